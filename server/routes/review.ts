import { decide } from '#server/commands/decide.ts'
import { reviewStanding } from '#server/commands/review-standing.ts'
import { submitReview } from '#server/commands/submit-review.ts'
import { route } from '#server/http/route.ts'
import { REPORT_SCHEMA } from '#server/presenters/report.ts'
import { presentReview, presentStanding, REVIEW_SCHEMA, STANDING_SCHEMA } from '#server/presenters/review.ts'
import { listReviews } from '#server/queries/reviews.ts'
import { factsOf, loadLocked, loadReport, versionOf } from './loads.ts'

const SUMMARY = { type: 'string', maxLength: 4000 } as const

const standingRoute = route({
  id: 'show-review',
  method: 'get',
  path: '/reports/:report/review',
  summary: 'Where a report stands in review: reviews so far, what is to be decided, what keeps it from being issued',
  tag: 'review',
  policy: { action: 'report.read', about: factsOf },
  limit: 'read',
  load: loadReport,
  answers: {
    200: {
      ...STANDING_SCHEMA,
      properties: { ...STANDING_SCHEMA.properties, reviews: { type: 'array', items: REVIEW_SCHEMA } },
    },
  },
  async run({ tx, actor, subject }) {
    const standing = await reviewStanding(tx, actor.organisation, subject)
    const reviews = await listReviews(tx, actor.organisation, subject.report_id)
    return { body: { ...presentStanding(standing), reviews: reviews.map(presentReview) } }
  },
})

const submitRoute = route({
  id: 'submit-review',
  method: 'post',
  path: '/reports/:report/review',
  summary: 'Submits the caller’s review: its remarks become visible together, with the decision',
  tag: 'review',
  body: {
    type: 'object',
    properties: { decision: { type: 'string', enum: ['remarks', 'returned', 'approved'] }, summary: SUMMARY },
    required: ['decision'],
    additionalProperties: false,
  },
  policy: { action: 'report.annotate', about: factsOf },
  limit: 'write',
  load: loadLocked,
  version: versionOf,
  answers: { 200: REPORT_SCHEMA },
  run: (call) => submitReview(call, { decision: call.body.decision, summary: call.body.summary ?? '' }),
})

const returnRoute = route({
  id: 'return-report',
  method: 'post',
  path: '/reports/:report/return',
  summary: 'Returns a report to its authors, with the remarks of the caller’s review',
  tag: 'review',
  body: {
    type: 'object',
    properties: { summary: { ...SUMMARY, minLength: 1 } },
    required: ['summary'],
    additionalProperties: false,
  },
  policy: { action: 'report.return', about: factsOf },
  limit: 'write',
  load: loadLocked,
  version: versionOf,
  answers: { 200: REPORT_SCHEMA },
  run: (call) => submitReview(call, { decision: 'returned', summary: call.body.summary }),
})

const approveRoute = route({
  id: 'approve-report',
  method: 'post',
  path: '/reports/:report/approve',
  summary: 'Approves the newest revision; refused with all that stands in the way',
  tag: 'review',
  body: { type: 'object', properties: { summary: SUMMARY }, additionalProperties: false },
  policy: { action: 'report.approve', about: factsOf },
  limit: 'write',
  load: loadLocked,
  version: versionOf,
  answers: { 200: REPORT_SCHEMA },
  run: (call) => submitReview(call, { decision: 'approved', summary: call.body.summary ?? '' }),
})

const acceptRoute = route({
  id: 'decide-departure',
  method: 'post',
  path: '/reports/:report/acceptances',
  summary: 'Accepts or refuses one limitation or departure, in exactly the words that were read',
  tag: 'review',
  body: {
    type: 'object',
    properties: {
      anchor: { type: 'string', minLength: 1, maxLength: 300 },
      words_sha256: { type: 'string', pattern: '^[0-9a-f]{64}$' },
      accepted: { type: 'boolean' },
      reason: { type: 'string', maxLength: 2000 },
    },
    required: ['anchor', 'words_sha256', 'accepted'],
    additionalProperties: false,
  },
  policy: { action: 'report.accept', about: factsOf },
  limit: 'write',
  load: loadLocked,
  answers: { 201: STANDING_SCHEMA },
  async run(call) {
    const { anchor, words_sha256, accepted, reason = '' } = call.body
    const refused = await decide(call, { anchor, wordsSha256: words_sha256, accepted, reason })
    if (refused !== undefined) return refused
    const standing = await reviewStanding(call.tx, call.actor.organisation, call.subject)
    return { status: 201, body: presentStanding(standing), audit: { anchor, words_sha256, accepted, reason } }
  },
})

export const REVIEW_ROUTES = [standingRoute, submitRoute, returnRoute, approveRoute, acceptRoute]
