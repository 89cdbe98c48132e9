import type { Delivery, MailSender } from './delivery.ts'
import type { OutboxMail } from './outbox.ts'
import { unsubscribeHeaders } from './unsubscribe.ts'

/** A mail in the outbox, with where it stands. */
export interface StoredMail extends OutboxMail {
  readonly id: string
  readonly state: 'waiting' | 'sent' | 'kept' | 'refused'
}

/** Where the outbox is kept. */
export interface MailLog {
  find(organisation: string, id: string): Promise<StoredMail | undefined>
  /** Notes an attempt. `later` leaves the mail waiting. */
  note(organisation: string, id: string, delivery: Delivery, at: Date): Promise<void>
}

export interface DeliverOptions {
  readonly log: MailLog
  readonly sender: MailSender
  readonly now: () => Date
  readonly baseUrl: string
  /** Signs the links that switch a kind of mail off. */
  readonly key: Uint8Array
}

/**
 * Sends one mail of the outbox, and notes what became of it. A mail that is no longer waiting is left alone, so the job
 * may run twice; one whose process died between sending and noting goes out again under the same Message-ID. The caller
 * lets the job fail on `later`, so that its queue tries again.
 */
export async function deliver(
  { log, sender, now, baseUrl, key }: DeliverOptions,
  organisation: string,
  id: string,
): Promise<Delivery | { readonly outcome: 'nothing to do' }> {
  const mail = await log.find(organisation, id)
  if (mail?.state !== 'waiting') return { outcome: 'nothing to do' }
  const { messageId, subject, text, html, to, kind } = mail
  const headers = unsubscribeHeaders({ organisation, person: to.person, kind }, { baseUrl, key })
  const delivery = await sender.send({ messageId, subject, text, html, to: to.address, headers })
  await log.note(organisation, id, delivery, now())
  return delivery
}
