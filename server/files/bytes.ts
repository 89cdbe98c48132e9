import type { ObjectKey } from './object-key.ts'
import { DamagedObject, type ObjectStore } from './store.ts'

/**
 * A stored object as bytes, its hash verified; nothing where there is none.
 * Throws where it holds more than the limit, before reading it.
 */
export async function bytesOf(store: ObjectStore, key: ObjectKey, limit: number): Promise<Buffer | undefined> {
  const object = await store.get(key)
  if (!object) return undefined
  if (object.size > limit) {
    object.stream.destroy()
    throw new Error(`The stored object ${key} has ${object.size} bytes, more than the ${limit} asked for.`)
  }
  const chunks: Buffer[] = []
  for await (const chunk of object.stream) chunks.push(chunk)
  const bytes = Buffer.concat(chunks)
  if (bytes.length !== object.size) throw new DamagedObject(key)
  return bytes
}
