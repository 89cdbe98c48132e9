// Fills an empty database with the demonstration, and prints its sign-ins. Anything but an empty database is left alone.
import type { Knex } from 'knex'
import { openDatabase } from '#server/db.ts'
import { readEnv } from '#server/env.ts'
import { DEMO_PASSWORD, ORGANISATIONS } from '../../seeds/fennmark/people.ts'

const read = readEnv(process.env)
if (!read.ok) {
  process.stderr.write(`${read.problems.join('\n')}\n`)
  process.exit(2)
}
const { env } = read

const signIns = (): string =>
  [
    `Demonstration sign-ins, password for all: ${DEMO_PASSWORD}`,
    ...ORGANISATIONS.flatMap(({ name, people }) => [
      `  ${name}`,
      ...people.map((person) => `    ${person.email.padEnd(24)} ${person.name}, ${person.roles.join(' and ')}`),
    ]),
    '',
  ].join('\n')

async function tellStory(db: Knex): Promise<void> {
  try {
    await db.seed.run({ directory: './seeds', loadExtensions: ['.ts'] })
  } catch (error) {
    process.stderr.write(
      'The demonstration is half told. Remove .data/postgres, or empty the database, and start again.\n',
    )
    throw error
  }
}

if (env.NODE_ENV !== 'production') {
  const db = openDatabase({ url: env.DATABASE_URL, pool: 4, name: 'skerry seed', statementTimeout: 120_000 })
  try {
    const { rows } = await db.raw<{ rows: { any: boolean }[] }>('select any_organisation() as any')
    const empty = rows[0]?.any === false
    if (empty) await tellStory(db)
    process.stdout.write(signIns())
  } finally {
    await db.destroy()
  }
}
