import type { Tx } from '#server/db.ts'
import type { Upload } from '#server/files/upload.ts'
import type { UploadLog, Whose } from '#server/files/upload-log.ts'

/** What a photo will be attached to once it is here. */
export interface Destination {
  readonly report: string
  readonly anchor: string | null
}

/** An upload with what became of it. */
export interface UploadRow {
  readonly upload_id: string
  readonly report_id: string
  readonly person_id: string
  readonly name: string
  readonly anchor: string | null
  readonly sha256: string
  readonly size: number
  readonly parts: readonly (string | null)[]
  readonly state: 'open' | 'complete' | 'attached' | 'refused'
  readonly refusal: string | null
  readonly attachment_id: string | null
  readonly expires_at: Date
}

const COLUMNS = [
  'upload_id',
  'report_id',
  'person_id',
  'name',
  'anchor',
  'sha256',
  'size',
  'parts',
  'state',
  'refusal',
  'attachment_id',
  'expires_at',
] as const

const uploadOf = (organisation: string, row: UploadRow): Upload => ({
  id: row.upload_id,
  organisation,
  uploader: row.person_id,
  name: row.name,
  size: row.size,
  sha256: row.sha256,
  state: row.state === 'open' ? 'open' : 'complete',
  expires: row.expires_at,
  parts: row.parts,
})

export async function findUpload(tx: Tx, organisation: string, upload: string): Promise<UploadRow | undefined> {
  return await tx('uploads')
    .where({ organisation_id: organisation, upload_id: upload })
    .first<UploadRow | undefined>(...COLUMNS)
}

/** Uploads of a report that are not part of it yet, oldest first. */
export async function listUploads(tx: Tx, organisation: string, report: string): Promise<UploadRow[]> {
  return await tx('uploads')
    .where({ organisation_id: organisation, report_id: report })
    .whereNot('state', 'attached')
    .orderBy('created_at')
    .limit(200)
    .select(...COLUMNS)
}

export async function settleUpload(
  tx: Tx,
  organisation: string,
  upload: string,
  outcome: { readonly attachment: string } | { readonly refusal: string },
): Promise<void> {
  const change =
    'attachment' in outcome
      ? { state: 'attached', attachment_id: outcome.attachment }
      : { state: 'refused', refusal: outcome.refusal }
  await tx('uploads').where({ organisation_id: organisation, upload_id: upload, state: 'complete' }).update(change)
}

/** The rows of uploads in a transaction. New ones go to one destination. */
export function uploadLog(tx: Tx, destination: Destination): UploadLog {
  const mine = ({ organisation, uploader }: Whose, id: string) =>
    tx('uploads').where({ organisation_id: organisation, person_id: uploader, upload_id: id })
  const changed = async (whose: Whose, id: string, change: Record<string, unknown>): Promise<Upload | undefined> => {
    const [row] = await mine(whose, id)
      .where('state', 'open')
      .update(change)
      .returning<UploadRow[]>([...COLUMNS])
    return row === undefined ? await found(whose, id) : uploadOf(whose.organisation, row)
  }
  const found = async (whose: Whose, id: string): Promise<Upload | undefined> => {
    const row = await mine(whose, id).first<UploadRow | undefined>(...COLUMNS)
    return row === undefined ? undefined : uploadOf(whose.organisation, row)
  }
  return {
    find: found,
    async open(upload, now) {
      const known = await tx('uploads')
        .where({
          organisation_id: upload.organisation,
          person_id: upload.uploader,
          report_id: destination.report,
          sha256: upload.sha256,
          size: upload.size,
          name: upload.name,
        })
        .where('expires_at', '>', now)
        .whereNot('state', 'refused')
        .first<UploadRow | undefined>(...COLUMNS)
      if (known !== undefined) return uploadOf(upload.organisation, known)
      await tx('uploads').insert({
        organisation_id: upload.organisation,
        upload_id: upload.id,
        person_id: upload.uploader,
        report_id: destination.report,
        anchor: destination.anchor,
        name: upload.name,
        sha256: upload.sha256,
        size: upload.size,
        parts: JSON.stringify(upload.parts),
        expires_at: upload.expires,
        created_at: now,
      })
      return upload
    },
    notePart: (whose, id, place, sha256) =>
      // In place, so that parts that arrive at the same moment do not undo each other.
      changed(whose, id, {
        parts: tx.raw('jsonb_set(parts, array[?]::text[], to_jsonb(?::text))', [String(place), sha256]),
      }),
    async forgetParts(whose, id) {
      await changed(whose, id, { parts: tx.raw('(select jsonb_agg(null::text) from jsonb_array_elements(parts))') })
    },
    complete: (whose, id) => changed(whose, id, { state: 'complete' }),
    async removeExpired(before) {
      return await tx('uploads').where('state', 'open').where('expires_at', '<', before).delete()
    },
  }
}
