import type { MailSender } from './delivery.ts'

/** What stands in the record for a mail that no server was asked to send. */
const ANSWER = 'Kept here: no mail server is configured.'

/**
 * Takes the place of a mail server in development. The mail already lies in the outbox, where the administrator reads
 * it; as `kept` it is never sent later either, when a server is configured.
 */
export const catcher: MailSender = {
  send: () => Promise.resolve({ outcome: 'kept', answer: ANSWER }),
  close: () => undefined,
}
