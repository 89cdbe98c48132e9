import { randomUUID } from 'node:crypto'
import type { Knex } from 'knex'
import { passwordProblem } from '#core/policy/password.ts'
import { inOrganisation } from '#server/db.ts'
import { checkedAddress } from '#server/mail/header.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { insertPerson } from '#server/queries/people.ts'
import { writeSecrets } from '#server/queries/secrets.ts'
import { hashPassword } from './passwords.ts'

/** A new organisation with its first administrator. */
export interface Founding {
  readonly name: string
  readonly mark: string
  readonly address: string
  readonly email: string
  readonly person: string
  readonly password: string
}

/** What keeps an organisation from being made, each as a finished sentence; empty when nothing does. */
export function foundingProblems({ name, mark, address, email, person, password }: Founding): string[] {
  const weak = passwordProblem(password, { words: [name, mark, email, person], secondFactor: false })
  const checks: readonly [boolean, string][] = [
    [name.length >= 1 && name.length <= 200, '--name: 1 to 200 characters are expected.'],
    [/^[A-Z][A-Z0-9]{1,7}$/.test(mark), '--mark: a capital letter and 1 to 7 capital letters or digits, as in ALDER.'],
    [address.length <= 500, '--address: at most 500 characters are taken.'],
    [person.length >= 1 && person.length <= 200, '--person: 1 to 200 characters are expected.'],
    [checkedAddress(email).ok, '--email: one plain address is expected, as in weir@alder.example.'],
    [weak === undefined, `The password cannot be taken. ${weak ?? ''}`],
  ]
  return checks.flatMap(([good, problem]) => (good ? [] : [problem]))
}

const isTaken = (error: unknown): boolean =>
  error instanceof Error && 'constraint' in error && error.constraint === 'organisations_mark_key'

/** Makes an organisation and its first administrator; undefined when another organisation has the mark. */
export async function foundOrganisation(db: Knex, founding: Founding, now: Date): Promise<string | undefined> {
  const organisation = randomUUID()
  const password_hash = await hashPassword(founding.password)
  try {
    await inOrganisation(db, organisation, async (tx) => {
      const { name, mark, address } = founding
      await tx('organisations').insert({ organisation_id: organisation, name, mark, address, created_at: now })
      const person = await insertPerson(tx, {
        organisation,
        email: founding.email.toLowerCase(),
        name: founding.person,
        licence: null,
        roles: ['administrator'],
        now,
      })
      if (person === undefined) throw new Error('A new organisation has somebody already.')
      await writeSecrets(tx, { organisation, person }, { password_hash })
      await writeAudit(tx, {
        organisation,
        person: null,
        roles: [],
        action: 'found-organisation',
        subject: `organisation/${organisation}`,
        at: now,
        request: 'command line',
        address: 'command line',
        details: { mark, administrator: person },
      })
    })
    return organisation
  } catch (error) {
    if (isTaken(error)) return undefined
    throw error
  }
}
