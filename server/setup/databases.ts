import createKnex, { type Knex } from 'knex'
import { migrate } from '#server/migrate.ts'
import { ownerConfig } from './owner.ts'

/** The roles that sign in at a cluster of our own. The owner migrates, the web serves, the backup reads everything. */
const OWNER = 'skerry_owner'
const WEB = 'skerry_web'
const BACKUP = 'skerry_backup'

export interface Addresses {
  readonly owner: string
  readonly web: string
  readonly backup: string
}

async function withKnex<T>(url: string, work: (db: Knex) => Promise<T>): Promise<T> {
  const db = createKnex(ownerConfig(url))
  try {
    return await work(db)
  } finally {
    await db.destroy()
  }
}

/** The address of another role or database of the same cluster; roles share the administrator's secret on loopback. */
export function addressFor(admin: string, database: string, role?: string): string {
  const url = new URL(admin)
  url.pathname = `/${database}`
  if (role !== undefined) url.username = role
  return url.href
}

export const addressesOf = (admin: string, database: string): Addresses => ({
  owner: addressFor(admin, database, OWNER),
  web: addressFor(admin, database, WEB),
  backup: addressFor(admin, database, BACKUP),
})

async function ensureRoles(admin: Knex, secret: string): Promise<void> {
  await admin.raw(`
    do $$ begin
      if not exists (select from pg_roles where rolname = 'skerry_app') then create role skerry_app nologin; end if;
      if not exists (select from pg_roles where rolname = '${OWNER}') then create role ${OWNER} login createrole; end if;
      if not exists (select from pg_roles where rolname = '${BACKUP}') then create role ${BACKUP} login bypassrls in role pg_read_all_data; end if;
      if not exists (select from pg_roles where rolname = '${WEB}') then create role ${WEB} login in role skerry_app; end if;
    end $$`)
  for (const role of [OWNER, WEB, BACKUP])
    await admin.raw(`alter role ${role} password '${secret.replaceAll("'", "''")}'`)
}

async function ensureDatabase(admin: Knex, database: string): Promise<void> {
  const { rows } = await admin.raw<{ rows: unknown[] }>('select 1 from pg_database where datname = ?', [database])
  if (rows.length === 0) await admin.raw('create database ?? owner ??', [database, OWNER])
}

/**
 * Makes roles and a database in a cluster of our own, and migrates it.
 *
 * @param admin the address of the cluster's administrator
 */
export async function prepareDatabase(admin: string, database: string): Promise<Addresses> {
  await withKnex(admin, async (db) => {
    await ensureRoles(db, decodeURIComponent(new URL(admin).password))
    await ensureDatabase(db, database)
  })
  const addresses = addressesOf(admin, database)
  await withKnex(addresses.owner, migrate)
  await withKnex(admin, (db) => db.raw('grant connect on database ?? to skerry_backup', [database]))
  return addresses
}

/** An empty database that a backup can be restored into. */
export async function emptyDatabase(admin: string, database: string): Promise<Addresses> {
  await withKnex(admin, async (db) => {
    await ensureRoles(db, decodeURIComponent(new URL(admin).password))
    await ensureDatabase(db, database)
    await db.raw(`do $$ begin
      if not exists (select from pg_roles where rolname = 'skerry_gate') then create role skerry_gate nologin; end if;
      grant skerry_app, skerry_gate to skerry_owner;
    end $$`)
    await db.raw('grant connect on database ?? to skerry_app, skerry_backup', [database])
  })
  return addressesOf(admin, database)
}

/** A copy of a database that nobody is connected to. */
export async function cloneDatabase(admin: string, template: string, database: string): Promise<Addresses> {
  await withKnex(admin, async (db) => {
    await db.raw('create database ?? template ?? owner ??', [database, template, OWNER])
    await db.raw('grant connect on database ?? to skerry_app, skerry_backup', [database])
  })
  return addressesOf(admin, database)
}

export async function dropDatabase(admin: string, database: string): Promise<void> {
  await withKnex(admin, (db) => db.raw('drop database if exists ?? with (force)', [database]))
}
