import { VERSION } from '#server/version.ts'
import { PROBLEMS, type ProblemCode } from './problems.ts'
import type { BodyKind, Route } from './route.ts'

type Json = Readonly<Record<string, unknown>>

const BODY_MEDIA: Readonly<Record<BodyKind, string>> = {
  json: 'application/json',
  source: 'application/yaml',
  chunk: 'application/octet-stream',
}

const BYTES = { type: 'string', contentMediaType: 'application/octet-stream' } as const

/** Ids in paths are UUIDs, but for these. */
const PARAMETERS: Readonly<Record<string, Json>> = {
  revision: { type: 'integer', minimum: 1 },
  number: { type: 'string', examples: ['ALDER-2026-0001'] },
  sha256: { type: 'string', pattern: '^[0-9a-f]{64}$' },
  offset: { type: 'integer', minimum: 0 },
}

const pathNames = (path: string): string[] => [...path.matchAll(/:(\w+)/g)].map(([, name]) => name ?? '')

function parameters(route: Route): Json[] {
  const inPath = pathNames(route.path).map((name) => ({
    name,
    in: 'path',
    required: true,
    schema: PARAMETERS[name] ?? { type: 'string', format: 'uuid' },
  }))
  const query = (route.query ?? {}) as { properties?: Record<string, Json>; required?: readonly string[] }
  const inQuery = Object.entries(query.properties ?? {}).map(([name, schema]) => ({
    name,
    in: 'query',
    required: query.required?.includes(name) ?? false,
    schema,
  }))
  return [...inPath, ...inQuery, ...headerParameters(route)]
}

function headerParameters(route: Route): Json[] {
  if (route.method === 'get') return []
  const needed = 'idempotency' in route && route.idempotency === 'required'
  const headers = [
    { name: 'Idempotency-Key', required: needed, description: 'New for each request, the same when it is sent again.' },
  ]
  if (route.version !== undefined)
    headers.push({ name: 'If-Match', required: true, description: 'The ETag of what was read.' })
  return headers.map(({ name, required, description }) => ({
    name,
    in: 'header',
    required,
    description,
    schema: { type: 'string' },
  }))
}

/** The problems that the pipeline itself may answer on this route. */
function problemsOf(route: Route): ProblemCode[] {
  const codes: ProblemCode[] = ['bad-request', 'too-many', 'internal', 'unavailable']
  if (route.policy !== 'public') codes.push('not-signed-in', 'not-allowed')
  if (route.load !== undefined) codes.push('not-found')
  if (route.method !== 'get') codes.push('cross-site', 'conflict', 'wrong-type')
  if (route.method !== 'get' && route.version !== undefined) codes.push('version-stale', 'version-missing')
  if (route.accepts === 'source') codes.push('file-refused', 'too-large')
  return codes
}

function responses(route: Route): Json {
  const good = Object.entries(route.answers).map(([status, answer]) => [status, success(route, Number(status), answer)])
  const statuses = [...new Set(problemsOf(route).map((code) => PROBLEMS[code].status))].toSorted((a, b) => a - b)
  const bad = statuses.map((status) => [String(status), { $ref: `#/components/responses/Problem${status}` }])
  return Object.fromEntries([...bad, ...good])
}

function success(route: Route, status: number, answer: Route['answers'][number]): Json {
  const headers = {
    'X-Request-Id': { description: 'By which the request is known in the log.', schema: { type: 'string' } },
    ...(route.version === undefined
      ? {}
      : { ETag: { description: 'The version, for If-Match.', schema: { type: 'string' } } }),
  }
  const description = status === 201 ? 'Made.' : status === 204 ? 'Done; there is nothing to show.' : 'As asked.'
  if (answer === null || answer === undefined) return { description, headers }
  const isBytes = typeof answer === 'object' && 'media' in answer
  const content = isBytes ? { [String(answer.media)]: { schema: BYTES } } : { 'application/json': { schema: answer } }
  return { description, headers, content }
}

function requestBody(route: Route): Json {
  if (route.body === undefined && route.accepts === undefined) return {}
  const kind = route.accepts ?? 'json'
  const schema = kind === 'json' ? route.body : BYTES
  return { requestBody: { required: true, content: { [BODY_MEDIA[kind]]: { schema } } } }
}

function security(route: Route): Json[] {
  if (route.policy === 'public') return [{}]
  return route.scope === undefined ? [{ session: [] }] : [{ session: [] }, { token: [] }]
}

function operation(route: Route): Json {
  return {
    operationId: route.id,
    summary: route.summary,
    tags: [route.tag],
    security: security(route),
    parameters: parameters(route),
    ...requestBody(route),
    responses: responses(route),
  }
}

const openPath = (path: string): string => `/api${path.replaceAll(/:(\w+)/g, '{$1}')}`

const PROBLEM_SCHEMA = {
  type: 'object',
  description: 'RFC 9457',
  properties: {
    type: { type: 'string', format: 'uri-reference', description: 'Address of a page that explains the problem.' },
    title: { type: 'string' },
    status: { type: 'integer' },
    detail: { type: 'string' },
    instance: { type: 'string', format: 'uri-reference' },
    errors: {
      type: 'array',
      items: {
        type: 'object',
        properties: {
          pointer: { type: 'string', description: 'JSON Pointer to what is wrong.' },
          message: { type: 'string' },
          code: { type: 'string' },
          line: { type: 'integer' },
          column: { type: 'integer' },
        },
        required: ['pointer', 'message'],
      },
    },
  },
  required: ['type', 'title', 'status'],
} as const

/** A response for each status that some route may answer with. */
function problemResponses(routes: readonly Route[]): Json {
  const byStatus = new Map<number, string[]>()
  const used = new Set(routes.flatMap(problemsOf).map((code) => PROBLEMS[code].status))
  for (const { status, title } of Object.values(PROBLEMS))
    if (used.has(status)) byStatus.set(status, [...(byStatus.get(status) ?? []), title])
  return Object.fromEntries(
    [...byStatus].map(([status, titles]) => [
      `Problem${status}`,
      {
        description: `${titles.join('; ')}.`,
        content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
      },
    ]),
  )
}

/** The OpenAPI 3.1 document of the API, made from the records that run it. */
export function openapi(routes: readonly Route[], baseUrl: string): Json {
  const paths: Record<string, Record<string, Json>> = {}
  for (const route of routes)
    paths[openPath(route.path)] = { ...paths[openPath(route.path)], [route.method]: operation(route) }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Skerry',
      version: VERSION,
      summary:
        'Test reports for buildings with photovoltaics, a battery and automatic changeover: judged, reviewed, issued, provable.',
      license: { name: 'MIT', identifier: 'MIT' },
    },
    servers: [{ url: baseUrl }],
    tags: [...new Set(routes.map(({ tag }) => tag))].toSorted().map((name) => ({ name })),
    paths,
    components: {
      schemas: { Problem: PROBLEM_SCHEMA },
      responses: problemResponses(routes),
      securitySchemes: {
        session: {
          type: 'apiKey',
          in: 'cookie',
          name: 'skerry',
          description: 'Changes also carry the header X-CSRF-Token that GET /api/session hands out.',
        },
        token: { type: 'http', scheme: 'bearer', description: 'A token that a person made for the command line.' },
      },
    },
  }
}
