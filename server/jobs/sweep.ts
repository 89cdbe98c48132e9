import { inOrganisation, outside } from '#server/db.ts'
import { sweepPassing } from '#server/files/sweep.ts'
import { everyOrganisation } from '#server/queries/every-organisation.ts'
import { dropOldKeys, dropOldLimits, dropOldSessions, dropOldUploads } from '#server/queries/sweeping.ts'
import type { Handler } from './handler.ts'

const HOUR = 3_600_000
/** An answer is kept under its key as long as a client may reasonably send the request again. */
const KEYS = 48 * HOUR
/** Parts of uploads that nobody has come back to. */
const UPLOADS = 48 * HOUR

/** Takes away what has had its time: sessions, counts of requests, kept answers, uploads that never arrived whole. */
export const sweep: Handler<'sweep'> = async ({ db, store, clock, log }) => {
  const now = clock().getTime()
  const sessions = await outside(db, (tx) => dropOldSessions(tx, new Date(now)))
  const limits = await outside(db, (tx) => dropOldLimits(tx, now))
  let [keys, uploads] = [0, 0]
  let objects = await store.sweep(new Date(now - UPLOADS))
  for (const organisation of await everyOrganisation(db)) {
    keys += await inOrganisation(db, organisation, (tx) => dropOldKeys(tx, organisation, new Date(now - KEYS)))
    uploads += await inOrganisation(db, organisation, (tx) => dropOldUploads(tx, organisation, new Date(now)))
    objects += await sweepPassing(store, organisation, new Date(now - UPLOADS))
  }
  log.info({ event: 'swept', sessions, limits, keys, uploads, objects }, 'swept')
}
