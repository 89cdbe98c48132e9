import type { Request } from 'express'
import type { Knex } from 'knex'
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible'
import type { LimitClass } from './route.ts'

/** Requests per stretch of seconds, counted per person where one is known, and per address otherwise. */
export const LIMITS = {
  write: { points: 240, seconds: 60 },
  upload: { points: 600, seconds: 60 },
  heavy: { points: 30, seconds: 60 },
  // Good sign-ins count here, too: a whole office may come from one address. Wrong ones are counted in `tries.ts`.
  'sign-in': { points: 300, seconds: 300 },
  public: { points: 60, seconds: 60 },
} as const satisfies Readonly<Partial<Record<LimitClass, { points: number; seconds: number }>>>

/** Says how many seconds to wait, or that the request may go on. */
export type Limiter = (limit: LimitClass, key: string) => Promise<number | undefined>

/** Counts in the database, so that all processes count together. Reads are not counted: they are bounded by the pool. */
export function limiter(db: Knex): Limiter {
  const made = new Map(
    Object.entries(LIMITS).map(([name, { points, seconds }]) => [
      name,
      new RateLimiterPostgres({
        storeClient: db,
        storeType: 'knex',
        tableName: 'rate_limits',
        tableCreated: true,
        clearExpiredByTimeout: false,
        keyPrefix: name,
        points,
        duration: seconds,
      }),
    ]),
  )
  return async (limit, key) => {
    const counter = made.get(limit)
    if (counter === undefined) return undefined
    try {
      await counter.consume(key)
      return undefined
    } catch (error) {
      if (error instanceof RateLimiterRes) return Math.max(1, Math.ceil(error.msBeforeNext / 1000))
      throw error
    }
  }
}

/** The address that a request is counted under; Express has resolved proxies by the configured number of hops. */
export const addressOf = (request: Request): string => request.ip ?? 'unknown'
