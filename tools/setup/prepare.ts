// Makes roles and a database in a cluster of our own, and migrates it; prints the addresses of its roles as JSON.
import { prepareDatabase } from '#server/setup/databases.ts'

const [, , database = 'skerry'] = process.argv
const admin = process.env['SKERRY_ADMIN_URL']
if (admin === undefined) {
  process.stderr.write('SKERRY_ADMIN_URL: the address of the cluster’s administrator is missing.\n')
  process.exit(2)
}
process.stdout.write(`${JSON.stringify(await prepareDatabase(admin, database))}\n`)
