import createKnex, { type Knex } from 'knex'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type House, openHouse } from '#tests/server/house.ts'

let house: House
let owner: Knex

beforeAll(async () => {
  house = await openHouse()
  owner = createKnex({ client: 'pg', connection: house.addresses.owner, pool: { min: 0, max: 1 } })
})
afterAll(async () => {
  await owner.destroy()
  await house.close()
})

async function rows<Row>(sql: string): Promise<Row[]> {
  const answer = await owner.raw<{ rows: Row[] }>(sql)
  return answer.rows
}

const TENANT_TABLES = `
  select c.oid, c.relname as name, c.relrowsecurity as secured, c.relforcerowsecurity as forced,
         (select count(*) from pg_policy p where p.polrelid = c.oid)::integer as policies
  from pg_class c join pg_namespace n on n.oid = c.relnamespace
  where n.nspname = 'public' and c.relkind in ('r', 'p')
    and exists (select from pg_attribute a where a.attrelid = c.oid and a.attname = 'organisation_id' and not a.attisdropped)
  order by c.relname`

/** Tables of the whole installation, each with the reason why no organisation stands in it. */
const SHARED: Readonly<Record<string, string>> = {
  sessions: 'looked up by a hash that only the cookie’s holder can make, before the organisation is known',
  rate_limits: 'counts requests by person or address, also of people who are not signed in',
  knex_migrations: 'of the migrator',
  knex_migrations_lock: 'of the migrator',
}

/** Keys that are unique over all organisations, each with its reason. */
const UNIQUE_EVERYWHERE: Readonly<Record<string, string>> = {
  organisations_mark_key: 'begins every number that the organisation issues, so it is public and must be unique',
}

describe('the fence between organisations', () => {
  it('stands around every table that holds an organisation’s rows, also against the owner', async () => {
    const tables = await rows<{ name: string; secured: boolean; forced: boolean; policies: number }>(TENANT_TABLES)
    expect(tables.length).toBeGreaterThan(20)
    for (const table of tables) {
      expect(table, table.name).toMatchObject({ secured: true, forced: true })
      expect(table.policies, table.name).toBeGreaterThan(0)
    }
  })

  it('leaves out only the tables that are known to be shared', async () => {
    const open = await rows<{ name: string }>(`
      select c.relname as name from pg_class c join pg_namespace n on n.oid = c.relnamespace
      where n.nspname = 'public' and c.relkind in ('r', 'p')
        and not exists (select from pg_attribute a where a.attrelid = c.oid and a.attname = 'organisation_id' and not a.attisdropped)`)
    expect(open.map(({ name }) => name).sort()).toEqual(Object.keys(SHARED).sort())
  })

  it('runs through every unique key: what another house holds can never be told from an error', async () => {
    const keys = await rows<{ name: string; columns: string[] }>(`
      select i.relname as name, array(
        select a.attname::text from unnest(x.indkey::smallint[]) with ordinality as k(number, place)
        join pg_attribute a on a.attrelid = x.indrelid and a.attnum = k.number order by k.place) as columns
      from pg_index x join pg_class i on i.oid = x.indexrelid join (${TENANT_TABLES}) t on t.oid = x.indrelid
      where x.indisunique`)
    expect(keys.length).toBeGreaterThan(25)
    const offenders = keys.filter(
      ({ name, columns }) => columns[0] !== 'organisation_id' && !(name in UNIQUE_EVERYWHERE),
    )
    expect(offenders).toEqual([])
  })

  it('runs through every foreign key: no row points into another house', async () => {
    const keys = await rows<{ name: string; columns: string[]; target: string }>(`
      select c.conname as name, t.name as source, c.confrelid::regclass::text as target, array(
        select a.attname::text from unnest(c.conkey) with ordinality as k(number, place)
        join pg_attribute a on a.attrelid = c.conrelid and a.attnum = k.number order by k.place) as columns
      from pg_constraint c join (${TENANT_TABLES}) t on t.oid = c.conrelid
      where c.contype = 'f'`)
    expect(keys.length).toBeGreaterThan(30)
    expect(keys.filter(({ columns }) => columns[0] !== 'organisation_id')).toEqual([])
  })

  it('is not gone round by a view, and functions with rights of their own are the known ones', async () => {
    const views = await rows(
      `select relname from pg_class c join pg_namespace n on n.oid = c.relnamespace where n.nspname = 'public' and c.relkind in ('v', 'm')`,
    )
    expect(views).toEqual([])
    const functions = await rows<{ name: string; owner: string; settings: string[] | null }>(`
      select p.proname as name, r.rolname as owner, p.proconfig as settings
      from pg_proc p join pg_namespace n on n.oid = p.pronamespace join pg_roles r on r.oid = p.proowner
      where n.nspname = 'public' and p.prosecdef order by p.proname`)
    for (const made of functions) {
      expect(made.owner, made.name).toBe('skerry_gate')
      expect(made.settings, made.name).toContain('search_path=public')
    }
    expect(functions.map(({ name }) => name)).toEqual(
      expect.arrayContaining(['chain_audit_event', 'public_document', 'sign_in_candidates']),
    )
  })
})

describe('the role of the running server', () => {
  it('owns nothing and is bound by row-level security', async () => {
    const [role] = await rows<Record<string, boolean>>(
      `select rolsuper, rolbypassrls, rolcreatedb, rolcreaterole from pg_roles where rolname = 'skerry_app'`,
    )
    expect(role).toEqual({ rolsuper: false, rolbypassrls: false, rolcreatedb: false, rolcreaterole: false })
    const owned = await rows(`
      select relname as name from pg_class where relowner in ('skerry_app'::regrole, 'skerry_web'::regrole)
      union all select proname from pg_proc where proowner in ('skerry_app'::regrole, 'skerry_web'::regrole)
      union all select nspname from pg_namespace where nspowner in ('skerry_app'::regrole, 'skerry_web'::regrole)`)
    expect(owned).toEqual([])
  })

  it('sees nothing while no organisation is set', async () => {
    const tables = await rows<{ name: string }>(TENANT_TABLES)
    await house.organisation()
    for (const { name } of tables) {
      const found = await house.services.db(name).count('* as count').first()
      expect(found, name).toEqual({ count: 0 })
    }
  })
})
