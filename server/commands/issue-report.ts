import type { IssueRecord } from '#core/report/issue.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import type { Answer } from '#server/http/route.ts'
import { findColleagues } from '#server/queries/colleagues.ts'
import { nextNumber } from '#server/queries/counters.ts'
import { insertDocument } from '#server/queries/documents.ts'
import { takeStep } from '#server/queries/report-steps.ts'
import { appendEntry, makeCheckpoint } from '#server/register/append.ts'
import { type Plan, planIssue } from './issue-plan.ts'
import { answerReport, type Stage } from './step-report.ts'
import { tell } from './tell.ts'

/** `MARK-YEAR-0001`: gap-free for each house and year. */
const numberOf = (mark: string, year: number, sequence: number): string =>
  `${mark}-${year}-${String(sequence).padStart(4, '0')}`

interface Issued {
  readonly document: string
  readonly record: IssueRecord
}

async function writeDocument({ tx, actor, subject, services }: Stage, plan: Plan): Promise<Issued> {
  const { house, revision, record, old, factsSha256 } = plan
  const year = Number(record.issued_at.slice(0, 4))
  const sequence = await nextNumber(tx, actor.organisation, year)
  const number = numberOf(house.mark, year, sequence)
  const issue: IssueRecord = { ...record, number, check_address: `${services.env.BASE_URL}/check/${number}` }
  const document = await insertDocument(tx, {
    organisation: actor.organisation,
    report: subject.report_id,
    revision: revision.revision,
    year,
    sequence,
    person: actor.person,
    sourceSha256: revision.sha256,
    factsSha256,
    issue,
    replaces: old?.document.document_id ?? null,
  })
  return { document, record: issue }
}

/** The entries of an issue: the new document's, and that of the one whose place it takes; then what is signed over them. */
async function writeRegister(stage: Stage, plan: Plan, { document, record }: Issued): Promise<void> {
  const { tx, actor, now, services } = stage
  const { house, revision, old, factsSha256 } = plan
  const register = { organisation: actor.organisation, mark: house.mark }
  const about = { number: record.number, revision: revision.revision, at: record.issued_at }
  await appendEntry(
    tx,
    register,
    document,
    {
      kind: 'issued',
      ...about,
      source_sha256: revision.sha256,
      facts_sha256: factsSha256,
      ...(old && { replaces: old.document.number, reason: old.reason }),
    },
    now,
  )
  if (old !== null) {
    const { number, revision: oldRevision, source_sha256, facts_sha256, document_id } = old.document
    const end = { kind: 'replaced', replaced_by: record.number, reason: old.reason } as const
    const was = { number, revision: oldRevision, source_sha256, facts_sha256, at: record.issued_at }
    await appendEntry(tx, register, document_id, { ...end, ...was }, now)
  }
  await makeCheckpoint(tx, register, await services.signer(), now)
}

async function tellOfIssue({ tx, actor, subject, now, services }: Stage, { record }: Issued): Promise<void> {
  const { replaces } = record
  const instead = replaces === undefined ? '' : ` It takes the place of ${replaces.number}: ${replaces.reason}`
  await tell(
    tx,
    services,
    {
      organisation: actor.organisation,
      kind: 'report issued',
      event: `issue/${subject.report_id}`,
      actor: actor.person,
      subject: `${record.number} is issued`,
      lines: [`${actor.name} has issued ${subject.reference}, ${subject.title}, as ${record.number}.${instead}`],
      path: `/reports/${subject.report_id}`,
      now,
    },
    await findColleagues(tx, actor.organisation, subject.facts.uploaders),
  )
}

/**
 * Issues an approved report: number, document, state, register, checkpoint, and the jobs that seal and tell, all in the
 * caller's transaction. A correction takes the place of its old report in the same moment.
 */
export async function issueReport(stage: Stage): Promise<Answer | Refused> {
  const { tx, actor, subject, now, services } = stage
  const { organisation } = actor
  const plan = await planIssue(stage)
  if ('refused' in plan) return plan
  const issued = await writeDocument(stage, plan)
  const { number } = issued.record
  if (!(await takeStep(tx, 'issue', { organisation, report: subject, now }, { number }))) return refuse('conflict')
  if (plan.old !== null && !(await takeStep(tx, 'replace', { organisation, report: plan.old.report, now })))
    return refuse('conflict')
  await writeRegister(stage, plan, issued)
  await services.jobs.send(tx, 'seal-document', { organisation, document: issued.document })
  await services.jobs.send(tx, 'send-checkpoint', { organisation })
  await tellOfIssue(stage, issued)
  return await answerReport(stage, subject.report_id, {
    number,
    document: issued.document,
    sha256: plan.revision.sha256,
    replaces: plan.old?.document.number ?? null,
  })
}
