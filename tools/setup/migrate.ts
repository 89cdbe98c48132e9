// Brings the database that DATABASE_OWNER_URL (or DATABASE_URL) names to this version.
import createKnex from 'knex'
import { readEnv } from '#server/env.ts'
import { migrate } from '#server/migrate.ts'
import { ownerConfig } from '#server/setup/owner.ts'

const read = readEnv(process.env)
if (!read.ok) {
  process.stderr.write(`${read.problems.join('\n')}\n`)
  process.exit(2)
}
const owner = createKnex(ownerConfig(read.env.DATABASE_OWNER_URL))
try {
  await migrate(owner)
  process.stdout.write('The database is up to date.\n')
} finally {
  await owner.destroy()
}
