import { createTransport } from 'nodemailer'
import { classify, type SmtpFailure } from './classify.ts'
import type { MailSender } from './delivery.ts'

export interface SmtpSettings {
  readonly host: string
  readonly port: number
  /** `tls` from the first byte, `starttls` before anything is said, or none, for a server on this machine. */
  readonly security: 'tls' | 'starttls' | 'none'
  readonly user: string | null
  readonly password: string | null
  /** The sender of all mails. */
  readonly from: { readonly name: string; readonly address: string }
  /** Certificates to trust besides the usual ones. */
  readonly ca?: string
}

/** How long each step may take, in ms. One attempt never takes longer than the job that makes it. */
export const SMTP_TIMES = { connection: 10_000, greeting: 10_000, socket: 20_000 } as const

export type SmtpTimes = { readonly [Step in keyof typeof SMTP_TIMES]: number }

const SECURITY = {
  tls: { secure: true },
  starttls: { secure: false, requireTLS: true },
  none: { secure: false, ignoreTLS: true },
} as const

function isFailure(error: unknown): error is SmtpFailure {
  return error instanceof Error && 'code' in error
}

/** Sends mails through a mail server, one connection each, so that a server that went away is noticed at once. */
export function smtpSender(
  { host, port, security, user, password, from, ca }: SmtpSettings,
  { now, times = SMTP_TIMES }: { readonly now: () => Date; readonly times?: SmtpTimes },
): MailSender {
  const transport = createTransport({
    host,
    port,
    ...SECURITY[security],
    ...(user === null ? {} : { auth: { user, pass: password ?? '' } }),
    tls: { minVersion: 'TLSv1.2', ...(ca === undefined ? {} : { ca }) },
    connectionTimeout: times.connection,
    greetingTimeout: times.greeting,
    socketTimeout: times.socket,
    dnsTimeout: times.connection,
    // Nothing in a mail may make this process read a file or ask another server.
    disableFileAccess: true,
    disableUrlAccess: true,
  })
  return {
    async send({ messageId, to, subject, text, html, headers }) {
      try {
        const { response } = await transport.sendMail({
          messageId,
          date: now(),
          from: { name: from.name, address: from.address },
          to: { name: '', address: to },
          envelope: { from: from.address, to },
          subject,
          text,
          html,
          headers: { ...headers, 'Auto-Submitted': 'auto-generated' },
        })
        return { outcome: 'sent', answer: response }
      } catch (error) {
        if (isFailure(error)) return classify(error)
        throw error
      }
    },
    close() {
      transport.close()
    },
  }
}
