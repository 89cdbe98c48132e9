import { enter } from '#server/commands/enter.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { type Answer, route } from '#server/http/route.ts'
import { presentSession, SESSION_SCHEMA } from '#server/presenters/actor.ts'
import { endSessions, listSessions } from '#server/queries/sessions.ts'
import { EMAIL } from './fields.ts'

const CREDENTIALS = {
  type: 'object',
  properties: {
    email: EMAIL,
    password: { type: 'string', minLength: 1, maxLength: 256 },
    code: { type: 'string', minLength: 6, maxLength: 40, description: 'Of the second factor, or a recovery code.' },
    organisation: { type: 'string', format: 'uuid', description: 'For an address that belongs to people of several.' },
  },
  required: ['email', 'password'],
  additionalProperties: false,
} as const

const showRoute = route({
  id: 'show-session',
  method: 'get',
  path: '/session',
  summary: 'Who is signed in, what they may do, and the token that changes must carry',
  tag: 'session',
  policy: 'public',
  limit: 'read',
  answers: { 200: SESSION_SCHEMA },
  async run({ actor, visit }) {
    return { body: presentSession(visit.session, actor.person === '' ? undefined : actor) }
  },
})

const signInRoute = route({
  id: 'sign-in',
  method: 'post',
  path: '/session',
  summary: 'Signs in with address and password, and the code of the second factor where there is one',
  tag: 'session',
  body: CREDENTIALS,
  policy: 'public',
  limit: 'sign-in',
  audited: false,
  answers: {
    200: {
      ...SESSION_SCHEMA,
      properties: {
        ...SESSION_SCHEMA.properties,
        choose: {
          type: 'array',
          items: {
            type: 'object',
            properties: { id: { type: 'string', format: 'uuid' }, name: { type: 'string' } },
            required: ['id', 'name'],
          },
          description: 'Organisations to choose from; nobody is signed in yet.',
        },
      },
    },
  },
  async run({ body, services, visit }): Promise<Answer | Refused> {
    const { session } = visit
    if (session === null) return refuse('bad-request', 'An API token needs no sign-in.')
    return {
      async afterwards() {
        const entered = await enter(services, body, visit)
        if (entered.kind === 'refused') return entered.refused
        if (entered.kind === 'choose')
          return { body: { ...presentSession(null, undefined), choose: entered.organisations } }
        await session.signIn(entered.membership)
        return { body: presentSession(session, entered.actor) }
      },
    }
  },
})

const signOutRoute = route({
  id: 'sign-out',
  method: 'delete',
  path: '/session',
  summary: 'Ends the session on the server',
  tag: 'session',
  policy: 'signed in',
  limit: 'write',
  about: ({ actor }) => `person/${actor.person}`,
  answers: { 204: null },
  async run({ visit }) {
    return {
      async afterwards() {
        await visit.session?.signOut()
        return { headers: { 'clear-site-data': '"cache", "storage"' } }
      },
    }
  },
})

const listRoute = route({
  id: 'list-sessions',
  method: 'get',
  path: '/sessions',
  summary: 'Where the caller is signed in',
  tag: 'session',
  policy: { action: 'self.manage' },
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: {
        sessions: {
          type: 'array',
          items: {
            type: 'object',
            properties: {
              id: { type: 'string', description: 'Names the session; opens nothing.' },
              current: { type: 'boolean' },
              signed_in_at: { type: 'string', format: 'date-time' },
              browser: { type: 'string' },
              address: { type: 'string' },
            },
            required: ['id', 'current', 'signed_in_at', 'browser', 'address'],
          },
        },
      },
      required: ['sessions'],
    },
  },
  async run({ tx, actor, visit, now }) {
    const rows = await listSessions(tx, actor.person, now)
    return {
      body: {
        sessions: rows.map(({ sid, signed_in_at, browser, address }) => ({
          id: sid,
          current: sid === visit.session?.id,
          signed_in_at: signed_in_at.toISOString(),
          browser,
          address,
        })),
      },
    }
  },
})

const endOneRoute = route({
  id: 'end-session',
  method: 'delete',
  path: '/sessions/:sha256',
  summary: 'Ends one session of the caller',
  tag: 'session',
  policy: { action: 'self.manage' },
  limit: 'write',
  about: ({ actor }) => `person/${actor.person}`,
  answers: { 204: null },
  async run({ tx, actor, params }) {
    const ended = await endSessions(tx, actor.person, { only: params['sha256'] ?? '' })
    return ended === 0 ? refuse('not-found') : {}
  },
})

const endOthersRoute = route({
  id: 'end-other-sessions',
  method: 'delete',
  path: '/sessions',
  summary: 'Ends all sessions of the caller but this one',
  tag: 'session',
  policy: { action: 'self.manage' },
  limit: 'write',
  about: ({ actor }) => `person/${actor.person}`,
  answers: { 204: null },
  async run({ tx, actor, visit }) {
    const ended = await endSessions(tx, actor.person, { but: visit.session?.id ?? '' })
    return { audit: { ended } }
  },
})

export const SESSION_ROUTES = [showRoute, signInRoute, signOutRoute, listRoute, endOneRoute, endOthersRoute]
