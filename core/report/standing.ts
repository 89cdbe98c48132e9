import type { Judged } from '#core/engine.ts'
import type { Finding, Verdict } from '#core/glossary.ts'
import type { Mark } from './blocks.ts'
import { DEPARTS, isFailing, markOf, WORST_FIRST } from './marks.ts'

/** How a report stands: whether it can be issued, and what stands in the way. */
export interface Standing {
  /** `meets`, `incomplete` or `fails`. */
  readonly word: string
  readonly counts: readonly { readonly mark: Mark; readonly count: number }[]
  /** Findings at failure level that are not met. */
  readonly failing: readonly Finding[]
  readonly notShown: readonly Finding[]
  /** Wait for the reviewer to accept them. */
  readonly limited: readonly Finding[]
  readonly departing: readonly Finding[]
  /** Not met at caution or note level: for the reviewer's judgement. */
  readonly cautions: readonly Finding[]
  readonly notes: readonly Finding[]
  readonly insideUncertainty: readonly Finding[]
}

/** Sorts findings by what they mean for issuing. Each is in one list, or in none where it is met or does not apply. */
export function standingOf({ findings }: Pick<Judged, 'findings'>): Standing {
  const departing = findings.filter(({ departure, verdict }) => departure && verdict !== 'not applicable')
  const plain = findings.filter(({ departure }) => !departure)
  const binding = plain.filter(({ severity }) => severity === 'failure')
  const failing = binding.filter(({ verdict }) => isFailing(verdict))
  const notShown = plain.filter(({ verdict }) => verdict === 'not shown')
  const blocking = binding.some(({ verdict }) => verdict === 'not shown')
  const unmet = (severity: Finding['severity']) =>
    plain.filter((finding) => finding.severity === severity && isFailing(finding.verdict))
  return {
    word: failing.length > 0 ? 'fails' : blocking ? 'incomplete' : 'meets',
    counts: countsOf(binding, departing.length, unmet('caution').length + unmet('note').length),
    failing,
    notShown,
    limited: plain.filter(({ verdict }) => verdict === 'limited'),
    departing,
    cautions: unmet('caution'),
    notes: unmet('note'),
    insideUncertainty: plain.filter(({ verdict }) => verdict === 'meets, inside the uncertainty'),
  }
}

const SPOKEN: readonly Verdict[] = WORST_FIRST.filter((verdict) => verdict !== 'not applicable')

function countsOf(binding: readonly Finding[], departing: number, cautions: number): Standing['counts'] {
  const counts = SPOKEN.map((verdict) => ({
    mark: markOf(verdict),
    count: binding.filter((finding) => finding.verdict === verdict).length,
  }))
  return [
    ...counts,
    { mark: DEPARTS, count: departing },
    {
      mark: { word: cautions === 1 ? 'caution or note' : 'cautions and notes', shape: 'verdict-not-applicable' },
      count: cautions,
    },
  ]
}
