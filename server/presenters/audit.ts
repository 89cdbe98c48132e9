import type { EventRow } from '#server/queries/audit-trail.ts'

export const EVENT_SCHEMA = {
  type: 'object',
  properties: {
    sequence: { type: 'integer' },
    at: { type: 'string', format: 'date-time' },
    person: {
      type: ['object', 'null'],
      properties: { id: { type: 'string', format: 'uuid' }, name: { type: ['string', 'null'] } },
      required: ['id', 'name'],
    },
    roles: { type: 'array', items: { type: 'string' } },
    action: { type: 'string' },
    subject: { type: 'string' },
    request: { type: ['string', 'null'] },
    address: { type: ['string', 'null'] },
    details: { type: 'object' },
    hash: { type: 'string' },
  },
  required: ['sequence', 'at', 'person', 'roles', 'action', 'subject', 'request', 'address', 'details', 'hash'],
} as const

interface Body {
  readonly roles?: readonly string[]
  readonly request?: string
  readonly address?: string
  readonly details?: Readonly<Record<string, unknown>>
}

export function presentEvent(row: EventRow) {
  const { roles = [], request, address, details = {} }: Body = JSON.parse(row.body)
  return {
    sequence: row.sequence,
    at: row.at.toISOString(),
    person: row.person_id === null ? null : { id: row.person_id, name: row.person_name },
    roles,
    action: row.action,
    subject: row.subject,
    request: request ?? null,
    address: address ?? null,
    details,
    hash: row.hash,
  }
}
