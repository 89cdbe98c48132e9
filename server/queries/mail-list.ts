import type { Tx } from '#server/db.ts'

/** A mail as the administrator of a demonstration reads it. */
export interface MailRow {
  readonly mail_id: string
  readonly kind: string
  readonly to_address: string
  readonly subject: string
  readonly text_body: string
  readonly state: string
  readonly last_answer: string | null
  readonly created_at: Date
}

/** The newest mails of an organisation. */
export async function listMails(tx: Tx, organisation: string, limit: number): Promise<MailRow[]> {
  return await tx('mails')
    .where({ organisation_id: organisation })
    .orderBy([
      { column: 'created_at', order: 'desc' },
      { column: 'mail_id', order: 'desc' },
    ])
    .limit(limit)
    .select('mail_id', 'kind', 'to_address', 'subject', 'text_body', 'state', 'last_answer', 'created_at')
}
