import { addRevision } from '#server/commands/add-revision.ts'
import { isRefused, refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { NO_SOURCE, sourceBytes } from '#server/http/source-body.ts'
import { presentReport, REPORT_SCHEMA } from '#server/presenters/report.ts'
import { presentRevision, REVISION_SCHEMA } from '#server/presenters/revision.ts'
import { findReport } from '#server/queries/reports.ts'
import { findSource, listRevisions } from '#server/queries/revisions.ts'
import { factsOf, loadLocked, loadReport, versionOf } from './loads.ts'

const listRoute = route({
  id: 'list-revisions',
  method: 'get',
  path: '/reports/:report/revisions',
  summary: 'Every upload of a report’s file, the newest first',
  tag: 'reports',
  policy: { action: 'report.read', about: factsOf },
  scope: 'report.read',
  limit: 'read',
  load: loadReport,
  answers: {
    200: {
      type: 'object',
      properties: { revisions: { type: 'array', items: REVISION_SCHEMA } },
      required: ['revisions'],
    },
  },
  async run({ tx, actor, subject }) {
    const rows = await listRevisions(tx, actor.organisation, subject.report_id)
    return { body: { revisions: rows.map(presentRevision) } }
  },
})

const createRoute = route({
  id: 'create-revision',
  method: 'post',
  path: '/reports/:report/revisions',
  summary: 'A new revision of the file; threads are carried along. The same bytes again store nothing',
  tag: 'reports',
  accepts: 'source',
  query: {
    type: 'object',
    properties: { file_name: { type: 'string', minLength: 1, maxLength: 200 } },
    required: ['file_name'],
    additionalProperties: false,
  },
  policy: { action: 'report.revise', about: factsOf },
  scope: 'report.send',
  limit: 'write',
  idempotency: 'required',
  load: loadLocked,
  version: versionOf,
  answers: { 200: REPORT_SCHEMA, 201: REPORT_SCHEMA },
  async run({ tx, actor, query, body, subject, now }) {
    const source = sourceBytes(body)
    if (source === undefined) return NO_SOURCE
    const { organisation, person } = actor
    const added = await addRevision(tx, {
      organisation,
      person,
      report: subject,
      source,
      fileName: query.file_name,
      now,
    })
    if (isRefused(added)) return added
    const report = await findReport(tx, organisation, subject.report_id)
    if (report === undefined) throw new Error('The report cannot be read back.')
    return {
      status: added.threads === null ? 200 : 201,
      body: presentReport(report),
      version: report.version,
      audit: { revision: added.revision, sha256: added.sha256, threads: added.threads },
    }
  },
})

const sourceRoute = route({
  id: 'show-source',
  method: 'get',
  path: '/reports/:report/revisions/:revision/source',
  summary: 'The install file of a revision, byte for byte as it was uploaded',
  tag: 'reports',
  policy: { action: 'report.read', about: factsOf },
  scope: 'report.read',
  limit: 'read',
  load: loadReport,
  answers: { 200: { media: 'application/yaml' } },
  async run({ tx, actor, subject, params }) {
    const revision = Number(params['revision'])
    const source = Number.isSafeInteger(revision)
      ? await findSource(tx, actor.organisation, subject.report_id, revision)
      : undefined
    if (source === undefined) return refuse('not-found')
    return {
      bytes: source.source,
      type: 'application/yaml; charset=utf-8',
      headers: { 'content-disposition': 'attachment; filename="source.skerry.yaml"', 'x-sha256': source.sha256 },
    }
  },
})

export const REVISION_ROUTES = [listRoute, createRoute, sourceRoute]
