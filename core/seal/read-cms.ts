import { equal } from '#core/register/bytes.ts'
import { buildCms, type CmsParts, signerOf } from './cms.ts'
import { type Element, inside, oid, partsOf } from './der.ts'
import { OID } from './names.ts'

const DIGEST_NAME = oid(OID.messageDigest)

/** What the attribute with the file's digest holds. */
function digestIn(signed: Element | undefined): Uint8Array | undefined {
  const found = partsOf(signed).find(({ whole }) => {
    const name = inside(whole, 0)
    return name !== undefined && equal(name.whole, DIGEST_NAME)
  })
  return found && inside(found.whole, 1, 0)?.content
}

/** The certificates with that of the signer first; `undefined` where it is missing. */
function signerFirst(certificates: readonly Uint8Array[], signer: Uint8Array): readonly Uint8Array[] | undefined {
  const own = certificates.find((certificate) => {
    const name = signerOf(certificate)
    return name !== undefined && equal(name, signer)
  })
  return own && [own, ...certificates.filter((certificate) => certificate !== own)]
}

/**
 * Takes a signature apart that `buildCms` put together.
 *
 * @param bytes ContentInfo as DER, without padding
 * @returns `undefined` where the bytes are not exactly what `buildCms` gives for the parts: none can be changed unseen
 */
export function readCms(bytes: Uint8Array): CmsParts | undefined {
  const listed = partsOf(inside(bytes, 1, 0, 3)).map(({ whole }) => whole)
  const [, signer, , signed, , signature, unsigned] = partsOf(inside(bytes, 1, 0, 4, 0))
  const digest = digestIn(signed)
  const certificates = signer && signerFirst(listed, signer.whole)
  if (!certificates || !signature || !digest) return undefined
  const timestamp = unsigned && inside(unsigned.whole, 0, 1, 0)?.whole
  const parts = { certificates, digest, signature: signature.content, ...(timestamp && { timestamp }) }
  return equal(buildCms(parts), bytes) ? parts : undefined
}
