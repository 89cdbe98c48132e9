import type { Tx } from '#server/db.ts'

export interface EventRow {
  readonly sequence: number
  readonly at: Date
  readonly person_id: string | null
  readonly person_name: string | null
  readonly action: string
  readonly subject: string
  readonly body: string
  readonly hash: string
}

export interface EventWish {
  readonly organisation: string
  readonly action?: string
  readonly person?: string
  readonly subjects?: readonly string[]
  readonly from?: string
  readonly to?: string
  /** Only events before this place. */
  readonly before?: number
  readonly limit: number
}

/** Events, the newest first; one more than asked for. */
export async function listEvents(
  tx: Tx,
  { organisation, action, person, subjects, from, to, before, limit }: EventWish,
): Promise<EventRow[]> {
  const query = tx('audit_events as e')
    .leftJoin('people as p', (on) =>
      on.on('p.organisation_id', 'e.organisation_id').andOn('p.person_id', 'e.person_id'),
    )
    .where('e.organisation_id', organisation)
    .orderBy('e.sequence', 'desc')
    .limit(limit + 1)
  if (action !== undefined) query.where('e.action', action)
  if (person !== undefined) query.where('e.person_id', person)
  if (subjects !== undefined) query.whereIn('e.subject', [...subjects])
  if (from !== undefined) query.where('e.at', '>=', from)
  if (to !== undefined) query.where('e.at', '<', to)
  if (before !== undefined) query.where('e.sequence', '<', before)
  return await query.select<EventRow[]>(
    'e.sequence',
    'e.at',
    'e.person_id',
    'p.name as person_name',
    'e.action',
    'e.subject',
    'e.body',
    'e.hash',
  )
}

export type LinkRow = Omit<EventRow, 'person_name'>

/** A stretch of the chain in its order, from behind a place. */
export async function chainAfter(tx: Tx, organisation: string, after: number, limit: number): Promise<LinkRow[]> {
  return await tx('audit_events')
    .where('organisation_id', organisation)
    .where('sequence', '>', after)
    .orderBy('sequence')
    .limit(limit)
    .select<LinkRow[]>('sequence', 'at', 'person_id', 'action', 'subject', 'body', 'hash')
}

export interface AuditHead {
  readonly last: number
  readonly hash: string
}

export async function auditHead(tx: Tx, organisation: string): Promise<AuditHead> {
  const row = await tx('audit_heads')
    .where({ organisation_id: organisation })
    .first<AuditHead | undefined>('last', 'hash')
  return row ?? { last: 0, hash: '' }
}
