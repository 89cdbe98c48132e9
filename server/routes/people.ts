import { ROLES } from '#core/policy/roles.ts'
import { changePerson } from '#server/commands/change-person.ts'
import { sendInvitation } from '#server/commands/send-link.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { type Call, route } from '#server/http/route.ts'
import { PERSON_SCHEMA, presentPerson } from '#server/presenters/person.ts'
import {
  countPeople,
  findPerson,
  insertPerson,
  listPeople,
  lockPerson,
  type PersonRow,
} from '#server/queries/people.ts'
import { endSessions } from '#server/queries/sessions.ts'
import { CODE, LICENCE, NAME, PASSWORD } from './fields.ts'

const MOST_PEOPLE = 1000

const EMAIL = { type: 'string', minLength: 3, maxLength: 254, format: 'email' } as const
const ROLE_LIST = { type: 'array', items: { type: 'string', enum: ROLES }, maxItems: 4, uniqueItems: true } as const

const NO_MAIL: Refused = refuse('bad-request', undefined, {
  errors: [{ pointer: '/email', message: 'No mail can be sent to this address: one plain address is taken.' }],
})

type Named = Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor' | 'params'>

const loadPerson = ({ tx, actor, params }: Named) => lockPerson(tx, actor.organisation, params['person'] ?? '')
const versionOf = ({ version }: PersonRow) => version

const listRoute = route({
  id: 'list-people',
  method: 'get',
  path: '/people',
  summary: 'The people of the organisation',
  tag: 'people',
  policy: { action: 'person.list' },
  limit: 'read',
  answers: {
    200: { type: 'object', properties: { people: { type: 'array', items: PERSON_SCHEMA } }, required: ['people'] },
  },
  async run({ tx, actor }) {
    return { body: { people: (await listPeople(tx, actor.organisation)).map(presentPerson) } }
  },
})

const showRoute = route({
  id: 'show-person',
  method: 'get',
  path: '/people/:person',
  summary: 'One person',
  tag: 'people',
  policy: { action: 'person.manage' },
  limit: 'read',
  load: ({ tx, actor, params }) => findPerson(tx, actor.organisation, params['person'] ?? ''),
  answers: { 200: PERSON_SCHEMA },
  async run({ subject }) {
    return { body: presentPerson(subject), version: subject.version }
  },
})

const inviteRoute = route({
  id: 'invite-person',
  method: 'post',
  path: '/people',
  summary: 'Makes an account and mails an invitation to choose a password',
  tag: 'people',
  body: {
    type: 'object',
    properties: { email: EMAIL, name: NAME, licence: LICENCE, roles: ROLE_LIST },
    required: ['email', 'name', 'roles'],
    additionalProperties: false,
  },
  policy: { action: 'person.manage' },
  limit: 'write',
  idempotency: 'required',
  answers: { 201: PERSON_SCHEMA },
  async run({ tx, actor, body, now, services }) {
    const { organisation } = actor
    if ((await countPeople(tx, organisation)) >= MOST_PEOPLE)
      return refuse('conflict', `An organisation has at most ${MOST_PEOPLE} people.`)
    const email = body.email.toLowerCase()
    const person = await insertPerson(tx, {
      organisation,
      email,
      name: body.name,
      licence: body.licence ?? null,
      roles: body.roles,
      now,
    })
    if (person === undefined)
      return refuse(
        'conflict',
        `Somebody of the organisation has the address ${email} already. Open that account again, or invite another address.`,
      )
    const to = { organisation, person, name: body.name, email, now }
    if (!(await sendInvitation(tx, services, to, { by: actor.name, roles: body.roles }))) return NO_MAIL
    const made = await findPerson(tx, organisation, person)
    if (made === undefined) throw new Error('A new person has no row.')
    return { status: 201, body: presentPerson(made), version: made.version, audit: { person, roles: body.roles } }
  },
})

const changeRoute = route({
  id: 'change-person',
  method: 'patch',
  path: '/people/:person',
  summary: 'Changes name, address, licence or roles, or closes an account; a closed account’s sessions end at once',
  tag: 'people',
  body: {
    type: 'object',
    properties: {
      email: {
        ...EMAIL,
        description: 'Takes the caller’s own password, too: who has the address can have the account.',
      },
      name: NAME,
      licence: LICENCE,
      roles: ROLE_LIST,
      active: { type: 'boolean' },
      password: PASSWORD,
      code: CODE,
    },
    minProperties: 1,
    additionalProperties: false,
  },
  policy: { action: 'person.manage' },
  limit: 'write',
  load: loadPerson,
  version: versionOf,
  answers: { 200: PERSON_SCHEMA },
  run: (call) => changePerson(call),
})

const againRoute = route({
  id: 'invite-again',
  method: 'post',
  path: '/people/:person/invitation',
  summary: 'Mails the invitation again; earlier ones no longer work',
  tag: 'people',
  policy: { action: 'person.manage' },
  limit: 'write',
  load: loadPerson,
  answers: { 204: null },
  async run({ tx, actor, subject, now, services }) {
    if (subject.has_password) return refuse('conflict', 'This person has chosen a password already.')
    if (!subject.active) return refuse('conflict', 'The account is closed. Open it first.')
    const { person_id: person, name, email, roles } = subject
    const to = { organisation: actor.organisation, person, name, email, now }
    return (await sendInvitation(tx, services, to, { by: actor.name, roles })) ? {} : NO_MAIL
  },
})

const endRoute = route({
  id: 'end-sessions-of-person',
  method: 'delete',
  path: '/people/:person/sessions',
  summary: 'Ends all sessions of a person',
  tag: 'people',
  policy: { action: 'person.manage' },
  limit: 'write',
  load: loadPerson,
  answers: { 204: null },
  async run({ tx, subject }) {
    return { audit: { ended: await endSessions(tx, subject.person_id) } }
  },
})

export const PEOPLE_ROUTES = [listRoute, showRoute, inviteRoute, changeRoute, againRoute, endRoute]
