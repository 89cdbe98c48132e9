import type { Measured, SheetValue } from '#core/glossary.ts'
import { shown } from '#core/texts/value.ts'

/** Holds a number and its unit on one line. */
const JOIN = '\u00a0'
const THOUSANDS: ReadonlySet<string> = new Set(['A', 'W', 'Wh', 'VA'])

/** A number with so many significant digits, no needless zeros, and a true minus. */
function digits(value: number, significant: number): string {
  return signed(String(Number(value.toPrecision(significant))))
}

function joined(value: number, unit: string, significant: number): string {
  const kilo = THOUSANDS.has(unit) && Math.abs(value) >= 1000
  const [number, name] = kilo ? [value / 1000, `k${unit}`] : [value, unit]
  return name === '' ? digits(number, significant) : `${digits(number, significant)}${JOIN}${name}`
}

/** A stated number with its unit, from 1000 on with kilo where the unit takes it: `2.1 kA`. */
export function amount(value: number, unit: string): string {
  return joined(value, unit, 4)
}

/** The same for what may not be known: `–`. */
export function amountOr(value: number | undefined, unit: string, missing = '–'): string {
  return value === undefined ? missing : amount(value, unit)
}

/** A value of a sheet as printed, computed numbers with three digits that count; `–` where there is none. */
export function printed(value: SheetValue | undefined, unit: string): string {
  if (value === undefined) return '–'
  if (typeof value !== 'number' || !Number.isFinite(value)) return shown(value, unit)
  return joined(value, unit, Math.abs(value) < 100 ? 3 : 4)
}

/** A number with at least so many decimals, more where it was read finer (up to four). */
export function decimals(value: number, least: number): string {
  for (let count = least; count < 4; count += 1) {
    if (Math.abs(Number(value.toFixed(count)) - value) < 1e-9) return signed(value.toFixed(count))
  }
  return signed(value.toFixed(Math.max(least, 4)))
}

/** A computed number with just so many decimals. */
export function rounded(value: number | undefined, count: number): string {
  return value === undefined ? '–' : signed(value.toFixed(count))
}

const signed = (text: string): string => text.replace('-', '−')

/** A reading as it was taken, without its unit: `0.55`, `>999`, `no trip`, `–` where there is none. */
export function readingText(measured: Measured | undefined, least: number): string {
  if (measured === undefined) return '–'
  if (!('value' in measured)) return 'not tested'
  if (measured.noTrip) return 'no trip'
  const sign = measured.bound === 'above' ? '>' : measured.bound === 'below' ? '<' : ''
  return `${sign}${decimals(measured.value, least)}`
}

/** A reading with its unit; the test voltage behind it where one is stated. */
export function readingWithUnit(measured: Measured | undefined, unit: string, least: number): string {
  const text = readingText(measured, least)
  if (measured === undefined || !('value' in measured) || measured.noTrip) return text
  const at = measured.at === undefined ? '' : ` at ${measured.at}${JOIN}V`
  return `${text}${JOIN}${unit}${at}`
}

const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const

/** `2026-10-13` as `13 October 2026`. */
export function dateText(iso: string): string {
  const [year, month, day] = iso.slice(0, 10).split('-').map(Number)
  return `${day}${JOIN}${MONTHS[Number(month) - 1]}${JOIN}${year}`
}

/** `2026-10-21T09:30:00Z` as `21 October 2026, 09:30 UTC`. */
export function timeText(iso: string): string {
  return `${dateText(iso)}, ${iso.slice(11, 16)}${JOIN}UTC`
}

/** The days of an inspection in words: `12 to 13 October 2026`. */
export function daysText(days: { readonly from: string; readonly to?: string } | undefined): string {
  if (days === undefined) return 'not yet inspected'
  const { from, to = from } = days
  if (to === from) return dateText(from)
  const sameMonth = to.slice(0, 7) === from.slice(0, 7)
  return `${sameMonth ? Number(from.slice(8, 10)) : dateText(from)} to ${dateText(to)}`
}

/** Hours as people say them: `7 h 18 min`. */
export function hoursText(hours: number): string {
  if (!Number.isFinite(hours)) return 'without end'
  const minutes = Math.round(hours * 60)
  const [whole, rest] = [Math.floor(minutes / 60), minutes % 60]
  return rest === 0 || whole >= 48 ? `${whole}${JOIN}h` : `${whole}${JOIN}h ${rest}${JOIN}min`
}

/** A few names in a row, the rest as a count. */
export function few(names: readonly string[], most: number): string {
  if (names.length <= most) return names.join(', ')
  return `${names.slice(0, most).join(', ')} and ${names.length - most} more`
}

/** A unit that belongs to the number before it. */
const UNIT = /(\d) (?=(?:[kmM]?(?:A|V|W|Wh|VA|Ω|Hz|s|m)|mm²|m²|%|°C|h|W\/m²)(?![A-Za-z²]))/g

/** Keeps numbers and their units on one line. */
export function held(words: string): string {
  return words.replace(UNIT, `$1${JOIN}`)
}

/** With a capital in front. */
export function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}
