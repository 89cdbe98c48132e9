import type { IssueRecord } from '#core/report/issue.ts'
import type { Tx } from '#server/db.ts'

export interface DocumentRow {
  readonly document_id: string
  readonly number: string
  readonly report_id: string
  readonly revision: number
  readonly issued_at: Date
  readonly issued_by: string
  readonly source_sha256: string
  readonly facts_sha256: string
  readonly issue: IssueRecord
  readonly replaces: string | null
}

const COLUMNS = [
  'document_id',
  'number',
  'report_id',
  'revision',
  'issued_at',
  'issued_by',
  'source_sha256',
  'facts_sha256',
  'issue',
  'replaces',
] as const

export async function findDocument(tx: Tx, organisation: string, document: string): Promise<DocumentRow | undefined> {
  return await tx('documents')
    .where({ organisation_id: organisation, document_id: document })
    .first<DocumentRow | undefined>(...COLUMNS)
}

export async function documentOf(tx: Tx, organisation: string, report: string): Promise<DocumentRow | undefined> {
  return await tx('documents')
    .where({ organisation_id: organisation, report_id: report })
    .first<DocumentRow | undefined>(...COLUMNS)
}

export interface NewDocument {
  readonly organisation: string
  readonly report: string
  readonly revision: number
  readonly year: number
  readonly sequence: number
  readonly person: string
  readonly sourceSha256: string
  readonly factsSha256: string
  readonly issue: IssueRecord
  readonly replaces: string | null
}

export async function insertDocument(tx: Tx, made: NewDocument): Promise<string> {
  const [row] = await tx('documents')
    .insert({
      organisation_id: made.organisation,
      number: made.issue.number,
      year: made.year,
      sequence: made.sequence,
      report_id: made.report,
      revision: made.revision,
      issued_at: made.issue.issued_at,
      issued_by: made.person,
      source_sha256: made.sourceSha256,
      facts_sha256: made.factsSha256,
      issue: JSON.stringify(made.issue),
      replaces: made.replaces,
    })
    .returning<{ document_id: string }[]>('document_id')
  if (row === undefined) throw new Error('The new document has no row.')
  return row.document_id
}

export interface SealRow {
  readonly pdf_sha256: string
  readonly bytes: number
  readonly certificate_sha256: string
  readonly sealed_at: Date
}

export async function findSeal(tx: Tx, organisation: string, document: string): Promise<SealRow | undefined> {
  return await tx('seals')
    .where({ organisation_id: organisation, document_id: document })
    .first<SealRow | undefined>('pdf_sha256', 'bytes', 'certificate_sha256', 'sealed_at')
}

/** Writes down a seal; false when the document has one already: the first is the one. */
export async function insertSeal(tx: Tx, organisation: string, document: string, seal: SealRow): Promise<boolean> {
  const rows = await tx('seals')
    .insert({ organisation_id: organisation, document_id: document, ...seal })
    .onConflict(['organisation_id', 'document_id'])
    .ignore()
    .returning('document_id')
  return rows.length === 1
}
