import type { Action } from '#core/policy/actions.ts'
import { can } from '#core/policy/can.ts'
import type { Step } from '#core/policy/states.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import type { Answer } from '#server/http/route.ts'
import { findColleagues } from '#server/queries/colleagues.ts'
import { publishRemarks } from '#server/queries/remarks.ts'
import { takeStep } from '#server/queries/report-steps.ts'
import { closeReview, openReview, type ReviewDecision } from '#server/queries/reviews.ts'
import { publishThreads, reopenAnswered } from '#server/queries/threads.ts'
import { reviewStanding } from './review-standing.ts'
import { answerReport, type Stage } from './step-report.ts'
import { tell } from './tell.ts'

/** What each decision asks of the policy, and the step that it takes. */
const DECISIONS: Readonly<
  Record<ReviewDecision, { readonly action: Action; readonly step: Step | null; readonly words: string }>
> = {
  remarks: { action: 'report.annotate', step: null, words: 'has made remarks on' },
  returned: { action: 'report.return', step: 'return', words: 'has returned' },
  approved: { action: 'report.approve', step: 'approve', words: 'has approved' },
}

export interface Closing {
  readonly decision: ReviewDecision
  readonly summary: string
}

/** Why a review cannot be submitted with this decision; nothing when it can. */
async function obstacle(stage: Stage, decision: ReviewDecision): Promise<Refused | undefined> {
  const { tx, actor, subject } = stage
  const allowed = can(actor, DECISIONS[decision].action, subject.facts)
  if (!allowed.allowed) return refuse(allowed.why === 'state' ? 'conflict' : 'not-allowed', allowed.reason)
  if (decision !== 'approved') return undefined
  const { blockers } = await reviewStanding(tx, actor.organisation, subject)
  return blockers.length === 0 ? undefined : refuse('blocked', undefined, { more: { blockers } })
}

async function tellAuthors(
  stage: Stage,
  review: string,
  { decision, summary }: Closing,
  remarks: number,
): Promise<void> {
  const { tx, actor, subject, now, services } = stage
  const { reference, title, report_id, facts } = subject
  const count = remarks === 1 ? '1 remark' : `${remarks} remarks`
  await tell(
    tx,
    services,
    {
      organisation: actor.organisation,
      kind: 'review submitted',
      event: `review/${review}`,
      actor: actor.person,
      subject: `${reference}: ${decision === 'remarks' ? 'remarks' : decision}`,
      lines: [
        `${actor.name} ${DECISIONS[decision].words} ${reference}, ${title}, with ${count}.`,
        ...(summary === '' ? [] : [summary]),
      ],
      path: `/reports/${report_id}`,
      now,
    },
    await findColleagues(tx, actor.organisation, facts.uploaders),
  )
}

/**
 * Submits a reviewer's review: all its remarks become visible together with the decision, and the author side is told by
 * one mail. What was approved earlier is in the reviews; a report that is returned from approval must be approved again.
 */
export async function submitReview(stage: Stage, closing: Closing): Promise<Answer | Refused> {
  const { tx, actor, subject, now } = stage
  const { organisation, person } = actor
  const { decision, summary } = closing
  // Corrections in this very review count: they are published before what stands in the way is asked.
  const review = await openReview(
    tx,
    { organisation, report: subject.report_id, reviewer: person },
    subject.revision,
    now,
  )
  await reopenAnswered(tx, organisation, review)
  await publishThreads(tx, organisation, review, now)
  const remarks = await publishRemarks(tx, organisation, review, now)
  if (remarks === 0 && summary === '' && decision !== 'approved')
    return refuse('bad-request', 'Say in a remark or in the summary what this review is about.')
  const refused = await obstacle(stage, decision)
  if (refused !== undefined) return refused
  await closeReview(tx, organisation, review, { revision: subject.revision, decision, summary, now })
  const { step } = DECISIONS[decision]
  if (step !== null && !(await takeStep(tx, step, { organisation, report: subject, now }))) return refuse('conflict')
  await tellAuthors(stage, review, closing, remarks)
  return await answerReport(stage, subject.report_id, { review, decision, remarks })
}
