import { parseEvents, YAMLException } from 'js-yaml'
import { faultAt, problem } from '../errors.ts'
import type { Path, Problem, Range } from '../glossary.ts'
import { build } from './build.ts'
import type { Parsed } from './events.ts'
import { guard } from './guard.ts'
import { MAX_DEPTH } from './limits.ts'
import { locate } from './locate.ts'
import { rangeOf, restOfLine } from './positions.ts'
import { EMPTY_FILE, ONLY_TEXT, TOO_DEEP } from './refusals.ts'

/** Where a value, or the key it stands under, is in the text. */
export type Locate = (path: Path, part?: 'key' | 'value') => Range

/** A file that was read, or what keeps it from being read. */
export type ReadResult =
  | {
      readonly ok: true
      readonly tree: unknown
      readonly locate: Locate
      /** Text and parser events, for whoever changes the text. */
      readonly parsed: Parsed
    }
  | {
      readonly ok: false
      readonly problems: readonly Problem[]
      /** The text is not well-formed YAML and only its first error is told: reading again with an explainer tells all. */
      readonly brief?: true
      /** What the file says for certain in spite of the problems; only `readThoroughly` looks for it. */
      readonly certain?: Certain
    }

/** The values of a file in which single places are in doubt. */
export interface Certain {
  readonly tree: unknown
  readonly locate: Locate
  /** Whether a problem of the tree is about a place that was told already when reading. */
  readonly told: (problem: Problem) => boolean
}

/** Finds all syntax errors of a text; `explain` of `explain.ts`. */
export type Explain = (text: string) => readonly Problem[]

/** The parser's own stop, behind ours: keys and values count as a level of their own there. */
const PARSER_DEPTH = MAX_DEPTH + 2

/**
 * Reads an install file: YAML 1.2, core schema, without tags, anchors, directives, merge keys and duplicate keys.
 *
 * Sound files take the fast way. A second reader, which goes on after an error and so finds them all, is only needed for
 * a file that is not well-formed; it is several times larger, so the caller brings it along when there is need:
 * `read(text)`, and if that answers `brief`, `read(text, (await import('./explain.ts')).explain)`.
 *
 * @param text the whole file, with or without a byte order mark
 * @param explain finds all syntax errors; without it the first one is told
 * @returns the values (objects with own keys only) and a way to find their places, or all problems, each with its range
 */
export function read(text: string, explain?: Explain): ReadResult {
  const refused = guard(text)
  if (refused.length > 0) return { ok: false, problems: refused }
  const parsed = parse(text)
  if ('error' in parsed) return unreadable(text, parsed.error, explain)
  const { tree, problems } = build(parsed)
  if (problems.length > 0) return { ok: false, problems }
  if (tree === null) return { ok: false, problems: [faultAt(EMPTY_FILE, [])] }
  if (typeof tree !== 'object') return { ok: false, problems: [faultAt(ONLY_TEXT, [])] }
  return { ok: true, tree, parsed, locate: (path, part) => locate(parsed, path, part) }
}

/** The fast parser stops at its first error, and takes tabs amiss that the slow reader lets pass. */
function firstError(text: string, reason: string, range: Range): Problem {
  if (restOfLine(text, range.offset - range.column + 1).includes('\t'))
    return problem('tab', [], 'A tab stands in this line: replace it by spaces.', range)
  const message = `This is not well-formed YAML (${reason}): look at this line and the one before it.`
  return problem('syntax', [], message, range)
}

function parse(text: string): Parsed | { readonly error: YAMLException } {
  try {
    return { text, events: parseEvents(text, { maxDepth: PARSER_DEPTH }) }
  } catch (error) {
    if (error instanceof YAMLException) return { error }
    throw error
  }
}

function unreadable(text: string, error: YAMLException, explain: Explain | undefined): ReadResult {
  const at = Math.min(error.mark?.position ?? 0, text.length)
  const range = rangeOf(text, at, Math.min(at + 1, text.length))
  if (error.reason.startsWith('nesting exceeded')) {
    return { ok: false, problems: [problem(TOO_DEEP.code, [], TOO_DEEP.message, range)] }
  }
  const explained = explain?.(text) ?? []
  if (explained.length > 0) return { ok: false, problems: explained }
  const problems = [firstError(text, error.reason, range)]
  return explain === undefined ? { ok: false, problems, brief: true } : { ok: false, problems }
}
