import type { Readable } from 'node:stream'
import type { Kind, ObjectKey } from './object-key.ts'

/** What became of bytes that were to be stored. A refusal leaves nothing behind. */
export type Stored =
  | { readonly ok: true; readonly size: number }
  | { readonly ok: false; readonly reason: 'other content'; readonly sha256: string }
  | { readonly ok: false; readonly reason: 'too large'; readonly limit: number }

export interface ObjectFacts {
  readonly key: ObjectKey
  readonly size: number
  readonly type: string
  /** When it was last written. */
  readonly written: Date
}

export interface StoredObject extends ObjectFacts {
  /**
   * The bytes. The last of them are held back until the hash of all is known to be right, so that a damaged
   * object never arrives whole; then the stream fails with `DamagedObject`.
   */
  readonly stream: Readable
}

export interface Within {
  readonly organisation: string
  readonly kind?: Kind
}

/**
 * Objects named by their own content. Writing is all or nothing and may be repeated.
 * What is in nobody's way is not missed: `head`, `get` answer nothing for a key that holds nothing, `delete` is content.
 */
export interface ObjectStore {
  /** Stores bytes that hash to the key's SHA-256; anything else is refused. */
  put(key: ObjectKey, body: Uint8Array | Readable): Promise<Stored>
  get(key: ObjectKey): Promise<StoredObject | undefined>
  head(key: ObjectKey): Promise<ObjectFacts | undefined>
  /** Removes an object. Two records of an organisation may share one: ask the record first. */
  delete(key: ObjectKey): Promise<void>
  /** All objects within, in the order of their keys. */
  list(within: Within): AsyncIterable<ObjectFacts>
  /** Removes what writers that died before a moment left behind unseen. Returns how many. */
  sweep(before: Date): Promise<number>
}

/** What lies in the store is not what was put there. */
export class DamagedObject extends Error {
  constructor(readonly key: ObjectKey) {
    super(`The stored object ${key} is damaged: its content does not have the hash that names it.`)
    this.name = 'DamagedObject'
  }
}
