import type { FormatScene } from '#cli/formats/format.ts'
import { FORMATS, type FormatName } from '#cli/formats/formats.ts'
import {
  colourOf,
  endWith,
  environment,
  isTerminal,
  print,
  readText,
  say,
  terminalWidth,
  watchPaths,
  writeWhole,
} from '#cli/io.ts'
import { checkFile, exitCode, type FileResult, unopened } from '#cli/result.ts'
import { select } from '#cli/select.ts'
import { shelfWith, shippedShelf } from '#cli/shelf.ts'
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

async function checkOne(file: string, shelf: Shelf, { all, stdinFilename }: CheckOptions): Promise<FileResult> {
  const name = file === '-' ? (stdinFilename ?? 'standard input') : file
  const text = readText(file)
  return text.ok ? checkFile(name, text.text, { all, shelf }) : unopened(name, text.message)
}

/** Tells on a terminal how far a long run has come. */
function progress(total: number): (done: number) => void {
  if (!isTerminal('stderr') || total < MANY) return () => undefined
  return (done) => say(done === total ? '\r\u001b[K' : `\r${done} of ${total} files`)
}

async function results(files: readonly string[], shelf: Shelf, options: CheckOptions): Promise<readonly FileResult[]> {
  const tell = progress(files.length)
  if (files.length >= MANY && options.rulebook === undefined) {
    const { checkInThreads } = await import('#cli/threads.ts')
    const words = wordsOnly(options)
    return checkInThreads(files, { all: options.all, words }, tell, words && printed(words))
  }
  const found: FileResult[] = []
  for (const file of files) {
    found.push(await checkOne(file, shelf, options))
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

/** Prints a result at once, and keeps of it only how it came out. */
function printed({ quiet }: FormatScene): (result: FileResult) => FileResult {
  let first = true
  return (result) => {
    print(`${first || quiet ? '' : '\n'}${result.block ?? ''}`)
    first = false
    return { ...result, block: '' }
  }
}

async function write(found: readonly FileResult[], options: CheckOptions): Promise<boolean> {
  const words = wordsOnly(options)
  if (words && found.some(({ block }) => block !== undefined)) {
    const { closing } = await import('#cli/formats/text.ts')
    print(closing(found, words))
    return true
  }
  for (const { format, output } of options.formats) {
    const print_ = await FORMATS[format]()
    const content = print_(found, sceneOf(options, output))
    if (output === undefined) print(content)
    else {
      const written = writeWhole(output, content)
      if (!written.ok) {
        say(`${written.message}\n`)
        return false
      }
    }
  }
  return true
}

async function once(files: readonly string[], shelf: Shelf, options: CheckOptions): Promise<number> {
  const found = await results(files, shelf, options)
  const written = await write(found, options)
  return written ? exitCode(found, options.strict) : 2
}

async function shelfFor({ rulebook }: CheckOptions): Promise<Shelf | undefined> {
  if (rulebook === undefined) return shippedShelf()
  const made = await shelfWith(rulebook)
  if (made.ok) return made.shelf
  say(`${made.message}\n`)
  return undefined
}

/** Validates, computes and judges files. */
export async function check(words: readonly string[], options: CheckOptions): Promise<void> {
  const { files, unmatched } = select(words)
  if (unmatched.length > 0 && options.errorOnUnmatched) {
    say(
      `${unmatched.map((word) => `Nothing matches ${word}: there is no such file, and no install file (*.skerry.yaml) below it.`).join('\n')}\n`,
    )
    return endWith(2)
  }
  const shelf = await shelfFor(options)
  if (!shelf) return endWith(2)
  endWith(await once(files, shelf, options))
  if (!options.watch) return
  say('Watching for changes; Ctrl-C ends.\n')
  watchPaths(files, () => {
    void once(files, shelf, options).then(endWith)
  })
}

/** The format where none is asked for: annotations on a build service, words elsewhere. */
export const usualFormat = (): FormatName => (environment('GITHUB_ACTIONS') === 'true' ? 'github' : 'text')
