import type { Tx } from '#server/db.ts'

/** Something that falls due: a verification by an issued report, or an instrument's calibration. */
export interface DueRow {
  readonly kind: 'verification' | 'calibration'
  readonly id: string
  /** The installation's title, or the instrument's kind. */
  readonly name: string
  readonly place: string
  /** The report's number, or the instrument's serial number. */
  readonly mark: string
  readonly due_on: string
  /** Who made the report, to be told beside the administrators. */
  readonly person: string | null
}

export interface DueWish {
  readonly organisation: string
  /** Due on this day or earlier. */
  readonly until: string
  readonly kind?: DueRow['kind']
  /** Due date and id of the last row before. */
  readonly after?: readonly string[]
  readonly limit: number
}

const DUE = `
  select 'verification' as kind, r.report_id as id, r.title as name, r.place, r.number as mark, r.due_on, r.created_by as person
  from reports r
  where r.organisation_id = :organisation and r.state = 'issued' and r.due_on <= :until::date
  union all
  select 'calibration', i.instrument_id, v.kind, '', i.serial, v.due_on, null
  from instruments i
  join instrument_versions v on v.organisation_id = i.organisation_id and v.instrument_id = i.instrument_id and v.version = i.version
  where i.organisation_id = :organisation and i.retired_at is null and v.due_on <= :until::date`

/** What falls due, the earliest first; one row more than asked for. Replaced and withdrawn reports remind nobody. */
export async function listDue(tx: Tx, { organisation, until, kind, after, limit }: DueWish): Promise<DueRow[]> {
  const [afterDay = null, afterId = null] = after ?? []
  const { rows } = await tx.raw<{ rows: DueRow[] }>(
    `select * from (${DUE}) as due
     where (:kind::text is null or kind = :kind) and (:afterDay::date is null or (due_on, id) > (:afterDay::date, :afterId::uuid))
     order by due_on, id limit :limit`,
    { organisation, until, kind: kind ?? null, afterDay, afterId, limit: limit + 1 },
  )
  return rows
}
