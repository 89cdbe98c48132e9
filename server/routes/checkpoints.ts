import { bytesToHex } from '@noble/hashes/utils.js'
import { keysetOf, PAGE_QUERY, pageOf } from '#server/http/keyset.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { CHECKPOINT_SCHEMA, presentCheckpoint } from '#server/presenters/register.ts'
import { findHead, pageOfCheckpoints } from '#server/queries/register.ts'
import { consistencyOf, rootAt } from '#server/register/proof-now.ts'

const common = { tag: 'register', method: 'get', policy: { action: 'register.read' }, limit: 'read' } as const

const listRoute = route({
  ...common,
  id: 'list-checkpoints',
  path: '/checkpoints',
  summary: 'Signed checkpoints of the register, the newest first',
  query: { type: 'object', properties: PAGE_QUERY, additionalProperties: false },
  answers: {
    200: {
      type: 'object',
      properties: { checkpoints: { type: 'array', items: CHECKPOINT_SCHEMA }, next: { type: ['string', 'null'] } },
      required: ['checkpoints', 'next'],
    },
  },
  async run({ tx, actor, query }) {
    const { after, limit = 50 } = query
    const cursor = after === undefined ? undefined : keysetOf(after, ['count'])
    if (cursor !== undefined && 'refused' in cursor) return cursor
    const found = await pageOfCheckpoints(tx, actor.organisation, cursor && Number(cursor[0]), limit)
    const { rows, next } = pageOf(found, limit, ({ size }) => [String(size)])
    return { body: { checkpoints: rows.map(presentCheckpoint), next } }
  },
})

const SIZE = { type: 'integer', minimum: 1, maximum: Number.MAX_SAFE_INTEGER } as const
const HASH = { type: 'string', pattern: '^[0-9a-f]{64}$' } as const

const consistencyRoute = route({
  ...common,
  id: 'show-consistency',
  path: '/consistency',
  summary: 'Proof that the register of one size continues the register of an earlier one (RFC 9162, 2.1.4)',
  query: {
    type: 'object',
    properties: { from: SIZE, to: SIZE },
    required: ['from', 'to'],
    additionalProperties: false,
  },
  answers: {
    200: {
      type: 'object',
      properties: {
        from: { type: 'integer' },
        to: { type: 'integer' },
        from_root: HASH,
        to_root: HASH,
        path: { type: 'array', items: HASH },
      },
      required: ['from', 'to', 'from_root', 'to_root', 'path'],
    },
  },
  async run({ tx, actor, query: { from, to } }) {
    const { organisation } = actor
    const size = (await findHead(tx, organisation))?.size ?? 0
    if (from > to || to > size)
      return refuse('bad-request', undefined, {
        errors: [
          {
            pointer: '/to',
            message: `The register has ${size} entries; \`from\` is not above \`to\`, nor \`to\` above that.`,
          },
        ],
      })
    return {
      body: {
        from,
        to,
        from_root: bytesToHex(await rootAt(tx, organisation, from)),
        to_root: bytesToHex(await rootAt(tx, organisation, to)),
        path: await consistencyOf(tx, organisation, from, to),
      },
    }
  },
})

export const CHECKPOINT_ROUTES = [listRoute, consistencyRoute]
