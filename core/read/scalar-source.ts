import { keyFault } from './keys.ts'
import { type PlainValue, resolvePlain } from './plain.ts'

/** How a value stands in the text: as it is, or between quotes. */
export type Quotes = '' | "'" | '"'

/** A scalar as it is written, and the value it is read as. */
export interface Written {
  readonly source: string
  readonly value: PlainValue
}

/** A first character that means nothing to YAML, or `-`, `?`, `:` with something behind them; no blank at either end. */
const PLAIN = /^(?:[^\s\p{Cc}\-?:,[\]{}#&*!|>'"%@`]|[-?:](?=[^\s,[\]{}]))(?:.*\S)?$/u
/** What ends a value, or begins a comment, in the middle of it. */
const BROKEN = /:(?=\s|$)|\s#|[\p{Cc}\u2028\u2029]/u
const BROKEN_IN_BRACKETS = /[,[\]{}]|:(?=[,[\]{}])/
const MARKER = /^(?:---|\.\.\.)/

/**
 * Writes a value: without quotes where YAML then reads it as it was meant, else between double quotes.
 *
 * @param text what was entered: `0.29 ohm`, `>999 MΩ`, `24`
 * @param inBrackets whether it goes inside `{ }` or `[ ]`, where a comma ends a value
 * @param quotes what stood around the value before; text keeps them, numbers do not
 */
export function writeScalar(text: string, inBrackets: boolean, quotes: Quotes = ''): Written {
  const resolved = isPlain(text, inBrackets) ? resolvePlain(text) : undefined
  if (resolved !== undefined && 'value' in resolved && resolved.value !== null) {
    const { value } = resolved
    if (quotes === '' || typeof value !== 'string') return { source: text, value }
  }
  if (quotes === "'" && !BROKEN_QUOTE.test(text)) return { source: `'${text.replaceAll("'", "''")}'`, value: text }
  return { source: JSON.stringify(text), value: text }
}

/** What single quotes cannot hold on one line. */
const BROKEN_QUOTE = /[\p{Cc}\u2028\u2029]/u

/** Writes a key, which is always text. */
export function writeKey(key: string): string {
  return isPlain(key, true) && keyFault(key, true) === undefined ? key : JSON.stringify(key)
}

function isPlain(text: string, inBrackets: boolean): boolean {
  if (!PLAIN.test(text) || BROKEN.test(text) || MARKER.test(text)) return false
  return !(inBrackets && BROKEN_IN_BRACKETS.test(text))
}
