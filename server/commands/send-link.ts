import { createHash } from 'node:crypto'
import type { Tx } from '#server/db.ts'
import { freshToken } from '#server/env.ts'
import { insertLink, type Purpose } from '#server/queries/links.ts'
import type { Services } from '#server/services.ts'
import { queueMail } from './queue-mail.ts'

export const linkHash = (token: string): string => createHash('sha256').update(token).digest('hex')

/** Long enough to reach somebody on site, short enough not to lie around. */
const LIFETIME_MS: Readonly<Record<Purpose, number>> = { invitation: 7 * 86_400_000, reset: 60 * 60_000 }

export interface LinkTo {
  readonly organisation: string
  readonly person: string
  readonly name: string
  readonly email: string
  readonly now: Date
}

type Outbox = Pick<Services, 'env' | 'jobs' | 'log'>

interface MadeLink {
  readonly hash: string
  readonly until: Date
  readonly page: `/${string}`
}

async function makeLink(tx: Tx, { organisation, person, now }: LinkTo, purpose: Purpose): Promise<MadeLink> {
  const token = freshToken()
  const hash = linkHash(token)
  const until = new Date(now.getTime() + LIFETIME_MS[purpose])
  await insertLink(tx, { organisation, person, purpose, hash, expires: until, now })
  // Behind the sign of a fragment the token is sent to no server and stands in no log.
  return { hash, until, page: `/password#${token}` }
}

const recipient = ({ person, name, email }: LinkTo) => ({ person, name, address: email })

/** Mails a link by which somebody who was given an account chooses a password; false when the address takes no mail. */
export async function sendInvitation(
  tx: Tx,
  services: Outbox,
  to: LinkTo,
  { by, roles }: { readonly by: string; readonly roles: readonly string[] },
): Promise<boolean> {
  const { hash, until, page } = await makeLink(tx, to, 'invitation')
  return await queueMail(tx, services, {
    organisation: to.organisation,
    kind: 'invitation',
    to: recipient(to),
    dedupe: `link/${hash}`,
    model: { by, roles, until, page },
    now: to.now,
  })
}

/** Mails a link for a new password. */
export async function sendReset(tx: Tx, services: Outbox, to: LinkTo): Promise<boolean> {
  const { hash, until, page } = await makeLink(tx, to, 'reset')
  return await queueMail(tx, services, {
    organisation: to.organisation,
    kind: 'password reset',
    to: recipient(to),
    dedupe: `link/${hash}`,
    model: { until, page },
    now: to.now,
  })
}

/** Tells a person of a change to the account, at the address that was good until then. */
export async function sendNotice(tx: Tx, services: Outbox, to: LinkTo, what: string): Promise<void> {
  await queueMail(tx, services, {
    organisation: to.organisation,
    kind: 'account notice',
    to: recipient(to),
    dedupe: `notice/${freshToken()}`,
    model: { what, at: to.now, page: '/account' },
    now: to.now,
  })
}
