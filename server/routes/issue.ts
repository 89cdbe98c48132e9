import { correctReport, withdrawReport } from '#server/commands/end-report.ts'
import { issueReport } from '#server/commands/issue-report.ts'
import { route } from '#server/http/route.ts'
import { REPORT_SCHEMA } from '#server/presenters/report.ts'
import { factsOf, loadLocked, versionOf } from './loads.ts'

const PASSWORD = { type: 'string', minLength: 1, maxLength: 256 } as const
const CODE = { type: 'string', minLength: 6, maxLength: 20 } as const
/** What is printed and registered: one line without control characters. */
const REASON = { type: 'string', minLength: 3, maxLength: 1000, pattern: '^[^\\u0000-\\u001f\\u007f]*$' } as const

const common = {
  tag: 'issue',
  limit: 'write',
  idempotency: 'required',
  load: loadLocked,
  version: versionOf,
} as const

const issueRoute = route({
  ...common,
  id: 'issue-report',
  method: 'post',
  path: '/reports/:report/issue',
  summary: 'Issues an approved report under the next number; the password is asked for again',
  body: {
    type: 'object',
    properties: { password: PASSWORD, code: CODE },
    required: ['password'],
    additionalProperties: false,
  },
  policy: { action: 'report.issue', about: factsOf },
  again: true,
  answers: { 200: REPORT_SCHEMA },
  run: (call) => issueReport(call),
})

const correctRoute = route({
  ...common,
  id: 'correct-report',
  method: 'post',
  path: '/reports/:report/correct',
  summary: 'Begins the report that will take an issued one’s place, and names it with the reason',
  body: { type: 'object', properties: { reason: REASON }, required: ['reason'], additionalProperties: false },
  policy: { action: 'report.correct', about: factsOf },
  answers: { 201: REPORT_SCHEMA },
  run: (call) => correctReport(call, call.body.reason),
})

const withdrawRoute = route({
  ...common,
  id: 'withdraw-report',
  method: 'post',
  path: '/reports/:report/withdraw',
  summary: 'Takes an issued report back for a reason; its document and number stay in the register',
  body: {
    type: 'object',
    properties: { reason: REASON, password: PASSWORD, code: CODE },
    required: ['reason', 'password'],
    additionalProperties: false,
  },
  policy: { action: 'report.withdraw', about: factsOf },
  again: true,
  answers: { 200: REPORT_SCHEMA },
  run: (call) => withdrawReport(call, call.body.reason),
})

export const ISSUE_ROUTES = [issueRoute, correctRoute, withdrawRoute]
