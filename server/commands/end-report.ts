import { isRefused, type Refused, refuse } from '#server/http/problems.ts'
import type { Answer } from '#server/http/route.ts'
import { presentReport } from '#server/presenters/report.ts'
import { findColleagues } from '#server/queries/colleagues.ts'
import { findCorrection } from '#server/queries/corrections.ts'
import { documentOf } from '#server/queries/documents.ts'
import { findHouse } from '#server/queries/organisation.ts'
import { findReport, insertReport, insertRevision } from '#server/queries/reports.ts'
import { findSource } from '#server/queries/revisions.ts'
import { appendEntry, makeCheckpoint, registerTime } from '#server/register/append.ts'
import { judgeSource } from './judge-source.ts'
import { type Stage, step } from './step-report.ts'
import { tell } from './tell.ts'

/**
 * Begins the report that will take an issued one's place: a draft of its own with the old file as its first revision.
 * The old one stays as it is until the new one is issued.
 */
export async function correctReport({ tx, actor, subject, now }: Stage, reason: string): Promise<Answer | Refused> {
  const { organisation, person } = actor
  const open = await findCorrection(tx, organisation, subject.report_id)
  if (open !== undefined)
    return refuse('conflict', 'A correction of this report has been begun already.', { more: { correction: open } })
  const stored = await findSource(tx, organisation, subject.report_id, subject.revision)
  if (stored === undefined) throw new Error('The issued revision has no source.')
  const judged = judgeSource(stored.source)
  if (!judged.ok) return refuse('file-refused', undefined, { errors: judged.errors })
  const { lifted } = judged
  const corrects = { report: subject.report_id, reason }
  const report = await insertReport(tx, { organisation, person, lifted, now, corrects })
  const { source, file_name } = stored
  await insertRevision(tx, { organisation, report, revision: 1, person, source, fileName: file_name, lifted, now })
  const made = await findReport(tx, organisation, report)
  if (made === undefined) throw new Error('The new report cannot be read back.')
  return {
    status: 201,
    body: presentReport(made),
    version: made.version,
    headers: { location: `/api/reports/${report}` },
    audit: { correction: report, reason },
  }
}

/** Takes an issued report back, with nothing in its place. Its document, its number and its entry stay. */
export async function withdrawReport(stage: Stage, reason: string): Promise<Answer | Refused> {
  const { tx, actor, subject, now, services } = stage
  const { organisation } = actor
  const answer = await step(stage, 'withdraw')
  if (isRefused(answer)) return answer
  const document = await documentOf(tx, organisation, subject.report_id)
  if (document === undefined) throw new Error('The issued report has no document.')
  const { number, revision, source_sha256, facts_sha256 } = document
  const register = { organisation, mark: (await findHouse(tx, organisation)).mark }
  const happened = { kind: 'withdrawn', number, revision, source_sha256, facts_sha256, reason } as const
  await appendEntry(tx, register, document.document_id, { ...happened, at: registerTime(now) }, now)
  await makeCheckpoint(tx, register, await services.signer(), now)
  await services.jobs.send(tx, 'send-checkpoint', { organisation })
  await tell(
    tx,
    services,
    {
      organisation,
      kind: 'report withdrawn',
      event: `withdraw/${subject.report_id}`,
      actor: actor.person,
      subject: `${number} is withdrawn`,
      lines: [`${actor.name} has withdrawn ${number}, ${subject.title}.`, reason],
      path: `/reports/${subject.report_id}`,
      now,
    },
    await findColleagues(tx, organisation, subject.facts.uploaders),
  )
  return { ...answer, audit: { ...answer.audit, number, reason } }
}
