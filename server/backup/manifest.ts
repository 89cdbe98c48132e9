import { createHash } from 'node:crypto'

/** What a backup holds, written last: a folder without it is no backup. */
export interface Manifest {
  readonly skerry: string
  readonly made_at: string
  readonly rows: Readonly<Record<string, number>>
  readonly dump_sha256: string
  /** Keys of the stored objects, each of which ends with the hash of its content. */
  readonly files: readonly string[]
}

export const MANIFEST = 'manifest.json'
export const DUMP = 'database.dump'
export const FILES = 'files'

export const sha256Of = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex')

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null

/** Reads a manifest; nothing when the text is none. */
export function readManifest(text: string): Manifest | undefined {
  const parsed: unknown = JSON.parse(text)
  if (!isRecord(parsed) || !isRecord(parsed['rows']) || !Array.isArray(parsed['files'])) return undefined
  const { skerry, made_at, dump_sha256 } = parsed
  if (typeof skerry !== 'string' || typeof made_at !== 'string' || typeof dump_sha256 !== 'string') return undefined
  const rows = Object.fromEntries(Object.entries(parsed['rows']).map(([table, count]) => [table, Number(count)]))
  return { skerry, made_at, dump_sha256, rows, files: parsed['files'].map(String) }
}
