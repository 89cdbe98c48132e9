import { createHash } from 'node:crypto'
import type { Tx } from '#server/db.ts'
import type { Colleague } from '#server/queries/colleagues.ts'
import { insertMail } from '#server/queries/mails.ts'
import type { Services } from '#server/services.ts'
import { escapeHtml, oneLine } from './mail-text.ts'

/** Kinds of mail that the record sends; each person may switch each off. */
export type MailKind = 'review asked' | 'review submitted' | 'report issued' | 'report withdrawn' | 'checkpoint'

/** What people are told, and of which event. */
export interface News {
  readonly organisation: string
  readonly kind: MailKind
  /** Names the event once and for all, such as `review/9f…`: nobody is told of it twice. */
  readonly event: string
  /** Who did it, and is not told of it. */
  readonly actor: string
  readonly subject: string
  readonly lines: readonly string[]
  /** A path of ours, beginning with `/`. */
  readonly path: string
  readonly now: Date
}

/** Writes one mail to each person who wants that kind, and puts it on the queue in the same transaction. */
export async function tell(
  tx: Tx,
  { jobs, env }: Pick<Services, 'jobs' | 'env'>,
  news: News,
  people: readonly Colleague[],
): Promise<number> {
  const { organisation, kind, event, actor, lines, now } = news
  const link = `${env.BASE_URL}${news.path}`
  const wanted = people.filter(({ person, silent }) => person !== actor && !silent.includes(kind))
  let written = 0
  for (const { person, email } of wanted) {
    const dedupeKey = `${event}/${person}`
    const name = createHash('sha256').update(`${organisation}/${dedupeKey}`).digest('hex').slice(0, 40)
    const mail = await insertMail(tx, {
      organisation,
      dedupeKey,
      messageId: `<${name}@${new URL(env.BASE_URL).hostname}>`,
      kind,
      to: { person, address: email },
      subject: oneLine(news.subject),
      text: [...lines, '', link, ''].join('\n'),
      html: [
        ...lines.map((line) => `<p>${escapeHtml(line)}</p>`),
        `<p><a href="${escapeHtml(link)}">${escapeHtml(link)}</a></p>`,
      ].join('\n'),
      now,
    })
    if (mail === undefined) continue
    await jobs.send(tx, 'send-mail', { organisation, mail })
    written += 1
  }
  return written
}
