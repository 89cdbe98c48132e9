import type { Fault } from '#core/errors.ts'
import { quote } from '#core/read/words.ts'
import { nearest } from '#core/texts/nearest.ts'
import type { Place } from './context.ts'
import { exampleOf, listed, titleOf } from './describe.ts'
import { isObject } from './locate.ts'
import { placeAt } from './place.ts'
import type { SchemaNode } from './schema-node.ts'

/** A key that the place does not know: the nearest known one, or all that are allowed. */
export function unknownKey(at: Place, key: string): Fault {
  const known = Object.keys({ ...at.place.properties })
  const meant = nearest(key, known)
  if (meant) return { code: 'unknown-key', message: `${titleOf(at.place)} has no key ${quote(key)}: write ${meant}.` }
  return brokenNumber(at.value, key) ?? { code: 'unknown-key', message: noSuchKey(at, key, known) }
}

function noSuchKey(at: Place, key: string, known: readonly string[]): string {
  return `${titleOf(at.place)} has no key ${quote(key)}: remove it, or use one of ${known.join(', ')}.`
}

/**
 * `{ length: 1,5 m }` is read as two entries, the second an empty one called `5 m`. Which number it belongs to is only
 * known for sure where the key before it holds one.
 */
function brokenNumber(block: unknown, key: string): Fault | undefined {
  if (!isObject(block) || !/^\d+(?: ?[^\d\s].*)?$/.test(key) || block[key] !== null) return undefined
  const keys = Object.keys(block)
  const before = keys[keys.indexOf(key) - 1]
  const start = before === undefined ? undefined : block[before]
  if (before === undefined || typeof start !== 'number') {
    const message = `A comma inside braces starts a new key, here ${quote(key)}: write the number with a decimal point.`
    return { code: 'decimal-comma', message }
  }
  return {
    code: 'decimal-comma',
    message: `A comma inside braces starts a new key, here ${quote(key)}: write ${before}: ${start}.${key}.`,
  }
}

/** Keys that must be there and are not. */
export function missingKeys(at: Place, missing: readonly string[]): Fault {
  const shorthand = at.place['x-shorthand']
  if (shorthand === 'device') {
    const message = `${titleOf(at.place)} names no device: add breaker or fuse, such as breaker: B16 or fuse: gG 35.`
    return { code: 'missing-key', message }
  }
  // A cable without any size is most easily mended by its type.
  const keys = shorthand === 'cable' && missing.length === 2 ? ['type'] : missing
  const examples = keys.map((key) => `${key}: ${exampleOf(placeAt(at.schema, [...at.path, key]))}`)
  const lacks = `${titleOf(at.place)} lacks ${listed(keys)}`
  return {
    code: 'missing-key',
    message: `${lacks}: add ${keys.length === 1 ? 'it' : 'them'}, such as ${examples.join(', ')}.`,
  }
}

/** A key that another key of the same block excludes. */
export function excludedKey(key: string): Fault {
  const rival = key === 'breaker' ? 'fuse' : 'type'
  return { code: 'conflicting-keys', message: `${quote(key)} cannot stand beside ${quote(rival)}: keep one of them.` }
}

/** An id that is not one. */
export function badId(names: SchemaNode, key: string): Fault {
  if (names.not?.enum?.includes(key)) {
    return { code: 'reserved-key', message: `${quote(key)} is a name of the format’s own: choose another id.` }
  }
  return {
    code: 'pattern',
    message: `${quote(key)} cannot be an id: start with a letter, then letters, digits, “.”, “-” or “_”, 32 at most, such as K1.`,
  }
}
