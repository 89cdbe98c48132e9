import { inOrganisation, outside } from '#server/db.ts'
import type { Visit } from '#server/http/route.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { findByAddress } from '#server/queries/links.ts'
import { findPerson } from '#server/queries/people.ts'
import type { Services } from '#server/services.ts'
import { sendInvitation, sendReset } from './send-link.ts'

/** The answer takes at least so long, whether or not anybody has the address. */
const ANSWER_MS = 400

/**
 * Mails a link for a new password to whoever has an address, if anybody does. Who asks cannot tell: neither by the answer
 * nor by its time. At most three mails an hour go to one address.
 *
 * @returns seconds to wait, for an address of the network that asked too often; 0 otherwise
 */
export async function askForReset(services: Services, email: string, visit: Visit): Promise<number> {
  const account = email.trim().toLowerCase()
  const wait = await services.tries.take('reset-address', visit.address)
  if (wait !== undefined) return wait
  const floor = new Promise((resolve) => setTimeout(resolve, ANSWER_MS))
  if ((await services.tries.take('reset-account', account)) === undefined) await mailLinks(services, account, visit)
  await floor
  return 0
}

async function mailLinks(services: Services, account: string, { request, address }: Visit): Promise<void> {
  const holders = await outside(services.db, (tx) => findByAddress(tx, account))
  for (const { organisation_id: organisation, person_id: person } of holders)
    await inOrganisation(services.db, organisation, async (tx) => {
      const found = await findPerson(tx, organisation, person)
      if (found === undefined || !found.active) return
      const now = services.clock()
      const to = { organisation, person, name: found.name, email: found.email, now }
      // Who has not accepted the invitation yet gets it again, for there is no password to be lost.
      if (found.has_password) await sendReset(tx, services, to)
      else await sendInvitation(tx, services, to, { by: 'Your administrator', roles: found.roles })
      await writeAudit(tx, {
        organisation,
        person: null,
        roles: [],
        action: 'ask-for-reset',
        subject: `person/${person}`,
        at: now,
        request,
        address,
        details: {},
      })
    })
}
