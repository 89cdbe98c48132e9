import createKnex, { type Knex } from 'knex'
import pg from 'pg'

// A calendar date has no time zone: pg would turn it into a local moment.
pg.types.setTypeParser(pg.types.builtins.DATE, (text) => text)
// Counters stay well below 2^53; pg would hand them out as text.
pg.types.setTypeParser(pg.types.builtins.INT8, Number)

/** The group role that holds every right of the running server. It owns nothing. */
export const APP_ROLE = 'skerry_app'

export interface DatabaseOptions {
  readonly url: string
  readonly pool: number
  /** Shown in `pg_stat_activity`. */
  readonly name: string
  /** Time limits in ms. */
  readonly statementTimeout?: number
  readonly acquireTimeout?: number
}

interface Connection {
  query(sql: string, done: (error: Error | null) => void): void
}

const nothing = (): void => undefined
/** What Knex would print beside our log lines is thrown as well, and told where it is caught. */
const QUIET = { warn: nothing, error: nothing, debug: nothing, deprecate: nothing }

/**
 * A pool whose every connection acts as the group role of the running server, whatever role it signed in as.
 *
 * Limits: a statement 15 s, a lock 5 s, an idle transaction 15 s, waiting for a free connection 3 s.
 */
export function openDatabase({
  url,
  pool,
  name,
  statementTimeout = 15_000,
  acquireTimeout = 3_000,
}: DatabaseOptions): Knex {
  const settings = `set role ${APP_ROLE}; set statement_timeout = ${statementTimeout}; set lock_timeout = 5000; set idle_in_transaction_session_timeout = 15000; set timezone = 'UTC'`
  return createKnex({
    client: 'pg',
    log: QUIET,
    connection: { connectionString: url, application_name: name, connectionTimeoutMillis: acquireTimeout },
    pool: {
      min: 0,
      max: pool,
      acquireTimeoutMillis: acquireTimeout,
      afterCreate: (connection: Connection, done: (error: Error | null, connection: Connection) => void) =>
        connection.query(settings, (error) => done(error, connection)),
    },
  })
}

/** A transaction in which row-level security shows exactly one organisation. Queries take it as their first parameter. */
export type Tx = Knex.Transaction

const RETRIES = 3
/** Serialisation failure and deadlock: the work may be done again from the start. */
const AGAIN = new Set(['40001', '40P01'])

const codeOf = (error: unknown): string | undefined =>
  typeof error === 'object' && error !== null && 'code' in error && typeof error.code === 'string'
    ? error.code
    : undefined

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/

/** An id as it stands in a statement without parameters, which alone can be sent together with others. */
export function uuidLiteral(id: string): string {
  if (!UUID.test(id)) throw new TypeError('This is not the id of anything.')
  return `'${id}'::uuid`
}

/** The statement that shows a transaction one organisation's rows. */
export const showing = (organisation: string): string =>
  `select set_config('app.organisation', (${uuidLiteral(organisation)})::text, true)`

async function once<T>(db: Knex, organisation: string | null, work: (tx: Tx) => Promise<T>): Promise<T> {
  return await db.transaction(async (tx) => {
    if (organisation !== null) await tx.raw(showing(organisation))
    return await work(tx)
  })
}

/**
 * Runs work in one transaction that sees one organisation's rows, and no others.
 *
 * @param organisation the organisation's id; taken from the session, a token or a job, never from what a client sends
 * @param work is started again, at most three times, when the database asks for it (deadlock, serialisation)
 */
export async function inOrganisation<T>(db: Knex, organisation: string, work: (tx: Tx) => Promise<T>): Promise<T> {
  return await retried(() => once(db, organisation, work))
}

/**
 * Reads in one transaction. Nothing depends on how it ends, so nobody waits for that.
 *
 * @param failed is told when ending it went wrong; the pool replaces the connection
 */
export async function reading<T>(db: Knex, work: (tx: Tx) => Promise<T>, failed: (error: unknown) => void): Promise<T> {
  const tx = await db.transaction({ readOnly: true })
  try {
    return await work(tx)
  } finally {
    tx.rollback().catch(failed)
  }
}

/** Runs work in a transaction that may be started again; what it may see, it chooses itself. */
export async function writing<T>(db: Knex, work: (tx: Tx) => Promise<T>): Promise<T> {
  return await retried(() => db.transaction(work))
}

/** Runs work in a transaction that sees no organisation's rows: only what the gate functions hand out. */
export async function outside<T>(db: Knex, work: (tx: Tx) => Promise<T>): Promise<T> {
  return await retried(() => once(db, null, work))
}

async function retried<T>(attempt: () => Promise<T>): Promise<T> {
  for (let left = RETRIES; ; left--) {
    try {
      return await attempt()
    } catch (error) {
      if (left === 0 || !AGAIN.has(codeOf(error) ?? '')) throw error
      await new Promise((resolve) => setTimeout(resolve, Math.random() * 50))
    }
  }
}

interface PlainConnection {
  query(text: string, values?: unknown[]): Promise<{ rows: unknown[]; rowCount: number }>
}

/** Runs a statement with numbered placeholders, for libraries that write their own; in a transaction it is part of it. */
export async function plainQuery(
  db: Knex | Tx,
  text: string,
  values?: unknown[],
): Promise<{ rows: unknown[]; rowCount: number }> {
  const connection: PlainConnection = await db.client.acquireConnection()
  try {
    return await connection.query(text, values)
  } finally {
    if (!db.isTransaction) await db.client.releaseConnection(connection)
  }
}
