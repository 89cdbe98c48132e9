import { createHash } from 'node:crypto'
import type { Tx } from '#server/db.ts'
import { freshToken } from '#server/env.ts'
import { insertLink, type Purpose } from '#server/queries/links.ts'
import { insertMail } from '#server/queries/mails.ts'
import { organisationName } from '#server/queries/organisations.ts'
import type { Services } from '#server/services.ts'
import { escapeHtml, oneLine } from './mail-text.ts'

export const linkHash = (token: string): string => createHash('sha256').update(token).digest('hex')

/** Long enough to reach somebody on site, short enough not to lie around. */
const LIFETIME_MS: Readonly<Record<Purpose, number>> = { invitation: 7 * 86_400_000, reset: 60 * 60_000 }

const SUBJECTS: Readonly<Record<Purpose, (organisation: string) => string>> = {
  invitation: (organisation) => `${organisation} invites you to its reports`,
  reset: () => 'A new password',
}

const LINES: Readonly<Record<Purpose, (organisation: string) => readonly string[]>> = {
  invitation: (organisation) => [
    `${organisation} keeps its test reports with Skerry and has made an account for you.`,
    'Choose a password at this address within seven days. The address works once.',
  ],
  reset: () => [
    'Somebody, probably you, asked for a new password.',
    'Choose it at this address within an hour. The address works once. If you asked for nothing, there is nothing to do: the old password stays.',
  ],
}

export interface LinkTo {
  readonly organisation: string
  readonly person: string
  readonly email: string
  readonly purpose: Purpose
}

/** Mails a link that lets somebody choose a password. The token is in the mail only. */
export async function sendLink(
  tx: Tx,
  { env, jobs }: Pick<Services, 'env' | 'jobs'>,
  to: LinkTo,
  now: Date,
): Promise<void> {
  const token = freshToken()
  const hash = linkHash(token)
  const { organisation, person, purpose } = to
  await insertLink(tx, {
    organisation,
    person,
    purpose,
    hash,
    expires: new Date(now.getTime() + LIFETIME_MS[purpose]),
    now,
  })
  const { name } = await organisationName(tx, organisation)
  // Behind the sign of a fragment the token is sent to no server and stands in no log.
  const address = `${env.BASE_URL}/password#${token}`
  const lines = LINES[purpose](name)
  const mail = await insertMail(tx, {
    organisation,
    dedupeKey: `link/${hash}`,
    messageId: `<${hash.slice(0, 40)}@${new URL(env.BASE_URL).hostname}>`,
    kind: purpose,
    to: { person, address: to.email },
    subject: oneLine(SUBJECTS[purpose](name)),
    text: [...lines, '', address, ''].join('\n'),
    html: [
      ...lines.map((line) => `<p>${escapeHtml(line)}</p>`),
      `<p><a href="${escapeHtml(address)}">${escapeHtml(address)}</a></p>`,
    ].join('\n'),
    now,
  })
  if (mail !== undefined) await jobs.send(tx, 'send-mail', { organisation, mail })
}
