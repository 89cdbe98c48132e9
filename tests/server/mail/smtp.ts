import type { AddressInfo } from 'node:net'
import { buffer } from 'node:stream/consumers'
import { type ParsedMail, simpleParser } from 'mailparser'
import { SMTPServer, type SMTPServerOptions } from 'smtp-server'
import type { OutgoingMail } from '#server/mail/delivery.ts'
import { type SmtpSettings, smtpSender } from '#server/mail/transport.ts'

export interface Received {
  readonly mail: ParsedMail
  readonly raw: string
  readonly secure: boolean
  readonly to: readonly string[]
}

export interface LocalServer {
  readonly received: readonly Received[]
  readonly settings: SmtpSettings
  readonly close: () => Promise<void>
}

export const OUTGOING: OutgoingMail = {
  messageId: '<0123456789abcdef@skerry.example>',
  to: 'ada@fennmark.example',
  subject: 'ALD-7: returned – 20 Ω',
  text: 'Hello Ada,\n\n.\n. a line with a dot\nFrom here on: Ω ≤ 0.42\n',
  html: '<p>Hello Ada,</p>\n<p>Ω ≤ 0.42</p>\n',
  headers: { 'List-Unsubscribe': '<https://skerry.example/x>', 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' },
}

/** A mail server on this machine that reads what it gets with a parser of its own. */
export async function localServer(options: SMTPServerOptions = {}): Promise<LocalServer> {
  const received: Received[] = []
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    async onData(stream, { envelope, secure }, done) {
      const raw = await buffer(stream)
      const to = envelope.rcptTo.map(({ address }) => address)
      received.push({ mail: await simpleParser(raw), raw: raw.toString('latin1'), secure, to })
      done(null)
    },
    ...options,
  })
  // Clients that break off are part of these tests.
  server.on('error', () => undefined)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const { port } = server.server.address() as AddressInfo
  return {
    received,
    settings: {
      host: 'localhost',
      port,
      security: 'none',
      user: null,
      password: null,
      from: { name: 'Skerry, tests', address: 'skerry@fennmark.example' },
    },
    close: () => new Promise((resolve) => server.close(resolve)),
  }
}

/** Short waits, so that what hangs is given up within the test. */
const TIMES = { connection: 500, greeting: 500, socket: 700 }

export async function sendTo(settings: SmtpSettings, mail: OutgoingMail = OUTGOING) {
  const sender = smtpSender(settings, { now: () => new Date('2026-05-04T10:15:30Z'), times: TIMES })
  try {
    return await sender.send(mail)
  } finally {
    sender.close()
  }
}
