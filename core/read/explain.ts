import { type Document, isScalar, Lexer, parseDocument, visit, type YAMLError, YAMLParseError } from 'yaml'
import { type ProblemCode, problem } from '../errors.ts'
import type { Problem } from '../glossary.ts'
import { rangeOf, restOfLine } from './positions.ts'
import { type Excess, prescan } from './prescan.ts'
import { problemList } from './problem-list.ts'
import { type Locate, read } from './read.ts'
import * as refusals from './refusals.ts'
import { isEcho, type Scene, wordsFor } from './syntax-words.ts'
import { quote } from './words.ts'

/**
 * The slow reader. It goes on after an error, and it keeps comments and layout; it is some ten times slower than the
 * fast one and several times larger, so nothing that only reads sound files may import this module at its top.
 */

const OPTIONS = {
  version: '1.2',
  schema: 'core',
  merge: false,
  stringKeys: true,
  // The parser compares each key with every other one of its block; `repeatedKeys` looks each up once.
  uniqueKeys: false,
  prettyErrors: false,
  strict: true,
} as const

const EXCESS = {
  depth: refusals.TOO_DEEP,
  keys: refusals.TOO_MANY_KEYS,
  items: refusals.TOO_MANY_ITEMS,
  tokens: refusals.TOO_MANY_TOKENS,
  length: refusals.TEXT_TOO_LONG,
} as const satisfies Readonly<Record<Excess['limit'], unknown>>

/**
 * Finds every syntax error of a text, in plain words, the first of each line.
 *
 * @param text the whole file, accepted by `guard`
 * @returns the problems in the order of the text, each with its range; empty when this reader sees none
 */
export function explain(text: string): readonly Problem[] {
  const composed = compose(text)
  return composed.ok ? [] : composed.problems
}

/**
 * Reads a file and keeps what a person put between the values, for editing in a form.
 *
 * @param text the whole file
 * @returns the values and places as `read` gives them, and the document of the package yaml with its comments; or all
 *   problems
 */
export function readWithComments(
  text: string,
):
  | { readonly ok: true; readonly tree: unknown; readonly locate: Locate; readonly document: Document }
  | { readonly ok: false; readonly problems: readonly Problem[] } {
  const fast = read(text, explain)
  if (!fast.ok) return fast
  const composed = compose(text)
  return composed.ok ? { ...fast, document: composed.document } : composed
}

type Composed =
  | { readonly ok: true; readonly document: Document }
  | { readonly ok: false; readonly problems: readonly Problem[] }

/**
 * The parser stumbles over a list behind a byte order mark; a line end in its place leaves all offsets as they are.
 * Nesting is measured before the parser runs: it would bring the program down, and no one could catch that.
 */
function compose(text: string): Composed {
  const excess = prescan(new Lexer().lex(text))
  if (excess !== undefined) {
    const { code, message } = EXCESS[excess.limit]
    return { ok: false, problems: [problem(code, [], message, rangeOf(text, excess.offset, excess.offset + 1))] }
  }
  const document = parseDocument(text.replace(/^\ufeff/, '\n'), OPTIONS)
  const problems = inWords(text, [...document.errors, ...document.warnings, ...repeatedKeys(document)])
  return problems.length === 0 ? { ok: true, document } : { ok: false, problems }
}

/** Keys that stand twice in their block, as the parser would tell them. */
function repeatedKeys(document: Document): YAMLError[] {
  const found: YAMLError[] = []
  visit(document, {
    Map(_, { items }) {
      const seen = new Set<unknown>()
      for (const { key } of items) {
        if (!isScalar(key) || !key.range) continue
        if (seen.has(key.value))
          found.push(new YAMLParseError([key.range[0], key.range[1]], 'DUPLICATE_KEY', 'repeated'))
        seen.add(key.value)
      }
    },
  })
  return found
}

function inWords(text: string, errors: readonly YAMLError[]): readonly Problem[] {
  const found = problemList()
  let told = -1
  for (const error of [...errors].sort((one, other) => one.pos[0] - other.pos[0])) {
    const [start] = error.pos
    if (start <= told) continue
    const echo = told !== -1 && isEcho(sceneOf(text, error))
    told = start + restOfLine(text, start).length
    if (!echo) found.add(() => problemOf(text, error))
  }
  return found.all()
}

function problemOf(text: string, error: YAMLError): Problem {
  const [start, end] = error.pos
  const opened = openedBefore(text, error)
  if (opened !== undefined) return placed(text, opened.code, opened.message, opened.offset, opened.offset + 1)
  const scene = sceneOf(text, error)
  const refused = refusalOf(error.code, text.slice(start, end))
  if (refused !== undefined) return placed(text, refused.code, refused.message, start, end)
  const { code, message } = wordsFor(scene)
  return placed(text, code, message, start, end)
}

function placed(text: string, code: ProblemCode, message: string, start: number, end: number): Problem {
  const from = Math.min(start, text.length)
  const range = rangeOf(text, from, Math.min(Math.max(end, from), text.length))
  return { code, path: [], message, range }
}

/** What is well-formed and still not part of the format; the fast reader says the same of it. */
function refusalOf(code: YAMLError['code'], found: string): { code: ProblemCode; message: string } | undefined {
  switch (code) {
    case 'DUPLICATE_KEY':
      return refusals.duplicateKey(found)
    case 'NON_STRING_KEY':
      return refusals.COMPLEX_KEY
    case 'MULTIPLE_DOCS':
      return refusals.SEVERAL_DOCUMENTS
    case 'TAG_RESOLVE_FAILED':
    case 'MULTIPLE_TAGS':
    case 'BAD_COLLECTION_TYPE':
      return refusals.tagRefused(found)
    case 'ALIAS_PROPS':
    case 'BAD_ALIAS':
    case 'MULTIPLE_ANCHORS':
      return refusals.anchorRefused(found)
    default:
      return undefined
  }
}

function sceneOf(text: string, { code, message, pos: [start] }: YAMLError): Scene {
  const lineStart = text.lastIndexOf('\n', start - 1) + 1
  return { code, reason: message, rest: restOfLine(text, start), line: restOfLine(text, lineStart) }
}

interface Opened {
  readonly code: ProblemCode
  readonly message: string
  readonly offset: number
}

/** The parser notices a missing quote or bracket at its end; a person looks for where it was opened. */
function openedBefore(text: string, { message, pos: [at] }: YAMLError): Opened | undefined {
  if (message.startsWith('Missing closing')) return openedQuote(text, at)
  return / end with a [\]}]/.test(message) ? openedBracket(text, at) : undefined
}

function openedQuote(text: string, end: number): Opened {
  let offset = 0
  for (const token of sourceTokens(text)) {
    if (offset + token.length >= end) break
    offset += token.length
  }
  const mark = text.charAt(offset)
  const message = `The quote ${mark} that opens here is never closed: write ${mark} at the end of ${quote(restOfLine(text, offset))}.`
  return { code: 'unclosed-quote', message, offset }
}

function openedBracket(text: string, end: number): Opened {
  const open: number[] = []
  let offset = 0
  for (const token of sourceTokens(text)) {
    if (offset >= end) break
    if (token === '[' || token === '{') open.push(offset)
    if (token === ']' || token === '}') open.pop()
    offset += token.length
  }
  const last = Math.max(0, ...open)
  const closing = text[last] === '[' ? ']' : '}'
  const message = `The bracket ${quote(restOfLine(text, last))} is not closed by “${closing}”: close it, and indent what is inside it more than its key.`
  return { code: 'unclosed-bracket', message, offset: last }
}

/** The lexer's tokens that are pieces of the text, without its marks. */
function* sourceTokens(text: string): Generator<string> {
  for (const token of new Lexer().lex(text)) {
    if (!/^[\u0002\u0018\u001f]$/.test(token)) yield token
  }
}
