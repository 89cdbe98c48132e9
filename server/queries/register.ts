import type { RegisterEntry } from '#core/register/entry.ts'
import type { NodePlace } from '#core/register/merkle.ts'
import type { Tx } from '#server/db.ts'

/** How far a register has come; hashes in hex. */
export interface HeadRow {
  readonly size: number
  readonly chain_hash: string
  readonly peaks: readonly string[]
}

/** The register's head, locked until the transaction ends: one entry after the other, no gap, no fork. */
export async function lockHead(tx: Tx, organisation: string, start: string): Promise<HeadRow> {
  await tx('register_heads')
    .insert({ organisation_id: organisation, size: 0, chain_hash: start, peaks: '[]' })
    .onConflict('organisation_id')
    .ignore()
  const row = await tx('register_heads')
    .where({ organisation_id: organisation })
    .forUpdate()
    .first<HeadRow | undefined>('size', 'chain_hash', 'peaks')
  if (row === undefined) throw new Error('The register has no head.')
  return row
}

export interface NewEntry {
  readonly organisation: string
  readonly document: string
  readonly sequence: number
  readonly kind: RegisterEntry['kind']
  readonly entry: string
  readonly leafHash: string
  readonly head: HeadRow
  readonly nodes: readonly (NodePlace & { readonly hash: string })[]
  readonly now: Date
}

export async function insertEntry(tx: Tx, made: NewEntry): Promise<void> {
  const { organisation, head, nodes } = made
  await tx('register_entries').insert({
    organisation_id: organisation,
    sequence: made.sequence,
    kind: made.kind,
    document_id: made.document,
    entry: made.entry,
    leaf_hash: made.leafHash,
    chain_hash: head.chain_hash,
    written_at: made.now,
  })
  await tx('register_nodes').insert(nodes.map((node) => ({ organisation_id: organisation, ...node })))
  await tx('register_heads')
    .where({ organisation_id: organisation })
    .update({ size: head.size, chain_hash: head.chain_hash, peaks: JSON.stringify(head.peaks) })
}

export interface EntryRow {
  readonly sequence: number
  readonly kind: RegisterEntry['kind']
  readonly document_id: string
  readonly entry: string
  readonly leaf_hash: string
  readonly chain_hash: string
  readonly written_at: Date
}

const ENTRY_COLUMNS = ['sequence', 'kind', 'document_id', 'entry', 'leaf_hash', 'chain_hash', 'written_at'] as const

export async function findEntry(
  tx: Tx,
  organisation: string,
  document: string,
  kind: RegisterEntry['kind'],
): Promise<EntryRow | undefined> {
  return await tx('register_entries')
    .where({ organisation_id: organisation, document_id: document, kind })
    .first<EntryRow | undefined>(...ENTRY_COLUMNS)
}

/** A stretch of the register, in its order. */
export async function listEntries(tx: Tx, organisation: string, from: number, limit: number): Promise<EntryRow[]> {
  return await tx('register_entries')
    .where('organisation_id', organisation)
    .where('sequence', '>=', from)
    .orderBy('sequence')
    .limit(limit)
    .select<EntryRow[]>(...ENTRY_COLUMNS)
}

export async function findHead(tx: Tx, organisation: string): Promise<HeadRow | undefined> {
  return await tx('register_heads')
    .where({ organisation_id: organisation })
    .first<HeadRow | undefined>('size', 'chain_hash', 'peaks')
}

/** Hashes in hex of full subtrees, by `level/index`. */
export async function readNodes(
  tx: Tx,
  organisation: string,
  places: readonly NodePlace[],
): Promise<ReadonlyMap<string, string>> {
  const rows =
    places.length === 0
      ? []
      : await tx('register_nodes')
          .where('organisation_id', organisation)
          .whereIn(
            ['level', 'index'],
            places.map(({ level, index }) => [level, index]),
          )
          .select<{ level: number; index: number; hash: string }[]>('level', 'index', 'hash')
  return new Map(rows.map(({ level, index, hash }) => [`${level}/${index}`, hash]))
}

export interface CheckpointRow {
  readonly size: number
  readonly root: string
  readonly signed: string
  readonly certificate: string
  readonly made_at: Date
}

const CHECKPOINT_COLUMNS = ['size', 'root', 'signed', 'certificate', 'made_at'] as const

export async function insertCheckpoint(tx: Tx, organisation: string, checkpoint: CheckpointRow): Promise<void> {
  await tx('checkpoints').insert({ organisation_id: organisation, ...checkpoint })
}

/** The first checkpoint that covers an entry: it was made with it, so that the proof is the same on every day. */
export async function checkpointOver(
  tx: Tx,
  organisation: string,
  sequence: number,
): Promise<CheckpointRow | undefined> {
  return await tx('checkpoints')
    .where('organisation_id', organisation)
    .where('size', '>', sequence)
    .orderBy('size')
    .first<CheckpointRow | undefined>(...CHECKPOINT_COLUMNS)
}

export async function newestCheckpoint(tx: Tx, organisation: string): Promise<CheckpointRow | undefined> {
  return await tx('checkpoints')
    .where('organisation_id', organisation)
    .orderBy('size', 'desc')
    .first<CheckpointRow | undefined>(...CHECKPOINT_COLUMNS)
}

export async function listCheckpoints(tx: Tx, organisation: string): Promise<CheckpointRow[]> {
  return await tx('checkpoints')
    .where('organisation_id', organisation)
    .orderBy('size')
    .select<CheckpointRow[]>(...CHECKPOINT_COLUMNS)
}

/** Everything that happened to a document, in the order of the register. */
export async function entriesOf(tx: Tx, organisation: string, document: string): Promise<EntryRow[]> {
  return await tx('register_entries')
    .where({ organisation_id: organisation, document_id: document })
    .orderBy('sequence')
    .select<EntryRow[]>(...ENTRY_COLUMNS)
}

/** Checkpoints, the newest first, of those smaller than `before`; one more than asked for. */
export async function pageOfCheckpoints(
  tx: Tx,
  organisation: string,
  before: number | undefined,
  limit: number,
): Promise<CheckpointRow[]> {
  const query = tx('checkpoints')
    .where('organisation_id', organisation)
    .orderBy('size', 'desc')
    .limit(limit + 1)
  if (before !== undefined) query.where('size', '<', before)
  return await query.select<CheckpointRow[]>(...CHECKPOINT_COLUMNS)
}
