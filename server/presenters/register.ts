import type { EntryRow } from '#server/queries/register.ts'
import type { RegisterRow } from '#server/queries/register-search.ts'

const HASH = { type: 'string', pattern: '^[0-9a-f]{64}$' } as const
const HASH_OR_NULL = { type: ['string', 'null'] } as const

export const REGISTER_ROW = {
  type: 'object',
  properties: {
    document: { type: 'string', format: 'uuid' },
    report: { type: 'string', format: 'uuid' },
    number: { type: 'string' },
    state: { type: 'string', enum: ['issued', 'replaced', 'withdrawn'] },
    reference: { type: 'string' },
    title: { type: 'string' },
    place: { type: 'string' },
    operator: { type: 'string' },
    inspected_on: { type: ['string', 'null'], format: 'date' },
    due_on: { type: ['string', 'null'], format: 'date' },
    outcome: { type: 'string' },
    revision: { type: 'integer' },
    issued_at: { type: 'string', format: 'date-time' },
    source_sha256: HASH,
    facts_sha256: HASH,
    pdf_sha256: HASH_OR_NULL,
    replaces: { type: ['string', 'null'] },
    replaced_by: { type: ['string', 'null'] },
  },
  required: ['document', 'report', 'number', 'state', 'issued_at', 'source_sha256', 'facts_sha256', 'pdf_sha256'],
} as const

export function presentRegisterRow(row: RegisterRow) {
  return {
    document: row.document_id,
    report: row.report_id,
    number: row.number,
    state: row.state,
    reference: row.reference,
    title: row.title,
    place: row.place,
    operator: row.operator,
    inspected_on: row.inspected_on,
    due_on: row.due_on,
    outcome: row.outcome,
    revision: row.revision,
    issued_at: row.issued_at.toISOString(),
    source_sha256: row.source_sha256,
    facts_sha256: row.facts_sha256,
    pdf_sha256: row.pdf_sha256,
    replaces: row.replaces_number,
    replaced_by: row.replaced_by_number,
  }
}

export const ENTRY_SCHEMA = {
  type: 'object',
  properties: {
    sequence: { type: 'integer' },
    kind: { type: 'string', enum: ['issued', 'sealed', 'replaced', 'withdrawn'] },
    entry: { type: 'object' },
    canonical: { type: 'string', description: 'The very text that is hashed (RFC 8785)' },
    leaf_hash: HASH,
    chain_hash: HASH,
    written_at: { type: 'string', format: 'date-time' },
    proof: { type: ['object', 'null'], description: 'The way from the entry to the newest checkpoint' },
  },
  required: ['sequence', 'kind', 'entry', 'canonical', 'leaf_hash', 'chain_hash', 'written_at', 'proof'],
} as const

export function presentEntry(row: EntryRow, proof: object | null) {
  const entry: unknown = JSON.parse(row.entry)
  return {
    sequence: row.sequence,
    kind: row.kind,
    entry,
    canonical: row.entry,
    leaf_hash: row.leaf_hash,
    chain_hash: row.chain_hash,
    written_at: row.written_at.toISOString(),
    proof,
  }
}

export const CHECKPOINT_SCHEMA = {
  type: 'object',
  properties: {
    size: { type: 'integer' },
    root: HASH,
    signed: { type: 'string' },
    certificate: { type: 'string' },
    made_at: { type: 'string', format: 'date-time' },
  },
  required: ['size', 'root', 'signed', 'certificate', 'made_at'],
} as const

export function presentCheckpoint(row: {
  readonly size: number
  readonly root: string
  readonly signed: string
  readonly certificate: string
  readonly made_at: Date
}) {
  const { size, root, signed, certificate, made_at } = row
  return { size, root, signed, certificate, made_at: made_at.toISOString() }
}
