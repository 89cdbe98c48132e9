import { answerThread, assignThread, beginThread } from '#server/commands/annotate.ts'
import { refuse } from '#server/http/problems.ts'
import { type Answer, type Call, route } from '#server/http/route.ts'
import { presentThread, REGION_SCHEMA, THREAD_SCHEMA } from '#server/presenters/thread.ts'
import { listRemarks } from '#server/queries/remarks.ts'
import type { Report } from '#server/queries/reports.ts'
import { deleteDraftThread, findThread, listThreads, type ThreadRow, updateThread } from '#server/queries/threads.ts'
import { factsOf, loadLocked, loadReport } from './loads.ts'

const BODY = { type: 'string', minLength: 1, maxLength: 4000 } as const
const PERSON = { type: ['string', 'null'], format: 'uuid' } as const

interface InReport {
  readonly report: Report
  readonly thread: ThreadRow
}

type Named = Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor' | 'params'>

async function loadThread(call: Named): Promise<InReport | undefined> {
  const report = await loadLocked(call)
  if (report === undefined) return undefined
  const { tx, actor, params } = call
  const thread = await findThread(tx, {
    organisation: actor.organisation,
    report: report.report_id,
    thread: params['thread'] ?? '',
    viewer: actor.person,
  })
  return thread === undefined ? undefined : { report, thread }
}

/** The thread as the caller sees it now. */
async function shown({ tx, actor }: Pick<Named, 'tx' | 'actor'>, report: string, id: string): Promise<Answer> {
  const { organisation, person } = actor
  const thread = await findThread(tx, { organisation, report, thread: id, viewer: person })
  if (thread === undefined) throw new Error(`Thread ${id} cannot be read back.`)
  const remarks = await listRemarks(tx, organisation, [id], person)
  return { body: presentThread(thread, remarks), version: thread.version, audit: { thread: id } }
}

const listRoute = route({
  id: 'list-threads',
  method: 'get',
  path: '/reports/:report/threads',
  summary: 'Remarks, questions and corrections of a report, with the caller’s own drafts',
  tag: 'review',
  policy: { action: 'report.read', about: factsOf },
  limit: 'read',
  load: loadReport,
  answers: {
    200: { type: 'object', properties: { threads: { type: 'array', items: THREAD_SCHEMA } }, required: ['threads'] },
  },
  async run({ tx, actor, subject }) {
    const { organisation, person } = actor
    const threads = await listThreads(tx, organisation, subject.report_id, person)
    const ids = threads.map(({ thread_id }) => thread_id)
    const remarks = await listRemarks(tx, organisation, ids, person)
    return { body: { threads: threads.map((thread) => presentThread(thread, remarks)) } }
  },
})

const beginRoute = route({
  id: 'begin-thread',
  method: 'post',
  path: '/reports/:report/threads',
  summary: 'A remark, question or correction at a place of the report; a draft until the review is submitted',
  tag: 'review',
  body: {
    type: 'object',
    properties: {
      anchor: { type: 'string', minLength: 1, maxLength: 300 },
      kind: { type: 'string', enum: ['remark', 'question', 'correction'] },
      body: BODY,
      region: REGION_SCHEMA,
      assigned_to: PERSON,
    },
    required: ['anchor', 'kind', 'body'],
    additionalProperties: false,
  },
  policy: { action: 'report.annotate', about: factsOf },
  limit: 'write',
  load: loadLocked,
  answers: { 201: THREAD_SCHEMA },
  async run(call) {
    const { anchor, kind, body, region = null, assigned_to = null } = call.body
    const thread = await beginThread(call, { anchor, kind, body, region, assignedTo: assigned_to })
    if (typeof thread !== 'string') return thread
    return { ...(await shown(call, call.subject.report_id, thread)), status: 201 }
  },
})

const common = { tag: 'review', limit: 'write', load: loadThread } as const
const aboutReport = ({ report }: InReport) => factsOf(report)

const answerRoute = route({
  ...common,
  id: 'answer-thread',
  method: 'post',
  path: '/reports/:report/threads/:thread/remarks',
  summary: 'An answer in a thread; a reviewer’s waits for the review to be submitted',
  body: { type: 'object', properties: { body: BODY }, required: ['body'], additionalProperties: false },
  policy: { action: 'report.answer', about: aboutReport },
  answers: { 201: THREAD_SCHEMA },
  async run(call) {
    const { report, thread } = call.subject
    const said = await answerThread({ ...call, subject: report }, thread, call.body.body)
    if (typeof said !== 'string') return said
    return { ...(await shown(call, report.report_id, thread.thread_id)), status: 201 }
  },
})

const assignRoute = route({
  ...common,
  id: 'assign-thread',
  method: 'put',
  path: '/reports/:report/threads/:thread/assignee',
  summary: 'Gives a thread to somebody, or to nobody',
  body: { type: 'object', properties: { assigned_to: PERSON }, required: ['assigned_to'], additionalProperties: false },
  policy: { action: 'report.answer', about: aboutReport },
  version: ({ thread }) => thread.version,
  answers: { 200: THREAD_SCHEMA },
  async run(call) {
    const { report, thread } = call.subject
    const refused = await assignThread({ ...call, subject: report }, thread, call.body.assigned_to ?? null)
    return refused ?? (await shown(call, report.report_id, thread.thread_id))
  },
})

const settle = (id: 'resolve-thread' | 'reopen-thread', summary: string, state: 'resolved' | 'open') =>
  route({
    ...common,
    id,
    method: 'post',
    path: `/reports/:report/threads/:thread/${id === 'resolve-thread' ? 'resolve' : 'reopen'}`,
    summary,
    body: { type: 'object', properties: {}, additionalProperties: false },
    policy: { action: 'report.annotate', about: aboutReport },
    version: ({ thread }) => thread.version,
    answers: { 200: THREAD_SCHEMA },
    async run(call) {
      const { report, thread } = call.subject
      if (thread.published_at === null) return refuse('conflict', 'A draft is not settled: change it or delete it.')
      if (!(await updateThread(call.tx, call.actor.organisation, thread, { state }))) return refuse('conflict')
      return await shown(call, report.report_id, thread.thread_id)
    },
  })

const deleteRoute = route({
  ...common,
  id: 'delete-thread',
  method: 'delete',
  path: '/reports/:report/threads/:thread',
  summary: 'Deletes a draft of one’s own',
  policy: { action: 'report.annotate', about: aboutReport },
  answers: { 204: null },
  async run({ tx, actor, subject }) {
    const gone = await deleteDraftThread(tx, actor.organisation, subject.thread.thread_id, actor.person)
    return gone ? {} : refuse('conflict', 'What was published stays as it was said.')
  },
})

export const THREAD_ROUTES = [
  listRoute,
  beginRoute,
  answerRoute,
  assignRoute,
  settle('resolve-thread', 'Settles a thread', 'resolved'),
  settle('reopen-thread', 'Opens a settled thread again', 'open'),
  deleteRoute,
]
