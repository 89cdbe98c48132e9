import { ACTIONS, type Action } from './actions.ts'
import type { Actor } from './roles.ts'
import { ISSUED, type ReportState, type Step, stepAllowed, WRITABLE } from './states.ts'

/** What decisions about a report need to know of it. */
export interface ReportFacts {
  readonly kind: 'report'
  readonly state: ReportState
  /** Who uploaded any of its revisions: each of them had a hand in it. */
  readonly uploaders: readonly string[]
  /** Who installed and tested, as the file names them. */
  readonly workers: readonly { readonly name: string; readonly licence: string | null }[]
  /** Who is asked to review, when somebody is. */
  readonly reviewer: string | null
}

export type Decision =
  | { readonly allowed: true }
  | { readonly allowed: false; readonly reason: string; readonly why: Refusal }

/** `role` and `hands` do not change with time; `state` may. */
export type Refusal = 'role' | 'hands' | 'state'

const YES: Decision = { allowed: true }
const no = (why: Refusal, reason: string): Decision => ({ allowed: false, why, reason })

type Condition = (actor: Actor, report: ReportFacts) => Decision

const fold = (text: string): string => text.normalize('NFKC').trim().toLowerCase().replaceAll(/\s+/g, ' ')

const isActor = (
  actor: Pick<Actor, 'name' | 'licence'>,
  worker: { readonly name: string; readonly licence: string | null },
): boolean =>
  (worker.licence !== null && actor.licence !== null && fold(worker.licence) === fold(actor.licence)) ||
  fold(worker.name) === fold(actor.name)

/** Four eyes: who uploaded, installed or tested cannot be the second person. */
export function secondPerson(actor: Pick<Actor, 'person' | 'name' | 'licence'>, report: ReportFacts): Decision {
  if (report.uploaders.includes(actor.person))
    return no('hands', 'You uploaded a revision of this report. A second competent person must decide on it.')
  if (report.workers.some((worker) => isActor(actor, worker)))
    return no(
      'hands',
      'The file names you among those who installed or tested. A second competent person must decide on it.',
    )
  return YES
}

const STEP_WORDS: Readonly<Record<Step, string>> = {
  submit: 'sent to review',
  recall: 'taken back from review',
  return: 'returned',
  approve: 'approved',
  issue: 'issued',
  replace: 'replaced',
  withdraw: 'withdrawn',
}

const inStep =
  (step: Step): Condition =>
  (_actor, report) =>
    stepAllowed(step, report.state)
      ? YES
      : no('state', `A report that is ${report.state} cannot be ${STEP_WORDS[step]}.`)

const stateAmong =
  (states: readonly ReportState[], words: string): Condition =>
  (_actor, report) =>
    states.includes(report.state) ? YES : no('state', `This report is ${report.state}: ${words}`)

/** An auditor sees what is issued, and nothing before it. */
const visible: Condition = (actor, report) =>
  ISSUED.includes(report.state) || actor.roles.some((role) => role !== 'auditor')
    ? YES
    : no('role', 'An auditor sees issued reports only.')

const CONDITIONS: Readonly<Partial<Record<Action, readonly Condition[]>>> = {
  'report.read': [visible],
  'report.revise': [stateAmong(WRITABLE, 'its file can be changed only while it is a draft or returned.')],
  'report.attach': [stateAmong(WRITABLE, 'attachments can be changed only while it is a draft or returned.')],
  'report.assign': [
    stateAmong(['draft', 'in review', 'returned', 'approved'], 'a reviewer is chosen before it is issued.'),
  ],
  'report.submit': [inStep('submit')],
  'report.recall': [inStep('recall')],
  'report.discard': [stateAmong(WRITABLE, 'only a draft or a returned report can be discarded.')],
  'report.annotate': [stateAmong(['in review', 'approved'], 'remarks are made while it is in review.'), secondPerson],
  'report.answer': [stateAmong(['in review', 'returned', 'draft'], 'answers are given until it is approved.')],
  'report.accept': [stateAmong(['in review'], 'departures and limitations are decided in review.'), secondPerson],
  'report.return': [inStep('return'), secondPerson],
  'report.approve': [inStep('approve'), secondPerson],
  'report.issue': [inStep('issue'), secondPerson],
  'report.correct': [stateAmong(['issued'], 'only an issued report can be corrected by a new one.')],
  'report.withdraw': [inStep('withdraw')],
}

const ROLE_WORDS = new Intl.ListFormat('en-GB', { type: 'disjunction' })

/** Whether a person could be the second one on a report: a reviewer without a hand in it. */
export function canReview(actor: Actor, report: ReportFacts): Decision {
  const decision = can(actor, 'report.annotate')
  return decision.allowed ? secondPerson(actor, report) : decision
}

/**
 * Whether a person may do something: by role first, then by what the report's state and the hands in it allow.
 *
 * @param actor who wants to
 * @param action one of the closed list
 * @param report what the action is about, where it is about a report
 * @returns a decision; a refusal gives its reason as a finished sentence
 */
export function can(actor: Actor, action: Action, report?: ReportFacts): Decision {
  const roles: readonly string[] = ACTIONS[action]
  if (!actor.roles.some((role) => roles.includes(role)))
    return no('role', `This takes the role of ${ROLE_WORDS.format(roles)}.`)
  if (report === undefined) return YES
  for (const condition of CONDITIONS[action] ?? []) {
    const decision = condition(actor, report)
    if (!decision.allowed) return decision
  }
  return YES
}
