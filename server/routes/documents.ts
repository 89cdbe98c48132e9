import { sealedFile } from '#server/commands/sealed-file.ts'
import { isRefused } from '#server/http/problems.ts'
import { type Call, route } from '#server/http/route.ts'
import { DOCUMENT_SCHEMA, presentDocument } from '#server/presenters/document.ts'
import { type DocumentRow, documentOf, findSeal } from '#server/queries/documents.ts'
import { findReport, type Report } from '#server/queries/reports.ts'
import { proofOf } from '#server/register/proof.ts'
import { factsOf } from './loads.ts'

interface Issued {
  readonly report: Report
  readonly document: DocumentRow
}

async function loadDocument({
  tx,
  actor,
  params,
}: Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor' | 'params'>): Promise<Issued | undefined> {
  const report = await findReport(tx, actor.organisation, params['report'] ?? '')
  if (report === undefined) return undefined
  const document = await documentOf(tx, actor.organisation, report.report_id)
  return document === undefined ? undefined : { report, document }
}

const common = {
  method: 'get',
  tag: 'register',
  policy: { action: 'register.download', about: ({ report }: Issued) => factsOf(report) },
  scope: 'report.read',
  load: loadDocument,
  audited: true,
} as const

const showRoute = route({
  ...common,
  id: 'show-document',
  path: '/reports/:report/document',
  summary: 'What was issued: number, names, accepted words, hashes, and the seal once it is there',
  limit: 'read',
  answers: { 200: DOCUMENT_SCHEMA },
  async run({ tx, actor, subject }) {
    const { document } = subject
    const seal = await findSeal(tx, actor.organisation, document.document_id)
    return { body: presentDocument(document, seal), audit: { number: document.number } }
  },
})

const fileRoute = route({
  ...common,
  id: 'download-document',
  path: '/reports/:report/document.pdf',
  summary: 'The sealed PDF, as long as it is byte for byte what was sealed',
  limit: 'heavy',
  answers: { 200: { media: 'application/pdf' } },
  async run({ tx, actor, subject, services }) {
    const { document_id, number } = subject.document
    const file = await sealedFile(tx, services, actor.organisation, document_id)
    if (isRefused(file)) return file
    return {
      bytes: file.bytes,
      type: 'application/pdf',
      headers: { 'content-disposition': `attachment; filename="${number}.pdf"`, 'x-sha256': file.sha256 },
      audit: { number, sha256: file.sha256 },
    }
  },
})

const proofRoute = route({
  ...common,
  id: 'show-proof',
  path: '/reports/:report/proof',
  summary: 'The place of the issue in the register, as a proof file that can be checked without this server',
  limit: 'read',
  answers: { 200: { type: 'object' } },
  async run({ tx, actor, subject }) {
    const { document_id, number } = subject.document
    const proof = await proofOf(tx, actor.organisation, document_id, 'issued')
    if (proof === undefined) throw new Error(`Document ${number} is not in the register.`)
    return { body: proof, audit: { number } }
  },
})

export const DOCUMENT_ROUTES = [showRoute, fileRoute, proofRoute]
