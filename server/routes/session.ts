import { ACTIONS, type Action } from '#core/policy/actions.ts'
import { can } from '#core/policy/can.ts'
import { signIn } from '#server/commands/sign-in.ts'
import { inOrganisation } from '#server/db.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { findActor } from '#server/queries/actor.ts'

const CREDENTIALS = {
  type: 'object',
  properties: {
    email: { type: 'string', minLength: 3, maxLength: 254 },
    password: { type: 'string', minLength: 1, maxLength: 256 },
    code: { type: 'string', minLength: 6, maxLength: 20 },
  },
  required: ['email', 'password'],
  additionalProperties: false,
} as const

const SESSION = {
  type: 'object',
  properties: {
    csrf: { type: 'string' },
    person: { type: ['object', 'null'] },
  },
  required: ['csrf', 'person'],
} as const

export const showSession = route({
  id: 'show-session',
  method: 'get',
  path: '/session',
  summary: 'Who is signed in, what they may do, and the token that changes must carry',
  tag: 'session',
  policy: 'public',
  limit: 'read',
  answers: { 200: SESSION },
  async run({ actor, visit }) {
    if (visit.session === null || actor.person === '')
      return { body: { csrf: visit.session?.csrf ?? '', person: null } }
    const actions = (Object.keys(ACTIONS) as Action[]).filter((action) => can(actor, action).allowed)
    return {
      body: {
        csrf: visit.session.csrf,
        person: {
          id: actor.person,
          name: actor.name,
          licence: actor.licence,
          roles: actor.roles,
          organisation: actor.organisation,
          actions,
        },
      },
    }
  },
})

export const createSession = route({
  id: 'sign-in',
  method: 'post',
  path: '/session',
  summary: 'Signs in with address and password, and the code of the second factor where there is one',
  tag: 'session',
  body: CREDENTIALS,
  policy: 'public',
  limit: 'sign-in',
  audited: false,
  answers: { 200: SESSION },
  async run({ body, services, visit }) {
    const found = await signIn(services.db, body)
    if (found === undefined || visit.session === null) return refuse('sign-in-failed')
    const actor = await inOrganisation(services.db, found.organisation, (tx) =>
      findActor(tx, found.organisation, found.person),
    )
    if (actor === undefined) return refuse('sign-in-failed')
    await visit.session.signIn(found)
    return {
      body: {
        csrf: visit.session.csrf,
        person: { id: actor.person, name: actor.name, roles: actor.roles, organisation: actor.organisation },
      },
    }
  },
})

export const deleteSession = route({
  id: 'sign-out',
  method: 'delete',
  path: '/session',
  summary: 'Ends the session on the server',
  tag: 'session',
  policy: 'signed in',
  limit: 'write',
  answers: { 204: null },
  async run({ visit }) {
    await visit.session?.signOut()
    return {}
  },
})

export const SESSION_ROUTES = [showSession, createSession, deleteSession]
