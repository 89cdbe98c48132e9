import { createHash } from 'node:crypto'
import { renderReport } from '#core/report/render.ts'
import { ownRevision } from '#server/commands/judged-revision.ts'
import { inOrganisation } from '#server/db.ts'
import { objectKey } from '#server/files/object-key.ts'
import { paperFonts } from '#server/paper/fonts.ts'
import { type DocumentRow, findDocument, findSeal, insertSeal } from '#server/queries/documents.ts'
import { findHouse } from '#server/queries/organisation.ts'
import { appendEntry, makeCheckpoint, registerTime } from '#server/register/append.ts'
import { proofOf } from '#server/register/proof.ts'
import { certificateHash, sealPdf } from '#server/seal/seal-pdf.ts'
import type { Services } from '#server/services.ts'
import type { Handler } from './handler.ts'

interface Unsealed {
  readonly document: DocumentRow
  readonly pdf: Uint8Array
}

/** The document printed from what was stored when it was issued; undefined where it has its seal already. */
async function printed({ db }: Services, organisation: string, id: string): Promise<Unsealed | undefined> {
  return await inOrganisation(db, organisation, async (tx) => {
    const document = await findDocument(tx, organisation, id)
    if (document === undefined) throw new Error(`There is no document ${id}.`)
    if ((await findSeal(tx, organisation, id)) !== undefined) return undefined
    const { judged, text, file } = await ownRevision(tx, organisation, document.report_id, document.revision)
    const register = await proofOf(tx, organisation, id, 'issued')
    if (register === undefined) throw new Error(`Document ${document.number} is not in the register.`)
    const issue = { ...document.issue, register }
    const created = document.issue.issued_at
    // What was computed at the issue is checked against what is computed now: other values are never sealed.
    const pdf = renderReport(judged, { text, file, fonts: paperFonts(), created, draft: false, issue })
    return { document, pdf }
  })
}

interface Sealed {
  readonly sha256: string
  readonly bytes: number
  readonly certificate: string
}

/** Writes the first seal of a document down, with its entry and what is signed over it; false when there is one already. */
async function record(
  { db, clock, jobs, signer }: Services,
  organisation: string,
  { document_id, number, revision, source_sha256, facts_sha256 }: DocumentRow,
  { sha256, bytes, certificate }: Sealed,
): Promise<boolean> {
  const key = await signer()
  return await inOrganisation(db, organisation, async (tx) => {
    const now = clock()
    const seal = { pdf_sha256: sha256, bytes, certificate_sha256: certificate, sealed_at: now }
    if (!(await insertSeal(tx, organisation, document_id, seal))) return false
    const register = { organisation, mark: (await findHouse(tx, organisation)).mark }
    const happened = { kind: 'sealed', number, revision, source_sha256, facts_sha256, pdf_sha256: sha256 } as const
    await appendEntry(tx, register, document_id, { ...happened, at: registerTime(now) }, now)
    await makeCheckpoint(tx, register, key, now)
    await jobs.send(tx, 'send-checkpoint', { organisation })
    return true
  })
}

/**
 * Prints an issued document, seals it, stores the file, and then writes the seal down. The file comes first: a row never
 * names a file that is not there. What is stored and loses to another worker's seal is taken away again.
 */
export const sealDocument: Handler<'seal-document'> = async (services, { organisation, document }) => {
  const unsealed = await printed(services, organisation, document)
  if (unsealed === undefined) return
  const signer = await services.signer()
  const pdf = await sealPdf(unsealed.pdf, {
    signer,
    at: registerTime(services.clock()),
    authority: services.env.TSA_URL,
  })
  const sha256 = createHash('sha256').update(pdf).digest('hex')
  const key = objectKey({ organisation, kind: 'document', sha256 })
  const stored = await services.store.put(key, pdf)
  if (!stored.ok) throw new Error(`The sealed document was not stored: ${stored.reason}.`)
  const sealed = { sha256, bytes: pdf.length, certificate: certificateHash(signer) }
  if (!(await record(services, organisation, unsealed.document, sealed))) await services.store.delete(key)
}
