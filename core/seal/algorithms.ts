import { sha256, sha384, sha512 } from '@noble/hashes/sha2.js'
import { rawFromDer } from '#core/register/ecdsa.ts'
import { inside, oid, partsOf } from './der.ts'
import { OID } from './names.ts'
import type { HashName, Subtle } from './subtle.ts'

/** Below this a key of RSA is weaker than 128 bits (NIST SP 800-57 Part 1 Rev. 5, table 2). */
const RSA_BITS = 3072

const HASHES: Readonly<
  Record<string, { readonly name: HashName; readonly digest: (bytes: Uint8Array) => Uint8Array }>
> = {
  [OID.sha256]: { name: 'SHA-256', digest: sha256 },
  [OID.sha384]: { name: 'SHA-384', digest: sha384 },
  [OID.sha512]: { name: 'SHA-512', digest: sha512 },
}

/** Signature algorithms that are strong enough, with the hash that each takes. */
const SIGNATURES: Readonly<Record<string, { readonly kind: 'ec' | 'rsa'; readonly hash: HashName }>> = {
  [OID.ecdsaSha256]: { kind: 'ec', hash: 'SHA-256' },
  [OID.ecdsaSha384]: { kind: 'ec', hash: 'SHA-384' },
  [OID.ecdsaSha512]: { kind: 'ec', hash: 'SHA-512' },
  [OID.rsaSha256]: { kind: 'rsa', hash: 'SHA-256' },
  [OID.rsaSha384]: { kind: 'rsa', hash: 'SHA-384' },
  [OID.rsaSha512]: { kind: 'rsa', hash: 'SHA-512' },
}

const CURVES = [
  { curve: 'P-256', name: oid(OID.p256), half: 32 },
  { curve: 'P-384', name: oid(OID.p384), half: 48 },
] as const

/** A hash by its object identifier in DER; `undefined` for one that is not known or no longer strong. */
export function hashOf(
  name: Uint8Array | undefined,
): { readonly name: HashName; readonly digest: (bytes: Uint8Array) => Uint8Array } | undefined {
  const found = Object.keys(HASHES).find((dotted) => oid(dotted).join() === name?.join())
  return found === undefined ? undefined : HASHES[found]
}

/** The algorithm of a CMS signature: some name the key's kind only, and leave the hash to the digest beside it. */
export function signatureName(algorithm: Uint8Array | undefined, hash: HashName): string | undefined {
  const text = algorithm?.join()
  const whole = Object.keys(SIGNATURES).find((dotted) => oid(dotted).join() === text)
  if (whole !== undefined) return whole
  if (text !== oid(OID.rsaKey).join()) return undefined
  return Object.keys(SIGNATURES).find(
    (dotted) => SIGNATURES[dotted]?.kind === 'rsa' && SIGNATURES[dotted]?.hash === hash,
  )
}

const copied = (bytes: Uint8Array): Uint8Array<ArrayBuffer> => new Uint8Array(bytes)

export interface SignedBytes {
  /** SubjectPublicKeyInfo as DER. */
  readonly key: Uint8Array
  /** Object identifier of the signature algorithm. */
  readonly algorithm: string
  readonly data: Uint8Array
  /** As certificates and CMS hold it. */
  readonly signature: Uint8Array
}

/** `weak`: the algorithm or the key is not one of those that are strong enough. */
export type SignatureVerdict = 'holds' | 'wrong' | 'weak'

async function onCurve<Key>(
  { key, data, signature }: SignedBytes,
  hash: HashName,
  subtle: Subtle<Key>,
): Promise<SignatureVerdict> {
  const named = inside(key, 0, 1)
  const found = CURVES.find(({ name }) => name.join() === named?.whole.join())
  if (!found) return 'weak'
  const raw = rawFromDer(signature, found.half)
  if (!raw) return 'wrong'
  const algorithm = { name: 'ECDSA', namedCurve: found.curve } as const
  const imported = await subtle.importKey('spki', copied(key), algorithm, false, ['verify'])
  const holds = await subtle.verify({ name: 'ECDSA', hash }, imported, copied(raw), copied(data))
  return holds ? 'holds' : 'wrong'
}

/** Bits of the modulus of an RSA key. */
function rsaBits(key: Uint8Array): number {
  const bits = inside(key, 1)?.content.subarray(1)
  const modulus = bits && partsOf(inside(bits))[0]?.content
  const digits = modulus?.[0] === 0 ? modulus.subarray(1) : modulus
  return (digits?.length ?? 0) * 8
}

async function withRsa<Key>(
  { key, data, signature }: SignedBytes,
  hash: HashName,
  subtle: Subtle<Key>,
): Promise<SignatureVerdict> {
  if (rsaBits(key) < RSA_BITS) return 'weak'
  const name = 'RSASSA-PKCS1-v1_5'
  const imported = await subtle.importKey('spki', copied(key), { name, hash }, false, ['verify'])
  return (await subtle.verify({ name }, imported, copied(signature), copied(data))) ? 'holds' : 'wrong'
}

const KINDS = { ec: OID.ecKey, rsa: OID.rsaKey } as const

/**
 * Verifies a signature by ECDSA on P-256 or P-384, or by RSA of at least 3072 bits, with SHA-2.
 *
 * @param subtle `crypto.subtle`
 */
export async function verifySignature<Key>(signed: SignedBytes, subtle: Subtle<Key>): Promise<SignatureVerdict> {
  const known = SIGNATURES[signed.algorithm]
  const kind = inside(signed.key, 0, 0)
  if (!known || kind?.whole.join() !== oid(KINDS[known.kind]).join()) return 'weak'
  try {
    return await (known.kind === 'ec' ? onCurve : withRsa)(signed, known.hash, subtle)
  } catch (error) {
    // WebCrypto says with an exception that a key is none: a point that is not on the curve, for example.
    if (error instanceof Error && error.name === 'DataError') return 'wrong'
    throw error
  }
}
