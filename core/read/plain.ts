import type { Fault } from '../errors.ts'
import { MAX_DIGITS } from './limits.ts'
import { cut, quote } from './words.ts'

export type PlainValue = string | number | boolean | null

const WORDS: ReadonlyMap<string, boolean | null> = new Map([
  ['', null],
  ['~', null],
  ['null', null],
  ['Null', null],
  ['NULL', null],
  ['true', true],
  ['True', true],
  ['TRUE', true],
  ['false', false],
  ['False', false],
  ['FALSE', false],
])

const NUMBER = /^[-+]?(?:\.[0-9]+|[0-9]+(?:\.[0-9]*)?)(?:[eE][-+]?[0-9]+)?$/
const NOT_FINITE = /^(?:[-+]?\.(?:inf|Inf|INF)|\.(?:nan|NaN|NAN))$/
const OTHER_RADIX = /^[-+]?0(?:o[0-7]+|x[0-9a-fA-F]+)$/
/** With or without underscores; whether there is one is asked besides, to keep the pattern quick on long text. */
const UNDERSCORES = /^[-+]?[0-9][0-9_]*(?:\.[0-9_]*)?$/
const SEXAGESIMAL = /^[-+]?[0-9]+(?::[0-5]?[0-9])+(?:\.[0-9]*)?$/
const LEADING_ZERO = /^([-+]?)0+(?=[0-9])/
const SMALLEST_NORMAL = 2.3e-308

/** No number is longer, however it is written. */
const LONGEST = 64

/** First characters of anything that is not simply text: signs, digits, the dot, and the letters of the words above. */
const MAY_BE_SPECIAL = /^[-+.0-9~nNtTfF]/

/**
 * The value of a scalar without quotes, by the core schema of YAML 1.2 (clause 10.3.2): `null`, `true`, `false`,
 * decimal numbers, and else text. `yes`, `no`, `on`, `off` and dates are text. Numbers that would be read differently
 * by another program, or lose digits, are refused: each with the mended text.
 *
 * @param source the scalar, lines already folded
 * @returns the value, or what is wrong with the number
 */
export function resolvePlain(source: string): { value: PlainValue } | { fault: Fault } {
  if (source !== '' && !MAY_BE_SPECIAL.test(source)) return { value: source }
  const word = WORDS.get(source)
  if (word !== undefined) return { value: word }
  if (NUMBER.test(source)) return resolveNumber(source)
  if (source.length > LONGEST) return { value: source }
  const fault = strangeNumber(source)
  return fault === undefined ? { value: source } : { fault }
}

function resolveNumber(source: string): { value: number } | { fault: Fault } {
  const fault = numberFault(source, `, or put it in quotes ("${cut(source)}") if it is a name`)
  if (fault !== undefined) return { fault }
  const value = Number(source)
  return { value: value === 0 ? 0 : value }
}

/**
 * Why a decimal number is refused although it is well formed.
 *
 * @param source sign, digits, point, exponent; nothing else
 * @param otherwise what else could be done, from the comma on; empty where there is only the one way
 * @returns what is wrong and how it is mended, or undefined for a sound number
 */
export function numberFault(source: string, otherwise: string): Fault | undefined {
  if (LEADING_ZERO.test(source)) {
    const mended = cut(source.replace(LEADING_ZERO, '$1'))
    return {
      code: 'number-leading-zero',
      message: `${quote(source)} begins with a zero: write ${mended}${otherwise}.`,
    }
  }
  const digits = significantDigits(source)
  if (digits.length > MAX_DIGITS) {
    return {
      code: 'number-too-precise',
      message: `${quote(source)} has ${digits.length} digits, and only ${MAX_DIGITS} are kept exactly: write ${rounded(source)}${otherwise}.`,
    }
  }
  const value = Math.abs(Number(source))
  if (value === Number.POSITIVE_INFINITY || (digits !== '' && value < SMALLEST_NORMAL)) {
    return {
      code: 'number-not-finite',
      message: `${quote(source)} is beyond the range of numbers: write the value that was measured or designed.`,
    }
  }
  return undefined
}

/** Digits from the first to the last that is not zero, without the exponent. */
function significantDigits(source: string): string {
  const digits = source
    .split(/[eE]/, 1)
    .join('')
    .replace(/[^0-9]/g, '')
  let start = 0
  while (digits[start] === '0') start++
  let end = digits.length
  while (end > start && digits[end - 1] === '0') end--
  return digits.slice(start, end)
}

function rounded(source: string): string {
  const value = Number(source)
  return Number.isFinite(value) ? String(Number(value.toPrecision(MAX_DIGITS))) : 'fewer digits'
}

/** What looks like a number to a person or to another program, and is none in the core schema. */
function strangeNumber(source: string): Fault | undefined {
  if (NOT_FINITE.test(source)) {
    return {
      code: 'number-not-finite',
      message: `${quote(source)} is not a number that can be worked with: write the reading, or one beyond the range as ">999 MΩ".`,
    }
  }
  if (OTHER_RADIX.test(source)) {
    return { code: 'number-radix', message: `${quote(source)} is not decimal: write ${decimal(source)}.` }
  }
  if (source.includes('_') && UNDERSCORES.test(source)) {
    const mended = source.replaceAll('_', '')
    return { code: 'number-separator', message: `${quote(source)} has separators between its digits: write ${mended}.` }
  }
  if (SEXAGESIMAL.test(source)) return sexagesimal(source)
  return undefined
}

function decimal(source: string): string {
  const sign = source.startsWith('-') ? '-' : ''
  return `${sign}${Number(source.replace(/^[-+]/, ''))}`
}

/** Some programs read `1:30` as 90. */
function sexagesimal(source: string): Fault {
  const sign = source.startsWith('-') ? -1 : 1
  const parts = source.replace(/^[-+]/, '').split(':')
  const value = sign * parts.reduce((sum, part) => sum * 60 + Number(part), 0)
  return {
    code: 'number-sexagesimal',
    message: `${quote(source)} is read as ${value} by some programs: write ${value}, or put it in quotes ("${source}") if it is text.`,
  }
}
