import { createHash } from 'node:crypto'
import { Readable } from 'node:stream'
import type { ObjectKey } from './object-key.ts'
import type { ObjectStore } from './store.ts'
import {
  acceptPart,
  allParts,
  type Checked,
  checkDeclared,
  type Declared,
  partCount,
  partKey,
  type Upload,
  type UploadProblem,
  wholeOf,
} from './upload.ts'
import type { UploadLog, Whose } from './upload-log.ts'

export interface UploadsOptions {
  readonly log: UploadLog
  readonly store: ObjectStore
  readonly now: () => Date
  readonly newId: () => string
  /** Largest file in bytes. */
  readonly limit: number
  /** How long an upload may stay unfinished, in ms. Parts must not be swept before twice that. */
  readonly lifetime: number
}

/** Files in parts over bad lines: declared, sent in any order, resumed, and taken only when the whole has the declared hash. */
export interface Uploads {
  /** Begins an upload. Declaring the same file again answers the upload that is already there, also a complete one. */
  declare(whose: Whose, declared: Declared): Promise<Checked<Upload>>
  find(whose: Whose, id: string): Promise<Checked<Upload>>
  /** Takes the part that begins at an offset; taking one twice changes nothing. */
  takePart(whose: Whose, id: string, offset: number, bytes: Uint8Array): Promise<Checked<Upload>>
  /** Puts the parts together; completing twice answers the same. `wholeOf` says where the whole lies. */
  complete(whose: Whose, id: string): Promise<Checked<Upload>>
}

const good = (value: Upload): Checked<Upload> => ({ ok: true, value })
const bad = (problem: UploadProblem): Checked<Upload> => ({ ok: false, problem })
const found = (upload: Upload | undefined): Checked<Upload> => (upload ? good(upload) : bad({ code: 'unknown' }))

export function uploads({ log, store, now, newId, limit, lifetime }: UploadsOptions): Uploads {
  async function* bytesOfAll(keys: readonly ObjectKey[]): AsyncGenerator<Buffer> {
    for (const key of keys) {
      const part = await store.get(key)
      if (!part) throw new Error(`A part of an upload is gone from the store: ${key}.`)
      yield* part.stream
    }
  }

  return {
    async declare(whose, { name, size, sha256 }) {
      const checked = checkDeclared({ name, size, sha256 }, limit)
      if (!checked.ok) return checked
      const moment = now()
      const expires = new Date(moment.getTime() + lifetime)
      const parts = Array.from({ length: partCount(size) }, () => null)
      return good(await log.open({ ...whose, id: newId(), name, size, sha256, state: 'open', expires, parts }, moment))
    },

    async find(whose, id) {
      return found(await log.find(whose, id))
    },

    async takePart(whose, id, offset, bytes) {
      const upload = await log.find(whose, id)
      if (!upload) return bad({ code: 'unknown' })
      const place = acceptPart(upload, offset, bytes.length, now())
      if (!place.ok) return place
      // The answer to the last part was lost on its way, and so it comes again.
      if (upload.state === 'complete') return good(upload)
      const sha256 = createHash('sha256').update(bytes).digest('hex')
      const stored = await store.put(partKey(upload, sha256), bytes)
      if (!stored.ok) throw new Error(`A part of an upload was not stored: ${stored.reason}.`)
      return found(await log.notePart(whose, id, place.value, sha256))
    },

    async complete(whose, id) {
      const upload = await log.find(whose, id)
      if (!upload) return bad({ code: 'unknown' })
      if (upload.state === 'complete') return good(upload)
      const parts = allParts(upload, now())
      if (!parts.ok) return parts
      const stored = await store.put(wholeOf(upload), Readable.from(bytesOfAll(parts.value)))
      if (!stored.ok) {
        // Which part is wrong cannot be known: all of them are asked for again.
        await log.forgetParts(whose, id)
        return bad({ code: 'other-content' })
      }
      return found(await log.complete(whose, id))
    },
  }
}
