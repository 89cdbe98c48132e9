import { canReview } from '#core/policy/can.ts'
import { quotations } from '#core/review/quote.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { findColleagues } from '#server/queries/colleagues.ts'
import { insertRemark } from '#server/queries/remarks.ts'
import { openReview } from '#server/queries/reviews.ts'
import { insertThread, type NewThread, type ThreadRow, updateThread } from '#server/queries/threads.ts'
import { draftModel, ownRevision } from './judged-revision.ts'
import type { Stage } from './step-report.ts'

/** A thread as its author begins it. */
export interface Beginning extends Pick<NewThread, 'anchor' | 'kind' | 'region'> {
  readonly body: string
  readonly assignedTo: string | null
}

const unknown = (pointer: string, message: string): Refused =>
  refuse('bad-request', undefined, { errors: [{ pointer, message }] })

const NOBODY = unknown('/assigned_to', 'Nobody of this organisation has this id.')

export const isColleague = async ({ tx, actor }: Pick<Stage, 'tx' | 'actor'>, person: string): Promise<boolean> =>
  (await findColleagues(tx, actor.organisation, [person])).length === 1

/** Begins a thread as part of the reviewer's own review: until that is submitted, nobody else sees it. */
export async function beginThread(stage: Stage, beginning: Beginning): Promise<string | Refused> {
  const { tx, actor, subject, now } = stage
  const { organisation, person } = actor
  const { anchor, assignedTo, body, kind, region } = beginning
  const report = subject.report_id
  const revision = await ownRevision(tx, organisation, report, subject.revision)
  const quoted = quotations(draftModel(revision)).get(anchor)
  if (quoted === undefined) return unknown('/anchor', `The newest revision has no place “${anchor}”.`)
  if (assignedTo !== null && !(await isColleague(stage, assignedTo))) return NOBODY
  const reviewed = { organisation, report, reviewer: person }
  const review = await openReview(tx, reviewed, subject.revision, now)
  const thread = await insertThread(tx, {
    organisation,
    report,
    anchor,
    quoted,
    region,
    kind,
    revision: subject.revision,
    person,
    assignedTo,
    review,
    now,
  })
  await insertRemark(tx, { organisation, thread, person, body, review, now })
  return thread
}

/**
 * Says something in a thread. A reviewer's word in review waits for the review to be submitted; anybody else's is seen
 * at once and answers the thread.
 */
export async function answerThread(stage: Stage, thread: ThreadRow, body: string): Promise<string | Refused> {
  const { tx, actor, subject, now } = stage
  const { organisation, person } = actor
  const reviewing = subject.state === 'in review' && canReview(actor, subject.facts).allowed
  const reviewed = { organisation, report: subject.report_id, reviewer: person }
  const review = reviewing ? await openReview(tx, reviewed, subject.revision, now) : null
  if (review === null && thread.published_at === null)
    return refuse('conflict', 'A draft is not answered: it is seen by nobody else yet.')
  const remark = await insertRemark(tx, { organisation, thread: thread.thread_id, person, body, review, now })
  if (
    review === null &&
    thread.state === 'open' &&
    !(await updateThread(tx, organisation, thread, { state: 'answered' }))
  )
    return refuse('conflict')
  return remark
}

/** Gives a thread to somebody, or to nobody. */
export async function assignThread(
  stage: Stage,
  thread: ThreadRow,
  person: string | null,
): Promise<Refused | undefined> {
  if (person !== null && !(await isColleague(stage, person))) return NOBODY
  const { tx, actor } = stage
  return (await updateThread(tx, actor.organisation, thread, { assigned_to: person })) ? undefined : refuse('conflict')
}
