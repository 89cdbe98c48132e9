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

const UNMET: Readonly<Record<'caution' | 'note', Mark>> = {
  caution: { word: 'caution: not met', shape: 'verdict-limited' },
  note: { word: 'note: not met', shape: 'verdict-not-applicable' },
}

/** A finding's verdict as printed; a departure stands in its place, and what is no failure is not called one. */
export function findingMark({
  verdict,
  severity,
  departure,
}: Pick<Finding, 'verdict' | 'severity' | 'departure'>): Mark {
  if (departure) return DEPARTS
  return severity !== 'failure' && isFailing(verdict) ? UNMET[severity] : markOf(verdict)
}

/** Whether a verdict says that the rule is not met. */
export function isFailing(verdict: Verdict): boolean {
  return verdict === 'fails' || verdict === 'fails, inside the uncertainty'
}
