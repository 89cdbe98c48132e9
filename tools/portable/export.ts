// npm run export -- --mark MARK FILE: everything of one organisation as an archive. Run with the owner's DATABASE_OWNER_URL.
import { createWriteStream } from 'node:fs'
import { rename, rm } from 'node:fs/promises'
import { parseArgs } from 'node:util'
import createKnex from 'knex'
import { readEnv } from '#server/env.ts'
import { openStore } from '#server/files/open-store.ts'
import { exportOrganisation } from '#server/portable/export.ts'
import { ownerConfig } from '#server/setup/owner.ts'

const { values, positionals } = parseArgs({ options: { mark: { type: 'string' } }, allowPositionals: true })
const [file] = positionals
const read = readEnv(process.env)
if (values.mark === undefined || file === undefined || !read.ok) {
  const problems = read.ok ? [] : read.problems
  process.stderr.write(['npm run export -- --mark MARK FILE', ...problems, ''].join('\n'))
  process.exit(2)
}
const owner = createKnex(ownerConfig(read.env.DATABASE_OWNER_URL))
const partial = `${file}.partial`
try {
  const out = createWriteStream(partial, { mode: 0o600 })
  const wish = { owner, store: openStore(read.env), mark: values.mark, now: new Date() }
  const manifest = await exportOrganisation(wish, out)
  if (manifest === undefined) {
    out.destroy()
    await rm(partial, { force: true })
    process.stderr.write(`There is no organisation with the mark ${values.mark}.\n`)
    process.exitCode = 1
  } else {
    await rename(partial, file)
    const rows = Object.values(manifest.tables).reduce((sum, table) => sum + table.rows, 0)
    process.stdout.write(`${file}: ${rows} rows, ${manifest.objects.length} files.\n`)
  }
} finally {
  await owner.destroy()
}
