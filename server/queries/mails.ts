import type { Tx } from '#server/db.ts'

export interface NewMail {
  readonly organisation: string
  /** One for each event and person: the same again is not written a second time. */
  readonly dedupeKey: string
  readonly messageId: string
  readonly kind: string
  readonly to: { readonly person: string | null; readonly address: string }
  readonly subject: string
  readonly text: string
  readonly html: string
  readonly now: Date
}

/** Writes a mail that is to be sent; undefined when the event was told to that person before. */
export async function insertMail(tx: Tx, mail: NewMail): Promise<string | undefined> {
  const [row] = await tx('mails')
    .insert({
      organisation_id: mail.organisation,
      dedupe_key: mail.dedupeKey,
      message_id: mail.messageId,
      kind: mail.kind,
      to_address: mail.to.address,
      to_person: mail.to.person,
      subject: mail.subject,
      text_body: mail.text,
      html_body: mail.html,
      created_at: mail.now,
    })
    .onConflict(['organisation_id', 'dedupe_key'])
    .ignore()
    .returning<{ mail_id: string }[]>('mail_id')
  return row?.mail_id
}
