/**
 * The part of WebCrypto that verifying takes. `crypto.subtle` of a browser and of Node fits; it comes in as an argument,
 * since core has no platform of its own.
 */
export interface Subtle<Key = never> {
  importKey(
    format: 'spki',
    key: Uint8Array<ArrayBuffer>,
    algorithm: KeyAlgorithm,
    extractable: boolean,
    usages: 'verify'[],
  ): Promise<Key>
  verify(
    algorithm: VerifyAlgorithm,
    key: Key,
    signature: Uint8Array<ArrayBuffer>,
    data: Uint8Array<ArrayBuffer>,
  ): Promise<boolean>
}

export type HashName = 'SHA-256' | 'SHA-384' | 'SHA-512'

export type KeyAlgorithm =
  | { readonly name: 'ECDSA'; readonly namedCurve: 'P-256' | 'P-384' }
  | { readonly name: 'RSASSA-PKCS1-v1_5'; readonly hash: HashName }

export type VerifyAlgorithm =
  | { readonly name: 'ECDSA'; readonly hash: HashName }
  | { readonly name: 'RSASSA-PKCS1-v1_5' }
