import type { ReviewStanding } from '#server/commands/review-standing.ts'
import type { ReviewRow } from '#server/queries/reviews.ts'

export const REVIEW_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    revision: { type: 'integer' },
    reviewer: {
      type: 'object',
      properties: { id: { type: 'string', format: 'uuid' }, name: { type: 'string' } },
      required: ['id', 'name'],
    },
    decision: { type: 'string', enum: ['remarks', 'returned', 'approved'] },
    summary: { type: 'string' },
    submitted_at: { type: 'string', format: 'date-time' },
  },
  required: ['id', 'revision', 'reviewer', 'decision', 'summary', 'submitted_at'],
} as const

export const presentReview = (row: ReviewRow) => ({
  id: row.review_id,
  revision: row.revision,
  reviewer: { id: row.reviewer_id, name: row.reviewer_name },
  decision: row.decision,
  summary: row.summary ?? '',
  submitted_at: row.submitted_at.toISOString(),
})

const DECISION_SCHEMA = {
  type: 'object',
  properties: {
    kind: { type: 'string', enum: ['limitation', 'departure'] },
    anchor: { type: 'string' },
    words: { type: 'string' },
    words_sha256: { type: 'string' },
    said: { type: ['object', 'null'] },
  },
  required: ['kind', 'anchor', 'words', 'words_sha256', 'said'],
} as const

export const STANDING_SCHEMA = {
  type: 'object',
  properties: {
    revision: { type: 'integer' },
    decisions: { type: 'array', items: DECISION_SCHEMA },
    blockers: {
      type: 'array',
      items: {
        type: 'object',
        properties: { kind: { type: 'string' }, anchor: { type: 'string' }, message: { type: 'string' } },
        required: ['kind', 'anchor', 'message'],
      },
    },
  },
  required: ['revision', 'decisions', 'blockers'],
} as const

export function presentStanding({ revision, decisions, blockers }: ReviewStanding) {
  return {
    revision: revision.revision,
    decisions: decisions.map(({ kind, anchor, words, wordsSha256, said }) => ({
      kind,
      anchor,
      words,
      words_sha256: wordsSha256,
      said: said && {
        accepted: said.accepted,
        reason: said.reason,
        by: { id: said.decided_by, name: said.decided_by_name },
        at: said.decided_at.toISOString(),
      },
    })),
    blockers,
  }
}
