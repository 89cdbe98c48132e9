import type { Tx } from '#server/db.ts'
import { type Secrets, type Whom, writeSecrets } from '#server/queries/secrets.ts'
import { recoveryHash, verifyCode } from './second-factor.ts'

/** Takes a code of the authenticator, or one of the recovery codes; either counts once. */
export async function takeCode(tx: Tx, whom: Whom, secrets: Secrets, code: string, now: Date): Promise<boolean> {
  if (secrets.totp_secret === null) return true
  const step = verifyCode(secrets.totp_secret, code, now, secrets.totp_last_step)
  if (step !== undefined) {
    await writeSecrets(tx, whom, { totp_last_step: step })
    return true
  }
  const hash = recoveryHash(code)
  if (code === '' || !secrets.recovery_hashes.includes(hash)) return false
  await writeSecrets(tx, whom, { recovery_hashes: secrets.recovery_hashes.filter((known) => known !== hash) })
  return true
}
