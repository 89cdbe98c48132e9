import type { Knex } from 'knex'

/** Reports and their revisions: each upload of the file, kept as it came. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create extension if not exists pg_trgm;

    create table reports (
      organisation_id uuid not null references organisations,
      report_id uuid not null default gen_random_uuid(),
      state text not null default 'draft'
        check (state in ('draft', 'in review', 'returned', 'approved', 'issued', 'replaced', 'withdrawn')),
      -- What the newest revision says, lifted for lists and search.
      reference text not null,
      title text not null,
      place text not null default '',
      operator text not null default '',
      purpose text,
      inspected_on date,
      due_on date,
      outcome text not null,
      revision integer not null default 1 check (revision >= 1),
      number text,
      corrects uuid,
      correction_reason text check (length(correction_reason) <= 2000),
      created_by uuid not null,
      reviewer_id uuid,
      discarded_at timestamptz,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      search text generated always as (lower(reference || ' ' || title || ' ' || place || ' ' || operator || ' ' || coalesce(number, ''))) stored,
      primary key (organisation_id, report_id),
      unique (organisation_id, number),
      foreign key (organisation_id, created_by) references people,
      foreign key (organisation_id, reviewer_id) references people,
      foreign key (organisation_id, corrects) references reports,
      check (corrects is null or correction_reason is not null),
      check ((number is null) = (state in ('draft', 'in review', 'returned', 'approved')))
    );
    create index reports_by_update on reports (organisation_id, updated_at desc, report_id desc) where discarded_at is null;
    create index reports_by_state on reports (organisation_id, state, updated_at desc, report_id desc) where discarded_at is null;
    create index reports_by_reference on reports (organisation_id, reference);
    create index reports_by_due on reports (organisation_id, due_on) where state = 'issued';
    create index reports_by_search on reports using gin (search gin_trgm_ops);
    -- One correction at a time.
    create unique index reports_by_corrected on reports (organisation_id, corrects) where corrects is not null and discarded_at is null;
    call fence('reports');
    grant select, insert on reports to skerry_app;
    grant update (state, reference, title, place, operator, purpose, inspected_on, due_on, outcome, revision, number, reviewer_id, discarded_at, version, updated_at)
      on reports to skerry_app;

    -- The state machine of core/policy/states.ts, as the last wall.
    create function check_report_step() returns trigger language plpgsql as $$
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
    create trigger check_step before update on reports for each row execute function check_report_step();

    create table revisions (
      organisation_id uuid not null,
      report_id uuid not null,
      revision integer not null check (revision >= 1),
      -- The bytes as they were uploaded.
      source bytea not null check (length(source) between 1 and 1048576),
      sha256 text not null check (sha256 = encode(sha256(source), 'hex')),
      file_name text not null check (length(file_name) between 1 and 200),
      uploaded_by uuid not null,
      uploaded_at timestamptz not null default now(),
      -- What the judgement leaned on, for doing it again years later.
      rulebook_id text not null,
      rulebook_version text not null,
      rulebook_hash text not null,
      software text not null,
      outcome text not null,
      counts jsonb not null,
      -- Who installed and tested, as the file names them.
      workers jsonb not null,
      primary key (organisation_id, report_id, revision),
      foreign key (organisation_id, report_id) references reports,
      foreign key (organisation_id, uploaded_by) references people
    );
    create index revisions_by_hash on revisions (organisation_id, sha256);
    call fence('revisions');
    call append_only('revisions');
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
