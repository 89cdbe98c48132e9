import type { Tx } from '#server/db.ts'

/** A session as its owner sees it. */
export interface SessionRow {
  readonly sid: string
  readonly signed_in_at: Date
  readonly expires_at: Date
  readonly browser: string
  readonly address: string
}

/** Sessions of a person that have not run out, newest first. */
export async function listSessions(tx: Tx, person: string, now: Date): Promise<SessionRow[]> {
  return await tx('sessions')
    .where({ person_id: person })
    .where('expire', '>', now)
    .orderByRaw("(sess ->> 'signedInAt')::bigint desc")
    .limit(100)
    .select<SessionRow[]>(
      'sid',
      tx.raw("to_timestamp((sess ->> 'signedInAt')::bigint / 1000.0) as signed_in_at"),
      'expire as expires_at',
      tx.raw("coalesce(sess ->> 'browser', '') as browser"),
      tx.raw("coalesce(sess ->> 'address', '') as address"),
    )
}

/** Ends sessions of a person: one, all, or all but one. Returns how many. */
export async function endSessions(
  tx: Tx,
  person: string,
  which: { readonly only?: string; readonly but?: string } = {},
): Promise<number> {
  const query = tx('sessions').where({ person_id: person })
  if (which.only !== undefined) query.where('sid', which.only)
  if (which.but !== undefined) query.whereNot('sid', which.but)
  return await query.delete()
}
