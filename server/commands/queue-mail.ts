import type { Tx } from '#server/db.ts'
import type { MailKind } from '#server/mail/kinds.ts'
import { mailRenderer } from '#server/mail/mail.ts'
import { compose, type Recipient } from '#server/mail/outbox.ts'
import type { MailViews } from '#server/mail/views.ts'
import { insertMail } from '#server/queries/mails.ts'
import { organisationName } from '#server/queries/organisations.ts'
import type { Services } from '#server/services.ts'

const render = mailRenderer()

export interface QueuedMail<Kind extends MailKind> {
  readonly organisation: string
  readonly kind: Kind
  readonly to: Omit<Recipient, 'silent'>
  /** Names the event once and for all: nobody is told of it twice. */
  readonly dedupe: string
  readonly model: MailViews[Kind]
  readonly now: Date
}

/**
 * Writes a mail and puts it on the queue, both in the transaction of what it tells of.
 *
 * @returns false when nothing can be sent to that address
 */
export async function queueMail<Kind extends MailKind>(
  tx: Tx,
  { jobs, env, log }: Pick<Services, 'jobs' | 'env' | 'log'>,
  { organisation, kind, to, dedupe, model, now }: QueuedMail<Kind>,
): Promise<boolean> {
  const { name } = await organisationName(tx, organisation)
  const composed = compose(
    { organisation, kind, event: dedupe, actor: null, view: model },
    { ...to, silent: [] },
    { render, baseUrl: env.BASE_URL, organisationName: name },
  )
  if (!composed.ok) {
    log.warn({ event: 'mail-refused', organisation, kind, field: composed.field, problem: composed.problem })
    return false
  }
  const mail = await insertMail(tx, { ...composed.mail, now })
  if (mail !== undefined) await jobs.send(tx, 'send-mail', { organisation, mail })
  return true
}
