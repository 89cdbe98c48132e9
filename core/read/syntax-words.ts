import type { ErrorCode } from 'yaml'
import type { ProblemCode } from '../errors.ts'
import { cut, quote } from './words.ts'

/** A syntax error, and what stands around it. */
export interface Scene {
  readonly code: ErrorCode
  /** The parser's own sentence. */
  readonly reason: string
  /** From the place of the error to the end of its line. */
  readonly rest: string
  /** The whole line. */
  readonly line: string
}

interface Wording {
  readonly code: ErrorCode
  /** Found in the parser's sentence, where the code alone does not tell. */
  readonly reason?: RegExp
  readonly when?: (scene: Scene) => boolean
  readonly problem: ProblemCode
  readonly say: (scene: Scene) => string
}

/** `>` or `|` where a value begins, with more than the header of a block of text behind it. */
const BOUND = /(?<=[:-] )[|>]/

const NO_DASHES = 'Items inside brackets have no dashes: delete the dash, and separate the items by commas.'

/** What each error of the parser means to whoever wrote the file. The first that fits is told. */
const WORDINGS: readonly Wording[] = [
  {
    code: 'TAB_AS_INDENT',
    problem: 'tab',
    say: () => 'A tab stands where YAML allows spaces only: replace it by spaces.',
  },
  { code: 'BAD_SCALAR_START', problem: 'needs-quotes', say: ({ rest }) => quotesNeeded(rest) },
  {
    code: 'UNEXPECTED_TOKEN',
    reason: /Block scalar header|Not a YAML token/,
    when: ({ line }) => BOUND.test(line),
    problem: 'needs-quotes',
    say: ({ line }) => quotesNeeded(line.slice(line.search(BOUND))),
  },
  {
    code: 'BAD_DQ_ESCAPE',
    problem: 'bad-escape',
    say: ({ rest }) =>
      `${quote(rest.slice(0, 2))} means nothing inside double quotes: write the backslash twice, or use single quotes.`,
  },
  {
    code: 'MULTILINE_IMPLICIT_KEY',
    when: ({ line }) => /^\s*[^\s:#]+:[^\s:]/.test(line),
    problem: 'missing-space',
    say: ({ line }) => `A space is missing after the colon: write ${quote(line.trim().replace(':', ': '))}.`,
  },
  {
    code: 'MULTILINE_IMPLICIT_KEY',
    reason: /flow sequence/,
    when: ({ rest }) => /^- /.test(rest),
    problem: 'indentation',
    say: () => NO_DASHES,
  },
  {
    code: 'MULTILINE_IMPLICIT_KEY',
    when: ({ rest }) => /^- /.test(rest),
    problem: 'indentation',
    say: () => 'A list item stands where a key belongs: put the list under a key, or indent it by two more spaces.',
  },
  {
    code: 'MULTILINE_IMPLICIT_KEY',
    problem: 'missing-colon',
    say: ({ rest }) => `${quote(rest)} stands where a key belongs and has no colon: write a key, a colon and a value.`,
  },
  {
    code: 'BLOCK_AS_IMPLICIT_KEY',
    when: ({ rest }) => /:(?: |$)/.test(rest),
    problem: 'needs-quotes',
    say: ({ rest }) => `${quote(rest)} has a second colon, which would begin another block: put the value in quotes.`,
  },
  {
    code: 'BLOCK_AS_IMPLICIT_KEY',
    problem: 'indentation',
    say: ({ rest }) =>
      `The next line is indented as if it belonged to the value ${quote(rest)}: align it with the keys it stands among.`,
  },
  { code: 'BAD_INDENT', problem: 'indentation', say: ({ line }) => misaligned(line) },
  {
    code: 'BLOCK_IN_FLOW',
    when: ({ rest }) => /^- /.test(rest),
    problem: 'indentation',
    say: () => NO_DASHES,
  },
  {
    code: 'BLOCK_IN_FLOW',
    problem: 'missing-comma',
    say: ({ rest }) =>
      `A comma is missing in ${quote(rest)}: put one between the entries, or quotes around a value with a colon.`,
  },
  {
    code: 'MISSING_CHAR',
    reason: /Comments must be separated/,
    problem: 'missing-space',
    say: ({ rest }) => `A space is missing in front of ${quote(rest)}: put one before “#”, or the value in quotes.`,
  },
  {
    code: 'MISSING_CHAR',
    reason: /Missing , |Missing , or :/,
    problem: 'missing-comma',
    say: ({ rest }) => `A comma is missing in front of ${quote(rest)}: separate the entries inside brackets by commas.`,
  },
  {
    code: 'MISSING_CHAR',
    reason: /Missing space after :/,
    problem: 'missing-space',
    say: ({ rest }) => `A space is missing in front of ${quote(rest)}: put one after the colon.`,
  },
  {
    code: 'MISSING_CHAR',
    reason: /Implicit map keys/,
    problem: 'missing-colon',
    say: ({ line }) => `${quote(line.trim())} has a key without a colon: write a key, a colon and a value.`,
  },
  {
    code: 'UNEXPECTED_TOKEN',
    reason: /flow-(?:seq|map)-end/,
    problem: 'unclosed-bracket',
    say: ({ rest }) => `“${rest.charAt(0)}” closes a bracket that was never opened: delete it, or open the bracket.`,
  },
  {
    code: 'UNEXPECTED_TOKEN',
    reason: /block-seq-ind/,
    problem: 'indentation',
    say: ({ rest }) =>
      `A list cannot begin on the line of its key: put ${quote(rest)} on the line below, indented by two spaces.`,
  },
  {
    code: 'UNEXPECTED_TOKEN',
    reason: /Unexpected ,|empty item/,
    problem: 'missing-comma',
    say: () => 'There is a comma with nothing in front of it: delete it, or write the missing entry.',
  },
  {
    code: 'UNEXPECTED_TOKEN',
    when: (scene) => /["']\s*$/.test(inFront(scene)),
    problem: 'unclosed-quote',
    say: ({ rest }) =>
      `The quotes end in front of ${quote(rest)}: where a quote belongs to the text, use the other kind of quotes around it.`,
  },
  {
    code: 'UNEXPECTED_TOKEN',
    problem: 'syntax',
    say: ({ rest }) =>
      `${quote(rest)} does not belong to what stands before it: look for a missing comma, or put the whole value in quotes.`,
  },
  {
    code: 'KEY_OVER_1024_CHARS',
    problem: 'text-too-long',
    say: () => 'This key has more than 1024 characters: shorten it, or look for a missing colon or quote.',
  },
]

/**
 * Puts a syntax error into plain words: what was found, what to do.
 *
 * @param scene the parser's error and the text around it
 */
export function wordsFor(scene: Scene): { readonly code: ProblemCode; readonly message: string } {
  const wording = WORDINGS.find(
    ({ code, reason, when }) => code === scene.code && (reason?.test(scene.reason) ?? true) && (when?.(scene) ?? true),
  )
  if (wording !== undefined) return { code: wording.problem, message: wording.say(scene) }
  return {
    code: 'syntax',
    message: `This is not well-formed YAML (${scene.reason}): look at this line and the one before.`,
  }
}

/** The line up to the error. */
function inFront({ line, rest }: Scene): string {
  return line.slice(0, line.length - rest.length)
}

/** Whether an error is only the echo of an earlier one: the parser has lost its place and takes no line for what it is. */
export function isEcho(scene: Scene): boolean {
  return (
    scene.code === 'UNEXPECTED_TOKEN' &&
    / at node end| in YAML stream/.test(scene.reason) &&
    inFront(scene).trim() === ''
  )
}

/** The value that begins here, up to what ends it inside brackets or before a comment. */
function quotesNeeded(rest: string): string {
  const line = rest.trimEnd()
  const end = line.search(/\s#|[,\]}](?:\s|$)/)
  const value = (end === -1 ? line : line.slice(0, end)).trim()
  return `A value that starts with “${value.charAt(0)}” needs quotes: write ${JSON.stringify(cut(value))}.`
}

function misaligned(line: string): string {
  const spaces = line.length - line.trimStart().length
  return `This line begins with ${spaces} ${spaces === 1 ? 'space' : 'spaces'}, unlike the lines it stands among: align it with them.`
}
