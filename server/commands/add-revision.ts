import { reportModel } from '#core/report/model.ts'
import type { Placement } from '#core/review/carry.ts'
import type { Tx } from '#server/db.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { liftRevision } from '#server/queries/report-steps.ts'
import { insertRevision, type Report } from '#server/queries/reports.ts'
import { findSource } from '#server/queries/revisions.ts'
import { carryThreads } from './carry-threads.ts'
import { judgeSource } from './judge-source.ts'

export interface Upload {
  readonly organisation: string
  readonly person: string
  readonly report: Report
  readonly source: Uint8Array
  readonly fileName: string
  readonly now: Date
}

export interface Added {
  readonly revision: number
  readonly sha256: string
  /** What became of the threads; null when the bytes are those of the newest revision and nothing was stored. */
  readonly threads: Readonly<Record<Placement, number>> | null
}

/** Judges a new file of a report, keeps it as the next revision and carries the threads along. */
export async function addRevision(
  tx: Tx,
  { organisation, person, report, source, fileName, now }: Upload,
): Promise<Added | Refused> {
  const result = judgeSource(source)
  if (!result.ok) return refuse('file-refused', undefined, { errors: result.errors })
  const { lifted, judged } = result
  const newest = await findSource(tx, organisation, report.report_id, report.revision)
  if (newest?.sha256 === lifted.sha256) return { revision: report.revision, sha256: lifted.sha256, threads: null }
  const revision = report.revision + 1
  await insertRevision(tx, {
    organisation,
    report: report.report_id,
    revision,
    person,
    source,
    fileName,
    lifted,
    now,
  })
  if (!(await liftRevision(tx, { organisation, report, now }, revision, lifted))) return refuse('conflict')
  const model = reportModel(judged, { file: fileName, hash: lifted.sha256, draft: true })
  const threads = await carryThreads(tx, organisation, report.report_id, { revision, model })
  return { revision, sha256: lifted.sha256, threads }
}
