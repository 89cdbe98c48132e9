import type { Knex } from 'knex'

/** Answers kept under the key that a client sent with its request, so that sending again does nothing twice. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table idempotency_keys (
      organisation_id uuid not null,
      person_id uuid not null,
      key text not null check (length(key) between 8 and 200),
      request_sha256 text not null,
      status integer not null,
      headers jsonb not null,
      body text not null,
      created_at timestamptz not null default now(),
      primary key (organisation_id, person_id, key),
      foreign key (organisation_id, person_id) references people
    );
    create index idempotency_keys_by_age on idempotency_keys (created_at);
    call fence('idempotency_keys');
    grant select, insert, delete on idempotency_keys to skerry_app;

    create table rate_limits (
      key text primary key,
      points integer not null default 0,
      expire bigint
    );
    grant select, insert, update, delete on rate_limits to skerry_app;
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
