import { availableParallelism } from 'node:os'
import { parentPort, Worker, workerData } from 'node:worker_threads'
import type { FormatScene } from './formats/format.ts'
import { worded } from './formats/text.ts'
import { readText } from './io.ts'
import { checkFile, type FileResult, unopened } from './result.ts'
import { shelfFor } from './shelf.ts'

/** The word that tells the bundle to work in a thread. */
export const THREAD = '--thread'

interface Task {
  readonly all: boolean
  /** The folder of a rule book of one's own: its checks are functions, so each thread reads it for itself. */
  readonly rulebook: string | undefined
  /** How words are printed, where words are all that is wanted. */
  readonly words: FormatScene | undefined
}

/** What a helper is handed at a time: enough to keep it busy, few enough that nobody waits for the last one. */
const PORTION = 16
const MOST_THREADS = 8
/** MB for what lives no longer than one file: with room enough most of it is gone before it is ever looked at. */
const YOUNG = 24

interface Portion {
  readonly start: number
  readonly files: readonly string[]
}
interface Done {
  readonly start: number
  readonly results: readonly FileResult[]
}

/** The other end: checks what it is handed until nothing comes. */
export function workInThread(): void {
  const { all, rulebook, words } = workerData as Task
  const opened = shelfFor(rulebook)
  const checked = async (file: string): Promise<FileResult> => {
    const shelf = await opened
    // The thread that hands out has read the book before; a book that changed since is no book for half of the files.
    if (!shelf.ok) throw new Error(shelf.message)
    const text = readText(file)
    const result = text.ok ? await checkFile(file, text.text, { all, shelf: shelf.shelf }) : unopened(file, text)
    return words ? worded(result, words) : result
  }
  parentPort?.on('message', ({ start, files }: Portion) => {
    void Promise.all(files.map(checked)).then((results) => parentPort?.postMessage({ start, results } satisfies Done))
  })
}

/**
 * Checks many files in several threads, this one only handing out and collecting; results in the order of the files.
 *
 * @param take is given each result in that order as soon as it and all before it are there, and says what is kept of it
 */
export function checkInThreads(
  files: readonly string[],
  task: Task,
  tell: (done: number) => void,
  take: (result: FileResult) => FileResult = (result) => result,
): Promise<readonly FileResult[]> {
  const portions: Portion[] = []
  for (let start = 0; start < files.length; start += PORTION)
    portions.push({ start, files: files.slice(start, start + PORTION) })
  const found = new Array<FileResult>(files.length)
  const count = Math.min(MOST_THREADS, availableParallelism(), portions.length)
  let [next, done, taken] = [0, 0, 0]
  return new Promise((resolve, reject) => {
    const workers = Array.from(
      { length: count },
      () =>
        new Worker(process.argv[1] ?? '', {
          workerData: task,
          argv: [THREAD],
          resourceLimits: { maxYoungGenerationSizeMb: YOUNG },
        }),
    )
    const hand = (worker: Worker): void => {
      const portion = portions[next]
      next += 1
      if (portion) worker.postMessage(portion)
      else void worker.terminate()
    }
    for (const worker of workers) {
      worker.on('error', (error) => {
        for (const other of workers) void other.terminate()
        reject(error)
      })
      worker.on('message', ({ start, results }: Done) => {
        results.forEach((result, index) => {
          found[start + index] = result
        })
        for (let ready = found[taken]; ready; ready = found[taken]) {
          found[taken] = take(ready)
          taken += 1
        }
        done += results.length
        tell(done)
        if (done === files.length) resolve(found)
        hand(worker)
      })
      hand(worker)
    }
  })
}
