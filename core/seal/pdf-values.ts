/** A value inside a PDF, with where it stands: offsets from the start of the file, the end exclusive. */
export type Value =
  | { readonly kind: 'number'; readonly number: number }
  | { readonly kind: 'word'; readonly word: string }
  | { readonly kind: 'name'; readonly name: string }
  | Text
  | { readonly kind: 'reference'; readonly id: number }
  | List
  | Dictionary

/** A text or a run of bytes, in `(…)` or in `<…>`. */
export interface Text {
  readonly kind: 'text'
  readonly bytes: Uint8Array
  readonly start: number
  readonly end: number
}

export interface List {
  readonly kind: 'list'
  readonly values: readonly Value[]
  readonly start: number
  readonly end: number
}

export interface Dictionary {
  readonly kind: 'dictionary'
  readonly entries: ReadonlyMap<string, Value>
  readonly end: number
}

/** Bytes that are no PDF, or none as Skerry writes it; the message says what was found. */
export class PdfError extends Error {
  override readonly name = 'PdfError'
}
