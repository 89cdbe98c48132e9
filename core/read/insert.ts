import { COLLECTION_STYLE, EVENT_ID, type MappingEvent, type SequenceEvent } from 'js-yaml'
import type { Path } from '../glossary.ts'
import { afterIndicator, afterNode, NOWHERE, type Parsed, stretchOf } from './events.ts'
import type { Step } from './locate.ts'
import type { PlainValue } from './plain.ts'
import { rangeOf, restOfLine } from './positions.ts'
import { type Written, writeKey, writeScalar } from './scalar-source.ts'

/** A stretch of the text and what comes in its place; `value` is what the new scalar is read as. */
export interface Change {
  readonly start: number
  readonly end: number
  readonly source: string
  readonly value: PlainValue
}

/** The last place on the way to a value that exists. */
export interface Place {
  readonly parsed: Parsed
  readonly step: Step
  /** Whether it is inside brackets, or has brackets of its own. */
  readonly inBrackets: boolean
}

/**
 * The change that puts a value under keys that are missing.
 *
 * @param place where the missing keys begin
 * @param missing the keys and indexes from there on, at least one
 * @param text the value as a person would write it
 * @returns undefined where there is no way to write it: below a value, or beyond the end of a list
 */
export function insertion(place: Place, missing: Path, text: string): Change | undefined {
  if (missing.some((name, depth) => depth > 0 && typeof name === 'number' && name !== 0)) return undefined
  const event = place.parsed.events[place.step.index]
  if (event?.type === EVENT_ID.SEQUENCE) return intoList(place, event, missing, text)
  if (event?.type === EVENT_ID.MAPPING) {
    return typeof missing[0] === 'number' ? undefined : intoBlock(place, event, missing, text)
  }
  const empty = event?.type === EVENT_ID.SCALAR && event.valueStart === NOWHERE
  return empty ? intoNothing(place, missing, text) : undefined
}

function intoBlock(place: Place, event: MappingEvent, missing: Path, text: string): Change | undefined {
  if (event.style === COLLECTION_STYLE.FLOW) return intoBrackets(place, event, missing, text)
  const { parsed, step } = place
  const column = rangeOf(parsed.text, event.start, event.start).column - 1
  const flow = neighboursAreFlow(parsed, step.index)
  return newLines(parsed.text, stretchOf(parsed, step.index, step.floor).end, column, missing, text, flow)
}

/** Whether the last value of a block stands in braces: then a new one does too. */
function neighboursAreFlow({ events }: Parsed, index: number): boolean {
  let last = index
  for (let at = index + 1; events[at]?.type !== EVENT_ID.POP; at = afterNode(events, at + 1)) last = at + 1
  const event = events[last]
  return event?.type === EVENT_ID.MAPPING && event.style === COLLECTION_STYLE.FLOW
}

function intoList(place: Place, event: SequenceEvent, missing: Path, text: string): Change | undefined {
  const { parsed, step } = place
  if (missing[0] !== lengthOf(parsed, step.index)) return undefined
  if (event.style === COLLECTION_STYLE.FLOW) return intoBrackets(place, event, missing, text)
  const column = rangeOf(parsed.text, event.start, event.start).column - 1
  return newLines(parsed.text, stretchOf(parsed, step.index, step.floor).end, column, missing, text, true)
}

function lengthOf({ events }: Parsed, index: number): number {
  let length = 0
  for (let at = index + 1; events[at]?.type !== EVENT_ID.POP; at = afterNode(events, at)) length++
  return length
}

/** `, key: value` behind the last entry, or alone between the brackets. */
function intoBrackets(
  place: Place,
  event: MappingEvent | SequenceEvent,
  missing: Path,
  text: string,
): Change | undefined {
  const { parsed, step } = place
  if (!/[{[]/.test(parsed.text.charAt(event.start))) return undefined
  const { source, value } = inFlow(missing, text)
  const end = endOfLastEntry(parsed, step.index, event.start)
  if (end !== undefined) return { start: end, end, source: `, ${source}`, value }
  const start = event.start + 1
  const after = /\s/.test(parsed.text.charAt(start)) ? '' : ' '
  return { start, end: start, source: ` ${source}${after}`, value }
}

function endOfLastEntry(parsed: Parsed, index: number, start: number): number | undefined {
  let end: number | undefined
  for (let at = index + 1; parsed.events[at]?.type !== EVENT_ID.POP; at = afterNode(parsed.events, at)) {
    end = stretchOf(parsed, at, afterIndicator(parsed.text, end ?? start + 1)).end
  }
  return end
}

/** Under a key, or in a list item, that was left empty. */
function intoNothing({ parsed, step, inBrackets }: Place, missing: Path, text: string): Change {
  if (inBrackets || step.key === undefined || typeof missing[0] === 'number') {
    const { source, value } = braced(missing, text)
    const colon = /[:-]/.test(parsed.text.charAt(step.floor - 1)) ? '' : ':'
    return { start: step.floor, end: step.floor, source: `${colon} ${source}`, value }
  }
  const column = rangeOf(parsed.text, step.key.start, step.key.start).column - 1 + indentOf(parsed.text)
  return newLines(parsed.text, step.floor, column, missing, text, false)
}

/** Spaces for a level, as the first indented line of the file has them. */
function indentOf(text: string): number {
  return /^( +)[^\s#-]/m.exec(text)?.[1]?.length ?? 2
}

/** New lines behind the line in which something ends; a comment at its end stays there. */
function newLines(text: string, end: number, column: number, missing: Path, value: string, flow: boolean): Change {
  const lineEnd = text.includes('\r\n') ? '\r\n' : '\n'
  const written = flow ? inFlow(missing, value, false) : undefined
  const { lines, value: meant } =
    written === undefined ? inLines(missing, value, indentOf(text)) : { lines: [written.source], value: written.value }
  const dash = typeof missing[0] === 'number' ? '- ' : ''
  const source = lines.map((line, index) => `${' '.repeat(column)}${index === 0 ? dash : ''}${line}`)
  if (text.charAt(end - 1) === '\n') {
    return { start: end, end, source: source.map((line) => line + lineEnd).join(''), value: meant }
  }
  const at = end + restOfLine(text, end).length
  return { start: at, end: at, source: source.map((line) => lineEnd + line).join(''), value: meant }
}

/** `key: value`, `key: { next: value }`; the first index stands for nothing, its item alone is written. */
function inFlow(missing: Path, text: string, inBrackets = true): Written {
  const [name, ...rest] = missing
  const inner = rest.length === 0 ? writeScalar(text, inBrackets) : braced(rest, text)
  return typeof name === 'string' ? { ...inner, source: `${writeKey(name)}: ${inner.source}` } : inner
}

/** `{ key: value }`, `[ value ]`. */
function braced(missing: Path, text: string): Written {
  const inner = inFlow(missing, text)
  const source = typeof missing[0] === 'number' ? `[ ${inner.source} ]` : `{ ${inner.source} }`
  return { ...inner, source }
}

/** A line for each key, each indented more than the one before; from an index on, the rest on one line. */
function inLines(missing: Path, text: string, indent: number): { lines: string[]; value: PlainValue } {
  const [name, ...rest] = missing
  if (rest.length === 0 || typeof rest[0] === 'number') {
    const { source, value } = inFlow(missing, text, false)
    return { lines: [source], value }
  }
  const inner = inLines(rest, text, indent)
  const lines = inner.lines.map((line) => ' '.repeat(indent) + line)
  return { lines: [`${writeKey(String(name))}:`, ...lines], value: inner.value }
}
