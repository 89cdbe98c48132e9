import type { Tx } from '#server/db.ts'
import { contained } from './instruments.ts'

/** An issued document as the register shows it. */
export interface RegisterRow {
  readonly document_id: string
  readonly report_id: string
  readonly number: string
  readonly state: 'issued' | 'replaced' | 'withdrawn'
  readonly reference: string
  readonly title: string
  readonly place: string
  readonly operator: string
  readonly inspected_on: string | null
  readonly due_on: string | null
  readonly outcome: string
  readonly revision: number
  readonly issued_at: Date
  readonly source_sha256: string
  readonly facts_sha256: string
  readonly pdf_sha256: string | null
  readonly replaces_number: string | null
  readonly replaced_by_number: string | null
}

export interface RegisterFilter {
  readonly organisation: string
  readonly state?: RegisterRow['state']
  /** Moments: from, and up to but not with. */
  readonly from?: string
  readonly to?: string
  /** Part of reference, title, place, operator or number. */
  readonly search?: string
  /** How the number begins. */
  readonly prefix?: string
}

const documents = (tx: Tx, { organisation, state, from, to, search, prefix }: RegisterFilter) => {
  const query = tx('documents as d')
    .join('reports as r', (on) => on.on('r.organisation_id', 'd.organisation_id').andOn('r.report_id', 'd.report_id'))
    .where('d.organisation_id', organisation)
  if (state !== undefined) query.where('r.state', state)
  if (from !== undefined) query.where('d.issued_at', '>=', from)
  if (to !== undefined) query.where('d.issued_at', '<', to)
  if (search !== undefined) query.whereLike('r.search', contained(search))
  if (prefix !== undefined) query.whereRaw('starts_with(d.number, ?)', [prefix.toUpperCase()])
  return query
}

const COLUMNS = [
  'd.document_id',
  'd.report_id',
  'd.number',
  'r.state',
  'r.reference',
  'r.title',
  'r.place',
  'r.operator',
  'r.inspected_on',
  'r.due_on',
  'r.outcome',
  'd.revision',
  'd.issued_at',
  'd.source_sha256',
  'd.facts_sha256',
  's.pdf_sha256',
  'old.number as replaces_number',
  'successor.number as replaced_by_number',
] as const

const whole = (tx: Tx, filter: RegisterFilter) =>
  documents(tx, filter)
    .leftJoin('seals as s', (on) =>
      on.on('s.organisation_id', 'd.organisation_id').andOn('s.document_id', 'd.document_id'),
    )
    .leftJoin('documents as old', (on) =>
      on.on('old.organisation_id', 'd.organisation_id').andOn('old.document_id', 'd.replaces'),
    )
    .leftJoin('documents as successor', (on) =>
      on.on('successor.organisation_id', 'd.organisation_id').andOn('successor.replaces', 'd.document_id'),
    )

/** Issued documents, the newest first; one row more than asked for. `after`: moment of issue and id of the last row before. */
export async function searchRegister(
  tx: Tx,
  { after, limit, ...filter }: RegisterFilter & { readonly after?: readonly string[]; readonly limit: number },
): Promise<RegisterRow[]> {
  const query = whole(tx, filter)
    .orderBy([
      { column: 'd.issued_at', order: 'desc' },
      { column: 'd.document_id', order: 'desc' },
    ])
    .limit(limit + 1)
  if (after !== undefined) query.whereRaw('(d.issued_at, d.document_id) < (?::timestamptz, ?::uuid)', [...after])
  return await query.select<RegisterRow[]>(...COLUMNS)
}

/** Those of some documents that the organisation has, by number. */
export async function registerRows(tx: Tx, organisation: string, ids: readonly string[]): Promise<RegisterRow[]> {
  return await whole(tx, { organisation })
    .whereIn('d.document_id', [...ids])
    .orderBy('d.number')
    .select<RegisterRow[]>(...COLUMNS)
}

export interface Numbered {
  readonly document_id: string
  readonly number: string
}

/** The whole population of a sample, at most `limit`, in the order of issue. */
export async function numbersOf(tx: Tx, filter: RegisterFilter, limit: number): Promise<Numbered[]> {
  return await documents(tx, filter)
    .orderBy(['d.year', 'd.sequence'])
    .limit(limit)
    .select<Numbered[]>('d.document_id', 'd.number')
}

/** What a stored revision was judged to, when it came. */
export interface StoredJudgement {
  readonly source: Buffer
  readonly rulebook_id: string
  readonly rulebook_version: string
  readonly rulebook_hash: string
  readonly software: string
  readonly outcome: string
  readonly counts: Readonly<Record<string, number>>
}

export async function storedJudgement(
  tx: Tx,
  organisation: string,
  report: string,
  revision: number,
): Promise<StoredJudgement> {
  const row = await tx('revisions')
    .where({ organisation_id: organisation, report_id: report, revision })
    .first<StoredJudgement | undefined>(
      'source',
      'rulebook_id',
      'rulebook_version',
      'rulebook_hash',
      'software',
      'outcome',
      'counts',
    )
  if (row === undefined) throw new Error(`Report ${report} has no revision ${revision}.`)
  return row
}
