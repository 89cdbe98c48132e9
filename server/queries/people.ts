import type { Role } from '#core/policy/roles.ts'
import type { Tx } from '#server/db.ts'

export interface PersonRow {
  readonly person_id: string
  readonly email: string
  readonly name: string
  readonly licence: string | null
  readonly roles: readonly Role[]
  readonly active: boolean
  readonly has_password: boolean
  readonly second_factor: boolean
  readonly version: number
  readonly created_at: Date
}

const columns = (tx: Tx) => [
  'person_id',
  'email',
  'name',
  'licence',
  'roles',
  'active',
  'version',
  'created_at',
  tx.raw('password_hash is not null as has_password'),
  tx.raw('totp_secret is not null as second_factor'),
]

export async function listPeople(tx: Tx, organisation: string): Promise<PersonRow[]> {
  return await tx('people')
    .where({ organisation_id: organisation })
    .orderBy(['name', 'person_id'])
    .limit(1000)
    .select(...columns(tx))
}

const one = (tx: Tx, organisation: string, person: string) =>
  tx('people').where({ organisation_id: organisation, person_id: person })

export async function findPerson(tx: Tx, organisation: string, person: string): Promise<PersonRow | undefined> {
  return await one(tx, organisation, person).first<PersonRow | undefined>(...columns(tx))
}

/** A person, locked until the transaction ends. */
export async function lockPerson(tx: Tx, organisation: string, person: string): Promise<PersonRow | undefined> {
  return await one(tx, organisation, person)
    .forUpdate()
    .first<PersonRow | undefined>(...columns(tx))
}

export async function countPeople(tx: Tx, organisation: string): Promise<number> {
  const [row] = await tx('people').where({ organisation_id: organisation }).count<{ count: number }[]>('* as count')
  return row?.count ?? 0
}

/** Administrators who can sign in, locked so that two requests cannot each take the other's role. */
export async function lockAdministrators(tx: Tx, organisation: string): Promise<string[]> {
  return await tx('people')
    .where({ organisation_id: organisation, active: true })
    .whereNotNull('password_hash')
    .whereRaw("'administrator' = any(roles)")
    .orderBy('person_id')
    .forUpdate()
    .pluck('person_id')
}

export interface NewPerson {
  readonly organisation: string
  readonly email: string
  readonly name: string
  readonly licence: string | null
  readonly roles: readonly Role[]
  readonly now: Date
}

/** The new person's id; nothing when the organisation has somebody with that address. */
export async function insertPerson(tx: Tx, person: NewPerson): Promise<string | undefined> {
  const [row] = await tx('people')
    .insert({
      organisation_id: person.organisation,
      email: person.email,
      name: person.name,
      licence: person.licence,
      roles: [...person.roles],
      created_at: person.now,
    })
    .onConflict(['organisation_id', 'email'])
    .ignore()
    .returning<{ person_id: string }[]>('person_id')
  return row?.person_id
}

export interface PersonChange {
  readonly email?: string
  readonly name?: string
  readonly licence?: string | null
  readonly roles?: readonly Role[]
  readonly active?: boolean
}

export async function updatePerson(tx: Tx, organisation: string, person: string, change: PersonChange): Promise<void> {
  const { roles, ...rest } = change
  await tx('people')
    .where({ organisation_id: organisation, person_id: person })
    .update({ ...rest, ...(roles === undefined ? {} : { roles: [...roles] }), version: tx.raw('version + 1') })
}

/** Whether somebody else of the organisation has an address. */
export async function addressTaken(tx: Tx, organisation: string, email: string, but: string): Promise<boolean> {
  const row = await tx('people')
    .where({ organisation_id: organisation, email })
    .whereNot('person_id', but)
    .first<{ person_id: string } | undefined>('person_id')
  return row !== undefined
}
