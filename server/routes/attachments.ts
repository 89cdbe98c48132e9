import { contentDisposition } from '#server/files/names.ts'
import { objectKey } from '#server/files/object-key.ts'
import { refuse } from '#server/http/problems.ts'
import { type Call, route } from '#server/http/route.ts'
import { ATTACHMENT_SCHEMA, presentAttachment } from '#server/presenters/attachment.ts'
import { type AttachmentRow, findAttachment, listAttachments, removeAttachment } from '#server/queries/attachments.ts'
import { findReport, type Report } from '#server/queries/reports.ts'
import { factsOf, loadReport } from './loads.ts'

interface InReport {
  readonly report: Report
  readonly attachment: AttachmentRow
}

async function loadAttachment({
  tx,
  actor,
  params,
}: Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor' | 'params'>): Promise<InReport | undefined> {
  const attachment = await findAttachment(tx, actor.organisation, params['attachment'] ?? '')
  const report = attachment && (await findReport(tx, actor.organisation, attachment.report_id))
  return attachment && report ? { attachment, report } : undefined
}

const about = ({ report }: InReport) => report.facts

const listRoute = route({
  id: 'list-attachments',
  method: 'get',
  path: '/reports/:report/attachments',
  summary: 'The photos of a report',
  tag: 'photos',
  policy: { action: 'report.read', about: factsOf },
  limit: 'read',
  load: loadReport,
  answers: {
    200: {
      type: 'object',
      properties: { attachments: { type: 'array', items: ATTACHMENT_SCHEMA } },
      required: ['attachments'],
    },
  },
  async run({ tx, actor, subject }) {
    const rows = await listAttachments(tx, actor.organisation, subject.report_id)
    return { body: { attachments: rows.map(presentAttachment) } }
  },
})

const photoRoute = route({
  id: 'show-photo',
  method: 'get',
  path: '/attachments/:attachment/photo',
  summary: 'The photo itself, as it was made anew',
  tag: 'photos',
  policy: { action: 'report.read', about },
  limit: 'read',
  load: loadAttachment,
  answers: { 200: { media: 'image/jpeg' } },
  async run({ actor, subject, services }) {
    const { sha256, name } = subject.attachment
    const object = await services.store.get(objectKey({ organisation: actor.organisation, kind: 'photo', sha256 }))
    if (object === undefined)
      return refuse(
        'unavailable',
        'The photo is in the record, but not in the storage. The administrator has to look into it.',
      )
    return {
      bytes: object.stream,
      type: 'image/jpeg',
      headers: { 'content-disposition': contentDisposition('inline', name), 'x-sha256': sha256 },
    }
  },
})

const removeRoute = route({
  id: 'remove-attachment',
  method: 'delete',
  path: '/attachments/:attachment',
  summary: 'Takes a photo out of a report that may still change; its bytes stay in the record',
  tag: 'photos',
  policy: { action: 'report.attach', about },
  limit: 'write',
  load: loadAttachment,
  about: ({ subject }) => `report/${subject.report.report_id}`,
  answers: { 204: null },
  async run({ tx, actor, subject, now }) {
    const { attachment_id, name, sha256 } = subject.attachment
    await removeAttachment(tx, actor.organisation, attachment_id, now)
    return { audit: { attachment: attachment_id, name, sha256 } }
  },
})

export const ATTACHMENT_ROUTES = [listRoute, photoRoute, removeRoute]
