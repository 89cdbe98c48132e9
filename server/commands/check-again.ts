import { type Refused, refuse } from '#server/http/problems.ts'
import type { Call } from '#server/http/route.ts'
import { findSecrets } from '#server/queries/secrets.ts'
import { verifyPassword } from './passwords.ts'
import { takeCode } from './second-step.ts'

const textOf = (body: unknown, name: string): string | undefined => {
  if (typeof body !== 'object' || body === null || !(name in body)) return undefined
  const value: unknown = Object.getOwnPropertyDescriptor(body, name)?.value
  return typeof value === 'string' ? value : undefined
}

/**
 * Asks for the password again, and for the code where there is a second factor: before steps that count in law, and
 * before changes to how a person signs in.
 */
export async function checkAgain(call: Omit<Call<unknown, unknown, unknown>, 'subject'>): Promise<Refused | undefined> {
  const { tx, actor, body, now } = call
  const password = textOf(body, 'password')
  if (password === undefined) return refuse('password-needed')
  const secrets = await findSecrets(tx, actor)
  if (secrets?.password_hash == null || !(await verifyPassword(secrets.password_hash, password)))
    return refuse('password-needed', 'The password is not the right one.')
  if (await takeCode(tx, actor, secrets, textOf(body, 'code') ?? '', now)) return undefined
  return refuse('password-needed', 'The code of the second factor is missing, wrong, or was used already.', {
    more: { code_needed: true },
  })
}
