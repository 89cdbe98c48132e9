import { hash, verify } from '@node-rs/argon2'

/** Argon2id (2 in the library's list) with 19 MiB, two passes, one lane: the least that OWASP's Password Storage Cheat Sheet names. */
const SETTINGS = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

/** NIST SP 800-63B-4: fifteen characters where the password stands alone, eight beside a second factor, no rules of composition. */
export const SHORTEST = { alone: 15, withSecondFactor: 8 } as const
export const LONGEST = 256

export async function hashPassword(password: string): Promise<string> {
  return await hash(password.normalize('NFKC'), SETTINGS)
}

export async function verifyPassword(stored: string, password: string): Promise<boolean> {
  return await verify(stored, password.normalize('NFKC'))
}
