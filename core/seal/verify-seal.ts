import { equal } from '#core/register/bytes.ts'
import type { Check } from '#core/register/signing.ts'
import { verifySignature } from './algorithms.ts'
import { type KnownCertificate, readCertificate } from './certificate.ts'
import { type CmsParts, signedAttributes } from './cms.ts'
import { leading } from './der.ts'
import { OID } from './names.ts'
import { PdfFile } from './pdf-file.ts'
import { PdfError } from './pdf-values.ts'
import { digestAround, type Placeholder, placeholderOf, rangesAround, timeFrom } from './placeholder.ts'
import { readCms } from './read-cms.ts'
import type { Subtle } from './subtle.ts'
import { verifyTimestamp } from './timestamp.ts'
import { followChain } from './trust.ts'

export interface Trust<Key> {
  /** DER of the certificates that are trusted, of seals and time stamps alike; `undefined` where none were named. */
  readonly certificates: readonly Uint8Array[] | undefined
  /** `crypto.subtle`. */
  readonly subtle: Subtle<Key>
}

/** Everything that was looked at, and what the seal says where it could be read. */
export interface SealVerdict {
  readonly checks: readonly Check[]
  /** Time that the seal states, RFC 3339 in UTC. */
  readonly at?: string
  readonly certificate?: KnownCertificate
  /** Certificates that came along with it. */
  readonly chain?: readonly KnownCertificate[]
}

const check = (id: string, holds: boolean, well: string, ill: string): Check => ({
  id,
  holds,
  says: holds ? well : ill,
})

/** Purposes of a certificate under which it may seal a document. */
const PURPOSES: readonly string[] = [OID.documentSigning, OID.emailProtection, OID.anyUsage]

function rangeCheck(bytes: Uint8Array, placeholder: Placeholder): Check {
  const wanted = rangesAround(placeholder, bytes.length)
  const { values } = placeholder.ranges
  const kind = placeholder.dictionary.entries.get('SubFilter')
  const covered =
    values.length === wanted.length &&
    values.every((value, at) => value.kind === 'number' && value.number === wanted[at]) &&
    kind?.kind === 'name' &&
    kind.name === 'ETSI.CAdES.detached'
  return check(
    'seal-covers-file',
    covered,
    'The seal covers every byte of the file but its own.',
    'The seal does not cover the whole file: something was added, cut off or moved after sealing.',
  )
}

/** The signature out of the hole, and whether all behind it is zero. */
function contentOf({ hole }: Placeholder): { readonly cms: Uint8Array; readonly padded: boolean } {
  const cms = leading(hole.bytes)?.whole ?? new Uint8Array()
  return { cms, padded: hole.bytes.subarray(cms.length).every((byte) => byte === 0) }
}

interface Signed {
  readonly parts: CmsParts
  readonly own: KnownCertificate
  readonly others: readonly KnownCertificate[]
}

/** The parts of the signature with its certificates read; `undefined` where one cannot be. */
function signedBy(cms: Uint8Array): Signed | undefined {
  const parts = readCms(cms)
  const known = parts?.certificates.map(readCertificate) ?? []
  const [own, ...rest] = known
  const others = rest.filter((certificate) => certificate !== undefined)
  return parts && own && others.length === rest.length ? { parts, own, others } : undefined
}

async function signatureCheck<Key>({ parts, own }: Signed, subtle: Subtle<Key>): Promise<Check> {
  const data = signedAttributes(own.der, parts.digest)
  const signed = { key: own.key, algorithm: OID.ecdsaSha256, data, signature: parts.signature }
  const verdict = await verifySignature(signed, subtle)
  return check(
    'seal-signature',
    verdict === 'holds',
    `The signature is that of the key of ${own.subject}.`,
    verdict === 'weak'
      ? 'The key of the certificate is none that Skerry seals with (ECDSA, P-256).'
      : 'The signature does not belong to the key of the certificate.',
  )
}

async function certificateCheck<Key>(
  { own, others }: Signed,
  at: Date,
  { certificates, subtle }: Trust<Key>,
): Promise<Check> {
  const id = 'seal-certificate'
  if (!own.maySign || (own.purposes.length > 0 && !own.purposes.some((purpose) => PURPOSES.includes(purpose)))) {
    return { id, holds: false, says: `The certificate of ${own.subject} is not for sealing documents.` }
  }
  const trusted = certificates?.flatMap((der) => readCertificate(der) ?? [])
  const { holds, says, open } = await followChain({ own, others, trusted, at, subtle })
  return { id, holds, says, ...(open && { open }) }
}

async function timestampCheck<Key>(
  token: Uint8Array,
  { parts }: Signed,
  { certificates, subtle }: Trust<Key>,
): Promise<{ readonly check: Check; readonly at?: Date }> {
  const { holds, says, at, own, others = [] } = await verifyTimestamp(token, parts.signature, subtle)
  if (!holds || !at || !own) return { check: { id: 'time-stamp', holds, says } }
  const chain = { own, others, at, subtle }
  const answer = await followChain({ ...chain, trusted: undefined })
  if (!answer.holds) return { check: { id: 'time-stamp', holds: false, says: answer.says } }
  const trusted = certificates?.flatMap((der) => readCertificate(der) ?? []) ?? []
  const rooted = await followChain({ ...chain, trusted })
  const words = rooted.trusted ? 'Its authority is trusted here.' : 'Its authority is not among those named as trusted.'
  const check: Check = {
    id: 'time-stamp',
    holds: true,
    says: `${says} ${words}`,
    ...(!rooted.trusted && { open: true }),
  }
  return { check, at }
}

async function signedChecks<Key>(
  bytes: Uint8Array,
  placeholder: Placeholder,
  signed: Signed,
  trust: Trust<Key>,
): Promise<SealVerdict> {
  const { parts, own, others } = signed
  const at = timeFrom(placeholder.time.bytes)
  const stated = at === undefined ? undefined : new Date(at)
  const stamp = parts.timestamp && (await timestampCheck(parts.timestamp, signed, trust))
  const when = stamp?.at ?? stated
  const checks = [
    check(
      'seal-digest',
      equal(parts.digest, digestAround(bytes, placeholder)),
      'Every byte is as it was when the file was sealed.',
      'The file was changed after it was sealed.',
    ),
    await signatureCheck(signed, trust.subtle),
    when
      ? await certificateCheck(signed, when, trust)
      : {
          id: 'seal-certificate',
          holds: false,
          says: 'The seal states no time, so nothing can be said of its certificate.',
        },
    ...(stamp ? [stamp.check] : []),
  ]
  return { checks, certificate: own, chain: others, ...(at !== undefined && { at }) }
}

/**
 * Verifies the seal of a PDF without any other program: that it covers the whole file, that nothing was changed, added
 * or cut off since, who sealed, and whether that certificate leads to one that is trusted.
 *
 * @param pdf the file
 * @returns each check with words; all of them must hold
 */
export async function verifySeal<Key>(pdf: Uint8Array, trust: Trust<Key>): Promise<SealVerdict> {
  try {
    const placeholder = placeholderOf(new PdfFile(pdf))
    const { cms, padded } = contentOf(placeholder)
    const form: Check[] = [
      { id: 'seal-file', holds: true, says: 'The file is in one piece, as Skerry writes it.' },
      rangeCheck(pdf, placeholder),
      check(
        'seal-padding',
        padded,
        'Nothing is hidden behind the signature.',
        'Something is hidden behind the signature.',
      ),
    ]
    const signed = signedBy(cms)
    if (!signed) {
      const says = 'There is no signature in the seal, or none as Skerry makes it: it was changed.'
      return { checks: [...form, { id: 'seal-signature', holds: false, says }] }
    }
    const verdict = await signedChecks(pdf, placeholder, signed, trust)
    return { ...verdict, checks: [...form, ...verdict.checks] }
  } catch (error) {
    if (!(error instanceof PdfError)) throw error
    return { checks: [{ id: 'seal-file', holds: false, says: error.message }] }
  }
}
