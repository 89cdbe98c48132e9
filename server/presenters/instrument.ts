import type { InstrumentRow } from '#server/queries/instruments.ts'

/** Kinds of measurement for which a calibration states an uncertainty, as the install file names them. */
const KINDS = [
  'insulation',
  'loop',
  'continuity',
  'electrode',
  'residual_time',
  'residual_current',
  'voltage',
  'frequency',
  'current',
  'irradiance',
  'time',
  'array_voltage',
  'array_current',
] as const

const PERCENT = { type: 'number', exclusiveMinimum: 0, maximum: 100 } as const
const DATE = { type: 'string', format: 'date' } as const

/** What is written with each calibration. */
export const CALIBRATION = {
  kind: { type: 'string', minLength: 1, maxLength: 100 },
  calibrated_on: DATE,
  due_on: DATE,
  certificate: { type: 'string', maxLength: 100, default: '' },
  uncertainty: {
    type: 'object',
    description: '% of the reading, by kind of measurement',
    propertyNames: { enum: KINDS },
    additionalProperties: PERCENT,
  },
  note: { type: 'string', maxLength: 2000, default: '' },
} as const

const WRITER = {
  type: 'object',
  properties: { id: { type: 'string', format: 'uuid' }, name: { type: 'string' } },
  required: ['id', 'name'],
} as const

export const INSTRUMENT_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    serial: { type: 'string' },
    version: { type: 'integer' },
    retired_at: { type: ['string', 'null'], format: 'date-time' },
    ...CALIBRATION,
    written_at: { type: 'string', format: 'date-time' },
    written_by: WRITER,
  },
  required: ['id', 'serial', 'version', 'retired_at', 'kind', 'calibrated_on', 'due_on', 'written_at', 'written_by'],
} as const

export const INSTRUMENT_WITH_HISTORY = {
  ...INSTRUMENT_SCHEMA,
  properties: { ...INSTRUMENT_SCHEMA.properties, history: { type: 'array', items: INSTRUMENT_SCHEMA } },
  required: [...INSTRUMENT_SCHEMA.required, 'history'],
} as const

export function presentInstrument(row: InstrumentRow) {
  return {
    id: row.instrument_id,
    serial: row.serial,
    version: row.version,
    retired_at: row.retired_at?.toISOString() ?? null,
    kind: row.kind,
    calibrated_on: row.calibrated_on,
    due_on: row.due_on,
    certificate: row.certificate,
    uncertainty: row.uncertainty,
    note: row.note,
    written_at: row.written_at.toISOString(),
    written_by: { id: row.written_by, name: row.written_by_name },
  }
}
