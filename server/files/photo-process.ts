import { type ChildProcessByStdio, spawn } from 'node:child_process'
import type { Readable, Writable } from 'node:stream'
import type { PhotoAnswer, PhotoProblem } from './photo-answer.ts'
import { unpacked } from './photo-frame.ts'
import { PHOTO_LIMITS } from './photo-limits.ts'

/** How a photo's process is started: Node's own arguments, the last of them the program. */
export interface PhotoProgram {
  readonly args: readonly string[]
  /** Time in ms, work in s and memory in kibibytes for one photo; the usual ones where left out. */
  readonly time?: number
  readonly work?: number
  readonly memory?: number
}

/** No two pictures of the sizes that are made come near this, in bytes. */
const MOST_OUTPUT = 32_000_000

const HEAP_MEGABYTES = 96

/** The shell sets the limits that the kernel then holds Node and everything in it to. */
const LIMITED = 'ulimit -d "$1" && ulimit -S -t "$2" && shift 2 && exec "$@"'

function start({
  args,
  memory = PHOTO_LIMITS.memory,
  work = PHOTO_LIMITS.work,
}: PhotoProgram): ChildProcessByStdio<Writable, Readable, Readable> {
  const node = [process.execPath, `--max-old-space-size=${HEAP_MEGABYTES}`, ...args]
  return spawn('/bin/sh', ['-c', LIMITED, 'photo', String(memory), String(work), ...node], {
    stdio: ['pipe', 'pipe', 'pipe'],
    // Nothing of the server's environment: no database, no keys. Fewer memory arenas keep the limit meaningful.
    env: { MALLOC_ARENA_MAX: '2', UV_THREADPOOL_SIZE: '2' },
  })
}

type Ended = Extract<PhotoProblem['code'], 'too-heavy' | 'too-slow'>

/** What a signal says. Out of memory, Node and the picture library end by several. */
const endedBy = (killedBy: NodeJS.Signals): Ended => (killedBy === 'SIGXCPU' ? 'too-slow' : 'too-heavy')

const whole = (code: number | null, chunks: readonly Buffer[]): PhotoAnswer | undefined =>
  code === 0 ? unpacked(Buffer.concat(chunks)) : undefined

const refuse = (code: Ended): PhotoAnswer => ({
  ok: false,
  problem: { code },
})

/** The first part of a stream as text, read on after each call: enough to tell what broke. */
function beginning(stream: Readable, most: number): () => string {
  let text = ''
  stream.on('data', (chunk: Buffer) => {
    if (text.length < most) text += chunk.toString('utf8').slice(0, most - text.length)
  })
  return () => text
}

/** Has one photo made anew by a process of its own, which is ended when it takes too long or more memory than allowed. */
export function inOwnProcess(bytes: Uint8Array, program: PhotoProgram, signal?: AbortSignal): Promise<PhotoAnswer> {
  return new Promise((resolve, reject) => {
    if (signal?.aborted) return reject(signal.reason)
    const child = start(program)
    const said = beginning(child.stderr, 2_000)
    const chunks: Buffer[] = []
    let size = 0
    let late = false
    const end = (): boolean => child.kill('SIGKILL')
    const clock = setTimeout(() => {
      late = true
      end()
    }, program.time ?? PHOTO_LIMITS.time)
    signal?.addEventListener('abort', end, { once: true })

    child.stdout.on('data', (chunk: Buffer) => {
      size += chunk.length
      if (size > MOST_OUTPUT) end()
      else chunks.push(chunk)
    })
    // A process that ends before it has read everything breaks this pipe; how it ended says more.
    child.stdin.on('error', () => undefined)
    child.stdin.end(bytes)
    child.on('error', reject)
    child.on('close', (code, killedBy) => {
      clearTimeout(clock)
      signal?.removeEventListener('abort', end)
      if (signal?.aborted) return reject(signal.reason)
      const answer = killedBy ? refuse(late ? 'too-slow' : endedBy(killedBy)) : whole(code, chunks)
      if (answer) return resolve(answer)
      reject(new Error(`A photo's process ended with ${code} and without an answer. It said: ${said()}`))
    })
  })
}
