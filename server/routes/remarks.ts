import { refuse } from '#server/http/problems.ts'
import { type Call, route } from '#server/http/route.ts'
import { countRemarks, deleteRemark, findDraftRemark, rewriteRemark } from '#server/queries/remarks.ts'
import type { Report } from '#server/queries/reports.ts'
import { deleteDraftThread } from '#server/queries/threads.ts'
import { factsOf, loadLocked } from './loads.ts'

interface InReport {
  readonly report: Report
  readonly remark: { readonly remark_id: string; readonly thread_id: string }
}

async function loadDraft(
  call: Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor' | 'params'>,
): Promise<InReport | undefined> {
  const report = await loadLocked(call)
  if (report === undefined) return undefined
  const { tx, actor, params } = call
  const remark = await findDraftRemark(tx, {
    organisation: actor.organisation,
    report: report.report_id,
    remark: params['remark'] ?? '',
    person: actor.person,
  })
  return remark === undefined ? undefined : { report, remark }
}

const common = {
  path: '/reports/:report/remarks/:remark',
  tag: 'review',
  policy: { action: 'report.annotate', about: ({ report }: InReport) => factsOf(report) },
  limit: 'write',
  load: loadDraft,
} as const

const rewriteRoute = route({
  ...common,
  id: 'rewrite-remark',
  method: 'patch',
  summary: 'Changes a draft remark of one’s own',
  body: {
    type: 'object',
    properties: { body: { type: 'string', minLength: 1, maxLength: 4000 } },
    required: ['body'],
    additionalProperties: false,
  },
  answers: { 204: null },
  async run({ tx, actor, body, subject }) {
    await rewriteRemark(tx, actor.organisation, subject.remark.remark_id, body.body)
    return {}
  },
})

const deleteRoute = route({
  ...common,
  id: 'delete-remark',
  method: 'delete',
  summary: 'Deletes a draft remark of one’s own; the only one of a draft thread takes the thread along',
  answers: { 204: null },
  async run({ tx, actor, subject }) {
    const { remark_id, thread_id } = subject.remark
    const only = (await countRemarks(tx, actor.organisation, thread_id)) === 1
    if (!only) await deleteRemark(tx, actor.organisation, remark_id)
    else if (!(await deleteDraftThread(tx, actor.organisation, thread_id, actor.person))) return refuse('conflict')
    return {}
  },
})

export const REMARK_ROUTES = [rewriteRoute, deleteRoute]
