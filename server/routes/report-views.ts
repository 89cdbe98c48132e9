import { compare } from '#core/report/compare.ts'
import { countVerdicts, toldFindings } from '#core/report/told.ts'
import { draftModel, judgedRevision } from '#server/commands/judged-revision.ts'
import { noteRead } from '#server/commands/note-read.ts'
import { renderDraft } from '#server/commands/render-draft.ts'
import { isRefused, refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { FINDING_SCHEMA, presentFinding } from '#server/presenters/finding.ts'
import { factsOf, loadReport } from './loads.ts'

const REVISION = { type: 'integer', minimum: 1, maximum: 1_000_000 } as const

const ONE_REVISION = { type: 'object', properties: { revision: REVISION }, additionalProperties: false } as const

const common = {
  tag: 'reports',
  policy: { action: 'report.read', about: factsOf },
  scope: 'report.read',
  load: loadReport,
} as const

const modelRoute = route({
  ...common,
  id: 'show-model',
  method: 'get',
  path: '/reports/:report/model',
  summary:
    'The document model of a revision (the newest when none is named): what the sheet shows and remarks hold on to',
  query: ONE_REVISION,
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: { revision: { type: 'integer' }, sha256: { type: 'string' }, model: { type: 'object' } },
      required: ['revision', 'sha256', 'model'],
    },
  },
  async run(call) {
    const { tx, actor, query, subject } = call
    const found = await judgedRevision(tx, actor.organisation, subject.report_id, query.revision ?? subject.revision)
    if (found === undefined) return refuse('not-found')
    await noteRead(call, 'model')
    return { body: { revision: found.revision, sha256: found.sha256, model: draftModel(found) } }
  },
})

const findingsRoute = route({
  ...common,
  id: 'list-findings',
  method: 'get',
  path: '/reports/:report/findings',
  summary: 'The findings of a revision in words, with their places in the file',
  query: {
    ...ONE_REVISION,
    properties: { ...ONE_REVISION.properties, all: { type: 'boolean' } },
  },
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: {
        revision: { type: 'integer' },
        outcome: { type: 'string' },
        findings: { type: 'array', items: FINDING_SCHEMA },
        counts: { type: 'object' },
      },
      required: ['revision', 'outcome', 'findings', 'counts'],
    },
  },
  async run({ tx, actor, query, subject }) {
    const found = await judgedRevision(tx, actor.organisation, subject.report_id, query.revision ?? subject.revision)
    if (found === undefined) return refuse('not-found')
    const { judged, lifted, revision } = found
    return {
      body: {
        revision,
        outcome: lifted.outcome,
        findings: toldFindings(judged, query.all ?? false).map(presentFinding),
        counts: countVerdicts(judged.findings),
      },
    }
  },
})

const compareRoute = route({
  ...common,
  id: 'compare-revisions',
  method: 'get',
  path: '/reports/:report/compare',
  summary: 'What changed between two revisions by meaning: values, and verdicts that flipped',
  query: {
    type: 'object',
    properties: { from: REVISION, to: REVISION },
    required: ['from', 'to'],
    additionalProperties: false,
  },
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: {
        from: { type: 'integer' },
        to: { type: 'integer' },
        verdicts: { type: 'array', items: { type: 'object' } },
        values: { type: 'array', items: { type: 'object' } },
      },
      required: ['from', 'to', 'verdicts', 'values'],
    },
  },
  async run({ tx, actor, query, subject }) {
    const before = await judgedRevision(tx, actor.organisation, subject.report_id, query.from)
    const after = await judgedRevision(tx, actor.organisation, subject.report_id, query.to)
    if (before === undefined || after === undefined) return refuse('not-found')
    return { body: { from: query.from, to: query.to, ...compare(before.judged, after.judged) } }
  },
})

const draftRoute = route({
  ...common,
  id: 'show-draft',
  method: 'get',
  path: '/reports/:report/draft.pdf',
  summary: 'A revision as a PDF, marked as a draft on every page',
  query: ONE_REVISION,
  limit: 'heavy',
  answers: { 200: { media: 'application/pdf' } },
  async run({ tx, actor, query, subject }) {
    const found = await judgedRevision(tx, actor.organisation, subject.report_id, query.revision ?? subject.revision)
    if (found === undefined) return refuse('not-found')
    const drawn = renderDraft(found)
    if (isRefused(drawn)) return drawn
    return {
      bytes: drawn.bytes,
      type: 'application/pdf',
      headers: { 'content-disposition': 'attachment; filename="draft.pdf"' },
    }
  },
})

export const VIEW_ROUTES = [modelRoute, findingsRoute, compareRoute, draftRoute]
