import type { ThreadStanding } from '#core/review/blockers.ts'
import type { Placement } from '#core/review/carry.ts'
import type { Tx } from '#server/db.ts'

/** A stretch of a photo, each number a part of its width or height. */
export interface Region {
  readonly attachment: string
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

export interface ThreadRow extends ThreadStanding {
  readonly thread_id: string
  readonly quoted: string
  readonly region: Region | null
  readonly placement: Placement
  readonly opened_on: number
  readonly placed_on: number
  readonly opened_by: string
  readonly assigned_to: string | null
  readonly review_id: string | null
  readonly published_at: Date | null
  readonly version: number
  readonly created_at: Date
}

const COLUMNS = [
  'thread_id',
  'anchor',
  'quoted',
  'region',
  'kind',
  'state',
  'placement',
  'opened_on',
  'placed_on',
  'opened_by',
  'assigned_to',
  'review_id',
  'published_at',
  'version',
  'created_at',
] as const

/** The threads of a report that a person may see: what is published, and the person's own drafts. */
export async function listThreads(tx: Tx, organisation: string, report: string, viewer: string): Promise<ThreadRow[]> {
  return await tx('threads')
    .where({ organisation_id: organisation, report_id: report })
    .where((seen) => void seen.whereNotNull('published_at').orWhere('opened_by', viewer))
    .orderBy(['created_at', 'thread_id'])
    .select<ThreadRow[]>(...COLUMNS)
}

export async function findThread(
  tx: Tx,
  { organisation, report, thread, viewer }: Readonly<Record<'organisation' | 'report' | 'thread' | 'viewer', string>>,
): Promise<ThreadRow | undefined> {
  return await tx('threads')
    .where({ organisation_id: organisation, report_id: report, thread_id: thread })
    .where((seen) => void seen.whereNotNull('published_at').orWhere('opened_by', viewer))
    .first<ThreadRow | undefined>(...COLUMNS)
}

/** What everybody can see of a report's threads, as far as issuing goes. */
export async function listStandings(tx: Tx, organisation: string, report: string): Promise<ThreadStanding[]> {
  return await tx('threads')
    .where({ organisation_id: organisation, report_id: report })
    .whereNotNull('published_at')
    .orderBy(['created_at', 'thread_id'])
    .select<ThreadStanding[]>('anchor', 'kind', 'state')
}

export interface NewThread {
  readonly organisation: string
  readonly report: string
  readonly anchor: string
  readonly quoted: string
  readonly region: Region | null
  readonly kind: ThreadStanding['kind']
  readonly revision: number
  readonly person: string
  readonly assignedTo: string | null
  readonly review: string
  readonly now: Date
}

export async function insertThread(tx: Tx, thread: NewThread): Promise<string> {
  const [row] = await tx('threads')
    .insert({
      organisation_id: thread.organisation,
      report_id: thread.report,
      anchor: thread.anchor,
      quoted: thread.quoted,
      region: thread.region === null ? null : JSON.stringify(thread.region),
      kind: thread.kind,
      opened_on: thread.revision,
      placed_on: thread.revision,
      opened_by: thread.person,
      assigned_to: thread.assignedTo,
      review_id: thread.review,
      created_at: thread.now,
    })
    .returning<{ thread_id: string }[]>('thread_id')
  if (row === undefined) throw new Error('The new thread has no row.')
  return row.thread_id
}

/** Changes a thread that is still as it was read; false when somebody was faster. */
export async function updateThread(
  tx: Tx,
  organisation: string,
  { thread_id, version }: Pick<ThreadRow, 'thread_id' | 'version'>,
  change: Readonly<{ state?: ThreadStanding['state']; assigned_to?: string | null }>,
): Promise<boolean> {
  const changed = await tx('threads')
    .where({ organisation_id: organisation, thread_id, version })
    .update({ ...change, version: version + 1 })
  return changed === 1
}

export async function deleteDraftThread(
  tx: Tx,
  organisation: string,
  thread: string,
  person: string,
): Promise<boolean> {
  const gone = await tx('threads')
    .where({ organisation_id: organisation, thread_id: thread, opened_by: person, published_at: null })
    .delete()
  return gone === 1
}

/** Lets everybody see the threads of a review. */
export async function publishThreads(tx: Tx, organisation: string, review: string, now: Date): Promise<number> {
  return await tx('threads')
    .where({ organisation_id: organisation, review_id: review, published_at: null })
    .update({ published_at: now })
}

/** What was answered is open again once its reviewer has said more. */
export async function reopenAnswered(tx: Tx, organisation: string, review: string): Promise<void> {
  await tx('threads')
    .where({ organisation_id: organisation, state: 'answered' })
    .whereIn('thread_id', tx('remarks').where({ organisation_id: organisation, review_id: review }).select('thread_id'))
    .update({ state: 'open', version: tx.raw('version + 1') })
}
