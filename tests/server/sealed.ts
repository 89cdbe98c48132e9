import { createHash } from 'node:crypto'
import { renderReport } from '#core/report/render.ts'
import { judgeSource } from '#server/commands/judge-source.ts'
import { inOrganisation } from '#server/db.ts'
import { objectKey } from '#server/files/object-key.ts'
import { paperFonts } from '#server/paper/fonts.ts'
import { type DocumentRow, findDocument, insertSeal } from '#server/queries/documents.ts'
import { findHouse } from '#server/queries/organisation.ts'
import { appendEntry, makeCheckpoint, registerTime } from '#server/register/append.ts'
import type { House } from './house.ts'

/** The PDF of a file, with the quantities that it carries; another file stands for another engine. */
export function pdfOf(text: string): Buffer {
  const judged = judgeSource(Buffer.from(text))
  if (!judged.ok) throw new Error('The file cannot be judged.')
  const options = { text, file: 'site.skerry.yaml', fonts: paperFonts(), created: '2026-11-02T09:00:00Z', draft: true }
  return Buffer.from(renderReport(judged.judged, options))
}

/** Stores bytes as the sealed PDF of a document and writes down the seal, as the worker does with what it has sealed. */
export async function sealWith(house: House, organisation: string, id: string, pdf: Buffer): Promise<DocumentRow> {
  const { services, now } = house
  const sha256 = createHash('sha256').update(pdf).digest('hex')
  const stored = await services.store.put(objectKey({ organisation, kind: 'document', sha256 }), pdf)
  if (!stored.ok) throw new Error('The PDF was not stored.')
  return await inOrganisation(services.db, organisation, async (tx) => {
    const document = await findDocument(tx, organisation, id)
    if (document === undefined) throw new Error('There is no such document.')
    const { number, revision, source_sha256, facts_sha256 } = document
    const { mark } = await findHouse(tx, organisation)
    const seal = { pdf_sha256: sha256, bytes: pdf.length, certificate_sha256: '0'.repeat(64), sealed_at: now }
    await insertSeal(tx, organisation, id, seal)
    const happened = { kind: 'sealed', number, revision, source_sha256, facts_sha256, pdf_sha256: sha256 } as const
    await appendEntry(tx, { organisation, mark }, id, { ...happened, at: registerTime(now) }, now)
    await makeCheckpoint(tx, { organisation, mark }, await services.signer(), now)
    return document
  })
}
