import type { Knex } from 'knex'

/** Mails to be sent, written in the same transaction as what they tell of. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table mails (
      organisation_id uuid not null references organisations,
      mail_id uuid not null default gen_random_uuid(),
      -- One mail for one event and one person, however often the event is handled.
      dedupe_key text not null check (length(dedupe_key) between 1 and 200),
      message_id text not null,
      kind text not null,
      to_address text not null,
      to_person uuid,
      subject text not null,
      text_body text not null,
      html_body text not null,
      state text not null default 'waiting' check (state in ('waiting', 'sent', 'kept', 'refused')),
      attempts integer not null default 0,
      last_answer text,
      created_at timestamptz not null default now(),
      sent_at timestamptz,
      primary key (organisation_id, mail_id),
      unique (organisation_id, dedupe_key),
      foreign key (organisation_id, to_person) references people
    );
    create index mails_by_time on mails (organisation_id, created_at desc, mail_id desc);
    call fence('mails');
    grant select, insert on mails to skerry_app;
    grant update (state, attempts, last_answer, sent_at) on mails to skerry_app;
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
