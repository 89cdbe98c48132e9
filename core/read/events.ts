import { EVENT_ID, type Event, getScalarValue, SCALAR_STYLE, type ScalarEvent } from 'js-yaml'

/** A parsed file: its text and the parser's flat list of events, which point into the text. */
export interface Parsed {
  readonly text: string
  readonly events: readonly Event[]
}

/** What the parser could not place: an empty value has no offset. */
export const NOWHERE = -1

/** Index of the event after the node that starts at `index`. */
export function afterNode(events: readonly Event[], index: number): number {
  let at = index
  let depth = 0
  do {
    const type = events[at++]?.type
    if (type === EVENT_ID.MAPPING || type === EVENT_ID.SEQUENCE) depth++
    else if (type === EVENT_ID.POP) depth--
  } while (depth > 0)
  return at
}

/** The decoded text of a key; undefined for anything but a scalar. */
export function keyText(parsed: Parsed, index: number): string | undefined {
  const event = parsed.events[index]
  return event?.type === EVENT_ID.SCALAR ? getScalarValue(parsed.text, event) : undefined
}

/** Index of the event of the document's top node. */
export const ROOT = 1

/** Start and end offsets of a stretch of the text. */
export interface Stretch {
  readonly start: number
  readonly end: number
}

/**
 * Where a node stands, quotes, brackets and the header of a block scalar included.
 *
 * @param parsed a file without syntax errors
 * @param index the node's event
 * @param floor an offset before the node and after everything in front of it; where the node is empty, this is where it
 *   would stand
 */
export function stretchOf(parsed: Parsed, index: number, floor: number): Stretch {
  const event = parsed.events[index]
  if (event?.type === EVENT_ID.MAPPING || event?.type === EVENT_ID.SEQUENCE) {
    return collectionStretch(parsed, index, event.start)
  }
  const empty = event?.type !== EVENT_ID.SCALAR || event.valueStart === NOWHERE
  return empty ? { start: floor, end: floor } : scalarStretch(parsed.text, event, floor)
}

function scalarStretch(text: string, { valueStart: start, valueEnd: end, style }: ScalarEvent, floor: number): Stretch {
  if (style === SCALAR_STYLE.SINGLE_QUOTED || style === SCALAR_STYLE.DOUBLE_QUOTED) {
    return { start: start - 1, end: end + 1 }
  }
  return style === SCALAR_STYLE.PLAIN ? { start, end } : { start: headerOf(text, start, floor), end }
}

/** The `|` or `>` of a block scalar: in the line before its text. */
function headerOf(text: string, start: number, floor: number): number {
  const line = Math.max(floor, text.lastIndexOf('\n', start - 2) + 1)
  return line + text.slice(line, start).search(/[|>]/)
}

function collectionStretch(parsed: Parsed, index: number, start: number): Stretch {
  const { text, events } = parsed
  const flow = text[start] === '{' || text[start] === '['
  let end = flow ? start + 1 : start
  for (let at = index + 1; events[at]?.type !== EVENT_ID.POP; at = afterNode(events, at)) {
    end = stretchOf(parsed, at, afterIndicator(text, end)).end
  }
  return { start, end: flow ? closingBracket(text, end) : end }
}

const isSpace = (character: string | undefined): boolean =>
  character === ' ' || character === '\n' || character === '\r' || character === '\t'

/** Past white space and comments, the offset of the next character that means something. */
function skipSpace(text: string, from: number): number {
  let at = from
  for (;;) {
    while (isSpace(text[at])) at++
    if (text[at] !== '#') return at
    const lineEnd = text.indexOf('\n', at)
    at = lineEnd === -1 ? text.length : lineEnd
  }
}

/** Just after the `:`, `-` or `?` that follows, where one does; else `from`. */
export function afterIndicator(text: string, from: number): number {
  const next = skipSpace(text, from)
  return text[next] === ':' || text[next] === '-' || text[next] === '?' ? next + 1 : from
}

function closingBracket(text: string, from: number): number {
  let at = skipSpace(text, from)
  while (text[at] === ',' || text[at] === ':' || text[at] === '?') at = skipSpace(text, at + 1)
  return at + 1
}
