import type { Request } from 'express'
import type { Knex } from 'knex'
import { can } from '#core/policy/can.ts'
import type { Actor } from '#core/policy/roles.ts'
import { checkAgain } from '#server/commands/check-again.ts'
import { inOrganisation } from '#server/db.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { etag } from './answer.ts'
import { type Refused, refuse } from './problems.ts'
import type { Answer, Call, Route } from './route.ts'

export type AnyCall = Call<unknown, unknown, unknown>

/** What happens inside the transaction of a request: load, policy, version, run, audit. */
export class Attempt {
  constructor(readonly route: Route) {}

  /** Whether nothing is written, not even an audit event. */
  get onlyReads(): boolean {
    return this.route.method === 'get' && this.route.audited !== true
  }

  /** The call with what its path names; nothing where that is not to be seen. */
  async load(call: AnyCall): Promise<AnyCall | undefined> {
    const { load } = this.route
    if (load === undefined) return call
    const subject = await load(call as never)
    return subject === undefined ? undefined : { ...call, subject }
  }

  async run(call: AnyCall, request: Request): Promise<Answer | Refused> {
    const { actor, subject } = call
    const refused = this.#policy(actor, subject) ?? this.#version(request, subject) ?? (await this.#again(call))
    return refused ?? (await this.route.run(call as never))
  }

  #policy(actor: Actor, subject: unknown): Refused | undefined {
    const { policy } = this.route
    if (policy === 'public' || policy === 'signed in') return undefined
    const decision = can(actor, policy.action, policy.about?.(subject as never))
    if (decision.allowed) return undefined
    return refuse(decision.why === 'state' ? 'conflict' : 'not-allowed', decision.reason)
  }

  #version(request: Request, subject: unknown): Refused | undefined {
    const { route } = this
    if (route.method === 'get' || route.version === undefined) return undefined
    const current = route.version(subject as never)
    const match = request.get('if-match')
    if (match === undefined) return refuse('version-missing')
    if (match === etag(current)) return undefined
    return refuse('version-stale', undefined, { more: { current }, headers: { etag: etag(current) } })
  }

  async #again(call: AnyCall): Promise<Refused | undefined> {
    return 'again' in this.route && this.route.again === true ? await checkAgain(call) : undefined
  }

  /** What the event is about: what the route says, or what its path names first. */
  #about(call: AnyCall): string {
    const named = this.route.about?.(call as never)
    const [first] = Object.entries(call.params)
    return named ?? (first === undefined ? `organisation/${call.actor.organisation}` : `${first[0]}/${first[1]}`)
  }

  async audit(call: AnyCall, answer: Answer): Promise<void> {
    const { route } = this
    if (route.audited ?? route.method !== 'get') await this.#write(call, route.id, answer.audit ?? {})
  }

  async denied(db: Knex, call: AnyCall, { detail = '' }: Refused): Promise<void> {
    await inOrganisation(db, call.actor.organisation, (tx) =>
      this.#write({ ...call, tx }, 'denied', { route: this.route.id, reason: detail }),
    )
  }

  async #write(call: AnyCall, action: string, details: Readonly<Record<string, unknown>>): Promise<void> {
    const { tx, actor, visit, now } = call
    await writeAudit(tx, {
      organisation: actor.organisation,
      person: actor.person,
      roles: actor.roles,
      action,
      subject: this.#about(call),
      at: now,
      request: visit.request,
      address: visit.address,
      details,
    })
  }
}
