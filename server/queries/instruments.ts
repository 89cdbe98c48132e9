import type { Tx } from '#server/db.ts'

/** What can change about an instrument: each calibration is a version of its own. */
export interface InstrumentFacts {
  readonly kind: string
  readonly calibrated_on: string
  readonly due_on: string
  readonly certificate: string
  /** % of the reading, by kind of measurement. */
  readonly uncertainty: Readonly<Record<string, number>>
  readonly note: string
}

/** An instrument as its newest version has it. */
export interface InstrumentRow extends InstrumentFacts {
  readonly instrument_id: string
  readonly serial: string
  readonly version: number
  readonly retired_at: Date | null
  readonly written_at: Date
  readonly written_by: string
  readonly written_by_name: string
}

export type Retired = 'no' | 'only' | 'all'

export interface InstrumentWish {
  readonly organisation: string
  readonly dueBefore?: string
  readonly retired: Retired
  readonly search?: string
  /** Due date and id of the last row before. */
  readonly after?: readonly string[]
  readonly limit: number
}

const COLUMNS = [
  'i.instrument_id',
  'i.serial',
  'v.version',
  'i.retired_at',
  'v.kind',
  'v.calibrated_on',
  'v.due_on',
  'v.certificate',
  'v.uncertainty',
  'v.note',
  'v.written_at',
  'v.written_by',
  'p.name as written_by_name',
] as const

const versions = (tx: Tx, organisation: string) =>
  tx('instruments as i')
    .join('instrument_versions as v', (on) =>
      on.on('v.organisation_id', 'i.organisation_id').andOn('v.instrument_id', 'i.instrument_id'),
    )
    .join('people as p', (on) => on.on('p.organisation_id', 'v.organisation_id').andOn('p.person_id', 'v.written_by'))
    .where('i.organisation_id', organisation)

const newest = (tx: Tx, organisation: string) => versions(tx, organisation).whereRaw('v.version = i.version')

/** A text as it stands between wild cards of LIKE. */
export const contained = (text: string): string =>
  `%${text.toLowerCase().replaceAll(/[\\%_]/g, (sign) => `\\${sign}`)}%`

/** Instruments with their newest calibration, the one that falls due first ahead; one row more than asked for. */
export async function listInstruments(
  tx: Tx,
  { organisation, dueBefore, retired, search, after, limit }: InstrumentWish,
): Promise<InstrumentRow[]> {
  const query = newest(tx, organisation)
    .orderBy([{ column: 'v.due_on' }, { column: 'i.instrument_id' }])
    .limit(limit + 1)
  if (retired === 'no') query.whereNull('i.retired_at')
  if (retired === 'only') query.whereNotNull('i.retired_at')
  if (dueBefore !== undefined) query.where('v.due_on', '<', dueBefore)
  if (search !== undefined) query.whereRaw("lower(i.serial || ' ' || v.kind) like ?", [contained(search)])
  if (after !== undefined) query.whereRaw('(v.due_on, i.instrument_id) > (?::date, ?::uuid)', [...after])
  return await query.select<InstrumentRow[]>(...COLUMNS)
}

export async function findInstrument(tx: Tx, organisation: string, id: string): Promise<InstrumentRow | undefined> {
  return await newest(tx, organisation)
    .where('i.instrument_id', id)
    .first<InstrumentRow | undefined>(...COLUMNS)
}

/** The same, locked until the transaction ends: versions are written one after the other. */
export async function lockInstrument(tx: Tx, organisation: string, id: string): Promise<InstrumentRow | undefined> {
  await tx('instruments').where({ organisation_id: organisation, instrument_id: id }).forUpdate().select('version')
  return await findInstrument(tx, organisation, id)
}

/** Every version of an instrument, the newest first. */
export async function instrumentHistory(tx: Tx, organisation: string, id: string): Promise<InstrumentRow[]> {
  return await versions(tx, organisation)
    .where('i.instrument_id', id)
    .orderBy('v.version', 'desc')
    .select<InstrumentRow[]>(...COLUMNS)
}

/** Every version of every instrument with one of these serial numbers, the oldest first. */
export async function instrumentsBySerial(
  tx: Tx,
  organisation: string,
  serials: readonly string[],
): Promise<InstrumentRow[]> {
  return await versions(tx, organisation)
    .whereIn('i.serial', [...serials])
    .orderBy('v.version')
    .select<InstrumentRow[]>(...COLUMNS)
}

export interface Written {
  readonly organisation: string
  readonly person: string
  readonly now: Date
}

/** Enters an instrument; undefined when its serial number is there already. */
export async function insertInstrument(tx: Tx, by: Written, serial: string): Promise<string | undefined> {
  const [row] = await tx('instruments')
    .insert({ organisation_id: by.organisation, serial, created_at: by.now })
    .onConflict(['organisation_id', 'serial'])
    .ignore()
    .returning<{ instrument_id: string }[]>('instrument_id')
  return row?.instrument_id
}

export async function insertInstrumentVersion(
  tx: Tx,
  { organisation, person, now }: Written,
  { id, version, facts }: { readonly id: string; readonly version: number; readonly facts: InstrumentFacts },
): Promise<void> {
  await tx('instrument_versions').insert({
    ...facts,
    organisation_id: organisation,
    instrument_id: id,
    version,
    uncertainty: JSON.stringify(facts.uncertainty),
    written_by: person,
    written_at: now,
  })
  await tx('instruments').where({ organisation_id: organisation, instrument_id: id }).update({ version })
}

export async function retireInstrument(tx: Tx, organisation: string, id: string, at: Date | null): Promise<void> {
  await tx('instruments').where({ organisation_id: organisation, instrument_id: id }).update({ retired_at: at })
}
