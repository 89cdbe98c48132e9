import type { Tx } from '#server/db.ts'

export async function dropOldSessions(tx: Tx, before: Date): Promise<number> {
  return await tx('sessions').where('expire', '<', before).delete()
}

/** @param before ms since 1970, as the counter keeps it */
export async function dropOldLimits(tx: Tx, before: number): Promise<number> {
  return await tx('rate_limits').where('expire', '<', before).delete()
}

export async function dropOldKeys(tx: Tx, organisation: string, before: Date): Promise<number> {
  return await tx('idempotency_keys').where('organisation_id', organisation).where('created_at', '<', before).delete()
}

export async function dropOldUploads(tx: Tx, organisation: string, before: Date): Promise<number> {
  return await tx('uploads')
    .where('organisation_id', organisation)
    .where('state', 'open')
    .where('expires_at', '<', before)
    .delete()
}
