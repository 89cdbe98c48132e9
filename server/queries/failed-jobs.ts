import type { Tx } from '#server/db.ts'

/** A job that was tried as often as its queue allows. */
export interface FailedJob {
  readonly id: string
  readonly queue: string
  readonly data: unknown
  readonly output: unknown
  readonly retry_count: number
  readonly created_on: Date
  readonly completed_on: Date | null
}

/** At most so many are listed. */
const MOST = 200

/** An organisation's jobs that were given up. The queue's tables know no row-level security: the condition is the fence. */
export async function listFailed(tx: Tx, organisation: string): Promise<FailedJob[]> {
  return await tx('pgboss.job')
    .where('state', 'failed')
    .whereRaw(`data ->> 'organisation' = ?`, [organisation])
    .whereNot('name', 'dead')
    .orderBy([{ column: 'completed_on', order: 'desc' }, 'id'])
    .limit(MOST)
    .select<FailedJob[]>('id', 'name as queue', 'data', 'output', 'retry_count', 'created_on', 'completed_on')
}

/** Puts a job that was given up back on its queue, to be tried once more at once; false when there is none. */
export async function retryFailed(tx: Tx, organisation: string, job: string): Promise<boolean> {
  const changed = await tx('pgboss.job')
    .where({ id: job, state: 'failed' })
    .whereRaw(`data ->> 'organisation' = ?`, [organisation])
    .whereNot('name', 'dead')
    .update({
      state: 'retry',
      retry_limit: tx.raw('retry_limit + 1'),
      start_after: tx.raw('now()'),
      completed_on: null,
    })
  return changed === 1
}

/** How many jobs of an organisation wait or run, by queue. */
export async function countWaiting(tx: Tx, organisation: string): Promise<{ queue: string; count: number }[]> {
  return await tx('pgboss.job')
    .whereIn('state', ['created', 'retry', 'active'])
    .whereRaw(`data ->> 'organisation' = ?`, [organisation])
    .whereNot('name', 'dead')
    .groupBy('name')
    .orderBy('name')
    .select(tx.raw('name as queue'), tx.raw('count(*)::integer as count'))
}
