import canonicalize from 'canonicalize'
import type { Tx } from '#server/db.ts'

/** One deed, as it is kept. */
export interface AuditEvent {
  readonly organisation: string
  readonly person: string | null
  readonly roles: readonly string[]
  readonly action: string
  /** `report/3f…`, `person/9a…`. */
  readonly subject: string
  readonly at: Date
  readonly request: string
  readonly address: string
  readonly details: Readonly<Record<string, unknown>>
}

/** Writes an event; the database chains it to the one before. Call it last in a transaction: it locks the chain's head. */
export async function writeAudit(tx: Tx, event: AuditEvent): Promise<void> {
  const body = canonicalize({ ...event, at: event.at.toISOString() })
  if (body === undefined) throw new TypeError('An audit event cannot be written as JSON.')
  await tx('audit_events').insert({
    organisation_id: event.organisation,
    at: event.at,
    person_id: event.person,
    action: event.action,
    subject: event.subject,
    body,
  })
}
