import {
  EVENT_ID,
  type Event,
  getScalarValue,
  type MappingEvent,
  SCALAR_STYLE,
  type ScalarEvent,
  type SequenceEvent,
} from 'js-yaml'
import { type Fault, problem } from '../errors.ts'
import type { Path, Problem } from '../glossary.ts'
import { NOWHERE, type Parsed } from './events.ts'
import { holdsForbidden } from './guard.ts'
import { keyFault } from './keys.ts'
import { MAX_DEPTH, MAX_ITEMS, MAX_KEYS, MAX_SCALAR } from './limits.ts'
import { resolvePlain } from './plain.ts'
import { rangeOf } from './positions.ts'
import { type ProblemList, problemList } from './problem-list.ts'
import * as refusals from './refusals.ts'

/** A block that is being filled. */
interface Block {
  readonly kind: 'block'
  readonly into: Record<string, unknown>
  key: string
  /** Where that key starts, for what is said about its value. */
  keyStart: number
  /** Whether a key comes next. */
  awaitsKey: boolean
  /** Whether the value that comes next is dropped, because its key is refused. */
  drops: boolean
}

/** A list that is being filled. */
interface List {
  readonly kind: 'list'
  readonly into: unknown[]
}

/**
 * Builds the values of a file from the parser's events, by the core schema of YAML 1.2, and refuses what the format does
 * not use: tags, anchors, merge keys, further documents, keys that stand twice, numbers that would lose digits, and
 * anything beyond the limits.
 *
 * @param parsed a file without syntax errors
 * @returns the values as plain objects and arrays with own keys only, and every problem met; the values are of use only
 *   when there is no problem
 */
export function build(parsed: Parsed): { tree: unknown; problems: Problem[] } {
  const builder = new Builder(parsed.text)
  for (const event of parsed.events) builder.take(event)
  return { tree: builder.tree, problems: builder.problems.all() }
}

class Builder {
  tree: unknown = null
  readonly problems: ProblemList = problemList()
  readonly #text: string
  readonly #frames: (Block | List)[] = []
  #top: Block | List | undefined
  #documents = 0
  #keys = 0
  #items = 0
  /** Offset after the last scalar, for what has no place of its own. */
  #last = 0

  constructor(text: string) {
    this.#text = text
  }

  take(event: Event): void {
    switch (event.type) {
      case EVENT_ID.SCALAR:
        return this.#scalar(event)
      case EVENT_ID.MAPPING:
        return this.#open(event, { kind: 'block', into: {}, key: '', keyStart: 0, awaitsKey: true, drops: false })
      case EVENT_ID.SEQUENCE:
        return this.#open(event, { kind: 'list', into: [] })
      case EVENT_ID.POP:
        return this.#close()
      case EVENT_ID.ALIAS:
        this.#anchor(event.anchorStart - 1, event.anchorEnd)
        return this.#put(null, event.anchorStart)
      default:
        return this.#document()
    }
  }

  #document(): void {
    if (++this.#documents !== 2) return
    const start = Math.max(this.#text.indexOf('---', this.#last), this.#last)
    this.#report(refusals.SEVERAL_DOCUMENTS, start, start + 3)
  }

  #open(event: MappingEvent | SequenceEvent, frame: Block | List): void {
    this.#properties(event)
    if (this.#frames.length === MAX_DEPTH) this.#report(refusals.TOO_DEEP, event.start, event.start + 1)
    this.#put(frame.into, event.start)
    this.#frames.push(frame)
    this.#top = frame
  }

  #close(): void {
    this.#frames.pop()
    this.#top = this.#frames.at(-1)
  }

  #scalar(event: ScalarEvent): void {
    this.#properties(event)
    const text = getScalarValue(this.#text, event)
    if (text.length > MAX_SCALAR) this.#reportAt(refusals.TEXT_TOO_LONG, event)
    if (event.style === SCALAR_STYLE.DOUBLE_QUOTED && !event.fast) this.#escapes(text, event)
    if (event.valueEnd !== NOWHERE) this.#last = event.valueEnd
    const top = this.#top
    if (top?.kind === 'block' && top.awaitsKey) return this.#key(top, text, event)
    if (event.style === SCALAR_STYLE.PLAIN) return this.#plain(text, event)
    if (event.style >= SCALAR_STYLE.LITERAL_BLOCK && text.trim() === '') this.#blankBlock(event)
    this.#put(text, event.valueStart)
  }

  #plain(text: string, event: ScalarEvent): void {
    const resolved = resolvePlain(text)
    if ('fault' in resolved) {
      this.#reportAt(resolved.fault, event)
      return this.#put(null, event.valueStart)
    }
    if (event.valueStart === NOWHERE) this.#withoutValue()
    this.#put(resolved.value, event.valueStart)
  }

  #key(top: Block, text: string, event: ScalarEvent): void {
    top.key = text
    top.keyStart = event.valueStart
    top.awaitsKey = false
    if (++this.#keys === MAX_KEYS + 1) this.#reportAt(refusals.TOO_MANY_KEYS, event)
    const repeated = Object.hasOwn(top.into, text) ? refusals.duplicateKey(text) : undefined
    const fault = keyFault(text, event.style === SCALAR_STYLE.PLAIN) ?? repeated
    top.drops = fault !== undefined
    if (fault !== undefined) this.#reportAt(fault, event)
  }

  /** Hands a finished scalar, or a block or list that is about to be filled, to what holds it. */
  #put(value: unknown, start: number): void {
    const top = this.#top
    if (top === undefined) {
      this.tree = value
    } else if (top.kind === 'list') {
      if (++this.#items === MAX_ITEMS + 1) this.#report(refusals.TOO_MANY_ITEMS, start, start + 1)
      top.into.push(value)
    } else if (top.awaitsKey) {
      this.#report(refusals.COMPLEX_KEY, start, start + 1)
      top.awaitsKey = false
      top.drops = true
    } else {
      if (!top.drops) top.into[top.key] = value
      top.awaitsKey = true
    }
  }

  #properties(event: ScalarEvent | MappingEvent | SequenceEvent): void {
    if (event.tagStart !== NOWHERE) {
      this.#report(refusals.tagRefused(this.#text.slice(event.tagStart, event.tagEnd)), event.tagStart, event.tagEnd)
    }
    if (event.anchorStart !== NOWHERE) this.#anchor(event.anchorStart - 1, event.anchorEnd)
  }

  #anchor(start: number, end: number): void {
    this.#report(refusals.anchorRefused(this.#text.slice(start, end)), start, end)
  }

  #escapes(text: string, event: ScalarEvent): void {
    const raw = this.#text.slice(event.valueStart, event.valueEnd)
    if (refusals.escapesBeyondUnicode(raw) || holdsForbidden(text)) this.#reportAt(refusals.FORBIDDEN_ESCAPE, event)
  }

  #blankBlock(event: ScalarEvent): void {
    const start = this.#text.lastIndexOf('\n', event.valueStart - 2) + 1
    const fault = refusals.unquotedBound(this.#text.slice(start, event.valueStart))
    if (fault !== undefined) this.#report(fault, start, event.valueStart - 1)
  }

  /** A key with nothing after it is allowed, but not when it is the rest of something else. */
  #withoutValue(): void {
    const top = this.#top
    if (top?.kind !== 'block' || top.keyStart === NOWHERE) return
    const end = top.keyStart + top.key.length
    const lost = refusals.lostComma(top.key, this.#text.slice(Math.max(top.keyStart - 20, 0), top.keyStart))
    if (lost !== undefined) return this.#report(lost.fault, top.keyStart - lost.length, end)
    const glued = refusals.gluedValue(top.key, this.#text.slice(end, end + 20))
    if (glued !== undefined) this.#report(glued, top.keyStart, end)
  }

  #reportAt(fault: Fault, event: ScalarEvent): void {
    this.#report(fault, event.valueStart, event.valueEnd)
  }

  #report(fault: Fault, start: number, end: number): void {
    const from = start === NOWHERE ? this.#last : start
    const to = Math.max(from, end)
    this.problems.add(() => problem(fault.code, this.#path(), fault.message, rangeOf(this.#text, from, to)))
  }

  /** Keys and indexes down to where the reading has come. */
  #path(): Path {
    const innermost = this.#frames.length - 1
    return this.#frames.map((frame, depth) => {
      if (frame.kind === 'block') return frame.key
      return depth === innermost ? frame.into.length : frame.into.length - 1
    })
  }
}
