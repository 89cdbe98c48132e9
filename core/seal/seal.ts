import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'
import { derFromRaw } from '#core/register/ecdsa.ts'
import type { Sign } from '#core/register/signing.ts'
import { buildCms, signedAttributes } from './cms.ts'
import { PdfFile } from './pdf-file.ts'
import { digestAround, placeholderOf, prepared } from './placeholder.ts'
import { timestampRequest, tokenFrom } from './timestamp-request.ts'

export interface SealOptions {
  /** An issued report as `renderReport` gave it. */
  readonly pdf: Uint8Array
  /** Signs with the key of the first certificate. */
  readonly sign: Sign
  /** DER: the signer's certificate, then those that lead to its root. */
  readonly certificates: readonly Uint8Array[]
  /** Time of sealing, RFC 3339 in UTC. */
  readonly at: string
  /** Sends a time-stamp request (DER) to an authority and gives back its response (DER). Without it the seal has none. */
  readonly timestamp?: (request: Uint8Array) => Promise<Uint8Array>
}

/**
 * Seals a PDF: a signature over every byte but the hole that it stands in, which permits no change (PAdES B-B), and a
 * time stamp over the signature where an authority is given (B-T).
 *
 * @returns the sealed file, as long as the one that came in
 * @throws PdfError where the PDF keeps no room; RangeError where the signature does not fit, the certificate is none, or
 * the authority refuses
 * @source ISO 32000-1, 12.8; ETSI EN 319 142-1 V1.1.1
 */
export async function seal({ pdf, sign, certificates, at, timestamp }: SealOptions): Promise<Uint8Array> {
  const bytes = prepared(new PdfFile(pdf), at)
  const placeholder = placeholderOf(new PdfFile(bytes))
  const [own = new Uint8Array()] = certificates
  const digest = digestAround(bytes, placeholder)
  const signature = derFromRaw(await sign(signedAttributes(own, digest)))
  const token = timestamp && tokenFrom(await timestamp(timestampRequest(signature)))
  const cms = buildCms({ certificates, digest, signature, ...(token && { timestamp: token }) })
  const hex = bytesToHex(cms)
  const { hole } = placeholder
  if (hex.length > hole.end - hole.start - 2) {
    throw new RangeError(
      `The signature has ${cms.length} bytes, which do not fit: leave certificates out that lead nowhere.`,
    )
  }
  bytes.set(utf8ToBytes(hex), hole.start + 1)
  return bytes
}
