import type { Tx } from '#server/db.ts'

export interface RemarkRow {
  readonly remark_id: string
  readonly thread_id: string
  readonly author_id: string
  readonly author_name: string
  readonly body: string
  readonly published_at: Date | null
  readonly created_at: Date
}

/** What was said in some threads, as far as a person may see it. */
export async function listRemarks(
  tx: Tx,
  organisation: string,
  threads: readonly string[],
  viewer: string,
): Promise<RemarkRow[]> {
  return await tx('remarks as r')
    .join('people as p', (on) => on.on('p.organisation_id', 'r.organisation_id').andOn('p.person_id', 'r.author_id'))
    .where('r.organisation_id', organisation)
    .whereIn('r.thread_id', [...threads])
    .where((seen) => void seen.whereNotNull('r.published_at').orWhere('r.author_id', viewer))
    .orderBy('r.sequence')
    .select<RemarkRow[]>(
      'r.remark_id',
      'r.thread_id',
      'r.author_id',
      'p.name as author_name',
      'r.body',
      'r.published_at',
      'r.created_at',
    )
}

export interface NewRemark {
  readonly organisation: string
  readonly thread: string
  readonly person: string
  readonly body: string
  /** The review that will publish it; without one it is seen at once. */
  readonly review: string | null
  readonly now: Date
}

export async function insertRemark(
  tx: Tx,
  { organisation, thread, person, body, review, now }: NewRemark,
): Promise<string> {
  const [row] = await tx('remarks')
    .insert({
      organisation_id: organisation,
      thread_id: thread,
      author_id: person,
      body,
      review_id: review,
      published_at: review === null ? now : null,
      created_at: now,
    })
    .returning<{ remark_id: string }[]>('remark_id')
  if (row === undefined) throw new Error('The new remark has no row.')
  return row.remark_id
}

interface Draft {
  readonly organisation: string
  readonly report: string
  readonly remark: string
  readonly person: string
}

/** A person's own remark that nobody else has seen; undefined for any other. */
export async function findDraftRemark(
  tx: Tx,
  { organisation, report, remark, person }: Draft,
): Promise<Pick<RemarkRow, 'remark_id' | 'thread_id'> | undefined> {
  return await tx('remarks as r')
    .join('threads as t', (on) => on.on('t.organisation_id', 'r.organisation_id').andOn('t.thread_id', 'r.thread_id'))
    .where({
      'r.organisation_id': organisation,
      'r.remark_id': remark,
      'r.author_id': person,
      't.report_id': report,
    })
    .whereNull('r.published_at')
    .first<Pick<RemarkRow, 'remark_id' | 'thread_id'> | undefined>('r.remark_id', 'r.thread_id')
}

export async function rewriteRemark(tx: Tx, organisation: string, remark: string, body: string): Promise<void> {
  await tx('remarks').where({ organisation_id: organisation, remark_id: remark, published_at: null }).update({ body })
}

export async function deleteRemark(tx: Tx, organisation: string, remark: string): Promise<void> {
  await tx('remarks').where({ organisation_id: organisation, remark_id: remark, published_at: null }).delete()
}

export async function countRemarks(tx: Tx, organisation: string, thread: string): Promise<number> {
  const row = await tx('remarks')
    .where({ organisation_id: organisation, thread_id: thread })
    .count<{ count: number }[]>('* as count')
    .first()
  return row?.count ?? 0
}

/** Lets everybody see the remarks of a review. */
export async function publishRemarks(tx: Tx, organisation: string, review: string, now: Date): Promise<number> {
  return await tx('remarks')
    .where({ organisation_id: organisation, review_id: review, published_at: null })
    .update({ published_at: now })
}
