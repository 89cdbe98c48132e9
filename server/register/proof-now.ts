import { bytesToHex, hexToBytes } from '@noble/hashes/utils.js'
import { consistencyPath, nodesOfConsistency } from '#core/register/consistency.ts'
import { leafHash, type RegisterEntry } from '#core/register/entry.ts'
import { includes, nodesOfInclusion } from '#core/register/inclusion.ts'
import { type Hash, nodesOf, rootOfSpan } from '#core/register/merkle.ts'
import { makeProof, type Proof } from '#core/register/proof.ts'
import type { Tx } from '#server/db.ts'
import { type CheckpointRow, type EntryRow, readNodes } from '#server/queries/register.ts'
import { readerOf } from './proof.ts'

/** Whether a proof's path leads from its entry to the root. */
export const leads = ({ entry, index, size, path }: Proof, root: string): boolean =>
  includes({ leaf: leafHash(entry), index, size, path: path.map(hexToBytes), root: hexToBytes(root) })

/** The proof of an entry against a checkpoint that covers it, such as the newest. */
export async function proofAgainst(
  tx: Tx,
  organisation: string,
  row: EntryRow,
  { signed, certificate, size }: CheckpointRow,
): Promise<Proof> {
  const nodes = await readNodes(tx, organisation, nodesOfInclusion(row.sequence, size))
  const entry: RegisterEntry = JSON.parse(row.entry)
  return makeProof(entry, signed, certificate, readerOf(nodes))
}

/** The register's root when it had `size` entries, from its stored subtrees. */
export async function rootAt(tx: Tx, organisation: string, size: number): Promise<Hash> {
  const span = { start: 0, end: size }
  return rootOfSpan(span, readerOf(await readNodes(tx, organisation, nodesOf(span))))
}

/** Hashes in hex that prove that the register of `second` entries continues that of `first`. */
export async function consistencyOf(tx: Tx, organisation: string, first: number, second: number): Promise<string[]> {
  const nodes = await readNodes(tx, organisation, nodesOfConsistency(first, second))
  return consistencyPath(first, second, readerOf(nodes)).map(bytesToHex)
}
