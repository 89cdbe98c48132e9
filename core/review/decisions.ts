import type { Judged } from '#core/engine.ts'
import type { Finding } from '#core/glossary.ts'
import { textHash } from '#core/report/anchor.ts'
import { findingAnchor } from '#core/report/finding-blocks.ts'
import { limitationsOf } from '#core/report/limitations.ts'
import { standingOf } from '#core/report/standing.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { titlesOf } from './titles.ts'

/** Something that a reviewer accepts or refuses, one by one. */
export interface Decision {
  readonly kind: 'limitation' | 'departure'
  /** Where it stands in the report. */
  readonly anchor: string
  /** Exactly what is accepted; other words need another decision. */
  readonly words: string
  /** SHA-256 of the words in UTF-8, in hex. */
  readonly wordsSha256: string
}

const decision = (kind: Decision['kind'], anchor: string, words: string): Decision => ({
  kind,
  anchor,
  words,
  wordsSha256: textHash(words),
})

const named = ({ subject, state }: Finding): string => (state === null ? subject : `${subject} ${STATE_WORDS[state]}`)

/**
 * Every limitation and departure of a judged file, with the words that must be accepted before it can be issued.
 * Limitations that give the same reason are one decision: it lists what stays untested and on what.
 */
export function decisionsOf(judged: Judged): Decision[] {
  const titleOf = titlesOf(judged)
  const limitations = limitationsOf(standingOf(judged).limited).map(({ anchor, reason, findings }) => {
    const untested = findings.map((finding) => `${named(finding)}: ${titleOf(finding.rule)}`)
    return decision('limitation', anchor, `Not tested: ${reason}. It leaves open: ${untested.join('; ')}.`)
  })
  const departures = judged.findings.flatMap((finding) => {
    const { departure, verdict, rule } = finding
    if (departure === undefined || verdict === 'not applicable') return []
    const { reason, agreed_by, on } = departure
    const words = `${named(finding)} departs from: ${titleOf(rule)}. Reason: ${reason}. Agreed by ${agreed_by}, ${on}.`
    return [decision('departure', findingAnchor(finding), words)]
  })
  return [...limitations, ...departures]
}
