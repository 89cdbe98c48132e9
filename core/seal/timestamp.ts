import { sha256 } from '@noble/hashes/sha2.js'
import { strFromU8 } from 'fflate'
import { equal } from '#core/register/bytes.ts'
import { hashOf, signatureName, verifySignature } from './algorithms.ts'
import { type KnownCertificate, readCertificate } from './certificate.ts'
import { signerOf } from './cms.ts'
import { der, type Element, inside, integer, oid, partsOf, setOf, TAG } from './der.ts'
import { OID } from './names.ts'
import type { Subtle } from './subtle.ts'

/** A time stamp that was taken apart. */
interface Token {
  /** When the authority saw the signature. */
  readonly at: Date
  /** What it saw: the digest of the signature. */
  readonly imprint: Uint8Array
  readonly own: KnownCertificate
  readonly others: readonly KnownCertificate[]
  /** The attributes that are signed, as a set. */
  readonly signed: Uint8Array
  readonly algorithm: string
  readonly signature: Uint8Array
}

export interface TimestampAnswer {
  readonly holds: boolean
  readonly says: string
  readonly at?: Date
  readonly own?: KnownCertificate
  readonly others?: readonly KnownCertificate[]
}

const GENERALIZED = 0x18

/** `20261021093000Z`, with or without parts of a second. */
function timeOf(element: Element | undefined): Date | undefined {
  if (element?.tag !== GENERALIZED) return undefined
  const [, year, month, day, hour, minute, second] =
    /^(\d{4})(\d\d)(\d\d)(\d\d)(\d\d)(\d\d(?:\.\d{1,9})?)Z$/.exec(strFromU8(element.content, true)) ?? []
  return second === undefined ? undefined : new Date(`${year}-${month}-${day}T${hour}:${minute}:${second}Z`)
}

function attributeOf(signed: Element, name: string): Element | undefined {
  const wanted = oid(name)
  const found = partsOf(signed).find(({ whole }) => equal(inside(whole, 0)?.whole ?? whole, wanted))
  return found && inside(found.whole, 1, 0)
}

/** Whether the attributes name this certificate as the signer's (ESSCertIDv2, RFC 5035). */
function namesSigner(signed: Element, certificate: Uint8Array): boolean {
  const value = attributeOf(signed, OID.signingCertificate)
  const [one, two] = partsOf(value && inside(value.whole, 0, 0))
  const hash = one?.tag === TAG.sequence ? hashOf(inside(one.whole, 0)?.whole) : { digest: sha256 }
  const stated = one?.tag === TAG.sequence ? two : one
  return hash !== undefined && stated !== undefined && equal(hash.digest(certificate), stated.content)
}

/** The certificates with the signer's apart; none may be unreadable. */
function parted(
  list: Element | undefined,
  signer: Uint8Array,
): { readonly own: KnownCertificate; readonly others: readonly KnownCertificate[] } | undefined {
  const all = partsOf(list).map(({ whole }) => readCertificate(whole))
  const known = all.filter((certificate) => certificate !== undefined)
  const own = known.find((certificate) => equal(signerOf(certificate.der) ?? certificate.der, signer))
  return own && known.length === all.length ? { own, others: known.filter((other) => other !== own) } : undefined
}

/** The one way in which these parts make a token: no byte of it can be changed unseen. */
function rebuilt(
  encapsulated: Element,
  certificates: Element,
  [, signer, digest, signed, algorithm, signature]: readonly Element[],
): Uint8Array {
  const parts = [signer, digest, signed, algorithm, signature].map((part) => part?.whole ?? new Uint8Array())
  return der(
    TAG.sequence,
    oid(OID.signedData),
    der(
      TAG.part0,
      der(
        TAG.sequence,
        integer(3),
        der(TAG.set, digest?.whole ?? new Uint8Array()),
        encapsulated.whole,
        setOf(
          TAG.part0,
          partsOf(certificates).map(({ whole }) => whole),
        ),
        der(TAG.set, der(TAG.sequence, integer(1), ...parts)),
      ),
    ),
  )
}

function tokenFrom(bytes: Uint8Array): Token | undefined {
  const [, , encapsulated, certificates] = partsOf(inside(bytes, 1, 0))
  const info = partsOf(inside(bytes, 1, 0, 4, 0))
  const [, signer, digest, signed, algorithm, signature] = info
  const content = encapsulated && inside(encapsulated.whole, 1, 0)
  if (!certificates || !signer || !digest || !signed || !signature || !content) return undefined
  const hash = hashOf(inside(digest.whole, 0)?.whole)
  const named = hash && signatureName(algorithm && inside(algorithm.whole, 0)?.whole, hash.name)
  const people = parted(certificates, signer.whole)
  const [, , imprint, , time] = partsOf(inside(content.content))
  const at = timeOf(time)
  const stated = imprint && inside(imprint.whole, 1)?.content
  const sha = imprint && inside(imprint.whole, 0, 0)?.whole
  if (!hash || named === undefined || !people || !at || !stated || !sha || !equal(sha, oid(OID.sha256)))
    return undefined
  const says = [
    [attributeOf(signed, OID.contentType)?.whole, oid(OID.timeStampInfo)],
    [inside(encapsulated.whole, 0)?.whole, oid(OID.timeStampInfo)],
    [attributeOf(signed, OID.messageDigest)?.content, hash.digest(content.content)],
    [rebuilt(encapsulated, certificates, info), bytes],
  ] as const
  if (says.some(([found, wanted]) => !found || !equal(found, wanted))) return undefined
  if (!namesSigner(signed, people.own.der)) return undefined
  return {
    at,
    imprint: stated,
    ...people,
    signed: der(TAG.set, signed.content),
    algorithm: named,
    signature: signature.content,
  }
}

/**
 * Verifies a time stamp over a signature; whether its authority is trusted is another question.
 *
 * @param token RFC 3161 token as DER
 * @param signature as it stands in the seal
 * @source RFC 3161, 2.4.2; RFC 5816
 */
export async function verifyTimestamp<Key>(
  token: Uint8Array,
  signature: Uint8Array,
  subtle: Subtle<Key>,
): Promise<TimestampAnswer> {
  const read = tokenFrom(token)
  if (!read)
    return {
      holds: false,
      says: 'The time stamp was changed, or is not one that Skerry accepts (RFC 3161 with SHA-2).',
    }
  const { at, imprint, own, others, signed, algorithm } = read
  const bad = (says: string): TimestampAnswer => ({ holds: false, says })
  if (!equal(imprint, sha256(signature))) return bad('The time stamp is over another signature.')
  if (!own.purposes.includes(OID.timeStamping)) return bad(`${own.subject} may not give time stamps.`)
  const verdict = await verifySignature({ key: own.key, algorithm, data: signed, signature: read.signature }, subtle)
  if (verdict !== 'holds')
    return bad(
      verdict === 'weak'
        ? 'The time stamp is signed with an algorithm or key that is too weak.'
        : 'The time stamp was changed after it was given.',
    )
  return { holds: true, says: `${own.subject} saw the seal at ${at.toISOString()}.`, at, own, others }
}
