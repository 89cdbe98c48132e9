import type { Tx } from '#server/db.ts'

export interface AuditLink {
  readonly sequence: number
  readonly body: string
  readonly hash: string
}

/** A stretch of an organisation's audit events after a place, in their order. */
export async function listAudit(tx: Tx, organisation: string, after: number, limit: number): Promise<AuditLink[]> {
  return await tx('audit_events')
    .where('organisation_id', organisation)
    .where('sequence', '>', after)
    .orderBy('sequence')
    .limit(limit)
    .select<AuditLink[]>('sequence', 'body', 'hash')
}
