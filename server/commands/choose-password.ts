import { passwordProblem } from '#core/policy/password.ts'
import { inOrganisation, outside, type Tx } from '#server/db.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import type { Visit } from '#server/http/route.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { findLink, type LinkHolder, useLink } from '#server/queries/links.ts'
import { organisationName } from '#server/queries/organisations.ts'
import { findSecrets, type Secrets, type Whom, writeSecrets } from '#server/queries/secrets.ts'
import { endSessions } from '#server/queries/sessions.ts'
import type { Services } from '#server/services.ts'
import { hashPassword } from './passwords.ts'
import { linkHash, sendNotice } from './send-link.ts'

/** Whom a link belongs to, when it is still good. */
export interface LinkOwner {
  readonly holder: LinkHolder
  readonly secrets: Secrets
  readonly organisation: string
}

/** Judges a password that somebody chooses; a refusal says why. */
export function judged(password: string, secrets: Secrets, organisation: string): Refused | undefined {
  const message = passwordProblem(password, {
    words: [secrets.name, secrets.email, organisation],
    secondFactor: secrets.totp_secret !== null,
  })
  if (message === undefined) return undefined
  return refuse('bad-request', message, { errors: [{ pointer: '/new_password', message }] })
}

export async function linkOwner(services: Services, link: string): Promise<LinkOwner | undefined> {
  const holder = await outside(services.db, (tx) => findLink(tx, linkHash(link), services.clock()))
  if (holder === undefined) return undefined
  return await inOrganisation(services.db, holder.organisation_id, async (tx) => {
    const secrets = await findSecrets(tx, whomOf(holder))
    if (secrets === undefined) return undefined
    return { holder, secrets, organisation: (await organisationName(tx, holder.organisation_id)).name }
  })
}

const whomOf = ({ organisation_id, person_id }: LinkHolder): Whom => ({
  organisation: organisation_id,
  person: person_id,
})

/** Chooses a password by the link of a mail: the link is used up and every session ends. A second factor stays. */
export async function choosePassword(
  services: Services,
  { link, new_password }: { readonly link: string; readonly new_password: string },
  visit: Visit,
): Promise<Refused | undefined> {
  const owner = await linkOwner(services, link)
  if (owner === undefined) return refuse('gone')
  const weak = judged(new_password, owner.secrets, owner.organisation)
  if (weak !== undefined) return weak
  const password_hash = await hashPassword(new_password)
  return await inOrganisation(services.db, owner.holder.organisation_id, (tx) =>
    write(tx, services, owner, { hash: linkHash(link), password_hash }, visit),
  )
}

async function write(
  tx: Tx,
  services: Services,
  { holder, secrets }: LinkOwner,
  { hash, password_hash }: { readonly hash: string; readonly password_hash: string },
  { request, address }: Visit,
): Promise<Refused | undefined> {
  const whom = whomOf(holder)
  const now = services.clock()
  const stillOpen = (await findSecrets(tx, whom)) !== undefined
  if (!(stillOpen && (await useLink(tx, whom.organisation, hash, now)))) return refuse('gone')
  await writeSecrets(tx, whom, { password_hash })
  await endSessions(tx, whom.person)
  if (holder.purpose === 'reset')
    await sendNotice(
      tx,
      services,
      { ...whom, name: secrets.name, email: secrets.email, now },
      'The password was changed',
    )
  await writeAudit(tx, {
    ...whom,
    roles: [],
    action: 'choose-password',
    subject: `person/${whom.person}`,
    at: now,
    request,
    address,
    details: { purpose: holder.purpose },
  })
  return undefined
}
