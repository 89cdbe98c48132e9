import { askForReset } from '#server/commands/ask-for-reset.ts'
import { choosePassword, judged, linkOwner } from '#server/commands/choose-password.ts'
import { hashPassword } from '#server/commands/passwords.ts'
import { sendNotice } from '#server/commands/send-link.ts'
import { refuse, tooMany } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { organisationName } from '#server/queries/organisations.ts'
import { findSecrets, writeSecrets } from '#server/queries/secrets.ts'
import { endSessions } from '#server/queries/sessions.ts'
import { CODE, EMAIL, PASSWORD } from './fields.ts'

/** Judged in words by length and by what it is made of. */
const NEW_PASSWORD = { type: 'string', minLength: 1, maxLength: 1000 } as const
const LINK = { type: 'string', pattern: '^[A-Za-z0-9_-]{43}$' } as const

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
  async run({ body, services }) {
    return {
      async afterwards() {
        const owner = await linkOwner(services, body.link)
        if (owner === undefined) return refuse('gone')
        const { holder, secrets, organisation } = owner
        return { body: { purpose: holder.purpose, name: secrets.name, organisation } }
      },
    }
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
    properties: { link: LINK, new_password: NEW_PASSWORD },
    required: ['link', 'new_password'],
    additionalProperties: false,
  },
  policy: 'public',
  limit: 'sign-in',
  audited: false,
  answers: { 204: null },
  async run({ body, services, visit }) {
    return { afterwards: async () => (await choosePassword(services, body, visit)) ?? {} }
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
    properties: { email: EMAIL },
    required: ['email'],
    additionalProperties: false,
  },
  policy: 'public',
  limit: 'sign-in',
  audited: false,
  answers: { 202: { type: 'object', properties: { sent: { type: 'string' } }, required: ['sent'] } },
  async run({ body, services, visit }) {
    return {
      async afterwards() {
        const wait = await askForReset(services, body.email, visit)
        if (wait > 0) return tooMany(wait)
        return { status: 202, body: { sent: 'If somebody has this address, a mail is on its way.' } }
      },
    }
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
      code: CODE,
      new_password: NEW_PASSWORD,
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
  async run({ tx, actor, body, visit, services, now }) {
    const secrets = await findSecrets(tx, actor)
    if (secrets === undefined) return refuse('not-signed-in')
    const { organisation, person } = actor
    const weak = judged(body.new_password, secrets, (await organisationName(tx, organisation)).name)
    if (weak !== undefined) return weak
    await writeSecrets(tx, actor, { password_hash: await hashPassword(body.new_password) })
    if (body.end_others === true) await endSessions(tx, person, { but: visit.session?.id ?? '' })
    await sendNotice(
      tx,
      services,
      { organisation, person, name: secrets.name, email: secrets.email, now },
      'The password was changed',
    )
    return { audit: { ended_others: body.end_others === true } }
  },
})

export const PASSWORD_ROUTES = [linkRoute, chooseRoute, resetRoute, changeRoute]
