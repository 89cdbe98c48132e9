import type { RemarkRow } from '#server/queries/remarks.ts'
import type { ThreadRow } from '#server/queries/threads.ts'

export const REGION_SCHEMA = {
  type: 'object',
  properties: {
    attachment: { type: 'string', format: 'uuid' },
    x: { type: 'number', minimum: 0, maximum: 1 },
    y: { type: 'number', minimum: 0, maximum: 1 },
    width: { type: 'number', exclusiveMinimum: 0, maximum: 1 },
    height: { type: 'number', exclusiveMinimum: 0, maximum: 1 },
  },
  required: ['attachment', 'x', 'y', 'width', 'height'],
  additionalProperties: false,
} as const

const REMARK_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    author: {
      type: 'object',
      properties: { id: { type: 'string', format: 'uuid' }, name: { type: 'string' } },
      required: ['id', 'name'],
    },
    body: { type: 'string' },
    draft: { type: 'boolean' },
    created_at: { type: 'string', format: 'date-time' },
  },
  required: ['id', 'author', 'body', 'draft', 'created_at'],
} as const

export const THREAD_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    anchor: { type: 'string' },
    quoted: { type: 'string' },
    region: { type: ['object', 'null'] },
    kind: { type: 'string', enum: ['remark', 'question', 'correction'] },
    state: { type: 'string', enum: ['open', 'answered', 'resolved'] },
    placement: { type: 'string', enum: ['kept', 'changed', 'orphaned'] },
    opened_on: { type: 'integer' },
    placed_on: { type: 'integer' },
    opened_by: { type: 'string', format: 'uuid' },
    assigned_to: { type: ['string', 'null'], format: 'uuid' },
    draft: { type: 'boolean' },
    version: { type: 'integer' },
    created_at: { type: 'string', format: 'date-time' },
    remarks: { type: 'array', items: REMARK_SCHEMA },
  },
  required: ['id', 'anchor', 'quoted', 'kind', 'state', 'placement', 'draft', 'version', 'remarks'],
} as const

const presentRemark = (row: RemarkRow) => ({
  id: row.remark_id,
  author: { id: row.author_id, name: row.author_name },
  body: row.body,
  draft: row.published_at === null,
  created_at: row.created_at.toISOString(),
})

export function presentThread(row: ThreadRow, remarks: readonly RemarkRow[]) {
  return {
    id: row.thread_id,
    anchor: row.anchor,
    quoted: row.quoted,
    region: row.region,
    kind: row.kind,
    state: row.state,
    placement: row.placement,
    opened_on: row.opened_on,
    placed_on: row.placed_on,
    opened_by: row.opened_by,
    assigned_to: row.assigned_to,
    draft: row.published_at === null,
    version: row.version,
    created_at: row.created_at.toISOString(),
    remarks: remarks.filter(({ thread_id }) => thread_id === row.thread_id).map(presentRemark),
  }
}
