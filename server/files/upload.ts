import { type ObjectKey, objectKey } from './object-key.ts'

/** Bytes of each part but the last. */
export const CHUNK = 262_144

/** What an uploader says before sending anything. */
export interface Declared {
  /** As the uploader calls the file; shown only after `displayName`. */
  readonly name: string
  readonly size: number
  readonly sha256: string
}

/**
 * An upload on its way. The file is cut at fixed places, every `CHUNK` bytes, so that parts may come in any order,
 * twice, or over several connections, and what is missing is always known.
 */
export interface Upload extends Declared {
  readonly id: string
  readonly organisation: string
  readonly uploader: string
  readonly state: 'open' | 'complete'
  readonly expires: Date
  /** The SHA-256 of each part that has come, by its place; nothing for those that are missing. */
  readonly parts: readonly (string | null)[]
}

export type UploadProblem =
  | { readonly code: 'empty' }
  | { readonly code: 'too-large'; readonly limit: number }
  | { readonly code: 'bad-hash' }
  | { readonly code: 'unknown' }
  | { readonly code: 'expired' }
  | { readonly code: 'bad-offset'; readonly offset: number }
  | { readonly code: 'bad-length'; readonly expected: number; readonly found: number }
  | { readonly code: 'incomplete'; readonly missing: readonly number[] }
  | { readonly code: 'other-content' }

export type Checked<Value> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly problem: UploadProblem }

const good = <Value>(value: Value): Checked<Value> => ({ ok: true, value })
const bad = (problem: UploadProblem): { readonly ok: false; readonly problem: UploadProblem } => ({
  ok: false,
  problem,
})

export const partCount = (size: number): number => Math.ceil(size / CHUNK)

/** Judges what an uploader declares. */
export function checkDeclared({ size, sha256 }: Declared, limit: number): Checked<null> {
  if (!Number.isInteger(size) || size < 1) return bad({ code: 'empty' })
  if (size > limit) return bad({ code: 'too-large', limit })
  if (!/^[0-9a-f]{64}$/.test(sha256)) return bad({ code: 'bad-hash' })
  return good(null)
}

/** The place of a part that begins at an offset and has a length, where the upload still takes it. */
export function acceptPart(upload: Upload, offset: number, length: number, now: Date): Checked<number> {
  if (upload.state === 'open' && upload.expires <= now) return bad({ code: 'expired' })
  const place = offset / CHUNK
  if (!Number.isInteger(place) || place < 0 || place >= partCount(upload.size))
    return bad({ code: 'bad-offset', offset })
  const expected = Math.min(CHUNK, upload.size - offset)
  return length === expected ? good(place) : bad({ code: 'bad-length', expected, found: length })
}

/** Offsets of the parts that have not come yet; none for a complete upload. */
export function missing(upload: Upload): number[] {
  if (upload.state === 'complete') return []
  return Array.from({ length: partCount(upload.size) }, (_, place) => place)
    .filter((place) => (upload.parts[place] ?? null) === null)
    .map((place) => place * CHUNK)
}

/** The stored parts of an upload in their order, where all have come. */
export function allParts(upload: Upload, now: Date): Checked<readonly ObjectKey[]> {
  if (upload.expires <= now) return bad({ code: 'expired' })
  const lacking = missing(upload)
  if (lacking.length > 0) return bad({ code: 'incomplete', missing: lacking })
  return good(upload.parts.flatMap((sha256) => (sha256 === null ? [] : [partKey(upload, sha256)])))
}

/** Where the whole of an upload lies once it is complete. */
export const wholeOf = ({ organisation, sha256 }: Upload): ObjectKey =>
  objectKey({ organisation, kind: 'upload', sha256 })

/** Where a part of an upload lies, by the hash of the part. */
export const partKey = ({ organisation }: Upload, sha256: string): ObjectKey =>
  objectKey({ organisation, kind: 'chunk', sha256 })
