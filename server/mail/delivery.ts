import type { OutboxMail } from './outbox.ts'

/** A mail as it goes out. */
export interface OutgoingMail extends Pick<OutboxMail, 'messageId' | 'subject' | 'text' | 'html'> {
  readonly to: string
  readonly headers: Readonly<Record<string, string>>
}

/** What became of one attempt. */
export type Delivery =
  | { readonly outcome: 'sent'; readonly answer: string }
  /** Kept for the administrator to read, since no mail server is configured. */
  | { readonly outcome: 'kept'; readonly answer: string }
  /** Not now: the line, the server or its settings. The same mail may go later. */
  | { readonly outcome: 'later'; readonly answer: string }
  /** Never: the recipient's server does not take this mail. */
  | { readonly outcome: 'refused'; readonly answer: string }

/** Sends one mail. It throws for mistakes of ours only; what others do is an outcome. */
export interface MailSender {
  send(mail: OutgoingMail): Promise<Delivery>
  close(): void
}
