import type { Fault } from '#core/errors.ts'
import type { ShapeError, ShapeKeyword } from '#core/generated/install-validator.js'
import { type Parsed, parseQuantity, parseReading } from '#core/read/quantity.ts'
import { parseCable, parseDevice } from '#core/read/shorthand.ts'
import type { Place } from './context.ts'
import { resolved } from './place.ts'
import { rangeFault } from './range.ts'
import type { SchemaNode } from './schema-node.ts'
import { badId, excludedKey, unknownKey } from './words-keys.ts'
import { badDate, badText, emptyText, notAllowed, tooFew, tooLong, tooMany, twice, wrongType } from './words-values.ts'

/** Keywords that are told on their own. Missing keys of one block are told together, see `explain.ts`. */
type Told = Exclude<ShapeKeyword, 'if' | 'required'>

type Wording = (place: Place, error: ShapeError) => Fault | undefined

/** How each keyword of the schema is put into words. The first of several at one place is told. */
const WORDINGS = {
  type: wrongType,
  additionalProperties: (place, { params }) => unknownKey(place, String(params.additionalProperty)),
  'false schema': ({ path }) => excludedKey(String(path.at(-1))),
  propertyNames: ({ place, schema }, { params }) =>
    place.propertyNames && badId(resolved(place.propertyNames, schema), String(params.propertyName)),
  minLength: emptyText,
  pattern: wrongText,
  maxLength: tooLong,
  enum: notAllowed,
  const: notAllowed,
  not: ({ place, value }) => badId(place, String(value)),
  minimum: outOfRange,
  exclusiveMinimum: outOfRange,
  maximum: outOfRange,
  minItems: tooFew,
  maxItems: tooMany,
  maxProperties: tooMany,
  uniqueItems: twice,
} as const satisfies Readonly<Record<Told, Wording>>

/** Keywords, the most telling first. */
export const RANKS: readonly string[] = [...Object.keys(WORDINGS), 'required']

/** What the validator found at a place, in the trade's words. */
export function faultOf(keyword: Told, error: ShapeError, place: Place): Fault | undefined {
  const wording: Wording = WORDINGS[keyword]
  return wording(place, error)
}

/** Text with a form of its own: whoever reads that form says what is wrong with it. */
function wrongText(at: Place): Fault {
  const { place, value } = at
  if (place['x-date']) return badDate(at)
  if (place.not) return badId(place, String(value))
  return faultOfForm(place, value) ?? badText(at)
}

function faultOfForm(place: SchemaNode, value: unknown): Fault | undefined {
  const read = readForm(place, value)
  return read && !read.ok ? read : undefined
}

const SHORTHAND = { device: parseDevice, cable: parseCable }

function readForm(place: SchemaNode, value: unknown): Parsed<unknown> | undefined {
  const { 'x-quantity': quantity, 'x-reading': reading, 'x-shorthand': shorthand, 'x-unit': unit = '' } = place
  if (quantity) return parseQuantity(value, quantity, unit)
  if (reading) return parseReading(value, reading, unit)
  return shorthand && SHORTHAND[shorthand](value)
}

function outOfRange({ place, value }: Place): Fault | undefined {
  return rangeFault(Number(value), place, place['x-unit'] ?? '')
}
