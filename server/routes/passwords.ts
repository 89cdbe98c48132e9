import { hashPassword, passwordProblem } from '#server/commands/passwords.ts'
import { linkHash, sendLink } from '#server/commands/send-link.ts'
import { inOrganisation } from '#server/db.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { type Answer, route } from '#server/http/route.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { findByAddress, findLink, useLink } from '#server/queries/links.ts'
import { organisationName } from '#server/queries/organisations.ts'
import { findSecrets, writeSecrets } from '#server/queries/secrets.ts'
import { endSessions } from '#server/queries/sessions.ts'

const PASSWORD = { type: 'string', minLength: 1, maxLength: 1000 } as const
const LINK = { type: 'string', pattern: '^[A-Za-z0-9_-]{43}$' } as const

const weak = (message: string): Refused =>
  refuse('bad-request', message, { errors: [{ pointer: '/new_password', message }] })

const linkRoute = route({
  id: 'show-link',
  method: 'post',
  path: '/links/show',
  summary: 'Whom a link of a mail belongs to; uses nothing up',
  tag: 'session',
  body: { type: 'object', properties: { link: LINK }, required: ['link'], additionalProperties: false },
  policy: 'public',
  limit: 'public',
  audited: false,
  answers: {
    200: {
      type: 'object',
      properties: {
        purpose: { type: 'string', enum: ['invitation', 'reset'] },
        name: { type: 'string' },
        organisation: { type: 'string' },
      },
      required: ['purpose', 'name', 'organisation'],
    },
  },
  async run({ tx, body, services }): Promise<Answer | Refused> {
    const holder = await findLink(tx, linkHash(body.link))
    if (holder === undefined) return refuse('gone')
    const { organisation_id: organisation, person_id: person, purpose } = holder
    return await inOrganisation(services.db, organisation, async (inside): Promise<Answer | Refused> => {
      const secrets = await findSecrets(inside, { organisation, person })
      if (secrets === undefined) return refuse('gone')
      return {
        body: { purpose, name: secrets.name, organisation: (await organisationName(inside, organisation)).name },
      }
    })
  },
})

const chooseRoute = route({
  id: 'choose-password',
  method: 'post',
  path: '/links/use',
  summary: 'Chooses a password by the link of a mail; the link is used up, and all sessions end',
  tag: 'session',
  body: {
    type: 'object',
    properties: { link: LINK, new_password: PASSWORD },
    required: ['link', 'new_password'],
    additionalProperties: false,
  },
  policy: 'public',
  limit: 'sign-in',
  audited: false,
  answers: { 204: null },
  async run({ tx, body, services, visit, now }): Promise<Answer | Refused> {
    const hash = linkHash(body.link)
    const holder = await findLink(tx, hash)
    if (holder === undefined) return refuse('gone')
    const { organisation_id: organisation, person_id: person, purpose } = holder
    return await inOrganisation(services.db, organisation, async (inside): Promise<Answer | Refused> => {
      const whom = { organisation, person }
      const secrets = await findSecrets(inside, whom)
      if (secrets === undefined) return refuse('gone')
      const { name } = await organisationName(inside, organisation)
      const problem = passwordProblem(body.new_password, {
        words: [secrets.name, secrets.email, name],
        secondFactor: secrets.totp_secret !== null,
      })
      if (problem !== undefined) return weak(problem)
      if (!(await useLink(inside, organisation, hash, now))) return refuse('gone')
      await writeSecrets(inside, whom, { password_hash: await hashPassword(body.new_password) })
      await endSessions(inside, person)
      await writeAudit(inside, {
        organisation,
        person,
        roles: [],
        action: 'choose-password',
        subject: `person/${person}`,
        at: now,
        request: visit.request,
        address: visit.address,
        details: { purpose },
      })
      return {}
    })
  },
})

const resetRoute = route({
  id: 'ask-for-reset',
  method: 'post',
  path: '/links',
  summary: 'Mails a link for a new password, if anybody has the address; the answer is the same either way',
  tag: 'session',
  body: {
    type: 'object',
    properties: { email: { type: 'string', minLength: 3, maxLength: 254 } },
    required: ['email'],
    additionalProperties: false,
  },
  policy: 'public',
  limit: 'sign-in',
  audited: false,
  answers: { 202: { type: 'object', properties: { sent: { type: 'string' } }, required: ['sent'] } },
  async run({ tx, body, services, now }) {
    const found = await findByAddress(tx, body.email)
    for (const { organisation_id: organisation, person_id: person } of found)
      await inOrganisation(services.db, organisation, async (inside) => {
        const secrets = await findSecrets(inside, { organisation, person })
        // Who has not accepted the invitation yet gets it again, for there is no password to be lost.
        const purpose = secrets?.password_hash === null ? 'invitation' : 'reset'
        if (secrets !== undefined)
          await sendLink(inside, services, { organisation, person, email: secrets.email, purpose }, now)
      })
    return { status: 202, body: { sent: 'If somebody has this address, a mail is on its way.' } }
  },
})

const changeRoute = route({
  id: 'change-password',
  method: 'put',
  path: '/password',
  summary: 'Changes the caller’s password; all other sessions end if asked for',
  tag: 'session',
  body: {
    type: 'object',
    properties: {
      password: PASSWORD,
      code: { type: 'string', maxLength: 40 },
      new_password: PASSWORD,
      end_others: { type: 'boolean' },
    },
    required: ['password', 'new_password'],
    additionalProperties: false,
  },
  policy: { action: 'self.manage' },
  limit: 'sign-in',
  again: true,
  about: ({ actor }) => `person/${actor.person}`,
  answers: { 204: null },
  async run({ tx, actor, body, visit }) {
    const secrets = await findSecrets(tx, actor)
    if (secrets === undefined) return refuse('not-signed-in')
    const { name } = await organisationName(tx, actor.organisation)
    const problem = passwordProblem(body.new_password, {
      words: [secrets.name, secrets.email, name],
      secondFactor: secrets.totp_secret !== null,
    })
    if (problem !== undefined) return weak(problem)
    await writeSecrets(tx, actor, { password_hash: await hashPassword(body.new_password) })
    if (body.end_others === true) await endSessions(tx, actor.person, { but: visit.session?.id ?? '' })
    return { audit: { ended_others: body.end_others === true } }
  },
})

export const PASSWORD_ROUTES = [linkRoute, chooseRoute, resetRoute, changeRoute]
