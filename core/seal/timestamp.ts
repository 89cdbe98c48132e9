import { sha256 } from '@noble/hashes/sha2.js'
import { equal } from '#core/register/bytes.ts'
import { verifySignature } from './algorithms.ts'
import type { KnownCertificate } from './certificate.ts'
import { OID } from './names.ts'
import { readToken } from './read-token.ts'
import type { Subtle } from './subtle.ts'

export interface TimestampAnswer {
  readonly holds: boolean
  readonly says: string
  readonly at?: Date
  readonly own?: KnownCertificate
  readonly others?: readonly KnownCertificate[]
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
  const read = readToken(token)
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
