import { createHash } from 'node:crypto'
import type { Knex } from 'knex'
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible'

/**
 * How many tries there are in how many seconds. A stranger who tries an account wears out `account`, which counts only
 * addresses that never got in; whoever signed in well from an address before is counted there by `pair` alone.
 */
export const TRIES = {
  pair: { points: 8, seconds: 900 },
  account: { points: 30, seconds: 900 },
  address: { points: 100, seconds: 900 },
  again: { points: 10, seconds: 900 },
  'reset-account': { points: 3, seconds: 3600 },
  'reset-address': { points: 20, seconds: 3600 },
} as const

export type TryKind = keyof typeof TRIES

/** How long an address is known after a good sign-in. */
const KNOWN_SECONDS = 90 * 24 * 60 * 60

/** Addresses of people are no business of this table: it holds hashes only. */
const hashed = (parts: readonly string[]): string => createHash('sha256').update(JSON.stringify(parts)).digest('hex')

/** Counts tries in the database, so that all processes count together and a restart forgets nothing. */
export class Tries {
  readonly #counters: ReadonlyMap<TryKind, RateLimiterPostgres>
  readonly #known: RateLimiterPostgres

  constructor(db: Knex) {
    const counter = (keyPrefix: string, points: number, duration: number): RateLimiterPostgres =>
      new RateLimiterPostgres({
        storeClient: db,
        storeType: 'knex',
        tableName: 'rate_limits',
        tableCreated: true,
        clearExpiredByTimeout: false,
        keyPrefix,
        points,
        duration,
      })
    this.#known = counter('known', 1, KNOWN_SECONDS)
    this.#counters = new Map(
      (Object.keys(TRIES) as TryKind[]).map((kind) => [
        kind,
        counter(`try-${kind}`, TRIES[kind].points, TRIES[kind].seconds),
      ]),
    )
  }

  #counter(kind: TryKind): RateLimiterPostgres {
    const counter = this.#counters.get(kind)
    if (counter === undefined) throw new TypeError(`There is no counter ${kind}.`)
    return counter
  }

  /** Counts one try; the seconds to wait when there are none left. */
  async take(kind: TryKind, ...parts: readonly string[]): Promise<number | undefined> {
    try {
      await this.#counter(kind).consume(hashed(parts))
      return undefined
    } catch (error) {
      if (error instanceof RateLimiterRes) return Math.max(1, Math.ceil(error.msBeforeNext / 1000))
      throw error
    }
  }

  /** The seconds to wait when there are no tries left; counts nothing. */
  async wait(kind: TryKind, ...parts: readonly string[]): Promise<number | undefined> {
    const state = await this.#counter(kind).get(hashed(parts))
    if (state === null || state.consumedPoints < TRIES[kind].points) return undefined
    return Math.max(1, Math.ceil(state.msBeforeNext / 1000))
  }

  /** Takes a try back that went well. */
  async giveBack(kind: TryKind, ...parts: readonly string[]): Promise<void> {
    await this.#counter(kind).reward(hashed(parts))
  }

  async forget(kind: TryKind, ...parts: readonly string[]): Promise<void> {
    await this.#counter(kind).delete(hashed(parts))
  }

  async know(account: string, address: string): Promise<void> {
    await this.#known.set(hashed([account, address]), 1, KNOWN_SECONDS)
  }

  async isKnown(account: string, address: string): Promise<boolean> {
    return (await this.#known.get(hashed([account, address]))) !== null
  }
}
