import { answerReport, askForReview, chooseReviewer, step } from '#server/commands/step-report.ts'
import { isRefused, refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { presentReport, REPORT_SCHEMA } from '#server/presenters/report.ts'
import { discardReport } from '#server/queries/report-steps.ts'
import { factsOf, loadLocked, versionOf } from './loads.ts'

const REVIEWER = { type: ['string', 'null'], format: 'uuid' } as const

const common = { tag: 'reports', limit: 'write', load: loadLocked, version: versionOf } as const

const submitRoute = route({
  ...common,
  id: 'submit-report',
  method: 'post',
  path: '/reports/:report/submit',
  summary: 'Sends a report to review, to one reviewer or to all who could be',
  body: { type: 'object', properties: { reviewer: REVIEWER }, additionalProperties: false },
  policy: { action: 'report.submit', about: factsOf },
  answers: { 200: REPORT_SCHEMA },
  async run(call) {
    const { body, subject } = call
    const chosen = body.reviewer === undefined ? subject : await chooseReviewer(call, body.reviewer)
    if (isRefused(chosen)) return chosen
    const stage = { ...call, subject: chosen }
    const answer = await step(stage, 'submit')
    if (!isRefused(answer)) await askForReview(stage)
    return answer
  },
})

const recallRoute = route({
  ...common,
  id: 'recall-report',
  method: 'post',
  path: '/reports/:report/recall',
  summary: 'Takes a report back from review',
  body: { type: 'object', properties: {}, additionalProperties: false },
  policy: { action: 'report.recall', about: factsOf },
  answers: { 200: REPORT_SCHEMA },
  run: (call) => step(call, 'recall'),
})

const discardRoute = route({
  ...common,
  id: 'discard-report',
  method: 'delete',
  path: '/reports/:report',
  summary: 'Discards a report that was not issued; what was done stays in the audit events',
  policy: { action: 'report.discard', about: factsOf },
  answers: { 204: null },
  async run({ tx, actor, subject, now }) {
    const done = await discardReport(tx, { organisation: actor.organisation, report: subject, now })
    return done ? { audit: { reference: subject.reference, revision: subject.revision } } : refuse('conflict')
  },
})

const reviewerRoute = route({
  ...common,
  id: 'assign-reviewer',
  method: 'put',
  path: '/reports/:report/reviewer',
  summary: 'Names the reviewer of a report, or nobody',
  body: { type: 'object', properties: { reviewer: REVIEWER }, required: ['reviewer'], additionalProperties: false },
  policy: { action: 'report.assign', about: factsOf },
  answers: { 200: REPORT_SCHEMA },
  async run(call) {
    const { body, subject } = call
    const chosen = await chooseReviewer(call, body.reviewer ?? null)
    if (isRefused(chosen)) return chosen
    if (chosen.state === 'in review') await askForReview({ ...call, subject: chosen })
    return {
      ...(await answerReport(call, subject.report_id, { reviewer: body.reviewer })),
      body: presentReport(chosen),
    }
  },
})

export const REPORT_STEP_ROUTES = [submitRoute, recallRoute, discardRoute, reviewerRoute]
