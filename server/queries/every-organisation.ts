import type { Knex } from 'knex'
import { outside } from '#server/db.ts'

/** The ids of all organisations, for work that goes through each in a transaction of its own. */
export async function everyOrganisation(db: Knex): Promise<string[]> {
  const { rows } = await outside(db, (tx) =>
    tx.raw<{ rows: { organisation: string }[] }>('select organisation_ids() as organisation'),
  )
  return rows.map(({ organisation }) => organisation)
}
