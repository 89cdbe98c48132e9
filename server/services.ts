import type { Knex } from 'knex'
import type { Logger } from 'pino'
import type { Env } from './env.ts'
import type { ObjectStore } from './files/store.ts'
import type { Jobs } from './jobs/jobs.ts'
import type { Signer } from './seal/signer.ts'
import type { Tries } from './tries.ts'

/** Everything that routes and jobs lean on besides their transaction; made by `main.ts` and by tests. */
export interface Services {
  readonly env: Env
  readonly db: Knex
  readonly log: Logger
  readonly jobs: Jobs
  /** Photos, attachments and issued reports, by the hash of their bytes. */
  readonly store: ObjectStore
  /** The key that signs checkpoints and seals; opened when it is first needed. */
  readonly signer: () => Promise<Signer>
  /** Counts wrong passwords and the like. */
  readonly tries: Tries
  readonly clock: () => Date
  /** What the process still waits for before it can work; empty when it is ready. */
  readonly ready: () => Promise<readonly string[]>
}
