import { createHash, randomBytes } from 'node:crypto'
import { Secret, TOTP } from 'otpauth'

const PERIOD = 30

export const newSecret = (): string => new Secret({ size: 20 }).base32

const totp = (secret: string, label = ''): TOTP =>
  new TOTP({ issuer: 'Skerry', label, secret: Secret.fromBase32(secret), algorithm: 'SHA1', digits: 6, period: PERIOD })

/** The address that an authenticator reads, usually from a picture. */
export const authenticatorUri = (secret: string, email: string): string => totp(secret, email).toString()

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

const RECOVERY_CODES = 10

/** Letters and digits that are not mistaken for each other, on paper or by voice. */
const SIGNS = 'abcdefghjkmnpqrstuvwxyz23456789'

const fresh = (): string => Array.from(randomBytes(16), (byte) => SIGNS[byte % SIGNS.length]).join('')

/** Codes for the day on which the authenticator is lost: shown once, each good for one sign-in. */
export const recoveryCodes = (): string[] =>
  Array.from({ length: RECOVERY_CODES }, () => fresh().replace(/(.{4})(?=.)/g, '$1-'))

/** Codes have 79 bits and need no slow hash. */
export const recoveryHash = (code: string): string =>
  createHash('sha256')
    .update(code.toLowerCase().replaceAll(/[^a-z0-9]/g, ''))
    .digest('hex')
