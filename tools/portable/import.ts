// npm run import -- FILE: brings an exported organisation into an empty instance. Run with the owner's DATABASE_OWNER_URL.
import { readFile } from 'node:fs/promises'
import createKnex from 'knex'
import { readEnv } from '#server/env.ts'
import { openStore } from '#server/files/open-store.ts'
import { importOrganisation } from '#server/portable/import.ts'
import { ownerConfig } from '#server/setup/owner.ts'

const [, , file] = process.argv
const read = readEnv(process.env)
if (file === undefined || !read.ok) {
  const problems = read.ok ? [] : read.problems
  process.stderr.write(['npm run import -- FILE', ...problems, ''].join('\n'))
  process.exit(2)
}
const owner = createKnex(ownerConfig(read.env.DATABASE_OWNER_URL))
try {
  const done = await importOrganisation({ owner, store: openStore(read.env) }, await readFile(file))
  if (done.ok) process.stdout.write(`${done.manifest.mark} is here. People sign in after a reset of their password.\n`)
  else process.stderr.write(`${done.problem}\n`)
  process.exitCode = done.ok ? 0 : 1
} finally {
  await owner.destroy()
}
