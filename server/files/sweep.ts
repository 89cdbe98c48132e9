import { PASSING_KINDS } from './object-key.ts'
import type { ObjectStore } from './store.ts'

/** Removes what an organisation's uploads left behind: parts and whole uploads last written before a moment. Returns how many. */
export async function sweepPassing(store: ObjectStore, organisation: string, before: Date): Promise<number> {
  let swept = 0
  for (const kind of PASSING_KINDS) {
    for await (const { key, written } of store.list({ organisation, kind })) {
      if (written >= before) continue
      await store.delete(key)
      swept += 1
    }
  }
  return swept
}
