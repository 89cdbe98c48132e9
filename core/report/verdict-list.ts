import type { Finding } from '#core/glossary.ts'
import { findingAnchor } from './finding-blocks.ts'

/** Each verdict by the anchor of its finding, a departure marked as such. */
export function verdictsOf(findings: readonly Finding[]): Readonly<Record<string, string>> {
  return Object.fromEntries(
    findings.map((finding) => [
      findingAnchor(finding),
      finding.departure ? `${finding.verdict}, departs on purpose` : finding.verdict,
    ]),
  )
}
