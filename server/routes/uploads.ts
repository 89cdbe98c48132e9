import { randomUUID } from 'node:crypto'
import { PHOTO_LIMITS } from '#server/files/photo-limits.ts'
import type { Checked, Upload } from '#server/files/upload.ts'
import { uploadWords } from '#server/files/upload-words.ts'
import { uploads } from '#server/files/uploads.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { type Answer, type Call, route } from '#server/http/route.ts'
import { presentUploadRow, UPLOAD_SCHEMA } from '#server/presenters/attachment.ts'
import { attachmentWeight } from '#server/queries/attachments.ts'
import { findReport, type Report } from '#server/queries/reports.ts'
import { type Destination, findUpload, listUploads, type UploadRow, uploadLog } from '#server/queries/uploads.ts'
import { factsOf, loadReport } from './loads.ts'

/** A photo that was begun on site may be finished days later. */
const LIFETIME_MS = 14 * 24 * 60 * 60 * 1000

/** What one report takes: photos, and bytes of them all. */
const MOST_PHOTOS = 200
const MOST_BYTES = 400_000_000

interface InReport {
  readonly report: Report
  readonly upload: UploadRow
}

type Named = Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor' | 'params' | 'services'>

/** An upload is its sender's own until the photo is part of the report. */
async function loadUpload({ tx, actor, params }: Named): Promise<InReport | undefined> {
  const upload = await findUpload(tx, actor.organisation, params['upload'] ?? '')
  if (upload === undefined || upload.person_id !== actor.person) return undefined
  const report = await findReport(tx, actor.organisation, upload.report_id)
  return report === undefined ? undefined : { report, upload }
}

const about = ({ report }: InReport) => report.facts

const uploadsOf = ({ tx, services }: Pick<Named, 'tx' | 'services'>, destination: Destination) =>
  uploads({
    log: uploadLog(tx, destination),
    store: services.store,
    now: services.clock,
    newId: randomUUID,
    limit: PHOTO_LIMITS.bytes,
    lifetime: LIFETIME_MS,
  })

const destinationOf = ({ report_id, anchor }: UploadRow): Destination => ({ report: report_id, anchor })
const whose = ({ actor }: Pick<Named, 'actor'>) => ({ organisation: actor.organisation, uploader: actor.person })

async function shown(
  call: Pick<Named, 'tx' | 'actor'>,
  checked: Checked<Upload>,
  status = 200,
): Promise<Answer | Refused> {
  if (!checked.ok) {
    const missing = checked.problem.code === 'incomplete' ? { more: { missing: checked.problem.missing } } : {}
    return refuse(
      checked.problem.code === 'too-large' ? 'too-large' : 'conflict',
      uploadWords(checked.problem),
      missing,
    )
  }
  const row = await findUpload(call.tx, call.actor.organisation, checked.value.id)
  if (row === undefined) throw new Error('An upload cannot be read back.')
  return { status, body: presentUploadRow(row), audit: { upload: row.upload_id } }
}

const beginRoute = route({
  id: 'begin-upload',
  method: 'post',
  path: '/reports/:report/uploads',
  summary: 'Declares a photo that will come in parts of 256 KiB; declaring it again resumes it',
  tag: 'photos',
  body: {
    type: 'object',
    properties: {
      name: { type: 'string', minLength: 1, maxLength: 120 },
      size: { type: 'integer', minimum: 1 },
      sha256: { type: 'string', pattern: '^[0-9a-f]{64}$' },
      anchor: {
        type: ['string', 'null'],
        maxLength: 300,
        description: 'The block of the report that the photo shows.',
      },
    },
    required: ['name', 'size', 'sha256'],
    additionalProperties: false,
  },
  policy: { action: 'report.attach', about: factsOf },
  limit: 'upload',
  load: loadReport,
  answers: { 201: UPLOAD_SCHEMA },
  async run({ body, subject, ...call }) {
    const weight = await attachmentWeight(call.tx, call.actor.organisation, subject.report_id)
    if (weight.count >= MOST_PHOTOS || weight.bytes + body.size > MOST_BYTES)
      return refuse(
        'too-large',
        `A report takes up to ${MOST_PHOTOS} photos and ${MOST_BYTES / 1e6} MB of them. Remove some first.`,
      )
    const destination = { report: subject.report_id, anchor: body.anchor ?? null }
    return await shown(call, await uploadsOf(call, destination).declare(whose(call), body), 201)
  },
})

const listRoute = route({
  id: 'list-uploads',
  method: 'get',
  path: '/reports/:report/uploads',
  summary: 'Photos that are on their way, and those that were refused',
  tag: 'photos',
  policy: { action: 'report.read', about: factsOf },
  limit: 'read',
  load: loadReport,
  answers: {
    200: { type: 'object', properties: { uploads: { type: 'array', items: UPLOAD_SCHEMA } }, required: ['uploads'] },
  },
  async run({ tx, actor, subject }) {
    const rows = await listUploads(tx, actor.organisation, subject.report_id)
    return { body: { uploads: rows.filter(({ person_id }) => person_id === actor.person).map(presentUploadRow) } }
  },
})

const showRoute = route({
  id: 'show-upload',
  method: 'get',
  path: '/uploads/:upload',
  summary: 'How far an upload is, and what became of it',
  tag: 'photos',
  policy: { action: 'report.read', about },
  limit: 'read',
  load: loadUpload,
  answers: { 200: UPLOAD_SCHEMA },
  async run({ subject }) {
    return { body: presentUploadRow(subject.upload) }
  },
})

const partRoute = route({
  id: 'send-part',
  method: 'put',
  path: '/uploads/:upload/parts/:offset',
  summary: 'One part, in any order, as often as need be',
  tag: 'photos',
  accepts: 'chunk',
  policy: { action: 'report.attach', about },
  limit: 'upload',
  audited: false,
  load: loadUpload,
  answers: { 200: UPLOAD_SCHEMA },
  async run({ body, params, subject, ...call }) {
    const bytes: unknown = body
    if (!(bytes instanceof Uint8Array)) return refuse('bad-request', 'The body is empty; send the bytes of the part.')
    const { upload } = subject
    const taken = await uploadsOf(call, destinationOf(upload)).takePart(
      whose(call),
      upload.upload_id,
      Number(params['offset']),
      bytes,
    )
    return await shown(call, taken)
  },
})

const completeRoute = route({
  id: 'complete-upload',
  method: 'post',
  path: '/uploads/:upload/complete',
  summary:
    'Puts the parts together; the photo is then made anew without its metadata, and attached. Parts that are not what was declared are missing again',
  tag: 'photos',
  policy: { action: 'report.attach', about },
  limit: 'upload',
  load: loadUpload,
  about: ({ subject }) => `report/${subject.report.report_id}`,
  answers: { 200: UPLOAD_SCHEMA },
  async run({ subject, ...call }) {
    const { upload } = subject
    const mine = uploadsOf(call, destinationOf(upload))
    const done = await mine.complete(whose(call), upload.upload_id)
    // That the parts are forgotten must stay, so this is no refusal: the answer says that all of them are missing again.
    if (!done.ok && done.problem.code === 'other-content')
      return await shown(call, await mine.find(whose(call), upload.upload_id))
    if (done.ok && upload.state === 'open')
      await call.services.jobs.send(call.tx, 'develop-photo', {
        organisation: call.actor.organisation,
        upload: upload.upload_id,
      })
    return await shown(call, done)
  },
})

export const UPLOAD_ROUTES = [beginRoute, listRoute, showRoute, partRoute, completeRoute]
