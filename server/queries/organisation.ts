import type { Tx } from '#server/db.ts'

/** The issuing house, as it stands on what it issues. */
export interface HouseRow {
  readonly name: string
  readonly address: string
  readonly mark: string
}

export async function findHouse(tx: Tx, organisation: string): Promise<HouseRow> {
  const row = await tx('organisations')
    .where({ organisation_id: organisation })
    .first<HouseRow | undefined>('name', 'address', 'mark')
  if (row === undefined) throw new Error(`There is no organisation ${organisation}.`)
  return row
}
