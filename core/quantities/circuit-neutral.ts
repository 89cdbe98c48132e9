import type { Cable } from '#core/install.ts'
import type { CircuitItem } from './circuit-item.ts'
import type { Quantity } from './quantity.ts'

/** mm²: up to this line conductor the neutral of a circuit of several lines is as large; above, it may go down to it. */
const FULL_UP_TO = { copper: 16, aluminium: 25 } as const satisfies Readonly<Record<Cable['material'], number>>

/**
 * Smallest neutral conductor in mm².
 *
 * With one line conductor the neutral carries the same current and has the same size. With several it is as large up to
 * 16 mm² copper or 25 mm² aluminium; above, it may be smaller down to that size, where its current is known to be small
 * and it is protected against overcurrent.
 *
 * @param cable its line conductor in mm², any positive size
 * @param lines count of line conductors, 1 to 3
 * @source IEC 60364-5-52:2009, 524.2, from memory
 */
export function neutralMinimum({ line, material }: Pick<Cable, 'line' | 'material'>, lines: number): number {
  return lines === 1 ? line : Math.min(line, FULL_UP_TO[material])
}

/** The neutral of a circuit. */
export const circuitNeutralQuantities: readonly Quantity<CircuitItem>[] = [
  {
    name: 'neutral_minimum',
    unit: 'mm²',
    title: 'Smallest neutral conductor',
    formula:
      'as large as the line on one line; on several as large up to 16 mm² copper or 25 mm² aluminium, above at least that',
    source: 'IEC 60364-5-52:2009, 524.2, from memory',
    from: ['cable.line', 'cable.material', 'phases'],
    compute: ({ circuit }) => neutralMinimum(circuit.cable, circuit.phases.length),
  },
]
