import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { MAIL_KINDS, type MailKind } from '#server/mail/kinds.ts'
import { listMails } from '#server/queries/mail-list.ts'
import { findSwitches, type MailSwitches, switchMail } from '#server/queries/mail-switches.ts'

const SWITCHABLE = (Object.keys(MAIL_KINDS) as MailKind[]).filter((kind) => MAIL_KINDS[kind].switchable)

const SWITCHES_SCHEMA = {
  type: 'object',
  properties: {
    switches: {
      type: 'array',
      items: {
        type: 'object',
        properties: { kind: { type: 'string' }, on: { type: 'boolean' } },
        required: ['kind', 'on'],
      },
    },
  },
  required: ['switches'],
} as const

const present = (switches: MailSwitches) => ({
  switches: SWITCHABLE.map((kind) => ({ kind, on: switches[kind] !== false })),
})

const listSwitchesRoute = route({
  id: 'list-mail-switches',
  method: 'get',
  path: '/mail-switches',
  summary: 'Which mails the caller gets',
  tag: 'mails',
  policy: { action: 'self.manage' },
  limit: 'read',
  answers: { 200: SWITCHES_SCHEMA },
  async run({ tx, actor }) {
    return { body: present((await findSwitches(tx, actor)) ?? {}) }
  },
})

const switchRoute = route({
  id: 'switch-mail',
  method: 'put',
  path: '/mail-switches',
  summary: 'Switches one kind of mail on or off for the caller',
  tag: 'mails',
  body: {
    type: 'object',
    properties: { kind: { type: 'string', enum: SWITCHABLE }, on: { type: 'boolean' } },
    required: ['kind', 'on'],
    additionalProperties: false,
  },
  policy: { action: 'self.manage' },
  limit: 'write',
  about: ({ actor }) => `person/${actor.person}`,
  answers: { 200: SWITCHES_SCHEMA },
  async run({ tx, actor, body }) {
    await switchMail(tx, actor, body.kind, body.on)
    return { body: present((await findSwitches(tx, actor)) ?? {}), audit: { kind: body.kind, on: body.on } }
  },
})

const MOST = 200

const listMailsRoute = route({
  id: 'list-mails',
  method: 'get',
  path: '/mails',
  summary: 'The newest mails, where no mail server is configured; otherwise they are their recipients’ own',
  tag: 'mails',
  policy: { action: 'mail.read' },
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: {
        mails: {
          type: 'array',
          items: {
            type: 'object',
            properties: {
              id: { type: 'string', format: 'uuid' },
              kind: { type: 'string' },
              to: { type: 'string' },
              subject: { type: 'string' },
              text: { type: 'string' },
              state: { type: 'string' },
              answer: { type: ['string', 'null'] },
              created_at: { type: 'string', format: 'date-time' },
            },
            required: ['id', 'kind', 'to', 'subject', 'text', 'state', 'answer', 'created_at'],
          },
        },
      },
      required: ['mails'],
    },
  },
  async run({ tx, actor, services }) {
    // A mail may hold the link to somebody's new password: once mails are really sent, nobody reads them here.
    if (services.env.SMTP_URL !== '')
      return refuse('not-allowed', 'Mails go out by a mail server and are read by their recipients only.')
    const rows = await listMails(tx, actor.organisation, MOST)
    return {
      body: {
        mails: rows.map((row) => ({
          id: row.mail_id,
          kind: row.kind,
          to: row.to_address,
          subject: row.subject,
          text: row.text_body,
          state: row.state,
          answer: row.last_answer,
          created_at: row.created_at.toISOString(),
        })),
      },
    }
  },
})

export const MAIL_ROUTES = [listSwitchesRoute, switchRoute, listMailsRoute]
