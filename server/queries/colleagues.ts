import type { Actor } from '#core/policy/roles.ts'
import { ROLES, type Role } from '#core/policy/roles.ts'
import type { Tx } from '#server/db.ts'

/** A person who can be written to. */
export interface Colleague extends Actor {
  readonly email: string
  /** Kinds of mail that the person has switched off. */
  readonly silent: readonly string[]
}

interface Row {
  person_id: string
  name: string
  licence: string | null
  roles: string[]
  email: string
  mail_switches: Readonly<Record<string, unknown>>
}

const isRole = (value: string): value is Role => (ROLES as readonly string[]).includes(value)

const colleagueOf = (organisation: string, row: Row): Colleague => ({
  organisation,
  person: row.person_id,
  name: row.name,
  licence: row.licence,
  roles: row.roles.filter(isRole),
  email: row.email,
  silent: Object.entries(row.mail_switches).flatMap(([kind, on]) => (on === false ? [kind] : [])),
})

const COLUMNS = ['person_id', 'name', 'licence', 'roles', 'email', 'mail_switches'] as const

/** Those of some people who still have an account. */
export async function findColleagues(tx: Tx, organisation: string, people: readonly string[]): Promise<Colleague[]> {
  const rows = await tx('people')
    .where({ organisation_id: organisation, active: true })
    .whereIn('person_id', [...people])
    .orderBy('person_id')
    .select<Row[]>(...COLUMNS)
  return rows.map((row) => colleagueOf(organisation, row))
}

/** Everybody of a role who has an account, at most `limit`. */
export async function findByRole(tx: Tx, organisation: string, role: Role, limit: number): Promise<Colleague[]> {
  const rows = await tx('people')
    .where({ organisation_id: organisation, active: true })
    .whereRaw('? = any(roles)', [role])
    .orderBy('person_id')
    .limit(limit)
    .select<Row[]>(...COLUMNS)
  return rows.map((row) => colleagueOf(organisation, row))
}
