import { textHash } from '#core/report/anchor.ts'
import { factsText } from '#core/report/facts.ts'
import type { Accepted, Issue, IssueRecord } from '#core/report/issue.ts'
import { renderReport } from '#core/report/render.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { paperFonts } from '#server/paper/fonts.ts'
import { findColleagues } from '#server/queries/colleagues.ts'
import { type DocumentRow, documentOf } from '#server/queries/documents.ts'
import { findHouse, type HouseRow } from '#server/queries/organisation.ts'
import { lockReport, type Report } from '#server/queries/reports.ts'
import { listReviews } from '#server/queries/reviews.ts'
import { registerTime } from '#server/register/append.ts'
import type { JudgedRevision } from './judged-revision.ts'
import { type Decided, reviewStanding } from './review-standing.ts'
import type { Stage } from './step-report.ts'

/** The report that a correction takes the place of. */
export interface Old {
  readonly report: Report
  readonly document: DocumentRow
  readonly reason: string
}

/** Everything that issuing will write, but the number. */
export interface Plan {
  readonly house: HouseRow
  readonly revision: JudgedRevision
  readonly factsSha256: string
  readonly old: Old | null
  readonly record: Omit<IssueRecord, 'number' | 'check_address'>
}

const acceptedOf = ({ kind, anchor, words, said }: Decided): Accepted[] =>
  said === null
    ? []
    : [
        {
          kind,
          anchor,
          words,
          by: said.decided_by_name,
          on: registerTime(said.decided_at),
          ...(said.reason !== '' && { reason: said.reason }),
        },
      ]

/** The report that is to be replaced, locked; a refusal when it is not there to be replaced any more. */
async function oldOne({ tx, actor, subject }: Stage): Promise<Old | Refused | null> {
  const { corrects, correction_reason } = subject
  if (corrects === null) return null
  const report = await lockReport(tx, actor.organisation, corrects)
  const document = await documentOf(tx, actor.organisation, corrects)
  if (report === undefined || document === undefined) throw new Error(`Report ${corrects} has no document.`)
  if (report.state !== 'issued')
    return refuse('conflict', `${document.number} is ${report.state} by now: there is nothing to take the place of.`)
  return { report, document, reason: correction_reason ?? '' }
}

async function reviewedBy({ tx, actor, subject }: Stage): Promise<IssueRecord['reviewed_by']> {
  const reviews = await listReviews(tx, actor.organisation, subject.report_id)
  const approval = reviews.findLast(
    ({ decision, revision }) => decision === 'approved' && revision === subject.revision,
  )
  if (approval === undefined) throw new Error(`Report ${subject.report_id} was approved by nobody.`)
  const [person] = await findColleagues(tx, actor.organisation, [approval.reviewer_id])
  const licence = person?.licence ?? null
  return { name: approval.reviewer_name, ...(licence !== null && { licence }) }
}

/** Prints once for trial, so that nothing gets a number that cannot be printed under it. */
function printable({ revision, house, record, factsSha256, old }: Plan): Refused | undefined {
  const { judged, text, file, sha256 } = revision
  const number = `${house.mark}-${record.issued_at.slice(0, 4)}-0000`
  const replaces = old && { replaces: old.document.number, reason: old.reason }
  const entry = {
    kind: 'issued',
    organisation: house.mark,
    sequence: 0,
    number,
    revision: revision.revision,
    source_sha256: sha256,
    facts_sha256: factsSha256,
    at: record.issued_at,
    ...replaces,
  } as const
  const register = {
    format: 'skerry-proof/1',
    entry,
    index: 0,
    size: 1,
    path: [],
    checkpoint: '',
    certificate: '',
  } as const
  const issue: Issue = { ...record, number, check_address: 'https://check.example/', register }
  try {
    renderReport(judged, { text, file, fonts: paperFonts(), created: record.issued_at, draft: false, issue })
    return undefined
  } catch (error) {
    if (!(error instanceof Error) || error.name !== 'PaperError') throw error
    return refuse('blocked', `It cannot be printed: ${error.message.replace(/^Line \d+, column \d+: /, '')}`, {
      more: { blockers: [] },
    })
  }
}

/** Puts together what issuing will write; a refusal when something stands in the way. */
export async function planIssue(stage: Stage): Promise<Plan | Refused> {
  const { tx, actor, subject, now } = stage
  const { revision, decisions, blockers } = await reviewStanding(tx, actor.organisation, subject)
  if (blockers.length > 0) return refuse('blocked', undefined, { more: { blockers } })
  const house = await findHouse(tx, actor.organisation)
  if (house.address.trim() === '')
    return refuse(
      'blocked',
      'The report must name the address of the house that issues it: an administrator enters it.',
      {
        more: { blockers: [] },
      },
    )
  const old = await oldOne(stage)
  if (old !== null && 'refused' in old) return old
  const { licence, name } = actor
  const plan: Plan = {
    house,
    revision,
    factsSha256: textHash(factsText(revision.judged)),
    old,
    record: {
      issued_at: registerTime(now),
      organisation: { name: house.name, address: house.address.split(/\n|, /).filter((line) => line.trim() !== '') },
      issued_by: { name, ...(licence !== null && { licence }) },
      reviewed_by: await reviewedBy(stage),
      ...(old && { replaces: { number: old.document.number, reason: old.reason } }),
      accepted: decisions.flatMap(acceptedOf),
    },
  }
  return printable(plan) ?? plan
}
