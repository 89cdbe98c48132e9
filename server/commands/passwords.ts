import { hash, verify } from '@node-rs/argon2'

/** Argon2id (2 in the library's list) with 19 MiB, two passes, one lane: the least that OWASP's Password Storage Cheat Sheet names. */
const SETTINGS = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

/** NIST SP 800-63B-4: fifteen characters where the password stands alone, eight beside a second factor, no rules of composition. */
const SHORTEST = { alone: 15, withSecondFactor: 8 } as const
const LONGEST = 256

/** Each hash holds its memory while it is made: more than these wait. */
const AT_ONCE = 4
let running = 0
const waiting: (() => void)[] = []

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) await new Promise<void>((resolve) => waiting.push(resolve))
  running += 1
  try {
    return await work()
  } finally {
    running -= 1
    waiting.shift()?.()
  }
}

export async function hashPassword(password: string): Promise<string> {
  return await inTurn(() => hash(password.normalize('NFKC'), SETTINGS))
}

export async function verifyPassword(stored: string, password: string): Promise<boolean> {
  return await inTurn(() => verify(stored, password.normalize('NFKC')))
}

/** Whether a stored hash was made with other settings than today's, and is to be made anew at the next sign-in. */
export const isOutdated = (stored: string): boolean => !stored.startsWith('$argon2id$v=19$m=19456,t=2,p=1$')

/** What everybody tries first, and what stands on the screen anyway. */
const WELL_KNOWN = [
  'password',
  'passwort',
  'skerry',
  'fennmark',
  'qwertz',
  'qwerty',
  'asdfgh',
  'letmein',
  'welcome',
  'admin',
  'iloveyou',
  'changeover',
  'electrician',
  'secret',
  'monkey',
  'dragon',
  'football',
  'sunshine',
  'princess',
  'abc',
  'test',
  'login',
  'master',
]

const fold = (text: string): string => text.normalize('NFKC').toLowerCase()

/** A text without digits and signs, and without the words that anybody would guess: what is left is what is secret. */
function remainder(password: string, words: readonly string[]): string {
  let left = fold(password)
  for (const word of [...words.map(fold), ...WELL_KNOWN].toSorted((a, b) => b.length - a.length))
    if (word.length >= 3) left = left.replaceAll(word, '')
  return left.replaceAll(/[^\p{L}\p{N}]/gu, '')
}

/** 1234…, aaaa…, abab…: a short piece over and over, or each character the next of the one before. */
function isPattern(text: string): boolean {
  const points = [...fold(text)].map((sign) => sign.codePointAt(0) ?? 0)
  const steps = points.slice(1).map((point, index) => point - (points[index] ?? 0))
  if (steps.every((step) => step === 1) || steps.every((step) => step === -1)) return true
  const folded = fold(text)
  return [1, 2, 3, 4, 5].some(
    (length) =>
      folded ===
      folded
        .slice(0, length)
        .repeat(Math.ceil(folded.length / length))
        .slice(0, folded.length),
  )
}

const FEWEST_OF_ITS_OWN = 6

/**
 * Why a password cannot be taken, as a finished sentence; nothing when it can.
 *
 * @param words the person's name and address, the organisation: what an attacker knows
 */
export function passwordProblem(
  password: string,
  { words, secondFactor }: { readonly words: readonly string[]; readonly secondFactor: boolean },
): string | undefined {
  const length = [...password.normalize('NFKC')].length
  const shortest = secondFactor ? SHORTEST.withSecondFactor : SHORTEST.alone
  if (length < shortest)
    return `The password has ${length} characters; at least ${shortest} are needed${secondFactor ? '' : ' without a second factor'}. A few unrelated words do well.`
  if (length > LONGEST) return `The password has ${length} characters; at most ${LONGEST} are taken.`
  if (isPattern(password))
    return 'The password repeats itself or only counts up: it is among the first that are guessed. Take a few unrelated words.'
  const known = words.flatMap((text) => text.split(/[^\p{L}\p{N}]+/u))
  if (remainder(password, known).length < Math.min(FEWEST_OF_ITS_OWN, shortest - 2))
    return 'The password is made of names and words that are known to belong to you, or that everybody tries. Take a few unrelated words.'
  return undefined
}
