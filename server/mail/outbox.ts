import { createHash } from 'node:crypto'
import { checkedAddress, type HeaderProblem, headerProblem } from './header.ts'
import { MAIL_KINDS, type MailKind } from './kinds.ts'
import type { RenderedMail, RenderMail } from './mail.ts'
import type { MailViews } from './views.ts'

export interface Recipient {
  /** Nothing where somebody without an account is written to, as when invited. */
  readonly person: string | null
  readonly name: string
  readonly address: string
  /** Kinds that the person has switched off. */
  readonly silent: readonly string[]
}

/** What happened, and whom it may concern. */
export interface MailEvent<Kind extends MailKind = MailKind> {
  readonly organisation: string
  readonly kind: Kind
  /** Names the event once and for all, such as `review/9f…`: nobody is told of it twice. */
  readonly event: string
  /** Who did it, and knows; nothing where the clock did. */
  readonly actor: string | null
  readonly view: MailViews[Kind]
}

/** A mail as it lies in the outbox, written in the same transaction as what it tells of. */
export interface OutboxMail extends RenderedMail {
  readonly organisation: string
  readonly kind: MailKind
  /** One for each event and recipient: the same again is not written a second time. */
  readonly dedupeKey: string
  /** The same however often the mail is sent, so that a mail program shows it once. */
  readonly messageId: string
  readonly to: { readonly person: string | null; readonly address: string }
}

export type Composed =
  | { readonly ok: true; readonly mail: OutboxMail }
  | { readonly ok: false; readonly field: 'address' | 'subject'; readonly problem: HeaderProblem }

export interface OutboxFrame {
  readonly render: RenderMail
  readonly baseUrl: string
  readonly organisationName: string
}

/** The people to be told: not who did it, not who has switched it off or is looking at it now, and nobody twice. */
export function audience(
  { kind, actor }: Pick<MailEvent, 'kind' | 'actor'>,
  people: readonly Recipient[],
  looking: ReadonlySet<string> = new Set(),
): Recipient[] {
  const told = new Set<string>()
  return people.filter(({ person, address, silent }) => {
    const key = address.toLowerCase()
    const knows = person !== null && (person === actor || (MAIL_KINDS[kind].switchable && looking.has(person)))
    if (knows || told.has(key) || (MAIL_KINDS[kind].switchable && silent.includes(kind))) return false
    told.add(key)
    return true
  })
}

/** The key of an event and a recipient; a stranger is known by the address only. */
export const dedupeKey = ({ event }: Pick<MailEvent, 'event'>, { person, address }: Recipient): string =>
  `${event}/${person ?? createHash('sha256').update(address.toLowerCase()).digest('hex').slice(0, 40)}`

/** The Message-ID of a key: nothing of the event can be read from it. */
export function messageId(organisation: string, key: string, baseUrl: string): string {
  const name = createHash('sha256').update(`${organisation}/${key}`).digest('hex').slice(0, 40)
  return `<${name}@${new URL(baseUrl).hostname}>`
}

/** The mail of an event to one recipient, or why none can be made. */
export function compose<Kind extends MailKind>(
  event: MailEvent<Kind>,
  recipient: Recipient,
  { render, baseUrl, organisationName }: OutboxFrame,
): Composed {
  const address = checkedAddress(recipient.address)
  if (!address.ok) return { ok: false, field: 'address', problem: address.problem }
  const rendered = render(event.kind, event.view, { baseUrl, organisation: organisationName, to: recipient.name })
  const problem = headerProblem(rendered.subject)
  if (problem) return { ok: false, field: 'subject', problem }
  const key = dedupeKey(event, recipient)
  return {
    ok: true,
    mail: {
      ...rendered,
      organisation: event.organisation,
      kind: event.kind,
      dedupeKey: key,
      messageId: messageId(event.organisation, key, baseUrl),
      to: { person: recipient.person, address: address.address },
    },
  }
}
