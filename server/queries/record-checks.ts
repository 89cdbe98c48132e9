import type { ReportState } from '#core/policy/states.ts'
import type { RegisterEntry } from '#core/register/entry.ts'
import type { Tx } from '#server/db.ts'

export interface CounterCheck {
  readonly year: number
  readonly last: number
  readonly most: number
  readonly count: number
}

/** Each year's counter beside the numbers that were given. */
export async function listCounters(tx: Tx, organisation: string): Promise<CounterCheck[]> {
  return await tx('counters as c')
    .leftJoin('documents as d', (on) => on.on('d.organisation_id', 'c.organisation_id').andOn('d.year', 'c.year'))
    .where('c.organisation_id', organisation)
    .groupBy('c.year', 'c.last')
    .orderBy('c.year')
    .select(
      'c.year',
      'c.last',
      tx.raw('coalesce(max(d.sequence), 0) as most'),
      tx.raw('count(d.sequence)::integer as count'),
    )
}

export interface DocumentState {
  readonly number: string
  readonly state: ReportState
  readonly kinds: readonly RegisterEntry['kind'][]
}

/** Each document with its report's state and the kinds of its register entries. */
export async function listDocumentStates(tx: Tx, organisation: string): Promise<DocumentState[]> {
  return await tx('documents as d')
    .join('reports as r', (on) => on.on('r.organisation_id', 'd.organisation_id').andOn('r.report_id', 'd.report_id'))
    .leftJoin('register_entries as e', (on) =>
      on.on('e.organisation_id', 'd.organisation_id').andOn('e.document_id', 'd.document_id'),
    )
    .where('d.organisation_id', organisation)
    .groupBy('d.number', 'r.state')
    .orderBy('d.number')
    .select(
      'd.number',
      'r.state',
      tx.raw(`coalesce(array_agg(e.kind) filter (where e.kind is not null), '{}') as kinds`),
    )
}

export interface SealCheck {
  readonly number: string
  readonly pdf_sha256: string
  readonly bytes: number
}

export async function listSeals(tx: Tx, organisation: string): Promise<SealCheck[]> {
  return await tx('seals as s')
    .join('documents as d', (on) =>
      on.on('d.organisation_id', 's.organisation_id').andOn('d.document_id', 's.document_id'),
    )
    .where('s.organisation_id', organisation)
    .orderBy('d.number')
    .select<SealCheck[]>('d.number', 's.pdf_sha256', 's.bytes')
}
