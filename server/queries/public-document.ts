import type { Tx } from '#server/db.ts'

/** Everything that the gate function hands out of a document to who knows its number or its file. */
export interface PublicDocument {
  readonly number: string
  readonly organisation: string
  readonly issued_at: Date
  readonly state: string
  readonly replaced_by: string | null
  readonly ended_at: Date | null
  readonly sealed: boolean
  readonly pdf_sha256: string | null
}

export async function publicDocument(
  tx: Tx,
  number: string | null,
  sha256: string | null,
): Promise<PublicDocument | undefined> {
  const { rows } = await tx.raw<{ rows: PublicDocument[] }>('select * from public_document(?, ?)', [number, sha256])
  return rows[0]
}
