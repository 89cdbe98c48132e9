import type { Actor } from '#core/policy/roles.ts'
import { ROLES, type Role } from '#core/policy/roles.ts'
import type { Tx } from '#server/db.ts'

const isRole = (value: string): value is Role => (ROLES as readonly string[]).includes(value)

interface Row {
  name: string
  licence: string | null
  roles: string[]
}

/** The person behind a session or token, with today's roles; nobody when the account was closed. */
export async function findActor(tx: Tx, organisation: string, person: string): Promise<Actor | undefined> {
  const row = await tx('people')
    .where({ organisation_id: organisation, person_id: person, active: true })
    .first<Row | undefined>('name', 'licence', 'roles')
  if (row === undefined) return undefined
  return { person, organisation, name: row.name, licence: row.licence, roles: row.roles.filter(isRole) }
}
