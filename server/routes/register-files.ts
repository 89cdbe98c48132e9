import { Readable } from 'node:stream'
import { documentPdfStream, documentProof, documentSource, NOT_SEALED } from '#server/commands/document-files.ts'
import { sealedFile } from '#server/commands/sealed-file.ts'
import { inOrganisation } from '#server/db.ts'
import { type ZipEntry, zipStream } from '#server/exports/zip.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { type Answer, type Call, route } from '#server/http/route.ts'
import { type RegisterRow, registerRows } from '#server/queries/register-search.ts'
import type { Services } from '#server/services.ts'

const common = {
  tag: 'register',
  policy: { action: 'register.download' },
  limit: 'heavy',
} as const

const one = {
  ...common,
  method: 'get',
  audited: true,
  load: async ({ tx, actor, params }: Pick<Call<unknown, unknown, undefined>, 'tx' | 'actor' | 'params'>) =>
    (await registerRows(tx, actor.organisation, [params['document'] ?? '']))[0],
} as const

const download = (name: string, type: string, bytes: Uint8Array | Refused): Answer | Refused =>
  bytes instanceof Uint8Array
    ? { bytes, type, headers: { 'content-disposition': `attachment; filename="${name}"` }, audit: { file: name } }
    : bytes

const pdfRoute = route({
  ...one,
  id: 'download-register-pdf',
  path: '/register/:document/pdf',
  summary: 'The sealed PDF of a document, its hash verified',
  answers: { 200: { media: 'application/pdf' } },
  async run({ tx, actor, subject, services }) {
    const file = await sealedFile(tx, services, actor.organisation, subject.document_id)
    return download(`${subject.number}.pdf`, 'application/pdf', 'refused' in file ? file : file.bytes)
  },
})

const sourceRoute = route({
  ...one,
  id: 'download-register-source',
  path: '/register/:document/source',
  summary: 'The install file that a document was made from, its hash verified',
  answers: { 200: { media: 'application/yaml' } },
  run: async ({ tx, actor, subject }) =>
    download(
      `${subject.number}.skerry.yaml`,
      'application/yaml; charset=utf-8',
      await documentSource(tx, actor.organisation, subject),
    ),
})

const proofRoute = route({
  ...one,
  id: 'download-register-proof',
  path: '/register/:document/proof',
  summary: 'The proof of a document’s place in the register, for checking without this server',
  answers: { 200: { media: 'application/json' } },
  async run({ tx, actor, subject }) {
    const proof = await documentProof(tx, actor.organisation, subject)
    const bytes = typeof proof === 'string' ? Buffer.from(proof) : proof
    return download(`${subject.number}.proof.json`, 'application/json; charset=utf-8', bytes)
  },
})

/** What an archive cannot be told any more once it has begun, it says by breaking off. */
function orBreak<Value extends object | string>(value: Value | Refused): Value {
  if (typeof value === 'object' && 'refused' in value) throw new Error(value.detail ?? value.refused)
  return value
}

/** The files of a document, each read in its own short transaction when its turn comes. */
function entriesOf(services: Services, organisation: string, row: RegisterRow, sealed: string): ZipEntry[] {
  const { number, issued_at: date } = row
  const entry = (name: string, open: ZipEntry['open']): ZipEntry => ({ path: [number, `${number}${name}`], date, open })
  return [
    entry('.pdf', () => documentPdfStream(services, organisation, sealed)),
    entry('.skerry.yaml', async () =>
      Readable.from([
        orBreak(await inOrganisation(services.db, organisation, (tx) => documentSource(tx, organisation, row))),
      ]),
    ),
    entry('.proof.json', async () =>
      Readable.from([
        Buffer.from(
          orBreak(await inOrganisation(services.db, organisation, (tx) => documentProof(tx, organisation, row))),
        ),
      ]),
    ),
  ]
}

const archiveRoute = route({
  ...common,
  id: 'download-register-archive',
  method: 'post',
  path: '/register/download',
  summary: 'Several documents as one archive: PDF, install file and proof of each',
  body: {
    type: 'object',
    properties: {
      documents: {
        type: 'array',
        items: { type: 'string', format: 'uuid' },
        minItems: 1,
        maxItems: 100,
        uniqueItems: true,
      },
    },
    required: ['documents'],
    additionalProperties: false,
  },
  answers: { 200: { media: 'application/zip' } },
  async run({ tx, actor, body, services }) {
    const { organisation } = actor
    const rows = await registerRows(tx, organisation, body.documents)
    if (rows.length !== body.documents.length)
      return refuse('not-found', 'Not all of these are documents of the register.')
    const sealed = rows.flatMap((row) => (row.pdf_sha256 === null ? [] : [{ row, sha256: row.pdf_sha256 }]))
    if (sealed.length !== rows.length) return NOT_SEALED
    return {
      bytes: zipStream(sealed.flatMap(({ row, sha256 }) => entriesOf(services, organisation, row, sha256))),
      type: 'application/zip',
      headers: { 'content-disposition': 'attachment; filename="documents.zip"' },
      audit: { documents: rows.map(({ number }) => number) },
    }
  },
})

export const REGISTER_FILE_ROUTES = [archiveRoute, pdfRoute, sourceRoute, proofRoute]
