import { can } from '#core/policy/can.ts'
import { csvAnswer, everyRow } from '#server/exports/table.ts'
import { keysetOf, PAGE_QUERY, pageOf } from '#server/http/keyset.ts'
import { route } from '#server/http/route.ts'
import { EVENT_SCHEMA, presentEvent } from '#server/presenters/audit.ts'
import {
  CHECKPOINT_SCHEMA,
  ENTRY_SCHEMA,
  presentCheckpoint,
  presentEntry,
  presentRegisterRow,
  REGISTER_ROW,
} from '#server/presenters/register.ts'
import { listEvents } from '#server/queries/audit-trail.ts'
import { findDocument } from '#server/queries/documents.ts'
import { entriesOf, newestCheckpoint } from '#server/queries/register.ts'
import { type RegisterRow, registerRows, searchRegister } from '#server/queries/register-search.ts'
import { proofAgainst } from '#server/register/proof-now.ts'
import { filterOf, REGISTER_FILTERS } from './register-filter.ts'

const common = { tag: 'register', policy: { action: 'register.read' }, limit: 'read' } as const

const orderOf = ({ issued_at, document_id }: RegisterRow): readonly string[] => [issued_at.toISOString(), document_id]

const listRoute = route({
  ...common,
  id: 'search-register',
  method: 'get',
  path: '/register',
  summary: 'Issued documents, the newest first, a page at a time',
  query: { type: 'object', properties: { ...REGISTER_FILTERS, ...PAGE_QUERY }, additionalProperties: false },
  answers: {
    200: {
      type: 'object',
      properties: { documents: { type: 'array', items: REGISTER_ROW }, next: { type: ['string', 'null'] } },
      required: ['documents', 'next'],
    },
  },
  async run({ tx, actor, query }) {
    const { after, limit = 50 } = query
    const cursor = after === undefined ? undefined : keysetOf(after, ['time', 'id'])
    if (cursor !== undefined && 'refused' in cursor) return cursor
    const wish = { ...filterOf(actor.organisation, query), limit, ...(cursor === undefined ? {} : { after: cursor }) }
    const { rows, next } = pageOf(await searchRegister(tx, wish), limit, orderOf)
    return { body: { documents: rows.map(presentRegisterRow), next } }
  },
})

const tableRoute = route({
  ...common,
  id: 'export-register',
  method: 'get',
  path: '/register.csv',
  summary: 'Issued documents as a table',
  query: { type: 'object', properties: REGISTER_FILTERS, additionalProperties: false },
  limit: 'heavy',
  audited: true,
  answers: { 200: { media: 'text/csv' } },
  async run({ actor, query, services }) {
    const filter = filterOf(actor.organisation, query)
    const rows = everyRow<RegisterRow>(services, actor.organisation, async (tx, last, limit) => {
      const after = last === undefined ? {} : { after: orderOf(last) }
      return (await searchRegister(tx, { ...filter, ...after, limit })).slice(0, limit)
    })
    const answer = csvAnswer(
      'register',
      {
        number: ({ number }) => number,
        state: ({ state }) => state,
        'issued at': ({ issued_at }) => issued_at.toISOString(),
        reference: ({ reference }) => reference,
        title: ({ title }) => title,
        place: ({ place }) => place,
        operator: ({ operator }) => operator,
        'inspected on': ({ inspected_on }) => inspected_on,
        'due on': ({ due_on }) => due_on,
        outcome: ({ outcome }) => outcome,
        replaces: ({ replaces_number }) => replaces_number,
        'replaced by': ({ replaced_by_number }) => replaced_by_number,
        'sha256 of the file': ({ source_sha256 }) => source_sha256,
        'sha256 of the quantities': ({ facts_sha256 }) => facts_sha256,
        'sha256 of the PDF': ({ pdf_sha256 }) => pdf_sha256,
      },
      rows,
    )
    return { ...answer, audit: { filters: query } }
  },
})

/** At most so many audit events are shown with a document; the rest is in the trail. */
const MOST_EVENTS = 100

const showRoute = route({
  ...common,
  id: 'show-register-document',
  method: 'get',
  path: '/register/:document',
  summary: 'One document with its entries, their way to the newest checkpoint, and what was done with it',
  audited: true,
  load: async ({ tx, actor, params }) => (await registerRows(tx, actor.organisation, [params['document'] ?? '']))[0],
  answers: {
    200: {
      type: 'object',
      properties: {
        ...REGISTER_ROW.properties,
        issue: {
          type: 'object',
          description: 'What is printed beside the file: names, accepted words, what it replaces',
        },
        entries: { type: 'array', items: ENTRY_SCHEMA },
        checkpoint: { anyOf: [CHECKPOINT_SCHEMA, { type: 'null' }] },
        events: { type: ['array', 'null'], items: EVENT_SCHEMA, description: 'For who may read the trail' },
      },
      required: [...REGISTER_ROW.required, 'issue', 'entries', 'checkpoint', 'events'],
    },
  },
  async run({ tx, actor, subject }) {
    const { organisation } = actor
    const document = await findDocument(tx, organisation, subject.document_id)
    const checkpoint = await newestCheckpoint(tx, organisation)
    const rows = await entriesOf(tx, organisation, subject.document_id)
    const entries = []
    for (const row of rows) {
      const covered = checkpoint !== undefined && row.sequence < checkpoint.size
      entries.push(presentEntry(row, covered ? await proofAgainst(tx, organisation, row, checkpoint) : null))
    }
    const subjects = [`report/${subject.report_id}`, `document/${subject.document_id}`]
    const events = can(actor, 'audit.read').allowed
      ? await listEvents(tx, { organisation, subjects, limit: MOST_EVENTS })
      : null
    return {
      body: {
        ...presentRegisterRow(subject),
        issue: document?.issue,
        entries,
        checkpoint: checkpoint === undefined ? null : presentCheckpoint(checkpoint),
        events: events?.slice(0, MOST_EVENTS).map(presentEvent) ?? null,
      },
    }
  },
})

export const REGISTER_ROUTES = [listRoute, tableRoute, showRoute]
