import type PgBoss from 'pg-boss'
import { developPhoto, photographs } from '#server/commands/develop-photo.ts'
import type { Services } from '#server/services.ts'
import { checkRecords } from './check-records.ts'
import type { Handler } from './handler.ts'
import { type JobData, QUEUES, type Queue } from './jobs.ts'
import { remind } from './remind.ts'
import { sealDocument } from './seal-document.ts'
import { sendCheckpoint } from './send-checkpoint.ts'
import { sendMail } from './send-mail.ts'
import { sweep } from './sweep.ts'

export type Handlers = { readonly [Q in Queue]?: Handler<Q> }

/** What does each queue's jobs. */
export function handlers(): Handlers {
  const lab = photographs()
  return {
    'seal-document': sealDocument,
    'develop-photo': (services, data) => developPhoto(services, lab, data),
    'send-mail': sendMail,
    'send-checkpoint': sendCheckpoint,
    'check-records': checkRecords,
    remind,
    sweep,
  }
}

/** When the clock calls, in UTC: minute, hour, day of the month, month, day of the week. */
const TIMETABLE: Readonly<Partial<Record<Queue, string>>> = {
  'check-records': '15 2 * * *',
  remind: '30 4 * * *',
  sweep: '*/15 * * * *',
}

/** Seconds between looks at a queue. */
const LOOK = 1

/** Lets a process do jobs until pg-boss is stopped; it takes one job of each queue at a time. */
export async function work(services: Services, boss: PgBoss, doers: Handlers): Promise<void> {
  const take = async <Q extends Queue>(queue: Q): Promise<void> => {
    const handler = doers[queue]
    if (handler === undefined) return
    await boss.work<JobData[Q]>(queue, { batchSize: 1, pollingIntervalSeconds: LOOK }, async (jobs) => {
      for (const { id, data } of jobs) {
        services.log.info({ event: 'job', queue, job: id }, 'job taken')
        await handler(services, data)
      }
    })
  }
  for (const queue of Object.keys(QUEUES) as Queue[]) await take(queue)
  await boss.work('dead', { batchSize: 20, pollingIntervalSeconds: LOOK }, async (jobs) => {
    // The job itself stays on its queue as failed, where the administrator finds it; this is for whoever watches the log.
    for (const { id, data } of jobs) services.log.error({ event: 'dead-letter', job: id, data }, 'a job was given up')
  })
  for (const [queue, cron] of Object.entries(TIMETABLE)) await boss.schedule(queue, cron, {}, { tz: 'UTC' })
}
