import type { Problem, Range } from '../glossary.ts'

/**
 * Covering up what is wrong, so that the rest of a file can still be read and every error be told at once. A cover is as
 * long as what it hides, and line ends and indentation stay, so all places remain what they are.
 */

/** A stretch of the text that a problem is about, covered. */
export interface Mask {
  readonly start: number
  readonly end: number
}

/** Characters that Unicode leaves to private use: no file of the trade holds them, and YAML takes them for letters. */
const FIRST_COVER = 0xe000
const COVERS = 6400
const COVER = /[\ue000-\uf8ff]/

/** Whether a key or text is covered in part. */
export function isCovered(text: string): boolean {
  return COVER.test(text)
}

/** A sentence that quotes covered text, with a mark in place of the covers: what they hide was told of already. */
export function uncovered(sentence: string): string {
  return sentence.replaceAll(/[\ue000-\uf8ff]+/g, '…')
}

type Stretch = { readonly start: number; readonly end: number; readonly blank?: true }
type Finder = (text: string, range: Range) => Stretch | undefined

const whole: Finder = (_, { offset, endOffset }) => ({ start: offset, end: endOffset })
const first: Finder = (_, { offset }) => ({ start: offset, end: offset + 1 })
const nothing: Finder = (_, { offset, endOffset }) => ({ start: offset, end: endOffset, blank: true })

function lineOf(text: string, { offset }: Range): { start: number; end: number } {
  const end = text.indexOf('\n', offset)
  return { start: text.lastIndexOf('\n', offset - 1) + 1, end: end === -1 ? text.length : end }
}

/** A tab between values means no more than a space. In front of a line it might mean any number of them. */
const tab: Finder = (text, range) => {
  const { start, end } = lineOf(text, range)
  return /^ *\t/.test(text.slice(start, end)) ? undefined : { start, end, blank: true }
}

/** A value with a character in front that means something else, or with a second colon. */
const unquoted: Finder = (text, range) => {
  if (/[@`%]/.test(text.charAt(range.offset))) return first(text, range)
  const { start, end } = lineOf(text, range)
  const bound = text.slice(start, end).search(/(?<=[:-] +)[|>]/)
  if (bound !== -1) return { start: start + bound, end: start + bound + 1 }
  return { start: range.offset, end }
}

/** A comment that is not set apart can go without changing a value. */
const comment: Finder = (text, range) => {
  if (text.charAt(range.offset) === '#') return { ...lineOf(text, range), start: range.offset, blank: true }
  return /^[^:\s]+:[^:\s]/.test(text.slice(range.offset, range.endOffset)) ? whole(text, range) : undefined
}

/** An alias stands for a value, an anchor only marks one. */
const anchor: Finder = (text, range) => (text.charAt(range.offset) === '*' ? whole : nothing)(text, range)

/** Problems after which it is still certain what the rest of the file says, and what of the text is in doubt. */
const FINDERS: Readonly<Record<string, Finder>> = {
  'forbidden-character': whole,
  directive: nothing,
  tab,
  'needs-quotes': unquoted,
  'missing-space': comment,
  'bad-escape': first,
  tag: nothing,
  anchor,
  'merge-key': whole,
  'reserved-key': whole,
  'duplicate-key': whole,
  'number-not-finite': whole,
  'number-too-precise': whole,
  'number-leading-zero': whole,
  'number-separator': whole,
  'number-sexagesimal': whole,
  'number-radix': whole,
  'decimal-comma': whole,
}

/**
 * Covers what problems are about.
 *
 * @param text the text in which they were found
 * @param problems each with its range; one without, or of a kind that leaves the rest in doubt, is not to be covered
 * @param covered how many problems were covered before: each gets a cover of its own, so that no two keys become equal
 * @returns the covered text, as long as before, and what is covered; or undefined where one of them cannot be covered
 */
export function cover(
  text: string,
  problems: readonly Problem[],
  covered: number,
): { readonly text: string; readonly masks: readonly Mask[] } | undefined {
  let now = text
  let letters = covered
  const masks: Mask[] = []
  for (const { code, range } of problems) {
    if (range === undefined) return undefined
    const stretch = FINDERS[code]?.(text, range)
    if (stretch === undefined || stretch.start === stretch.end) return undefined
    const { start, end } = stretch
    const letter = String.fromCharCode(FIRST_COVER + (letters % COVERS))
    now = now.slice(0, start) + hidden(text.slice(start, end), stretch.blank ? undefined : letter) + now.slice(end)
    // What stands in a line with a tab is sound, as far as is known.
    if (code !== 'tab') masks.push({ start: Math.min(start, range.offset), end: Math.max(end, range.endOffset) })
    letters += 1
  }
  return { text: now, masks }
}

/** A blank cover of a tab only replaces the tabs: the values of the line are sound. */
function hidden(text: string, letter: string | undefined): string {
  if (letter !== undefined) return text === '\r' ? ' ' : text.replace(/[^\r\n\t ]/g, letter)
  return text.includes('\t') && !text.startsWith('#') ? text.replaceAll('\t', ' ') : text.replace(/[^\r\n]/g, ' ')
}
