import { createHash } from 'node:crypto'
import type { Readable } from 'node:stream'
import type { Tx } from '#server/db.ts'
import { objectKey } from '#server/files/object-key.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { checkpointOver, findEntry } from '#server/queries/register.ts'
import { type RegisterRow, storedJudgement } from '#server/queries/register-search.ts'
import { leads, proofAgainst } from '#server/register/proof-now.ts'
import type { Services } from '#server/services.ts'

/** What is stored is not what the register says: it is told, and never handed out. */
const altered = (what: string): Refused =>
  refuse('damaged', `The stored ${what} does not have the hash that stands in the register, so it is not handed out.`)

export const NOT_SEALED = refuse('unavailable', 'The PDF is being sealed. Ask again in a moment.', {
  headers: { 'retry-after': '5' },
})

const keyOf = (organisation: string, sha256: string) => objectKey({ organisation, kind: 'document', sha256 })

/** The sealed PDF as a stream, for an archive: it breaks off before its end when the hash is not right. */
export async function documentPdfStream(
  { store }: Pick<Services, 'store'>,
  organisation: string,
  sha256: string,
): Promise<Readable> {
  const object = await store.get(keyOf(organisation, sha256))
  if (object === undefined) throw new Error(`The PDF ${sha256} is missing.`)
  return object.stream
}

/** The install file that the document was made from, its hash verified. */
export async function documentSource(tx: Tx, organisation: string, row: RegisterRow): Promise<Buffer | Refused> {
  const { source } = await storedJudgement(tx, organisation, row.report_id, row.revision)
  return createHash('sha256').update(source).digest('hex') === row.source_sha256 ? source : altered('file')
}

/**
 * The proof file: the newest thing that holds for the document (sealed, or issued while the seal is under way) against the
 * checkpoint that was made with it, so that the file is the same on every day.
 */
export async function documentProof(tx: Tx, organisation: string, row: RegisterRow): Promise<string | Refused> {
  const entry =
    (await findEntry(tx, organisation, row.document_id, 'sealed')) ??
    (await findEntry(tx, organisation, row.document_id, 'issued'))
  if (entry === undefined) return altered('register entry')
  const checkpoint = await checkpointOver(tx, organisation, entry.sequence)
  if (checkpoint === undefined) return refuse('conflict', 'No checkpoint covers the entry yet. Ask again in a moment.')
  const proof = await proofAgainst(tx, organisation, entry, checkpoint)
  return leads(proof, checkpoint.root) ? `${JSON.stringify(proof, null, 2)}\n` : altered('register')
}
