import type { Knex } from 'knex'

/** Issued documents, their numbers, seals, and the register that holds them together. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    -- Numbers without gaps: the row stays locked until the issuing transaction ends either way.
    create table counters (
      organisation_id uuid not null references organisations,
      year integer not null,
      last integer not null check (last >= 0),
      primary key (organisation_id, year)
    );
    call fence('counters');
    grant select, insert on counters to skerry_app;
    grant update (last) on counters to skerry_app;

    create table documents (
      organisation_id uuid not null references organisations,
      document_id uuid not null default gen_random_uuid(),
      number text not null check (number ~ '^[A-Z][A-Z0-9]{1,7}-[0-9]{4}-[0-9]{4,}$'),
      year integer not null,
      sequence integer not null,
      report_id uuid not null,
      revision integer not null,
      issued_at timestamptz not null,
      issued_by uuid not null,
      source_sha256 text not null check (source_sha256 ~ '^[0-9a-f]{64}$'),
      facts_sha256 text not null check (facts_sha256 ~ '^[0-9a-f]{64}$'),
      -- Everything that is printed and does not come from the file: names, accepted words, what it replaces.
      issue jsonb not null,
      replaces uuid,
      primary key (organisation_id, document_id),
      unique (organisation_id, number),
      unique (organisation_id, year, sequence),
      unique (organisation_id, report_id),
      unique (organisation_id, replaces),
      foreign key (organisation_id, report_id, revision) references revisions,
      foreign key (organisation_id, issued_by) references people,
      foreign key (organisation_id, replaces) references documents
    );
    create index documents_by_issue on documents (organisation_id, issued_at desc, document_id desc);
    call fence('documents');
    call append_only('documents');

    -- Who issues is a reviewer without a hand in the work, and so was whoever approved that revision.
    create function check_issue() returns trigger language plpgsql as $$
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
    create trigger check_issue before insert on documents for each row execute function check_issue();

    create function check_issued() returns trigger language plpgsql as $$
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
    create trigger check_issued before update on reports for each row execute function check_issued();

    -- The sealed PDF of a document. Rendering may run many times; the first seal that is written down is the one.
    create table seals (
      organisation_id uuid not null,
      document_id uuid not null,
      pdf_sha256 text not null check (pdf_sha256 ~ '^[0-9a-f]{64}$'),
      bytes bigint not null check (bytes > 0),
      certificate_sha256 text not null,
      sealed_at timestamptz not null,
      primary key (organisation_id, document_id),
      foreign key (organisation_id, document_id) references documents
    );
    create index seals_by_hash on seals (pdf_sha256);
    call fence('seals');
    call append_only('seals');

    -- The register: one line for each thing that happened to a document, chained by hashes.
    create table register_entries (
      organisation_id uuid not null references organisations,
      sequence bigint not null check (sequence >= 0),
      kind text not null check (kind in ('issued', 'sealed', 'replaced', 'withdrawn')),
      document_id uuid not null,
      -- Canonical JSON (RFC 8785); the hashes are over these very bytes.
      entry text not null,
      leaf_hash text not null check (leaf_hash = encode(sha256('\\x00'::bytea || convert_to(entry, 'UTF8')), 'hex')),
      chain_hash text not null check (chain_hash ~ '^[0-9a-f]{64}$'),
      written_at timestamptz not null,
      primary key (organisation_id, sequence),
      foreign key (organisation_id, document_id) references documents
    );
    create unique index one_of_a_kind on register_entries (organisation_id, document_id, kind);
    create index register_entries_by_document on register_entries (organisation_id, document_id);
    call fence('register_entries');
    call append_only('register_entries');

    -- Full subtrees of the register's Merkle tree, so that a proof reads a handful of rows however long the register is.
    create table register_nodes (
      organisation_id uuid not null references organisations,
      level integer not null check (level between 0 and 50),
      index bigint not null check (index >= 0),
      hash text not null check (hash ~ '^[0-9a-f]{64}$'),
      primary key (organisation_id, level, index)
    );
    call fence('register_nodes');
    call append_only('register_nodes');

    -- How far the register has come: locked by whoever appends. Peaks are the Merkle tree's roots of full subtrees.
    create table register_heads (
      organisation_id uuid primary key references organisations,
      size bigint not null default 0,
      chain_hash text not null,
      peaks jsonb not null default '[]'
    );
    call fence('register_heads');
    grant select, insert on register_heads to skerry_app;
    grant update (size, chain_hash, peaks) on register_heads to skerry_app;

    create table checkpoints (
      organisation_id uuid not null references organisations,
      size bigint not null,
      root text not null check (root ~ '^[0-9a-f]{64}$'),
      signed text not null,
      -- PEM of whoever signed: a later key does not take the proof away from an older checkpoint.
      certificate text not null,
      made_at timestamptz not null,
      primary key (organisation_id, size)
    );
    call fence('checkpoints');
    call append_only('checkpoints');

    -- The public check page knows a number or the hash of a file, and no organisation.
    create policy gate on documents to skerry_gate using (true);
    create policy gate on seals to skerry_gate using (true);
    create policy gate on organisations to skerry_gate using (true);
    create policy gate on reports to skerry_gate using (true);
    create policy gate on register_entries to skerry_gate using (true);
    grant select (organisation_id, document_id, number, report_id, issued_at, replaces) on documents to skerry_gate;
    grant select (organisation_id, document_id, pdf_sha256) on seals to skerry_gate;
    grant select (organisation_id, name) on organisations to skerry_gate;
    grant select (organisation_id, report_id, state) on reports to skerry_gate;
    grant select (organisation_id, document_id, kind, written_at) on register_entries to skerry_gate;

    create function public_document(wanted_number text, wanted_sha256 text)
      returns table (number text, organisation text, issued_at timestamptz, state text, replaced_by text, ended_at timestamptz, sealed boolean, pdf_sha256 text)
      language sql stable security definer set search_path = public
      as $$
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
    -- What the nightly check and the sweeper go through; each organisation's rows are then read in its own transaction.
    create function organisation_ids() returns setof uuid
      language sql stable security definer set search_path = public
      as $$ select organisation_id from organisations order by organisation_id $$;
    alter function organisation_ids() owner to skerry_gate;
    revoke all on function organisation_ids() from public;
    grant execute on function organisation_ids() to skerry_app;

    -- Tells an empty database from one that must not be seeded.
    create function any_organisation() returns boolean
      language sql stable security definer set search_path = public
      as $$ select exists (select from organisations) $$;
    alter function any_organisation() owner to skerry_gate;
    revoke all on function any_organisation() from public;
    grant execute on function any_organisation() to skerry_app;

    alter function public_document(text, text) owner to skerry_gate;
    revoke all on function public_document(text, text) from public;
    grant execute on function public_document(text, text) to skerry_app;
    create index documents_by_number on documents (number);
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
