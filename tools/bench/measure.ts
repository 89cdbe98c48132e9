import { spawn } from 'node:child_process'
import { readFileSync } from 'node:fs'

/** One run of a command: wall time, and the most memory that it and its threads held at once. */
export interface Run {
  readonly milliseconds: number
  readonly megabytes: number
}

/** A command to measure, and the exit codes that count as done. */
export interface Contestant {
  readonly name: string
  readonly command: readonly string[]
  readonly codes?: readonly number[]
}

const PEAK = /VmHWM:\s+(\d+) kB/

function peakOf(pid: number): number {
  try {
    return Number(PEAK.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1] ?? 0) / 1024
  } catch (error) {
    if (error instanceof Error && 'code' in error && (error.code === 'ENOENT' || error.code === 'ESRCH')) return 0
    throw error
  }
}

/** Runs a command once. `watchMemory` reads its peak every few milliseconds, which costs a little time itself. */
export function once({ name, command, codes = [0, 1] }: Contestant, watchMemory = false): Promise<Run> {
  const [program = '', ...args] = command
  return new Promise((resolve, reject) => {
    const start = performance.now()
    const child = spawn(program, args, { stdio: ['ignore', 'ignore', 'ignore'] })
    let megabytes = 0
    const watch = watchMemory
      ? setInterval(() => {
          megabytes = Math.max(megabytes, child.pid === undefined ? 0 : peakOf(child.pid))
        }, 5)
      : undefined
    child.on('error', reject)
    child.on('close', (code) => {
      clearInterval(watch)
      if (code === null || !codes.includes(code)) reject(new Error(`${name} ended with ${code}`))
      else resolve({ milliseconds: performance.now() - start, megabytes })
    })
  })
}

/** The middle value of a list. */
export function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b)
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN
}

/** Medians of several contestants, run in turns in changing order so that a slow moment of the machine hits them all. */
export async function compare(
  contestants: readonly Contestant[],
  rounds: number,
): Promise<ReadonlyMap<string, number>> {
  const times = new Map<string, number[]>(contestants.map(({ name }) => [name, []]))
  for (const contestant of contestants) await once(contestant)
  for (let round = 0; round < rounds; round += 1) {
    const order = [
      ...contestants.slice(round % contestants.length),
      ...contestants.slice(0, round % contestants.length),
    ]
    for (const contestant of order) times.get(contestant.name)?.push((await once(contestant)).milliseconds)
  }
  return new Map([...times].map(([name, list]) => [name, median(list)]))
}
