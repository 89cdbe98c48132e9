import type { Actor } from '#core/policy/roles.ts'
import { REPORT_STATES, WRITABLE } from '#core/policy/states.ts'
import { judgeSource, type Lifted } from '#server/commands/judge-source.ts'
import type { Tx } from '#server/db.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { type Answer, route } from '#server/http/route.ts'
import { NO_SOURCE, sourceBytes } from '#server/http/source-body.ts'
import {
  presentReport,
  presentReportWithHands,
  REPORT_SCHEMA,
  REPORT_WITH_HANDS_SCHEMA,
} from '#server/presenters/report.ts'
import { cursorOf, cursorText, listReports } from '#server/queries/report-list.ts'
import { findByReference, findReport, insertReport, insertRevision, type Report } from '#server/queries/reports.ts'
import { findSource } from '#server/queries/revisions.ts'

const PAGE = { type: 'integer', minimum: 1, maximum: 100, default: 50 } as const

const about = ({ facts }: Report) => facts

const listRoute = route({
  id: 'list-reports',
  method: 'get',
  path: '/reports',
  summary: 'Reports of the organisation, newest change first, a page at a time',
  tag: 'reports',
  query: {
    type: 'object',
    properties: {
      state: { type: 'string', enum: REPORT_STATES },
      search: { type: 'string', minLength: 1, maxLength: 100 },
      after: { type: 'string', maxLength: 200 },
      limit: PAGE,
    },
    additionalProperties: false,
  },
  policy: { action: 'report.list' },
  scope: 'report.read',
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: { reports: { type: 'array', items: REPORT_SCHEMA }, next: { type: ['string', 'null'] } },
      required: ['reports', 'next'],
    },
  },
  async run({ tx, actor, query }) {
    const { limit = 50, after, state, search } = query
    const cursor = after === undefined ? undefined : cursorOf(after)
    if (after !== undefined && cursor === undefined)
      return refuse('bad-request', undefined, {
        errors: [{ pointer: '/after', message: 'Take the value of `next` of the page before.' }],
      })
    const issuedOnly = actor.roles.every((role) => role === 'auditor')
    const rows = await listReports(tx, {
      organisation: actor.organisation,
      issuedOnly,
      limit,
      ...(state === undefined ? {} : { state }),
      ...(search === undefined ? {} : { search }),
      ...(cursor === undefined ? {} : { after: cursor }),
    })
    const page = rows.slice(0, limit)
    const last = page.at(-1)
    const next =
      rows.length > limit && last !== undefined
        ? cursorText({ at: last.updated_at.toISOString(), id: last.report_id })
        : null
    return { body: { reports: page.map(presentReport), next } }
  },
})

const showRoute = route({
  id: 'show-report',
  method: 'get',
  path: '/reports/:report',
  summary: 'One report',
  tag: 'reports',
  policy: { action: 'report.read', about },
  scope: 'report.read',
  limit: 'read',
  load: ({ tx, actor, params }) => findReport(tx, actor.organisation, params['report'] ?? ''),
  answers: { 200: REPORT_WITH_HANDS_SCHEMA },
  async run({ subject }) {
    return { body: presentReportWithHands(subject), version: subject.version }
  },
})

/** The answer for a file that was sent before, or whose reference is taken; nothing for one that is new. */
async function knownReport(tx: Tx, { organisation }: Actor, lifted: Lifted): Promise<Answer | Refused | undefined> {
  const id = await findByReference(tx, organisation, lifted.reference)
  const report = id === undefined ? undefined : await findReport(tx, organisation, id)
  if (report === undefined) return undefined
  const newest = await findSource(tx, organisation, report.report_id, report.revision)
  if (newest?.sha256 === lifted.sha256) return { status: 200, body: presentReport(report), version: report.version }
  if (WRITABLE.includes(report.state))
    return refuse('conflict', `There is a report ${report.reference} already: send the file as its next revision.`, {
      more: { existing: presentReport(report) },
    })
  return refuse(
    'conflict',
    `There is a report ${report.reference} already, and it is ${report.state}. Have it returned, correct it by a new one, or give this file another reference.`,
  )
}

const createRoute = route({
  id: 'create-report',
  method: 'post',
  path: '/reports',
  summary: 'A new report from an install file',
  tag: 'reports',
  accepts: 'source',
  query: {
    type: 'object',
    properties: {
      file_name: { type: 'string', minLength: 1, maxLength: 200 },
      same_reference: {
        type: 'string',
        enum: ['new', 'refuse'],
        default: 'new',
        description: 'What to do when a report with the reference of the file is there already.',
      },
    },
    required: ['file_name'],
    additionalProperties: false,
  },
  policy: { action: 'report.create' },
  scope: 'report.send',
  limit: 'write',
  idempotency: 'required',
  answers: { 200: REPORT_SCHEMA, 201: REPORT_SCHEMA },
  async run({ tx, actor, query, body, now }) {
    const bytes = sourceBytes(body)
    if (bytes === undefined) return NO_SOURCE
    const judged = judgeSource(bytes)
    if (!judged.ok) return refuse('file-refused', undefined, { errors: judged.errors })
    const { organisation, person } = actor
    const { lifted } = judged
    if (query.same_reference === 'refuse') {
      const known = await knownReport(tx, actor, lifted)
      if (known !== undefined) return known
    }
    const report = await insertReport(tx, { organisation, person, lifted, now })
    await insertRevision(tx, {
      organisation,
      report,
      revision: 1,
      person,
      source: bytes,
      fileName: query.file_name,
      lifted,
      now,
    })
    const made = await findReport(tx, organisation, report)
    if (made === undefined) throw new Error('The new report cannot be read back.')
    return {
      status: 201,
      body: presentReport(made),
      version: made.version,
      headers: { location: `/api/reports/${report}` },
      audit: { report, sha256: lifted.sha256 },
    }
  },
})

export const REPORT_ROUTES = [listRoute, showRoute, createRoute]
