import { createHash, type KeyObject, randomBytes, sign } from 'node:crypto'
import { der, integer, oid, TAG } from '#core/seal/der.ts'
import { OID } from '#core/seal/names.ts'

/** Whom a certificate is for. */
export interface Holder {
  /** The name as `nameOf` gives it, or as it stands in a certificate. */
  readonly name: Uint8Array
  readonly publicKey: KeyObject
}

/** Who issues it: the holder itself for a root. */
export interface Issuer extends Holder {
  readonly privateKey: KeyObject
}

export interface CertificatePlan {
  readonly holder: Holder
  readonly issuer: Issuer
  readonly from: Date
  readonly until: Date
  /** What the key is for: to issue certificates, or to seal documents. */
  readonly role: 'authority' | 'seal'
}

const SUBJECT_KEY = '2.5.29.14'
const AUTHORITY_KEY = '2.5.29.35'
const COMMON_NAME = '2.5.4.3'
const ORGANISATION = '2.5.4.10'
const UTF8 = 0x0c
const TIME = 0x18
const PART_3 = 0xa3
/** Implicit and primitive: `[0]`. */
const KEY_IDENTIFIER = 0x80

const YES = der(TAG.boolean, Uint8Array.of(0xff))
const ECDSA = der(TAG.sequence, oid(OID.ecdsaSha256))
/** Bits of KeyUsage with the count of unused ones before them (RFC 5280, 4.2.1.3): certificates and their lists; documents. */
const USAGE = { authority: [1, 0x06], seal: [6, 0xc0] } as const
const PURPOSES = der(TAG.sequence, oid(OID.documentSigning), oid(OID.emailProtection))

const spki = (key: KeyObject): Uint8Array => new Uint8Array(key.export({ type: 'spki', format: 'der' }))

/** RFC 7093, method 1, in place of SHA-1: the first 160 bits of SHA-256 over the key. */
function keyIdentifier(key: KeyObject): Uint8Array {
  return new Uint8Array(createHash('sha256').update(spki(key)).digest().subarray(0, 20))
}

/** A distinguished name of an organisation and a common name, as DER. */
export function nameOf(organisation: string, commonName: string): Uint8Array {
  const parts = [
    [ORGANISATION, organisation],
    [COMMON_NAME, commonName],
  ] as const
  const named = parts.map(([type, text]) =>
    der(TAG.set, der(TAG.sequence, oid(type), der(UTF8, new Uint8Array(Buffer.from(text, 'utf8'))))),
  )
  return der(TAG.sequence, ...named)
}

/** RFC 5280, 4.1.2.5.2 allows the long form for all dates only from 2050 on; readers take the short one before. */
function timeOf(date: Date): Uint8Array {
  const digits = date.toISOString().slice(0, 19).replaceAll(/[-:T]/g, '')
  const [tag, text] = date.getUTCFullYear() < 2050 ? [0x17, digits.slice(2)] : [TIME, digits]
  return der(tag, new Uint8Array(Buffer.from(`${text}Z`, 'latin1')))
}

function extension(name: string, critical: boolean, value: Uint8Array): Uint8Array {
  return der(TAG.sequence, oid(name), critical ? YES : new Uint8Array(), der(TAG.octets, value))
}

function extensionsOf({ holder, issuer, role }: CertificatePlan): Uint8Array {
  const issuerKey = der(TAG.sequence, der(KEY_IDENTIFIER, keyIdentifier(issuer.publicKey)))
  return der(
    TAG.sequence,
    extension(OID.basicConstraints, true, der(TAG.sequence, role === 'authority' ? YES : new Uint8Array())),
    extension(OID.keyUsage, true, der(TAG.bits, Uint8Array.from(USAGE[role]))),
    extension(SUBJECT_KEY, false, der(TAG.octets, keyIdentifier(holder.publicKey))),
    extension(AUTHORITY_KEY, false, issuerKey),
    role === 'seal' ? extension(OID.extendedKeyUsage, false, PURPOSES) : new Uint8Array(),
  )
}

/** A serial number of 126 random bits, above zero (RFC 5280, 4.1.2.2). */
function serialNumber(): Uint8Array {
  const bytes = new Uint8Array(randomBytes(16))
  bytes[0] = ((bytes[0] ?? 0) & 0x3f) | 0x40
  return der(TAG.integer, bytes)
}

/**
 * Makes an X.509 certificate, signed with ECDSA and SHA-256, as DER.
 *
 * @source RFC 5280, 4.1
 */
export function makeCertificate(plan: CertificatePlan): Uint8Array {
  const { holder, issuer, from, until } = plan
  const body = der(
    TAG.sequence,
    der(TAG.part0, integer(2)),
    serialNumber(),
    ECDSA,
    issuer.name,
    der(TAG.sequence, timeOf(from), timeOf(until)),
    holder.name,
    spki(holder.publicKey),
    der(PART_3, extensionsOf(plan)),
  )
  const signature = new Uint8Array(sign('sha256', body, issuer.privateKey))
  return der(TAG.sequence, body, ECDSA, der(TAG.bits, Uint8Array.of(0), signature))
}
