import { kindOf } from '#core/read/units.ts'
import type { SchemaNode } from '#core/shape/schema-node.ts'
import { eachSchema } from './map-schema.ts'
import { INSTALL_ID, type SchemaParts } from './parts.ts'

const PART = `${INSTALL_ID}:quantities`
const POINTER = `${PART}#/$defs/`
const READING = '-reading'
/** Times of residual-current devices, where `no trip` is a reading. */
const TRIP_TIME = 'trip-time'

const NUMBER = String.raw`[-+−]?(?:0|[1-9][0-9]*)(?:\.[0-9]+)?(?:[eE][-+]?[0-9]+)?`
const BLANK = String.raw`[ \u00a0\u2009\u202f]?`
const BOUND = '(?:>=|<=|[<>≤≥])? ?'

/**
 * The part of the schema that says how quantities and readings are written: one definition for each kind that the other
 * parts refer to, its text form made from the units that the reader knows.
 */
export function quantitiesPart({ top, parts }: SchemaParts): SchemaNode {
  const names = new Set<string>()
  for (const schema of [top, ...parts.values()]) {
    for (const { node } of eachSchema(schema)) {
      if (node.$ref?.startsWith(POINTER)) names.add(node.$ref.slice(POINTER.length))
    }
  }
  const definitions = [...names].sort().map((name) => [name, definition(name)] as const)
  return {
    $schema: 'https://json-schema.org/draft/2020-12/schema',
    $id: PART,
    title: 'Quantities',
    description:
      'How numbers with units, and readings of instruments, are written. Generated from the units of the reader.',
    $defs: Object.fromEntries(definitions),
  }
}

function definition(name: string): SchemaNode {
  return name.endsWith(READING) ? reading(name.slice(0, -READING.length)) : quantity(name)
}

function quantity(kind: string): SchemaNode {
  const { name, example } = kindOf(kind)
  return {
    'x-quantity': kind,
    type: ['number', 'string'],
    title: capital(name),
    description: 'A number in the unit of the place, or text with a unit of its own.',
    maxLength: 64,
    pattern: `^${NUMBER}${BLANK}${units(kind)}$`,
    examples: [example],
  }
}

function reading(name: string): SchemaNode {
  const kind = name === TRIP_TIME ? 'time' : name
  const voltage = kind === 'insulation' ? `(?: at ${NUMBER}${BLANK}${units('voltage')})?` : ''
  const value = `${BOUND}${NUMBER}${BLANK}${units(kind)}${voltage}`
  return {
    'x-reading': kind,
    type: ['number', 'string', 'object'],
    title: `Reading of ${kindOf(kind).name}`,
    description: 'What the instrument showed; or { not_tested: the reason }.',
    maxLength: 64,
    pattern: name === TRIP_TIME ? `^(?:[Nn]o trip|${value})$` : `^${value}$`,
    examples: name === TRIP_TIME ? ['no trip', '24 ms'] : [kindOf(kind).example],
    additionalProperties: false,
    required: ['not_tested'],
    properties: { not_tested: NOT_TESTED },
  }
}

const NOT_TESTED: SchemaNode = {
  type: 'string',
  title: 'Not tested',
  description:
    'Why this was not measured. The report states it as a limitation, and the reviewer accepts or refuses it; it never counts as a pass.',
  minLength: 1,
  maxLength: 500,
  examples: ['Rain on the array'],
}

/** The units of a kind in every spelling that the reader takes for the same. */
function units(kind: string): string {
  const spellings = Object.keys(kindOf(kind).units)
    .filter((unit) => unit !== '')
    .map(spelling)
  return `(?:${spellings.join('|')})?`
}

function spelling(unit: string): string {
  return unit
    .replace('°C', '(?:[°º˚]C|℃)')
    .replace(/^°/, '[°º˚]')
    .replace('ohm', '(?:ohm|Ω|\u2126)')
    .replace('µ', '[µμ]')
    .replace(/2/, '(?:2|²|\\^2)')
    .replace(/^x$/, '[x×]')
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}
