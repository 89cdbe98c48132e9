import { createHash } from 'node:crypto'
import { type Kind, type ObjectKey, objectKey } from '#server/files/object-key.ts'

export const sha256 = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex')

/** The organisation that all tests of files write for, unless they say another. */
export const OURS = 'fennmark-electric'

export const keyFor = (bytes: Uint8Array, kind: Kind = 'source', organisation = OURS): ObjectKey =>
  objectKey({ organisation, kind, sha256: sha256(bytes) })

export async function collected<Item>(items: AsyncIterable<Item>): Promise<Item[]> {
  const all: Item[] = []
  for await (const item of items) all.push(item)
  return all
}
