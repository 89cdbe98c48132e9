import { ISSUED, type ReportState } from '#core/policy/states.ts'
import type { Tx } from '#server/db.ts'
import { REPORT_COLUMNS, type ReportRow } from './reports.ts'

/** Which reports, and where the page begins. */
export interface ListWish {
  readonly organisation: string
  readonly state?: ReportState
  readonly search?: string
  /** Only what auditors may see. */
  readonly issuedOnly: boolean
  readonly after?: Cursor
  readonly limit: number
}

/** The last row of the page before: order is by time of change, then by id. */
export interface Cursor {
  readonly at: string
  readonly id: string
}

export const cursorText = ({ at, id }: Cursor): string => Buffer.from(JSON.stringify([at, id])).toString('base64url')

export function cursorOf(text: string): Cursor | undefined {
  try {
    const parsed: unknown = JSON.parse(Buffer.from(text, 'base64url').toString('utf8'))
    if (!Array.isArray(parsed) || parsed.length !== 2) return undefined
    const [at, id]: unknown[] = parsed
    const sound =
      typeof at === 'string' && typeof id === 'string' && !Number.isNaN(Date.parse(at)) && /^[0-9a-f-]{36}$/.test(id)
    return sound ? { at, id } : undefined
  } catch {
    return undefined
  }
}

/** One page of reports, newest change first; one row more than asked for says that there is another page. */
export async function listReports(
  tx: Tx,
  { organisation, state, search, issuedOnly, after, limit }: ListWish,
): Promise<ReportRow[]> {
  const query = tx<ReportRow>('reports')
    .select(...REPORT_COLUMNS)
    .where('organisation_id', organisation)
    .whereNull('discarded_at')
    .orderBy([
      { column: 'updated_at', order: 'desc' },
      { column: 'report_id', order: 'desc' },
    ])
    .limit(limit + 1)
  if (state !== undefined) query.where('state', state)
  if (issuedOnly) query.whereIn('state', [...ISSUED])
  if (search !== undefined)
    query.whereLike('search', `%${search.toLowerCase().replaceAll(/[\\%_]/g, (sign) => `\\${sign}`)}%`)
  if (after !== undefined) query.whereRaw('(updated_at, report_id) < (?::timestamptz, ?::uuid)', [after.at, after.id])
  return await query
}
