import { csvAnswer, everyRow } from '#server/exports/table.ts'
import { keysetOf, PAGE_QUERY, pageOf } from '#server/http/keyset.ts'
import { route } from '#server/http/route.ts'
import { INSTRUMENT_SCHEMA, INSTRUMENT_WITH_HISTORY, presentInstrument } from '#server/presenters/instrument.ts'
import { findInstrument, type InstrumentRow, instrumentHistory, listInstruments } from '#server/queries/instruments.ts'

const FILTERS = {
  due_before: { type: 'string', format: 'date' },
  retired: { type: 'string', enum: ['no', 'only', 'all'], default: 'no' },
  search: { type: 'string', minLength: 1, maxLength: 100, description: 'Part of the serial number or of the kind' },
} as const

const common = { tag: 'instruments', policy: { action: 'instrument.read' }, limit: 'read' } as const

interface Filters {
  readonly due_before?: string | undefined
  readonly retired?: 'no' | 'only' | 'all' | undefined
  readonly search?: string | undefined
}

const wished = (organisation: string, { due_before, retired = 'no', search }: Filters) => ({
  organisation,
  retired,
  ...(due_before === undefined ? {} : { dueBefore: due_before }),
  ...(search === undefined ? {} : { search }),
})

const orderOf = ({ due_on, instrument_id }: InstrumentRow): readonly string[] => [due_on, instrument_id]

const listRoute = route({
  ...common,
  id: 'list-instruments',
  method: 'get',
  path: '/instruments',
  summary: 'Instruments with their newest calibration, what falls due first ahead',
  query: { type: 'object', properties: { ...FILTERS, ...PAGE_QUERY }, additionalProperties: false },
  answers: {
    200: {
      type: 'object',
      properties: { instruments: { type: 'array', items: INSTRUMENT_SCHEMA }, next: { type: ['string', 'null'] } },
      required: ['instruments', 'next'],
    },
  },
  async run({ tx, actor, query }) {
    const { after, limit = 50 } = query
    const cursor = after === undefined ? undefined : keysetOf(after, ['date', 'id'])
    if (cursor !== undefined && 'refused' in cursor) return cursor
    const wish = { ...wished(actor.organisation, query), limit, ...(cursor === undefined ? {} : { after: cursor }) }
    const { rows, next } = pageOf(await listInstruments(tx, wish), limit, orderOf)
    return { body: { instruments: rows.map(presentInstrument), next } }
  },
})

const showRoute = route({
  ...common,
  id: 'show-instrument',
  method: 'get',
  path: '/instruments/:instrument',
  summary: 'One instrument with every version of its record',
  load: ({ tx, actor, params }) => findInstrument(tx, actor.organisation, params['instrument'] ?? ''),
  answers: { 200: INSTRUMENT_WITH_HISTORY },
  async run({ tx, actor, subject }) {
    const history = await instrumentHistory(tx, actor.organisation, subject.instrument_id)
    return {
      body: { ...presentInstrument(subject), history: history.map(presentInstrument) },
      version: subject.version,
    }
  },
})

const tableRoute = route({
  ...common,
  id: 'export-instruments',
  method: 'get',
  path: '/instruments.csv',
  summary: 'Instruments as a table',
  query: { type: 'object', properties: FILTERS, additionalProperties: false },
  limit: 'heavy',
  audited: true,
  answers: { 200: { media: 'text/csv' } },
  async run({ actor, query, services }) {
    const wish = wished(actor.organisation, query)
    const rows = everyRow<InstrumentRow>(services, actor.organisation, async (tx, last, limit) => {
      const after = last === undefined ? {} : { after: orderOf(last) }
      return (await listInstruments(tx, { ...wish, ...after, limit })).slice(0, limit)
    })
    return csvAnswer(
      'instruments',
      {
        serial: ({ serial }) => serial,
        kind: ({ kind }) => kind,
        'calibrated on': ({ calibrated_on }) => calibrated_on,
        'due on': ({ due_on }) => due_on,
        certificate: ({ certificate }) => certificate,
        'retired at': ({ retired_at }) => retired_at?.toISOString() ?? null,
        version: ({ version }) => version,
        'written by': ({ written_by_name }) => written_by_name,
        'written at': ({ written_at }) => written_at.toISOString(),
        note: ({ note }) => note,
      },
      rows,
    )
  },
})

export const INSTRUMENT_ROUTES = [listRoute, tableRoute, showRoute]
