// npm run schema: writes the schema that the migrations make, for reviewers to read.
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { prepareDatabase } from '#server/setup/databases.ts'
import { homeFor, startCluster, stopCluster } from '#tools/setup/postgres.mjs'
import { dumpSchema, SCHEMA_FILE } from './schema.ts'

const home = homeFor(mkdtempSync(join(tmpdir(), 'skerry-schema-')))
try {
  const { url } = await startCluster(home, { quick: true })
  const { owner } = await prepareDatabase(url, 'skerry_schema')
  writeFileSync(SCHEMA_FILE, dumpSchema(owner))
  process.stdout.write(`${SCHEMA_FILE} is up to date.\n`)
} finally {
  stopCluster(home, 'immediate')
  rmSync(home, { recursive: true, force: true })
}
