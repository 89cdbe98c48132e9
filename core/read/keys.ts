import type { Fault } from '../errors.ts'
import { quote } from './words.ts'

const RESERVED: ReadonlySet<string> = new Set(['__proto__', 'constructor', 'prototype'])
const NULLS: ReadonlySet<string> = new Set(['', '~', 'null', 'Null', 'NULL'])

/**
 * Whether a text may be a key. Keys are always text: `1` and `yes` are taken as they are written.
 *
 * @param key the key, quotes already removed
 * @param plain whether it stood without quotes
 * @returns why not, or undefined
 */
export function keyFault(key: string, plain: boolean): Fault | undefined {
  if (RESERVED.has(key)) {
    return { code: 'reserved-key', message: `The name ${quote(key)} cannot be used as a key: choose another one.` }
  }
  if (!plain) return undefined
  if (key === '<<') {
    return {
      code: 'merge-key',
      message: '“<<” would merge another block, which this format does not use: write the keys out.',
    }
  }
  if (!NULLS.has(key)) return undefined
  const message =
    key === ''
      ? 'There is no key before the colon: write one, or delete the line.'
      : `${quote(key)} is not a name but the word for “nothing”: write a name, or put it in quotes.`
  return { code: 'key-not-text', message }
}
