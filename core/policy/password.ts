import { COMMON_WORDS, RUNS } from './common-words.ts'

/** NIST SP 800-63B-4, 3.1.1.2: fifteen characters where the password stands alone, eight beside a second factor. */
export const SHORTEST = { alone: 15, besideSecondFactor: 8 } as const
export const LONGEST = 256

/** What a password is judged beside. */
export interface PasswordContext {
  readonly secondFactor: boolean
  /** What a guesser knows: the person's name and address, the organisation's. */
  readonly words: readonly string[]
}

/** Fewer characters than this, apart from what everybody guesses, are no secret. */
const LEAST_OF_ONES_OWN = 4

const LEET: Readonly<Record<string, string>> = {
  '0': 'o',
  '1': 'i',
  '3': 'e',
  '4': 'a',
  '5': 's',
  '7': 't',
  '@': 'a',
  $: 's',
}

const folded = (text: string): string => text.normalize('NFKC').toLowerCase()
const unleet = (text: string): string => [...text].map((sign) => LEET[sign] ?? sign).join('')
const reversed = (text: string): string => [...text].toReversed().join('')

/** Whether a text is one piece of at most half its length, over and over. */
function repeats(text: string): boolean {
  for (let length = 1; length <= Math.min(text.length / 2, 12); length++)
    if (
      text ===
      text
        .slice(0, length)
        .repeat(Math.ceil(text.length / length))
        .slice(0, text.length)
    )
      return true
  return false
}

const ALL_RUNS: readonly string[] = RUNS.flatMap((run) => [run, reversed(run)])
const COMMON: readonly string[] = [...new Set(COMMON_WORDS)]

/** How many characters from a place on lie side by side in a run, in either direction. */
function runAt(text: string, at: number): number {
  let reach = 1
  for (const run of ALL_RUNS)
    while (at + reach < text.length && run.includes(text.slice(at, at + reach + 1))) reach += 1
  return reach
}

/** Lengths of everything that guessers know and that begins at a place: words, years, runs of three and more. */
function knownAt(text: string, plain: string, at: number, words: readonly string[]): number[] {
  const lengths = words.flatMap((word) =>
    text.startsWith(word, at) || plain.startsWith(word, at) ? [word.length] : [],
  )
  if (/^(19|20)\d\d$/.test(text.slice(at, at + 4))) lengths.push(4)
  const run = runAt(text, at)
  if (run >= 3) lengths.push(run)
  return lengths
}

/** The fewest characters of a text that are nobody's guess, marks and spaces aside. */
function leftOf(whole: string, words: readonly string[]): number {
  const text = whole.replaceAll(/[^\p{L}\p{M}\p{N}\p{So}@$]/gu, '')
  const plain = unleet(text)
  const left: number[] = [0]
  // From the end to the start: each place either counts, or begins something known.
  for (let rest = 1; rest <= text.length; rest++) {
    const at = text.length - rest
    const skips = knownAt(text, plain, at, words).map((length) => left[rest - length] ?? 0)
    left.push(Math.min(1 + (left[rest - 1] ?? 0), ...skips))
  }
  return left[text.length] ?? 0
}

const coveredBy = (text: string, words: readonly string[]): boolean => leftOf(text, words) < LEAST_OF_ONES_OWN

const partsOf = (words: readonly string[]): string[] =>
  ['skerry', ...words].flatMap((name) => {
    const parts = folded(name).split(/[^\p{L}\p{N}]+/u)
    return [...parts, parts.join('')].filter((part) => part.length >= 3)
  })

/**
 * Judges a password that somebody chooses: by length, and by whether it is what guessers try first. Anything else is
 * free, spaces and every script included.
 *
 * @param password as typed; characters are counted, not bytes, after Unicode's NFKC
 * @param context whether there is a second factor, and names that are no secret
 * @returns why it is refused, as a finished sentence; undefined when it may be used
 * Source: NIST SP 800-63B-4, 3.1.1.2.
 */
export function passwordProblem(password: string, { secondFactor, words }: PasswordContext): string | undefined {
  const text = folded(password)
  const length = [...password.normalize('NFKC')].length
  const shortest = secondFactor ? SHORTEST.besideSecondFactor : SHORTEST.alone
  if (length < shortest)
    return `It has ${length} characters; at least ${shortest} are needed${secondFactor ? '' : ', or 8 once a second factor is set up'}.`
  if (length > LONGEST) return `It has ${length} characters; at most ${LONGEST} are taken.`
  if (repeats(text)) return 'It repeats one short piece. Guessers try that first.'
  if (coveredBy(text, COMMON)) return 'It is made of words and runs of keys that guessers try first.'
  if (coveredBy(text, [...COMMON, ...partsOf(words)]))
    return 'It is made of your name, your address, your organisation’s name or this program’s, which guessers try first.'
  return undefined
}
