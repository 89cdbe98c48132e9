import { AHEAD_DAYS, daysAfter, dueStage } from '#core/review/due-stage.ts'
import { keysetOf, PAGE_QUERY, pageOf } from '#server/http/keyset.ts'
import { route } from '#server/http/route.ts'
import { listDue } from '#server/queries/due.ts'

const DUE_SCHEMA = {
  type: 'object',
  properties: {
    kind: { type: 'string', enum: ['verification', 'calibration'] },
    id: { type: 'string', format: 'uuid', description: 'Of the report, or of the instrument' },
    name: { type: 'string' },
    place: { type: 'string' },
    mark: { type: 'string', description: 'Number of the report, or serial number' },
    due_on: { type: 'string', format: 'date' },
    stage: { type: ['string', 'null'], enum: ['ahead', 'soon', 'overdue', null] },
  },
  required: ['kind', 'id', 'name', 'place', 'mark', 'due_on', 'stage'],
} as const

const dueRoute = route({
  id: 'list-due',
  method: 'get',
  path: '/due',
  summary: 'Verifications and calibrations that fall due, the earliest first',
  tag: 'due',
  query: {
    type: 'object',
    properties: {
      until: {
        type: 'string',
        format: 'date',
        description: `Due on this day or earlier; ${AHEAD_DAYS} days ahead when left out`,
      },
      kind: { type: 'string', enum: ['verification', 'calibration'] },
      ...PAGE_QUERY,
    },
    additionalProperties: false,
  },
  policy: { action: 'instrument.read' },
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: { due: { type: 'array', items: DUE_SCHEMA }, next: { type: ['string', 'null'] } },
      required: ['due', 'next'],
    },
  },
  async run({ tx, actor, query, now }) {
    const today = now.toISOString().slice(0, 10)
    const { until = daysAfter(today, AHEAD_DAYS), kind, after, limit = 50 } = query
    const cursor = after === undefined ? undefined : keysetOf(after, ['date', 'id'])
    if (cursor !== undefined && 'refused' in cursor) return cursor
    const found = await listDue(tx, {
      organisation: actor.organisation,
      until,
      limit,
      ...(kind === undefined ? {} : { kind }),
      ...(cursor === undefined ? {} : { after: cursor }),
    })
    const { rows, next } = pageOf(found, limit, ({ due_on, id }) => [due_on, id])
    const due = rows.map(({ person: _, ...row }) => ({ ...row, stage: dueStage(row.due_on, today) ?? null }))
    return { body: { due, next } }
  },
})

export const DUE_ROUTES = [dueRoute]
