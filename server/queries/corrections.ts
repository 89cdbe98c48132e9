import type { Tx } from '#server/db.ts'

/** The report that was begun to take another one's place, unless it was discarded. */
export async function findCorrection(tx: Tx, organisation: string, report: string): Promise<string | undefined> {
  const row = await tx('reports')
    .where({ organisation_id: organisation, corrects: report, discarded_at: null })
    .first<{ report_id: string } | undefined>('report_id')
  return row?.report_id
}
