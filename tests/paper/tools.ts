import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/** Runs a program and returns what it printed; a failure throws with what it said. */
export const run = (program: string, ...parameters: readonly string[]): string =>
  execFileSync(program, parameters, { encoding: 'utf8', maxBuffer: 1 << 28, stdio: ['ignore', 'pipe', 'pipe'] })

/** Puts bytes into a file of a folder that is gone afterwards. */
export const withFile = <Result>(
  name: string,
  bytes: Uint8Array,
  use: (path: string, folder: string) => Result,
): Result => {
  const folder = mkdtempSync(join(tmpdir(), 'skerry-paper-'))
  try {
    const path = join(folder, name)
    writeFileSync(path, bytes)
    return use(path, folder)
  } finally {
    rmSync(folder, { recursive: true })
  }
}

/** The words of a PDF, one string a page, as poppler lays them out. */
export const pagesOf = (pdf: Uint8Array): readonly string[] =>
  withFile('page.pdf', pdf, (path) => run('pdftotext', '-layout', path, '-').split('\f').slice(0, -1))

/** All words of a PDF in reading order, single spaces between them. */
export const wordsOf = (pdf: Uint8Array): string =>
  withFile('page.pdf', pdf, (path) => run('pdftotext', path, '-').replace(/\s+/g, ' '))
