import type { Fault } from '../errors.ts'
import type { Reading } from '../glossary.ts'
import { convert, decimal } from './decimal.ts'
import { numberFault } from './plain.ts'
import { canonical, kindOf, kindWithUnit, printed, sameButForCapitals, type Unit, usualUnits } from './units.ts'
import { either, quote } from './words.ts'

/** A value, or what is wrong with it. */
export type Parsed<T> = { readonly ok: true; readonly value: T } | ({ readonly ok: false } & Fault)

/** Blanks of every width that word processors and phones put between a number and its unit. */
const BLANKS = /[\s\u00a0\u2007\u2009\u200a\u202f]+/g
const NUMBER = /^[-+]?(?:[0-9]+(?:\.[0-9]*)?|\.[0-9]+)(?:[eE][-+]?[0-9]+)?/
const COMMA = /^[-+]?[0-9][0-9.]*,[0-9][0-9.,]*/
const GROUPS = /^[-+]?[0-9]{1,3}(?:[ '’][0-9]{3})+(?![0-9])/
/** No quantity is longer; longer text is not looked at. */
const LONGEST = 64

/**
 * Reads a quantity: a number in the unit that the schema names for the place, or text with a unit of its own
 * (`0.42 ohm`, `420 mΩ`, `2.5mm²`, `20 %`).
 *
 * @param value what stands in the file
 * @param kind `voltage`, `current`, `time` …: see `units.ts`
 * @param unit the unit that is wanted; a bare number is in it
 * @returns the number in that unit, exact to the last digit; or the fault, with the mended text where there is one
 * @throws Error when there is no such kind, or the kind has no such unit
 */
export function parseQuantity(value: unknown, kind: string, unit: string): Parsed<number> {
  const wanted = unitOf(kind, unit)
  if (typeof value === 'string') return parseText(value, kind, wanted)
  if (typeof value !== 'number') return notAQuantity(value, kind)
  if (Number.isFinite(value)) return { ok: true, value }
  const message = `This is not a number that can be worked with: write for example ${kindOf(kind).example}.`
  return { ok: false, code: 'number-not-finite', message }
}

function unitOf(kind: string, unit: string): Unit {
  const found = kindOf(kind).units[canonical(unit)]
  if (found === undefined) throw new Error(`The unit ${unit} is not one of ${kind}`)
  return found
}

/** One kind of blank, one kind of minus. */
function tidy(text: string): string {
  return text
    .replace(BLANKS, ' ')
    .trim()
    .replace(/^[\u2212\u2012\u2013]/, '-')
}

function parseText(text: string, kind: string, wanted: Unit): Parsed<number> {
  const tidied = tidy(text)
  const number = NUMBER.exec(tidied)?.[0]
  if (number === undefined || tidied.length > LONGEST) return notAQuantity(text, kind)
  const separated = separatorFault(tidied)
  if (separated !== undefined) return { ok: false, ...separated }
  const fault = numberFault(number, '')
  if (fault !== undefined) return { ok: false, ...fault }
  const unit = tidied.slice(number.length).trim()
  if (unit === '') return { ok: true, value: convert(decimal(number), wanted, wanted) }
  const from = kindOf(kind).units[canonical(unit)]
  if (from === undefined) return { ok: false, ...unitFault(number, unit, kind) }
  return { ok: true, value: convert(decimal(number), from, wanted) }
}

/** Commas and blanks between digits. */
function separatorFault(text: string): Fault | undefined {
  const groups = GROUPS.exec(text)?.[0]
  if (groups !== undefined) {
    const mended = groups.replace(/[ '’]/g, '') + text.slice(groups.length)
    return { code: 'number-separator', message: `${quote(text)} has separators between its digits: write ${mended}.` }
  }
  const comma = COMMA.exec(text)?.[0]
  if (comma === undefined) return undefined
  const rest = text.slice(comma.length)
  const mended = pointsFor(comma).map((number) => number + rest)
  return {
    code: 'decimal-comma',
    message: `${quote(text)} has a comma, and numbers are written with a decimal point: write ${either(mended)}.`,
  }
}

/** What a number with commas can have meant: `1,5` one thing, `1,000` two. */
function pointsFor(number: string): string[] {
  const whole = number.replaceAll(',', '')
  if (number.indexOf(',') !== number.lastIndexOf(',') || number.lastIndexOf('.') > number.indexOf(',')) return [whole]
  const point = number.replaceAll('.', '').replace(',', '.')
  return /,[0-9]{3}$/.test(number) && !number.includes('.') && !/^[-+]?0/.test(number) ? [point, whole] : [point]
}

function unitFault(number: string, unit: string, kind: string): Fault {
  const place = kindOf(kind)
  const spelt = canonical(unit)
  const meant = sameButForCapitals(place, spelt)
  if (meant !== undefined && kindWithUnit(spelt) === undefined) {
    const message = `The unit ${quote(unit)} is not spelt that way: write ${number} ${printed(meant)}.`
    return { code: 'unit-unknown', message }
  }
  const allowed = either(usualUnits(place))
  const wanted = allowed === '' ? 'without a unit' : `in ${allowed}`
  const other = kindWithUnit(spelt)
  if (other === undefined) {
    const message = `The unit ${quote(unit)} is not known: write ${place.name} ${wanted}, for example ${place.example}.`
    return { code: 'unit-unknown', message }
  }
  const message = `${quote(`${number} ${unit}`)} is ${other.name}, and this place takes ${place.name}: write it ${wanted}, for example ${place.example}.`
  return { code: 'unit-of-wrong-kind', message }
}

function notAQuantity(value: unknown, kind: string): { ok: false } & Fault {
  const { name, example } = kindOf(kind)
  const found = typeof value === 'string' ? `${quote(value)} is not` : 'This is not'
  return { ok: false, code: 'not-a-quantity', message: `${found} ${name}: write a number, for example ${example}.` }
}

/**
 * Prints a quantity so that `parseQuantity` reads the same number again.
 *
 * @param value finite, in that unit, with at most 15 significant digits
 * @param unit as the schema names it; empty for a bare factor
 */
export function printQuantity(value: number, unit: string): string {
  return unit === '' ? String(value) : `${value} ${unit}`
}

/**
 * Reads what an instrument showed: a quantity, or one beyond the range of the instrument (`>999 MΩ`, `≤0.05 ohm`), with
 * the test voltage where it states one (`180 MΩ at 1000 V`), or `no trip` for the time of a residual-current device.
 *
 * @param value what stands in the file
 * @param kind as in `parseQuantity`; only `insulation` takes a test voltage
 * @param unit the unit that is wanted; `no trip` is taken where times are in ms, as those of residual-current devices are
 * @returns the reading in that unit, or the fault
 * @throws Error when there is no such kind, or the kind has no such unit
 */
export function parseReading(value: unknown, kind: string, unit: string): Parsed<Reading> {
  if (typeof value !== 'string') return asReading(parseQuantity(value, kind, unit), {})
  const text = tidy(value)
  if (/^no trip$/i.test(text)) return noTrip(kind, unit)
  if (OVER_RANGE.test(text)) return overRange(text, kind)
  const sign = SIGNS.find((mark) => text.startsWith(mark)) ?? ''
  const rest = text.slice(sign.length)
  const end = rest.indexOf(' at ')
  const shown = end === -1 ? rest : rest.slice(0, end)
  const at = end === -1 ? undefined : testVoltage(text, rest.slice(end + 4), kind)
  if (at !== undefined && !at.ok) return at
  const read = parseQuantity(shown, kind, unit)
  return asReading(read, { ...boundOf(sign), ...(at === undefined ? {} : { at: at.value }) })
}

/** Beyond the range of the instrument; the longer spelling first. */
const SIGNS = ['>=', '<=', '>', '<', '≥', '≤']
/** What displays show when the value is beyond their range. */
const OVER_RANGE = /^[<>]? ?(?:O\.?L\.?|over(?:flow|load| range)?|infinite|infinity|inf|∞)(?: [kMG]?(?:ohm|Ω|Ω))?$/i

function asReading(read: Parsed<number>, more: Omit<Reading, 'value'>): Parsed<Reading> {
  return read.ok ? { ok: true, value: { value: read.value, ...more } } : read
}

function boundOf(sign: string): Pick<Reading, 'bound'> {
  if (sign === '') return {}
  return { bound: sign.startsWith('>') || sign === '≥' ? 'above' : 'below' }
}

function noTrip(kind: string, unit: string): Parsed<Reading> {
  if (kind === 'time' && unit === 'ms') return { ok: true, value: { value: Number.POSITIVE_INFINITY, noTrip: true } }
  const { name, example } = kindOf(kind)
  const message = `“no trip” is said of a residual-current device that did not open: write ${name} here, for example ${example}.`
  return { ok: false, code: 'reading-no-trip', message }
}

function overRange(text: string, kind: string): Parsed<Reading> {
  const { name } = kindOf(kind)
  const example = kind === 'insulation' ? '">999 MΩ"' : '">199 ohm"'
  const message = `${quote(text)} does not say how large ${name} is at least: write the end of the instrument’s range, for example ${example}.`
  return { ok: false, code: 'reading-bound', message }
}

function testVoltage(text: string, voltage: string, kind: string): Parsed<number> {
  if (kind === 'insulation') return parseQuantity(voltage, 'voltage', 'V')
  const message = `${quote(text)} states a test voltage, which belongs to an insulation reading only: leave out “at ${voltage}”.`
  return { ok: false, code: 'reading-test-voltage', message }
}

/**
 * Prints a reading so that `parseReading` reads the same one again.
 *
 * @param reading its value with at most 15 significant digits
 * @param unit as the schema names it
 */
export function printReading(reading: Reading, unit: string): string {
  if (reading.noTrip) return 'no trip'
  const sign = reading.bound === undefined ? '' : reading.bound === 'above' ? '>' : '<'
  const at = reading.at === undefined ? '' : ` at ${printQuantity(reading.at, 'V')}`
  return `${sign}${printQuantity(reading.value, unit)}${at}`
}
