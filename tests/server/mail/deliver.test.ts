import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { catcher } from '#server/mail/catcher.ts'
import { type DeliverOptions, deliver, type MailLog, type StoredMail } from '#server/mail/deliver.ts'
import type { Delivery, MailSender, OutgoingMail } from '#server/mail/delivery.ts'
import { mailRenderer } from '#server/mail/mail.ts'
import { openSender } from '#server/mail/open-sender.ts'
import { compose } from '#server/mail/outbox.ts'
import { smtpSender } from '#server/mail/transport.ts'
import { readUnsubscribeToken } from '#server/mail/unsubscribe.ts'
import { SAMPLES } from './samples.ts'
import { type LocalServer, localServer } from './smtp.ts'

const KEY = Buffer.alloc(32, 1)
const AT = new Date('2026-05-04T10:15:30Z')
const BASE = 'https://skerry.example'

function storedMail(): StoredMail {
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
  return { ...composed.mail, id: '1', state: 'waiting' }
}

const STATES = { sent: 'sent', kept: 'kept', later: 'waiting', refused: 'refused' } as const

function logWith(
  mail: StoredMail,
): MailLog & { readonly row: () => StoredMail; readonly attempts: () => readonly Delivery[] } {
  let row = mail
  const attempts: Delivery[] = []
  return {
    row: () => row,
    attempts: () => attempts,
    find: (organisation, id) => Promise.resolve(organisation === row.organisation && id === row.id ? row : undefined),
    note(_organisation, _id, delivery) {
      attempts.push(delivery)
      row = { ...row, state: STATES[delivery.outcome] }
      return Promise.resolve()
    },
  }
}

const options = (log: MailLog, sender: MailSender): DeliverOptions => ({
  log,
  sender,
  now: () => AT,
  baseUrl: BASE,
  key: KEY,
})

/** Answers in turn with what it is given, and remembers what it was asked to send. */
function scripted(
  ...outcomes: readonly Delivery['outcome'][]
): MailSender & { readonly asked: readonly OutgoingMail[] } {
  const asked: OutgoingMail[] = []
  const left = [...outcomes]
  return {
    asked,
    send(mail) {
      asked.push(mail)
      return Promise.resolve({ outcome: left.shift() ?? 'sent', answer: 'as told' })
    },
    close: () => undefined,
  }
}

describe('a mail of the outbox', () => {
  let server: LocalServer
  beforeAll(async () => {
    server = await localServer()
  })
  afterAll(() => server.close())

  it('arrives, with a link that switches its kind off for its reader', async () => {
    const log = logWith(storedMail())
    const sender = smtpSender(server.settings, { now: () => AT })
    expect(await deliver(options(log, sender), 'fennmark', '1')).toMatchObject({ outcome: 'sent' })
    const [received] = server.received
    expect(received?.mail.subject).toBe('FEN-2026-0007: issued')
    expect(received?.mail.text).toBe(log.row().text)
    const token = /<https:\/\/skerry\.example\/mails\/switch-off\/([^>]+)>/.exec(
      received?.raw.replace(/\r\n\s/g, '') ?? '',
    )?.[1]
    expect(readUnsubscribeToken(token ?? '', KEY)).toEqual({
      organisation: 'fennmark',
      person: 'ada',
      kind: 'report issued',
    })
  })

  it('is sent once, also when its job runs again', async () => {
    const log = logWith(storedMail())
    const sender = scripted()
    await deliver(options(log, sender), 'fennmark', '1')
    expect(await deliver(options(log, sender), 'fennmark', '1')).toEqual({ outcome: 'nothing to do' })
    expect(sender.asked).toHaveLength(1)
  })

  it('waits after a failed attempt, and goes out under the same Message-ID', async () => {
    const log = logWith(storedMail())
    const sender = scripted('later', 'sent')
    expect(await deliver(options(log, sender), 'fennmark', '1')).toMatchObject({ outcome: 'later' })
    expect(log.row().state).toBe('waiting')
    expect(await deliver(options(log, sender), 'fennmark', '1')).toMatchObject({ outcome: 'sent' })
    expect(new Set(sender.asked.map(({ messageId }) => messageId)).size).toBe(1)
    expect(log.attempts().map(({ outcome }) => outcome)).toEqual(['later', 'sent'])
  })

  it('is not tried again once it was refused for good', async () => {
    const log = logWith(storedMail())
    const sender = scripted('refused')
    await deliver(options(log, sender), 'fennmark', '1')
    expect(log.row().state).toBe('refused')
    expect(await deliver(options(log, sender), 'fennmark', '1')).toEqual({ outcome: 'nothing to do' })
  })

  it('of another organisation is not there', async () => {
    const sender = scripted()
    expect(await deliver(options(logWith(storedMail()), sender), 'other', '1')).toEqual({ outcome: 'nothing to do' })
    expect(sender.asked).toEqual([])
  })

  it('is kept to be read where no mail server is configured', async () => {
    const log = logWith(storedMail())
    expect(await deliver(options(log, catcher), 'fennmark', '1')).toMatchObject({ outcome: 'kept' })
    expect(log.row().state).toBe('kept')
  })
})

describe('the way out for mails', () => {
  it('keeps them where no server is named', () => {
    expect(openSender({ SMTP_URL: '', MAIL_FROM: '' }, () => AT)).toBe(catcher)
  })

  it('sends them where one is', async () => {
    const server = await localServer()
    const { port } = server.settings
    const sender = openSender(
      { SMTP_URL: `smtp://127.0.0.1:${port}`, MAIL_FROM: 'Skerry <skerry@fennmark.example>' },
      () => AT,
    )
    expect(await deliver(options(logWith(storedMail()), sender), 'fennmark', '1')).toMatchObject({ outcome: 'sent' })
    expect(server.received[0]?.mail.from?.text).toBe('"Skerry" <skerry@fennmark.example>')
    sender.close()
    await server.close()
  })

  it.each([
    ['https://mail.example', 'Skerry <skerry@fennmark.example>', 'SMTP_URL'],
    ['smtp://mail.example', 'Skerry', 'MAIL_FROM'],
  ])('does not open with %s and %s', (SMTP_URL, MAIL_FROM, name) => {
    expect(() => openSender({ SMTP_URL, MAIL_FROM }, () => AT)).toThrow(name)
  })
})
