import type { Knex } from 'knex'

/**
 * Three roles without sign-in. `skerry_app` holds what the running server may do; `skerry_gate` owns the few functions
 * that look something up before the organisation is known; `skerry_backup` reads everything for a dump. Roles belong to
 * the whole cluster, so another database may have made them already.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    do $$ begin
      perform pg_advisory_xact_lock(hashtext('skerry roles'));
      if not exists (select from pg_roles where rolname = 'skerry_app') then create role skerry_app nologin; end if;
      if not exists (select from pg_roles where rolname = 'skerry_gate') then create role skerry_gate nologin; end if;
      execute format('grant skerry_app, skerry_gate to %I', current_user);
      execute format('revoke all on database %I from public', current_database());
      execute format('grant connect on database %I to skerry_app', current_database());
    end $$;
    revoke create on schema public from public;
    grant usage on schema public to skerry_app, skerry_gate;
    grant create on schema public to skerry_gate;

    create function current_organisation() returns uuid language sql stable
      as $$ select nullif(current_setting('app.organisation', true), '')::uuid $$;

    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception '% is kept as it was written: % is refused', tg_table_name, tg_op using errcode = 'integrity_constraint_violation';
    end $$;

    -- Fences a table off by organisation, also against its owner.
    create procedure fence(subject regclass) language plpgsql as $$
    begin
      execute format('alter table %s enable row level security', subject);
      execute format('alter table %s force row level security', subject);
      execute format('create policy own_organisation on %s to skerry_app using (organisation_id = current_organisation()) with check (organisation_id = current_organisation())', subject);
    end $$;

    -- Makes a table append-only for everybody: rows can be added and read.
    create procedure append_only(subject regclass) language plpgsql as $$
    begin
      execute format('create trigger no_change before update or delete on %s for each row execute function refuse_change()', subject);
      execute format('create trigger no_truncate before truncate on %s for each statement execute function refuse_change()', subject);
      execute format('grant select, insert on %s to skerry_app', subject);
    end $$;
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
