import type { Tx } from '#server/db.ts'
import { contained, type Written } from './instruments.ts'

export type Separation = 'all poles' | 'line poles' | 'not stated'

/** What a grid operator demands from a day on. */
export interface ConditionFacts {
  readonly separation: Separation
  readonly stated_in: string
  readonly valid_from: string
  readonly note: string
}

export interface ConditionRow extends ConditionFacts {
  readonly condition_id: string
  readonly operator: string
  readonly version: number
  readonly written_at: Date
  readonly written_by: string
  readonly written_by_name: string
}

export interface ConditionWish {
  readonly organisation: string
  readonly search?: string
  /** Operator and id of the last row before. */
  readonly after?: readonly string[]
  readonly limit: number
}

const COLUMNS = [
  'c.condition_id',
  'c.operator',
  'v.version',
  'v.separation',
  'v.stated_in',
  'v.valid_from',
  'v.note',
  'v.written_at',
  'v.written_by',
  'p.name as written_by_name',
] as const

const versions = (tx: Tx, organisation: string) =>
  tx('conditions as c')
    .join('condition_versions as v', (on) =>
      on.on('v.organisation_id', 'c.organisation_id').andOn('v.condition_id', 'c.condition_id'),
    )
    .join('people as p', (on) => on.on('p.organisation_id', 'v.organisation_id').andOn('p.person_id', 'v.written_by'))
    .where('c.organisation_id', organisation)

const newest = (tx: Tx, organisation: string) => versions(tx, organisation).whereRaw('v.version = c.version')

/** Operators by name, each with what was written last; one row more than asked for. */
export async function listConditions(
  tx: Tx,
  { organisation, search, after, limit }: ConditionWish,
): Promise<ConditionRow[]> {
  const query = newest(tx, organisation)
    .orderBy([{ column: 'c.operator' }, { column: 'c.condition_id' }])
    .limit(limit + 1)
  if (search !== undefined) query.whereRaw('lower(c.operator) like ?', [contained(search)])
  if (after !== undefined) query.whereRaw('(c.operator, c.condition_id) > (?::text, ?::uuid)', [...after])
  return await query.select<ConditionRow[]>(...COLUMNS)
}

export async function findCondition(tx: Tx, organisation: string, id: string): Promise<ConditionRow | undefined> {
  return await newest(tx, organisation)
    .where('c.condition_id', id)
    .first<ConditionRow | undefined>(...COLUMNS)
}

/** The same, locked until the transaction ends. */
export async function lockCondition(tx: Tx, organisation: string, id: string): Promise<ConditionRow | undefined> {
  await tx('conditions').where({ organisation_id: organisation, condition_id: id }).forUpdate().select('version')
  return await findCondition(tx, organisation, id)
}

/** Every version, the newest first. */
export async function conditionHistory(tx: Tx, organisation: string, id: string): Promise<ConditionRow[]> {
  return await versions(tx, organisation)
    .where('c.condition_id', id)
    .orderBy('v.version', 'desc')
    .select<ConditionRow[]>(...COLUMNS)
}

/** Every version of what an operator of this name demands, the oldest first. Capitals do not matter. */
export async function conditionsOf(tx: Tx, organisation: string, operator: string): Promise<ConditionRow[]> {
  return await versions(tx, organisation)
    .whereRaw('lower(c.operator) = lower(?)', [operator.trim()])
    .orderBy('v.version')
    .select<ConditionRow[]>(...COLUMNS)
}

/** Enters an operator; undefined when it is there already. */
export async function insertCondition(tx: Tx, by: Written, operator: string): Promise<string | undefined> {
  const known = await tx('conditions')
    .where('organisation_id', by.organisation)
    .whereRaw('lower(operator) = lower(?)', [operator])
    .first<{ condition_id: string } | undefined>('condition_id')
  if (known !== undefined) return undefined
  const [row] = await tx('conditions')
    .insert({ organisation_id: by.organisation, operator, created_at: by.now })
    .onConflict(['organisation_id', 'operator'])
    .ignore()
    .returning<{ condition_id: string }[]>('condition_id')
  return row?.condition_id
}

export async function insertConditionVersion(
  tx: Tx,
  { organisation, person, now }: Written,
  { id, version, facts }: { readonly id: string; readonly version: number; readonly facts: ConditionFacts },
): Promise<void> {
  await tx('condition_versions').insert({
    ...facts,
    organisation_id: organisation,
    condition_id: id,
    version,
    written_by: person,
    written_at: now,
  })
  await tx('conditions').where({ organisation_id: organisation, condition_id: id }).update({ version })
}
