import createKnex, { type Knex } from 'knex'
import { ownerConfig } from '#server/setup/owner.ts'
import type { House } from './house.ts'

/** What somebody can do who owns the database: the tables' triggers are switched off while they are at it. */
export async function asOwner(
  house: House,
  organisation: string,
  tables: readonly string[],
  work: (tx: Knex.Transaction) => Promise<unknown>,
): Promise<void> {
  const owner = createKnex(ownerConfig(house.addresses.owner))
  try {
    await owner.transaction(async (tx) => {
      await tx.raw("select set_config('app.organisation', ?, true)", [organisation])
      // The group role may not write here; the owner lets it.
      for (const table of tables) await tx.raw('alter table ?? disable trigger user', [table])
      for (const table of tables) await tx.raw('alter table ?? disable row level security', [table])
      await work(tx)
      for (const table of tables) await tx.raw('alter table ?? enable row level security', [table])
      for (const table of tables) await tx.raw('alter table ?? enable trigger user', [table])
    })
  } finally {
    await owner.destroy()
  }
}
