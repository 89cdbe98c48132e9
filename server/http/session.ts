import { createHash, createHmac, randomBytes } from 'node:crypto'
import connectPgSimple from 'connect-pg-simple'
import type { Request, RequestHandler } from 'express'
import session from 'express-session'
import type { Knex } from 'knex'
import type { Pool } from 'pg'
import { plainQuery } from '#server/db.ts'
import type { Env } from '#server/env.ts'
import type { SessionHandle } from './route.ts'

declare module 'express-session' {
  interface SessionData {
    person?: string
    organisation?: string
    /** When the person last showed the password, in ms since 1970. */
    signedInAt?: number
    /** When it was last used, to within some minutes, in ms since 1970. */
    seenAt?: number
    /** Shown to the person in the list of sessions. */
    browser?: string
    address?: string
  }
}

/** An idle session ends after eight hours: a day on site with long gaps. Issuing asks for the password again anyway. */
const IDLE_MS = 8 * 60 * 60 * 1000
/** No session lives longer than this. */
const ABSOLUTE_MS = 12 * 60 * 60 * 1000

const hash = (sid: string): string => createHash('sha256').update(sid).digest('hex')

type Done = (error?: unknown) => void
type Got = (error: unknown, data?: session.SessionData | null) => void

const PgStore = connectPgSimple(session)

/** Sessions in PostgreSQL under the hash of their id: who reads the table cannot use what is there. */
export class HashedStore extends PgStore {
  override get(sid: string, done: Got): void {
    super.get(hash(sid), done)
  }
  override set(sid: string, data: session.SessionData, done?: Done): void {
    super.set(hash(sid), data, done)
  }
  override destroy(sid: string, done?: Done): void {
    super.destroy(hash(sid), done)
  }
  override touch(sid: string, data: session.SessionData, done?: Done): void {
    super.touch(hash(sid), data, done)
  }
}

/** The cookie's name says to the browser that it belongs to this very host, over TLS only. Plain HTTP knows no such names. */
export const cookieName = (secure: boolean): string => (secure ? '__Host-skerry' : 'skerry')

export const isSecure = (env: Env): boolean => env.BASE_URL.startsWith('https://')

export function sessions(env: Env, db: Knex): RequestHandler {
  const secure = isSecure(env)
  return session({
    name: cookieName(secure),
    secret: env.SESSION_SECRET,
    store: new HashedStore({
      pool: { query: (text: string, values: unknown[]) => plainQuery(db, text, values) } as unknown as Pool,
      tableName: 'sessions',
      createTableIfMissing: false,
      pruneSessionInterval: false,
      // Written once in some minutes instead of at each request: see `stillSignedIn`.
      disableTouch: true,
      ttl: IDLE_MS / 1000,
    }),
    genid: () => randomBytes(32).toString('base64url'),
    resave: false,
    rolling: false,
    saveUninitialized: false,
    cookie: { httpOnly: true, secure, sameSite: 'lax', path: '/', maxAge: IDLE_MS },
  })
}

const SEEN_EVERY_MS = 5 * 60 * 1000

/** Whether a session is still good, by our own clock; notes now and then that it is in use. */
export function stillSignedIn(session: Partial<session.SessionData>, now: Date): boolean {
  const { signedInAt, seenAt } = session
  if (signedInAt === undefined || seenAt === undefined) return false
  const moment = now.getTime()
  if (moment - signedInAt > ABSOLUTE_MS || moment - seenAt > IDLE_MS) return false
  if (moment - seenAt > SEEN_EVERY_MS) session.seenAt = moment
  return true
}

/** A token that only pages of this session can know, made from its id and never stored. */
export const csrfToken = (env: Env, sid: string): string =>
  createHmac('sha256', env.SESSION_SECRET).update(`csrf ${sid}`).digest('base64url')

/** What routes may do with a session, without seeing the framework's object. */
export function sessionHandle(
  env: Env,
  request: Pick<Request, 'session' | 'sessionID' | 'get' | 'ip'>,
  now: Date,
): SessionHandle {
  const settle = (work: (done: Done) => void): Promise<void> =>
    new Promise((resolve, reject) => work((error) => (error ? reject(error) : resolve())))
  return {
    id: hash(request.sessionID),
    get csrf() {
      return csrfToken(env, request.sessionID)
    },
    async signIn({ person, organisation }) {
      // A new id at sign-in: one that was planted before is worth nothing.
      await settle((done) => request.session.regenerate(done))
      request.session.person = person
      request.session.organisation = organisation
      request.session.signedInAt = now.getTime()
      request.session.seenAt = now.getTime()
      request.session.browser = (request.get('user-agent') ?? '').slice(0, 200)
      request.session.address = request.ip ?? ''
      await settle((done) => request.session.save(done))
    },
    async signOut() {
      await settle((done) => request.session.destroy(done))
    },
  }
}
