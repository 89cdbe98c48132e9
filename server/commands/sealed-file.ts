import type { Tx } from '#server/db.ts'
import { bytesOf } from '#server/files/bytes.ts'
import { objectKey } from '#server/files/object-key.ts'
import { DamagedObject } from '#server/files/store.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { findSeal } from '#server/queries/documents.ts'
import type { Services } from '#server/services.ts'

/** Largest sealed file that is handed out, in bytes. */
const LIMIT = 128 * 1024 * 1024

export interface SealedFile {
  readonly bytes: Buffer
  readonly sha256: string
}

const DAMAGED = refuse(
  'damaged',
  'The stored file is not what was sealed, so it is not handed out. An administrator must bring it back from a backup.',
)

/** The sealed PDF of a document, as long as its bytes still have the hash that was written down when it was sealed. */
export async function sealedFile(
  tx: Tx,
  { store, log }: Pick<Services, 'store' | 'log'>,
  organisation: string,
  document: string,
): Promise<SealedFile | Refused> {
  const seal = await findSeal(tx, organisation, document)
  if (seal === undefined)
    return refuse('unavailable', 'The document is being sealed. Ask again in a moment.', {
      headers: { 'retry-after': '5' },
    })
  const sha256 = seal.pdf_sha256
  try {
    const bytes = await bytesOf(store, objectKey({ organisation, kind: 'document', sha256 }), LIMIT)
    if (bytes !== undefined && bytes.length === seal.bytes) return { bytes, sha256 }
  } catch (error) {
    if (!(error instanceof DamagedObject)) throw error
  }
  log.error({ event: 'record-damaged', organisation, document, sha256 }, 'a sealed file is missing or changed')
  return DAMAGED
}
