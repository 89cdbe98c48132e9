import type { Judged } from '#core/engine.ts'
import { type ReportModel, reportModel } from '#core/report/model.ts'
import type { Tx } from '#server/db.ts'
import { findSource } from '#server/queries/revisions.ts'
import { judgeSource, type Lifted } from './judge-source.ts'

/** A stored revision, judged again. */
export interface JudgedRevision {
  readonly judged: Judged
  readonly lifted: Lifted
  readonly text: string
  readonly file: string
  readonly sha256: string
  readonly revision: number
}

/** Judges a revision from its stored bytes; undefined where there is no such revision. */
export async function judgedRevision(
  tx: Tx,
  organisation: string,
  report: string,
  revision: number,
): Promise<JudgedRevision | undefined> {
  const stored = await findSource(tx, organisation, report, revision)
  if (stored === undefined) return undefined
  const result = judgeSource(stored.source)
  // It was judged when it came: a rule book or schema of today that does not take it is a fault of ours.
  if (!result.ok) throw new Error(`Revision ${revision} of report ${report} can no longer be judged.`)
  const { judged, lifted, text } = result
  return { judged, lifted, text, file: stored.file_name, sha256: stored.sha256, revision }
}

/** The same for a revision that must be there, since a row names it. */
export async function ownRevision(
  tx: Tx,
  organisation: string,
  report: string,
  revision: number,
): Promise<JudgedRevision> {
  const found = await judgedRevision(tx, organisation, report, revision)
  if (found === undefined) throw new Error(`Report ${report} has no revision ${revision}.`)
  return found
}

/** The document model of a revision that is not issued. */
export const draftModel = ({ judged, file, sha256 }: JudgedRevision): ReportModel =>
  reportModel(judged, { file, hash: sha256, draft: true })
