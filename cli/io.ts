// The only place of the command line that touches streams, files and the process.
import {
  existsSync,
  fstatSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  watch,
  writeFileSync,
  writeSync,
} from 'node:fs'
import { dirname, join } from 'node:path'
import { decode } from '#core/read/guard.ts'

/** What went wrong with a file, in words for the person at the terminal. */
export interface FileFault {
  readonly ok: false
  readonly message: string
}

export type FileText = { readonly ok: true; readonly text: string } | FileFault

const FAULTS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file',
  EACCES: 'this account may not read it',
  EISDIR: 'it is a folder, and a file is wanted here',
  ENOTDIR: 'a part of its path is no folder',
  EMFILE: 'too many files are open',
}

function faultOf(error: unknown): string {
  const code = error instanceof Error && 'code' in error ? String(error.code) : ''
  return FAULTS[code] ?? (error instanceof Error ? error.message : String(error))
}

/** The bytes of a file. */
export function readBytes(file: string): { readonly ok: true; readonly bytes: Uint8Array } | FileFault {
  try {
    return { ok: true, bytes: readFileSync(file === '-' ? 0 : file) }
  } catch (error) {
    return { ok: false, message: `Cannot read ${file}: ${faultOf(error)}.` }
  }
}

/** The text of a file, `-` for standard input. */
export function readText(file: string): FileText {
  const read = readBytes(file)
  if (!read.ok) return read
  const decoded = decode(read.bytes)
  return decoded.ok ? decoded : { ok: false, message: `Cannot read ${file}: ${decoded.problem.message}` }
}

const unfinished = new Set<string>()
let drafts = 0

/** Writes a file whole or not at all: under another name first, then renamed. */
export function writeWhole(file: string, content: string | Uint8Array): FileFault | { readonly ok: true } {
  drafts += 1
  const draft = join(dirname(file), `.skerry-${process.pid}-${drafts}.part`)
  try {
    unfinished.add(draft)
    writeFileSync(draft, content)
    renameSync(draft, file)
    return { ok: true }
  } catch (error) {
    return { ok: false, message: `Cannot write ${file}: ${faultOf(error)}.` }
  } finally {
    rmSync(draft, { force: true })
    unfinished.delete(draft)
  }
}

export const exists = (file: string): boolean => existsSync(file)
export const isFolder = (file: string): boolean => existsSync(file) && statSync(file).isDirectory()

const SUFFIX = '.skerry.yaml'
const SKIPPED: ReadonlySet<string> = new Set(['node_modules', '.git'])

/** Install files below a folder, in the order of their names. */
export function filesBelow(
  folder: string,
  matches: (path: string) => boolean = (path) => path.endsWith(SUFFIX),
): string[] {
  const entries = readdirSync(folder, { withFileTypes: true }).toSorted((a, b) => (a.name < b.name ? -1 : 1))
  return entries.flatMap((entry) => {
    const path = folder === '.' ? entry.name : join(folder, entry.name)
    if (entry.isDirectory()) return SKIPPED.has(entry.name) ? [] : filesBelow(path, matches)
    return matches(path) ? [path] : []
  })
}

const OUTPUT = 1
const TALK = 2

/**
 * Writes to a stream by its number, all of it before going on: Node.js loads a quarter of itself for its own streams. A
 * reader that has gone away is no fault of ours; one that is slow is waited for.
 */
function writeOut(stream: number, text: string): void {
  const bytes = Buffer.from(text)
  let written = 0
  while (written < bytes.length) {
    try {
      written += writeSync(stream, bytes, written)
    } catch (error) {
      const code = error instanceof Error && 'code' in error ? error.code : ''
      if (code === 'EPIPE') process.exit(0)
      if (code !== 'EAGAIN') throw error
      Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 5)
    }
  }
}

/** Results go to standard output. */
export const print = (text: string): void => writeOut(OUTPUT, text)

/** Talk goes to standard error. */
export const say = (text: string): void => writeOut(TALK, text)

/** The device that swallows everything, as Linux numbers it. */
const NULL_DEVICE = 0x103
const STREAMS = { stdin: 0, stdout: OUTPUT, stderr: TALK } as const

/** Whether a stream is a terminal. What knows for certain is loaded only for what may be one. */
export function isTerminal(stream: keyof typeof STREAMS): boolean {
  const status = fstatSync(STREAMS[stream])
  if (!status.isCharacterDevice() || status.rdev === NULL_DEVICE) return false
  return process[stream].isTTY === true
}

export const environment = (name: string): string | undefined => process.env[name]

/** Whether a stream gets colour: asked for, or a terminal that nothing speaks against. */
export function colourOf(stream: 'stdout' | 'stderr', asked?: boolean): boolean {
  if (asked !== undefined) return asked
  if (process.env['FORCE_COLOR']) return process.env['FORCE_COLOR'] !== '0'
  if (process.env['NO_COLOR'] || process.env['TERM'] === 'dumb') return false
  return isTerminal(stream)
}

const USUAL_WIDTH = 100
export const terminalWidth = (): number => (isTerminal('stdout') ? process.stdout.columns : USUAL_WIDTH)

/** Ends with a code once everything is written. */
export function endWith(code: number): void {
  process.exitCode = code
}

/** Calls back after a file or folder changed and stayed quiet for a moment. */
export function watchPaths(paths: readonly string[], changed: () => void): void {
  const QUIET = 120
  let timer: NodeJS.Timeout | undefined
  for (const path of paths) {
    watch(path, { recursive: false }, () => {
      clearTimeout(timer)
      timer = setTimeout(changed, QUIET)
    })
  }
}

/** Keeps the details of a failure that should not have happened, and says where. */
export function keepDetails(error: unknown): string {
  const file = join(process.env['TMPDIR'] ?? process.env['TEMP'] ?? '/tmp', `skerry-${process.pid}-${Date.now()}.txt`)
  const details = error instanceof Error ? (error.stack ?? error.message) : String(error)
  writeFileSync(
    file,
    `${new Date().toISOString()}\n${process.argv.slice(2).join(' ')}\n${process.version}\n\n${details}\n`,
  )
  return file
}

/** Files that the program brings along, beside its bundle. */
export function ownFile(name: string): Uint8Array {
  return new Uint8Array(readFileSync(join(dirname(process.argv[1] ?? ''), name)))
}

/** Takes away what was being written, and ends at once. */
export function endOnInterrupt(): void {
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => {
      for (const draft of unfinished) rmSync(draft, { force: true })
      process.exit(signal === 'SIGINT' ? 130 : 143)
    })
  }
}

/** Asks questions at the terminal, on standard error so that standard output stays clean. */
export async function asker(): Promise<{
  readonly ask: (question: string) => Promise<string>
  readonly close: () => void
}> {
  const { createInterface } = await import('node:readline/promises')
  const lines = createInterface({ input: process.stdin, output: process.stderr })
  return { ask: (question) => lines.question(question), close: () => lines.close() }
}
