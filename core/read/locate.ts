import { EVENT_ID } from 'js-yaml'
import type { Path, Range } from '../glossary.ts'
import { afterIndicator, afterNode, keyText, type Parsed, ROOT, type Stretch, stretchOf } from './events.ts'
import { rangeOf } from './positions.ts'

/** One step down from a node: the event of its value, and where its key stands, when it has one. */
export interface Step {
  readonly index: number
  readonly floor: number
  readonly key?: Stretch
}

/**
 * Where a value or its key stands in the text. Nothing is remembered: the events are walked again at each question,
 * because nearly all files are read without one.
 *
 * @param parsed a file without syntax errors
 * @param path keys and indexes from the top
 * @param part the value (default), or the key it stands under; what has no key answers with its value
 * @returns the range; for a path that does not exist, the key of the nearest ancestor that does (an item of a list: the
 *   item; the file itself: its very beginning, with no length); for a value that was left empty, its key
 */
export function locate(parsed: Parsed, path: Path, part: 'key' | 'value' = 'value'): Range {
  const { text } = parsed
  let step: Step = { index: ROOT, floor: 0 }
  for (const name of path) {
    const next = child(parsed, step, name)
    if (next === undefined) return ancestorRange(parsed, step)
    step = next
  }
  if (part === 'key' && step.key !== undefined) return rangeOf(text, step.key.start, step.key.end)
  const { start, end } = stretchOf(parsed, step.index, step.floor)
  if (start === end && step.key !== undefined) return rangeOf(text, step.key.start, step.key.end)
  return rangeOf(text, start, end)
}

function ancestorRange(parsed: Parsed, step: Step): Range {
  const { start, end } = step.key ?? stretchOf(parsed, step.index, step.floor)
  return rangeOf(parsed.text, start, step.index === ROOT ? start : end)
}

/** The value under a key of a block, or at an index of a list; undefined where there is none. */
export function child(parsed: Parsed, step: Step, name: string | number): Step | undefined {
  const event = parsed.events[step.index]
  if (event?.type === EVENT_ID.MAPPING) return childOfMapping(parsed, step.index, event.start, String(name))
  if (event?.type === EVENT_ID.SEQUENCE) return childOfSequence(parsed, step.index, event.start, Number(name))
  return undefined
}

function childOfMapping(parsed: Parsed, index: number, start: number, name: string): Step | undefined {
  const { text, events } = parsed
  for (let at = index + 1; events[at]?.type !== EVENT_ID.POP; at = afterNode(events, at + 1)) {
    if (keyText(parsed, at) !== name) continue
    const key = stretchOf(parsed, at, start)
    return { index: at + 1, floor: afterIndicator(text, key.end), key }
  }
  return undefined
}

function childOfSequence(parsed: Parsed, index: number, start: number, wanted: number): Step | undefined {
  const { text, events } = parsed
  let floor = afterIndicator(text, start)
  let count = 0
  for (let at = index + 1; events[at]?.type !== EVENT_ID.POP; at = afterNode(events, at)) {
    if (count++ === wanted) return { index: at, floor }
    floor = afterIndicator(text, stretchOf(parsed, at, floor).end)
  }
  return undefined
}
