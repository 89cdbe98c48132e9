import { STEPS, type Step } from '#core/policy/states.ts'
import type { Lifted } from '#server/commands/judge-source.ts'
import type { Tx } from '#server/db.ts'
import { liftedColumns, type ReportRow } from './reports.ts'

type Held = Pick<ReportRow, 'report_id' | 'version'>

interface Change {
  readonly organisation: string
  /** As it was read: another version in the table means that somebody was faster. */
  readonly report: Held
  readonly now: Date
}

async function update(
  tx: Tx,
  { organisation, report, now }: Change,
  columns: Readonly<Record<string, unknown>>,
  states?: readonly string[],
): Promise<boolean> {
  const query = tx('reports').where({
    organisation_id: organisation,
    report_id: report.report_id,
    version: report.version,
    discarded_at: null,
  })
  if (states !== undefined) query.whereIn('state', [...states])
  const changed = await query.update({ ...columns, version: report.version + 1, updated_at: now })
  return changed === 1
}

/** Takes a step from a state that it may start in; false when the report is in another state or version. */
export async function takeStep(
  tx: Tx,
  step: Step,
  change: Change,
  columns: Readonly<{ number?: string }> = {},
): Promise<boolean> {
  return await update(tx, change, { ...columns, state: STEPS[step].to }, STEPS[step].from)
}

/** Points a report at its newest revision. */
export async function liftRevision(tx: Tx, change: Change, revision: number, lifted: Lifted): Promise<boolean> {
  return await update(tx, change, { ...liftedColumns(lifted), revision }, ['draft', 'returned'])
}

export async function assignReviewer(tx: Tx, change: Change, reviewer: string | null): Promise<boolean> {
  return await update(tx, change, { reviewer_id: reviewer })
}

/** Takes a report out of every list; what it was stays in the audit events. */
export async function discardReport(tx: Tx, change: Change): Promise<boolean> {
  return await update(tx, change, { discarded_at: change.now }, ['draft', 'returned'])
}
