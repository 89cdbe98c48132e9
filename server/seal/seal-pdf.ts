import { createHash } from 'node:crypto'
import { seal } from '#core/seal/seal.ts'
import type { Signer } from './signer.ts'
import { timestampFrom } from './timestamp.ts'

export interface Sealing {
  readonly signer: Signer
  /** RFC 3339 in UTC. */
  readonly at: string
  /** Address of a time-stamp authority (RFC 3161); empty where none is asked. */
  readonly authority: string
}

/** SHA-256 of the signer's own certificate, in hex. */
export function certificateHash({ certificates: [own] }: Signer): string {
  if (own === undefined) throw new Error('The signer has no certificate.')
  return createHash('sha256').update(own).digest('hex')
}

/** Seals a printed document with the server's key, with a time stamp where an authority is configured. */
export async function sealPdf(pdf: Uint8Array, { signer, at, authority }: Sealing): Promise<Uint8Array> {
  const { sign, certificates } = signer
  return await seal({ pdf, sign, certificates, at, ...(authority !== '' && { timestamp: timestampFrom(authority) }) })
}
