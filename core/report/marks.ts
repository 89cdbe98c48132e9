import type { Finding, Verdict } from '#core/glossary.ts'
import type { Mark } from './blocks.ts'

const SHAPES: Readonly<Record<Verdict, string>> = {
  meets: 'verdict-meets',
  'meets, inside the uncertainty': 'verdict-meets-inside',
  'fails, inside the uncertainty': 'verdict-fails-inside',
  fails: 'verdict-fails',
  'not shown': 'verdict-not-shown',
  limited: 'verdict-limited',
  'not applicable': 'verdict-not-applicable',
}

/** Worst news first. */
export const WORST_FIRST: readonly Verdict[] = [
  'fails',
  'fails, inside the uncertainty',
  'not shown',
  'limited',
  'meets, inside the uncertainty',
  'meets',
  'not applicable',
]

/** A verdict as printed. */
export function markOf(verdict: Verdict): Mark {
  return { word: verdict, shape: SHAPES[verdict] }
}

/** A departure that the reviewer accepts or refuses. */
export const DEPARTS: Mark = { word: 'departs on purpose', shape: 'verdict-limited' }

/** A finding's verdict as printed; a departure stands in its place. */
export function findingMark({ verdict, departure }: Pick<Finding, 'verdict' | 'departure'>): Mark {
  return departure ? DEPARTS : markOf(verdict)
}

/** Whether a verdict says that the rule is not met. */
export function isFailing(verdict: Verdict): boolean {
  return verdict === 'fails' || verdict === 'fails, inside the uncertainty'
}
