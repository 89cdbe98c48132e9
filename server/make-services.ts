import { readdirSync } from 'node:fs'
import type { Knex } from 'knex'
import type PgBoss from 'pg-boss'
import pino, { type Logger } from 'pino'
import { openDatabase } from './db.ts'
import type { Env } from './env.ts'
import { openStore } from './files/open-store.ts'
import { jobsThrough, openBoss } from './jobs/jobs.ts'
import { isMigrated } from './migrate.ts'
import { openSigner, type Signer } from './seal/signer.ts'
import type { Services } from './services.ts'
import { Tries } from './tries.ts'

/** Services with what must be closed at the end. */
export interface OpenServices {
  readonly services: Services
  readonly boss: PgBoss
  readonly close: () => Promise<void>
}

const MIGRATIONS = new URL('../migrations', import.meta.url)

function makeLog(env: Env): Logger {
  return pino({
    level: env.LOG_LEVEL,
    timestamp: pino.stdTimeFunctions.isoTime,
    formatters: { level: (level) => ({ level }) },
    redact: ['*.password', '*.token', '*.cookie', '*.authorization', 'err.config', 'err.request'],
  })
}

async function waitingFor(db: Knex, known: readonly string[]): Promise<string[]> {
  try {
    return (await isMigrated(db, known)) ? [] : ['migrations']
  } catch {
    // Whatever keeps the question from being answered is what the caller waits for.
    return ['database']
  }
}

/** Opens the key once; a failure is tried again by whoever needs it next. */
function signerOf(env: Env, clock: () => Date): () => Promise<Signer> {
  let opened: Promise<Signer> | undefined
  return async () => {
    opened ??= openSigner(env.KEY_DIR, new URL(env.BASE_URL).hostname, clock())
    try {
      return await opened
    } catch (error) {
      opened = undefined
      throw error
    }
  }
}

/** Opens what a process of the server needs: the web and the worker differ in nothing but what they do with it. */
export function openServices(
  env: Env,
  { name, supervise, clock }: { readonly name: string; readonly supervise: boolean; readonly clock: () => Date },
): OpenServices {
  const log = makeLog(env)
  const db = openDatabase({ url: env.DATABASE_URL, pool: env.DATABASE_POOL, name })
  const boss = openBoss(db, { supervise })
  boss.on('error', (error) => log.error({ event: 'queue', err: error }, 'the job queue failed'))
  const known = readdirSync(MIGRATIONS).filter((file) => file.endsWith('.ts'))
  let stopping = false
  const services: Services = {
    env,
    db,
    log,
    jobs: jobsThrough(boss),
    store: openStore(env),
    signer: signerOf(env, clock),
    tries: new Tries(db),
    clock,
    ready: async () => (stopping ? ['stopping'] : await waitingFor(db, known)),
  }
  return {
    services,
    boss,
    async close() {
      stopping = true
      await boss.stop({ graceful: true, wait: true, timeout: 20_000 })
      await db.destroy()
    },
  }
}
