import type { ReportFacts } from '#core/policy/can.ts'
import type { ReportState } from '#core/policy/states.ts'
import type { Lifted, Worker } from '#server/commands/judge-source.ts'
import type { Tx } from '#server/db.ts'

/** A report as its row and its newest revision tell it. */
export interface ReportRow {
  readonly report_id: string
  readonly state: ReportState
  readonly reference: string
  readonly title: string
  readonly place: string
  readonly purpose: string | null
  readonly inspected_on: string | null
  readonly due_on: string | null
  readonly outcome: string
  readonly revision: number
  readonly number: string | null
  readonly corrects: string | null
  readonly correction_reason: string | null
  readonly created_by: string
  readonly reviewer_id: string | null
  readonly version: number
  readonly created_at: Date
  readonly updated_at: Date
}

export const REPORT_COLUMNS = [
  'report_id',
  'state',
  'reference',
  'title',
  'place',
  'purpose',
  'inspected_on',
  'due_on',
  'outcome',
  'revision',
  'number',
  'corrects',
  'correction_reason',
  'created_by',
  'reviewer_id',
  'version',
  'created_at',
  'updated_at',
] as const

/** A report with what decisions about it need. */
export interface Report extends ReportRow {
  readonly facts: ReportFacts
}

interface Hands {
  uploaders: string[] | null
  workers: Worker[] | null
}

/** Everybody who had a hand in any revision: what a later file leaves out does not undo who did the work. */
async function handsIn(tx: Tx, organisation: string, report: string): Promise<Hands> {
  return await tx('revisions as r')
    .joinRaw('left join lateral jsonb_array_elements(r.workers) as w on true')
    .where({ 'r.organisation_id': organisation, 'r.report_id': report })
    .first<Hands>(
      tx.raw('array_agg(distinct r.uploaded_by::text) as uploaders'),
      tx.raw('jsonb_agg(distinct w) filter (where w is not null) as workers'),
    )
}

async function find(tx: Tx, organisation: string, report: string, lock: boolean): Promise<Report | undefined> {
  const query = tx('reports')
    .where({ organisation_id: organisation, report_id: report, discarded_at: null })
    .first<ReportRow | undefined>(...REPORT_COLUMNS)
  const row = await (lock ? query.forUpdate() : query)
  if (row === undefined) return undefined
  const hands = await handsIn(tx, organisation, report)
  return {
    ...row,
    facts: {
      kind: 'report',
      state: row.state,
      uploaders: hands.uploaders ?? [],
      workers: hands.workers ?? [],
      reviewer: row.reviewer_id,
    },
  }
}

export async function findReport(tx: Tx, organisation: string, report: string): Promise<Report | undefined> {
  return await find(tx, organisation, report, false)
}

/**
 * The same, its row locked until the transaction ends: what is decided on it then still holds when it is written. Whoever
 * locks a second report locks the newer one first.
 */
export async function lockReport(tx: Tx, organisation: string, report: string): Promise<Report | undefined> {
  return await find(tx, organisation, report, true)
}

export interface NewReport {
  readonly organisation: string
  readonly person: string
  readonly lifted: Lifted
  readonly now: Date
  readonly corrects?: { readonly report: string; readonly reason: string }
}

export const liftedColumns = (lifted: Lifted) => ({
  reference: lifted.reference,
  title: lifted.title,
  place: lifted.place,
  operator: lifted.operator,
  purpose: lifted.purpose,
  inspected_on: lifted.inspectedOn,
  due_on: lifted.dueOn,
  outcome: lifted.outcome,
})

export async function insertReport(
  tx: Tx,
  { organisation, person, lifted, now, corrects }: NewReport,
): Promise<string> {
  const [row] = await tx('reports')
    .insert({
      organisation_id: organisation,
      created_by: person,
      ...liftedColumns(lifted),
      created_at: now,
      updated_at: now,
      ...(corrects === undefined ? {} : { corrects: corrects.report, correction_reason: corrects.reason }),
    })
    .returning<{ report_id: string }[]>('report_id')
  if (row === undefined) throw new Error('The new report has no row.')
  return row.report_id
}

export interface NewRevision {
  readonly organisation: string
  readonly report: string
  readonly revision: number
  readonly person: string
  readonly source: Uint8Array
  readonly fileName: string
  readonly lifted: Lifted
  readonly now: Date
}

export async function insertRevision(
  tx: Tx,
  { organisation, report, revision, person, source, fileName, lifted, now }: NewRevision,
): Promise<void> {
  await tx('revisions').insert({
    organisation_id: organisation,
    report_id: report,
    revision,
    source: Buffer.from(source),
    sha256: lifted.sha256,
    file_name: fileName,
    uploaded_by: person,
    uploaded_at: now,
    rulebook_id: lifted.rulebook.id,
    rulebook_version: lifted.rulebook.version,
    rulebook_hash: lifted.rulebook.hash,
    software: lifted.software,
    outcome: lifted.outcome,
    counts: JSON.stringify(lifted.counts),
    workers: JSON.stringify(lifted.workers),
  })
}

/** The newest report that is not discarded with this reference. */
export async function findByReference(tx: Tx, organisation: string, reference: string): Promise<string | undefined> {
  const row = await tx('reports')
    .where({ organisation_id: organisation, reference, discarded_at: null })
    .orderBy('created_at', 'desc')
    .first<{ report_id: string } | undefined>('report_id')
  return row?.report_id
}
