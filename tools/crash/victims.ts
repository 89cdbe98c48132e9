import { type ChildProcess, spawn } from 'node:child_process'
import { openSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { startCluster } from '#tools/setup/postgres.mjs'

/** Something that is killed at a bad moment and started again by whoever watches over it. */
export interface Victim {
  readonly name: 'web' | 'worker' | 'database'
  start(): Promise<void>
  /** Ends it the way a power cut does. */
  kill(): void
}

/** A process of ours, whose output goes to a file. */
export class OwnProcess implements Victim {
  #child: ChildProcess | undefined

  constructor(
    readonly name: 'web' | 'worker',
    readonly script: string,
    readonly env: Readonly<Record<string, string>>,
    readonly log: string,
  ) {}

  start(): Promise<void> {
    const out = openSync(this.log, 'a')
    const env = { ...process.env, ...this.env }
    this.#child = spawn(process.execPath, ['--import', 'tsx', this.script], { env, stdio: ['ignore', out, out] })
    return Promise.resolve()
  }

  kill(): void {
    this.#child?.kill('SIGKILL')
  }

  /** Ends it in good order, and says with which code it went. */
  async stop(): Promise<number | null> {
    const child = this.#child
    if (child === undefined || child.exitCode !== null) return child?.exitCode ?? null
    const ended = new Promise<number | null>((resolve) => child.once('exit', resolve))
    child.kill('SIGTERM')
    return await ended
  }
}

/** The database: its postmaster is killed, and comes back on the same port with what it had committed. */
export class Database implements Victim {
  readonly name = 'database'

  constructor(
    readonly home: string,
    readonly port: number,
  ) {}

  async start(): Promise<void> {
    await startCluster(this.home, { port: this.port })
  }

  kill(): void {
    const [pid] = readFileSync(join(this.home, 'data', 'postmaster.pid'), 'utf8').split('\n')
    process.kill(Number(pid), 'SIGKILL')
  }
}
