import { createHash } from 'node:crypto'
import type { Knex } from 'knex'
import { RateLimiterPostgres } from 'rate-limiter-flexible'

/** Wrong tries until a wait: by one address for one account, by one address for all, and for one account by everybody. */
export const TRIES = {
  pair: { points: 8, seconds: 15 * 60 },
  address: { points: 60, seconds: 60 * 60 },
  account: { points: 40, seconds: 60 * 60 },
} as const

/** An address that signed in well before is not locked out by what strangers try elsewhere. */
const KNOWN_FOR_SECONDS = 90 * 24 * 60 * 60

const hash = (text: string): string => createHash('sha256').update(text).digest('base64url')

interface Try {
  readonly email: string
  readonly address: string
}

/** Counts wrong sign-ins in the database, for all processes together. */
export class SignInThrottle {
  readonly #pair: RateLimiterPostgres
  readonly #address: RateLimiterPostgres
  readonly #account: RateLimiterPostgres
  readonly #known: RateLimiterPostgres

  constructor(db: Knex) {
    const limiter = (keyPrefix: string, points: number, duration: number): RateLimiterPostgres =>
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
    this.#pair = limiter('tries-pair', TRIES.pair.points, TRIES.pair.seconds)
    this.#address = limiter('tries-address', TRIES.address.points, TRIES.address.seconds)
    this.#account = limiter('tries-account', TRIES.account.points, TRIES.account.seconds)
    this.#known = limiter('known', 1, KNOWN_FOR_SECONDS)
  }

  #keys({ email, address }: Try) {
    const account = hash(email.trim().toLowerCase())
    return { pair: `${account} ${address}`, address, account }
  }

  /** Seconds to wait before the next try; 0 when it may be made. */
  async wait(tried: Try): Promise<number> {
    const keys = this.#keys(tried)
    const [pair, address, account, known] = await Promise.all([
      this.#pair.get(keys.pair),
      this.#address.get(keys.address),
      this.#account.get(keys.account),
      this.#known.get(keys.pair),
    ])
    const blocked = [
      pair !== null && pair.consumedPoints >= TRIES.pair.points ? pair : null,
      address !== null && address.consumedPoints >= TRIES.address.points ? address : null,
      known === null && account !== null && account.consumedPoints >= TRIES.account.points ? account : null,
    ]
    return Math.max(0, ...blocked.map((state) => (state === null ? 0 : Math.ceil(state.msBeforeNext / 1000))))
  }

  async failed(tried: Try): Promise<void> {
    const keys = this.#keys(tried)
    await Promise.all([
      this.#pair.penalty(keys.pair),
      this.#address.penalty(keys.address),
      this.#account.penalty(keys.account),
    ])
  }

  async succeeded(tried: Try): Promise<void> {
    const keys = this.#keys(tried)
    await Promise.all([this.#pair.delete(keys.pair), this.#known.set(keys.pair, 1, KNOWN_FOR_SECONDS)])
  }
}
