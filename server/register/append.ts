import { bytesToHex, hexToBytes } from '@noble/hashes/utils.js'
import { signCheckpoint } from '#core/register/checkpoint.ts'
import { CHAIN_START, canonicalEntry, chainHash, leafHash, type RegisterEntry } from '#core/register/entry.ts'
import { append, rootOfFrontier } from '#core/register/frontier.ts'
import type { Tx } from '#server/db.ts'
import { findHead, insertCheckpoint, insertEntry, lockHead } from '#server/queries/register.ts'
import type { Signer } from '#server/seal/signer.ts'

/** Whose register it is: the row's id, and the mark that stands in every entry and checkpoint. */
export interface Register {
  readonly organisation: string
  readonly mark: string
}

/** What happened, as its entry will say it; the register adds whose it is and the place. */
type Unplaced<Entry> = Entry extends RegisterEntry ? Omit<Entry, 'organisation' | 'sequence'> : never
export type Happened = Unplaced<RegisterEntry>

/** Times in the register are whole seconds in UTC. */
export const registerTime = (at: Date): string => at.toISOString().replace(/\.\d{3}Z$/, 'Z')

/** Writes one entry at the end of the register, in the transaction of what it tells of. */
export async function appendEntry(
  tx: Tx,
  { organisation, mark }: Register,
  document: string,
  happened: Happened,
  now: Date,
): Promise<RegisterEntry> {
  const head = await lockHead(tx, organisation, bytesToHex(CHAIN_START))
  const entry: RegisterEntry = { ...happened, organisation: mark, sequence: head.size }
  const leaf = leafHash(entry)
  const grown = append({ size: head.size, peaks: head.peaks.map(hexToBytes) }, leaf)
  await insertEntry(tx, {
    organisation,
    document,
    sequence: head.size,
    kind: entry.kind,
    entry: canonicalEntry(entry),
    leafHash: bytesToHex(leaf),
    head: {
      size: grown.size,
      chain_hash: bytesToHex(chainHash(hexToBytes(head.chain_hash), leaf)),
      peaks: grown.peaks.map(bytesToHex),
    },
    nodes: grown.nodes.map(({ level, index, hash }) => ({ level, index, hash: bytesToHex(hash) })),
    now,
  })
  return entry
}

/** Signs how far the register has come, after the last entry of a transaction. */
export async function makeCheckpoint(
  tx: Tx,
  { organisation, mark }: Register,
  signer: Signer,
  now: Date,
): Promise<void> {
  const head = await findHead(tx, organisation)
  if (head === undefined) throw new Error('A register without entries has nothing to sign.')
  const root = bytesToHex(rootOfFrontier({ size: head.size, peaks: head.peaks.map(hexToBytes) }))
  const signed = await signCheckpoint({ origin: mark, size: head.size, root, at: registerTime(now) }, signer.sign)
  const { certificate } = signer
  await insertCheckpoint(tx, organisation, { size: head.size, root, signed, certificate, made_at: now })
}
