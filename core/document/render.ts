import type Handlebars from 'handlebars'
import runtime from 'handlebars/runtime.js'
import type { Judged } from '#core/engine.ts'
import templates from '#core/generated/document-templates.js'
import type { Install } from '#core/install.ts'
import { encodeUtf8 } from '#core/judge/canonical.ts'
import type { Attachment, FontName } from '#core/paper/options.ts'
import { typeset } from '#core/paper/paper.ts'
import { sha256 } from '#core/paper/sha256.ts'
import { factsOf } from '#core/report/facts.ts'
import { fieldsheetModel } from './fieldsheet.ts'
import type { ReportModel } from './model.ts'
import { reportModel } from './report.ts'

export interface RenderOptions {
  /** The file as it was entered, to be embedded. */
  readonly text: string
  /** Its name, without folders. */
  readonly file: string
  readonly fonts: Readonly<Record<FontName, Uint8Array>>
  /** ISO 8601 date and time; the only clock that the paper knows. */
  readonly created: string
  readonly draft: boolean
}

/** A day that says «not dated»: a file without dates must print the same bytes on every day. */
const UNDATED = '2000-01-01'

/** The date that a draft carries: the last day of the inspection, so that the same file always prints the same bytes. */
export function createdFrom({ report }: Install): string {
  return `${report.inspected?.to ?? report.inspected?.from ?? UNDATED}T00:00:00Z`
}

/** The package declares no types for its runtime: it is the full engine without the compiler. */
const engine = (runtime as unknown as typeof Handlebars).create()
for (const [name, specification] of Object.entries(templates))
  engine.registerPartial(name, engine.template(specification()))

/** Fills the page from its model: the HTML that the browser shows and the paper is set from. */
export function pageOf(model: Partial<ReportModel>): string {
  const page = templates['report']
  if (!page) throw new Error('The template of the report is missing: generate the templates again.')
  return engine.template<object>(page())(model)
}

const hex = (bytes: Uint8Array): string => Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')

function running(judged: Judged, what: string) {
  const { report, site } = judged.install
  return {
    header: { left: `${report.reference} · ${site.name}`, right: what },
    footer: {
      left: `Rule book ${judged.book.id} ${judged.book.version} · ${judged.book.hash.slice(0, 16)}`,
      right: 'page {page} of {pages}',
    },
  }
}

/** The report as a tagged PDF, with the file and every computed quantity embedded. The same input gives the same bytes. */
export function renderReport(judged: Judged, { text, file, fonts, created, draft }: RenderOptions): Uint8Array {
  const source = encodeUtf8(text)
  const model = reportModel(judged, { file, sourceHash: hex(sha256(source)) })
  const attachments: Attachment[] = [
    {
      name: file,
      type: 'application/yaml',
      bytes: source,
      relationship: 'Source',
      description: 'The installation as entered',
      created,
    },
    {
      name: 'facts.json',
      type: 'application/json',
      bytes: encodeUtf8(`${JSON.stringify(factsOf(judged), null, 2)}\n`),
      relationship: 'Data',
      description: 'Every computed quantity',
      created,
    },
  ]
  return typeset(pageOf(model), {
    fonts,
    created,
    attachments,
    language: 'en',
    title: `${judged.install.report.reference}: ${judged.install.site.name}`,
    author: judged.install.people?.tested_by?.name ?? judged.install.people?.installed_by?.name ?? 'not named',
    subject: model.lead,
    ...(draft && { watermark: 'DRAFT' }),
    ...running(judged, draft ? 'Draft report' : 'Report'),
  })
}

/** The sheet for the site as a tagged PDF. */
export function renderFieldsheet(judged: Judged, { fonts, created }: RenderOptions): Uint8Array {
  const { report, site } = judged.install
  const model = {
    kicker: `Field sheet · ${report.reference}`,
    title: site.name,
    lead: 'Each test point in the order of the tests, and what its reading is held against',
    place: site.address.join(', '),
    sections: fieldsheetModel(judged),
    end: 'Bring the readings back with skerry fill, or write them into the file.',
  }
  return typeset(pageOf(model), {
    fonts,
    created,
    language: 'en',
    title: `Field sheet ${report.reference}: ${site.name}`,
    author: judged.install.people?.tested_by?.name ?? 'not named',
    ...running(judged, 'Field sheet'),
  })
}
