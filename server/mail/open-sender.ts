import { catcher } from './catcher.ts'
import type { MailSender } from './delivery.ts'
import { readSender, readSmtpUrl } from './smtp-url.ts'
import { SMTP_TIMES, type SmtpTimes, smtpSender } from './transport.ts'

export interface MailConfiguration {
  /** Empty where mails are kept to be read instead of sent. */
  readonly SMTP_URL: string
  readonly MAIL_FROM: string
}

/** The way out for mails that the configuration names. Throws with words for who configures the server. */
export function openSender(
  { SMTP_URL, MAIL_FROM }: MailConfiguration,
  now: () => Date,
  times: SmtpTimes = SMTP_TIMES,
): MailSender {
  if (SMTP_URL === '') return catcher
  const from = readSender(MAIL_FROM)
  if (!from.ok) throw new Error(`MAIL_FROM: ${from.problem}`)
  const settings = readSmtpUrl(SMTP_URL, from.value)
  if (!settings.ok) throw new Error(`SMTP_URL: ${settings.problem}`)
  return smtpSender(settings.value, { now, times })
}
