-- The schema that all migrations together make. Written by: npm run schema
-- Read it to see what a migration really does; a test holds it to the migrations.

CREATE SCHEMA public;
COMMENT ON SCHEMA public IS 'standard public schema';
CREATE FUNCTION public.any_organisation() RETURNS boolean
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select exists (select from organisations) $$;
CREATE PROCEDURE public.append_only(IN subject regclass)
    LANGUAGE plpgsql
    AS $$
    begin
      execute format('create trigger no_change before update or delete on %s for each row execute function refuse_change()', subject);
      execute format('create trigger no_truncate before truncate on %s for each statement execute function refuse_change()', subject);
      execute format('grant select, insert on %s to skerry_app', subject);
    end $$;
CREATE FUNCTION public.chain_audit_event() RETURNS trigger
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
    declare head audit_heads;
    begin
      insert into audit_heads (organisation_id) values (new.organisation_id) on conflict do nothing;
      select * into head from audit_heads where organisation_id = new.organisation_id for update;
      new.sequence := head.last + 1;
      new.hash := encode(sha256(convert_to(head.hash || new.body, 'UTF8')), 'hex');
      update audit_heads set last = new.sequence, hash = new.hash where organisation_id = new.organisation_id;
      return new;
    end $$;
CREATE FUNCTION public.check_approval() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      if new.state = 'approved' and old.state <> 'approved' and not exists (
        select from reviews v
        where v.organisation_id = new.organisation_id and v.report_id = new.report_id and v.revision = new.revision
          and v.decision = 'approved'
      ) then
        raise exception 'a report is approved by a review of its newest revision' using errcode = 'check_violation';
      end if;
      return new;
    end $$;
CREATE FUNCTION public.check_issue() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      if had_a_hand(new.organisation_id, new.report_id, new.issued_by) or not exists (
        select from people p
        where p.organisation_id = new.organisation_id and p.person_id = new.issued_by and p.active and 'reviewer' = any(p.roles)
      ) then
        raise exception 'a report is issued by a reviewer without a hand in it' using errcode = 'check_violation';
      end if;
      if not exists (
        select from reviews v
        where v.organisation_id = new.organisation_id and v.report_id = new.report_id and v.revision = new.revision
          and v.decision = 'approved' and not had_a_hand(v.organisation_id, v.report_id, v.reviewer_id)
      ) then
        raise exception 'a report is issued after its revision was approved' using errcode = 'check_violation';
      end if;
      return new;
    end $$;
CREATE FUNCTION public.check_issued() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      if new.state = 'issued' and old.state <> 'issued' and not exists (
        select from documents d
        where d.organisation_id = new.organisation_id and d.report_id = new.report_id and d.revision = new.revision
          and d.number = new.number
      ) then
        raise exception 'an issued report has a document' using errcode = 'check_violation';
      end if;
      return new;
    end $$;
CREATE FUNCTION public.check_report_step() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      if new.state <> old.state and (old.state, new.state) not in (
        ('draft', 'in review'), ('returned', 'in review'), ('in review', 'draft'), ('in review', 'returned'),
        ('approved', 'returned'), ('in review', 'approved'), ('approved', 'issued'), ('issued', 'replaced'), ('issued', 'withdrawn')
      ) then
        raise exception 'a report cannot go from % to %', old.state, new.state using errcode = 'check_violation';
      end if;
      if old.number is not null and new.number is distinct from old.number then
        raise exception 'a number once given stays' using errcode = 'check_violation';
      end if;
      if old.state in ('issued', 'replaced', 'withdrawn') and (new.revision, new.discarded_at) is distinct from (old.revision, old.discarded_at) then
        raise exception 'an issued report keeps its revision' using errcode = 'check_violation';
      end if;
      return new;
    end $$;
CREATE FUNCTION public.check_second_person() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    declare who uuid := (to_jsonb(new) ->> tg_argv[0])::uuid;
    begin
      if had_a_hand(new.organisation_id, new.report_id, who) then
        raise exception 'who uploaded, installed or tested cannot decide on the report' using errcode = 'check_violation';
      end if;
      return new;
    end $$;
CREATE FUNCTION public.current_organisation() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select nullif(current_setting('app.organisation', true), '')::uuid $$;
CREATE PROCEDURE public.fence(IN subject regclass)
    LANGUAGE plpgsql
    AS $$
    begin
      execute format('alter table %s enable row level security', subject);
      execute format('alter table %s force row level security', subject);
      execute format('create policy own_organisation on %s to skerry_app using (organisation_id = current_organisation()) with check (organisation_id = current_organisation())', subject);
    end $$;
CREATE FUNCTION public.folded(words text) RETURNS text
    LANGUAGE sql IMMUTABLE
    AS $$ select lower(regexp_replace(btrim(normalize(words, nfkc)), '\s+', ' ', 'g')) $$;
CREATE FUNCTION public.had_a_hand(in_organisation uuid, in_report uuid, who uuid) RETURNS boolean
    LANGUAGE sql STABLE
    AS $$
      select exists (
        select from revisions r
        where r.organisation_id = in_organisation and r.report_id = in_report and r.uploaded_by = who
      ) or exists (
        select from revisions r
        cross join lateral jsonb_array_elements(r.workers) as w
        join people p on p.organisation_id = r.organisation_id and p.person_id = who
        where r.organisation_id = in_organisation and r.report_id = in_report
          and (folded(w ->> 'name') = folded(p.name) or folded(w ->> 'licence') = folded(p.licence))
      )
    $$;
CREATE FUNCTION public.keep_published() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      if old.published_at is not null and (tg_op = 'DELETE' or to_jsonb(new) - array['state', 'placement', 'placed_on', 'anchor', 'quoted', 'assigned_to', 'version'] is distinct from to_jsonb(old) - array['state', 'placement', 'placed_on', 'anchor', 'quoted', 'assigned_to', 'version']) then
        raise exception 'a published remark stays as it was said' using errcode = 'integrity_constraint_violation';
      end if;
      return coalesce(new, old);
    end $$;
CREATE FUNCTION public.link_holder(hash text, moment timestamp with time zone) RETURNS TABLE(organisation_id uuid, person_id uuid, purpose text)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select l.organisation_id, l.person_id, l.purpose from links l
            where l.token_hash = hash and l.used_at is null and l.expires_at > moment $$;
CREATE FUNCTION public.organisation_ids() RETURNS SETOF uuid
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select organisation_id from organisations order by organisation_id $$;
CREATE FUNCTION public.people_with_address(address text) RETURNS TABLE(organisation_id uuid, person_id uuid)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select p.organisation_id, p.person_id from people p
            where p.email = lower(address) and p.active order by p.person_id limit 5 $$;
CREATE FUNCTION public.public_document(wanted_number text, wanted_sha256 text) RETURNS TABLE(number text, organisation text, issued_at timestamp with time zone, state text, replaced_by text, ended_at timestamp with time zone, sealed boolean, pdf_sha256 text)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
        -- Two branches, each with its own index: one OR over both tables would read them whole.
        with wanted as (
          select d.organisation_id, d.document_id from documents d where d.number = upper(wanted_number)
          union
          select s.organisation_id, s.document_id from seals s where s.pdf_sha256 = lower(wanted_sha256)
        )
        select d.number, o.name, d.issued_at, r.state, successor.number,
               (select max(e.written_at) from register_entries e
                where e.organisation_id = d.organisation_id and e.document_id = d.document_id and e.kind in ('replaced', 'withdrawn')),
               s.pdf_sha256 is not null, s.pdf_sha256
        from wanted w
        join documents d on d.organisation_id = w.organisation_id and d.document_id = w.document_id
        join organisations o on o.organisation_id = d.organisation_id
        join reports r on r.organisation_id = d.organisation_id and r.report_id = d.report_id
        left join seals s on s.organisation_id = d.organisation_id and s.document_id = d.document_id
        left join documents successor on successor.organisation_id = d.organisation_id and successor.replaces = d.document_id
        limit 2
      $$;
CREATE FUNCTION public.refuse_change() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      raise exception '% is kept as it was written: % is refused', tg_table_name, tg_op using errcode = 'integrity_constraint_violation';
    end $$;
CREATE FUNCTION public.sign_in_candidates(address text) RETURNS TABLE(organisation_id uuid, person_id uuid, password_hash text)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select p.organisation_id, p.person_id, p.password_hash from people p
            where p.email = lower(address) and p.active and p.password_hash is not null
            order by p.person_id limit 5 $$;
CREATE FUNCTION public.token_holder(hash text, moment timestamp with time zone) RETURNS TABLE(organisation_id uuid, person_id uuid, token_id uuid, scopes text[], last_used_at timestamp with time zone)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select t.organisation_id, t.person_id, t.token_id, t.scopes, t.last_used_at from tokens t
            where t.token_hash = hash and t.revoked_at is null and t.expires_at > moment $$;
CREATE TABLE public.acceptances (
    organisation_id uuid NOT NULL,
    acceptance_id uuid DEFAULT gen_random_uuid() NOT NULL,
    report_id uuid NOT NULL,
    revision integer NOT NULL,
    anchor text NOT NULL,
    sequence bigint NOT NULL,
    words text NOT NULL,
    words_sha256 text NOT NULL,
    accepted boolean NOT NULL,
    reason text DEFAULT ''::text NOT NULL,
    decided_by uuid NOT NULL,
    decided_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT acceptances_anchor_check CHECK (((length(anchor) >= 1) AND (length(anchor) <= 300))),
    CONSTRAINT acceptances_check CHECK ((words_sha256 = encode(sha256(convert_to(words, 'UTF8'::name)), 'hex'::text))),
    CONSTRAINT acceptances_check1 CHECK ((accepted OR (reason <> ''::text))),
    CONSTRAINT acceptances_reason_check CHECK ((length(reason) <= 2000))
);
ALTER TABLE ONLY public.acceptances FORCE ROW LEVEL SECURITY;
ALTER TABLE public.acceptances ALTER COLUMN sequence ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.acceptances_sequence_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);
CREATE TABLE public.attachments (
    organisation_id uuid NOT NULL,
    attachment_id uuid DEFAULT gen_random_uuid() NOT NULL,
    report_id uuid NOT NULL,
    file_id uuid NOT NULL,
    paper_file_id uuid,
    name text NOT NULL,
    anchor text,
    taken_at timestamp with time zone,
    added_by uuid NOT NULL,
    added_at timestamp with time zone DEFAULT now() NOT NULL,
    removed_at timestamp with time zone,
    CONSTRAINT attachments_anchor_check CHECK ((length(anchor) <= 300)),
    CONSTRAINT attachments_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120)))
);
ALTER TABLE ONLY public.attachments FORCE ROW LEVEL SECURITY;
CREATE TABLE public.audit_events (
    organisation_id uuid NOT NULL,
    sequence bigint NOT NULL,
    at timestamp with time zone NOT NULL,
    person_id uuid,
    action text NOT NULL,
    subject text NOT NULL,
    body text NOT NULL,
    hash text NOT NULL,
    CONSTRAINT audit_events_action_check CHECK (((length(action) >= 1) AND (length(action) <= 60))),
    CONSTRAINT audit_events_subject_check CHECK ((length(subject) <= 200))
);
ALTER TABLE ONLY public.audit_events FORCE ROW LEVEL SECURITY;
CREATE TABLE public.audit_heads (
    organisation_id uuid NOT NULL,
    last bigint DEFAULT 0 NOT NULL,
    hash text DEFAULT ''::text NOT NULL
);
ALTER TABLE ONLY public.audit_heads FORCE ROW LEVEL SECURITY;
CREATE TABLE public.checkpoints (
    organisation_id uuid NOT NULL,
    size bigint NOT NULL,
    root text NOT NULL,
    signed text NOT NULL,
    certificate text NOT NULL,
    made_at timestamp with time zone NOT NULL,
    CONSTRAINT checkpoints_root_check CHECK ((root ~ '^[0-9a-f]{64}$'::text))
);
ALTER TABLE ONLY public.checkpoints FORCE ROW LEVEL SECURITY;
CREATE TABLE public.condition_versions (
    organisation_id uuid NOT NULL,
    condition_id uuid NOT NULL,
    version integer NOT NULL,
    separation text NOT NULL,
    stated_in text NOT NULL,
    valid_from date NOT NULL,
    note text DEFAULT ''::text NOT NULL,
    written_by uuid NOT NULL,
    written_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT condition_versions_note_check CHECK ((length(note) <= 4000)),
    CONSTRAINT condition_versions_separation_check CHECK ((separation = ANY (ARRAY['all poles'::text, 'line poles'::text, 'not stated'::text]))),
    CONSTRAINT condition_versions_stated_in_check CHECK (((length(stated_in) >= 1) AND (length(stated_in) <= 300)))
);
ALTER TABLE ONLY public.condition_versions FORCE ROW LEVEL SECURITY;
CREATE TABLE public.conditions (
    organisation_id uuid NOT NULL,
    condition_id uuid DEFAULT gen_random_uuid() NOT NULL,
    operator text NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT conditions_operator_check CHECK (((length(operator) >= 1) AND (length(operator) <= 200)))
);
ALTER TABLE ONLY public.conditions FORCE ROW LEVEL SECURITY;
CREATE TABLE public.counters (
    organisation_id uuid NOT NULL,
    year integer NOT NULL,
    last integer NOT NULL,
    CONSTRAINT counters_last_check CHECK ((last >= 0))
);
ALTER TABLE ONLY public.counters FORCE ROW LEVEL SECURITY;
CREATE TABLE public.documents (
    organisation_id uuid NOT NULL,
    document_id uuid DEFAULT gen_random_uuid() NOT NULL,
    number text NOT NULL,
    year integer NOT NULL,
    sequence integer NOT NULL,
    report_id uuid NOT NULL,
    revision integer NOT NULL,
    issued_at timestamp with time zone NOT NULL,
    issued_by uuid NOT NULL,
    source_sha256 text NOT NULL,
    facts_sha256 text NOT NULL,
    issue jsonb NOT NULL,
    replaces uuid,
    CONSTRAINT documents_facts_sha256_check CHECK ((facts_sha256 ~ '^[0-9a-f]{64}$'::text)),
    CONSTRAINT documents_number_check CHECK ((number ~ '^[A-Z][A-Z0-9]{1,7}-[0-9]{4}-[0-9]{4,}$'::text)),
    CONSTRAINT documents_source_sha256_check CHECK ((source_sha256 ~ '^[0-9a-f]{64}$'::text))
);
ALTER TABLE ONLY public.documents FORCE ROW LEVEL SECURITY;
CREATE TABLE public.files (
    organisation_id uuid NOT NULL,
    file_id uuid DEFAULT gen_random_uuid() NOT NULL,
    sha256 text NOT NULL,
    kind text NOT NULL,
    type text NOT NULL,
    bytes bigint NOT NULL,
    width integer,
    height integer,
    received_sha256 text NOT NULL,
    created_by uuid NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT files_bytes_check CHECK ((bytes > 0)),
    CONSTRAINT files_kind_check CHECK ((kind = ANY (ARRAY['photo'::text, 'paper photo'::text, 'attachment'::text]))),
    CONSTRAINT files_received_sha256_check CHECK ((received_sha256 ~ '^[0-9a-f]{64}$'::text)),
    CONSTRAINT files_sha256_check CHECK ((sha256 ~ '^[0-9a-f]{64}$'::text))
);
ALTER TABLE ONLY public.files FORCE ROW LEVEL SECURITY;
CREATE TABLE public.idempotency_keys (
    organisation_id uuid NOT NULL,
    person_id uuid NOT NULL,
    key text NOT NULL,
    request_sha256 text NOT NULL,
    status integer NOT NULL,
    headers jsonb NOT NULL,
    body text NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT idempotency_keys_key_check CHECK (((length(key) >= 8) AND (length(key) <= 200)))
);
ALTER TABLE ONLY public.idempotency_keys FORCE ROW LEVEL SECURITY;
CREATE TABLE public.instrument_versions (
    organisation_id uuid NOT NULL,
    instrument_id uuid NOT NULL,
    version integer NOT NULL,
    kind text NOT NULL,
    calibrated_on date NOT NULL,
    due_on date NOT NULL,
    certificate text DEFAULT ''::text NOT NULL,
    uncertainty jsonb DEFAULT '{}'::jsonb NOT NULL,
    note text DEFAULT ''::text NOT NULL,
    written_by uuid NOT NULL,
    written_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT instrument_versions_certificate_check CHECK ((length(certificate) <= 100)),
    CONSTRAINT instrument_versions_check CHECK ((calibrated_on < due_on)),
    CONSTRAINT instrument_versions_kind_check CHECK (((length(kind) >= 1) AND (length(kind) <= 100))),
    CONSTRAINT instrument_versions_note_check CHECK ((length(note) <= 2000))
);
ALTER TABLE ONLY public.instrument_versions FORCE ROW LEVEL SECURITY;
CREATE TABLE public.instruments (
    organisation_id uuid NOT NULL,
    instrument_id uuid DEFAULT gen_random_uuid() NOT NULL,
    serial text NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    retired_at timestamp with time zone,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT instruments_serial_check CHECK (((length(serial) >= 1) AND (length(serial) <= 100)))
);
ALTER TABLE ONLY public.instruments FORCE ROW LEVEL SECURITY;
CREATE TABLE public.links (
    organisation_id uuid NOT NULL,
    token_hash text NOT NULL,
    person_id uuid NOT NULL,
    purpose text NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    used_at timestamp with time zone,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT links_purpose_check CHECK ((purpose = ANY (ARRAY['invitation'::text, 'reset'::text]))),
    CONSTRAINT links_token_hash_check CHECK ((token_hash ~ '^[0-9a-f]{64}$'::text))
);
ALTER TABLE ONLY public.links FORCE ROW LEVEL SECURITY;
CREATE TABLE public.mails (
    organisation_id uuid NOT NULL,
    mail_id uuid DEFAULT gen_random_uuid() NOT NULL,
    dedupe_key text NOT NULL,
    message_id text NOT NULL,
    kind text NOT NULL,
    to_address text NOT NULL,
    to_person uuid,
    subject text NOT NULL,
    text_body text NOT NULL,
    html_body text NOT NULL,
    state text DEFAULT 'waiting'::text NOT NULL,
    attempts integer DEFAULT 0 NOT NULL,
    last_answer text,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    sent_at timestamp with time zone,
    CONSTRAINT mails_dedupe_key_check CHECK (((length(dedupe_key) >= 1) AND (length(dedupe_key) <= 200))),
    CONSTRAINT mails_state_check CHECK ((state = ANY (ARRAY['waiting'::text, 'sent'::text, 'kept'::text, 'refused'::text])))
);
ALTER TABLE ONLY public.mails FORCE ROW LEVEL SECURITY;
CREATE TABLE public.organisations (
    organisation_id uuid DEFAULT gen_random_uuid() NOT NULL,
    name text NOT NULL,
    address text DEFAULT ''::text NOT NULL,
    mark text NOT NULL,
    settings jsonb DEFAULT '{}'::jsonb NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT organisations_address_check CHECK ((length(address) <= 500)),
    CONSTRAINT organisations_mark_check CHECK ((mark ~ '^[A-Z][A-Z0-9]{1,7}$'::text)),
    CONSTRAINT organisations_name_check CHECK (((length(name) >= 1) AND (length(name) <= 200)))
);
ALTER TABLE ONLY public.organisations FORCE ROW LEVEL SECURITY;
CREATE TABLE public.people (
    organisation_id uuid NOT NULL,
    person_id uuid DEFAULT gen_random_uuid() NOT NULL,
    email text NOT NULL,
    name text NOT NULL,
    licence text,
    roles text[] NOT NULL,
    password_hash text,
    totp_secret text,
    totp_last_step bigint,
    recovery_hashes text[] DEFAULT '{}'::text[] NOT NULL,
    mail_switches jsonb DEFAULT '{}'::jsonb NOT NULL,
    active boolean DEFAULT true NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT people_email_check CHECK ((((length(email) >= 3) AND (length(email) <= 254)) AND (email = lower(email)))),
    CONSTRAINT people_licence_check CHECK ((length(licence) <= 100)),
    CONSTRAINT people_name_check CHECK (((length(name) >= 1) AND (length(name) <= 200))),
    CONSTRAINT people_roles_check CHECK ((roles <@ ARRAY['installer'::text, 'reviewer'::text, 'auditor'::text, 'administrator'::text]))
);
ALTER TABLE ONLY public.people FORCE ROW LEVEL SECURITY;
CREATE TABLE public.rate_limits (
    key text NOT NULL,
    points integer DEFAULT 0 NOT NULL,
    expire bigint
);
CREATE TABLE public.register_entries (
    organisation_id uuid NOT NULL,
    sequence bigint NOT NULL,
    kind text NOT NULL,
    document_id uuid NOT NULL,
    entry text NOT NULL,
    leaf_hash text NOT NULL,
    chain_hash text NOT NULL,
    written_at timestamp with time zone NOT NULL,
    CONSTRAINT register_entries_chain_hash_check CHECK ((chain_hash ~ '^[0-9a-f]{64}$'::text)),
    CONSTRAINT register_entries_check CHECK ((leaf_hash = encode(sha256(('\x00'::bytea || convert_to(entry, 'UTF8'::name))), 'hex'::text))),
    CONSTRAINT register_entries_kind_check CHECK ((kind = ANY (ARRAY['issued'::text, 'sealed'::text, 'replaced'::text, 'withdrawn'::text]))),
    CONSTRAINT register_entries_sequence_check CHECK ((sequence >= 0))
);
ALTER TABLE ONLY public.register_entries FORCE ROW LEVEL SECURITY;
CREATE TABLE public.register_heads (
    organisation_id uuid NOT NULL,
    size bigint DEFAULT 0 NOT NULL,
    chain_hash text NOT NULL,
    peaks jsonb DEFAULT '[]'::jsonb NOT NULL
);
ALTER TABLE ONLY public.register_heads FORCE ROW LEVEL SECURITY;
CREATE TABLE public.register_nodes (
    organisation_id uuid NOT NULL,
    level integer NOT NULL,
    index bigint NOT NULL,
    hash text NOT NULL,
    CONSTRAINT register_nodes_hash_check CHECK ((hash ~ '^[0-9a-f]{64}$'::text)),
    CONSTRAINT register_nodes_index_check CHECK ((index >= 0)),
    CONSTRAINT register_nodes_level_check CHECK (((level >= 0) AND (level <= 50)))
);
ALTER TABLE ONLY public.register_nodes FORCE ROW LEVEL SECURITY;
CREATE TABLE public.remarks (
    organisation_id uuid NOT NULL,
    remark_id uuid DEFAULT gen_random_uuid() NOT NULL,
    thread_id uuid NOT NULL,
    sequence bigint NOT NULL,
    author_id uuid NOT NULL,
    body text NOT NULL,
    review_id uuid,
    published_at timestamp with time zone,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT remarks_body_check CHECK (((length(body) >= 1) AND (length(body) <= 4000)))
);
ALTER TABLE ONLY public.remarks FORCE ROW LEVEL SECURITY;
ALTER TABLE public.remarks ALTER COLUMN sequence ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.remarks_sequence_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);
CREATE TABLE public.reports (
    organisation_id uuid NOT NULL,
    report_id uuid DEFAULT gen_random_uuid() NOT NULL,
    state text DEFAULT 'draft'::text NOT NULL,
    reference text NOT NULL,
    title text NOT NULL,
    place text DEFAULT ''::text NOT NULL,
    operator text DEFAULT ''::text NOT NULL,
    purpose text,
    inspected_on date,
    due_on date,
    outcome text NOT NULL,
    revision integer DEFAULT 1 NOT NULL,
    number text,
    corrects uuid,
    correction_reason text,
    created_by uuid NOT NULL,
    reviewer_id uuid,
    discarded_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    updated_at timestamp with time zone DEFAULT now() NOT NULL,
    search text GENERATED ALWAYS AS (lower(((((((((reference || ' '::text) || title) || ' '::text) || place) || ' '::text) || operator) || ' '::text) || COALESCE(number, ''::text)))) STORED,
    CONSTRAINT reports_check CHECK (((corrects IS NULL) OR (correction_reason IS NOT NULL))),
    CONSTRAINT reports_check1 CHECK (((number IS NULL) = (state = ANY (ARRAY['draft'::text, 'in review'::text, 'returned'::text, 'approved'::text])))),
    CONSTRAINT reports_correction_reason_check CHECK ((length(correction_reason) <= 2000)),
    CONSTRAINT reports_revision_check CHECK ((revision >= 1)),
    CONSTRAINT reports_state_check CHECK ((state = ANY (ARRAY['draft'::text, 'in review'::text, 'returned'::text, 'approved'::text, 'issued'::text, 'replaced'::text, 'withdrawn'::text])))
);
ALTER TABLE ONLY public.reports FORCE ROW LEVEL SECURITY;
CREATE TABLE public.reviews (
    organisation_id uuid NOT NULL,
    review_id uuid DEFAULT gen_random_uuid() NOT NULL,
    report_id uuid NOT NULL,
    revision integer NOT NULL,
    reviewer_id uuid NOT NULL,
    started_at timestamp with time zone DEFAULT now() NOT NULL,
    submitted_at timestamp with time zone,
    decision text,
    summary text,
    CONSTRAINT reviews_check CHECK (((submitted_at IS NULL) = (decision IS NULL))),
    CONSTRAINT reviews_decision_check CHECK ((decision = ANY (ARRAY['remarks'::text, 'returned'::text, 'approved'::text]))),
    CONSTRAINT reviews_summary_check CHECK ((length(summary) <= 4000))
);
ALTER TABLE ONLY public.reviews FORCE ROW LEVEL SECURITY;
CREATE TABLE public.revisions (
    organisation_id uuid NOT NULL,
    report_id uuid NOT NULL,
    revision integer NOT NULL,
    source bytea NOT NULL,
    sha256 text NOT NULL,
    file_name text NOT NULL,
    uploaded_by uuid NOT NULL,
    uploaded_at timestamp with time zone DEFAULT now() NOT NULL,
    rulebook_id text NOT NULL,
    rulebook_version text NOT NULL,
    rulebook_hash text NOT NULL,
    software text NOT NULL,
    outcome text NOT NULL,
    counts jsonb NOT NULL,
    workers jsonb NOT NULL,
    CONSTRAINT revisions_check CHECK ((sha256 = encode(sha256(source), 'hex'::text))),
    CONSTRAINT revisions_file_name_check CHECK (((length(file_name) >= 1) AND (length(file_name) <= 200))),
    CONSTRAINT revisions_revision_check CHECK ((revision >= 1)),
    CONSTRAINT revisions_source_check CHECK (((length(source) >= 1) AND (length(source) <= 1048576)))
);
ALTER TABLE ONLY public.revisions FORCE ROW LEVEL SECURITY;
CREATE TABLE public.seals (
    organisation_id uuid NOT NULL,
    document_id uuid NOT NULL,
    pdf_sha256 text NOT NULL,
    bytes bigint NOT NULL,
    certificate_sha256 text NOT NULL,
    sealed_at timestamp with time zone NOT NULL,
    CONSTRAINT seals_bytes_check CHECK ((bytes > 0)),
    CONSTRAINT seals_pdf_sha256_check CHECK ((pdf_sha256 ~ '^[0-9a-f]{64}$'::text))
);
ALTER TABLE ONLY public.seals FORCE ROW LEVEL SECURITY;
CREATE TABLE public.sessions (
    sid text NOT NULL,
    sess jsonb NOT NULL,
    expire timestamp(6) with time zone NOT NULL,
    person_id uuid GENERATED ALWAYS AS (((sess ->> 'person'::text))::uuid) STORED,
    seen_at timestamp with time zone DEFAULT now() NOT NULL
);
CREATE TABLE public.threads (
    organisation_id uuid NOT NULL,
    thread_id uuid DEFAULT gen_random_uuid() NOT NULL,
    report_id uuid NOT NULL,
    anchor text NOT NULL,
    quoted text NOT NULL,
    region jsonb,
    kind text NOT NULL,
    state text DEFAULT 'open'::text NOT NULL,
    placement text DEFAULT 'kept'::text NOT NULL,
    opened_on integer NOT NULL,
    placed_on integer NOT NULL,
    opened_by uuid NOT NULL,
    assigned_to uuid,
    review_id uuid,
    published_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT threads_anchor_check CHECK (((length(anchor) >= 1) AND (length(anchor) <= 300))),
    CONSTRAINT threads_kind_check CHECK ((kind = ANY (ARRAY['remark'::text, 'question'::text, 'correction'::text]))),
    CONSTRAINT threads_placement_check CHECK ((placement = ANY (ARRAY['kept'::text, 'changed'::text, 'orphaned'::text]))),
    CONSTRAINT threads_quoted_check CHECK ((length(quoted) <= 2000)),
    CONSTRAINT threads_state_check CHECK ((state = ANY (ARRAY['open'::text, 'answered'::text, 'resolved'::text])))
);
ALTER TABLE ONLY public.threads FORCE ROW LEVEL SECURITY;
CREATE TABLE public.tokens (
    organisation_id uuid NOT NULL,
    token_id uuid DEFAULT gen_random_uuid() NOT NULL,
    person_id uuid NOT NULL,
    name text NOT NULL,
    token_hash text NOT NULL,
    hint text NOT NULL,
    scopes text[] NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    revoked_at timestamp with time zone,
    last_used_at timestamp with time zone,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT tokens_name_check CHECK (((length(name) >= 1) AND (length(name) <= 100))),
    CONSTRAINT tokens_scopes_check CHECK ((scopes <@ ARRAY['report.read'::text, 'report.send'::text])),
    CONSTRAINT tokens_token_hash_check CHECK ((token_hash ~ '^[0-9a-f]{64}$'::text))
);
ALTER TABLE ONLY public.tokens FORCE ROW LEVEL SECURITY;
CREATE TABLE public.uploads (
    organisation_id uuid NOT NULL,
    upload_id uuid DEFAULT gen_random_uuid() NOT NULL,
    person_id uuid NOT NULL,
    report_id uuid NOT NULL,
    name text NOT NULL,
    anchor text,
    taken_at timestamp with time zone,
    sha256 text NOT NULL,
    size bigint NOT NULL,
    parts jsonb NOT NULL,
    state text DEFAULT 'open'::text NOT NULL,
    refusal text,
    attachment_id uuid,
    expires_at timestamp with time zone NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT uploads_anchor_check CHECK ((length(anchor) <= 300)),
    CONSTRAINT uploads_check CHECK (((state = 'attached'::text) = (attachment_id IS NOT NULL))),
    CONSTRAINT uploads_check1 CHECK (((state = 'refused'::text) = (refusal IS NOT NULL))),
    CONSTRAINT uploads_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120))),
    CONSTRAINT uploads_sha256_check CHECK ((sha256 ~ '^[0-9a-f]{64}$'::text)),
    CONSTRAINT uploads_size_check CHECK (((size >= 1) AND (size <= 15728640))),
    CONSTRAINT uploads_state_check CHECK ((state = ANY (ARRAY['open'::text, 'complete'::text, 'attached'::text, 'refused'::text])))
);
ALTER TABLE ONLY public.uploads FORCE ROW LEVEL SECURITY;
ALTER TABLE ONLY public.acceptances
    ADD CONSTRAINT acceptances_pkey PRIMARY KEY (organisation_id, acceptance_id);
ALTER TABLE ONLY public.attachments
    ADD CONSTRAINT attachments_pkey PRIMARY KEY (organisation_id, attachment_id);
ALTER TABLE ONLY public.audit_events
    ADD CONSTRAINT audit_events_pkey PRIMARY KEY (organisation_id, sequence);
ALTER TABLE ONLY public.audit_heads
    ADD CONSTRAINT audit_heads_pkey PRIMARY KEY (organisation_id);
ALTER TABLE ONLY public.checkpoints
    ADD CONSTRAINT checkpoints_pkey PRIMARY KEY (organisation_id, size);
ALTER TABLE ONLY public.condition_versions
    ADD CONSTRAINT condition_versions_pkey PRIMARY KEY (organisation_id, condition_id, version);
ALTER TABLE ONLY public.conditions
    ADD CONSTRAINT conditions_organisation_id_operator_key UNIQUE (organisation_id, operator);
ALTER TABLE ONLY public.conditions
    ADD CONSTRAINT conditions_pkey PRIMARY KEY (organisation_id, condition_id);
ALTER TABLE ONLY public.counters
    ADD CONSTRAINT counters_pkey PRIMARY KEY (organisation_id, year);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_number_key UNIQUE (organisation_id, number);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_replaces_key UNIQUE (organisation_id, replaces);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_report_id_key UNIQUE (organisation_id, report_id);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_year_sequence_key UNIQUE (organisation_id, year, sequence);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_pkey PRIMARY KEY (organisation_id, document_id);
ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_organisation_id_sha256_kind_key UNIQUE (organisation_id, sha256, kind);
ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_pkey PRIMARY KEY (organisation_id, file_id);
ALTER TABLE ONLY public.idempotency_keys
    ADD CONSTRAINT idempotency_keys_pkey PRIMARY KEY (organisation_id, person_id, key);
ALTER TABLE ONLY public.instrument_versions
    ADD CONSTRAINT instrument_versions_pkey PRIMARY KEY (organisation_id, instrument_id, version);
ALTER TABLE ONLY public.instruments
    ADD CONSTRAINT instruments_organisation_id_serial_key UNIQUE (organisation_id, serial);
ALTER TABLE ONLY public.instruments
    ADD CONSTRAINT instruments_pkey PRIMARY KEY (organisation_id, instrument_id);
ALTER TABLE ONLY public.links
    ADD CONSTRAINT links_pkey PRIMARY KEY (organisation_id, token_hash);
ALTER TABLE ONLY public.mails
    ADD CONSTRAINT mails_organisation_id_dedupe_key_key UNIQUE (organisation_id, dedupe_key);
ALTER TABLE ONLY public.mails
    ADD CONSTRAINT mails_pkey PRIMARY KEY (organisation_id, mail_id);
ALTER TABLE ONLY public.organisations
    ADD CONSTRAINT organisations_mark_key UNIQUE (mark);
ALTER TABLE ONLY public.organisations
    ADD CONSTRAINT organisations_pkey PRIMARY KEY (organisation_id);
ALTER TABLE ONLY public.people
    ADD CONSTRAINT people_organisation_id_email_key UNIQUE (organisation_id, email);
ALTER TABLE ONLY public.people
    ADD CONSTRAINT people_pkey PRIMARY KEY (organisation_id, person_id);
ALTER TABLE ONLY public.rate_limits
    ADD CONSTRAINT rate_limits_pkey PRIMARY KEY (key);
ALTER TABLE ONLY public.register_entries
    ADD CONSTRAINT register_entries_pkey PRIMARY KEY (organisation_id, sequence);
ALTER TABLE ONLY public.register_heads
    ADD CONSTRAINT register_heads_pkey PRIMARY KEY (organisation_id);
ALTER TABLE ONLY public.register_nodes
    ADD CONSTRAINT register_nodes_pkey PRIMARY KEY (organisation_id, level, index);
ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_pkey PRIMARY KEY (organisation_id, remark_id);
ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_number_key UNIQUE (organisation_id, number);
ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_pkey PRIMARY KEY (organisation_id, report_id);
ALTER TABLE ONLY public.reviews
    ADD CONSTRAINT reviews_pkey PRIMARY KEY (organisation_id, review_id);
ALTER TABLE ONLY public.revisions
    ADD CONSTRAINT revisions_pkey PRIMARY KEY (organisation_id, report_id, revision);
ALTER TABLE ONLY public.seals
    ADD CONSTRAINT seals_pkey PRIMARY KEY (organisation_id, document_id);
ALTER TABLE ONLY public.sessions
    ADD CONSTRAINT sessions_pkey PRIMARY KEY (sid);
ALTER TABLE ONLY public.threads
    ADD CONSTRAINT threads_pkey PRIMARY KEY (organisation_id, thread_id);
ALTER TABLE ONLY public.tokens
    ADD CONSTRAINT tokens_organisation_id_token_hash_key UNIQUE (organisation_id, token_hash);
ALTER TABLE ONLY public.tokens
    ADD CONSTRAINT tokens_pkey PRIMARY KEY (organisation_id, token_id);
ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_pkey PRIMARY KEY (organisation_id, upload_id);
CREATE INDEX acceptances_by_report ON public.acceptances USING btree (organisation_id, report_id, sequence);
CREATE INDEX audit_events_by_person ON public.audit_events USING btree (organisation_id, person_id, sequence DESC);
CREATE INDEX audit_events_by_subject ON public.audit_events USING btree (organisation_id, subject, sequence DESC);
CREATE INDEX documents_by_issue ON public.documents USING btree (organisation_id, issued_at DESC, document_id DESC);
CREATE INDEX documents_by_number ON public.documents USING btree (number);
CREATE INDEX files_by_received ON public.files USING btree (organisation_id, received_sha256);
CREATE INDEX idempotency_keys_by_age ON public.idempotency_keys USING btree (created_at);
CREATE INDEX instrument_versions_by_due ON public.instrument_versions USING btree (organisation_id, due_on);
CREATE INDEX links_by_person ON public.links USING btree (organisation_id, person_id);
CREATE INDEX links_by_token ON public.links USING btree (token_hash);
CREATE INDEX mails_by_time ON public.mails USING btree (organisation_id, created_at DESC, mail_id DESC);
CREATE UNIQUE INDEX one_name_a_report ON public.attachments USING btree (organisation_id, report_id, name) WHERE (removed_at IS NULL);
CREATE UNIQUE INDEX one_of_a_kind ON public.register_entries USING btree (organisation_id, document_id, kind);
CREATE UNIQUE INDEX one_open_review ON public.reviews USING btree (organisation_id, report_id, reviewer_id) WHERE (submitted_at IS NULL);
CREATE INDEX people_by_email ON public.people USING btree (email);
CREATE INDEX people_by_id ON public.people USING btree (person_id);
CREATE INDEX register_entries_by_document ON public.register_entries USING btree (organisation_id, document_id);
CREATE INDEX remarks_by_thread ON public.remarks USING btree (organisation_id, thread_id, sequence);
CREATE UNIQUE INDEX reports_by_corrected ON public.reports USING btree (organisation_id, corrects) WHERE ((corrects IS NOT NULL) AND (discarded_at IS NULL));
CREATE INDEX reports_by_due ON public.reports USING btree (organisation_id, due_on) WHERE (state = 'issued'::text);
CREATE INDEX reports_by_reference ON public.reports USING btree (organisation_id, reference);
CREATE INDEX reports_by_search ON public.reports USING gin (search public.gin_trgm_ops);
CREATE INDEX reports_by_state ON public.reports USING btree (organisation_id, state, updated_at DESC, report_id DESC) WHERE (discarded_at IS NULL);
CREATE INDEX reports_by_update ON public.reports USING btree (organisation_id, updated_at DESC, report_id DESC) WHERE (discarded_at IS NULL);
CREATE INDEX reviews_by_report ON public.reviews USING btree (organisation_id, report_id, started_at);
CREATE INDEX revisions_by_hash ON public.revisions USING btree (organisation_id, sha256);
CREATE INDEX seals_by_hash ON public.seals USING btree (pdf_sha256);
CREATE INDEX sessions_by_expiry ON public.sessions USING btree (expire);
CREATE INDEX sessions_by_person ON public.sessions USING btree (person_id);
CREATE INDEX threads_by_assignee ON public.threads USING btree (organisation_id, assigned_to) WHERE (state <> 'resolved'::text);
CREATE INDEX threads_by_report ON public.threads USING btree (organisation_id, report_id, created_at);
CREATE INDEX tokens_by_hash ON public.tokens USING btree (token_hash);
CREATE INDEX tokens_by_person ON public.tokens USING btree (organisation_id, person_id);
CREATE INDEX uploads_by_expiry ON public.uploads USING btree (expires_at) WHERE (state = 'open'::text);
CREATE INDEX uploads_by_report ON public.uploads USING btree (organisation_id, report_id, created_at);
CREATE TRIGGER chain BEFORE INSERT ON public.audit_events FOR EACH ROW EXECUTE FUNCTION public.chain_audit_event();
CREATE TRIGGER check_approval BEFORE UPDATE ON public.reports FOR EACH ROW EXECUTE FUNCTION public.check_approval();
CREATE TRIGGER check_issue BEFORE INSERT ON public.documents FOR EACH ROW EXECUTE FUNCTION public.check_issue();
CREATE TRIGGER check_issued BEFORE UPDATE ON public.reports FOR EACH ROW EXECUTE FUNCTION public.check_issued();
CREATE TRIGGER check_step BEFORE UPDATE ON public.reports FOR EACH ROW EXECUTE FUNCTION public.check_report_step();
CREATE TRIGGER keep_published BEFORE DELETE OR UPDATE ON public.remarks FOR EACH ROW EXECUTE FUNCTION public.keep_published();
CREATE TRIGGER keep_published BEFORE DELETE OR UPDATE ON public.threads FOR EACH ROW EXECUTE FUNCTION public.keep_published();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.acceptances FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.audit_events FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.checkpoints FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.condition_versions FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.documents FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.files FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.instrument_versions FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.register_entries FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.register_nodes FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.revisions FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_change BEFORE DELETE OR UPDATE ON public.seals FOR EACH ROW EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.acceptances FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.audit_events FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.checkpoints FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.condition_versions FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.documents FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.files FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.instrument_versions FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.register_entries FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.register_nodes FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.revisions FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER no_truncate BEFORE TRUNCATE ON public.seals FOR EACH STATEMENT EXECUTE FUNCTION public.refuse_change();
CREATE TRIGGER second_person BEFORE INSERT ON public.acceptances FOR EACH ROW EXECUTE FUNCTION public.check_second_person('decided_by');
CREATE TRIGGER second_person BEFORE INSERT OR UPDATE ON public.reviews FOR EACH ROW EXECUTE FUNCTION public.check_second_person('reviewer_id');
ALTER TABLE ONLY public.acceptances
    ADD CONSTRAINT acceptances_organisation_id_decided_by_fkey FOREIGN KEY (organisation_id, decided_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.acceptances
    ADD CONSTRAINT acceptances_organisation_id_report_id_revision_fkey FOREIGN KEY (organisation_id, report_id, revision) REFERENCES public.revisions(organisation_id, report_id, revision);
ALTER TABLE ONLY public.attachments
    ADD CONSTRAINT attachments_organisation_id_added_by_fkey FOREIGN KEY (organisation_id, added_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.attachments
    ADD CONSTRAINT attachments_organisation_id_file_id_fkey FOREIGN KEY (organisation_id, file_id) REFERENCES public.files(organisation_id, file_id);
ALTER TABLE ONLY public.attachments
    ADD CONSTRAINT attachments_organisation_id_paper_file_id_fkey FOREIGN KEY (organisation_id, paper_file_id) REFERENCES public.files(organisation_id, file_id);
ALTER TABLE ONLY public.attachments
    ADD CONSTRAINT attachments_organisation_id_report_id_fkey FOREIGN KEY (organisation_id, report_id) REFERENCES public.reports(organisation_id, report_id);
ALTER TABLE ONLY public.audit_events
    ADD CONSTRAINT audit_events_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.audit_heads
    ADD CONSTRAINT audit_heads_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.checkpoints
    ADD CONSTRAINT checkpoints_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.condition_versions
    ADD CONSTRAINT condition_versions_organisation_id_condition_id_fkey FOREIGN KEY (organisation_id, condition_id) REFERENCES public.conditions(organisation_id, condition_id);
ALTER TABLE ONLY public.condition_versions
    ADD CONSTRAINT condition_versions_organisation_id_written_by_fkey FOREIGN KEY (organisation_id, written_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.conditions
    ADD CONSTRAINT conditions_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.counters
    ADD CONSTRAINT counters_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_issued_by_fkey FOREIGN KEY (organisation_id, issued_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_replaces_fkey FOREIGN KEY (organisation_id, replaces) REFERENCES public.documents(organisation_id, document_id);
ALTER TABLE ONLY public.documents
    ADD CONSTRAINT documents_organisation_id_report_id_revision_fkey FOREIGN KEY (organisation_id, report_id, revision) REFERENCES public.revisions(organisation_id, report_id, revision);
ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_organisation_id_created_by_fkey FOREIGN KEY (organisation_id, created_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.idempotency_keys
    ADD CONSTRAINT idempotency_keys_organisation_id_person_id_fkey FOREIGN KEY (organisation_id, person_id) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.instrument_versions
    ADD CONSTRAINT instrument_versions_organisation_id_instrument_id_fkey FOREIGN KEY (organisation_id, instrument_id) REFERENCES public.instruments(organisation_id, instrument_id);
ALTER TABLE ONLY public.instrument_versions
    ADD CONSTRAINT instrument_versions_organisation_id_written_by_fkey FOREIGN KEY (organisation_id, written_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.instruments
    ADD CONSTRAINT instruments_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.links
    ADD CONSTRAINT links_organisation_id_person_id_fkey FOREIGN KEY (organisation_id, person_id) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.mails
    ADD CONSTRAINT mails_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.mails
    ADD CONSTRAINT mails_organisation_id_to_person_fkey FOREIGN KEY (organisation_id, to_person) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.people
    ADD CONSTRAINT people_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.register_entries
    ADD CONSTRAINT register_entries_organisation_id_document_id_fkey FOREIGN KEY (organisation_id, document_id) REFERENCES public.documents(organisation_id, document_id);
ALTER TABLE ONLY public.register_entries
    ADD CONSTRAINT register_entries_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.register_heads
    ADD CONSTRAINT register_heads_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.register_nodes
    ADD CONSTRAINT register_nodes_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_author_id_fkey FOREIGN KEY (organisation_id, author_id) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_review_id_fkey FOREIGN KEY (organisation_id, review_id) REFERENCES public.reviews(organisation_id, review_id);
ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_thread_id_fkey FOREIGN KEY (organisation_id, thread_id) REFERENCES public.threads(organisation_id, thread_id) ON DELETE CASCADE;
ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_corrects_fkey FOREIGN KEY (organisation_id, corrects) REFERENCES public.reports(organisation_id, report_id);
ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_created_by_fkey FOREIGN KEY (organisation_id, created_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_reviewer_id_fkey FOREIGN KEY (organisation_id, reviewer_id) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.reviews
    ADD CONSTRAINT reviews_organisation_id_report_id_revision_fkey FOREIGN KEY (organisation_id, report_id, revision) REFERENCES public.revisions(organisation_id, report_id, revision);
ALTER TABLE ONLY public.reviews
    ADD CONSTRAINT reviews_organisation_id_reviewer_id_fkey FOREIGN KEY (organisation_id, reviewer_id) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.revisions
    ADD CONSTRAINT revisions_organisation_id_report_id_fkey FOREIGN KEY (organisation_id, report_id) REFERENCES public.reports(organisation_id, report_id);
ALTER TABLE ONLY public.revisions
    ADD CONSTRAINT revisions_organisation_id_uploaded_by_fkey FOREIGN KEY (organisation_id, uploaded_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.seals
    ADD CONSTRAINT seals_organisation_id_document_id_fkey FOREIGN KEY (organisation_id, document_id) REFERENCES public.documents(organisation_id, document_id);
ALTER TABLE ONLY public.threads
    ADD CONSTRAINT threads_organisation_id_assigned_to_fkey FOREIGN KEY (organisation_id, assigned_to) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.threads
    ADD CONSTRAINT threads_organisation_id_opened_by_fkey FOREIGN KEY (organisation_id, opened_by) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.threads
    ADD CONSTRAINT threads_organisation_id_report_id_fkey FOREIGN KEY (organisation_id, report_id) REFERENCES public.reports(organisation_id, report_id);
ALTER TABLE ONLY public.threads
    ADD CONSTRAINT threads_organisation_id_review_id_fkey FOREIGN KEY (organisation_id, review_id) REFERENCES public.reviews(organisation_id, review_id);
ALTER TABLE ONLY public.tokens
    ADD CONSTRAINT tokens_organisation_id_person_id_fkey FOREIGN KEY (organisation_id, person_id) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_organisation_id_attachment_id_fkey FOREIGN KEY (organisation_id, attachment_id) REFERENCES public.attachments(organisation_id, attachment_id);
ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);
ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_organisation_id_person_id_fkey FOREIGN KEY (organisation_id, person_id) REFERENCES public.people(organisation_id, person_id);
ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_organisation_id_report_id_fkey FOREIGN KEY (organisation_id, report_id) REFERENCES public.reports(organisation_id, report_id);
ALTER TABLE public.acceptances ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.attachments ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.audit_events ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.audit_heads ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.checkpoints ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.condition_versions ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.conditions ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.counters ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.documents ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.files ENABLE ROW LEVEL SECURITY;
CREATE POLICY gate ON public.audit_heads TO skerry_gate USING (true) WITH CHECK (true);
CREATE POLICY gate ON public.documents TO skerry_gate USING (true);
CREATE POLICY gate ON public.links TO skerry_gate USING (true);
CREATE POLICY gate ON public.organisations TO skerry_gate USING (true);
CREATE POLICY gate ON public.people TO skerry_gate USING (true);
CREATE POLICY gate ON public.register_entries TO skerry_gate USING (true);
CREATE POLICY gate ON public.reports TO skerry_gate USING (true);
CREATE POLICY gate ON public.seals TO skerry_gate USING (true);
CREATE POLICY gate ON public.tokens TO skerry_gate USING (true);
ALTER TABLE public.idempotency_keys ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.instrument_versions ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.instruments ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.links ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.mails ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.organisations ENABLE ROW LEVEL SECURITY;
CREATE POLICY own_organisation ON public.acceptances TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.attachments TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.audit_events TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.audit_heads TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.checkpoints TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.condition_versions TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.conditions TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.counters TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.documents TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.files TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.idempotency_keys TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.instrument_versions TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.instruments TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.links TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.mails TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.organisations TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.people TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.register_entries TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.register_heads TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.register_nodes TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.remarks TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.reports TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.reviews TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.revisions TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.seals TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.threads TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.tokens TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
CREATE POLICY own_organisation ON public.uploads TO skerry_app USING ((organisation_id = public.current_organisation())) WITH CHECK ((organisation_id = public.current_organisation()));
ALTER TABLE public.people ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.register_entries ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.register_heads ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.register_nodes ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.remarks ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.reports ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.reviews ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.revisions ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.seals ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.threads ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.tokens ENABLE ROW LEVEL SECURITY;
ALTER TABLE public.uploads ENABLE ROW LEVEL SECURITY;
GRANT USAGE ON SCHEMA public TO skerry_app;
GRANT ALL ON SCHEMA public TO skerry_gate;
REVOKE ALL ON FUNCTION public.any_organisation() FROM PUBLIC;
GRANT ALL ON FUNCTION public.any_organisation() TO skerry_app;
REVOKE ALL ON FUNCTION public.link_holder(hash text, moment timestamp with time zone) FROM PUBLIC;
GRANT ALL ON FUNCTION public.link_holder(hash text, moment timestamp with time zone) TO skerry_app;
REVOKE ALL ON FUNCTION public.organisation_ids() FROM PUBLIC;
GRANT ALL ON FUNCTION public.organisation_ids() TO skerry_app;
REVOKE ALL ON FUNCTION public.people_with_address(address text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.people_with_address(address text) TO skerry_app;
REVOKE ALL ON FUNCTION public.public_document(wanted_number text, wanted_sha256 text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.public_document(wanted_number text, wanted_sha256 text) TO skerry_app;
REVOKE ALL ON FUNCTION public.sign_in_candidates(address text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.sign_in_candidates(address text) TO skerry_app;
REVOKE ALL ON FUNCTION public.token_holder(hash text, moment timestamp with time zone) FROM PUBLIC;
GRANT ALL ON FUNCTION public.token_holder(hash text, moment timestamp with time zone) TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.acceptances TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.attachments TO skerry_app;
GRANT UPDATE(anchor) ON TABLE public.attachments TO skerry_app;
GRANT UPDATE(removed_at) ON TABLE public.attachments TO skerry_app;
GRANT SELECT ON TABLE public.audit_events TO skerry_app;
GRANT INSERT(organisation_id) ON TABLE public.audit_events TO skerry_app;
GRANT INSERT(at) ON TABLE public.audit_events TO skerry_app;
GRANT INSERT(person_id) ON TABLE public.audit_events TO skerry_app;
GRANT INSERT(action) ON TABLE public.audit_events TO skerry_app;
GRANT INSERT(subject) ON TABLE public.audit_events TO skerry_app;
GRANT INSERT(body) ON TABLE public.audit_events TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.audit_heads TO skerry_gate;
GRANT SELECT ON TABLE public.audit_heads TO skerry_app;
GRANT UPDATE(last) ON TABLE public.audit_heads TO skerry_gate;
GRANT UPDATE(hash) ON TABLE public.audit_heads TO skerry_gate;
GRANT SELECT,INSERT ON TABLE public.checkpoints TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.condition_versions TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.conditions TO skerry_app;
GRANT UPDATE(version) ON TABLE public.conditions TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.counters TO skerry_app;
GRANT UPDATE(last) ON TABLE public.counters TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.documents TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.documents TO skerry_gate;
GRANT SELECT(document_id) ON TABLE public.documents TO skerry_gate;
GRANT SELECT(number) ON TABLE public.documents TO skerry_gate;
GRANT SELECT(report_id) ON TABLE public.documents TO skerry_gate;
GRANT SELECT(issued_at) ON TABLE public.documents TO skerry_gate;
GRANT SELECT(replaces) ON TABLE public.documents TO skerry_gate;
GRANT SELECT,INSERT ON TABLE public.files TO skerry_app;
GRANT SELECT,INSERT,DELETE ON TABLE public.idempotency_keys TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.instrument_versions TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.instruments TO skerry_app;
GRANT UPDATE(version) ON TABLE public.instruments TO skerry_app;
GRANT UPDATE(retired_at) ON TABLE public.instruments TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.links TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.links TO skerry_gate;
GRANT SELECT(token_hash) ON TABLE public.links TO skerry_gate;
GRANT SELECT(person_id) ON TABLE public.links TO skerry_gate;
GRANT SELECT(purpose) ON TABLE public.links TO skerry_gate;
GRANT SELECT(expires_at) ON TABLE public.links TO skerry_gate;
GRANT UPDATE(used_at) ON TABLE public.links TO skerry_app;
GRANT SELECT(used_at) ON TABLE public.links TO skerry_gate;
GRANT SELECT,INSERT ON TABLE public.mails TO skerry_app;
GRANT UPDATE(state) ON TABLE public.mails TO skerry_app;
GRANT UPDATE(attempts) ON TABLE public.mails TO skerry_app;
GRANT UPDATE(last_answer) ON TABLE public.mails TO skerry_app;
GRANT UPDATE(sent_at) ON TABLE public.mails TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.organisations TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.organisations TO skerry_gate;
GRANT UPDATE(name) ON TABLE public.organisations TO skerry_app;
GRANT SELECT(name) ON TABLE public.organisations TO skerry_gate;
GRANT UPDATE(address) ON TABLE public.organisations TO skerry_app;
GRANT UPDATE(settings) ON TABLE public.organisations TO skerry_app;
GRANT UPDATE(version) ON TABLE public.organisations TO skerry_app;
GRANT SELECT,INSERT,UPDATE ON TABLE public.people TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.people TO skerry_gate;
GRANT SELECT(person_id) ON TABLE public.people TO skerry_gate;
GRANT SELECT(email) ON TABLE public.people TO skerry_gate;
GRANT SELECT(password_hash) ON TABLE public.people TO skerry_gate;
GRANT SELECT(totp_secret) ON TABLE public.people TO skerry_gate;
GRANT SELECT(active) ON TABLE public.people TO skerry_gate;
GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.rate_limits TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.register_entries TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.register_entries TO skerry_gate;
GRANT SELECT(kind) ON TABLE public.register_entries TO skerry_gate;
GRANT SELECT(document_id) ON TABLE public.register_entries TO skerry_gate;
GRANT SELECT(written_at) ON TABLE public.register_entries TO skerry_gate;
GRANT SELECT,INSERT ON TABLE public.register_heads TO skerry_app;
GRANT UPDATE(size) ON TABLE public.register_heads TO skerry_app;
GRANT UPDATE(chain_hash) ON TABLE public.register_heads TO skerry_app;
GRANT UPDATE(peaks) ON TABLE public.register_heads TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.register_nodes TO skerry_app;
GRANT SELECT,INSERT,DELETE ON TABLE public.remarks TO skerry_app;
GRANT UPDATE(body) ON TABLE public.remarks TO skerry_app;
GRANT UPDATE(published_at) ON TABLE public.remarks TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.reports TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.reports TO skerry_gate;
GRANT SELECT(report_id) ON TABLE public.reports TO skerry_gate;
GRANT UPDATE(state) ON TABLE public.reports TO skerry_app;
GRANT SELECT(state) ON TABLE public.reports TO skerry_gate;
GRANT UPDATE(reference) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(title) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(place) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(operator) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(purpose) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(inspected_on) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(due_on) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(outcome) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(revision) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(number) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(reviewer_id) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(discarded_at) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(version) ON TABLE public.reports TO skerry_app;
GRANT UPDATE(updated_at) ON TABLE public.reports TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.reviews TO skerry_app;
GRANT UPDATE(revision) ON TABLE public.reviews TO skerry_app;
GRANT UPDATE(submitted_at) ON TABLE public.reviews TO skerry_app;
GRANT UPDATE(decision) ON TABLE public.reviews TO skerry_app;
GRANT UPDATE(summary) ON TABLE public.reviews TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.revisions TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.seals TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.seals TO skerry_gate;
GRANT SELECT(document_id) ON TABLE public.seals TO skerry_gate;
GRANT SELECT(pdf_sha256) ON TABLE public.seals TO skerry_gate;
GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.sessions TO skerry_app;
GRANT SELECT,INSERT,DELETE ON TABLE public.threads TO skerry_app;
GRANT UPDATE(anchor) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(quoted) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(region) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(kind) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(state) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(placement) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(placed_on) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(assigned_to) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(published_at) ON TABLE public.threads TO skerry_app;
GRANT UPDATE(version) ON TABLE public.threads TO skerry_app;
GRANT SELECT,INSERT ON TABLE public.tokens TO skerry_app;
GRANT SELECT(organisation_id) ON TABLE public.tokens TO skerry_gate;
GRANT SELECT(token_id) ON TABLE public.tokens TO skerry_gate;
GRANT SELECT(person_id) ON TABLE public.tokens TO skerry_gate;
GRANT SELECT(token_hash) ON TABLE public.tokens TO skerry_gate;
GRANT SELECT(scopes) ON TABLE public.tokens TO skerry_gate;
GRANT SELECT(expires_at) ON TABLE public.tokens TO skerry_gate;
GRANT UPDATE(revoked_at) ON TABLE public.tokens TO skerry_app;
GRANT SELECT(revoked_at) ON TABLE public.tokens TO skerry_gate;
GRANT UPDATE(last_used_at) ON TABLE public.tokens TO skerry_app;
GRANT SELECT(last_used_at) ON TABLE public.tokens TO skerry_gate;
GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.uploads TO skerry_app;
