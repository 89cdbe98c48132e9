import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex } from '@noble/hashes/utils.js'
import { type AttributeTypeAndValue, BasicConstraints, Certificate, type Extension, ExtKeyUsage } from 'pkijs'
import { type Element, inside, partsOf } from './der.ts'
import { OID } from './names.ts'

/** A certificate with what trust in it hangs on. */
export interface KnownCertificate {
  readonly der: Uint8Array
  /** `CN=…, O=…`. */
  readonly subject: string
  readonly issuer: string
  /** Both names as they are encoded: they are compared byte for byte. */
  readonly subjectName: Uint8Array
  readonly issuerName: Uint8Array
  readonly from: Date
  readonly until: Date
  /** SubjectPublicKeyInfo as DER. */
  readonly key: Uint8Array
  /** What its issuer signed, with which algorithm, and the signature. */
  readonly signed: Uint8Array
  readonly algorithm: string
  readonly signature: Uint8Array
  readonly isAuthority: boolean
  /** Whether its key may sign documents, and certificates; both where it says nothing about it. */
  readonly maySign: boolean
  readonly mayCertify: boolean
  /** Purposes that it is limited to, as object identifiers; none where it is not limited. */
  readonly purposes: readonly string[]
  /** SHA-256 in hex. */
  readonly fingerprint: string
}

/** RFC 4519 and RFC 5280, Appendix A. */
const NAMES: Readonly<Record<string, string>> = {
  '2.5.4.3': 'CN',
  '2.5.4.6': 'C',
  '2.5.4.7': 'L',
  '2.5.4.8': 'ST',
  '2.5.4.10': 'O',
  '2.5.4.11': 'OU',
  '2.5.4.5': 'serialNumber',
  '2.5.4.97': 'organizationIdentifier',
}

const UNDERSTOOD: ReadonlySet<string> = new Set([OID.keyUsage, OID.basicConstraints, OID.extendedKeyUsage])
/** Bits of the first byte of KeyUsage (RFC 5280, 4.2.1.3). */
const USAGE = { digitalSignature: 0x80, nonRepudiation: 0x40, keyCertSign: 0x04 } as const

function nameText(parts: readonly AttributeTypeAndValue[]): string {
  return parts.map(({ type, value }) => `${NAMES[type] ?? type}=${String(value.valueBlock.value)}`).join(', ')
}

function usageOf(extensions: readonly Extension[]): number {
  const found = extensions.find(({ extnID }) => extnID === OID.keyUsage)
  const bits = found && new Uint8Array(found.extnValue.valueBlock.valueHexView)
  return bits ? (bits[3] ?? 0) : 0xff
}

function purposesOf(extensions: readonly Extension[]): readonly string[] {
  const found = extensions.find(({ extnID }) => extnID === OID.extendedKeyUsage)?.parsedValue
  return found instanceof ExtKeyUsage ? found.keyPurposes : []
}

function isAuthority(extensions: readonly Extension[]): boolean {
  const found = extensions.find(({ extnID }) => extnID === OID.basicConstraints)?.parsedValue
  return found instanceof BasicConstraints && found.cA
}

function parsed(der: Uint8Array): Certificate | undefined {
  try {
    return Certificate.fromBER(new Uint8Array(der))
  } catch {
    // The package throws plain errors for whatever is no certificate; there is nothing else in it that could fail.
    return undefined
  }
}

/** The algorithm of a signature; `undefined` where inside and outside of the certificate do not agree on it. */
function agreed(body: readonly Element[], outside: Element | undefined): boolean {
  const within = body[2]
  return within !== undefined && outside !== undefined && within.whole.join() === outside.whole.join()
}

/**
 * Reads a certificate.
 *
 * @param der X.509 of version 3
 * @returns `undefined` where the bytes are none, or hold something critical that is not understood
 * @source RFC 5280
 */
export function readCertificate(der: Uint8Array): KnownCertificate | undefined {
  const outer = inside(der)
  const [body, algorithm, signature, ...rest] = partsOf(outer)
  const parts = partsOf(body)
  const [, , , issuerName, , subjectName, key] = parts
  const certificate = parsed(der)
  if (outer?.whole.length !== der.length || rest.length > 0) return undefined
  if (!certificate || !body || !signature || !issuerName || !subjectName || !key) return undefined
  const { extensions = [], issuer, subject, notBefore, notAfter, signatureAlgorithm } = certificate
  if (!agreed(parts, algorithm)) return undefined
  if (extensions.some(({ critical, extnID }) => critical && !UNDERSTOOD.has(extnID))) return undefined
  const usage = usageOf(extensions)
  return {
    der,
    subject: nameText(subject.typesAndValues),
    issuer: nameText(issuer.typesAndValues),
    subjectName: subjectName.whole,
    issuerName: issuerName.whole,
    from: notBefore.value,
    until: notAfter.value,
    key: key.whole,
    signed: body.whole,
    algorithm: signatureAlgorithm.algorithmId,
    // The first byte counts unused bits, of which a signature has none.
    signature: signature.content.subarray(1),
    isAuthority: isAuthority(extensions),
    maySign: (usage & (USAGE.digitalSignature | USAGE.nonRepudiation)) !== 0,
    mayCertify: (usage & USAGE.keyCertSign) !== 0,
    purposes: purposesOf(extensions),
    fingerprint: bytesToHex(sha256(der)),
  }
}
