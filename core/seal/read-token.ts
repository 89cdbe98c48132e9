import { sha256 } from '@noble/hashes/sha2.js'
import { strFromU8 } from 'fflate'
import { equal } from '#core/register/bytes.ts'
import { hashOf, signatureName } from './algorithms.ts'
import { type KnownCertificate, readCertificate } from './certificate.ts'
import { signerOf } from './cms.ts'
import { der, type Element, inside, integer, oid, partsOf, setOf, TAG } from './der.ts'
import { OID } from './names.ts'

/** A time stamp that was taken apart. */
export interface Token {
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
  certificates: readonly Uint8Array[],
  signer: Uint8Array,
): { readonly own: KnownCertificate; readonly others: readonly KnownCertificate[] } | undefined {
  const all = certificates.map(readCertificate)
  const known = all.filter((certificate) => certificate !== undefined)
  const own = known.find((certificate) => equal(signerOf(certificate.der) ?? certificate.der, signer))
  return own && known.length === all.length ? { own, others: known.filter((other) => other !== own) } : undefined
}

/** An algorithm without parameters, left out or empty: both are written. */
function isPlain(algorithm: Element, name: Uint8Array): boolean {
  return [der(TAG.sequence, name), der(TAG.sequence, name, der(TAG.nothing))].some((form) =>
    equal(form, algorithm.whole),
  )
}

/** What a token is made of. */
interface Parts {
  readonly certificates: readonly Uint8Array[]
  /** TSTInfo as DER. */
  readonly content: Uint8Array
  readonly signer: Uint8Array
  readonly digest: Element
  readonly signed: Element
  readonly algorithm: Element
  readonly signature: Uint8Array
}

function partsIn(bytes: Uint8Array): Parts | undefined {
  const [, , encapsulated, certificates] = partsOf(inside(bytes, 1, 0))
  const [, signer, digest, signed, algorithm, signature] = partsOf(inside(bytes, 1, 0, 4, 0))
  const content = encapsulated && inside(encapsulated.whole, 1, 0)
  if (!signer || !digest || !signed || !algorithm || !signature || !content) return undefined
  return {
    certificates: partsOf(certificates).map(({ whole }) => whole),
    content: content.content,
    signer: signer.whole,
    digest,
    signed,
    algorithm,
    signature: signature.content,
  }
}

/** The one way in which these parts make a token: no byte of it can be changed unseen. */
function rebuilt({ certificates, content, signer, digest, signed, algorithm, signature }: Parts): Uint8Array {
  const encapsulated = der(TAG.sequence, oid(OID.timeStampInfo), der(TAG.part0, der(TAG.octets, content)))
  const info = der(
    TAG.sequence,
    integer(1),
    signer,
    digest.whole,
    der(TAG.part0, signed.content),
    algorithm.whole,
    der(TAG.octets, signature),
  )
  const body = der(
    TAG.sequence,
    integer(3),
    der(TAG.set, digest.whole),
    encapsulated,
    setOf(TAG.part0, certificates),
    der(TAG.set, info),
  )
  return der(TAG.sequence, oid(OID.signedData), der(TAG.part0, body))
}

/** The names of hash and signature algorithm; `undefined` where one is too weak or not known. */
function algorithmsOf({
  digest,
  algorithm,
}: Parts): { readonly digest: (bytes: Uint8Array) => Uint8Array; readonly name: string } | undefined {
  const [hashName, signatureOid] = [inside(digest.whole, 0)?.whole, inside(algorithm.whole, 0)?.whole]
  const hash = hashOf(hashName)
  const name = hash && signatureName(signatureOid, hash.name)
  if (!hash || name === undefined || !hashName || !signatureOid) return undefined
  return isPlain(digest, hashName) && isPlain(algorithm, signatureOid) ? { digest: hash.digest, name } : undefined
}

/** When the authority saw what: the digest must be SHA-256, as it was asked for. */
function sightOf(content: Uint8Array): { readonly at: Date; readonly imprint: Uint8Array } | undefined {
  const [, , imprint, , time] = partsOf(inside(content))
  const [algorithm, digest] = partsOf(imprint)
  const at = timeOf(time)
  if (!at || !digest || !algorithm || !isPlain(algorithm, oid(OID.sha256))) return undefined
  return { at, imprint: digest.content }
}

/** Whether the signed attributes speak of this content and this certificate. */
function attributesFit({ signed }: Parts, digest: Uint8Array, own: KnownCertificate): boolean {
  const [type, stated] = [attributeOf(signed, OID.contentType), attributeOf(signed, OID.messageDigest)]
  return (
    type !== undefined &&
    equal(type.whole, oid(OID.timeStampInfo)) &&
    stated !== undefined &&
    equal(stated.content, digest) &&
    namesSigner(signed, own.der)
  )
}

/**
 * Takes a time stamp apart.
 *
 * @param bytes RFC 3161 token as DER
 * @returns `undefined` where it is none that is built in the one way, with algorithms that are strong enough
 * @source RFC 3161, 2.4.2; RFC 5816
 */
export function readToken(bytes: Uint8Array): Token | undefined {
  const parts = partsIn(bytes)
  const algorithms = parts && algorithmsOf(parts)
  const people = parts && parted(parts.certificates, parts.signer)
  const sight = parts && sightOf(parts.content)
  if (!algorithms || !people || !sight || !equal(rebuilt(parts), bytes)) return undefined
  if (!attributesFit(parts, algorithms.digest(parts.content), people.own)) return undefined
  return {
    ...sight,
    ...people,
    signed: der(TAG.set, parts.signed.content),
    algorithm: algorithms.name,
    signature: parts.signature,
  }
}
