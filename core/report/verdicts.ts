import type { Judged } from '#core/engine.ts'
import type { Finding, State, Verdict } from '#core/glossary.ts'
import type { Cell } from './blocks.ts'
import { groupedBy } from './grouped-by.ts'
import { DEPARTS, isFailing, markOf, WORST_FIRST } from './marks.ts'
import { sure } from './sure.ts'

/** Which findings a row or a reading stands for. */
export interface Wanted {
  readonly state?: State | null
  /** Only rules that read one of these fields. */
  readonly fields?: readonly string[]
  /** Only rules that read none of these fields. */
  readonly without?: readonly string[]
}

/** Findings by subject, to be asked for those behind a row. */
export class Verdicts {
  readonly #bySubject: ReadonlyMap<string, readonly Finding[]>
  readonly #reads: ReadonlyMap<string, readonly string[]>

  constructor({ findings, book }: Pick<Judged, 'findings' | 'book'>) {
    this.#reads = new Map(book.rules.map(({ id, reads }) => [id, reads]))
    this.#bySubject = groupedBy(findings, ({ subject }) => subject)
  }

  /** The findings about a subject that are wanted, those that do not apply left out. */
  of(subject: string, { state, fields, without }: Wanted = {}): readonly Finding[] {
    return (this.#bySubject.get(subject) ?? []).filter((finding) => {
      if (finding.verdict === 'not applicable') return false
      if (state !== undefined && finding.state !== state) return false
      const reads = sure(this.#reads.get(finding.rule), `The rule ${finding.rule}`)
      if (fields && !reads.some((name) => fields.includes(name))) return false
      return !without || !reads.some((name) => without.includes(name))
    })
  }

  /** The cell that closes a row: the worst verdict at failure level, and how many cautions stand beside it. */
  cell(subject: string, wanted: Wanted, anchor: string): Cell {
    const found = this.of(subject, wanted)
    return { anchor, ...verdictCell(found) }
  }

  /** Whether the row behind a cell fails. */
  fails(subject: string, wanted: Wanted): boolean {
    return this.of(subject, wanted).some(
      ({ verdict, severity, departure }) => severity === 'failure' && !departure && isFailing(verdict),
    )
  }
}

/** The worst of some findings as a cell, with the count of cautions that are not met. */
export function verdictCell(findings: readonly Finding[]): Cell {
  const binding = findings.filter(({ severity }) => severity === 'failure')
  const cautions = findings.filter(({ severity, verdict }) => severity === 'caution' && isFailing(verdict)).length
  const words = cautions === 0 ? '' : cautions === 1 ? '1 caution' : `${cautions} cautions`
  if (binding.length === 0 && words !== '') return { text: words }
  if (findings.length === 0) return { text: '–' }
  const open = binding.filter(({ departure }) => !departure)
  const mark =
    open.length < binding.length && !open.some(({ verdict }) => isFailing(verdict)) ? DEPARTS : markOf(worst(open))
  return words === '' ? { mark } : { mark, note: words }
}

/** The worst verdict of some findings; `meets` where there are none. */
export function worst(findings: readonly Pick<Finding, 'verdict'>[]): Verdict {
  return WORST_FIRST.find((verdict) => findings.some((finding) => finding.verdict === verdict)) ?? 'meets'
}
