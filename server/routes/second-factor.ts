import { authenticatorUri, newSecret, recoveryCodes, recoveryHash, verifyCode } from '#server/commands/second-factor.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { findSecrets, writeSecrets } from '#server/queries/secrets.ts'

const PASSWORD = { type: 'string', minLength: 1, maxLength: 256 } as const
const CODE = { type: 'string', maxLength: 40 } as const

const offerRoute = route({
  id: 'offer-second-factor',
  method: 'post',
  path: '/second-factor/offer',
  summary: 'A new secret for an authenticator; nothing is changed until it is confirmed',
  tag: 'session',
  body: {
    type: 'object',
    properties: { password: PASSWORD, code: CODE },
    required: ['password'],
    additionalProperties: false,
  },
  policy: { action: 'self.manage' },
  limit: 'sign-in',
  again: true,
  audited: false,
  idempotency: 'never',
  answers: {
    200: {
      type: 'object',
      properties: {
        secret: { type: 'string' },
        uri: { type: 'string', description: 'For the authenticator, usually as a picture.' },
      },
      required: ['secret', 'uri'],
    },
  },
  async run({ tx, actor }) {
    const secrets = await findSecrets(tx, actor)
    if (secrets === undefined) return refuse('not-signed-in')
    const secret = newSecret()
    return { body: { secret, uri: authenticatorUri(secret, secrets.email) } }
  },
})

const confirmRoute = route({
  id: 'set-second-factor',
  method: 'put',
  path: '/second-factor',
  summary: 'Takes the secret into use once a code of it is right; shows the recovery codes this once',
  tag: 'session',
  body: {
    type: 'object',
    properties: {
      password: PASSWORD,
      code: { ...CODE, description: 'Of the second factor that is in use, if there is one.' },
      secret: { type: 'string', pattern: '^[A-Z2-7]{32}$' },
      new_code: { type: 'string', pattern: '^[0-9]{6}$' },
    },
    required: ['password', 'secret', 'new_code'],
    additionalProperties: false,
  },
  policy: { action: 'self.manage' },
  limit: 'sign-in',
  again: true,
  idempotency: 'never',
  about: ({ actor }) => `person/${actor.person}`,
  answers: {
    200: {
      type: 'object',
      properties: { recovery_codes: { type: 'array', items: { type: 'string' } } },
      required: ['recovery_codes'],
    },
  },
  async run({ tx, actor, body, now }) {
    const step = verifyCode(body.secret, body.new_code, now, null)
    if (step === undefined)
      return refuse('bad-request', undefined, {
        errors: [
          {
            pointer: '/new_code',
            message:
              'The code does not belong to this secret. Check the clock of the authenticator, and send its newest code.',
          },
        ],
      })
    const codes = recoveryCodes()
    await writeSecrets(tx, actor, {
      totp_secret: body.secret,
      totp_last_step: step,
      recovery_hashes: codes.map(recoveryHash),
    })
    return { body: { recovery_codes: codes } }
  },
})

const removeRoute = route({
  id: 'remove-second-factor',
  method: 'post',
  path: '/second-factor/remove',
  summary: 'Signs in by the password alone from now on',
  tag: 'session',
  body: {
    type: 'object',
    properties: { password: PASSWORD, code: CODE },
    required: ['password', 'code'],
    additionalProperties: false,
  },
  policy: { action: 'self.manage' },
  limit: 'sign-in',
  again: true,
  about: ({ actor }) => `person/${actor.person}`,
  answers: { 204: null },
  async run({ tx, actor, body }) {
    if ([...body.password].length < 15)
      return refuse(
        'conflict',
        'The password has fewer than 15 characters, which is enough only beside a second factor. Choose a longer one first.',
      )
    await writeSecrets(tx, actor, { totp_secret: null, totp_last_step: null, recovery_hashes: [] })
    return {}
  },
})

export const SECOND_FACTOR_ROUTES = [offerRoute, confirmRoute, removeRoute]
