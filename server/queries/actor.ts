import type { Actor } from '#core/policy/roles.ts'
import { ROLES, type Role } from '#core/policy/roles.ts'
import { showing, type Tx, uuidLiteral } from '#server/db.ts'

const isRole = (value: string): value is Role => (ROLES as readonly string[]).includes(value)

interface Row {
  name: string
  licence: string | null
  roles: string[]
}

/**
 * Shows a transaction its organisation's rows and reads who acts, both in one round to the database: every request
 * begins so.
 */
export async function enterAs(tx: Tx, organisation: string, person: string): Promise<Actor | undefined> {
  const [, found] = await tx.raw<[unknown, { rows: Row[] }]>(
    `${showing(organisation)}; select name, licence, roles from people
     where organisation_id = ${uuidLiteral(organisation)} and person_id = ${uuidLiteral(person)} and active`,
  )
  const [row] = found.rows
  return row === undefined ? undefined : actorOf(row, organisation, person)
}

const actorOf = (row: Row, organisation: string, person: string): Actor => ({
  person,
  organisation,
  name: row.name,
  licence: row.licence,
  roles: row.roles.filter(isRole),
})

/** The person behind a session or token, with today's roles; nobody when the account was closed. */
export async function findActor(tx: Tx, organisation: string, person: string): Promise<Actor | undefined> {
  const row = await tx('people')
    .where({ organisation_id: organisation, person_id: person, active: true })
    .first<Row | undefined>('name', 'licence', 'roles')
  return row === undefined ? undefined : actorOf(row, organisation, person)
}
