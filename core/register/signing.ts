/**
 * Signs bytes with ECDSA P-256 and SHA-256.
 *
 * @returns r and s, 32 bytes each behind one another (IEEE P1363), as WebCrypto answers
 */
export type Sign = (data: Uint8Array) => Promise<Uint8Array>

/** Says whether a signature of that form belongs to the bytes. The key is the one that the function was made for. */
export type Verify = (data: Uint8Array, signature: Uint8Array) => Promise<boolean>

/** What was looked at, whether it holds, and that in words for whoever asked. */
export interface Check {
  /** Kebab-case; stays the same in all languages and versions. */
  readonly id: string
  readonly holds: boolean
  readonly says: string
  /** It could not be settled, and counts neither way: the words say what is missing. */
  readonly open?: true
}
