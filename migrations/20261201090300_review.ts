import type { Knex } from 'knex'

/** Review: threads of remarks that hold on to a block of the report, reviews that publish them together, acceptances. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table reviews (
      organisation_id uuid not null,
      review_id uuid not null default gen_random_uuid(),
      report_id uuid not null,
      revision integer not null,
      reviewer_id uuid not null,
      started_at timestamptz not null default now(),
      submitted_at timestamptz,
      decision text check (decision in ('remarks', 'returned', 'approved')),
      summary text check (length(summary) <= 4000),
      primary key (organisation_id, review_id),
      foreign key (organisation_id, report_id, revision) references revisions,
      foreign key (organisation_id, reviewer_id) references people,
      check ((submitted_at is null) = (decision is null))
    );
    create unique index one_open_review on reviews (organisation_id, report_id, reviewer_id) where submitted_at is null;
    create index reviews_by_report on reviews (organisation_id, report_id, started_at);
    call fence('reviews');
    grant select, insert on reviews to skerry_app;
    grant update (submitted_at, decision, summary, revision) on reviews to skerry_app;

    create table threads (
      organisation_id uuid not null,
      thread_id uuid not null default gen_random_uuid(),
      report_id uuid not null,
      -- Where it holds: an anchor of the document model, with the words that stood there.
      anchor text not null check (length(anchor) between 1 and 300),
      quoted text not null check (length(quoted) <= 2000),
      region jsonb,
      kind text not null check (kind in ('remark', 'question', 'correction')),
      state text not null default 'open' check (state in ('open', 'answered', 'resolved')),
      placement text not null default 'kept' check (placement in ('kept', 'changed', 'orphaned')),
      -- The revision it was opened on, and the newest one that it was carried to.
      opened_on integer not null,
      placed_on integer not null,
      opened_by uuid not null,
      assigned_to uuid,
      -- Until its review is submitted, a thread is seen by its author only.
      review_id uuid,
      published_at timestamptz,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      primary key (organisation_id, thread_id),
      foreign key (organisation_id, report_id) references reports,
      foreign key (organisation_id, opened_by) references people,
      foreign key (organisation_id, assigned_to) references people,
      foreign key (organisation_id, review_id) references reviews
    );
    create index threads_by_report on threads (organisation_id, report_id, created_at);
    create index threads_by_assignee on threads (organisation_id, assigned_to) where state <> 'resolved';
    call fence('threads');
    grant select, insert, delete on threads to skerry_app;
    grant update (anchor, quoted, region, kind, state, placement, placed_on, assigned_to, published_at, version) on threads to skerry_app;

    create table remarks (
      organisation_id uuid not null,
      remark_id uuid not null default gen_random_uuid(),
      thread_id uuid not null,
      -- Several may be written in one moment.
      sequence bigint generated always as identity,
      author_id uuid not null,
      body text not null check (length(body) between 1 and 4000),
      review_id uuid,
      published_at timestamptz,
      created_at timestamptz not null default now(),
      primary key (organisation_id, remark_id),
      foreign key (organisation_id, thread_id) references threads on delete cascade,
      foreign key (organisation_id, author_id) references people,
      foreign key (organisation_id, review_id) references reviews
    );
    create index remarks_by_thread on remarks (organisation_id, thread_id, sequence);
    call fence('remarks');
    grant select, insert, delete on remarks to skerry_app;
    grant update (body, published_at) on remarks to skerry_app;

    -- A published remark stays as it was said.
    create function keep_published() returns trigger language plpgsql as $$
    begin
      if old.published_at is not null and (tg_op = 'DELETE' or to_jsonb(new) - array['state', 'placement', 'placed_on', 'anchor', 'quoted', 'assigned_to', 'version'] is distinct from to_jsonb(old) - array['state', 'placement', 'placed_on', 'anchor', 'quoted', 'assigned_to', 'version']) then
        raise exception 'a published remark stays as it was said' using errcode = 'integrity_constraint_violation';
      end if;
      return coalesce(new, old);
    end $$;
    create trigger keep_published before update or delete on remarks for each row execute function keep_published();
    create trigger keep_published before update or delete on threads for each row execute function keep_published();

    -- Each departure and each limitation is accepted or refused one by one; the newest row counts.
    create table acceptances (
      organisation_id uuid not null,
      acceptance_id uuid not null default gen_random_uuid(),
      report_id uuid not null,
      revision integer not null,
      anchor text not null check (length(anchor) between 1 and 300),
      sequence bigint generated always as identity,
      -- The words that were accepted: other words in a later revision must be decided again.
      words text not null,
      words_sha256 text not null check (words_sha256 = encode(sha256(convert_to(words, 'UTF8')), 'hex')),
      accepted boolean not null,
      reason text not null default '' check (length(reason) <= 2000),
      decided_by uuid not null,
      decided_at timestamptz not null default now(),
      primary key (organisation_id, acceptance_id),
      foreign key (organisation_id, report_id, revision) references revisions,
      foreign key (organisation_id, decided_by) references people,
      check (accepted or reason <> '')
    );
    create index acceptances_by_report on acceptances (organisation_id, report_id, sequence);
    call fence('acceptances');
    call append_only('acceptances');

    -- Four eyes, as the last wall: core/policy/can.ts decides before, and a way past it ends here.
    create function folded(words text) returns text language sql immutable
      as $$ select lower(regexp_replace(btrim(normalize(words, nfkc)), '\\s+', ' ', 'g')) $$;
    create function had_a_hand(in_organisation uuid, in_report uuid, who uuid) returns boolean language sql stable as $$
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
    create function check_second_person() returns trigger language plpgsql as $$
    declare who uuid := (to_jsonb(new) ->> tg_argv[0])::uuid;
    begin
      if had_a_hand(new.organisation_id, new.report_id, who) then
        raise exception 'who uploaded, installed or tested cannot decide on the report' using errcode = 'check_violation';
      end if;
      return new;
    end $$;
    create trigger second_person before insert or update on reviews for each row execute function check_second_person('reviewer_id');
    create trigger second_person before insert on acceptances for each row execute function check_second_person('decided_by');

    create function check_approval() returns trigger language plpgsql as $$
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
    create trigger check_approval before update on reports for each row execute function check_approval();
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
