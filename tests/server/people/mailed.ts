import { inOrganisation } from '#server/db.ts'
import type { House } from '#tests/server/house.ts'

interface Mail {
  readonly kind: string
  readonly to_address: string
  readonly text_body: string
  readonly html_body: string
}

/** What lies in the outbox of an organisation for an address, the newest last. */
export async function mailsTo(house: House, organisation: string, address: string): Promise<Mail[]> {
  return await inOrganisation(house.services.db, organisation, (tx) =>
    tx('mails')
      .where({ organisation_id: organisation, to_address: address })
      .orderBy('created_at')
      .orderBy('mail_id')
      .select<Mail[]>('kind', 'to_address', 'text_body', 'html_body'),
  )
}

/** The token behind the sign of the fragment in a mail's link. */
export function linkIn({ text_body }: Pick<Mail, 'text_body'>): string {
  const token = /\/password#([\w-]{43})/.exec(text_body)?.[1]
  if (token === undefined) throw new Error(`No link in: ${text_body}`)
  return token
}

/** Events of an organisation about a subject, the oldest first. */
export async function eventsOf(
  house: House,
  organisation: string,
  subject: string,
): Promise<{ action: string; body: string }[]> {
  return await inOrganisation(house.services.db, organisation, (tx) =>
    tx('audit_events').where({ organisation_id: organisation, subject }).orderBy('sequence').select('action', 'body'),
  )
}
