import { verifyAudit } from '#server/commands/verify-audit.ts'
import { csvAnswer, everyRow } from '#server/exports/table.ts'
import { keysetOf, PAGE_QUERY, pageOf } from '#server/http/keyset.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { EVENT_SCHEMA, presentEvent } from '#server/presenters/audit.ts'
import { type EventRow, listEvents } from '#server/queries/audit-trail.ts'

const FILTERS = {
  action: { type: 'string', minLength: 1, maxLength: 60 },
  person: { type: 'string', format: 'uuid' },
  subject: { type: 'string', minLength: 1, maxLength: 200, description: 'Such as `report/` and its id' },
  from: { type: 'string', format: 'date-time' },
  to: { type: 'string', format: 'date-time' },
} as const

interface Filters {
  readonly action?: string | undefined
  readonly person?: string | undefined
  readonly subject?: string | undefined
  readonly from?: string | undefined
  readonly to?: string | undefined
}

const wished = (organisation: string, { action, person, subject, from, to }: Filters) => ({
  organisation,
  ...(action === undefined ? {} : { action }),
  ...(person === undefined ? {} : { person }),
  ...(subject === undefined ? {} : { subjects: [subject] }),
  ...(from === undefined ? {} : { from }),
  ...(to === undefined ? {} : { to }),
})

const common = { tag: 'audit', method: 'get', policy: { action: 'audit.read' }, limit: 'read' } as const

const listRoute = route({
  ...common,
  id: 'list-audit-events',
  path: '/audit',
  summary: 'Who did what, the newest first, a page at a time',
  query: { type: 'object', properties: { ...FILTERS, ...PAGE_QUERY }, additionalProperties: false },
  answers: {
    200: {
      type: 'object',
      properties: { events: { type: 'array', items: EVENT_SCHEMA }, next: { type: ['string', 'null'] } },
      required: ['events', 'next'],
    },
  },
  async run({ tx, actor, query }) {
    const { after, limit = 50 } = query
    const cursor = after === undefined ? undefined : keysetOf(after, ['count'])
    if (cursor !== undefined && 'refused' in cursor) return cursor
    const before = cursor === undefined ? {} : { before: Number(cursor[0]) }
    const found = await listEvents(tx, { ...wished(actor.organisation, query), ...before, limit })
    const { rows, next } = pageOf(found, limit, ({ sequence }) => [String(sequence)])
    return { body: { events: rows.map(presentEvent), next } }
  },
})

const tableRoute = route({
  ...common,
  id: 'export-audit-events',
  path: '/audit.csv',
  summary: 'The trail as a table',
  query: { type: 'object', properties: FILTERS, additionalProperties: false },
  limit: 'heavy',
  audited: true,
  answers: { 200: { media: 'text/csv' } },
  async run({ actor, query, services }) {
    const { organisation } = actor
    const rows = everyRow<EventRow>(services, organisation, async (tx, last, limit) => {
      const before = last === undefined ? {} : { before: last.sequence }
      return (await listEvents(tx, { ...wished(organisation, query), ...before, limit })).slice(0, limit)
    })
    const answer = csvAnswer(
      'audit',
      {
        sequence: ({ sequence }) => sequence,
        at: ({ at }) => at.toISOString(),
        person: ({ person_name, person_id }) => person_name ?? person_id,
        action: ({ action }) => action,
        subject: ({ subject }) => subject,
        event: ({ body }) => body,
        link: ({ hash }) => hash,
      },
      rows,
    )
    return { ...answer, audit: { filters: query } }
  },
})

const verifyRoute = route({
  ...common,
  id: 'verify-audit-events',
  path: '/audit/verify',
  summary: 'Follows the chain of the whole trail; a link noted at an earlier time shows also what was cut off since',
  query: {
    type: 'object',
    properties: {
      known_sequence: { type: 'integer', minimum: 1, maximum: Number.MAX_SAFE_INTEGER },
      known_hash: { type: 'string', pattern: '^[0-9a-f]{64}$' },
    },
    additionalProperties: false,
  },
  limit: 'heavy',
  answers: {
    200: {
      type: 'object',
      properties: {
        ok: { type: 'boolean' },
        events: { type: 'integer' },
        last: { type: 'integer' },
        hash: { type: 'string' },
        broken: {
          type: ['object', 'null'],
          properties: { sequence: { type: 'integer' }, why: { type: 'string' } },
          required: ['sequence', 'why'],
        },
      },
      required: ['ok', 'events', 'last', 'hash', 'broken'],
    },
  },
  async run({ tx, actor, query: { known_sequence, known_hash } }) {
    if ((known_sequence === undefined) !== (known_hash === undefined))
      return refuse('bad-request', 'A noted link is its place and its hash: send both or neither.')
    const known =
      known_sequence === undefined || known_hash === undefined
        ? undefined
        : { sequence: known_sequence, hash: known_hash }
    return { body: await verifyAudit(tx, actor.organisation, known) }
  },
})

export const AUDIT_ROUTES = [listRoute, tableRoute, verifyRoute]
