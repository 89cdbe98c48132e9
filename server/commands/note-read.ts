import { ISSUED } from '#core/policy/states.ts'
import { inOrganisation } from '#server/db.ts'
import type { Call } from '#server/http/route.ts'
import { writeAudit } from '#server/queries/audit.ts'
import type { Report } from '#server/queries/reports.ts'

/** A read of an issued report leaves an event, in a transaction of its own: the reading one may write nothing. */
export async function noteRead(
  { actor, services, visit, now, subject }: Omit<Call<unknown, unknown, Report>, 'tx'>,
  what: string,
): Promise<void> {
  if (!ISSUED.includes(subject.state)) return
  await inOrganisation(services.db, actor.organisation, (tx) =>
    writeAudit(tx, {
      organisation: actor.organisation,
      person: actor.person,
      roles: actor.roles,
      action: 'read-issued',
      subject: `report/${subject.report_id}`,
      at: now,
      request: visit.request,
      address: visit.address,
      details: { what, number: subject.number },
    }),
  )
}
