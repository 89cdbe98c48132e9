import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex } from '@noble/hashes/utils.js'
import { strFromU8 } from 'fflate'
import validate from '#core/generated/issue-validator.js'
import { type Proof, parseProof } from '#core/register/proof.ts'
import type { Check } from '#core/register/signing.ts'
import { EMBEDDED, type Issue, type IssueFile, misfit } from '#core/report/issue.ts'
import { attachmentsOf, type Embedded } from '#core/seal/attachments.ts'
import type { PdfFile } from '#core/seal/pdf-file.ts'

/** Everything that an issued report carries for whoever verifies it. */
export interface Carried {
  readonly source: { readonly name: string; readonly text: string; readonly sha256: string }
  readonly facts: { readonly text: string; readonly sha256: string }
  readonly record: IssueFile
  readonly proof: Proof
  readonly issue: Issue
}

export type CarriedResult = { readonly carried: Carried; readonly check: Check } | { readonly check: Check }

const hashOf = (bytes: Uint8Array): string => bytesToHex(sha256(bytes))

function recordFrom(bytes: Uint8Array | undefined): IssueFile | undefined {
  try {
    const value: unknown = bytes && JSON.parse(strFromU8(bytes))
    return validate(value) ? value : undefined
  } catch (error) {
    if (error instanceof SyntaxError) return undefined
    throw error
  }
}

const failed = (says: string): CarriedResult => ({ check: { id: 'embedded', holds: false, says } })

/** The install file: the only one that the page was made from. */
function sourceOf(files: readonly Embedded[]): Embedded | undefined {
  const sources = files.filter(({ relationship }) => relationship === 'Source')
  return sources.length === 1 ? sources[0] : undefined
}

/** Takes out what a report carries, and looks whether it all belongs to the entry of the register. */
export function carriedBy(file: PdfFile): CarriedResult {
  const files = attachmentsOf(file)
  const named = (name: string): Uint8Array | undefined => files.find((one) => one.name === name)?.bytes
  const source = sourceOf(files)
  const facts = named(EMBEDDED.facts)
  const record = recordFrom(named(EMBEDDED.issue))
  const proof = parseProof(strFromU8(named(EMBEDDED.register) ?? new Uint8Array()))
  if (!source || !facts || !record || !proof.ok) {
    return failed(
      'The PDF does not carry what an issued report of Skerry does: install file, quantities, issue and place in the register.',
    )
  }
  const { rulebook: _book, verdicts: _verdicts, ...printed } = record
  const issue: Issue = { ...printed, register: proof.proof }
  const hashes = { source: hashOf(source.bytes), facts: hashOf(facts) }
  const wrong = misfit(issue, hashes)
  if (wrong !== undefined) return failed(`What the PDF carries does not belong together. ${wrong}`)
  return {
    check: {
      id: 'embedded',
      holds: true,
      says: `The install file and the quantities inside have the hashes that the register holds for ${issue.number}.`,
    },
    carried: {
      source: { name: source.name, text: strFromU8(source.bytes), sha256: hashes.source },
      facts: { text: strFromU8(facts), sha256: hashes.facts },
      record,
      proof: proof.proof,
      issue,
    },
  }
}
