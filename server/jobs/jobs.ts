import type { Knex } from 'knex'
import PgBoss from 'pg-boss'
import { plainQuery, type Tx } from '#server/db.ts'

/**
 * Every queue with its bounds. A handler may run twice (a worker that dies leaves its job to another), so each is written
 * to have its effect once. `expireInSeconds` is longer than the worst run.
 */
export const QUEUES = {
  'seal-document': { retryLimit: 8, retryDelay: 5, retryBackoff: true, expireInSeconds: 120, deadLetter: 'dead' },
  'develop-photo': { retryLimit: 5, retryDelay: 5, retryBackoff: true, expireInSeconds: 120, deadLetter: 'dead' },
  'send-mail': { retryLimit: 12, retryDelay: 20, retryBackoff: true, expireInSeconds: 60, deadLetter: 'dead' },
  'send-checkpoint': { retryLimit: 8, retryDelay: 30, retryBackoff: true, expireInSeconds: 60, deadLetter: 'dead' },
  remind: { retryLimit: 5, retryDelay: 60, retryBackoff: true, expireInSeconds: 300, deadLetter: 'dead' },
  'check-records': { retryLimit: 2, retryDelay: 60, retryBackoff: true, expireInSeconds: 3600, deadLetter: 'dead' },
  sweep: { retryLimit: 2, retryDelay: 60, retryBackoff: true, expireInSeconds: 300, deadLetter: 'dead' },
} as const

export type Queue = keyof typeof QUEUES

/** What each queue's jobs carry. */
export interface JobData {
  'seal-document': { readonly organisation: string; readonly document: string }
  'develop-photo': { readonly organisation: string; readonly upload: string }
  'send-mail': { readonly organisation: string; readonly mail: string }
  'send-checkpoint': { readonly organisation: string }
  remind: Record<string, never>
  'check-records': Record<string, never>
  sweep: Record<string, never>
}

/** Puts jobs on their queues, inside the transaction that they belong to. */
export interface Jobs {
  send<Q extends Queue>(tx: Tx, queue: Q, data: JobData[Q], options?: { readonly key?: string }): Promise<void>
}

/** Lets pg-boss speak through a connection of ours: with a transaction, its statements are part of it. */
export const through = (db: Knex | Tx): PgBoss.Db => ({ executeSql: (text, values) => plainQuery(db, text, values) })

/** pg-boss on our pool. It makes and alters nothing: the migrations did. */
export function openBoss(db: Knex, { supervise }: { readonly supervise: boolean }): PgBoss {
  return new PgBoss({ db: through(db), schema: 'pgboss', migrate: false, supervise, schedule: supervise })
}

export function jobsThrough(boss: PgBoss): Jobs {
  return {
    async send(tx, queue, data, { key } = {}) {
      const { retryLimit, retryDelay, retryBackoff, expireInSeconds, deadLetter } = QUEUES[queue]
      const options = { retryLimit, retryDelay, retryBackoff, expireInSeconds, deadLetter, db: through(tx) }
      await boss.send(queue, data, key === undefined ? options : { ...options, singletonKey: key })
    },
  }
}
