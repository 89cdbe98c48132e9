import { inOrganisation } from '#server/db.ts'
import { isMailKind } from '#server/mail/kinds.ts'
import { openSender } from '#server/mail/open-sender.ts'
import { switchKey } from '#server/mail/switch-key.ts'
import { unsubscribeHeaders } from '#server/mail/unsubscribe.ts'
import { lockMail, noteAttempt } from '#server/queries/mail-state.ts'
import type { Handler } from './handler.ts'

/** Limits in ms, together below what an idle transaction is allowed: a mail server that hangs is tried again later. */
const TIMES = { connection: 4_000, greeting: 4_000, socket: 6_000 } as const

/**
 * Sends a mail once. The row stays locked while the mail server answers; only a worker that dies between the server's
 * yes and the commit lets it be sent again, under the same Message-ID, which mail programs show once.
 */
export const sendMail: Handler<'send-mail'> = async ({ db, env, clock }, { organisation, mail }) => {
  const sender = openSender(env, clock, TIMES)
  try {
    const answer = await inOrganisation(db, organisation, async (tx) => {
      const row = await lockMail(tx, organisation, mail)
      if (row?.state !== 'waiting') return undefined
      const { message_id, to_address, subject, text_body, html_body, kind, to_person } = row
      const headers = isMailKind(kind)
        ? unsubscribeHeaders({ organisation, person: to_person, kind }, { baseUrl: env.BASE_URL, key: switchKey(env) })
        : {}
      const outgoing = { messageId: message_id, to: to_address, subject, text: text_body, html: html_body, headers }
      const delivery = await sender.send(outgoing)
      const state = delivery.outcome === 'later' ? 'waiting' : delivery.outcome
      await noteAttempt(tx, organisation, mail, { state, answer: delivery.answer, now: clock() })
      return delivery.outcome === 'later' ? delivery.answer : undefined
    })
    // Noted, and still thrown: only a job that fails is tried again.
    if (answer !== undefined) throw new Error(`The mail waits: ${answer}`)
  } finally {
    sender.close()
  }
}
