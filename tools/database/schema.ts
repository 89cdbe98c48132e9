import { spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { postgresBin } from '#tools/setup/postgres.mjs'

/** Where the committed dump is: the schema that all migrations together make. */
export const SCHEMA_FILE = 'migrations/schema.sql'

const HEAD = `-- The schema that all migrations together make. Written by: npm run schema
-- Read it to see what a migration really does; a test holds it to the migrations.
`

/** Lines that differ from one server or run to the next, and say nothing. */
const NOISE = /^(--.*|SET .*|SELECT pg_catalog\.set_config.*|\\(un)?restrict .*)?$/

/** The schema of a migrated database as SQL, without the tables that libraries make for themselves. */
export function dumpSchema(url: string): string {
  const dumped = spawnSync(
    join(postgresBin(), 'pg_dump'),
    ['--schema-only', '--no-owner', '--schema=public', '--exclude-table=knex_*', url],
    { encoding: 'utf8', maxBuffer: 1 << 26 },
  )
  if (dumped.status !== 0) throw new Error(`pg_dump failed:\n${dumped.stderr}`)
  const lines = dumped.stdout.split('\n').filter((line) => !NOISE.test(line))
  return `${HEAD}\n${lines.join('\n')}\n`
}
