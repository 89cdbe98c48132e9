import { timingSafeEqual } from 'node:crypto'
import { type RequestHandler, Router } from 'express'
import type { Knex } from 'knex'
import { Counter, collectDefaultMetrics, Gauge, Histogram, Registry } from 'prom-client'

/** One request, as it is counted: by the route's pattern, never by the path that somebody sent. */
export interface Counted {
  readonly method: string
  readonly route: string
  readonly status: number
  readonly seconds: number
}

/** What the operator watches: how much is asked, how long it takes, what is refused, and how full the pool is. */
export class Metrics {
  readonly #registry = new Registry()
  readonly #requests = new Histogram({
    name: 'skerry_request_seconds',
    help: 'Requests by route and status, with their duration.',
    labelNames: ['method', 'route', 'status'],
    buckets: [0.005, 0.02, 0.05, 0.1, 0.25, 0.5, 1, 2.5, 5],
    registers: [this.#registry],
  })
  readonly #refused = new Counter({
    name: 'skerry_refused_total',
    help: 'Requests that were refused for who asked or how often: 401, 403, 429.',
    labelNames: ['status'],
    registers: [this.#registry],
  })

  constructor(db: Knex) {
    collectDefaultMetrics({ register: this.#registry })
    const pool = new Gauge({
      name: 'skerry_pool_connections',
      help: 'Connections to the database, in use and waited for.',
      labelNames: ['state'],
      registers: [this.#registry],
      collect() {
        const { pool: connections } = db.client
        pool.set({ state: 'used' }, connections.numUsed())
        pool.set({ state: 'free' }, connections.numFree())
        pool.set({ state: 'waited for' }, connections.numPendingAcquires())
      },
    })
  }

  count({ method, route, status, seconds }: Counted): void {
    this.#requests.observe({ method, route, status }, seconds)
    if (status === 401 || status === 403 || status === 429) this.#refused.inc({ status })
  }

  async text(): Promise<string> {
    return await this.#registry.metrics()
  }

  get type(): string {
    return this.#registry.contentType
  }
}

const same = (a: string, b: string): boolean => {
  const [left, right] = [Buffer.from(a), Buffer.from(b)]
  return left.length === right.length && timingSafeEqual(left, right)
}

/** `/metrics` for who has the token; nothing at all where none is configured. */
export function metricsPage(metrics: Metrics, token: string): RequestHandler {
  const router = Router()
  if (token === '') return router
  router.get('/metrics', async (request, response) => {
    response.set('cache-control', 'no-store')
    if (!same(request.get('authorization') ?? '', `Bearer ${token}`)) {
      response.status(401).set('www-authenticate', 'Bearer').end()
      return
    }
    response.type(metrics.type).send(await metrics.text())
  })
  return router
}
