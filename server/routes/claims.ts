import { claimsOf } from '#server/commands/claims.ts'
import { judgedRevision } from '#server/commands/judged-revision.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { CLAIM_SCHEMA, presentClaim } from '#server/presenters/claim.ts'
import { factsOf, loadReport } from './loads.ts'

const claimsRoute = route({
  id: 'list-claims',
  method: 'get',
  path: '/reports/:report/claims',
  summary: 'What a revision says of instruments and of the operator, where the registers of the house know otherwise',
  tag: 'reports',
  query: {
    type: 'object',
    properties: { revision: { type: 'integer', minimum: 1, maximum: 1_000_000 } },
    additionalProperties: false,
  },
  policy: { action: 'report.read', about: factsOf },
  scope: 'report.read',
  limit: 'read',
  load: loadReport,
  answers: {
    200: {
      type: 'object',
      properties: { revision: { type: 'integer' }, claims: { type: 'array', items: CLAIM_SCHEMA } },
      required: ['revision', 'claims'],
    },
  },
  async run({ tx, actor, query, subject, now }) {
    const revision = query.revision ?? subject.revision
    const found = await judgedRevision(tx, actor.organisation, subject.report_id, revision)
    if (found === undefined) return refuse('not-found')
    const claims = await claimsOf(tx, actor.organisation, found.judged, now)
    return { body: { revision, claims: claims.map((claim) => presentClaim(claim, found.judged)) } }
  },
})

export const CLAIM_ROUTES = [claimsRoute]
