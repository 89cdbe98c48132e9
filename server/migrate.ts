import type { Knex } from 'knex'
import PgBoss from 'pg-boss'
import { APP_ROLE } from './db.ts'
import { QUEUES, type Queue, through } from './jobs/jobs.ts'

/** Where pg-boss puts what its timetable calls for; it would make it itself, but the running server may make nothing. */
const TIMETABLE = '__pgboss__send-it'

/** Queue names in the order in which they must be made: a queue's dead letters need somewhere to go. */
const QUEUE_NAMES = [TIMETABLE, 'dead', ...(Object.keys(QUEUES) as Queue[])] as const

/**
 * Brings a database to this version: our migrations, the job queue's own tables, and its queues.
 *
 * @param owner a connection of the role that owns the database
 */
export async function migrate(owner: Knex): Promise<void> {
  await owner.migrate.latest()
  const boss = new PgBoss({ db: through(owner), schema: 'pgboss', migrate: true, supervise: false, schedule: false })
  boss.on('error', () => {
    // start() below rejects with the same error; without a listener the process would end before it is told.
  })
  await boss.start()
  try {
    const existing = new Set((await boss.getQueues()).map(({ name }) => name))
    for (const name of QUEUE_NAMES) if (!existing.has(name)) await boss.createQueue(name)
    await owner.raw(`
      grant select on knex_migrations to ${APP_ROLE};
      grant usage on schema pgboss to ${APP_ROLE};
      grant select, insert, update, delete on all tables in schema pgboss to ${APP_ROLE};
      grant execute on all functions in schema pgboss to ${APP_ROLE};
    `)
  } finally {
    await boss.stop({ graceful: false, wait: false })
  }
}

/** Whether every migration that this version knows has been applied, and none that it does not know. */
export async function isMigrated(db: Knex, known: readonly string[]): Promise<boolean> {
  const rows = await db<{ name: string }>('knex_migrations').select('name')
  return rows.length === known.length && rows.every(({ name }) => known.includes(name))
}
