import { freshToken } from '#server/env.ts'
import { TOKEN_PREFIX, tokenHash } from '#server/http/caller.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { insertToken, listTokens, revokeToken, type TokenRow } from '#server/queries/tokens.ts'
import { NAME } from './fields.ts'

const DAY_MS = 86_400_000
const MOST_DAYS = 400

const TOKEN_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    name: { type: 'string' },
    hint: { type: 'string', description: 'The last characters of the token.' },
    scopes: { type: 'array', items: { type: 'string' } },
    expires_at: { type: 'string', format: 'date-time' },
    revoked: { type: 'boolean' },
    last_used_at: { type: ['string', 'null'], format: 'date-time' },
  },
  required: ['id', 'name', 'hint', 'scopes', 'expires_at', 'revoked', 'last_used_at'],
} as const

const present = (row: TokenRow) => ({
  id: row.token_id,
  name: row.name,
  hint: row.hint,
  scopes: row.scopes,
  expires_at: row.expires_at.toISOString(),
  revoked: row.revoked_at !== null,
  last_used_at: row.last_used_at?.toISOString() ?? null,
})

const listRoute = route({
  id: 'list-tokens',
  method: 'get',
  path: '/tokens',
  summary: 'The caller’s tokens for the command line',
  tag: 'tokens',
  policy: { action: 'self.manage' },
  limit: 'read',
  answers: {
    200: { type: 'object', properties: { tokens: { type: 'array', items: TOKEN_SCHEMA } }, required: ['tokens'] },
  },
  async run({ tx, actor }) {
    return { body: { tokens: (await listTokens(tx, actor.organisation, actor.person)).map(present) } }
  },
})

const createRoute = route({
  id: 'create-token',
  method: 'post',
  path: '/tokens',
  summary: 'A token for the command line, shown this once',
  tag: 'tokens',
  body: {
    type: 'object',
    properties: {
      name: { ...NAME, maxLength: 100 },
      scopes: {
        type: 'array',
        items: { type: 'string', enum: ['report.read', 'report.send'] },
        minItems: 1,
        maxItems: 2,
        uniqueItems: true,
      },
      days: { type: 'integer', minimum: 1, maximum: MOST_DAYS },
      password: { type: 'string', minLength: 1, maxLength: 256 },
      code: { type: 'string', maxLength: 40 },
    },
    required: ['name', 'scopes', 'days', 'password'],
    additionalProperties: false,
  },
  policy: { action: 'self.manage' },
  limit: 'write',
  idempotency: 'never',
  again: true,
  about: ({ actor }) => `person/${actor.person}`,
  answers: {
    201: {
      ...TOKEN_SCHEMA,
      properties: { ...TOKEN_SCHEMA.properties, token: { type: 'string' } },
      required: [...TOKEN_SCHEMA.required, 'token'],
    },
  },
  async run({ tx, actor, body, now }) {
    const token = `${TOKEN_PREFIX}${freshToken()}`
    const row = await insertToken(tx, {
      organisation: actor.organisation,
      person: actor.person,
      name: body.name,
      hash: tokenHash(token),
      hint: token.slice(-4),
      scopes: body.scopes,
      expires: new Date(now.getTime() + body.days * DAY_MS),
      now,
    })
    return { status: 201, body: { ...present(row), token }, audit: { token: row.token_id, scopes: row.scopes } }
  },
})

const revokeRoute = route({
  id: 'revoke-token',
  method: 'delete',
  path: '/tokens/:token',
  summary: 'Revokes one of the caller’s tokens',
  tag: 'tokens',
  policy: { action: 'self.manage' },
  limit: 'write',
  answers: { 204: null },
  async run({ tx, actor, params, now }) {
    const revoked = await revokeToken(tx, actor.organisation, actor.person, params['token'] ?? '', now)
    return revoked ? {} : refuse('not-found')
  },
})

export const TOKEN_ROUTES = [listRoute, createRoute, revokeRoute]
