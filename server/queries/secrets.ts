import type { Tx } from '#server/db.ts'

/** What a person signs in with. Never leaves the server. */
export interface Secrets {
  readonly email: string
  readonly name: string
  readonly password_hash: string | null
  readonly totp_secret: string | null
  readonly totp_last_step: number | null
  readonly recovery_hashes: readonly string[]
}

export interface Whom {
  readonly organisation: string
  readonly person: string
}

const of = (tx: Tx, { organisation, person }: Whom) =>
  tx('people').where({ organisation_id: organisation, person_id: person })

/** Locked until the transaction ends, so that a code cannot be used by two requests at once. */
export async function findSecrets(tx: Tx, whom: Whom): Promise<Secrets | undefined> {
  return await of(tx, whom)
    .where('active', true)
    .forUpdate()
    .first<Secrets | undefined>('email', 'name', 'password_hash', 'totp_secret', 'totp_last_step', 'recovery_hashes')
}

export async function writeSecrets(
  tx: Tx,
  whom: Whom,
  change: Partial<Pick<Secrets, 'password_hash' | 'totp_secret' | 'totp_last_step' | 'recovery_hashes'>>,
): Promise<void> {
  await of(tx, whom).update({
    ...change,
    ...(change.recovery_hashes === undefined ? {} : { recovery_hashes: [...change.recovery_hashes] }),
  })
}
