import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { type PublicDocument, publicDocument } from '#server/queries/public-document.ts'

const STATES: Readonly<Record<string, string>> = { issued: 'valid', replaced: 'replaced', withdrawn: 'withdrawn' }

/** One shape for everything, so that an answer says nothing beyond its words. */
const presented = (found: PublicDocument | undefined) => ({
  status: found === undefined ? 'unknown' : (STATES[found.state] ?? 'unknown'),
  number: found?.number ?? null,
  issued_by: found?.organisation ?? null,
  issued_at: found?.issued_at.toISOString() ?? null,
  replaced_by: found?.replaced_by ?? null,
  ended_at: found?.ended_at?.toISOString() ?? null,
  sealed: found?.sealed ?? null,
  pdf_sha256: found?.pdf_sha256 ?? null,
})

const TEXT_OR_NULL = { type: ['string', 'null'] } as const

const checkRoute = route({
  id: 'check-document',
  method: 'get',
  path: '/public/check',
  summary: 'Whether a document is genuine and still stands, by its number or the SHA-256 of its file; for everybody',
  tag: 'public',
  query: {
    type: 'object',
    properties: {
      number: { type: 'string', minLength: 1, maxLength: 60 },
      sha256: { type: 'string', pattern: '^[0-9A-Fa-f]{64}$' },
    },
    additionalProperties: false,
  },
  policy: 'public',
  limit: 'public',
  answers: {
    200: {
      type: 'object',
      properties: {
        status: { type: 'string', enum: ['valid', 'replaced', 'withdrawn', 'unknown'] },
        number: TEXT_OR_NULL,
        issued_by: TEXT_OR_NULL,
        issued_at: TEXT_OR_NULL,
        replaced_by: TEXT_OR_NULL,
        ended_at: TEXT_OR_NULL,
        sealed: { type: ['boolean', 'null'] },
        pdf_sha256: TEXT_OR_NULL,
      },
      required: ['status', 'number', 'issued_by', 'issued_at', 'replaced_by', 'ended_at', 'sealed', 'pdf_sha256'],
      additionalProperties: false,
    },
  },
  async run({ tx, query: { number, sha256 } }) {
    if ((number === undefined) === (sha256 === undefined))
      return refuse('bad-request', 'Ask by a number or by the hash of a file, not by both or neither.')
    return { body: presented(await publicDocument(tx, number?.trim() ?? null, sha256 ?? null)) }
  },
})

export const PUBLIC_ROUTES = [checkRoute]
