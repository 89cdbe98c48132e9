import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex } from '@noble/hashes/utils.js'
import type { Judged } from '#core/engine.ts'
import { equal } from '#core/register/bytes.ts'
import type { Check } from '#core/register/signing.ts'
import type { Issue } from '#core/report/issue.ts'
import { PdfFile } from '#core/seal/pdf-file.ts'
import { PdfError } from '#core/seal/pdf-values.ts'
import { digestAround, placeholderOf, prepared } from '#core/seal/placeholder.ts'
import { type Trust, verifySeal } from '#core/seal/verify-seal.ts'
import { type Carried, carriedBy } from './embedded.ts'
import { handedChecks } from './handed-proof.ts'
import { type Difference, type Engine, recompute } from './recompute.ts'
import { registerChecks } from './register-checks.ts'

/** What verifying leans on: the engine and the press of this version of Skerry. */
export interface Workshop extends Engine {
  readonly render: (
    judged: Judged,
    made: { readonly text: string; readonly file: string; readonly issue: Issue },
  ) => Uint8Array
}

export interface ReportQuestion<Key> {
  readonly pdf: Uint8Array
  /** Text of the proof file that was handed out with it, where there is one. */
  readonly proof: string | undefined
  readonly trust: Trust<Key>
  readonly workshop: Workshop
}

/** All that was looked at, in the order in which one thing rests on another. */
export interface ReportVerdict {
  readonly checks: readonly Check[]
  readonly differences: readonly Difference[]
  /** SHA-256 of the file. */
  readonly sha256: string
  readonly number?: string
  readonly issuedAt?: string
  readonly sealedAt?: string
}

/** Whether the pages are those that the embedded file gives: compared byte for byte, but for the signature. */
function pagesCheck(
  pdf: PdfFile,
  carried: Carried,
  judged: Judged | undefined,
  at: string | undefined,
  { render }: Workshop,
): Check {
  const id = 'pages'
  if (!judged || at === undefined) {
    const says =
      'The pages could not be compared with a fresh rendering: this version of Skerry has another rule book, which is printed in the report.'
    return { id, holds: true, open: true, says }
  }
  const { source, issue } = carried
  const fresh = prepared(new PdfFile(render(judged, { text: source.text, file: source.name, issue })), at)
  const freshDigest = digestAround(fresh, placeholderOf(new PdfFile(fresh)))
  const holds = equal(freshDigest, digestAround(pdf.bytes, placeholderOf(pdf)))
  const says = holds
    ? 'Rendered anew from the embedded file, every page is the same to the last byte.'
    : 'Rendered anew from the embedded file, the document differs: it was made by another version of Skerry, or its pages do not show what the file holds.'
  return { id, holds, says }
}

/**
 * Verifies an issued report: its seal, what it carries, its place in the register, and that computing, judging and
 * rendering the embedded file anew gives the same. Needs no network and no server.
 */
export async function verifyReport<Key>({ pdf, proof, trust, workshop }: ReportQuestion<Key>): Promise<ReportVerdict> {
  const seal = await verifySeal(pdf, trust)
  const hash = bytesToHex(sha256(pdf))
  const stopped = (check: Check): ReportVerdict => ({ checks: [...seal.checks, check], differences: [], sha256: hash })
  try {
    const file = new PdfFile(pdf)
    const found = carriedBy(file)
    if (!('carried' in found)) return stopped(found.check)
    const { carried } = found
    const again = recompute(carried, workshop)
    const checks = [
      ...seal.checks,
      found.check,
      ...(await registerChecks(carried.proof, seal, trust)),
      ...(proof === undefined ? [] : await handedChecks(proof, hash, carried, seal, trust)),
      ...again.checks,
      pagesCheck(file, carried, again.judged, seal.at, workshop),
    ]
    const { number, issued_at: issuedAt } = carried.issue
    return {
      checks,
      differences: again.differences,
      sha256: hash,
      number,
      issuedAt,
      ...(seal.at !== undefined && { sealedAt: seal.at }),
    }
  } catch (error) {
    if (!(error instanceof PdfError)) throw error
    return seal.checks.some(({ holds }) => !holds)
      ? { checks: seal.checks, differences: [], sha256: hash }
      : stopped({ id: 'embedded', holds: false, says: error.message })
  }
}
