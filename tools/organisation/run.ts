// npm run organisation: a new organisation with its first administrator. There is no account that nobody made.
import { parseArgs } from 'node:util'
import { foundingProblems, foundOrganisation } from '#server/commands/found-organisation.ts'
import { openDatabase } from '#server/db.ts'
import { readEnv } from '#server/env.ts'
import { secretFrom } from './ask-hidden.ts'

const USAGE = `npm run organisation -- --name NAME --mark MARK --email ADDRESS [--person NAME] [--address TEXT] [--password-file FILE]

  Makes an organisation and its first administrator in the database that DATABASE_URL names.
  --mark           begins every number that the organisation issues: a capital letter and up to 7 more or digits
  --email          the administrator's address
  --person         the administrator's name; the address without it
  --password-file  a file with the password; without it, it is asked for on the terminal
`

function end(code: number, lines: readonly string[]): never {
  process.stderr.write(`${lines.join('\n')}\n`)
  process.exit(code)
}

function words() {
  const text = { type: 'string' } as const
  try {
    const options = { name: text, mark: text, email: text, person: text, address: text, 'password-file': text }
    return parseArgs({ options }).values
  } catch (error) {
    return end(2, [error instanceof Error ? error.message : String(error), USAGE])
  }
}

const given = words()
const { name, mark, email } = given
if (name === undefined || mark === undefined || email === undefined) end(2, [USAGE])
const read = readEnv(process.env)
if (!read.ok) end(2, read.problems)
const password = await secretFrom(given['password-file'])
if (password === undefined) end(2, ['There is no terminal to ask for the password on: give --password-file.'])
const founding = { name, mark, email, person: given.person ?? email, address: given.address ?? '', password }
const problems = foundingProblems(founding)
if (problems.length > 0) end(1, problems)
const db = openDatabase({ url: read.env.DATABASE_URL, pool: 1, name: 'skerry organisation' })
try {
  const id = await foundOrganisation(db, founding, new Date())
  if (id === undefined) end(1, [`--mark: another organisation has ${mark} already.`])
  process.stdout.write(`${name} (${mark}) is made: ${id}. ${email} signs in as its administrator.\n`)
} finally {
  await db.destroy()
}
