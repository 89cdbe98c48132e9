import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { catcher } from '#server/mail/catcher.ts'
import { mailRenderer } from '#server/mail/mail.ts'
import { openSender } from '#server/mail/open-sender.ts'
import { compose } from '#server/mail/outbox.ts'
import { readUnsubscribeToken, unsubscribeHeaders } from '#server/mail/unsubscribe.ts'
import { SAMPLES } from './samples.ts'
import { type LocalServer, localServer, OUTGOING } from './smtp.ts'

const KEY = Buffer.alloc(32, 1)
const BASE = 'https://skerry.example'
const now = (): Date => new Date('2026-05-04T10:15:30Z')
const FROM = 'Skerry <skerry@fennmark.example>'

describe('the way out for mails', () => {
  let server: LocalServer
  beforeAll(async () => {
    server = await localServer()
  })
  afterAll(() => server.close())

  it('keeps them to be read where no server is named', async () => {
    const sender = openSender({ SMTP_URL: '', MAIL_FROM: '' }, now)
    expect(sender).toBe(catcher)
    expect(await sender.send(OUTGOING)).toEqual({ outcome: 'kept', answer: expect.stringContaining('no mail server') })
  })

  it.each([
    ['https://mail.example', FROM, 'SMTP_URL'],
    ['smtp://mail.example', 'Skerry', 'MAIL_FROM'],
  ])('does not open with %s and %s', (SMTP_URL, MAIL_FROM, name) => {
    expect(() => openSender({ SMTP_URL, MAIL_FROM }, now)).toThrow(name)
  })

  it('carries a mail of the outbox to its reader, with a link that switches its kind off', async () => {
    const composed = compose(
      {
        organisation: 'fennmark',
        kind: 'report issued',
        event: 'document/1',
        actor: null,
        view: SAMPLES['report issued'],
      },
      { person: 'ada', name: 'Ada Reed', address: 'ada@fennmark.example', silent: [] },
      { render: mailRenderer(), baseUrl: BASE, organisationName: 'Fennmark Electric' },
    )
    if (!composed.ok) throw new Error(composed.problem)
    const { mail } = composed
    const headers = unsubscribeHeaders(
      { organisation: mail.organisation, person: mail.to.person, kind: mail.kind },
      { baseUrl: BASE, key: KEY },
    )
    const sender = openSender({ SMTP_URL: `smtp://127.0.0.1:${server.settings.port}`, MAIL_FROM: FROM }, now)
    expect(await sender.send({ ...mail, to: mail.to.address, headers })).toMatchObject({ outcome: 'sent' })
    sender.close()

    const [received] = server.received
    expect(received?.mail.subject).toBe('FEN-2026-0007: issued')
    expect(received?.mail.text).toBe(mail.text)
    expect(received?.mail.from?.text).toBe('"Skerry" <skerry@fennmark.example>')
    expect(received?.mail.messageId).toBe(mail.messageId)
    const unfolded = received?.raw.replace(/\r\n\s/g, '') ?? ''
    const token = /<https:\/\/skerry\.example\/mails\/switch-off\/([^>]+)>/.exec(unfolded)?.[1] ?? ''
    expect(readUnsubscribeToken(token, KEY)).toEqual({ organisation: 'fennmark', person: 'ada', kind: 'report issued' })
  })
})
