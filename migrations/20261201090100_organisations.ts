import type { Knex } from 'knex'

/** Organisations, their people, and what lets people in. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table organisations (
      organisation_id uuid primary key default gen_random_uuid(),
      name text not null check (length(name) between 1 and 200),
      address text not null default '' check (length(address) <= 500),
      -- Begins every number that the organisation issues, so it is public and unique.
      mark text not null unique check (mark ~ '^[A-Z][A-Z0-9]{1,7}$'),
      settings jsonb not null default '{}',
      version integer not null default 1,
      created_at timestamptz not null default now()
    );
    call fence('organisations');
    grant select, insert on organisations to skerry_app;
    grant update (name, address, settings, version) on organisations to skerry_app;

    create table people (
      organisation_id uuid not null references organisations,
      person_id uuid not null default gen_random_uuid(),
      email text not null check (length(email) between 3 and 254 and email = lower(email)),
      name text not null check (length(name) between 1 and 200),
      licence text check (length(licence) <= 100),
      roles text[] not null check (roles <@ array['installer', 'reviewer', 'auditor', 'administrator']),
      password_hash text,
      totp_secret text,
      totp_last_step bigint,
      recovery_hashes text[] not null default '{}',
      mail_switches jsonb not null default '{}',
      active boolean not null default true,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      primary key (organisation_id, person_id),
      unique (organisation_id, email)
    );
    create index people_by_email on people (email);
    create index people_by_id on people (person_id);
    call fence('people');
    grant select, insert, update on people to skerry_app;

    -- Invitations and password resets: the token itself is in the mail only.
    create table links (
      organisation_id uuid not null,
      token_hash text not null check (token_hash ~ '^[0-9a-f]{64}$'),
      person_id uuid not null,
      purpose text not null check (purpose in ('invitation', 'reset')),
      expires_at timestamptz not null,
      used_at timestamptz,
      created_at timestamptz not null default now(),
      primary key (organisation_id, token_hash),
      foreign key (organisation_id, person_id) references people
    );
    create index links_by_token on links (token_hash);
    create index links_by_person on links (organisation_id, person_id);
    call fence('links');
    grant select, insert on links to skerry_app;
    grant update (used_at) on links to skerry_app;

    -- Machine access: shown once, kept as a hash.
    create table tokens (
      organisation_id uuid not null,
      token_id uuid not null default gen_random_uuid(),
      person_id uuid not null,
      name text not null check (length(name) between 1 and 100),
      token_hash text not null check (token_hash ~ '^[0-9a-f]{64}$'),
      hint text not null,
      scopes text[] not null check (scopes <@ array['report.read', 'report.send']),
      expires_at timestamptz not null,
      revoked_at timestamptz,
      last_used_at timestamptz,
      created_at timestamptz not null default now(),
      primary key (organisation_id, token_id),
      unique (organisation_id, token_hash),
      foreign key (organisation_id, person_id) references people
    );
    create index tokens_by_hash on tokens (token_hash);
    create index tokens_by_person on tokens (organisation_id, person_id);
    call fence('tokens');
    grant select, insert on tokens to skerry_app;
    grant update (revoked_at, last_used_at) on tokens to skerry_app;

    -- Sessions are looked up before the organisation is known; the key is a hash that only the cookie's holder can make.
    create table sessions (
      sid text primary key,
      sess jsonb not null,
      expire timestamptz(6) not null,
      person_id uuid generated always as ((sess ->> 'person')::uuid) stored,
      seen_at timestamptz not null default now()
    );
    create index sessions_by_expiry on sessions (expire);
    create index sessions_by_person on sessions (person_id);
    grant select, insert, update, delete on sessions to skerry_app;

    -- What may be looked up before the organisation is known, and nothing more.
    create policy gate on people to skerry_gate using (true);
    create policy gate on links to skerry_gate using (true);
    create policy gate on tokens to skerry_gate using (true);
    grant select (organisation_id, person_id, email, password_hash, totp_secret, active) on people to skerry_gate;
    grant select (organisation_id, token_hash, person_id, purpose, expires_at, used_at) on links to skerry_gate;
    grant select (organisation_id, token_id, person_id, token_hash, scopes, expires_at, revoked_at, last_used_at) on tokens to skerry_gate;

    create function sign_in_candidates(address text)
      returns table (organisation_id uuid, person_id uuid, password_hash text)
      language sql stable security definer set search_path = public
      as $$ select p.organisation_id, p.person_id, p.password_hash from people p
            where p.email = lower(address) and p.active and p.password_hash is not null
            order by p.person_id limit 5 $$;
    create function link_holder(hash text, moment timestamptz)
      returns table (organisation_id uuid, person_id uuid, purpose text)
      language sql stable security definer set search_path = public
      as $$ select l.organisation_id, l.person_id, l.purpose from links l
            where l.token_hash = hash and l.used_at is null and l.expires_at > moment $$;
    create function token_holder(hash text, moment timestamptz)
      returns table (organisation_id uuid, person_id uuid, token_id uuid, scopes text[], last_used_at timestamptz)
      language sql stable security definer set search_path = public
      as $$ select t.organisation_id, t.person_id, t.token_id, t.scopes, t.last_used_at from tokens t
            where t.token_hash = hash and t.revoked_at is null and t.expires_at > moment $$;
    create function people_with_address(address text)
      returns table (organisation_id uuid, person_id uuid)
      language sql stable security definer set search_path = public
      as $$ select p.organisation_id, p.person_id from people p
            where p.email = lower(address) and p.active order by p.person_id limit 5 $$;
    alter function sign_in_candidates(text) owner to skerry_gate;
    alter function link_holder(text, timestamptz) owner to skerry_gate;
    alter function token_holder(text, timestamptz) owner to skerry_gate;
    alter function people_with_address(text) owner to skerry_gate;
    revoke all on function sign_in_candidates(text), link_holder(text, timestamptz), token_holder(text, timestamptz), people_with_address(text) from public;
    grant execute on function sign_in_candidates(text), link_holder(text, timestamptz), token_holder(text, timestamptz), people_with_address(text) to skerry_app;
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
