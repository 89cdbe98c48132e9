import type { FileFault } from '#cli/io.ts'
import { check, type Shelf } from '#core/engine.ts'
import type { ReadResult } from '#core/read/read.ts'
import {
  atFailureLevel,
  atStrictLevel,
  type Counts,
  countVerdicts,
  type ToldFinding,
  toldFindings,
} from '#core/report/told.ts'

/** How a file came out. `incomplete`: nothing fails, something is not shown. */
export type Outcome = 'meets' | 'incomplete' | 'fails' | 'unreadable'

/** A finding with the line that it points to. */
export interface ShownFinding extends ToldFinding {
  readonly line: string
}

/** Everything that any format prints of a file: plain data, so that it can come from another thread. */
export interface FileResult {
  readonly file: string
  readonly outcome: Outcome
  readonly findings: readonly ShownFinding[]
  readonly counts: Counts
  /** Whether the file keeps the command from ending well; likewise when asked to be strict. */
  readonly stops: boolean
  readonly stopsStrictly: boolean
  readonly book: { readonly id: string; readonly version: string; readonly hash: string } | null
  /** Already put in words where it was checked, its findings left there: what comes from another thread is copied. */
  readonly block?: string
}

export interface ResultOptions {
  readonly all: boolean
  readonly shelf: Shelf
}

const LONGEST_LINE = 400

function lineAt(text: string, offset: number): string {
  const start = text.lastIndexOf('\n', offset - 1) + 1
  const end = text.indexOf('\n', offset)
  return text.slice(start, Math.min(end === -1 ? text.length : end, start + LONGEST_LINE)).replace(/\r$/, '')
}

/** A file that could not even be opened, or is no text: the code says which. */
export function unopened(file: string, { message, code = 'file' }: Omit<FileFault, 'ok'>): FileResult {
  const finding: ShownFinding = {
    rule: code,
    key: null,
    subject: 'file',
    state: null,
    verdict: 'fails',
    severity: 'failure',
    message,
    remedy: '',
    cite: '',
    path: [],
    range: { line: 1, column: 1, endLine: 1, endColumn: 1, offset: 0, endOffset: 0 },
    related: [],
    line: '',
  }
  return {
    file,
    outcome: 'unreadable',
    findings: [finding],
    counts: countVerdicts([finding]),
    stops: true,
    stopsStrictly: true,
    book: null,
  }
}

function resultOf(
  file: string,
  text: string,
  { all, shelf }: ResultOptions,
  reader?: (text: string) => ReadResult,
): FileResult {
  const checked = check(text, shelf, reader)
  const told = toldFindings(checked, all)
  const judged = checked.kind === 'judged' ? checked.findings : told
  const counts = countVerdicts(judged)
  const stops = judged.some(atFailureLevel)
  const outcome =
    checked.kind === 'unreadable' ? 'unreadable' : stops ? 'fails' : counts['not shown'] > 0 ? 'incomplete' : 'meets'
  return {
    file,
    outcome,
    findings: told.map((finding) => ({ ...finding, line: lineAt(text, finding.range.offset) })),
    counts,
    stops,
    stopsStrictly: judged.some(atStrictLevel),
    book:
      checked.kind === 'judged'
        ? { id: checked.book.id, version: checked.book.version, hash: checked.book.hash }
        : null,
  }
}

/** Checks the text of a file. The slower reader, which tells all that is wrong, is loaded only for a file that has some. */
export async function checkFile(file: string, text: string, options: ResultOptions): Promise<FileResult> {
  const result = resultOf(file, text, options)
  if (result.outcome !== 'unreadable') return result
  const { readThoroughly } = await import('#core/read/thorough.ts')
  return resultOf(file, text, options, readThoroughly)
}

/** 0 where nothing stops, 1 where something does, 2 where a file could not be read. */
export function exitCode(
  results: readonly Pick<FileResult, 'outcome' | 'stops' | 'stopsStrictly'>[],
  strict: boolean,
): number {
  if (results.some(({ outcome }) => outcome === 'unreadable')) return 2
  return results.some(({ stops, stopsStrictly }) => (strict ? stopsStrictly : stops)) ? 1 : 0
}
