import type { Knex } from 'knex'

const config: Knex.Config = {
  client: 'pg',
  connection: process.env['DATABASE_OWNER_URL'] ?? process.env['DATABASE_URL'] ?? '',
  pool: { min: 0, max: 1 },
  migrations: { directory: './migrations', extension: 'ts', loadExtensions: ['.ts'] },
  seeds: { directory: './seeds', extension: 'ts', loadExtensions: ['.ts'] },
}

export default config
