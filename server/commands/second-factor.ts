import { Secret, TOTP } from 'otpauth'

const PERIOD = 30

export const totp = (secret: string): TOTP =>
  new TOTP({ issuer: 'Skerry', secret: Secret.fromBase32(secret), algorithm: 'SHA1', digits: 6, period: PERIOD })

/**
 * Checks a code of RFC 6238 against the step of now and its neighbours.
 *
 * @param last the newest step that was used: a code counts once
 * @returns the step that the code belongs to, or nothing when it is wrong or used
 */
export function verifyCode(secret: string, code: string, now: Date, last: number | null): number | undefined {
  if (!/^\d{6}$/.test(code)) return undefined
  const delta = totp(secret).validate({ token: code, timestamp: now.getTime(), window: 1 })
  if (delta === null) return undefined
  const step = Math.floor(now.getTime() / 1000 / PERIOD) + delta
  return last !== null && step <= last ? undefined : step
}
