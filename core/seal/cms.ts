import { sha256 } from '@noble/hashes/sha2.js'
import { der, inside, integer, oid, partsOf, setOf, TAG } from './der.ts'
import { OID } from './names.ts'

/**
 * The signature inside a seal: CMS SignedData over the file, which it does not contain, with the attributes that PAdES
 * B-B asks for and, for B-T, a time stamp over the signature.
 *
 * @source RFC 5652; ETSI EN 319 142-1 V1.1.1, clause 6 (no signing-time attribute: the time is the signature's `M`)
 */
export interface CmsParts {
  /** Each as DER; the first is the signer's. */
  readonly certificates: readonly Uint8Array[]
  /** SHA-256 of the bytes that are signed. */
  readonly digest: Uint8Array
  /** ECDSA signature over the signed attributes, as DER. */
  readonly signature: Uint8Array
  /** RFC 3161 token over the signature, as DER. */
  readonly timestamp?: Uint8Array
}

const SHA256 = der(TAG.sequence, oid(OID.sha256))
const ECDSA = der(TAG.sequence, oid(OID.ecdsaSha256))

function attribute(name: string, value: Uint8Array): Uint8Array {
  return der(TAG.sequence, oid(name), der(TAG.set, value))
}

/** ESSCertIDv2 with its default, SHA-256: the signature speaks for this certificate and no other. */
function signingCertificate(certificate: Uint8Array): Uint8Array {
  return der(TAG.sequence, der(TAG.sequence, der(TAG.sequence, der(TAG.octets, sha256(certificate)))))
}

function attributes(tag: number, certificate: Uint8Array, digest: Uint8Array): Uint8Array {
  return setOf(tag, [
    attribute(OID.contentType, oid(OID.data)),
    attribute(OID.messageDigest, der(TAG.octets, digest)),
    attribute(OID.signingCertificate, signingCertificate(certificate)),
  ])
}

/**
 * The bytes that are signed: the attributes, among them the digest of the file and of the certificate.
 *
 * @param certificate the signer's, as DER
 * @param digest SHA-256 of the file but for the hole
 */
export function signedAttributes(certificate: Uint8Array, digest: Uint8Array): Uint8Array {
  return attributes(TAG.set, certificate, digest)
}

/**
 * Issuer and serial number of a certificate, as a signature names its signer.
 *
 * @returns `undefined` where the bytes are no certificate of version 3
 */
export function signerOf(certificate: Uint8Array): Uint8Array | undefined {
  const [version, serial, , issuer] = partsOf(inside(certificate, 0))
  if (version?.tag !== TAG.part0 || !serial || !issuer) return undefined
  return der(TAG.sequence, issuer.whole, serial.whole)
}

/**
 * Puts the signature together. The same parts give the same bytes.
 *
 * @returns ContentInfo as DER
 * @throws RangeError where the first certificate is none
 */
export function buildCms({ certificates, digest, signature, timestamp }: CmsParts): Uint8Array {
  const [own = new Uint8Array()] = certificates
  const signer = signerOf(own)
  if (!signer) throw new RangeError('The first of the certificates is no X.509 certificate (version 3) in DER.')
  const info = der(
    TAG.sequence,
    integer(1),
    signer,
    SHA256,
    attributes(TAG.part0, own, digest),
    ECDSA,
    der(TAG.octets, signature),
    timestamp ? setOf(TAG.part1, [attribute(OID.timeStampToken, timestamp)]) : new Uint8Array(),
  )
  const signed = der(
    TAG.sequence,
    integer(1),
    der(TAG.set, SHA256),
    der(TAG.sequence, oid(OID.data)),
    setOf(TAG.part0, certificates),
    der(TAG.set, info),
  )
  return der(TAG.sequence, oid(OID.signedData), der(TAG.part0, signed))
}
