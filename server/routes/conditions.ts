import { csvAnswer, everyRow } from '#server/exports/table.ts'
import { keysetOf, PAGE_QUERY, pageOf } from '#server/http/keyset.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { CONDITION_SCHEMA, CONDITION_WITH_HISTORY, DEMAND, presentCondition } from '#server/presenters/condition.ts'
import {
  type ConditionRow,
  conditionHistory,
  findCondition,
  insertCondition,
  insertConditionVersion,
  listConditions,
  lockCondition,
} from '#server/queries/conditions.ts'

const SEARCH = { search: { type: 'string', minLength: 1, maxLength: 100 } } as const
const NEEDED = ['separation', 'stated_in', 'valid_from'] as const

const reads = { tag: 'conditions', policy: { action: 'condition.read' }, limit: 'read' } as const
const writes = { tag: 'conditions', policy: { action: 'condition.write' }, limit: 'write' } as const

const orderOf = ({ operator, condition_id }: ConditionRow): readonly string[] => [operator, condition_id]

const listRoute = route({
  ...reads,
  id: 'list-conditions',
  method: 'get',
  path: '/conditions',
  summary: 'Grid operators with what they demand, by name',
  query: { type: 'object', properties: { ...SEARCH, ...PAGE_QUERY }, additionalProperties: false },
  answers: {
    200: {
      type: 'object',
      properties: { conditions: { type: 'array', items: CONDITION_SCHEMA }, next: { type: ['string', 'null'] } },
      required: ['conditions', 'next'],
    },
  },
  async run({ tx, actor, query }) {
    const { after, search, limit = 50 } = query
    const cursor = after === undefined ? undefined : keysetOf(after, ['text', 'id'])
    if (cursor !== undefined && 'refused' in cursor) return cursor
    const found = await listConditions(tx, {
      organisation: actor.organisation,
      limit,
      ...(search === undefined ? {} : { search }),
      ...(cursor === undefined ? {} : { after: cursor }),
    })
    const { rows, next } = pageOf(found, limit, orderOf)
    return { body: { conditions: rows.map(presentCondition), next } }
  },
})

const showRoute = route({
  ...reads,
  id: 'show-condition',
  method: 'get',
  path: '/conditions/:condition',
  summary: 'What one operator demands, with every version',
  load: ({ tx, actor, params }) => findCondition(tx, actor.organisation, params['condition'] ?? ''),
  answers: { 200: CONDITION_WITH_HISTORY },
  async run({ tx, actor, subject }) {
    const history = await conditionHistory(tx, actor.organisation, subject.condition_id)
    return { body: { ...presentCondition(subject), history: history.map(presentCondition) }, version: subject.version }
  },
})

const tableRoute = route({
  ...reads,
  id: 'export-conditions',
  method: 'get',
  path: '/conditions.csv',
  summary: 'Operators and their demands as a table',
  query: { type: 'object', properties: SEARCH, additionalProperties: false },
  limit: 'heavy',
  audited: true,
  answers: { 200: { media: 'text/csv' } },
  async run({ actor, query, services }) {
    const { organisation } = actor
    const rows = everyRow<ConditionRow>(services, organisation, async (tx, last, limit) => {
      const after = last === undefined ? {} : { after: orderOf(last) }
      const search = query.search === undefined ? {} : { search: query.search }
      return (await listConditions(tx, { organisation, ...search, ...after, limit })).slice(0, limit)
    })
    return csvAnswer(
      'conditions',
      {
        operator: ({ operator }) => operator,
        separation: ({ separation }) => separation,
        'stated in': ({ stated_in }) => stated_in,
        'valid from': ({ valid_from }) => valid_from,
        version: ({ version }) => version,
        'written by': ({ written_by_name }) => written_by_name,
        'written at': ({ written_at }) => written_at.toISOString(),
        note: ({ note }) => note,
      },
      rows,
    )
  },
})

const createRoute = route({
  ...writes,
  id: 'create-condition',
  method: 'post',
  path: '/conditions',
  summary: 'Enters an operator with what it demands',
  body: {
    type: 'object',
    properties: { operator: { type: 'string', pattern: '^\\S(.{0,198}\\S)?$' }, ...DEMAND },
    required: ['operator', ...NEEDED],
    additionalProperties: false,
  },
  answers: { 201: CONDITION_SCHEMA },
  async run({ tx, actor, body, now }) {
    const { operator, separation, stated_in, valid_from, note = '' } = body
    const by = { organisation: actor.organisation, person: actor.person, now }
    const id = await insertCondition(tx, by, operator)
    if (id === undefined) return refuse('conflict', `${operator} is in the register already: write a new version.`)
    const facts = { separation, stated_in, valid_from, note }
    await insertConditionVersion(tx, by, { id, version: 1, facts })
    const row = await findCondition(tx, actor.organisation, id)
    if (row === undefined) throw new Error('The condition cannot be read back.')
    return { status: 201, body: presentCondition(row), version: 1, audit: { condition: id, operator, after: facts } }
  },
})

const versionRoute = route({
  ...writes,
  id: 'write-condition-version',
  method: 'post',
  path: '/conditions/:condition/versions',
  summary: 'What the operator demands from another day on, or a correction; the versions before stay readable',
  body: { type: 'object', properties: DEMAND, required: NEEDED, additionalProperties: false },
  load: ({ tx, actor, params }) => lockCondition(tx, actor.organisation, params['condition'] ?? ''),
  version: ({ version }) => version,
  answers: { 201: CONDITION_SCHEMA },
  async run({ tx, actor, subject, body, now }) {
    const { separation, stated_in, valid_from, note = '' } = body
    const { condition_id: id } = subject
    const facts = { separation, stated_in, valid_from, note }
    const version = subject.version + 1
    const by = { organisation: actor.organisation, person: actor.person, now }
    await insertConditionVersion(tx, by, { id, version, facts })
    const row = await findCondition(tx, actor.organisation, id)
    if (row === undefined) throw new Error('The condition cannot be read back.')
    const before = { separation: subject.separation, stated_in: subject.stated_in, valid_from: subject.valid_from }
    return { status: 201, body: presentCondition(row), version, audit: { before, after: facts } }
  },
})

export const CONDITION_ROUTES = [listRoute, tableRoute, showRoute, createRoute, versionRoute]
