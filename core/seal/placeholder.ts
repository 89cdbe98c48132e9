import { sha256 } from '@noble/hashes/sha2.js'
import { utf8ToBytes } from '@noble/hashes/utils.js'
import type { PdfFile } from './pdf-file.ts'
import { type Dictionary, type List, PdfError, type Text } from './pdf-values.ts'

/** The signature dictionary of a PDF: where its time, its ranges and the hole for the signature stand. */
export interface Placeholder {
  readonly dictionary: Dictionary
  readonly time: Text
  readonly ranges: List
  readonly hole: Text
}

/**
 * Finds the room for the seal: the only field of the form, whose signature is also the one that permits no changes.
 *
 * @throws PdfError where the PDF has none
 */
export function placeholderOf(file: PdfFile): Placeholder {
  const { catalog } = file
  if (!catalog.entries.has('AcroForm'))
    throw new PdfError('The PDF carries no seal: it is a draft, or no report of Skerry.')
  const fields = file.follow(file.dictionary(catalog, 'AcroForm').entries.get('Fields'))
  const [field, ...others] = fields?.kind === 'list' ? fields.values : []
  const described = file.follow(field)
  if (described?.kind !== 'dictionary' || others.length > 0) throw new PdfError('The PDF has no field for one seal.')
  const value = described.entries.get('V')
  const permitted = file.dictionary(catalog, 'Perms').entries.get('DocMDP')
  if (value?.kind !== 'reference' || permitted?.kind !== 'reference' || value.id !== permitted.id) {
    throw new PdfError('The seal is not the one that forbids changes.')
  }
  const dictionary = file.dictionary(described, 'V')
  const time = dictionary.entries.get('M')
  const ranges = dictionary.entries.get('ByteRange')
  const hole = dictionary.entries.get('Contents')
  if (time?.kind !== 'text' || ranges?.kind !== 'list' || hole?.kind !== 'text') {
    throw new PdfError('The seal lacks its time, its ranges or its signature.')
  }
  return { dictionary, time, ranges, hole }
}

/** What is signed: everything but the hole. */
export function rangesAround({ hole }: Placeholder, size: number): readonly [number, number, number, number] {
  return [0, hole.start, hole.end, size - hole.end]
}

/** SHA-256 over everything but the hole. */
export function digestAround(bytes: Uint8Array, { hole }: Placeholder): Uint8Array {
  return sha256.create().update(bytes.subarray(0, hole.start)).update(bytes.subarray(hole.end)).digest()
}

/** `2026-10-21T09:30:00Z` as PDF writes it. */
export function pdfTime(at: string): string {
  return `D:${at.slice(0, 19).replaceAll(/[-:T]/g, '')}Z`
}

/** The same the other way; `undefined` where it is no time in UTC. */
export function timeFrom(bytes: Uint8Array): string | undefined {
  const [, ...parts] = /^D:(\d{4})(\d\d)(\d\d)(\d\d)(\d\d)(\d\d)Z$/.exec(String.fromCharCode(...bytes)) ?? []
  const [year, month, day, hour, minute, second] = parts
  return second === undefined ? undefined : `${year}-${month}-${day}T${hour}:${minute}:${second}Z`
}

/** Text of just that many bytes, filled up with blanks. */
function fitted(text: string, { start, end }: { readonly start: number; readonly end: number }): Uint8Array {
  if (text.length > end - start) throw new PdfError(`“${text}” does not fit its ${end - start} bytes.`)
  return utf8ToBytes(text.padEnd(end - start))
}

/**
 * Writes the time and the ranges into the room for the seal; the hole is emptied.
 *
 * @param file an issued report, sealed or not
 * @param at time of sealing, RFC 3339 in UTC; parts of a second are left out
 * @returns the whole file, as long as before
 */
export function prepared(file: PdfFile, at: string): Uint8Array {
  const placeholder = placeholderOf(file)
  const { time, ranges, hole } = placeholder
  const bytes = file.bytes.slice()
  bytes.set(fitted(`(${pdfTime(at)})`, time), time.start)
  bytes.set(fitted(`[${rangesAround(placeholder, bytes.length).join(' ')}]`, ranges), ranges.start)
  bytes.fill(0x30, hole.start + 1, hole.end - 1)
  return bytes
}
