import { strToU8 } from 'fflate'
import type { Judged } from '#core/engine.ts'
import type { Install } from '#core/install.ts'
import type { Attachment, FontName, PaperOptions } from '#core/paper/options.ts'
import { typeset } from '#core/paper/paper.ts'
import { sha256 } from '#core/paper/sha256.ts'
import { factsText } from './facts.ts'
import { fieldsheetModel } from './fieldsheet.ts'
import { EMBEDDED, type Issue, type IssueFile, misfit } from './issue.ts'
import { reportModel } from './model.ts'
import { fillPage } from './page.ts'
import { verdictsOf } from './verdict-list.ts'

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
  /** Makes it an issued report: no draft, dated by its issue, with room for the seal. */
  readonly issue?: Issue
}

/** The date of a file without dates: it must print the same bytes on every day. */
const UNDATED = '2000-01-01'

/** The date that a page carries: the last day of the inspection. */
export function createdFrom({ report }: Install): string {
  return `${report.inspected?.to ?? report.inspected?.from ?? UNDATED}T00:00:00Z`
}

const hex = (bytes: Uint8Array): string => Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')

/** The record of the issue and its place in the register travel with an issued report. */
function issueAttachments({ book, findings }: Judged, { register, ...record }: Issue, created: string): Attachment[] {
  const json = (value: object): Uint8Array => strToU8(`${JSON.stringify(value, null, 2)}\n`)
  return [
    {
      name: EMBEDDED.issue,
      type: 'application/json',
      bytes: json({
        ...record,
        rulebook: { id: book.id, version: book.version, hash: book.hash },
        verdicts: verdictsOf(findings),
      } satisfies IssueFile),
      relationship: 'Data',
      description: 'What is printed beyond the file: number, names, accepted words',
      created,
    },
    {
      name: EMBEDDED.register,
      type: 'application/json',
      bytes: json(register),
      relationship: 'Supplement',
      description: 'Place in the register: entry, proof, signed checkpoint',
      created,
    },
  ]
}

function attachments(judged: Judged, { text, file, created, issue }: RenderOptions): Attachment[] {
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
      name: EMBEDDED.facts,
      type: 'application/json',
      bytes: strToU8(factsText(judged)),
      relationship: 'Data',
      description: 'Every computed quantity, with its formula and source',
      created,
    },
    ...(issue ? issueAttachments(judged, issue, created) : []),
  ]
}

function paperOptions(
  { install, book }: Judged,
  { fonts, created, draft, issue }: RenderOptions,
  kind: string,
): PaperOptions {
  const { report, site, people } = install
  const name = issue?.number ?? report.reference
  return {
    fonts,
    title: `${kind} ${name}: ${site.name}`,
    author: issue?.organisation.name ?? people?.tested_by?.name ?? people?.installed_by?.name ?? 'not named',
    subject: report.purpose,
    language: 'en',
    created,
    header: { left: `${name} · ${site.name}`, right: kind },
    footer: {
      left: `Rule book ${book.id} ${book.version}`,
      right: `${issue ? `${name} · ` : ''}page {page} of {pages}`,
    },
    ...(draft && { watermark: 'DRAFT' }),
    ...(issue && { seal: { name: issue.organisation.name, reason: `Issue of report ${name}` } }),
  }
}

/** An issued report is dated by its issue, and refuses to be printed with an entry that is about something else. */
function settled(judged: Judged, options: RenderOptions, hash: string): RenderOptions {
  const { issue } = options
  if (!issue) return options
  const wrong = misfit(issue, { source: hash, facts: hex(sha256(strToU8(factsText(judged)))) })
  if (wrong !== undefined) throw new RangeError(`Report ${issue.number} cannot be issued. ${wrong}`)
  return { ...options, created: issue.issued_at, draft: false }
}

/**
 * The report as PDF/A-3, with the file and every computed quantity embedded. The same input gives the same bytes.
 *
 * @throws PaperError where a text holds a character that no font has; RangeError where the entry of an issue is not about it
 */
export function renderReport(judged: Judged, options: RenderOptions): Uint8Array {
  const { text, file, issue } = options
  const hash = hex(sha256(strToU8(text)))
  const plan = settled(judged, options, hash)
  const model = reportModel(judged, { file, hash, draft: plan.draft, ...(issue && { issue }) })
  return typeset(fillPage('report', model), {
    ...paperOptions(judged, plan, 'Test report'),
    attachments: attachments(judged, plan),
  })
}

/** The sheet for the site: each test point with its limit, and a box where there is no reading yet. */
export function renderFieldsheet(judged: Judged, options: RenderOptions): Uint8Array {
  return typeset(
    fillPage('fieldsheet', fieldsheetModel(judged)),
    paperOptions(judged, { ...options, draft: false }, 'Field sheet'),
  )
}
