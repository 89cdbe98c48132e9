import type { Knex } from 'knex'

/** Who did what, in the same transaction as the deed, chained by hashes. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table audit_heads (
      organisation_id uuid primary key references organisations,
      last bigint not null default 0,
      hash text not null default ''
    );
    call fence('audit_heads');

    create table audit_events (
      organisation_id uuid not null references organisations,
      sequence bigint not null,
      at timestamptz not null,
      person_id uuid,
      action text not null check (length(action) between 1 and 60),
      subject text not null check (length(subject) <= 200),
      -- Canonical JSON of the whole event; the hash is over the previous hash and these very bytes.
      body text not null,
      hash text not null,
      primary key (organisation_id, sequence)
    );
    create index audit_events_by_subject on audit_events (organisation_id, subject, sequence desc);
    create index audit_events_by_person on audit_events (organisation_id, person_id, sequence desc);
    call fence('audit_events');
    call append_only('audit_events');
    revoke insert on audit_events from skerry_app;
    grant insert (organisation_id, at, person_id, action, subject, body) on audit_events to skerry_app;
    grant select, insert on audit_heads to skerry_gate;
    grant update (last, hash) on audit_heads to skerry_gate;
    create policy gate on audit_heads to skerry_gate using (true) with check (true);
    grant select on audit_heads to skerry_app;

    -- The head row is locked until the transaction ends: one event after the other in an organisation, no gap, no fork.
    create function chain_audit_event() returns trigger language plpgsql security definer set search_path = public as $$
    declare head audit_heads;
    begin
      insert into audit_heads (organisation_id) values (new.organisation_id) on conflict do nothing;
      select * into head from audit_heads where organisation_id = new.organisation_id for update;
      new.sequence := head.last + 1;
      new.hash := encode(sha256(convert_to(head.hash || new.body, 'UTF8')), 'hex');
      update audit_heads set last = new.sequence, hash = new.hash where organisation_id = new.organisation_id;
      return new;
    end $$;
    alter function chain_audit_event() owner to skerry_gate;
    create trigger chain before insert on audit_events for each row execute function chain_audit_event();
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
