import { bytesToHex, hexToBytes } from '@noble/hashes/utils.js'
import validate from '#core/generated/proof-validator.js'
import { parseCheckpoint, type SignedCheckpoint, verifyCheckpoint } from './checkpoint.ts'
import { leafHash, type RegisterEntry } from './entry.ts'
import { includes, inclusionPath } from './inclusion.ts'
import type { NodeReader } from './merkle.ts'
import type { Check, Verify } from './signing.ts'

export const PROOF_FORMAT = 'skerry-proof/1'

/** What is handed out with a document: its entry, the way from there to a signed checkpoint, and who signed. */
export interface Proof {
  readonly format: typeof PROOF_FORMAT
  readonly entry: RegisterEntry
  /** Place of the entry, from 0. */
  readonly index: number
  /** Number of entries that the checkpoint stands for. */
  readonly size: number
  /** Hashes in hex, from the entry upwards. */
  readonly path: readonly string[]
  /** The signed text of the checkpoint. */
  readonly checkpoint: string
  /** PEM of the certificate that signed it, then of those that lead to its root. */
  readonly certificate: string
}

export type ProofResult =
  | { readonly ok: true; readonly proof: Proof }
  | { readonly ok: false; readonly message: string }

/**
 * Puts a proof together.
 *
 * @param entry the entry; its sequence is its place
 * @param signed the signed text of a checkpoint that covers it
 * @param read gives the subtrees named by `nodesOfInclusion(entry.sequence, size)`
 * @throws RangeError where the checkpoint does not cover the entry, or is none
 */
export function makeProof(entry: RegisterEntry, signed: string, certificate: string, read: NodeReader): Proof {
  const parsed = parseCheckpoint(signed)
  if (!parsed.ok) throw new RangeError(parsed.message)
  const { size } = parsed.checkpoint
  return {
    format: PROOF_FORMAT,
    entry,
    index: entry.sequence,
    size,
    path: inclusionPath(entry.sequence, size, read).map(bytesToHex),
    checkpoint: signed,
    certificate,
  }
}

/** Reads the text of a proof file; nothing is verified yet. */
export function parseProof(text: string): ProofResult {
  const message = `This is no proof file of Skerry (${PROOF_FORMAT}): ask whoever issued the document for a fresh one.`
  try {
    const value: unknown = JSON.parse(text)
    return validate(value) ? { ok: true, proof: value } : { ok: false, message }
  } catch (error) {
    if (error instanceof SyntaxError) return { ok: false, message }
    throw error
  }
}

function placeCheck({ entry, index, size, path }: Proof, checkpoint: SignedCheckpoint): Check {
  const holds =
    index === entry.sequence &&
    size === checkpoint.size &&
    includes({ leaf: leafHash(entry), index, size, path: path.map(hexToBytes), root: hexToBytes(checkpoint.root) })
  return {
    id: 'register-place',
    holds,
    says: holds
      ? `The entry is number ${index + 1} of the ${size} that the checkpoint of ${checkpoint.at} stands for.`
      : `The entry does not lead to the root of the checkpoint of ${checkpoint.at}: it was changed, or belongs to another register.`,
  }
}

function ownerCheck({ entry }: Proof, { origin }: SignedCheckpoint): Check {
  const holds = origin === entry.organisation
  return {
    id: 'register-owner',
    holds,
    says: holds
      ? `Entry and checkpoint are of the register of ${origin}.`
      : `The entry is of the register of ${entry.organisation}, the checkpoint of ${origin}.`,
  }
}

/**
 * Verifies a proof against the key of whoever keeps the register.
 *
 * @param proof what `parseProof` gave
 * @param verify made for the key of a certificate whose trust was looked at elsewhere
 */
export async function verifyProof(proof: Proof, verify: Verify): Promise<readonly Check[]> {
  const parsed = parseCheckpoint(proof.checkpoint)
  if (!parsed.ok) return [{ id: 'register-checkpoint', holds: false, says: parsed.message }]
  const { checkpoint } = parsed
  const signed = await verifyCheckpoint(checkpoint, verify)
  return [
    {
      id: 'register-checkpoint',
      holds: signed,
      says: signed
        ? `The checkpoint of ${checkpoint.at} (${checkpoint.size} entries, root ${checkpoint.root}) is signed with the key of the certificate.`
        : `The checkpoint of ${checkpoint.at} is not signed with the key of the certificate.`,
    },
    ownerCheck(proof, checkpoint),
    placeCheck(proof, checkpoint),
  ]
}
