import type { Fault } from '#core/errors.ts'
import { quote } from '#core/read/words.ts'
import { nearest } from '#core/texts/nearest.ts'
import type { Place } from './context.ts'
import { exampleOf, found, titleOf } from './describe.ts'
import type { SchemaNode } from './schema-node.ts'

const TYPES: Readonly<Record<string, string>> = {
  object: 'a block of keys',
  array: 'a list',
  string: 'text',
  number: 'a number',
  integer: 'a whole number',
  boolean: 'true or false',
}

/** A value of another type than the place takes. */
export function wrongType({ place, value }: Place): Fault {
  const head = `${titleOf(place)} is ${found(value)}, but takes ${taken(place)}`
  return { code: 'wrong-type', message: `${head}: write ${correction(place, value)}.` }
}

function taken(place: SchemaNode): string {
  const unit = place['x-unit']
  if (place['x-reading']) return `a reading in ${unit}, or { not_tested: the reason }`
  if (place['x-quantity']) return unit ? `a number in ${unit}, or text with its unit` : 'a number'
  if (place['x-shorthand']) return `a ${place['x-shorthand']} in short or in long`
  return String(TYPES[String(place.type)])
}

/** A number where text belongs only lacks its quotes, a single value where a list belongs its brackets. */
function correction({ type, ...place }: SchemaNode, value: unknown): string {
  const plain = typeof value === 'number' || typeof value === 'boolean' || typeof value === 'string'
  if (type === 'string' && plain && !place.enum && !place.pattern) return `"${value}", in quotes`
  if (type === 'array' && plain) return `[ ${value} ]`
  return exampleOf(place)
}

/** A value outside the list of what the place takes. */
export function notAllowed({ place, value }: Place): Fault {
  const names = (place.enum ?? [place.const]).map(String)
  const meant = typeof value === 'string' ? nearest(value, names) : undefined
  const head = `${titleOf(place)} is ${found(value)}, but takes only ${names.join(' · ')}`
  return { code: 'not-allowed-value', message: `${head}: write ${meant ?? 'one of them'}.` }
}

const DATE = /^(\d{4})-(\d{2})-(\d{2})/

/** Text that is not a day of the calendar. */
export function badDate({ place, value }: Place): Fault {
  const text = String(value)
  const [, year, month, day] = DATE.exec(text) ?? []
  const form = `write it like ${exampleOf(place)}`
  if (day === undefined) return { code: 'bad-date', message: `${quote(text)} is not a date: ${form}.` }
  if (Number(month) < 1 || Number(month) > 12) {
    return { code: 'bad-date', message: `${quote(text)} is not a date, there is no month ${month}: ${form}.` }
  }
  const last = new Date(Date.UTC(Number(year), Number(month), 0)).getUTCDate()
  if (Number(day) < 1 || Number(day) > last) {
    const reason = `${year}-${month} has ${last} days`
    return { code: 'bad-date', message: `${quote(text)} is not in the calendar, ${reason}: write the right day.` }
  }
  return { code: 'bad-date', message: `${quote(text)} is not a date and time: ${form}.` }
}

/** Text that has not the form of its place. */
export function badText({ place, value }: Place): Fault {
  const text = String(value)
  return { code: 'pattern', message: `${titleOf(place)} cannot be ${quote(text)}: write it like ${exampleOf(place)}.` }
}

export function tooLong({ place, value }: Place): Fault {
  const message = `${titleOf(place)} has ${String(value).length} characters: shorten it to ${place.maxLength}.`
  return { code: 'too-long', message }
}

export function emptyText({ place }: Place): Fault {
  return {
    code: 'too-few',
    message: `${titleOf(place)} is an empty text: write it, such as ${exampleOf(place)}, or remove the key.`,
  }
}

export function tooMany({ place }: Place): Fault {
  const most = place.maxItems ?? place.maxProperties
  return { code: 'too-many', message: `${titleOf(place)} holds more than ${most} entries: shorten it to that.` }
}

export function tooFew({ place }: Place): Fault {
  return {
    code: 'too-few',
    message: `${titleOf(place)} is an empty list: write at least one entry, such as ${exampleOf(place)}.`,
  }
}

export function twice({ place }: Place): Fault {
  return { code: 'not-allowed-value', message: `${titleOf(place)} names the same thing twice: remove one of them.` }
}
