import { canReview } from '#core/policy/can.ts'
import type { Actor } from '#core/policy/roles.ts'
import type { Step } from '#core/policy/states.ts'
import type { Tx } from '#server/db.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import type { Answer } from '#server/http/route.ts'
import { presentReport } from '#server/presenters/report.ts'
import { type Colleague, findByRole, findColleagues } from '#server/queries/colleagues.ts'
import { assignReviewer, takeStep } from '#server/queries/report-steps.ts'
import { findReport, type Report } from '#server/queries/reports.ts'
import type { Services } from '#server/services.ts'
import { tell } from './tell.ts'

export interface Stage {
  readonly tx: Tx
  readonly actor: Actor
  readonly subject: Report
  readonly now: Date
  readonly services: Services
}

/** The report as it is now, for an answer. */
export async function answerReport(
  { tx, actor }: Pick<Stage, 'tx' | 'actor'>,
  report: string,
  audit: Readonly<Record<string, unknown>> = {},
): Promise<Answer> {
  const found = await findReport(tx, actor.organisation, report)
  if (found === undefined) throw new Error(`Report ${report} cannot be read back.`)
  return { body: presentReport(found), version: found.version, audit: { state: found.state, ...audit } }
}

/** Takes a step and answers with the report; a conflict when somebody was faster. */
export async function step(stage: Stage, name: Step): Promise<Answer | Refused> {
  const { tx, actor, subject, now } = stage
  const done = await takeStep(tx, name, { organisation: actor.organisation, report: subject, now })
  return done ? await answerReport(stage, subject.report_id, { from: subject.state }) : refuse('conflict')
}

/** At most so many reviewers are asked when nobody is named. */
const MOST_ASKED = 20

async function toBeAsked(tx: Tx, { facts }: Report, organisation: string): Promise<Colleague[]> {
  const chosen = facts.reviewer
  const people =
    chosen === null
      ? await findByRole(tx, organisation, 'reviewer', MOST_ASKED)
      : await findColleagues(tx, organisation, [chosen])
  return people.filter((person) => canReview(person, facts).allowed)
}

/** Asks a reviewer, or all who could be one, to look at a report that was sent to review. */
export async function askForReview({ tx, actor, subject, now, services }: Stage): Promise<void> {
  const people = await toBeAsked(tx, subject, actor.organisation)
  const { reference, title, revision, report_id, version } = subject
  await tell(
    tx,
    services,
    {
      organisation: actor.organisation,
      kind: 'review asked',
      event: `submit/${report_id}/${version}`,
      actor: actor.person,
      subject: `${reference}: review asked for`,
      lines: [`${actor.name} asks for the review of ${reference}, ${title}, revision ${revision}.`],
      path: `/reports/${report_id}`,
      now,
    },
    people,
  )
}

/** Names the reviewer, or nobody; only somebody who may be the second person can be named. */
export async function chooseReviewer(stage: Stage, reviewer: string | null): Promise<Report | Refused> {
  const { tx, actor, subject, now } = stage
  const { organisation } = actor
  if (reviewer !== null) {
    const [person] = await findColleagues(tx, organisation, [reviewer])
    if (person === undefined)
      return refuse('bad-request', undefined, {
        errors: [{ pointer: '/reviewer', message: 'Nobody of this organisation has this id.' }],
      })
    const decision = canReview(person, subject.facts)
    if (!decision.allowed) return refuse('conflict', `${person.name} cannot review this report: ${decision.reason}`)
  }
  if (!(await assignReviewer(tx, { organisation, report: subject, now }, reviewer))) return refuse('conflict')
  const found = await findReport(tx, organisation, subject.report_id)
  if (found === undefined) throw new Error('The report cannot be read back.')
  return found
}
