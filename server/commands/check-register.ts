import { bytesToHex, hexToBytes, utf8ToBytes } from '@noble/hashes/utils.js'
import { parseCheckpoint } from '#core/register/checkpoint.ts'
import { CHAIN_START, chainHash } from '#core/register/entry.ts'
import { append, EMPTY_FRONTIER, type Frontier, rootOfFrontier } from '#core/register/frontier.ts'
import { hashOfLeaf } from '#core/register/merkle.ts'
import type { Tx } from '#server/db.ts'
import { type CheckpointRow, type EntryRow, findHead, listCheckpoints, listEntries } from '#server/queries/register.ts'

/** Something that is not as it was written. */
export interface Damage {
  readonly where: string
  readonly what: string
}

const damage = (where: string, what: string): Damage => ({ where, what })

/** Entries read at a time. */
const PAGE = 1000

interface Walk {
  frontier: Frontier
  chain: Uint8Array
}

/** Each entry must hash to its leaf, and each leaf to the next link. */
function checkEntry(walk: Walk, row: EntryRow): Damage[] {
  const where = `register/${row.sequence}`
  const leaf = hashOfLeaf(utf8ToBytes(row.entry))
  const found: Damage[] = []
  if (row.sequence !== walk.frontier.size) found.push(damage(where, `stands where entry ${walk.frontier.size} should`))
  if (bytesToHex(leaf) !== row.leaf_hash) found.push(damage(where, 'its words do not have its hash'))
  walk.chain = chainHash(walk.chain, leaf)
  walk.frontier = append(walk.frontier, leaf)
  if (bytesToHex(walk.chain) !== row.chain_hash) found.push(damage(where, 'the chain breaks here'))
  return found
}

function checkCheckpoint({ frontier }: Walk, { size, root, signed }: CheckpointRow): Damage[] {
  const where = `checkpoint/${size}`
  const parsed = parseCheckpoint(signed)
  if (!parsed.ok || parsed.checkpoint.root !== root || parsed.checkpoint.size !== size)
    return [damage(where, 'the signed words are not those of its row')]
  return bytesToHex(rootOfFrontier(frontier)) === root ? [] : [damage(where, 'the entries do not lead to its root')]
}

/** Reads a whole register: entries, chain, tree, every checkpoint, and the head. */
export async function checkRegister(tx: Tx, organisation: string): Promise<Damage[]> {
  const found: Damage[] = []
  const walk: Walk = { frontier: EMPTY_FRONTIER, chain: CHAIN_START }
  const checkpoints = new Map((await listCheckpoints(tx, organisation)).map((row) => [row.size, row]))
  for (;;) {
    const rows = await listEntries(tx, organisation, walk.frontier.size, PAGE)
    for (const row of rows) {
      found.push(...checkEntry(walk, row))
      const checkpoint = checkpoints.get(walk.frontier.size)
      if (checkpoint !== undefined) found.push(...checkCheckpoint(walk, checkpoint))
      checkpoints.delete(walk.frontier.size)
    }
    if (rows.length < PAGE) break
  }
  for (const size of checkpoints.keys()) found.push(damage(`checkpoint/${size}`, 'the register is shorter than this'))
  const head = await findHead(tx, organisation)
  const { size, peaks } = walk.frontier
  const fits = head === undefined ? size === 0 : head.size === size && sameHashes(head.peaks, peaks)
  if (!fits || (head !== undefined && head.chain_hash !== bytesToHex(walk.chain)))
    found.push(damage('register', 'the head is not where the entries end'))
  return found
}

const sameHashes = (hex: readonly string[], hashes: readonly Uint8Array[]): boolean =>
  hex.length === hashes.length && hex.every((one, place) => one === bytesToHex(hashes[place] ?? hexToBytes('')))
