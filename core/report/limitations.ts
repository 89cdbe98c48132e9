import type { Finding } from '#core/glossary.ts'
import { anchorOf, textHash } from './anchor.ts'

/** A stated reason for missing readings, with everything that it covers. */
export interface Limitation {
  readonly anchor: string
  readonly reason: string
  readonly subjects: readonly string[]
  readonly findings: readonly Finding[]
}

/** The anchor goes by the reason alone, so that it stays when the reason comes to cover one subject more. */
const limitationAnchor = (reason: string): string => anchorOf('limitation', textHash(reason).slice(0, 16))

/** Reasons why readings are missing, in the order of the findings. */
export function limitationsOf(findings: readonly Finding[]): Limitation[] {
  const byReason = new Map<string, Finding[]>()
  for (const finding of findings) {
    if (finding.verdict !== 'limited') continue
    const { reason = '' } = finding
    const known = byReason.get(reason)
    if (known) known.push(finding)
    else byReason.set(reason, [finding])
  }
  return [...byReason].map(([reason, group]) => ({
    anchor: limitationAnchor(reason),
    reason,
    subjects: [...new Set(group.map(({ subject }) => subject))],
    findings: group,
  }))
}
