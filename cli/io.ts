// The only place of the command line that touches streams, files and the process.
import {
  closeSync,
  type Dirent,
  existsSync,
  fstatSync,
  openSync,
  readdirSync,
  readFileSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
  writeSync,
} from 'node:fs'
import { homedir } from 'node:os'
import { basename, dirname, join, relative, resolve } from 'node:path'
import { decode } from '#core/read/guard.ts'

/** What went wrong with a file, in words for the person at the terminal. */
export interface FileFault {
  readonly ok: false
  readonly message: string
  /** What the bytes themselves are at fault for; none where they could not be had. */
  readonly code?: string
}

export type FileText = { readonly ok: true; readonly text: string } | FileFault

const FAULTS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file',
  EACCES: 'this account may not read it',
  EPERM: 'this account may not do that',
  EROFS: 'the disk takes no writing',
  ENOSPC: 'the disk is full',
  EISDIR: 'it is a folder, and a file is wanted here',
  ENOTDIR: 'a part of its path is no folder',
  EMFILE: 'too many files are open',
}

function faultOf(error: unknown): string {
  const code = error instanceof Error && 'code' in error ? String(error.code) : ''
  return FAULTS[code] ?? (error instanceof Error ? error.message : String(error))
}

/** No file that is read is anywhere near as long; one that is would only fill the memory before it is refused. */
const FAR_TOO_LONG = 64_000_000

/** The bytes of a file, `-` for standard input. */
export function readBytes(file: string): { readonly ok: true; readonly bytes: Uint8Array } | FileFault {
  if (file === '-' && isTerminal('stdin'))
    return { ok: false, message: 'Standard input is this terminal, and nothing comes from it: pipe a file in with |.' }
  try {
    const { size } = file === '-' ? { size: 0 } : statSync(file)
    if (size > FAR_TOO_LONG)
      return {
        ok: false,
        code: 'too-large',
        message: `Cannot read ${file}: its ${size} bytes are far more than any file has that is read here.`,
      }
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
  if (decoded.ok) return decoded
  const { code, message } = decoded.problem
  return { ok: false, code, message: `Cannot read ${file}: ${message}` }
}

const unfinished = new Set<string>()
let drafts = 0

/** Where a file really is, and who may do what with it: writing must change neither. */
function standing(file: string): { readonly target: string; readonly mode: number | undefined } {
  if (!existsSync(file)) return { target: file, mode: undefined }
  const target = realpathSync(file)
  return { target, mode: statSync(target).mode }
}

/** A file's content, whole or in pieces in their order. */
type Content = string | Uint8Array | Iterable<string | Uint8Array>

function writePieces(file: string, pieces: Iterable<string | Uint8Array>, mode?: number): void {
  const open = openSync(file, 'w', mode)
  try {
    for (const piece of pieces) writeFileSync(open, piece)
  } finally {
    closeSync(open)
  }
}

/** Writes a file whole or not at all: under another name first, then renamed. `-` is standard output. */
export function writeWhole(file: string, content: Content): FileFault | { readonly ok: true } {
  const pieces = typeof content === 'string' || content instanceof Uint8Array ? [content] : content
  if (file === '-') {
    for (const piece of pieces) writeOut(OUTPUT, piece)
    return { ok: true }
  }
  if (drafts === 0) endOnInterrupt()
  drafts += 1
  const { target, mode } = standing(file)
  const draft = join(dirname(target), `.skerry-${process.pid}-${drafts}.part`)
  try {
    if (mode !== undefined && !statSync(target).isFile()) {
      // What is no plain file, such as a pipe, is written to and never replaced.
      writePieces(target, pieces)
      return { ok: true }
    }
    unfinished.add(draft)
    writePieces(draft, pieces, mode ?? 0o666)
    renameSync(draft, target)
    return { ok: true }
  } catch (error) {
    const gone = existsSync(dirname(target)) ? faultOf(error) : `there is no folder ${dirname(target)}`
    return { ok: false, message: `Cannot write ${file}: ${gone}.` }
  } finally {
    rmSync(draft, { force: true })
    unfinished.delete(draft)
  }
}

export const exists = (file: string): boolean => existsSync(file)
export const isFolder = (file: string): boolean => existsSync(file) && statSync(file).isDirectory()

/** The folder that a file is in, and a path from the root: by these, two spellings of one place are the same. */
export const folderOf = (file: string): string => dirname(file)
export const baseName = (file: string): string => (file === '-' ? 'standard-input.skerry.yaml' : basename(file))
export const homeFolder = (): string => homedir()
export const wholePath = (path: string): string => resolve(path)
export const pathFromHere = (path: string): string => relative('', path)

/** Whether a file is one by its name; any file is that is named itself. */
export const isInstallFile = (path: string): boolean => path.endsWith('.skerry.yaml')

const SKIPPED: ReadonlySet<string> = new Set(['node_modules', '.git'])

/** What is in a folder, by name; null where this account may not look. */
function entriesOf(folder: string): readonly (Dirent | null)[] {
  try {
    return readdirSync(folder, { withFileTypes: true }).toSorted((a, b) => (a.name < b.name ? -1 : 1))
  } catch {
    return [null]
  }
}

/** Install files below a folder, in the order of their names. */
export function filesBelow(folder: string, matches: (path: string) => boolean = isInstallFile): string[] {
  return entriesOf(folder).flatMap((entry) => {
    // A folder that may not be looked into is told in its place, as a file that cannot be read.
    if (entry === null) return [folder]
    const path = folder === '.' ? entry.name : join(folder, entry.name)
    if (entry.isDirectory()) return SKIPPED.has(entry.name) ? [] : filesBelow(path, matches)
    return matches(path) ? [path] : []
  })
}

const OUTPUT = 1
const TALK = 2

/** Streams whose reader has gone away: nothing more is written to them, and the command ends as it would have. */
const unread = new Set<number>()

/**
 * Writes to a stream by its number, all of it before going on: Node.js loads a quarter of itself for its own streams. A
 * reader that has gone away is no fault of ours; one that is slow is waited for.
 */
function writeOut(stream: number, content: string | Uint8Array): void {
  if (unread.has(stream)) return
  const bytes = typeof content === 'string' ? Buffer.from(content) : content
  let written = 0
  while (written < bytes.length) {
    try {
      written += writeSync(stream, bytes, written)
    } catch (error) {
      const code = error instanceof Error && 'code' in error ? error.code : ''
      if (code === 'EPIPE') {
        unread.add(stream)
        return
      }
      if (code !== 'EAGAIN') throw error
      Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 5)
    }
  }
}

/** Results go to standard output. */
export const print = (text: string | Uint8Array): void => writeOut(OUTPUT, text)

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
const NARROWEST = 40

/** Columns of the terminal; some say that they have none. */
export function terminalWidth(): number {
  const columns = isTerminal('stdout') ? process.stdout.columns : USUAL_WIDTH
  return columns > 0 ? Math.max(NARROWEST, columns) : USUAL_WIDTH
}

/** The bytes of files, as the disk has them; one that is not there has none. */
export const bytesIn = (files: readonly string[]): number =>
  files.reduce((sum, file) => sum + (statSync(file, { throwIfNoEntry: false })?.size ?? 0), 0)

/** Tells the engine not to compile a second time what runs often: that pays only where it runs for long. */
export async function expectShortRun(): Promise<void> {
  const { setFlagsFromString } = await import('node:v8')
  setFlagsFromString('--no-opt')
}

/** Ends with a code once everything is done. */
export function endWith(code: number): void {
  process.exitCode = code
}

/** Ends now: all that was to be written is, and tidying up memory that goes away as a whole would only take time. */
export function leave(): never {
  process.exit()
}

/** Keeps the details of a failure that should not have happened, and says where; undefined where no place takes them. */
export function keepDetails(error: unknown): string | undefined {
  const file = join(process.env['TMPDIR'] ?? process.env['TEMP'] ?? '/tmp', `skerry-${process.pid}-${Date.now()}.txt`)
  const details = error instanceof Error ? (error.stack ?? error.message) : String(error)
  const head = `${new Date().toISOString()}\n${process.argv.slice(2).join(' ')}\n${process.version}`
  try {
    writeFileSync(file, `${head}\n\n${details}\n`)
    return file
  } catch {
    return undefined
  }
}

/** Hands over what nobody caught, wherever it was thrown. */
export function onUncaught(handle: (error: unknown) => void): void {
  process.on('uncaughtException', handle)
}

/** Files that the program brings along, beside its bundle. */
export function ownFile(name: string): Uint8Array {
  return new Uint8Array(readFileSync(join(dirname(process.argv[1] ?? ''), name)))
}

/** From the first writing on: takes away what was being written, and ends at once. Before it the system ends us. */
function endOnInterrupt(): void {
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => {
      for (const draft of unfinished) rmSync(draft, { force: true })
      process.exit(signal === 'SIGINT' ? 130 : 143)
    })
  }
}

/** Asks questions at the terminal, on standard error so that standard output stays clean; no answer where it was left. */
export async function asker(): Promise<{
  readonly ask: (question: string) => Promise<string | undefined>
  readonly close: () => void
}> {
  const { createInterface } = await import('node:readline/promises')
  const lines = createInterface({ input: process.stdin, output: process.stderr })
  const left = new Promise<undefined>((resolve) => lines.once('close', () => resolve(undefined)))
  return { ask: (question) => Promise.race([lines.question(question), left]), close: () => lines.close() }
}
