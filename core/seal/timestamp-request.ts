import { sha256 } from '@noble/hashes/sha2.js'
import { der, integer, leading, oid, partsOf, TAG } from './der.ts'
import { OID } from './names.ts'

const SHA256 = der(TAG.sequence, oid(OID.sha256), der(TAG.nothing))
const YES = der(TAG.boolean, Uint8Array.of(0xff))
/** `granted`, and `granted with modifications`. */
const GRANTED: ReadonlySet<number> = new Set([0, 1])

/**
 * A request for a time stamp over a signature, which asks for the authority's certificate with it. It carries no number
 * of its own: each signature is new, so an old answer cannot be taken for one to this request.
 *
 * @param signature as it stands in the seal
 * @returns TimeStampReq as DER
 * @source RFC 3161, 2.4.1
 */
export function timestampRequest(signature: Uint8Array): Uint8Array {
  const imprint = der(TAG.sequence, SHA256, der(TAG.octets, sha256(signature)))
  return der(TAG.sequence, integer(1), imprint, YES)
}

/**
 * The token out of an authority's response.
 *
 * @param response TimeStampResp as DER
 * @throws RangeError where the authority refused, or answered something else
 * @source RFC 3161, 2.4.2
 */
export function tokenFrom(response: Uint8Array): Uint8Array {
  const [status, token, ...rest] = partsOf(leading(response))
  const code = partsOf(status)[0]
  if (code?.tag !== TAG.integer)
    throw new RangeError('The time-stamp authority did not answer with a response of RFC 3161.')
  if (!GRANTED.has(code.content[0] ?? -1) || !token || rest.length > 0) {
    throw new RangeError(`The time-stamp authority refused (status ${code.content.join(' ')}).`)
  }
  return token.whole
}
