// npm run backup -- FOLDER: the database, the stored files and a manifest, in a new folder.
import { backUp } from '#server/backup/backup.ts'
import { readEnv } from '#server/env.ts'
import { openStore } from '#server/files/open-store.ts'
import { postgresBin } from '#tools/setup/postgres.mjs'
import { tell } from './tell.ts'

const [, , folder] = process.argv
const url = process.env['BACKUP_DATABASE_URL']
const read = readEnv(process.env)

await tell(async () => {
  if (folder === undefined) throw new Error('Name a new folder: npm run backup -- FOLDER')
  if (url === undefined)
    throw new Error(
      'BACKUP_DATABASE_URL: the address of the database under a role that sees every row, such as skerry_backup.',
    )
  if (!read.ok) throw new Error(read.problems.join('\n'))
  const manifest = await backUp({ url, bin: postgresBin(), store: openStore(read.env), folder, now: new Date() })
  const rows = Object.values(manifest.rows).reduce((sum, count) => sum + count, 0)
  return `${folder}: ${rows} rows of ${Object.keys(manifest.rows).length} tables, ${manifest.files.length} files. The folder holds everything that is secret: keep it so.`
})
