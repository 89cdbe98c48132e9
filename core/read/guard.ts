import { type Fault, problem } from '../errors.ts'
import type { Problem } from '../glossary.ts'
import { MAX_BYTES } from './limits.ts'
import { rangeOf } from './positions.ts'
import { problemList } from './problem-list.ts'
import { named, quote } from './words.ts'

/**
 * What no file may hold: control characters other than tab and line end, a lone carriage return, the characters that
 * change the direction of writing (they make a value look like another one), a byte order mark anywhere but in front,
 * halves of surrogate pairs, and the two code points that are never characters.
 */
const FORBIDDEN =
  /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069\ufeff\ufffe\uffff\ud800-\udfff]|\r(?!\n)/u

const DIRECTION = /[\u202a-\u202e\u2066-\u2069]/

/** A directive, the end or the start of a document; they mean something else where they are not the first line. */
const MAYBE_MARK = /^\ufeff?(?: *%|\.\.\.| +---| +\.\.\.)/m
/** What may stand before them: blank lines and comments. */
const BEFORE_DOCUMENT = /^[ \t]*(?:#.*)?$/

/**
 * Looks at the text before any parser does: its size, characters that may not be in it, lines indented with
 * tabs, and marks in front of the document.
 *
 * @param text the whole file, with or without a byte order mark
 * @returns what keeps it from being parsed; empty for nearly every file
 */
export function guard(text: string): Problem[] {
  const bytes = text.length * 3 <= MAX_BYTES ? 0 : utf8Length(text)
  if (bytes > MAX_BYTES) {
    const message = `The file has ${bytes} bytes; at most ${MAX_BYTES} are read. Split the installation into several files.`
    return [problem('too-large', [], message)]
  }
  if (FORBIDDEN.test(text.startsWith('\ufeff') ? text.slice(1) : text)) return forbiddenCharacters(text)
  const tabs = text.includes('\t') ? tabsInFront(text) : []
  return tabs.length === 0 && MAYBE_MARK.test(text) ? marks(text) : tabs
}

/** Whether a decoded value holds a character that no file may hold; escapes in double quotes can bring one in. */
export function holdsForbidden(value: string): boolean {
  return FORBIDDEN.test(value.replaceAll('\r', ''))
}

function forbiddenCharacters(text: string): Problem[] {
  const found = problemList()
  for (const match of text.matchAll(new RegExp(FORBIDDEN.source, 'gu'))) {
    if (match.index === 0 && match[0] === '\ufeff') continue
    const [character] = match
    const end = match.index + character.length
    found.add(() => problem('forbidden-character', [], aboutCharacter(character), rangeOf(text, match.index, end)))
  }
  return found.all()
}

function aboutCharacter(character: string): string {
  const name = named(character)
  if (DIRECTION.test(character)) {
    return `Character ${name} changes the direction of writing, so that what is seen is not what is stored: delete it.`
  }
  if (character === '\r') return 'A carriage return without a line feed: save the file with LF or CRLF line ends.'
  return `Character ${name} cannot be seen and is not allowed here: delete it.`
}

/** Lines that begin with a tab: YAML allows it in few places only, and no two parsers agree in which. */
function tabsInFront(text: string): Problem[] {
  const found = problemList()
  for (const match of text.matchAll(/^ *\t+/gm)) {
    const start = match.index + match[0].indexOf('\t')
    const end = match.index + match[0].length
    const message = 'This line is indented with a tab, and YAML allows spaces only: write two spaces for each level.'
    found.add(() => problem('tab', [], message, rangeOf(text, start, end)))
  }
  return found.all()
}

function marks(text: string): Problem[] {
  const front = marksInFront(text)
  const [, second] = text.matchAll(/^\.\.\.(?=\s|$)/gm)
  if (front.length > 0 || second === undefined) return front
  const message = '“...” ends the YAML document a second time: delete the line.'
  return [problem('several-documents', [], message, rangeOf(text, second.index, second.index + 3))]
}

function marksInFront(text: string): Problem[] {
  const found = problemList()
  let offset = text.startsWith('\ufeff') ? 1 : 0
  for (const line of text.slice(offset).split('\n')) {
    const bare = line.replace(/\r$/, '')
    const start = offset
    const fault = aboutMark(bare)
    if (fault !== undefined) {
      found.add(() => problem(fault.code, [], fault.message, rangeOf(text, start, start + bare.length)))
    } else if (!BEFORE_DOCUMENT.test(bare)) break
    offset += line.length + 1
  }
  return found.all()
}

function aboutMark(line: string): Fault | undefined {
  if (/^ *%/.test(line)) {
    const message = `${quote(line.trim())} is a YAML directive, which this format does not use: delete the line.`
    return { code: 'directive', message }
  }
  const indented = /^ +(---|\.\.\.)(?:\s|$)/.exec(line)?.[1]
  if (indented !== undefined) {
    const message = `“${indented}” is indented, and parsers disagree what it means then: delete the line.`
    return { code: 'indentation', message }
  }
  if (!/^\.\.\.(?:\s|$)/.test(line)) return undefined
  const message = '“...” ends a YAML document before anything is in it: delete the line.'
  return { code: 'several-documents', message }
}

/** Bytes that a text takes in UTF-8. */
function utf8Length(text: string): number {
  let bytes = text.length
  for (let index = 0; index < text.length; index++) {
    const unit = text.charCodeAt(index)
    if (unit < 0x80) continue
    bytes += unit < 0x800 || isSurrogate(unit) ? 1 : 2
  }
  return bytes
}

function isSurrogate(unit: number): boolean {
  return unit >= 0xd800 && unit <= 0xdfff
}

/** The one part of the platform's decoder that is used; browsers and Node both have it. */
declare const TextDecoder: new (
  label: 'utf-8',
  options: { readonly fatal: true; readonly ignoreBOM: true },
) => { decode(bytes: Uint8Array): string }

/**
 * Turns bytes into text.
 *
 * @param bytes the file as it was stored or sent
 * @returns the text, its byte order mark kept so that offsets agree; or the problem that the bytes are not UTF-8, or
 *   too many
 */
export function decode(bytes: Uint8Array): { ok: true; text: string } | { ok: false; problem: Problem } {
  if (bytes.length > MAX_BYTES) {
    const message = `The file has ${bytes.length} bytes; at most ${MAX_BYTES} are read. Split the installation into several files.`
    return { ok: false, problem: problem('too-large', [], message) }
  }
  try {
    return { ok: true, text: new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes) }
  } catch {
    const message = 'The file is not UTF-8 text: open it in an editor and save it with the encoding UTF-8.'
    return { ok: false, problem: problem('not-utf8', [], message) }
  }
}
