import type { Tx } from '#server/db.ts'

/**
 * The next number of a year. The row stays locked until the transaction ends: one that fails gives its number back, so
 * there is never a gap.
 */
export async function nextNumber(tx: Tx, organisation: string, year: number): Promise<number> {
  const [row] = await tx('counters')
    .insert({ organisation_id: organisation, year, last: 1 })
    .onConflict(['organisation_id', 'year'])
    .merge({ last: tx.raw('counters.last + 1') })
    .returning<{ last: number }[]>('last')
  if (row === undefined) throw new Error('The counter has no row.')
  return row.last
}
