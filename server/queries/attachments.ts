import type { Tx } from '#server/db.ts'

/** A photo of a report, with where its bytes are. */
export interface AttachmentRow {
  readonly attachment_id: string
  readonly report_id: string
  readonly name: string
  readonly anchor: string | null
  readonly taken_at: Date | null
  readonly added_by: string
  readonly added_at: Date
  readonly sha256: string
  readonly bytes: number
  readonly width: number | null
  readonly height: number | null
  readonly paper_sha256: string | null
}

export interface NewFile {
  readonly organisation: string
  readonly person: string
  readonly sha256: string
  readonly kind: 'photo' | 'paper photo'
  readonly type: string
  readonly bytes: number
  readonly width: number
  readonly height: number
  readonly received: string
  readonly now: Date
}

/** The row of a file; the same bytes have one row, however often they come. */
export async function keepFile(tx: Tx, file: NewFile): Promise<string> {
  const known = { organisation_id: file.organisation, sha256: file.sha256, kind: file.kind }
  await tx('files')
    .insert({
      ...known,
      type: file.type,
      bytes: file.bytes,
      width: file.width,
      height: file.height,
      received_sha256: file.received,
      created_by: file.person,
      created_at: file.now,
    })
    .onConflict(['organisation_id', 'sha256', 'kind'])
    .ignore()
  const row = await tx('files').where(known).first<{ file_id: string } | undefined>('file_id')
  if (row === undefined) throw new Error('A stored file has no row.')
  return row.file_id
}

export interface NewAttachment {
  readonly organisation: string
  readonly report: string
  readonly file: string
  readonly paper: string
  readonly name: string
  readonly anchor: string | null
  readonly taken: string | null
  readonly person: string
  readonly now: Date
}

/** Attaches a photo. A name that the report has already gets a number, so that none hides another. */
export async function attach(tx: Tx, added: NewAttachment): Promise<string> {
  const [row] = await tx('attachments')
    .insert({
      organisation_id: added.organisation,
      report_id: added.report,
      file_id: added.file,
      paper_file_id: added.paper,
      name: await freeName(tx, added),
      anchor: added.anchor,
      taken_at: added.taken,
      added_by: added.person,
      added_at: added.now,
    })
    .returning<{ attachment_id: string }[]>('attachment_id')
  if (row === undefined) throw new Error('A new attachment has no row.')
  return row.attachment_id
}

async function freeName(tx: Tx, { organisation, report, name }: NewAttachment): Promise<string> {
  const rows = await tx('attachments')
    .where({ organisation_id: organisation, report_id: report, removed_at: null })
    .pluck<string[]>('name')
  const taken = new Set(rows)
  if (!taken.has(name)) return name
  const dot = name.lastIndexOf('.')
  const [stem, ending] = dot > 0 ? [name.slice(0, dot), name.slice(dot)] : [name, '']
  for (let number = 2; ; number += 1) {
    const tried = `${stem.slice(0, 110 - ending.length)} ${number}${ending}`
    if (!taken.has(tried)) return tried
  }
}

const joined = (tx: Tx, organisation: string) =>
  tx('attachments as a')
    .join('files as f', (on) => on.on('f.organisation_id', 'a.organisation_id').andOn('f.file_id', 'a.file_id'))
    .leftJoin('files as p', (on) =>
      on.on('p.organisation_id', 'a.organisation_id').andOn('p.file_id', 'a.paper_file_id'),
    )
    .where({ 'a.organisation_id': organisation, 'a.removed_at': null })
    .select('a.attachment_id', 'a.report_id', 'a.name', 'a.anchor', 'a.taken_at', 'a.added_by', 'a.added_at')
    .select('f.sha256', 'f.bytes', 'f.width', 'f.height', 'p.sha256 as paper_sha256')

export async function listAttachments(tx: Tx, organisation: string, report: string): Promise<AttachmentRow[]> {
  return await joined(tx, organisation)
    .where('a.report_id', report)
    .orderBy(['a.added_at', 'a.attachment_id'])
    .limit(500)
}

export async function findAttachment(
  tx: Tx,
  organisation: string,
  attachment: string,
): Promise<AttachmentRow | undefined> {
  const [row] = await joined(tx, organisation).where('a.attachment_id', attachment)
  return row
}

export async function removeAttachment(tx: Tx, organisation: string, attachment: string, now: Date): Promise<void> {
  await tx('attachments')
    .where({ organisation_id: organisation, attachment_id: attachment })
    .update({ removed_at: now })
}

/** How many photos a report has, and how much they weigh together. */
export async function attachmentWeight(
  tx: Tx,
  organisation: string,
  report: string,
): Promise<{ count: number; bytes: number }> {
  const [row] = await joined(tx, organisation)
    .clearSelect()
    .where('a.report_id', report)
    .select<{ count: number; bytes: number }[]>(tx.raw('count(*) as count, coalesce(sum(f.bytes), 0)::bigint as bytes'))
  return row ?? { count: 0, bytes: 0 }
}
