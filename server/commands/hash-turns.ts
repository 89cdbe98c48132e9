/** Says that the server has more to do than it can; whoever asked may come again in a moment. */
export class Overloaded extends Error {
  readonly code = 'OVERLOADED'
}

/** Lets only so many pieces of work run at once, and only so many wait for their turn. */
export class Turns {
  readonly #waiting: (() => void)[] = []
  #running = 0

  constructor(
    readonly atOnce: number,
    readonly mostWaiting: number,
  ) {}

  async take<T>(work: () => Promise<T>): Promise<T> {
    if (this.#running >= this.atOnce) await this.#wait()
    else this.#running += 1
    try {
      return await work()
    } finally {
      // The place goes straight to the next in line, so that nobody can slip in between.
      const next = this.#waiting.shift()
      if (next === undefined) this.#running -= 1
      else next()
    }
  }

  async #wait(): Promise<void> {
    if (this.#waiting.length >= this.mostWaiting) throw new Overloaded('Too many passwords are being checked at once.')
    await new Promise<void>((resolve) => this.#waiting.push(resolve))
  }
}
