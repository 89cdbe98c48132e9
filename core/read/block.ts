import type { Fault } from '../errors.ts'
import { type Parsed, parseQuantity } from './quantity.ts'
import { either, quote } from './words.ts'

/** What a block of keys is called here, once it is known to be one. */
export type Block = Readonly<Record<string, unknown>>

/** Whether a value is a block of keys, and not a list or a single value. */
export function isBlock(value: unknown): value is Block {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}

/** The first key of a block that is not among those known, with what is known. */
export function unknownKey(block: Block, known: readonly string[]): Fault | undefined {
  const strange = Object.keys(block).find((key) => !known.includes(key))
  if (strange === undefined) return undefined
  const message = `${quote(strange)} is not known here: write ${either(known)}.`
  return { code: 'unknown-key', message, at: [strange] }
}

/** A quantity under a key, as a part of a block: empty where the key is missing. */
export function quantityUnder<Key extends string>(
  block: Block,
  key: Key,
  kind: string,
  unit: string,
): Parsed<{ [K in Key]?: number }> {
  if (block[key] === undefined) return { ok: true, value: {} }
  const read = parseQuantity(block[key], kind, unit)
  if (!read.ok) return { ...read, at: [key] }
  const value: { [K in Key]?: number } = {}
  value[key] = read.value
  return { ok: true, value }
}

/** A word under a key that is one of a few, as a part of a block: empty where the key is missing. */
export function wordUnder<Key extends string, Word extends string | number>(
  block: Block,
  key: Key,
  words: readonly Word[],
): Parsed<{ [K in Key]?: Word }> {
  if (block[key] === undefined) return { ok: true, value: {} }
  const word = words.find((allowed) => allowed === block[key])
  if (word === undefined) {
    const message = `${quote(String(block[key]))} is not possible here: write ${either(words.map(String))}.`
    return { ok: false, code: 'not-allowed-value', message, at: [key] }
  }
  const value: { [K in Key]?: Word } = {}
  value[key] = word
  return { ok: true, value }
}

/** All parts together, or the first fault. */
export function together<T extends object>(parts: readonly Parsed<object>[], start: T): Parsed<T> {
  let whole = start
  for (const part of parts) {
    if (!part.ok) return part
    whole = { ...whole, ...part.value }
  }
  return { ok: true, value: whole }
}
