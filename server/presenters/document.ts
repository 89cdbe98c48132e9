import type { DocumentRow, SealRow } from '#server/queries/documents.ts'

export const DOCUMENT_SCHEMA = {
  type: 'object',
  properties: {
    number: { type: 'string' },
    report: { type: 'string', format: 'uuid' },
    revision: { type: 'integer' },
    issued_at: { type: 'string', format: 'date-time' },
    source_sha256: { type: 'string' },
    facts_sha256: { type: 'string' },
    issue: { type: 'object' },
    seal: {
      type: ['object', 'null'],
      properties: {
        pdf_sha256: { type: 'string' },
        bytes: { type: 'integer' },
        certificate_sha256: { type: 'string' },
        sealed_at: { type: 'string', format: 'date-time' },
      },
    },
  },
  required: ['number', 'report', 'revision', 'issued_at', 'source_sha256', 'facts_sha256', 'issue', 'seal'],
} as const

export function presentDocument(row: DocumentRow, seal: SealRow | undefined) {
  return {
    number: row.number,
    report: row.report_id,
    revision: row.revision,
    issued_at: row.issued_at.toISOString(),
    source_sha256: row.source_sha256,
    facts_sha256: row.facts_sha256,
    issue: row.issue,
    seal:
      seal === undefined
        ? null
        : {
            pdf_sha256: seal.pdf_sha256,
            bytes: seal.bytes,
            certificate_sha256: seal.certificate_sha256,
            sealed_at: seal.sealed_at.toISOString(),
          },
  }
}
