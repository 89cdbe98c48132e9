import type { ConditionRow } from '#server/queries/conditions.ts'

/** What is written of an operator each time that its conditions change. */
export const DEMAND = {
  separation: { type: 'string', enum: ['all poles', 'line poles', 'not stated'] },
  stated_in: { type: 'string', minLength: 1, maxLength: 300 },
  valid_from: { type: 'string', format: 'date' },
  note: { type: 'string', maxLength: 4000, default: '' },
} as const

export const CONDITION_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    operator: { type: 'string' },
    version: { type: 'integer' },
    ...DEMAND,
    written_at: { type: 'string', format: 'date-time' },
    written_by: {
      type: 'object',
      properties: { id: { type: 'string', format: 'uuid' }, name: { type: 'string' } },
      required: ['id', 'name'],
    },
  },
  required: ['id', 'operator', 'version', 'separation', 'stated_in', 'valid_from', 'written_at', 'written_by'],
} as const

export const CONDITION_WITH_HISTORY = {
  ...CONDITION_SCHEMA,
  properties: { ...CONDITION_SCHEMA.properties, history: { type: 'array', items: CONDITION_SCHEMA } },
  required: [...CONDITION_SCHEMA.required, 'history'],
} as const

export function presentCondition(row: ConditionRow) {
  return {
    id: row.condition_id,
    operator: row.operator,
    version: row.version,
    separation: row.separation,
    stated_in: row.stated_in,
    valid_from: row.valid_from,
    note: row.note,
    written_at: row.written_at.toISOString(),
    written_by: { id: row.written_by, name: row.written_by_name },
  }
}
