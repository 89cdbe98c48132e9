import type { FormatScene, Printing } from '#cli/formats/format.ts'
import { FORMATS, type FormatName } from '#cli/formats/formats.ts'
import {
  bytesIn,
  colourOf,
  endWith,
  environment,
  expectShortRun,
  isTerminal,
  print,
  readText,
  say,
  terminalWidth,
  writeWhole,
} from '#cli/io.ts'
import { checkFile, exitCode, type FileResult, unopened } from '#cli/result.ts'
import { select, watchedFor } from '#cli/select.ts'
import { shelfFor } from '#cli/shelf.ts'
import { Spool } from '#cli/spool.ts'
import { VERSION } from '#cli/version.ts'
import type { Shelf } from '#core/engine.ts'

export interface CheckOptions {
  readonly formats: readonly { readonly format: FormatName; readonly output: string | undefined }[]
  readonly strict: boolean
  readonly all: boolean
  readonly quiet: boolean
  readonly verbose: boolean
  readonly watch: boolean
  readonly color: boolean | undefined
  readonly stdinFilename: string | undefined
  readonly rulebook: string | undefined
  readonly errorOnUnmatched: boolean
}

/** From this many files on, other threads help. */
const MANY = 48
/** Clears the line from where the terminal stands. */
const CLEARED = '\u001b[K'

/** Up to so many bytes are judged before code that V8 compiled once more would have paid for itself; below, nothing is. */
const SHORT_RUN = { from: 7_000, to: 100_000 } as const

function isShort(files: readonly string[], { watch }: CheckOptions): boolean {
  const bytes = bytesIn(files)
  return !watch && bytes >= SHORT_RUN.from && bytes <= SHORT_RUN.to
}

async function checkOne(file: string, shelf: Shelf, { all, stdinFilename }: CheckOptions): Promise<FileResult> {
  const name = file === '-' ? (stdinFilename ?? 'standard input') : file
  const text = readText(file)
  return text.ok ? checkFile(name, text.text, { all, shelf }) : unopened(name, text)
}

/** Tells on a terminal how far a long run has come, where nothing else shows it. The next line that is written takes its place. */
function progress(total: number, shown: boolean): (done: number) => void {
  if (shown || !isTerminal('stderr') || total < MANY) return () => undefined
  return (done) => say(done === total ? CLEARED : `${CLEARED}${done} of ${total} files\r`)
}

/** How a file came out, without what was found: that went to where it is printed. */
function ended({ file, outcome, counts, stops, stopsStrictly }: FileResult): FileResult {
  return { file, outcome, findings: [], counts, stops, stopsStrictly, book: null }
}

/** Checks the files; each result is handed on as soon as it and those before it are there, and only its end is kept. */
async function results(
  files: readonly string[],
  shelf: Shelf,
  options: CheckOptions,
  take: (result: FileResult) => void,
): Promise<readonly FileResult[]> {
  const words = wordsOnly(options)
  const tell = progress(files.length, words !== undefined && isTerminal('stdout'))
  const keep = (result: FileResult): FileResult => {
    take(result)
    return ended(result)
  }
  if (files.length >= MANY) {
    const { checkInThreads } = await import('#cli/threads.ts')
    return checkInThreads(files, { all: options.all, rulebook: options.rulebook, words }, tell, keep)
  }
  if (isShort(files, options)) await expectShortRun()
  const found: FileResult[] = []
  for (const file of files) {
    found.push(keep(await checkOne(file, shelf, options)))
    tell(found.length)
  }
  return found
}

function sceneOf({ color, verbose, quiet, strict }: CheckOptions, output: string | undefined): FormatScene {
  return {
    version: VERSION,
    colour: output === undefined && colourOf('stdout', color),
    width: output === undefined ? Math.min(terminalWidth(), 120) : 100,
    verbose,
    quiet,
    strict,
  }
}

/** How words are printed, where words on standard output are all that is wanted: they can come as they are made. */
function wordsOnly(options: CheckOptions): FormatScene | undefined {
  const [only, ...others] = options.formats
  return only?.format === 'text' && only.output === undefined && others.length === 0
    ? sceneOf(options, undefined)
    : undefined
}

/** One of the prints that were asked for. */
interface Print {
  readonly output: string | undefined
  readonly printing: Printing
  readonly spool: Spool
}

/** Words alone are printed as they come; anything else waits for its head, which is known at the end. */
async function openPrints(options: CheckOptions): Promise<readonly Print[]> {
  return Promise.all(
    options.formats.map(async ({ format, output }) => ({
      output,
      printing: (await FORMATS[format]())(sceneOf(options, output)),
      spool: new Spool(),
    })),
  )
}

function* whole({ printing, spool }: Print): Generator<string | Uint8Array> {
  const { head, tail } = printing.frame()
  yield head
  yield* spool.pieces()
  yield tail
}

function write(prints: readonly Print[]): boolean {
  for (const one of prints) {
    if (one.output === undefined) {
      for (const piece of whole(one)) print(piece)
      continue
    }
    const written = writeWhole(one.output, whole(one))
    if (!written.ok) {
      say(`${written.message}\n`)
      return false
    }
  }
  return true
}

async function once(files: readonly string[], shelf: Shelf, options: CheckOptions): Promise<number> {
  const prints = await openPrints(options)
  const words = wordsOnly(options) !== undefined
  const found = await results(files, shelf, options, (result) => {
    for (const { printing, spool } of prints) {
      const piece = printing.take(result)
      if (words) print(piece)
      else spool.add(piece)
    }
  })
  return write(prints) ? exitCode(found, options.strict) : 2
}

/** Checks what the words mean now; answers with the files, or nothing where there was nothing to check. */
async function run(words: readonly string[], options: CheckOptions): Promise<readonly string[] | undefined> {
  const { files, unmatched } = select(words)
  if (unmatched.length > 0 && options.errorOnUnmatched) {
    say(
      `${unmatched.map((word) => `Nothing matches ${word}: there is no such file, and no install file (*.skerry.yaml) below it.`).join('\n')}\n`,
    )
    endWith(2)
    return undefined
  }
  const shelf = await shelfFor(options.rulebook)
  if (!shelf.ok) {
    say(`${shelf.message}\n`)
    endWith(2)
    return undefined
  }
  endWith(await once(files, shelf.shelf, options))
  return files
}

/** Checks again after each change; a change during a check is looked at after it. It goes on until it is interrupted. */
async function watch(words: readonly string[], options: CheckOptions): Promise<never> {
  const { watchFolders } = await import('#cli/watching.ts')
  const book = options.rulebook
  const ofBook =
    book === undefined ? [] : [{ folder: book, deep: false, wanted: (path: string) => path.endsWith('.yaml') }]
  let last: Promise<unknown> = Promise.resolve()
  say('Watching for changes; Ctrl-C ends.\n')
  watchFolders([...watchedFor(words), ...ofBook], (path) => {
    last = last.then(() => {
      say(`\n${path} changed.\n`)
      return run(words, options)
    })
  })
  return new Promise<never>(() => undefined)
}

/** Validates, computes and judges files. */
export async function check(words: readonly string[], options: CheckOptions): Promise<void> {
  const files = await run(words, options)
  if (files && options.watch) await watch(words, options)
}

/** The format where none is asked for: annotations on a build service, words elsewhere. */
export const usualFormat = (): FormatName => (environment('GITHUB_ACTIONS') === 'true' ? 'github' : 'text')
