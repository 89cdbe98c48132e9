import type { SealRoom } from './seal-room.ts'
import type { FaceName, SvgStyle } from './style.ts'

/** The five fonts that a page is set in, as the bytes of TrueType files. */
export type FontName = FaceName

/** Running text at the top or foot of a page; `{page}` and `{pages}` stand for the numbers. Empty text prints nothing. */
export interface RunningText {
  readonly left: string
  readonly right: string
}

export type Running = RunningText | ((place: { readonly page: number; readonly pages: number }) => RunningText)

/** A file that travels inside the PDF. */
export interface Attachment {
  readonly name: string
  /** Media type, `application/yaml`. */
  readonly type: string
  readonly bytes: Uint8Array
  /** ISO 19005-3, 6.8: what the file is to the page. */
  readonly relationship: 'Source' | 'Data' | 'Alternative' | 'Supplement' | 'Unspecified'
  readonly description: string
  /** ISO 8601 date and time. */
  readonly created: string
}

export interface PaperOptions {
  readonly fonts: Readonly<Record<FontName, Uint8Array>>
  readonly title: string
  readonly author: string
  readonly subject?: string
  readonly language: 'en'
  /** ISO 8601 date and time; the only clock that the page knows. */
  readonly created: string
  /** A word across each page, such as DRAFT. */
  readonly watermark?: string
  readonly header?: Running
  readonly footer?: Running
  readonly attachments?: readonly Attachment[]
  /** Keeps room for a seal in the name of whoever will put it there. */
  readonly seal?: SealRoom
  /** JPEG files by the name that `<img src>` uses. */
  readonly pictures?: Readonly<Record<string, Uint8Array>>
  /** What a class means inside `<svg>`. */
  readonly svgStyles?: Readonly<Record<string, SvgStyle>>
  /** `PDF/A-3a` (with PDF/UA-1) unless given. `PDF/A-1b` serves checkers that know no later part; it carries no attachments. */
  readonly flavour?: 'PDF/A-3a' | 'PDF/A-1b'
}
