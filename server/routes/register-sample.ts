import { randomBytes } from 'node:crypto'
import { drawSample, populationHash, SAMPLE_METHOD, SAMPLE_WORDS } from '#core/register/sample.ts'
import { recompute } from '#server/commands/recompute.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { presentRegisterRow, REGISTER_ROW } from '#server/presenters/register.ts'
import { numbersOf, registerRows } from '#server/queries/register-search.ts'
import { filterOf, REGISTER_FILTERS } from './register-filter.ts'

const common = { tag: 'register', method: 'post', policy: { action: 'register.sample' }, limit: 'heavy' } as const

/** A population beyond this is narrowed by time first. */
const LARGEST = 100_000

const sampleRoute = route({
  ...common,
  id: 'draw-sample',
  path: '/register/sample',
  summary: 'A random sample of issued documents that can be drawn again from its seed',
  body: {
    type: 'object',
    properties: {
      ...REGISTER_FILTERS,
      size: { type: 'integer', minimum: 1, maximum: 100 },
      seed: { type: 'string', pattern: '^[0-9A-Za-z-]{8,64}$', description: 'Of a sample that is to be drawn again' },
      population_sha256: {
        type: 'string',
        pattern: '^[0-9a-f]{64}$',
        description: 'Of the earlier sample: refuses to draw from another population',
      },
    },
    required: ['size'],
    additionalProperties: false,
  },
  answers: {
    200: {
      type: 'object',
      properties: {
        method: { type: 'string' },
        words: { type: 'string' },
        seed: { type: 'string' },
        size: { type: 'integer' },
        population: {
          type: 'object',
          properties: {
            count: { type: 'integer' },
            first: { type: ['string', 'null'] },
            last: { type: ['string', 'null'] },
            sha256: { type: 'string' },
            filters: { type: 'object' },
          },
          required: ['count', 'first', 'last', 'sha256', 'filters'],
        },
        documents: { type: 'array', items: REGISTER_ROW },
      },
      required: ['method', 'words', 'seed', 'size', 'population', 'documents'],
    },
  },
  async run({ tx, actor, body }) {
    const { organisation } = actor
    const { size, seed = randomBytes(16).toString('hex'), population_sha256, ...filters } = body
    const found = await numbersOf(tx, filterOf(organisation, filters), LARGEST + 1)
    if (found.length > LARGEST)
      return refuse('bad-request', `More than ${LARGEST} documents: narrow them by the time of issue.`)
    const numbers = found.map(({ number }) => number)
    const sha256 = populationHash(numbers)
    if (population_sha256 !== undefined && population_sha256 !== sha256)
      return refuse(
        'conflict',
        'The population is not the one of the earlier sample: documents were issued or changed state since.',
        {
          more: { population_sha256: sha256 },
        },
      )
    const drawn = drawSample(numbers, seed, size)
    const ids = new Map(found.map(({ number, document_id }) => [number, document_id]))
    const rows = await registerRows(
      tx,
      organisation,
      drawn.flatMap((number) => ids.get(number) ?? []),
    )
    const byNumber = new Map(rows.map((row) => [row.number, row]))
    const population = {
      count: numbers.length,
      first: numbers[0] ?? null,
      last: numbers.at(-1) ?? null,
      sha256,
      filters,
    }
    return {
      body: {
        method: SAMPLE_METHOD,
        words: SAMPLE_WORDS,
        seed,
        size: drawn.length,
        population,
        documents: drawn.flatMap((number) => byNumber.get(number) ?? []).map(presentRegisterRow),
      },
      audit: { method: SAMPLE_METHOD, seed, population, drawn },
    }
  },
})

/** A document takes some tens of milliseconds; one request is not to hold a connection for longer than seconds. */
const MOST_RECOMPUTED = 20

const recomputeRoute = route({
  ...common,
  id: 'recompute-documents',
  path: '/register/recompute',
  summary: 'Judges the stored files of documents with today’s engine and lists what comes out otherwise than issued',
  body: {
    type: 'object',
    properties: {
      documents: {
        type: 'array',
        items: { type: 'string', format: 'uuid' },
        minItems: 1,
        maxItems: MOST_RECOMPUTED,
        uniqueItems: true,
      },
    },
    required: ['documents'],
    additionalProperties: false,
  },
  answers: {
    200: {
      type: 'object',
      properties: { documents: { type: 'array', items: { type: 'object' } }, same: { type: 'integer' } },
      required: ['documents', 'same'],
    },
  },
  async run({ tx, actor, body, services }) {
    const rows = await registerRows(tx, actor.organisation, body.documents)
    if (rows.length !== body.documents.length)
      return refuse('not-found', 'Not all of these are documents of the register.')
    const documents = []
    for (const row of rows) documents.push(await recompute(tx, services, actor.organisation, row))
    const outcome = documents.map(({ number, same }) => ({ number, same }))
    return { body: { documents, same: outcome.filter(({ same }) => same).length }, audit: { outcome } }
  },
})

export const SAMPLE_ROUTES = [sampleRoute, recomputeRoute]
