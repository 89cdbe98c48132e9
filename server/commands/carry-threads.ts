import type { ReportModel } from '#core/report/model.ts'
import { carry, type Placement } from '#core/review/carry.ts'
import { quotations } from '#core/review/quote.ts'
import type { Tx } from '#server/db.ts'
import { listPlaced, placeThreads } from '#server/queries/thread-placements.ts'

const PLACEMENTS: readonly Placement[] = ['kept', 'changed', 'orphaned']

/** Carries every thread of a report to a new revision; none is lost, whatever has become of its place. */
export async function carryThreads(
  tx: Tx,
  organisation: string,
  report: string,
  { revision, model }: { readonly revision: number; readonly model: ReportModel },
): Promise<Readonly<Record<Placement, number>>> {
  const threads = await listPlaced(tx, organisation, report)
  const counts: Record<Placement, number> = { kept: 0, changed: 0, orphaned: 0 }
  if (threads.length === 0) return counts
  const found = quotations(model)
  for (const placement of PLACEMENTS) {
    const ids = threads.filter((thread) => carry(thread, found) === placement).map(({ thread_id }) => thread_id)
    await placeThreads(tx, organisation, ids, placement, revision)
    counts[placement] = ids.length
  }
  return counts
}
