import type { Delivery } from './delivery.ts'

/** What a failed attempt tells, as the mail library words it. */
export interface SmtpFailure {
  readonly code?: string | undefined
  readonly command?: string | undefined
  readonly responseCode?: number | undefined
  readonly response?: string | undefined
  readonly message: string
}

/** Commands that are about this mail; a lasting no to any other is about the connection or our settings. */
const ABOUT_THE_MAIL = ['RCPT TO', 'DATA'] as const

/** Lasting refusals that are not about this mail after all: wrong order of commands, no right to send, too much mail. */
const NOT_ABOUT_THE_MAIL: ReadonlySet<number> = new Set([503, 530, 535, 538])

const LONGEST = 300

/** The server's words on one line, short enough for a list. */
const shown = (text: string): string =>
  text
    .replace(/[\p{Cc}\s]+/gu, ' ')
    .trim()
    .slice(0, LONGEST)

function isLasting({ command = '', responseCode = 0 }: SmtpFailure): boolean {
  const about = ABOUT_THE_MAIL.some((name) => command.toUpperCase().startsWith(name))
  return about && responseCode >= 500 && responseCode < 600 && !NOT_ABOUT_THE_MAIL.has(responseCode)
}

/**
 * Whether a failed mail may go later. Only a lasting no (5xx, RFC 5321) to the recipient or the content is final: a
 * refused sender, a wrong password or a broken line is ours to mend, and the mail waits for that.
 */
export function classify(failure: SmtpFailure): Delivery {
  const answer = shown(failure.response ?? `${failure.code ?? 'error'}: ${failure.message}`)
  return { outcome: isLasting(failure) ? 'refused' : 'later', answer }
}
