import { type Checked, check, type Judged, type Shelf } from '#core/engine.ts'
import type { Range } from '#core/glossary.ts'
import { endWith, readText, say } from './io.ts'
import { shelfFor } from './shelf.ts'

/** A file that could be judged, with its text. */
export interface JudgedFile {
  readonly judged: Judged
  readonly text: string
}

async function thorough(text: string, shelf: Shelf): Promise<Checked> {
  const checked = check(text, shelf)
  if (checked.kind !== 'unreadable') return checked
  const { readThoroughly } = await import('#core/read/thorough.ts')
  return check(text, shelf, readThoroughly)
}

function complain(file: string, checked: Exclude<Checked, Judged>): void {
  const place = (range: Range | undefined): string => (range ? `:${range.line}:${range.column}` : '')
  const lines = checked.problems.map(
    ({ path, range, message }) =>
      `${file}${place(range ?? (checked.kind === 'misshapen' ? checked.locate(path) : undefined))}: ${message}`,
  )
  say(`${lines.join('\n')}\n${file} must be mended first.\n`)
}

/** Reads and judges one file for a command that needs it whole; otherwise says what is wrong and ends with 2. */
export async function judgedFile(file: string, rulebook?: string): Promise<JudgedFile | undefined> {
  const read = readText(file)
  const shelf = await shelfFor(rulebook)
  if (!read.ok || !shelf.ok) {
    say(`${read.ok ? (shelf.ok ? '' : shelf.message) : read.message}\n`)
    endWith(2)
    return undefined
  }
  const checked = await thorough(read.text, shelf.shelf)
  if (checked.kind === 'judged') return { judged: checked, text: read.text }
  complain(file, checked)
  endWith(2)
  return undefined
}
