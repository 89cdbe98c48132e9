import type { Tx } from '#server/db.ts'

export interface WaitingMail {
  readonly mail_id: string
  readonly message_id: string
  readonly kind: string
  readonly to_person: string | null
  readonly to_address: string
  readonly subject: string
  readonly text_body: string
  readonly html_body: string
  readonly state: 'waiting' | 'sent' | 'kept' | 'refused'
}

/** A mail, locked: two workers with the same job go one after the other, and the second finds it sent. */
export async function lockMail(tx: Tx, organisation: string, mail: string): Promise<WaitingMail | undefined> {
  return await tx('mails')
    .where({ organisation_id: organisation, mail_id: mail })
    .forUpdate()
    .first<WaitingMail | undefined>(
      'mail_id',
      'message_id',
      'kind',
      'to_person',
      'to_address',
      'subject',
      'text_body',
      'html_body',
      'state',
    )
}

export interface Attempted {
  readonly state: WaitingMail['state']
  readonly answer: string
  readonly now: Date
}

export async function noteAttempt(
  tx: Tx,
  organisation: string,
  mail: string,
  { state, answer, now }: Attempted,
): Promise<void> {
  await tx('mails')
    .where({ organisation_id: organisation, mail_id: mail })
    .update({
      state,
      attempts: tx.raw('attempts + 1'),
      last_answer: answer.slice(0, 500),
      sent_at: state === 'sent' ? now : null,
    })
}
