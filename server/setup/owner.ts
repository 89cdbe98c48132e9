import { fileURLToPath } from 'node:url'
import type { Knex } from 'knex'

interface Connection {
  query(sql: string, done: (error: Error | null) => void): void
}

/** A migration that waits for a lock keeps everybody else waiting behind it: it gives up after 5 s and can be started again. */
const LIMITS = "set lock_timeout = '5s'; set statement_timeout = '10min'"

const folder = (name: string): string => fileURLToPath(new URL(`../../${name}`, import.meta.url))

/** How the owner of a database connects to migrate and to seed it. */
export const ownerConfig = (url: string): Knex.Config => ({
  client: 'pg',
  connection: url,
  pool: {
    min: 0,
    max: 2,
    afterCreate: (connection: Connection, done: (error: Error | null, connection: Connection) => void) =>
      connection.query(LIMITS, (error) => done(error, connection)),
  },
  migrations: { directory: folder('migrations'), extension: 'ts', loadExtensions: ['.ts'] },
  seeds: { directory: folder('seeds'), extension: 'ts', loadExtensions: ['.ts'] },
})
