import { hash, verify } from '@node-rs/argon2'
import { Turns } from './hash-turns.ts'

/** Argon2id (2 in the library's list) with 19 MiB, two passes, one lane: the least that OWASP's Password Storage Cheat Sheet names. */
const SETTINGS = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

/** Each hash holds its memory while it is made: 4 at once are 76 MiB. */
const turns = new Turns(4, 200)

export async function hashPassword(password: string): Promise<string> {
  return await turns.take(() => hash(password.normalize('NFKC'), SETTINGS))
}

export async function verifyPassword(stored: string, password: string): Promise<boolean> {
  return await turns.take(() => verify(stored, password.normalize('NFKC')))
}

/** Whether a stored hash was made with other settings than today's, and is to be made anew at the next sign-in. */
export const isOutdated = (stored: string): boolean => !stored.startsWith('$argon2id$v=19$m=19456,t=2,p=1$')
