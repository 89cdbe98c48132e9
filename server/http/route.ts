import type { Readable } from 'node:stream'
import type { FromSchema, JSONSchema } from 'json-schema-to-ts'
import type { Action } from '#core/policy/actions.ts'
import type { ReportFacts } from '#core/policy/can.ts'
import type { Actor } from '#core/policy/roles.ts'
import type { Tx } from '#server/db.ts'
import type { Services } from '#server/services.ts'
import type { Refused } from './problems.ts'

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete'

/** How often a route may be called; the numbers are in `limits.ts`. */
export type LimitClass = 'read' | 'write' | 'upload' | 'heavy' | 'sign-in' | 'public'

/** What a body may be: JSON judged by a schema, the bytes of an install file, or a stretch of a photo. */
export type BodyKind = 'json' | 'source' | 'chunk'

/** Who may call: everybody, anybody signed in, or whom the policy allows an action. There is no default. */
export type RoutePolicy<Subject> =
  | 'public'
  | 'signed in'
  | { readonly action: Action; readonly about?: (subject: Subject) => ReportFacts }

/** What a route's code gets. */
export interface Call<Query, Body, Subject> {
  readonly tx: Tx
  readonly actor: Actor
  readonly params: Readonly<Record<string, string>>
  readonly query: Query
  readonly body: Body
  readonly subject: Subject
  readonly now: Date
  readonly services: Services
  readonly visit: Visit
}

/** Where the request came from, and by what it is known in logs and audit events. */
export interface Visit {
  readonly request: string
  readonly address: string
  readonly session: SessionHandle | null
  /** The id of the API token, for a request without a session. */
  readonly token: string | null
}

/** What routes may do with the browser's session. */
export interface SessionHandle {
  readonly id: string
  readonly csrf: string
  signIn(person: { readonly person: string; readonly organisation: string }): Promise<void>
  signOut(): Promise<void>
}

/** What a route gives back when it did what was asked. */
export interface Answer {
  readonly status?: number
  readonly body?: unknown
  /** The version of the thing in the body, for ETag. */
  readonly version?: number
  readonly headers?: Readonly<Record<string, string>>
  /** Bytes instead of a JSON body. */
  readonly bytes?: Uint8Array | Readable
  readonly type?: string
  /** What the audit event tells besides who, when and what. */
  readonly audit?: Readonly<Record<string, unknown>>
  /**
   * Done once the transaction is committed, without holding a connection; its answer is sent instead. For what waits
   * (hashing) and for the browser's session. Never kept under an Idempotency-Key.
   */
  readonly afterwards?: () => Promise<Answer | Refused>
}

type ObjectSchema = JSONSchema & { readonly type: 'object' }
type Typed<S> = S extends JSONSchema ? FromSchema<S> : undefined

interface Common<Q, B, Subject> {
  /** Verb and noun in kebab-case: operationId, audit action, limiter key. */
  readonly id: string
  readonly path: `/${string}`
  readonly summary: string
  readonly tag: string
  readonly query?: Q
  readonly body?: B
  readonly accepts?: BodyKind
  readonly policy: RoutePolicy<Subject>
  /** API tokens with this scope may call, too. */
  readonly scope?: 'report.read' | 'report.send'
  readonly limit: LimitClass
  /** Finds what the path names among what the actor may see; nothing there is 404. */
  readonly load?: (call: Omit<Call<Typed<Q>, Typed<B>, undefined>, 'subject'>) => Promise<Subject | undefined>
  /** The version that If-Match must name; its presence makes the header obligatory for what changes something. */
  readonly version?: (subject: Subject) => number
  /** What the audit event is about, such as `report/3f…`; the path's first parameter otherwise. */
  readonly about?: (call: Call<Typed<Q>, Typed<B>, Subject>) => string
  /** Answers by status, for the OpenAPI document: JSON Schema, or a media type for bytes. */
  readonly answers: Readonly<Record<number, JSONSchema | { readonly media: string } | null>>
  readonly run: (call: Call<Typed<Q>, Typed<B>, Subject>) => Promise<Answer | Refused>
}

export interface ReadSpec<Q, B, Subject> extends Common<Q, B, Subject> {
  readonly method: 'get'
  /** Leaves an audit event, as reads of issued reports do. */
  readonly audited?: true
}

export interface WriteSpec<Q, B, Subject> extends Common<Q, B, Subject> {
  readonly method: Exclude<Method, 'get'>
  /**
   * `required`: an Idempotency-Key must be sent; otherwise one is honoured when it is. `never`: the answer holds a secret
   * that is shown once and kept nowhere.
   */
  readonly idempotency?: 'required' | 'never'
  /** The password (and code) must be in the body as `password` and `code`, and is checked before `run`. */
  readonly again?: true
  /** Left out only by what changes nothing. */
  readonly audited?: false
}

/** A route as the pipeline sees it, its own types checked and then forgotten. */
export type Route = (ReadSpec<ObjectSchema, ObjectSchema, unknown> | WriteSpec<ObjectSchema, ObjectSchema, unknown>) & {
  readonly __route: true
}

/**
 * Makes a route from its record. Leaving out the policy does not compile.
 */
export function route<
  const Q extends ObjectSchema | undefined = undefined,
  const B extends ObjectSchema | undefined = undefined,
  Subject = undefined,
>(spec: ReadSpec<Q, B, Subject> | WriteSpec<Q, B, Subject>): Route {
  // The record's own types relate its parts to each other; the pipeline validates before it hands anything on.
  return { ...spec, __route: true } as unknown as Route
}
