/** How many texts are remembered for one place before it starts anew: bounded, for a process that runs for months. */
const MOST = 2000

const memory = new WeakMap<object, Map<string, unknown>>()

/**
 * What a text was read as at a place of the plan, read once: the same `6 kA` and `500 MΩ at 500 V` come back in every
 * circuit and every file. What is remembered is never changed by anyone.
 *
 * @param place the plan's place, which tells kind and unit
 * @param value as the file has it; only texts are remembered
 * @param read reads it
 */
export function remembered<Result>(place: object, value: unknown, read: () => Result): Result {
  if (typeof value !== 'string') return read()
  const known = memory.get(place) ?? new Map<string, unknown>()
  const found = known.get(value)
  if (found !== undefined) return found as Result
  if (known.size >= MOST) known.clear()
  const result = read()
  known.set(value, result)
  memory.set(place, known)
  return result
}
