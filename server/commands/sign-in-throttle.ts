import type { Tries } from '#server/tries.ts'

interface Try {
  readonly email: string
  readonly address: string
}

/** Counts tries to sign in, so that guessing is slow and no stranger can lock anybody out. */
export class SignInThrottle {
  constructor(readonly tries: Tries) {}

  /**
   * Counts a try before its password is looked at, so that many at once count as many.
   *
   * @returns seconds to wait before the next try; 0 when this one may be made
   */
  async enter({ email, address }: Try): Promise<number> {
    const { tries } = this
    const account = accountOf(email)
    const waits = [await tries.take('pair', account, address), await tries.take('address', address)]
    // What strangers try counts only for addresses that never got in.
    if (!(await tries.isKnown(account, address))) waits.push(await tries.take('account', account))
    return Math.max(0, ...waits.map((wait) => wait ?? 0))
  }

  /** A good sign-in takes its counts back, and makes the address a known one. */
  async succeeded({ email, address }: Try): Promise<void> {
    const { tries } = this
    const account = accountOf(email)
    await tries.forget('pair', account, address)
    await tries.giveBack('address', address)
    if (await tries.isKnown(account, address)) return
    await tries.giveBack('account', account)
    await tries.know(account, address)
  }
}

/** An address as accounts are known by it. */
const accountOf = (email: string): string => email.trim().toLowerCase()
