// npm run restore -- FOLDER: a backup into an empty database and storage, held against its manifest.
import { restore } from '#server/backup/restore.ts'
import { readEnv } from '#server/env.ts'
import { openStore } from '#server/files/open-store.ts'
import { postgresBin } from '#tools/setup/postgres.mjs'
import { tell } from './tell.ts'

const [, , folder] = process.argv
const reader = process.env['BACKUP_DATABASE_URL']
const read = readEnv(process.env)

await tell(async () => {
  if (folder === undefined) throw new Error('Name the folder of a backup: npm run restore -- FOLDER')
  if (reader === undefined)
    throw new Error(
      'BACKUP_DATABASE_URL: the address of the empty database under a role that sees every row, such as skerry_backup.',
    )
  if (!read.ok) throw new Error(read.problems.join('\n'))
  const options = { owner: read.env.DATABASE_OWNER_URL, reader, bin: postgresBin(), store: openStore(read.env), folder }
  const manifest = await restore(options)
  return `Restored what was backed up at ${manifest.made_at}: rows and files are as the manifest says. Have the records checked next: the worker does it each night.`
})
