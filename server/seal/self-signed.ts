import { webcrypto } from 'node:crypto'
import * as asn1js from 'asn1js'
import * as pkijs from 'pkijs'

const engine = new pkijs.CryptoEngine({ name: 'node', crypto: webcrypto })

const pem = (label: string, bytes: ArrayBuffer): string =>
  `-----BEGIN ${label}-----\n${Buffer.from(bytes)
    .toString('base64')
    .replaceAll(/.{64}(?=.)/g, '$&\n')}\n-----END ${label}-----\n`

/** X.520 attributes: common name, organisation name. */
const COMMON_NAME = '2.5.4.3'
const ORGANISATION_NAME = '2.5.4.10'
/** RFC 5280, 4.2.1.3 and 4.2.1.9. */
const KEY_USAGE = '2.5.29.15'
const BASIC_CONSTRAINTS = '2.5.29.19'
/** digitalSignature and contentCommitment, the first two bits. */
const SIGNS_AND_COMMITS = new Uint8Array([0xc0]).buffer

const named = (type: string, text: string): pkijs.AttributeTypeAndValue =>
  new pkijs.AttributeTypeAndValue({ type, value: new asn1js.Utf8String({ value: text }) })

const YEARS = 10

export interface KeyPems {
  /** PKCS #8. */
  readonly key: string
  readonly certificate: string
}

/**
 * A fresh key on P-256 with a certificate that it signs itself: enough to prove that a document is unchanged, not who
 * the house is. An operator who has a certificate from an authority puts it in its place.
 *
 * @param now the certificate is valid from then for ten years
 * @param serial random bytes, at least 64 bits (CA/Browser Forum's rule for serial numbers)
 */
export async function selfSigned(name: string, now: Date, serial: Uint8Array): Promise<KeyPems> {
  const keys = await webcrypto.subtle.generateKey({ name: 'ECDSA', namedCurve: 'P-256' }, true, ['sign', 'verify'])
  const certificate = new pkijs.Certificate()
  certificate.version = 2
  const positive = Uint8Array.from(serial)
  positive[0] = ((positive[0] ?? 0) & 0x7f) | 0x40
  certificate.serialNumber = new asn1js.Integer({ valueHex: positive.buffer })
  for (const party of [certificate.subject, certificate.issuer])
    party.typesAndValues.push(named(ORGANISATION_NAME, name), named(COMMON_NAME, `${name}: issued reports`))
  certificate.notBefore.value = now
  certificate.notAfter.value = new Date(Date.UTC(now.getUTCFullYear() + YEARS, now.getUTCMonth(), now.getUTCDate()))
  certificate.extensions = [
    new pkijs.Extension({
      extnID: BASIC_CONSTRAINTS,
      critical: true,
      extnValue: new pkijs.BasicConstraints({ cA: false }).toSchema().toBER(),
    }),
    new pkijs.Extension({
      extnID: KEY_USAGE,
      critical: true,
      extnValue: new asn1js.BitString({ valueHex: SIGNS_AND_COMMITS, unusedBits: 6 }).toBER(),
    }),
  ]
  await certificate.subjectPublicKeyInfo.importKey(keys.publicKey, engine)
  await certificate.sign(keys.privateKey, 'SHA-256', engine)
  return {
    key: pem('PRIVATE KEY', await webcrypto.subtle.exportKey('pkcs8', keys.privateKey)),
    certificate: pem('CERTIFICATE', certificate.toSchema(true).toBER()),
  }
}
