import { missing, type Upload } from '#server/files/upload.ts'
import type { AttachmentRow } from '#server/queries/attachments.ts'
import type { UploadRow } from '#server/queries/uploads.ts'

export const ATTACHMENT_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    name: { type: 'string' },
    anchor: { type: ['string', 'null'] },
    taken_at: { type: ['string', 'null'], description: 'As the camera says it; not verified.' },
    added_by: { type: 'string', format: 'uuid' },
    added_at: { type: 'string', format: 'date-time' },
    sha256: { type: 'string' },
    bytes: { type: 'integer' },
    width: { type: ['integer', 'null'] },
    height: { type: ['integer', 'null'] },
  },
  required: ['id', 'name', 'anchor', 'added_by', 'added_at', 'sha256', 'bytes'],
  additionalProperties: false,
} as const

export const presentAttachment = (row: AttachmentRow) => ({
  id: row.attachment_id,
  name: row.name,
  anchor: row.anchor,
  taken_at: row.taken_at?.toISOString() ?? null,
  added_by: row.added_by,
  added_at: row.added_at.toISOString(),
  sha256: row.sha256,
  bytes: row.bytes,
  width: row.width,
  height: row.height,
})

export const UPLOAD_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    name: { type: 'string' },
    size: { type: 'integer' },
    sha256: { type: 'string' },
    state: { type: 'string', enum: ['open', 'complete', 'attached', 'refused'] },
    missing: { type: 'array', items: { type: 'integer' }, description: 'Offsets of the parts that have not come.' },
    refusal: { type: ['string', 'null'] },
    attachment: { type: ['string', 'null'], format: 'uuid' },
    expires_at: { type: 'string', format: 'date-time' },
  },
  required: ['id', 'name', 'size', 'sha256', 'state', 'missing', 'refusal', 'attachment', 'expires_at'],
  additionalProperties: false,
} as const

export const presentUpload = (upload: Upload, row: Pick<UploadRow, 'state' | 'refusal' | 'attachment_id'>) => ({
  id: upload.id,
  name: upload.name,
  size: upload.size,
  sha256: upload.sha256,
  state: row.state,
  missing: missing(upload),
  refusal: row.refusal,
  attachment: row.attachment_id,
  expires_at: upload.expires.toISOString(),
})

export const presentUploadRow = (row: UploadRow) =>
  presentUpload(
    {
      id: row.upload_id,
      organisation: '',
      uploader: row.person_id,
      name: row.name,
      size: row.size,
      sha256: row.sha256,
      state: row.state === 'open' ? 'open' : 'complete',
      expires: row.expires_at,
      parts: row.parts,
    },
    row,
  )
