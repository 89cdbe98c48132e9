import type { Tx } from '#server/db.ts'

export type ReviewDecision = 'remarks' | 'returned' | 'approved'

export interface Reviewed {
  readonly organisation: string
  readonly report: string
  readonly reviewer: string
}

export async function findOpenReview(
  tx: Tx,
  { organisation, report, reviewer }: Reviewed,
): Promise<string | undefined> {
  const row = await tx('reviews')
    .where({ organisation_id: organisation, report_id: report, reviewer_id: reviewer })
    .whereNull('submitted_at')
    .first<{ review_id: string } | undefined>('review_id')
  return row?.review_id
}

/** The review that a reviewer has begun on a report; begun now where there is none. */
export async function openReview(tx: Tx, reviewed: Reviewed, revision: number, now: Date): Promise<string> {
  const { organisation, report, reviewer } = reviewed
  const open = await findOpenReview(tx, reviewed)
  if (open !== undefined) return open
  const [row] = await tx('reviews')
    .insert({ organisation_id: organisation, report_id: report, revision, reviewer_id: reviewer, started_at: now })
    .returning<{ review_id: string }[]>('review_id')
  if (row === undefined) throw new Error('The new review has no row.')
  return row.review_id
}

export async function closeReview(
  tx: Tx,
  organisation: string,
  review: string,
  closing: {
    readonly revision: number
    readonly decision: ReviewDecision
    readonly summary: string
    readonly now: Date
  },
): Promise<void> {
  const { revision, decision, summary, now } = closing
  await tx('reviews')
    .where({ organisation_id: organisation, review_id: review })
    .update({ revision, decision, summary, submitted_at: now })
}

export interface ReviewRow {
  readonly review_id: string
  readonly revision: number
  readonly reviewer_id: string
  readonly reviewer_name: string
  readonly submitted_at: Date
  readonly decision: ReviewDecision
  readonly summary: string | null
}

/** Submitted reviews of a report, in the order in which they were submitted. */
export async function listReviews(tx: Tx, organisation: string, report: string): Promise<ReviewRow[]> {
  return await tx('reviews as v')
    .join('people as p', (on) => on.on('p.organisation_id', 'v.organisation_id').andOn('p.person_id', 'v.reviewer_id'))
    .where({ 'v.organisation_id': organisation, 'v.report_id': report })
    .whereNotNull('v.submitted_at')
    .orderBy(['v.submitted_at', 'v.review_id'])
    .select<ReviewRow[]>(
      'v.review_id',
      'v.revision',
      'v.reviewer_id',
      'p.name as reviewer_name',
      'v.submitted_at',
      'v.decision',
      'v.summary',
    )
}
