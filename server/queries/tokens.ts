import type { Tx } from '#server/db.ts'

export interface TokenRow {
  readonly token_id: string
  readonly name: string
  readonly hint: string
  readonly scopes: readonly string[]
  readonly expires_at: Date
  readonly revoked_at: Date | null
  readonly last_used_at: Date | null
  readonly created_at: Date
}

const COLUMNS = [
  'token_id',
  'name',
  'hint',
  'scopes',
  'expires_at',
  'revoked_at',
  'last_used_at',
  'created_at',
] as const

export interface NewToken {
  readonly organisation: string
  readonly person: string
  readonly name: string
  readonly hash: string
  readonly hint: string
  readonly scopes: readonly string[]
  readonly expires: Date
  readonly now: Date
}

export async function insertToken(tx: Tx, token: NewToken): Promise<TokenRow> {
  const [row] = await tx('tokens')
    .insert({
      organisation_id: token.organisation,
      person_id: token.person,
      name: token.name,
      token_hash: token.hash,
      hint: token.hint,
      scopes: [...token.scopes],
      expires_at: token.expires,
      created_at: token.now,
    })
    .returning<TokenRow[]>([...COLUMNS])
  if (row === undefined) throw new Error('A new token has no row.')
  return row
}

export async function listTokens(tx: Tx, organisation: string, person: string): Promise<TokenRow[]> {
  return await tx('tokens')
    .where({ organisation_id: organisation, person_id: person })
    .orderBy('created_at', 'desc')
    .limit(100)
    .select(...COLUMNS)
}

/** Whether there was such a token of this person that was still good. */
export async function revokeToken(
  tx: Tx,
  organisation: string,
  person: string,
  token: string,
  now: Date,
): Promise<boolean> {
  const changed = await tx('tokens')
    .where({ organisation_id: organisation, person_id: person, token_id: token, revoked_at: null })
    .update({ revoked_at: now })
  return changed === 1
}

/** Revokes all tokens of a person. */
export async function revokeTokens(tx: Tx, organisation: string, person: string, now: Date): Promise<number> {
  return await tx('tokens')
    .where({ organisation_id: organisation, person_id: person, revoked_at: null })
    .update({ revoked_at: now })
}

/** Notes that a token was used, at most once a minute. */
export async function noteTokenUse(tx: Tx, organisation: string, token: string, now: Date): Promise<void> {
  await tx('tokens')
    .where({ organisation_id: organisation, token_id: token })
    .where(
      (unused) => void unused.whereNull('last_used_at').orWhere('last_used_at', '<', new Date(now.getTime() - 60_000)),
    )
    .update({ last_used_at: now })
}
