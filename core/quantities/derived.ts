import type { CircuitItem } from './circuit-item.ts'
import { knownNumber } from './circuit-item.ts'
import type { Quantity } from './quantity.ts'

/**
 * A quantity that follows from one other of the same circuit by a plain formula; missing where that one is.
 *
 * @param words its name, unit, title, formula and source
 * @param of the quantity it follows from
 * @param formula from that one's value, in its unit, to this one's
 */
export function derived(
  words: Pick<Quantity<CircuitItem>, 'name' | 'unit' | 'title' | 'formula' | 'source'>,
  of: string,
  formula: (value: number) => number,
): Quantity<CircuitItem> {
  return {
    ...words,
    from: [of],
    compute: (_item, _scene, known) => {
      const value = knownNumber(known, of)
      return value === undefined ? undefined : formula(value)
    },
  }
}
