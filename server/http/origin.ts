import { timingSafeEqual } from 'node:crypto'
import type { Request } from 'express'
import type { Env } from '#server/env.ts'
import { type Refused, refuse } from './problems.ts'
import { csrfToken } from './session.ts'

const same = (a: string, b: string): boolean => {
  const [left, right] = [Buffer.from(a), Buffer.from(b)]
  return left.length === right.length && timingSafeEqual(left, right)
}

/**
 * Refuses what another site made a browser send. Three walls: the browser's own word on where the request comes from, the
 * origin, and a token that only our pages know. Requests with an API token carry no cookie and need none of them.
 */
export function crossSite(request: Request, env: Env, signedIn: boolean): Refused | undefined {
  const site = request.get('sec-fetch-site')
  if (site !== undefined && site !== 'same-origin' && site !== 'none')
    return refuse('cross-site', `The browser says that the request comes from another site (${site}).`)
  const origin = request.get('origin')
  if (
    origin !== undefined &&
    origin !== new URL(env.BASE_URL).origin &&
    origin !== `${request.protocol}://${request.get('host')}`
  )
    return refuse('cross-site', 'The header Origin names another site.')
  // Without a session there is nothing that a foreign page could borrow; its JSON would need leave that we never give.
  if (!signedIn) return undefined
  const token = request.get('x-csrf-token')
  if (token === undefined || !same(token, csrfToken(env, request.sessionID)))
    return refuse(
      'cross-site',
      'The header X-CSRF-Token is missing or not of this session. GET /api/session hands it out.',
    )
  return undefined
}
