import { type Proof, parseProof } from '#core/register/proof.ts'
import type { Check } from '#core/register/signing.ts'
import type { SealVerdict, Trust } from '#core/seal/verify-seal.ts'
import type { Carried } from './embedded.ts'
import { registerChecks } from './register-checks.ts'

/** Where checks of a proof that was handed out come from. */
const HANDED = 'proof-'

/** Whether the proof is about this report, and says that it stands. */
function aboutCheck({ entry }: Proof, pdfHash: string, { issue, source, facts }: Carried): Check {
  const id = `${HANDED}is-about-this-file`
  if (entry.number !== issue.number)
    return { id, holds: false, says: `The proof is about ${entry.number}, the report is ${issue.number}.` }
  if (entry.source_sha256 !== source.sha256 || entry.facts_sha256 !== facts.sha256) {
    return {
      id,
      holds: false,
      says: `The proof is about a report ${entry.number} with another install file or other quantities.`,
    }
  }
  if (entry.kind === 'replaced')
    return { id, holds: false, says: `${entry.number} was replaced by ${entry.replaced_by}: ${entry.reason}` }
  if (entry.kind === 'withdrawn') return { id, holds: false, says: `${entry.number} was withdrawn: ${entry.reason}` }
  if (entry.kind === 'issued') {
    return {
      id,
      holds: true,
      open: true,
      says: 'The proof shows that the report was issued; the entry with the hash of the sealed file is another.',
    }
  }
  const holds = entry.pdf_sha256 === pdfHash
  const says = holds
    ? `The register holds the SHA-256 of this very file, entered ${entry.at}.`
    : 'The register holds the hash of another file for this report: this is not the one that was sealed and entered.'
  return { id, holds, says }
}

/** Verifies the proof file that was handed out with a report. */
export async function handedChecks<Key>(
  text: string,
  pdfHash: string,
  carried: Carried,
  seal: SealVerdict,
  trust: Trust<Key>,
): Promise<readonly Check[]> {
  const parsed = parseProof(text)
  if (!parsed.ok) return [{ id: `${HANDED}file`, holds: false, says: parsed.message }]
  const checks = await registerChecks(parsed.proof, seal, trust)
  return [
    ...checks.map((check) => ({ ...check, id: `${HANDED}${check.id}` })),
    aboutCheck(parsed.proof, pdfHash, carried),
  ]
}
