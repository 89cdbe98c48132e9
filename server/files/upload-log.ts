import type { Upload } from './upload.ts'

/** Whose upload. Another organisation's and another uploader's answers like one that is not there. */
export interface Whose {
  readonly organisation: string
  readonly uploader: string
}

/**
 * Where the rows of uploads are kept. Each function is one transaction, or part of the caller's.
 * Parts may come at the same moment in several processes, so `notePart` and `forgetParts` change the row in place.
 */
export interface UploadLog {
  /** Adds a row, or answers the one with the same uploader, hash and size that expires after `now`. */
  open(upload: Upload, now: Date): Promise<Upload>
  find(whose: Whose, id: string): Promise<Upload | undefined>
  /** Sets the hash of one part, and answers the row after that. */
  notePart(whose: Whose, id: string, place: number, sha256: string): Promise<Upload | undefined>
  /** Takes all parts back: together they were not what was declared. */
  forgetParts(whose: Whose, id: string): Promise<void>
  complete(whose: Whose, id: string): Promise<Upload | undefined>
  /** Removes rows that expired before a moment. Returns how many. */
  removeExpired(before: Date): Promise<number>
}
