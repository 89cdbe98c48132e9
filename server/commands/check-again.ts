import { type Refused, refuse } from '#server/http/problems.ts'
import type { Call } from '#server/http/route.ts'
import { verifyPassword } from './passwords.ts'
import { verifyCode } from './second-factor.ts'

interface Secrets {
  password_hash: string | null
  totp_secret: string | null
  totp_last_step: number | null
}

const textOf = (body: unknown, name: string): string | undefined => {
  if (typeof body !== 'object' || body === null || !(name in body)) return undefined
  const value: unknown = Object.getOwnPropertyDescriptor(body, name)?.value
  return typeof value === 'string' ? value : undefined
}

/**
 * Asks for the password again, and for the code where there is a second factor: before steps that count in law, and
 * before changes to how a person signs in.
 */
export async function checkAgain({
  tx,
  actor,
  body,
  now,
}: Omit<Call<unknown, unknown, unknown>, 'subject'>): Promise<Refused | undefined> {
  const password = textOf(body, 'password')
  if (password === undefined) return refuse('password-needed')
  const secrets = await tx('people')
    .where({ organisation_id: actor.organisation, person_id: actor.person })
    .first<Secrets | undefined>('password_hash', 'totp_secret', 'totp_last_step')
  if (secrets?.password_hash == null || !(await verifyPassword(secrets.password_hash, password)))
    return refuse('password-needed', 'The password is not the right one.')
  if (secrets.totp_secret === null) return undefined
  const step = verifyCode(secrets.totp_secret, textOf(body, 'code') ?? '', now, secrets.totp_last_step)
  if (step === undefined)
    return refuse('password-needed', 'The code of the second factor is missing, wrong, or was used already.')
  await tx('people')
    .update({ totp_last_step: step })
    .where({ organisation_id: actor.organisation, person_id: actor.person })
  return undefined
}
