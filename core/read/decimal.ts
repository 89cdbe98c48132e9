import type { Unit } from './units.ts'

/** A decimal number as it was written: digits × 10^exponent. */
export interface Decimal {
  readonly negative: boolean
  readonly digits: string
  readonly exponent: number
}

/**
 * Takes a number apart without rounding it.
 *
 * @param text sign, digits, point, exponent: what `NUMBER` of `quantity.ts` matches
 */
export function decimal(text: string): Decimal {
  const mark = text.search(/e/i)
  const mantissa = (mark === -1 ? text : text.slice(0, mark)).replace(/^[-+]/, '')
  const exponent = mark === -1 ? 0 : Number(text.slice(mark + 1))
  const point = mantissa.indexOf('.')
  const places = point === -1 ? 0 : mantissa.length - point - 1
  return { negative: text.startsWith('-'), digits: mantissa.replace('.', ''), exponent: exponent - places }
}

/**
 * Converts a number from one unit to another of the same kind. Powers of ten are moved in the text, so that 0.024 s is
 * exactly 24 ms; minutes and hours are multiplied as whole numbers, and divided once at the end.
 *
 * @param number as it was written
 * @param from the unit it was written in
 * @param to the unit that is wanted
 * @returns the double-precision number nearest to the exact value (after a division: nearest but one)
 */
export function convert(number: Decimal, from: Unit, to: Unit): number {
  const power = number.exponent + from.power - to.power
  const common = Math.min(from.times, to.times)
  const digits = BigInt(number.digits) * BigInt(from.times / common)
  const value = Number(`${digits}e${power}`) / (to.times / common)
  return number.negative && value !== 0 ? -value : value
}
