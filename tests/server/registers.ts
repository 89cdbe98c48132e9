import { createPublicKey, verify, X509Certificate } from 'node:crypto'
import { bytesToHex, hexToBytes } from '@noble/hashes/utils.js'
import { expect } from 'vitest'
import { parseCheckpoint, verifyCheckpoint } from '#core/register/checkpoint.ts'
import { CHAIN_START, canonicalEntry, chainHash, leafHash, type RegisterEntry } from '#core/register/entry.ts'
import { rootOf } from '#core/register/merkle.ts'
import { inOrganisation } from '#server/db.ts'
import { listEntries, newestCheckpoint } from '#server/queries/register.ts'
import type { Services } from '#server/services.ts'

/** Reads a register as an auditor with a copy would: every entry, the chain, the root, the signature over it. */
export async function soundRegister({ db }: Pick<Services, 'db'>, organisation: string): Promise<RegisterEntry[]> {
  return await inOrganisation(db, organisation, async (tx) => {
    const rows = await listEntries(tx, organisation, 0, 100_000)
    const entries: RegisterEntry[] = rows.map(({ entry }) => JSON.parse(entry))
    let chain = CHAIN_START
    for (const [place, row] of rows.entries()) {
      const entry = entries[place]
      if (entry === undefined) throw new Error('An entry is missing.')
      expect(entry.sequence).toBe(place)
      expect(canonicalEntry(entry)).toBe(row.entry)
      chain = chainHash(chain, leafHash(entry))
      expect(bytesToHex(chain)).toBe(row.chain_hash)
    }
    const checkpoint = await newestCheckpoint(tx, organisation)
    if (checkpoint === undefined) return entries
    const leaves = rows.map(({ leaf_hash }) => hexToBytes(leaf_hash))
    expect(checkpoint.size).toBe(rows.length)
    expect(checkpoint.root).toBe(bytesToHex(rootOf(leaves)))
    const parsed = parseCheckpoint(checkpoint.signed)
    if (!parsed.ok) throw new Error(parsed.message)
    const key = createPublicKey(
      new X509Certificate(checkpoint.certificate).publicKey.export({ format: 'pem', type: 'spki' }),
    )
    const holds = await verifyCheckpoint(parsed.checkpoint, async (data, signature) =>
      verify('sha256', data, { key, dsaEncoding: 'ieee-p1363' }, signature),
    )
    expect(holds).toBe(true)
    expect(parsed.checkpoint.root).toBe(checkpoint.root)
    return entries
  })
}
