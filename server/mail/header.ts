import { domainToASCII } from 'node:url'

/** Why a text cannot stand in the head of a mail. */
export type HeaderProblem =
  | 'holds a line end or another control character'
  | 'is too long'
  | 'is empty'
  | 'is no address'

/** Longest line that RFC 5322 lets a mail have. */
const LONGEST = 998

/** What ends a line, or what some reader may take for a line's end. */
const CONTROL = /[\p{Cc}\p{Zl}\p{Zp}]/u

/** Whether a text may be the value of a header; nothing where it may. */
export function headerProblem(value: string): HeaderProblem | undefined {
  if (CONTROL.test(value)) return 'holds a line end or another control character'
  if (value.trim() === '') return 'is empty'
  return Buffer.byteLength(value) > LONGEST ? 'is too long' : undefined
}

/** Signs that RFC 5322 lets the part before @ hold without quotes. */
const LOCAL = /^[A-Za-z0-9!#$%&'*+/=?^_`{|}~-]+(?:\.[A-Za-z0-9!#$%&'*+/=?^_`{|}~-]+)*$/
const LABEL = /^[a-z0-9](?:[a-z0-9-]{0,61}[a-z0-9])?$/

const isDomain = (domain: string): boolean =>
  domain.length <= 253 && domain.split('.').every((label) => LABEL.test(label))

/**
 * One address in the form that is sent, its domain in ASCII; a problem where it is none. Lists, names, comments,
 * quoted parts and routes are not taken: each of them has been used to send mail to somebody else.
 */
export function checkedAddress(
  address: string,
): { readonly ok: true; readonly address: string } | { readonly ok: false; readonly problem: HeaderProblem } {
  const problem = headerProblem(address)
  if (problem) return { ok: false, problem }
  const at = address.lastIndexOf('@')
  const local = address.slice(0, Math.max(0, at))
  const domain = domainToASCII(address.slice(at + 1))
  const good = at > 0 && local.length <= 64 && LOCAL.test(local) && isDomain(domain) && address.length <= 254
  return good ? { ok: true, address: `${local}@${domain}` } : { ok: false, problem: 'is no address' }
}
