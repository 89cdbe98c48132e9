import { parseCheckpoint } from '#core/register/checkpoint.ts'
import type { Proof } from '#core/register/proof.ts'
import type { Entry, Particulars } from '../blocks.ts'
import { capital, dateText, daysText, timeText } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { signatoryText } from './signatory.ts'

const entry = (anchor: string, term: string, detail: string | undefined, note?: string): readonly Entry[] =>
  detail === undefined ? [] : [{ anchor, term, detail, ...(note !== undefined && { note }) }]

function place({ install: { site } }: ReportScene): string | undefined {
  const { position } = site
  if (!position) return undefined
  const { latitude, longitude, altitude } = position
  const height = altitude === undefined ? '' : `, ${altitude} m above sea level`
  const north = `${Math.abs(latitude)}° ${latitude < 0 ? 'S' : 'N'}`
  const east = `${Math.abs(longitude)}° ${longitude < 0 ? 'W' : 'E'}`
  return `${north}, ${east}${height}`
}

/** The head of the register when the report was issued: printed, so that nobody can give the register another past. */
function headText({ checkpoint }: Proof): string | undefined {
  const parsed = parseCheckpoint(checkpoint)
  return parsed.ok ? `Checkpoint of ${parsed.checkpoint.size} entries ${grouped(parsed.checkpoint.root)}` : undefined
}

/** Number, issuer and predecessor of an issued report; of a draft, that it is one. */
function issueEntries({ context: { issue, draft } }: ReportScene): readonly Entry[] {
  if (!issue) return entry('report/issue', 'Issued', draft ? 'not issued: a draft' : undefined)
  const { number, issued_at, organisation, issued_by, reviewed_by, replaces, register, check_address } = issue
  return [
    ...entry('report/number', 'Report', number),
    ...entry('report/issue', 'Issued', timeText(issued_at)),
    ...entry('report/organisation', 'Issuing body', organisation.name, organisation.address.join(', ')),
    ...entry('report/reviewed', 'Reviewed by', signatoryText(reviewed_by)),
    ...entry('report/authorised', 'Authorised by', signatoryText(issued_by)),
    ...entry('report/replaces', 'Replaces', replaces?.number, replaces?.reason),
    ...entry('report/checkpoint', 'Register', `entry ${register.index + 1}`, headText(register)),
    ...entry('report/check', 'Check at', check_address),
  ]
}

/** Who, where, when, and by which rules: what identifies the report. */
export function identity(scene: ReportScene): Particulars {
  const { install, judged, context } = scene
  const { report, site, supply, people } = install
  const { book } = judged
  const company = [people?.tested_by?.company, people?.installed_by?.company].find((name) => name !== undefined)
  return {
    kind: 'particulars',
    anchor: 'report/identity',
    beside: true,
    lists: [
      {
        entries: [
          ...entry('site/name', 'Site', site.name),
          ...entry('site/address', 'Address', site.address.join(', ')),
          ...entry('site/customer', 'Customer', site.customer ?? 'not stated'),
          ...entry('site/premises', 'Premises', site.premises),
          ...entry('site/position', 'Position', place(scene)),
          ...entry('supply/operator', 'Grid operator', supply.operator),
          ...entry('people/company', 'Contractor', company),
          ...issueEntries(scene),
        ],
      },
      {
        entries: [
          ...entry('report/reference', 'Reference', report.reference),
          ...entry('report/purpose', 'Purpose', capital(report.purpose)),
          ...entry('report/inspected', 'Inspected', daysText(report.inspected)),
          ...entry('report/next-due', 'Next due', report.next_due && dateText(report.next_due)),
          ...entry(
            'report/rulebook',
            'Rule book',
            `${book.title}, ${book.id} ${book.version}`,
            `SHA-256 ${grouped(book.hash)}`,
          ),
          ...entry('report/source', 'Source file', context.file, `SHA-256 ${grouped(context.hash)}`),
        ],
      },
    ],
  }
}

/** A hash in groups of eight, so that it can be read out and broken between lines. */
export function grouped(hash: string): string {
  return hash.replace(/.{8}(?=.)/g, '$& ')
}
