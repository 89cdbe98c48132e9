import { createHash } from 'node:crypto'
import type { Request } from 'express'
import type { Tx } from '#server/db.ts'
import { findAnswer, type KeyOwner, keepAnswer, takeKey } from '#server/queries/idempotency.ts'
import type { Ready } from './answer.ts'
import type { Caller } from './caller.ts'
import { type Refused, refuse } from './problems.ts'
import type { Route } from './route.ts'

const SHORTEST = 8
const LONGEST = 200

/** Refuses a request whose key is missing where one is needed, or has not the form of one. */
export function keyOf(route: Route, request: Request): Refused | undefined {
  const key = request.get('idempotency-key')
  const needed = 'idempotency' in route && route.idempotency === 'required'
  if (key === undefined)
    return needed
      ? refuse(
          'bad-request',
          `The header Idempotency-Key is missing: ${SHORTEST} to ${LONGEST} characters, new for each request, the same when it is sent again.`,
        )
      : undefined
  if (key.length >= SHORTEST && key.length <= LONGEST) return undefined
  return refuse('bad-request', `The header Idempotency-Key takes ${SHORTEST} to ${LONGEST} characters.`)
}

const hashOf = (request: Request): string =>
  createHash('sha256')
    .update(`${request.method} ${request.originalUrl}\n`)
    .update(Buffer.isBuffer(request.body) ? request.body : JSON.stringify(request.body ?? null))
    .digest('hex')

/** The key of one request by one person. */
export class RequestKey {
  private constructor(
    readonly owner: KeyOwner,
    readonly hash: string,
  ) {}

  static of(request: Request, { organisation, person }: Caller): RequestKey | undefined {
    const key = request.get('idempotency-key')
    if (key === undefined || request.method === 'GET') return undefined
    return new RequestKey({ organisation, person, key }, hashOf(request))
  }

  /** The answer that was given before; a refusal when the key is at work elsewhere, or belongs to another request. */
  async find(tx: Tx): Promise<Ready | Refused | undefined> {
    if (!(await takeKey(tx, this.owner))) return refuse('still-running')
    const kept = await findAnswer(tx, this.owner)
    if (kept === undefined) return undefined
    if (kept.request_sha256 !== this.hash) return refuse('key-reused')
    return { status: kept.status, headers: { ...kept.headers, 'idempotency-replayed': 'true' }, body: kept.body }
  }

  async keep(tx: Tx, answer: Ready): Promise<void> {
    await keepAnswer(tx, this.owner, { request_sha256: this.hash, ...answer })
  }
}
