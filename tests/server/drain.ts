import { outside } from '#server/db.ts'
import type { JobData, Queue } from '#server/jobs/jobs.ts'
import { type Handlers, handlers } from '#server/jobs/work.ts'
import type { Services } from '#server/services.ts'

interface Waiting {
  readonly id: string
  readonly name: Queue
  readonly data: JobData[Queue]
}

async function once(services: Services, doers: Handlers): Promise<number> {
  const jobs: Waiting[] = await outside(services.db, (tx) =>
    tx('pgboss.job')
      .whereIn('state', ['created', 'retry'])
      .whereIn('name', Object.keys(doers))
      .orderBy('created_on')
      .select('id', 'name', 'data'),
  )
  for (const { id, name, data } of jobs) {
    await doers[name]?.(services, data as never)
    await outside(services.db, (tx) =>
      tx('pgboss.job')
        .where({ id })
        .update({ state: 'completed', completed_on: tx.raw('now()') }),
    )
  }
  return jobs.length
}

/** Does every job that waits, and those that they call for, as a worker would; gives back how many there were. */
export async function drain(services: Services): Promise<number> {
  const doers = handlers()
  let count = 0
  for (let done = await once(services, doers); done > 0; done = await once(services, doers)) count += done
  return count
}
