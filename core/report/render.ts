import { strToU8 } from 'fflate'
import type { Judged } from '#core/engine.ts'
import type { Install } from '#core/install.ts'
import type { Attachment, FontName, PaperOptions } from '#core/paper/options.ts'
import { typeset } from '#core/paper/paper.ts'
import { sha256 } from '#core/paper/sha256.ts'
import { factsOf } from './facts.ts'
import { fieldsheetModel } from './fieldsheet.ts'
import { reportModel } from './model.ts'
import { fillPage } from './page.ts'

export interface RenderOptions {
  /** The file as it was entered, to be embedded. */
  readonly text: string
  /** Its name, without folders. */
  readonly file: string
  readonly fonts: Readonly<Record<FontName, Uint8Array>>
  /** ISO 8601 date and time; the only clock that the paper knows. */
  readonly created: string
  /** Prints DRAFT across each page. */
  readonly draft: boolean
}

/** The date of a file without dates: it must print the same bytes on every day. */
const UNDATED = '2000-01-01'

/** The date that a page carries: the last day of the inspection. */
export function createdFrom({ report }: Install): string {
  return `${report.inspected?.to ?? report.inspected?.from ?? UNDATED}T00:00:00Z`
}

const hex = (bytes: Uint8Array): string => Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')

function attachments(judged: Judged, { text, file, created }: RenderOptions): Attachment[] {
  return [
    {
      name: file,
      type: 'application/yaml',
      bytes: strToU8(text),
      relationship: 'Source',
      description: 'The installation as entered',
      created,
    },
    {
      name: 'facts.json',
      type: 'application/json',
      bytes: strToU8(`${JSON.stringify(factsOf(judged), null, 2)}\n`),
      relationship: 'Data',
      description: 'Every computed quantity, with its formula and source',
      created,
    },
  ]
}

function paperOptions({ install, book }: Judged, { fonts, created, draft }: RenderOptions, kind: string): PaperOptions {
  const { report, site, people } = install
  return {
    fonts,
    title: `${kind} ${report.reference}: ${site.name}`,
    author: people?.tested_by?.name ?? people?.installed_by?.name ?? 'not named',
    subject: report.purpose,
    language: 'en',
    created,
    header: { left: `${report.reference} · ${site.name}`, right: kind },
    footer: { left: `Rule book ${book.id} ${book.version}`, right: 'page {page} of {pages}' },
    ...(draft && { watermark: 'DRAFT' }),
  }
}

/**
 * The report as PDF/A-3, with the file and every computed quantity embedded. The same input gives the same bytes.
 *
 * @throws PaperError where a text holds a character that no font has
 */
export function renderReport(judged: Judged, options: RenderOptions): Uint8Array {
  const { text, file, draft } = options
  const model = reportModel(judged, { file, hash: hex(sha256(strToU8(text))), draft })
  return typeset(fillPage('report', model), {
    ...paperOptions(judged, options, 'Test report'),
    attachments: attachments(judged, options),
  })
}

/** The sheet for the site: each test point with its limit, and a box where there is no reading yet. */
export function renderFieldsheet(judged: Judged, options: RenderOptions): Uint8Array {
  return typeset(
    fillPage('fieldsheet', fieldsheetModel(judged)),
    paperOptions(judged, { ...options, draft: false }, 'Field sheet'),
  )
}
