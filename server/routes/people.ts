import { ROLES } from '#core/policy/roles.ts'
import { sendLink } from '#server/commands/send-link.ts'
import { refuse } from '#server/http/problems.ts'
import { type Call, route } from '#server/http/route.ts'
import {
  addressTaken,
  countPeople,
  findPerson,
  insertPerson,
  listPeople,
  lockAdministrators,
  type PersonRow,
  updatePerson,
} from '#server/queries/people.ts'
import { endSessions } from '#server/queries/sessions.ts'

const MOST_PEOPLE = 1000

const NAME = { type: 'string', minLength: 1, maxLength: 200, pattern: '^[^\\u0000-\\u001f\\u007f]*$' } as const
const LICENCE = { type: ['string', 'null'], maxLength: 100, pattern: '^[^\\u0000-\\u001f\\u007f]*$' } as const
const EMAIL = { type: 'string', minLength: 3, maxLength: 254, format: 'email' } as const
const ROLE_LIST = { type: 'array', items: { type: 'string', enum: ROLES }, maxItems: 4, uniqueItems: true } as const

const PERSON_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    email: { type: 'string' },
    name: { type: 'string' },
    licence: { type: ['string', 'null'] },
    roles: { type: 'array', items: { type: 'string' } },
    active: { type: 'boolean' },
    invited: { type: 'boolean', description: 'Has not chosen a password yet.' },
    second_factor: { type: 'boolean' },
    version: { type: 'integer' },
  },
  required: ['id', 'email', 'name', 'licence', 'roles', 'active', 'invited', 'second_factor', 'version'],
} as const

const present = (row: PersonRow) => ({
  id: row.person_id,
  email: row.email,
  name: row.name,
  licence: row.licence,
  roles: row.roles,
  active: row.active,
  invited: !row.has_password,
  second_factor: row.second_factor,
  version: row.version,
})

type Named = Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor' | 'params'>

const loadPerson = ({ tx, actor, params }: Named) => findPerson(tx, actor.organisation, params['person'] ?? '')
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
    return { body: { people: (await listPeople(tx, actor.organisation)).map(present) } }
  },
})

const showRoute = route({
  id: 'show-person',
  method: 'get',
  path: '/people/:person',
  summary: 'One person',
  tag: 'people',
  policy: { action: 'person.manage' },
  limit: 'write',
  load: async ({ tx, actor, params }) =>
    (await listPeople(tx, actor.organisation)).find(({ person_id }) => person_id === params['person']),
  answers: { 200: PERSON_SCHEMA },
  async run({ subject }) {
    return { body: present(subject), version: subject.version }
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
    await sendLink(tx, services, { organisation, person, email, purpose: 'invitation' }, now)
    const made = await findPerson(tx, organisation, person)
    if (made === undefined) throw new Error('A new person has no row.')
    return { status: 201, body: present(made), version: made.version, audit: { person, roles: body.roles } }
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
    properties: { email: EMAIL, name: NAME, licence: LICENCE, roles: ROLE_LIST, active: { type: 'boolean' } },
    minProperties: 1,
    additionalProperties: false,
  },
  policy: { action: 'person.manage' },
  limit: 'write',
  load: loadPerson,
  version: versionOf,
  answers: { 200: PERSON_SCHEMA },
  async run({ tx, actor, subject, body }) {
    const { organisation } = actor
    const { person_id } = subject
    const loses = body.active === false || (body.roles !== undefined && !body.roles.includes('administrator'))
    const administrators = loses ? await lockAdministrators(tx, organisation) : []
    if (administrators.length === 1 && administrators[0] === person_id)
      return refuse('conflict', 'This is the last administrator. Give the role to somebody else first.')
    const email = body.email?.toLowerCase()
    if (email !== undefined && (await addressTaken(tx, organisation, email, person_id)))
      return refuse('conflict', `Somebody else of the organisation has the address ${email}.`)
    const { email: _, ...rest } = body
    await updatePerson(tx, organisation, person_id, { ...rest, ...(email === undefined ? {} : { email }) })
    if (body.active === false) await endSessions(tx, person_id)
    const changed = await findPerson(tx, organisation, person_id)
    if (changed === undefined) throw new Error('A changed person has no row.')
    return {
      body: present(changed),
      version: changed.version,
      audit: { before: present(subject), after: present(changed) },
    }
  },
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
    await sendLink(
      tx,
      services,
      { organisation: actor.organisation, person: subject.person_id, email: subject.email, purpose: 'invitation' },
      now,
    )
    return {}
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
