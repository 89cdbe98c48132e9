import { createHash } from 'node:crypto'
import type { Readable } from 'node:stream'
import { type ObjectKey, partsOf } from './object-key.ts'
import type { Stored } from './store.ts'

const chunksOf = (body: Uint8Array | Readable): Iterable<Uint8Array> | AsyncIterable<Uint8Array> =>
  body instanceof Uint8Array ? [body] : body

/**
 * Reads a body to its end, hands each chunk on, and says whether it is what the key names.
 * A body above the limit is given up at the first byte too many. A stream that breaks off throws.
 */
export async function takeIn(
  key: ObjectKey,
  body: Uint8Array | Readable,
  limit: number,
  handOn: (chunk: Uint8Array) => Promise<void> | void,
): Promise<Stored> {
  const { sha256: wanted } = partsOf(key)
  const hash = createHash('sha256')
  let size = 0
  for await (const chunk of chunksOf(body)) {
    size += chunk.length
    if (size > limit) return { ok: false, reason: 'too large', limit }
    hash.update(chunk)
    await handOn(chunk)
  }
  const sha256 = hash.digest('hex')
  return sha256 === wanted ? { ok: true, size } : { ok: false, reason: 'other content', sha256 }
}
