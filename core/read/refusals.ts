import type { Fault } from '../errors.ts'
import { MAX_DEPTH, MAX_ITEMS, MAX_KEYS, MAX_SCALAR, MAX_TOKENS } from './limits.ts'
import { cut, quote } from './words.ts'

/** What both readers say about YAML that is well formed and still not part of the format. */

const SPLIT = 'split the installation into several files.'

export const SEVERAL_DOCUMENTS: Fault = {
  code: 'several-documents',
  message: 'A second document starts here: one file holds one installation, so move it to a file of its own.',
}

export const TOO_DEEP: Fault = {
  code: 'too-deep',
  message: `Lists and blocks are nested more than ${MAX_DEPTH} deep: write the values directly; the format needs fewer than ten levels.`,
}

export const TOO_MANY_KEYS: Fault = {
  code: 'too-many-keys',
  message: `The file has more than ${MAX_KEYS} keys: ${SPLIT}`,
}

export const TOO_MANY_ITEMS: Fault = {
  code: 'too-many-items',
  message: `The lists have more than ${MAX_ITEMS} items together: ${SPLIT}`,
}

export const TOO_MANY_TOKENS: Fault = {
  code: 'too-large',
  message: `The file holds more than ${MAX_TOKENS} words and marks, too many to explain what is wrong: ${SPLIT}`,
}

export const COMPLEX_KEY: Fault = {
  code: 'key-not-text',
  message: 'A list or a block stands where a key belongs: write the key as text.',
}

export const FORBIDDEN_ESCAPE: Fault = {
  code: 'forbidden-character',
  message: 'An escape in this text stands for a character that cannot be seen and is not allowed here: delete it.',
}

export const EMPTY_FILE: Fault = {
  code: 'empty-file',
  message: 'There is nothing in this file: begin with “skerry: 1”, or let “skerry new” write a file to fill in.',
}

export const ONLY_TEXT: Fault = {
  code: 'wrong-type',
  message: 'This file holds a text or a number and no keys: begin with “skerry: 1”, each key on a line of its own.',
}

export const TEXT_TOO_LONG: Fault = {
  code: 'text-too-long',
  message: `This text has more than ${MAX_SCALAR} characters, and no more are read: shorten it.`,
}

export function duplicateKey(key: string): Fault {
  return {
    code: 'duplicate-key',
    message: `The key ${quote(key)} stands twice in this block, and only one can count: rename or delete one of the two.`,
  }
}

export function tagRefused(tag: string): Fault {
  return { code: 'tag', message: `${quote(tag)} is a YAML tag, which this format does not use: delete it.` }
}

export function anchorRefused(mark: string): Fault {
  const message = `${quote(mark)} is a YAML anchor or alias, which this format does not use: write the value out, or put it in quotes.`
  return { code: 'anchor', message }
}

/**
 * `>9` alone is the header of a block of text to YAML; where there is no text, it was meant as a reading.
 *
 * @param header the line in which the block of text begins
 */
export function unquotedBound(header: string): Fault | undefined {
  const bound = /[|>][-+]?[0-9][-+]?(?=\s*$|\s+#)/.exec(header)?.[0]
  if (bound === undefined) return undefined
  return {
    code: 'needs-quotes',
    message: `A value that starts with “${bound.charAt(0)}” needs quotes: write "${bound}".`,
  }
}

/**
 * `{ loop: 1,5 ohm }` is a key `5 ohm` without a value to YAML; it was meant as a number.
 *
 * @param key the key that was left without a value
 * @param before some text in front of it
 * @returns the fault, and how many characters before the key it begins
 */
export function lostComma(key: string, before: string): { fault: Fault; length: number } | undefined {
  if (!/^[0-9]/.test(key)) return undefined
  const number = /[0-9]{1,15},$/.exec(before)?.[0]
  if (number === undefined) return undefined
  const mended = `${number.slice(0, -1)}.${key}`
  const message = `${quote(number + key)} has a decimal comma, which separates entries here: write ${cut(mended)}.`
  return { fault: { code: 'decimal-comma', message }, length: number.length }
}

/**
 * `{ b:1 }` is a key `b:1` without a value to YAML.
 *
 * @param key the key that was left without a value
 * @param after some text behind it
 */
export function gluedValue(key: string, after: string): Fault | undefined {
  if (!/^[^:]+:[^:]/.test(key) || !/^\s*[,}]/.test(after)) return undefined
  const mended = key.replace(':', ': ')
  return { code: 'missing-space', message: `${quote(key)} has no space after the colon: write ${cut(mended)}.` }
}

/** `\U` with a code point beyond Unicode; a pair of backslashes before it is text. */
const BEYOND_UNICODE = /(?:^|[^\\])(?:\\\\)*\\U(?!000|0010)/

/** Whether the inside of double quotes escapes a code point that Unicode does not have. */
export function escapesBeyondUnicode(raw: string): boolean {
  return BEYOND_UNICODE.test(raw)
}
