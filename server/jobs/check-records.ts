import { randomUUID } from 'node:crypto'
import { checkAudit, checkFiles, checkNumbers, checkStates } from '#server/commands/check-documents.ts'
import { checkRegister, type Damage } from '#server/commands/check-register.ts'
import { inOrganisation } from '#server/db.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { everyOrganisation } from '#server/queries/every-organisation.ts'
import type { Services } from '#server/services.ts'
import type { Handler } from './handler.ts'

/** At most so much damage of one organisation is written into its audit trail; the count is whole. */
const MOST = 50

/** Reads everything that an organisation's record rests on, and tells what is not as it was written. */
export async function checkOrganisation(
  { db, store }: Pick<Services, 'db' | 'store'>,
  organisation: string,
): Promise<Damage[]> {
  return await inOrganisation(db, organisation, async (tx) => [
    ...(await checkRegister(tx, organisation)),
    ...(await checkNumbers(tx, organisation)),
    ...(await checkStates(tx, organisation)),
    ...(await checkFiles(tx, store, organisation)),
    ...(await checkAudit(tx, organisation)),
  ])
}

/** The nightly check of all records; damage is logged as an error and stands in the audit trail. */
export const checkRecords: Handler<'check-records'> = async (services) => {
  const { db, log, clock, jobs } = services
  for (const organisation of await everyOrganisation(db)) {
    const found = await checkOrganisation(services, organisation)
    for (const damage of found) log.error({ event: 'record-damaged', organisation, ...damage }, 'a record is damaged')
    await inOrganisation(db, organisation, async (tx) => {
      await jobs.send(tx, 'send-checkpoint', { organisation })
      await writeAudit(tx, {
        organisation,
        person: null,
        roles: [],
        action: 'check-records',
        subject: `organisation/${organisation}`,
        at: clock(),
        request: randomUUID(),
        address: 'worker',
        details: { damaged: found.length, damage: found.slice(0, MOST) },
      })
    })
    log.info({ event: 'records-checked', organisation, damaged: found.length }, 'records checked')
  }
}
