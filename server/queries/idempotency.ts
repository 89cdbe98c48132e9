import type { Tx } from '#server/db.ts'

export interface KeptAnswer {
  readonly request_sha256: string
  readonly status: number
  readonly headers: Readonly<Record<string, string>>
  readonly body: string
}

export interface KeyOwner {
  readonly organisation: string
  readonly person: string
  readonly key: string
}

/** Takes a key for the length of the transaction; false when another request holds it. */
export async function takeKey(tx: Tx, { organisation, person, key }: KeyOwner): Promise<boolean> {
  const { rows } = await tx.raw<{ rows: { taken: boolean }[] }>(
    'select pg_try_advisory_xact_lock(hashtextextended(?, 0)) as taken',
    [`${organisation} ${person} ${key}`],
  )
  return rows[0]?.taken === true
}

export async function findAnswer(tx: Tx, { organisation, person, key }: KeyOwner): Promise<KeptAnswer | undefined> {
  return await tx('idempotency_keys')
    .where({ organisation_id: organisation, person_id: person, key })
    .first<KeptAnswer | undefined>('request_sha256', 'status', 'headers', 'body')
}

export async function keepAnswer(tx: Tx, { organisation, person, key }: KeyOwner, answer: KeptAnswer): Promise<void> {
  await tx('idempotency_keys').insert({
    organisation_id: organisation,
    person_id: person,
    key,
    ...answer,
    headers: JSON.stringify(answer.headers),
  })
}
