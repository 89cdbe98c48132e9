import type { Judged } from '#core/engine.ts'
import type { Finding } from '#core/glossary.ts'
import { findingAnchor } from '#core/report/finding-blocks.ts'
import { standingOf } from '#core/report/standing.ts'
import { missingContent } from './content.ts'
import { type Decision, decisionsOf } from './decisions.ts'
import { titlesOf } from './titles.ts'

/** A reviewer's word on one limitation or departure. */
export interface Acceptance {
  readonly anchor: string
  readonly wordsSha256: string
  readonly accepted: boolean
}

/** A thread as far as issuing goes. */
export interface ThreadStanding {
  readonly anchor: string
  readonly kind: 'remark' | 'question' | 'correction'
  readonly state: 'open' | 'answered' | 'resolved'
}

/** Something that keeps a report from being approved and issued. */
export interface Blocker {
  readonly kind: 'fails' | 'not shown' | 'not decided' | 'refused' | 'correction' | 'content' | 'register'
  readonly anchor: string
  readonly message: string
}

function onDecision({ anchor, words, wordsSha256 }: Decision, acceptances: readonly Acceptance[]): Blocker[] {
  const said = acceptances.findLast((one) => one.anchor === anchor && one.wordsSha256 === wordsSha256)
  if (said === undefined) return [{ kind: 'not decided', anchor, message: `Waits for the reviewer: ${words}` }]
  return said.accepted ? [] : [{ kind: 'refused', anchor, message: `Refused by the reviewer: ${words}` }]
}

/**
 * Everything that keeps a report from being approved and issued; nothing does when the list is empty.
 *
 * @param judged the newest revision
 * @param acceptances in the order in which they were said; on the same words the last one counts
 * @param threads those that everybody can see
 */
export function blockers(
  judged: Judged,
  acceptances: readonly Acceptance[],
  threads: readonly ThreadStanding[],
): Blocker[] {
  const { failing, notShown } = standingOf(judged)
  const titleOf = titlesOf(judged)
  const told = (kind: 'fails' | 'not shown', finding: Finding, words: string): Blocker => ({
    kind,
    anchor: findingAnchor(finding),
    message: `${finding.subject} ${words}: ${titleOf(finding.rule)}.`,
  })
  return [
    ...failing.map((finding) => told('fails', finding, 'does not meet')),
    ...notShown
      .filter(({ severity }) => severity === 'failure')
      .map((finding) => told('not shown', finding, 'is not shown to meet')),
    ...decisionsOf(judged).flatMap((one) => onDecision(one, acceptances)),
    ...threads
      .filter(({ kind, state }) => kind === 'correction' && state !== 'resolved')
      .map(
        ({ anchor }): Blocker => ({
          kind: 'correction',
          anchor,
          message: 'A correction is asked for and not settled.',
        }),
      ),
    ...missingContent(judged.install).map(({ anchor, message }): Blocker => ({ kind: 'content', anchor, message })),
  ]
}
