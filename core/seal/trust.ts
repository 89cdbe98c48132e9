import { equal } from '#core/register/bytes.ts'
import { verifySignature } from './algorithms.ts'
import type { KnownCertificate } from './certificate.ts'
import type { Subtle } from './subtle.ts'

/** More than any chain of certificates needs. */
const LONGEST = 6

export interface ChainQuestion<Key> {
  /** The signer's certificate. */
  readonly own: KnownCertificate
  /** Certificates that came along. */
  readonly others: readonly KnownCertificate[]
  /** Certificates that whoever asks trusts; `undefined` where none were named. */
  readonly trusted: readonly KnownCertificate[] | undefined
  /** When the signature was made. */
  readonly at: Date
  readonly subtle: Subtle<Key>
}

export interface ChainAnswer {
  readonly holds: boolean
  /** Whether the way leads to a certificate that was named as trusted. */
  readonly trusted: boolean
  /** Nobody was named as trusted. */
  readonly open?: true
  /** What is wrong, or how far the trust goes, in one sentence. */
  readonly says: string
}

const day = (date: Date): string => date.toISOString().slice(0, 10)

function outOfDate({ subject, from, until }: KnownCertificate, at: Date): string | undefined {
  if (at >= from && at <= until) return undefined
  return `The certificate of ${subject} was valid from ${day(from)} to ${day(until)}, not on ${day(at)}.`
}

/** Why a certificate does not come from an issuer; `undefined` where it does. */
async function unissued<Key>(
  certificate: KnownCertificate,
  issuer: KnownCertificate,
  subtle: Subtle<Key>,
): Promise<string | undefined> {
  if (!issuer.isAuthority || !issuer.mayCertify) return `${issuer.subject} may not issue certificates.`
  const { signed, signature, algorithm } = certificate
  const verdict = await verifySignature({ key: issuer.key, algorithm, data: signed, signature }, subtle)
  if (verdict === 'holds') return undefined
  return verdict === 'weak'
    ? `The certificate of ${certificate.subject} is signed with an algorithm or key that is too weak.`
    : `The certificate of ${certificate.subject} was changed, or is not signed by ${issuer.subject}.`
}

/** Goes up from the signer through the certificates that came along. All of them must be on the way. */
async function climb<Key>({
  own,
  others,
  at,
  subtle,
}: ChainQuestion<Key>): Promise<{ readonly top: KnownCertificate; readonly fault: string | undefined }> {
  let [top, rest] = [own, others]
  for (let step = 0; step < LONGEST; step += 1) {
    const late = outOfDate(top, at)
    if (late !== undefined) return { top, fault: late }
    const { issuerName } = top
    const issuer = rest.find(({ subjectName }) => equal(subjectName, issuerName))
    if (!issuer) break
    const fault = await unissued(top, issuer, subtle)
    if (fault !== undefined) return { top, fault }
    rest = rest.filter((other) => other !== issuer)
    top = issuer
  }
  const [stray] = rest
  return { top, fault: stray && `The certificate of ${stray.subject} came along and leads nowhere.` }
}

async function rooted<Key>(
  top: KnownCertificate,
  trusted: readonly KnownCertificate[],
  { at, subtle }: ChainQuestion<Key>,
): Promise<string | undefined> {
  if (trusted.some((root) => equal(root.der, top.der))) return undefined
  const root = trusted.find(({ subjectName }) => equal(subjectName, top.issuerName))
  if (!root)
    return `No certificate that is trusted here has issued that of ${top.subject}; its issuer is ${top.issuer}.`
  return outOfDate(root, at) ?? unissued(top, root, subtle)
}

/** Whether a certificate that signed itself did so. */
async function unsigned<Key>(top: KnownCertificate, subtle: Subtle<Key>): Promise<string | undefined> {
  return equal(top.subjectName, top.issuerName) && top.isAuthority ? unissued(top, top, subtle) : undefined
}

/**
 * Follows a certificate to one that is trusted.
 *
 * Without a list of trusted ones nothing is known of who stands at the top: the answer then says so, and what a reader
 * must do about it.
 */
export async function followChain<Key>(question: ChainQuestion<Key>): Promise<ChainAnswer> {
  const { own, trusted, subtle } = question
  const { top, fault } = await climb(question)
  const wrong = fault ?? (await unsigned(top, subtle))
  if (wrong !== undefined) return { holds: false, trusted: false, says: wrong }
  if (!trusted) {
    return {
      holds: true,
      trusted: false,
      open: true,
      says: `The certificate is that of ${own.subject}, issued by ${own.issuer} (SHA-256 ${own.fingerprint}). Nobody was named as trusted: it is only as trustworthy as where it came from.`,
    }
  }
  const loose = await rooted(top, trusted, question)
  if (loose !== undefined) return { holds: false, trusted: false, says: loose }
  return {
    holds: true,
    trusted: true,
    says: `The certificate is that of ${own.subject}, and leads to one that is trusted here.`,
  }
}
