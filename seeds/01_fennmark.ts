import type { Knex } from 'knex'
import { hashPassword } from '#server/commands/passwords.ts'
import { inOrganisation } from '#server/db.ts'
import { DEMO_PASSWORD, type DemoOrganisation, ORGANISATIONS } from './fennmark/people.ts'

async function organisation(db: Knex, { id, name, address, mark, people }: DemoOrganisation): Promise<void> {
  const password_hash = await hashPassword(DEMO_PASSWORD)
  await inOrganisation(db, id, async (tx) => {
    await tx('organisations').insert({ organisation_id: id, name, address, mark })
    await tx('people').insert(
      people.map((person) => ({
        organisation_id: id,
        person_id: person.id,
        email: person.email,
        name: person.name,
        licence: person.licence,
        roles: [...person.roles],
        password_hash,
      })),
    )
  })
}

/** The demonstration: two contractors of Fennmark and their people. */
export async function seed(db: Knex): Promise<void> {
  for (const each of ORGANISATIONS) await organisation(db, each)
}
