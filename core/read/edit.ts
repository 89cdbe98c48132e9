import { COLLECTION_STYLE, EVENT_ID, type Event, SCALAR_STYLE, type ScalarEvent } from 'js-yaml'
import { problem } from '../errors.ts'
import type { Path, Problem } from '../glossary.ts'
import { NOWHERE, type Parsed, ROOT, stretchOf } from './events.ts'
import { type Change, insertion } from './insert.ts'
import { child, type Step } from './locate.ts'
import { type Explain, type ReadResult, read } from './read.ts'
import { type Quotes, writeScalar } from './scalar-source.ts'
import { sameTree, withValue } from './tree.ts'
import { quote } from './words.ts'

/** One value to be written. */
export interface Edit {
  /** Where it goes; keys and one list item past the end are made where they are missing. */
  readonly path: Path
  /** What a person would write there, without quotes: `0.29 ohm`, `>999 MΩ`, `no trip`. */
  readonly text: string
}

/** The new text, or why nothing was changed. */
export type EditResult =
  | { readonly ok: true; readonly text: string }
  | { readonly ok: false; readonly problems: readonly Problem[] }

/**
 * Writes values into a file. Everything else stays as it is to the byte: comments, order, blank lines, line ends,
 * alignment. A missing key is put last in its block, in the style of its neighbours. Each edit is checked by reading
 * the result: it must hold the old values with only this one changed.
 *
 * @param text a sound install file
 * @param edits in this order; a later one sees what an earlier one wrote
 * @param explain tells all syntax errors of a file that is not sound, as in `read`
 * @returns the new text; or all problems, and then none of the edits is done
 */
export function setValues(text: string, edits: readonly Edit[], explain?: Explain): EditResult {
  const problems: Problem[] = []
  let now = text
  let file = read(text, explain)
  for (const edit of edits) {
    if (!file.ok) return file
    const done = setValue(file, edit)
    if (done === undefined) {
      const message = `${quote(edit.text)} cannot be written here without changing something else: write it by hand.`
      problems.push(problem('edit-refused', edit.path, message, file.locate(edit.path)))
      continue
    }
    now = done.text
    file = done.file
  }
  if (!file.ok) return file
  return problems.length === 0 ? { ok: true, text: now } : { ok: false, problems }
}

type Sound = Extract<ReadResult, { ok: true }>

function setValue(file: Sound, { path, text }: Edit): { readonly text: string; readonly file: Sound } | undefined {
  const change = changeFor(file.parsed, path, text)
  if (change === undefined) return undefined
  const before = file.parsed.text
  const after = before.slice(0, change.start) + change.source + before.slice(change.end)
  const result = read(after)
  if (!result.ok || !sameTree(result.tree, withValue(file.tree, path, change.value))) return undefined
  return { text: after, file: result }
}

function changeFor(parsed: Parsed, path: Path, text: string): Change | undefined {
  let step: Step = { index: ROOT, floor: 0 }
  let inBrackets = isFlow(parsed.events[ROOT])
  for (const [depth, name] of path.entries()) {
    const next = child(parsed, step, name)
    if (next === undefined) return insertion({ parsed, step, inBrackets }, path.slice(depth), text)
    step = next
    if (depth < path.length - 1) inBrackets ||= isFlow(parsed.events[step.index])
  }
  return path.length === 0 ? undefined : replacement(parsed, step, inBrackets, text)
}

function isFlow(event: Event | undefined): boolean {
  return (
    (event?.type === EVENT_ID.MAPPING || event?.type === EVENT_ID.SEQUENCE) && event.style === COLLECTION_STYLE.FLOW
  )
}

/** A value in place of one that stands there already; what takes several lines is only replaced if it is text. */
function replacement(parsed: Parsed, step: Step, inBrackets: boolean, text: string): Change | undefined {
  const event = parsed.events[step.index]
  if (event?.type === EVENT_ID.SCALAR) return scalarReplacement(parsed, step, event, inBrackets, text)
  const { start, end } = stretchOf(parsed, step.index, step.floor)
  if (!isFlow(event) || parsed.text.slice(start, end).includes('\n')) return undefined
  const { source, value } = writeScalar(text, inBrackets)
  return { start, end, source, value }
}

function scalarReplacement(
  parsed: Parsed,
  step: Step,
  event: ScalarEvent,
  inBrackets: boolean,
  text: string,
): Change | undefined {
  const { source, value } = writeScalar(text, inBrackets, quotesOf(event))
  const { start, end } = stretchOf(parsed, step.index, step.floor)
  if (event.valueStart === NOWHERE) {
    const colon = /[:-]/.test(parsed.text.charAt(start - 1)) ? '' : ':'
    return { start, end, source: `${colon} ${source}`, value }
  }
  return { start, end: start + parsed.text.slice(start, end).trimEnd().length, source, value }
}

function quotesOf({ style }: ScalarEvent): Quotes {
  if (style === SCALAR_STYLE.SINGLE_QUOTED) return "'"
  return style === SCALAR_STYLE.DOUBLE_QUOTED ? '"' : ''
}
