import { createHmac, timingSafeEqual } from 'node:crypto'
import { addressOf } from './helpers.ts'
import { isMailKind, MAIL_KINDS, type MailKind } from './kinds.ts'

/** Whose mails of which kind are to be switched off. */
export interface Unsubscription {
  readonly organisation: string
  readonly person: string
  readonly kind: MailKind
}

const PATH = '/mails/switch-off/'

const sign = (body: string, key: Uint8Array): Buffer => createHmac('sha256', key).update(`switch-off:${body}`).digest()

/** A token that switches one kind of mail off for one person, and can do nothing else. */
export function unsubscribeToken({ organisation, person, kind }: Unsubscription, key: Uint8Array): string {
  const body = Buffer.from(JSON.stringify([organisation, person, kind])).toString('base64url')
  return `${body}.${sign(body, key).toString('base64url')}`
}

function parsed(body: string): Unsubscription | undefined {
  const read: unknown = JSON.parse(Buffer.from(body, 'base64url').toString('utf8'))
  if (!Array.isArray(read)) return undefined
  const [organisation, person, kind]: readonly unknown[] = read
  if (typeof organisation !== 'string' || typeof person !== 'string' || typeof kind !== 'string') return undefined
  return isMailKind(kind) && MAIL_KINDS[kind].switchable ? { organisation, person, kind } : undefined
}

/** What a token switches off; nothing where we did not make it. */
export function readUnsubscribeToken(token: string, key: Uint8Array): Unsubscription | undefined {
  const [body = '', signature = '', ...more] = token.split('.')
  const [given, wanted] = [Buffer.from(signature, 'base64url'), sign(body, key)]
  if (more.length > 0 || given.length !== wanted.length || !timingSafeEqual(given, wanted)) return undefined
  return parsed(body)
}

/**
 * The headers that let a mail program offer one click to switch a kind off (RFC 2369, RFC 8058); none for kinds that an
 * account needs. The address answers POST only by changing something: programs that look at links in mails use GET.
 */
export function unsubscribeHeaders(
  {
    organisation,
    person,
    kind,
  }: { readonly organisation: string; readonly person: string | null; readonly kind: MailKind },
  { baseUrl, key }: { readonly baseUrl: string; readonly key: Uint8Array },
): Readonly<Record<string, string>> {
  if (person === null || !MAIL_KINDS[kind].switchable) return {}
  const address = addressOf(baseUrl, `${PATH}${unsubscribeToken({ organisation, person, kind }, key)}`)
  return { 'List-Unsubscribe': `<${address}>`, 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' }
}
