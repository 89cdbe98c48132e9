import type { RevisionRow } from '#server/queries/revisions.ts'

const RULEBOOK = {
  type: 'object',
  properties: { id: { type: 'string' }, version: { type: 'string' }, hash: { type: 'string' } },
  required: ['id', 'version', 'hash'],
} as const

export const REVISION_SCHEMA = {
  type: 'object',
  properties: {
    revision: { type: 'integer' },
    sha256: { type: 'string' },
    file_name: { type: 'string' },
    bytes: { type: 'integer' },
    uploaded_by: {
      type: 'object',
      properties: { id: { type: 'string', format: 'uuid' }, name: { type: 'string' } },
      required: ['id', 'name'],
    },
    uploaded_at: { type: 'string', format: 'date-time' },
    rulebook: RULEBOOK,
    software: { type: 'string' },
    outcome: { type: 'string' },
    counts: { type: 'object', additionalProperties: { type: 'integer' } },
  },
  required: ['revision', 'sha256', 'file_name', 'bytes', 'uploaded_by', 'uploaded_at', 'rulebook', 'outcome', 'counts'],
} as const

export function presentRevision(row: RevisionRow) {
  return {
    revision: row.revision,
    sha256: row.sha256,
    file_name: row.file_name,
    bytes: row.bytes,
    uploaded_by: { id: row.uploaded_by, name: row.uploaded_by_name },
    uploaded_at: row.uploaded_at.toISOString(),
    rulebook: { id: row.rulebook_id, version: row.rulebook_version, hash: row.rulebook_hash },
    software: row.software,
    outcome: row.outcome,
    counts: row.counts,
  }
}
