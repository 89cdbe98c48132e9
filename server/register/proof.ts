import { hexToBytes } from '@noble/hashes/utils.js'
import type { RegisterEntry } from '#core/register/entry.ts'
import { nodesOfInclusion } from '#core/register/inclusion.ts'
import type { NodeReader } from '#core/register/merkle.ts'
import { makeProof, type Proof, parseProof } from '#core/register/proof.ts'
import type { Tx } from '#server/db.ts'
import { checkpointOver, findEntry, readNodes } from '#server/queries/register.ts'

/** Reads stored subtrees by their places. */
export function readerOf(nodes: ReadonlyMap<string, string>): NodeReader {
  return ({ level, index }) => {
    const hash = nodes.get(`${level}/${index}`)
    if (hash === undefined) throw new Error(`The register has no subtree ${level}/${index}.`)
    return hexToBytes(hash)
  }
}

/**
 * The proof of what happened to a document, against the checkpoint that was made with it: the same on every day.
 * Undefined where it did not happen.
 */
export async function proofOf(
  tx: Tx,
  organisation: string,
  document: string,
  kind: RegisterEntry['kind'],
): Promise<Proof | undefined> {
  const row = await findEntry(tx, organisation, document, kind)
  if (row === undefined) return undefined
  const checkpoint = await checkpointOver(tx, organisation, row.sequence)
  if (checkpoint === undefined) throw new Error(`Entry ${row.sequence} of the register has no checkpoint.`)
  const nodes = await readNodes(tx, organisation, nodesOfInclusion(row.sequence, checkpoint.size))
  const entry: RegisterEntry = JSON.parse(row.entry)
  const proof = makeProof(entry, checkpoint.signed, checkpoint.certificate, readerOf(nodes))
  const sound = parseProof(JSON.stringify(proof))
  if (!sound.ok) throw new Error(`Entry ${row.sequence} of the register is not in form.`)
  return sound.proof
}
