import { type RequestHandler, Router } from 'express'
import type { Services } from '#server/services.ts'

/** `/healthz`: the process answers. `/readyz`: it can do its work; 503 with the reason's name otherwise. */
export function health(services: Services): RequestHandler {
  const router = Router()
  router.get('/healthz', (_request, response) => {
    response.set('cache-control', 'no-store').json({ status: 'ok' })
  })
  router.get('/readyz', async (_request, response) => {
    const waiting = await services.ready()
    response
      .set('cache-control', 'no-store')
      .status(waiting.length === 0 ? 200 : 503)
      .json(waiting.length === 0 ? { status: 'ready' } : { status: 'waiting', for: waiting })
  })
  return router
}
