/** Lets a few works run at once, a few more wait, and turns the rest away. */
export interface Gate {
  /** Runs a work when its turn comes; answers nothing where too many wait already. */
  run<Result>(work: () => Promise<Result>): Promise<{ readonly result: Result } | undefined>
}

export function gate(atOnce: number, waiting: number): Gate {
  const queue: (() => void)[] = []
  let running = 0

  async function turn(): Promise<void> {
    if (running < atOnce) {
      running += 1
      return
    }
    // The place of the one that ends goes to the one that waits, so the count stays.
    await new Promise<void>((start) => queue.push(start))
  }

  function leave(): void {
    const next = queue.shift()
    if (next) next()
    else running -= 1
  }

  return {
    async run(work) {
      if (running >= atOnce && queue.length >= waiting) return undefined
      await turn()
      try {
        return { result: await work() }
      } finally {
        leave()
      }
    },
  }
}
