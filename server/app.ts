import { randomUUID } from 'node:crypto'
import express, { type Express, type NextFunction, type Request, type RequestHandler, type Response } from 'express'
import helmet from 'helmet'
import { sendFailure, sendProblem } from './http/answer.ts'
import { health } from './http/health.ts'
import { limiter } from './http/limits.ts'
import { Metrics, metricsPage } from './http/metrics.ts'
import { openapi } from './http/openapi.ts'
import { handler } from './http/pipeline.ts'
import { plainPages } from './http/plain-pages.ts'
import { type Refused, refuse } from './http/problems.ts'
import type { BodyKind, Route } from './http/route.ts'
import { isSecure, sessions } from './http/session.ts'
import { switchOffPages } from './http/switch-off.ts'
import { ROUTES } from './routes/all.ts'
import type { Services } from './services.ts'

const PARSERS: Readonly<Record<BodyKind, RequestHandler>> = {
  json: express.json({ limit: '256kb', strict: true, type: 'application/json' }),
  source: express.raw({ limit: '1mb', type: ['application/yaml', 'application/x-yaml', 'text/yaml', 'text/plain'] }),
  chunk: express.raw({ limit: '257kb', type: 'application/octet-stream' }),
}

const TYPES: Readonly<Record<BodyKind, string>> = {
  json: 'application/json',
  source: 'application/yaml',
  chunk: 'application/octet-stream',
}

function headers(services: Services): RequestHandler {
  const secure = isSecure(services.env)
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        fontSrc: ["'self'"],
        imgSrc: ["'self'", 'blob:', 'data:'],
        connectSrc: ["'self'"],
        workerSrc: ["'self'"],
        manifestSrc: ["'self'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        objectSrc: ["'none'"],
        requireTrustedTypesFor: ["'script'"],
        ...(secure ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: secure ? { maxAge: 63_072_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'no-referrer' },
    crossOriginOpenerPolicy: { policy: 'same-origin' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
  })
}

/** Gives each request an id, and logs how it ended. */
function visits(services: Services, metrics: Metrics): RequestHandler {
  return (request, response, next) => {
    const id = randomUUID()
    const begun = process.hrtime.bigint()
    response.locals['request'] = id
    response.set('x-request-id', id)
    response.on('finish', () => {
      const ms = Number(process.hrtime.bigint() - begun) / 1e6
      const route = request.route?.path ?? 'none'
      metrics.count({ method: request.method, route, status: response.statusCode, seconds: ms / 1000 })
      services.log.info({
        event: 'request',
        request: id,
        method: request.method,
        path: request.path,
        status: response.statusCode,
        ms: Math.round(ms * 10) / 10,
      })
    })
    next()
  }
}

/** A body of another kind than the route takes is refused before it is read. */
function bodyOf(route: Route): RequestHandler[] {
  if (route.method === 'get') return []
  const kind = route.accepts ?? 'json'
  const check: RequestHandler = (request, response, next) => {
    const empty =
      request.get('content-length') === '0' ||
      (request.get('content-length') === undefined && request.get('transfer-encoding') === undefined)
    if (empty && route.body === undefined && kind === 'json') return next()
    const wanted =
      kind === 'source' ? ['application/yaml', 'application/x-yaml', 'text/yaml', 'text/plain'] : TYPES[kind]
    if (request.is(wanted) === false || (request.is(wanted) === null && kind !== 'json'))
      return sendProblem(
        response,
        refuse('wrong-type', `Send ${TYPES[kind]}.`, { headers: { accept: TYPES[kind] } }),
        response.locals['request'],
      )
    next()
  }
  return [check, PARSERS[kind]]
}

const PARSE_REFUSALS: Readonly<Record<string, Refused>> = {
  'entity.too.large': refuse(
    'too-large',
    'A file may have 1 MiB, a JSON body 256 KiB, a stretch of an upload 256 KiB.',
  ),
  'entity.parse.failed': refuse('bad-request', 'The body is not JSON.'),
  'encoding.unsupported': refuse('wrong-type', 'This content encoding is not taken.'),
  'charset.unsupported': refuse('wrong-type', 'Send UTF-8.'),
}

const member = (error: unknown, name: 'type' | 'status'): unknown =>
  typeof error === 'object' && error !== null ? Object.getOwnPropertyDescriptor(error, name)?.value : undefined

/** Express hands over what its parsers refuse as errors with a type. */
function parseErrors(services: Services) {
  return (error: unknown, _request: Request, response: Response, _next: NextFunction): void => {
    const id: string = response.locals['request'] ?? ''
    const known = PARSE_REFUSALS[String(member(error, 'type'))]
    if (known !== undefined) return sendProblem(response, known, id)
    const status = Number(member(error, 'status'))
    if (status >= 400 && status < 500) return sendProblem(response, refuse('bad-request'), id)
    sendFailure(response, error, id, services.log)
  }
}

/** The whole web application over its services; it keeps nothing between requests. */
export function createApp(services: Services): Express {
  const app = express()
  app.disable('x-powered-by')
  app.set('etag', false)
  app.set('query parser', 'simple')
  app.set('trust proxy', services.env.TRUST_PROXY)
  const metrics = new Metrics(services.db)
  app.use(headers(services), health(services), metricsPage(metrics, services.env.METRICS_TOKEN))
  app.use(visits(services, metrics), plainPages(services), switchOffPages(services))
  const limit = limiter(services.db)
  const session = sessions(services.env, services.db)
  const noStore: RequestHandler = (_request, response, next) => {
    response.set('cache-control', 'no-store')
    next()
  }
  app.use('/api', noStore)
  for (const path of new Set(ROUTES.map((route) => route.path))) {
    const routes = ROUTES.filter((route) => route.path === path)
    for (const route of routes)
      app[route.method](`/api${path}`, session, ...bodyOf(route), handler(route, services, limit))
    const allowed = routes.map(({ method }) => method.toUpperCase()).join(', ')
    app.all(`/api${path}`, (_request, response) =>
      sendProblem(
        response,
        refuse('method-not-allowed', undefined, { headers: { allow: allowed } }),
        response.locals['request'],
      ),
    )
  }
  const document = JSON.stringify(openapi(ROUTES, services.env.BASE_URL))
  app.get('/api/openapi.json', (_request, response) => {
    response.type('application/json').send(document)
  })
  app.use('/api', (_request, response) => sendProblem(response, refuse('not-found'), response.locals['request']))
  app.use(parseErrors(services))
  return app
}
