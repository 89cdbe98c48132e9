/** What is mutated together, and the tests that are to notice. */
export interface Mutated {
  readonly sources: readonly string[]
  readonly tests: readonly string[]
  /** Sentences in place: changing a word there is no change of behaviour, so texts are left as they are. */
  readonly wordy?: true
}

/** A folder of core and its own tests, plus the tables of examples that hold it where its behaviour is stated as data. */
const own = (folder: string, ...more: readonly string[]): Mutated => ({
  sources: [`core/${folder}/**/*.ts`],
  tests: [`tests/core/${folder}/**/*.test.ts`, ...more],
})

const RULE_EXAMPLES = 'tests/core/judge/rule-examples.test.ts'

/** Each part of core that is measured by itself: `npm run mutate -- topology`. */
export const FOLDERS: Readonly<Record<string, Mutated>> = {
  quantities: own('quantities'),
  topology: own('topology'),
  judge: own('judge'),
  normalise: own('normalise'),
  read: own('read'),
  shape: { ...own('shape'), wordy: true },
  sheets: own('sheets', RULE_EXAMPLES),
  texts: own('texts'),
  report: { ...own('report'), wordy: true },
  paper: { ...own('paper'), tests: ['tests/paper/**/*.test.ts'], wordy: true },
}
