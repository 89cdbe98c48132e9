import type { Placement } from '#core/review/carry.ts'
import type { Tx } from '#server/db.ts'

export interface PlacedThread {
  readonly thread_id: string
  readonly anchor: string
  readonly quoted: string
}

/** Every thread of a report, drafts too: each is carried along with the file. */
export async function listPlaced(tx: Tx, organisation: string, report: string): Promise<PlacedThread[]> {
  return await tx('threads')
    .where({ organisation_id: organisation, report_id: report })
    .select<PlacedThread[]>('thread_id', 'anchor', 'quoted')
}

export async function placeThreads(
  tx: Tx,
  organisation: string,
  threads: readonly string[],
  placement: Placement,
  revision: number,
): Promise<void> {
  if (threads.length === 0) return
  await tx('threads')
    .where('organisation_id', organisation)
    .whereIn('thread_id', [...threads])
    .update({ placement, placed_on: revision })
}
