import type { Knex } from 'knex'

/** Instruments and operators' conditions, with history: what an old report leaned on can still be read. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table instruments (
      organisation_id uuid not null references organisations,
      instrument_id uuid not null default gen_random_uuid(),
      serial text not null check (length(serial) between 1 and 100),
      version integer not null default 1,
      retired_at timestamptz,
      created_at timestamptz not null default now(),
      primary key (organisation_id, instrument_id),
      unique (organisation_id, serial)
    );
    call fence('instruments');
    grant select, insert on instruments to skerry_app;
    grant update (version, retired_at) on instruments to skerry_app;

    create table instrument_versions (
      organisation_id uuid not null,
      instrument_id uuid not null,
      version integer not null,
      kind text not null check (length(kind) between 1 and 100),
      calibrated_on date not null,
      due_on date not null,
      certificate text not null default '' check (length(certificate) <= 100),
      uncertainty jsonb not null default '{}',
      note text not null default '' check (length(note) <= 2000),
      written_by uuid not null,
      written_at timestamptz not null default now(),
      primary key (organisation_id, instrument_id, version),
      foreign key (organisation_id, instrument_id) references instruments,
      foreign key (organisation_id, written_by) references people,
      check (calibrated_on < due_on)
    );
    create index instrument_versions_by_due on instrument_versions (organisation_id, due_on);
    call fence('instrument_versions');
    call append_only('instrument_versions');

    create table conditions (
      organisation_id uuid not null references organisations,
      condition_id uuid not null default gen_random_uuid(),
      operator text not null check (length(operator) between 1 and 200),
      version integer not null default 1,
      created_at timestamptz not null default now(),
      primary key (organisation_id, condition_id),
      unique (organisation_id, operator)
    );
    call fence('conditions');
    grant select, insert on conditions to skerry_app;
    grant update (version) on conditions to skerry_app;

    create table condition_versions (
      organisation_id uuid not null,
      condition_id uuid not null,
      version integer not null,
      separation text not null check (separation in ('all poles', 'line poles', 'not stated')),
      stated_in text not null check (length(stated_in) between 1 and 300),
      valid_from date not null,
      note text not null default '' check (length(note) <= 4000),
      written_by uuid not null,
      written_at timestamptz not null default now(),
      primary key (organisation_id, condition_id, version),
      foreign key (organisation_id, condition_id) references conditions,
      foreign key (organisation_id, written_by) references people
    );
    call fence('condition_versions');
    call append_only('condition_versions');
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
