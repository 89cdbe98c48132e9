import { ACTIONS, type Action } from '#core/policy/actions.ts'
import { can } from '#core/policy/can.ts'
import type { Actor } from '#core/policy/roles.ts'
import type { SessionHandle } from '#server/http/route.ts'

export const SESSION_SCHEMA = {
  type: 'object',
  properties: {
    csrf: { type: 'string', description: 'Goes into the header X-CSRF-Token of every request that changes something.' },
    person: {
      type: ['object', 'null'],
      properties: {
        id: { type: 'string', format: 'uuid' },
        name: { type: 'string' },
        licence: { type: ['string', 'null'] },
        roles: { type: 'array', items: { type: 'string' } },
        organisation: { type: 'string', format: 'uuid' },
        actions: { type: 'array', items: { type: 'string' }, description: 'What the roles allow.' },
      },
    },
  },
  required: ['csrf', 'person'],
} as const

/** Who is signed in, with all that the roles allow: pages show what can be done without knowing roles. */
export const presentSession = (session: SessionHandle | null, actor: Actor | undefined) => ({
  csrf: actor === undefined ? '' : (session?.csrf ?? ''),
  person:
    actor === undefined
      ? null
      : {
          id: actor.person,
          name: actor.name,
          licence: actor.licence,
          roles: actor.roles,
          organisation: actor.organisation,
          actions: (Object.keys(ACTIONS) as Action[]).filter((action) => can(actor, action).allowed),
        },
})
