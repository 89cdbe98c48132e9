import { randomUUID } from 'node:crypto'
import type { Request, RequestHandler, Response } from 'express'
import type { Actor } from '#core/policy/roles.ts'
import { outside, reading, type Tx, writing } from '#server/db.ts'
import { enterAs } from '#server/queries/actor.ts'
import type { Services } from '#server/services.ts'
import { type Ready, ready, send, sendBytes, sendFailure, sendProblem } from './answer.ts'
import { type AnyCall, Attempt } from './attempt.ts'
import { type Caller, findCaller } from './caller.ts'
import { keyOf, RequestKey } from './idempotency.ts'
import { addressOf, type Limiter } from './limits.ts'
import { crossSite } from './origin.ts'
import { isRefused, type ProblemCode, type Refused, refuse, tooMany } from './problems.ts'
import type { Answer, Route, Visit } from './route.ts'
import { sessionHandle } from './session.ts'
import { type Checker, checker } from './validate.ts'

/** Rolls a transaction back and carries the reason out of it. */
class RolledBack extends Error {
  constructor(readonly refused: Refused) {
    super(refused.refused)
  }
}

/** What a transaction gives back when it is committed. */
type Outcome = Ready | Answer

async function orRefused(work: Promise<Outcome>): Promise<Outcome | Refused> {
  try {
    return await work
  } catch (error) {
    if (error instanceof RolledBack) return error.refused
    throw error
  }
}

/** Ids have the form of ids; a path with any other is the path of nothing. */
const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/
const NOT_IDS = new Set(['revision', 'number', 'name', 'code', 'sha256', 'rule', 'book', 'offset'])

const idsAreSound = (request: Request): boolean =>
  Object.entries(request.params).every(([name, value]) => NOT_IDS.has(name) || UUID.test(String(value)))

/** Whether an answer is all there as JSON, with nothing left to do. */
const isWhole = (answer: Answer): boolean => answer.bytes === undefined && answer.afterwards === undefined

const NOBODY: Actor = { person: '', organisation: '', roles: [], name: '', licence: null }

/** Refusals that leave an event: somebody reached for what is not theirs, or did not know the password. */
const TOLD: ReadonlySet<string> = new Set<ProblemCode>(['not-allowed', 'password-needed'])

/** A route's way through the stages: caller, limit, origin, form, then the transaction. */
class Pipeline {
  readonly #attempt: Attempt
  readonly #checkQuery: Checker
  readonly #checkBody: Checker

  constructor(
    readonly route: Route,
    readonly services: Services,
    readonly limit: Limiter,
  ) {
    this.#attempt = new Attempt(route)
    this.#checkQuery = checker(route.query ?? { type: 'object', additionalProperties: false }, 'query')
    this.#checkBody = route.body === undefined ? () => [] : checker(route.body, 'body')
  }

  get #keepsNothing(): boolean {
    return 'idempotency' in this.route && this.route.idempotency === 'never'
  }

  get #asksAgain(): boolean {
    return 'again' in this.route && this.route.again === true
  }

  /** Everything that can be refused before a transaction begins. */
  async admit(request: Request, caller: Caller | undefined, query: unknown): Promise<Refused | undefined> {
    const { route } = this
    const wait = await this.limit(route.limit, caller?.person ?? addressOf(request))
    if (wait !== undefined) return tooMany(wait)
    const refused = this.#foreign(request, caller) ?? this.#reach(caller)
    if (refused !== undefined) return refused
    if (!idsAreSound(request)) return refuse('not-found')
    const errors = [...this.#checkQuery(query), ...this.#checkBody(request.body)]
    return errors.length > 0 ? refuse('bad-request', undefined, { errors }) : keyOf(route, request)
  }

  /** A browser sends its cookie along with whatever any page asks for; an API token goes only where it is sent. */
  #foreign(request: Request, caller: Caller | undefined): Refused | undefined {
    if (this.route.method === 'get' || caller?.token != null) return undefined
    return crossSite(request, this.services.env, caller !== undefined)
  }

  #reach(caller: Caller | undefined): Refused | undefined {
    const { policy, scope } = this.route
    if (caller === undefined) return policy === 'public' ? undefined : refuse('not-signed-in')
    if (caller.scopes === null || (scope !== undefined && caller.scopes.includes(scope))) return undefined
    return refuse('not-allowed', 'The API token does not reach this far.')
  }

  async respond(
    request: Request,
    visit: Visit,
    caller: Caller | undefined,
    query: unknown,
  ): Promise<Outcome | Refused> {
    const { services } = this
    const base = {
      params: request.params as Record<string, string>,
      query,
      body: request.body as unknown,
      now: services.clock(),
      services,
      visit,
      subject: undefined,
    }
    if (caller === undefined)
      return await orRefused(outside(services.db, (tx) => this.#unknown({ ...base, tx, actor: NOBODY }, request)))
    const key = this.#keepsNothing ? undefined : RequestKey.of(request, caller)
    const refused: { call?: AnyCall } = {}
    const only = this.#attempt.onlyReads
    const work = async (tx: Tx): Promise<Outcome> => {
      const actor = await this.#actor(tx, caller)
      const kept = await this.#kept(tx, key)
      if (kept !== undefined) return kept
      const call = await this.#loaded({ ...base, tx, actor })
      refused.call = call
      return await this.#once(call, request, key)
    }
    // Only wrong passwords count: somebody who is signed in and sends a step twice at once must not be locked out by it.
    const wait = this.#asksAgain ? await services.tries.wait('again', caller.person) : undefined
    if (wait !== undefined) return tooMany(wait)
    const outcome = await orRefused(only ? reading(services.db, work, this.#lost) : writing(services.db, work))
    // What refused was rolled back, its event with it: a denied access leaves one of its own.
    if (isRefused(outcome) && TOLD.has(outcome.refused) && refused.call !== undefined)
      await this.#attempt.denied(services.db, refused.call, outcome)
    if (this.#asksAgain && isRefused(outcome) && outcome.refused === 'password-needed')
      await services.tries.take('again', caller.person)
    return outcome
  }

  readonly #lost = (error: unknown): void =>
    this.services.log.warn({ event: 'unavailable', err: error }, 'a reading transaction did not end well')

  async #actor(tx: Tx, { organisation, person }: Caller): Promise<Actor> {
    const actor = await enterAs(tx, organisation, person)
    if (actor === undefined) throw new RolledBack(refuse('not-signed-in'))
    return actor
  }

  async #loaded(call: AnyCall): Promise<AnyCall> {
    const loaded = await this.#attempt.load(call)
    if (loaded === undefined) throw new RolledBack(refuse('not-found'))
    return loaded
  }

  async #unknown(call: AnyCall, request: Request): Promise<Outcome> {
    const answer = await this.#attempt.run(await this.#loaded(call), request)
    if (isRefused(answer)) throw new RolledBack(answer)
    return isWhole(answer) ? ready(answer) : answer
  }

  /** Under a key the same request is done once, and answered the same ever after. */
  async #kept(tx: Tx, key: RequestKey | undefined): Promise<Ready | undefined> {
    const kept = await key?.find(tx)
    if (kept !== undefined && isRefused(kept)) throw new RolledBack(kept)
    return kept
  }

  async #once(call: AnyCall, request: Request, key: RequestKey | undefined): Promise<Outcome> {
    const answer = await this.#attempt.run(call, request)
    if (isRefused(answer)) throw new RolledBack(answer)
    await this.#attempt.audit(call, answer)
    if (!isWhole(answer)) return answer
    const whole = ready(answer)
    await key?.keep(call.tx, whole)
    return whole
  }
}

/** Does what was left for after the transaction. */
async function finish(outcome: Outcome | Refused): Promise<Outcome | Refused> {
  if (isRefused(outcome) || !('afterwards' in outcome) || outcome.afterwards === undefined) return outcome
  const answer = await outcome.afterwards()
  return isRefused(answer) || !isWhole(answer) ? answer : ready(answer)
}

async function deliver(response: Response, outcome: Outcome | Refused, request: string): Promise<void> {
  if (isRefused(outcome)) return sendProblem(response, outcome, request)
  if ('bytes' in outcome && outcome.bytes !== undefined) return await sendBytes(response, outcome, outcome.bytes)
  if (typeof outcome.body === 'string' && 'headers' in outcome) send(response, outcome as Ready)
}

/** Makes the Express handler of a route. */
export function handler(route: Route, services: Services, limit: Limiter): RequestHandler {
  const pipeline = new Pipeline(route, services, limit)
  return async (request: Request, response: Response) => {
    const id: string = response.locals['request'] ?? randomUUID()
    try {
      const caller = await findCaller(request, services)
      const query: Record<string, unknown> = { ...request.query }
      const refused = await pipeline.admit(request, caller, query)
      if (refused !== undefined) return sendProblem(response, refused, id)
      const session = sessionHandle(services.env, request, services.clock())
      const visit: Visit = { request: id, address: addressOf(request), session, token: caller?.token ?? null }
      await deliver(response, await finish(await pipeline.respond(request, visit, caller, query)), id)
    } catch (error) {
      sendFailure(response, error, id, services.log)
    }
  }
}
