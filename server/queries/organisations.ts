import type { Tx } from '#server/db.ts'

export interface OrganisationName {
  readonly id: string
  readonly name: string
}

export async function organisationName(tx: Tx, organisation: string): Promise<OrganisationName> {
  const row = await tx('organisations')
    .where({ organisation_id: organisation })
    .first<{ name: string } | undefined>('name')
  if (row === undefined) throw new Error('An organisation with people has no row.')
  return { id: organisation, name: row.name }
}
