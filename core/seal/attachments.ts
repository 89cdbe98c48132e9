import { strFromU8 } from 'fflate'
import type { PdfFile } from './pdf-file.ts'
import { type Dictionary, PdfError, type Value } from './pdf-values.ts'

/** A file that travels inside a PDF. */
export interface Embedded {
  readonly name: string
  /** What it is to the page: `Source`, `Data`, `Supplement`. */
  readonly relationship: string
  readonly bytes: Uint8Array
}

const MARK = [0xfe, 0xff] as const

/** A text of a PDF: UTF-16 behind its mark, else ASCII. */
function textOf(value: Value | undefined): string {
  if (value?.kind !== 'text') throw new PdfError('An embedded file has no name.')
  const { bytes } = value
  if (MARK.some((byte, at) => bytes[at] !== byte)) return strFromU8(bytes, true)
  const units = Array.from(
    { length: (bytes.length - 2) >> 1 },
    (_, at) => ((bytes[at * 2 + 2] ?? 0) << 8) | (bytes[at * 2 + 3] ?? 0),
  )
  return String.fromCharCode(...units)
}

function embedded(file: PdfFile, entry: Value): Embedded {
  const value = file.follow(entry)
  if (value?.kind !== 'dictionary') throw new PdfError('An embedded file is not described.')
  const relationship = value.entries.get('AFRelationship')
  return {
    name: textOf(value.entries.get('UF')),
    relationship: relationship?.kind === 'name' ? relationship.name : '',
    bytes: file.stream(file.dictionary(value, 'EF').entries.get('F')),
  }
}

/** Every file that a PDF carries, in the order in which it names them. */
export function attachmentsOf(file: PdfFile, catalog: Dictionary = file.catalog): Embedded[] {
  const list = file.follow(catalog.entries.get('AF'))
  return list?.kind === 'list' ? list.values.map((entry) => embedded(file, entry)) : []
}
