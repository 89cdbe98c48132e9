import type { Cable } from '#core/install.ts'
import table from '#schemas/tables/conductor-resistance.json' with { type: 'json' }

const ROWS: Readonly<Record<string, Readonly<Record<string, number>>>> = table.rows

/**
 * Resistance of one conductor at 20 °C in Ω/m.
 *
 * @param size cross-section in mm², a standard size of 0.5 to 95 mm² (aluminium: classes 1 and 2, 10 to 95 mm²)
 * @returns undefined for a size or class that the table does not hold
 * @source IEC 60228, Tables 1 to 3; aluminium from memory
 */
export function conductorResistance(
  size: number,
  material: Cable['material'],
  conductorClass: Cable['conductor_class'],
): number | undefined {
  const flexible = conductorClass === 5
  if (flexible && material === 'aluminium') return undefined
  const row = ROWS[material === 'aluminium' ? 'aluminium 1, 2' : flexible ? 'copper 5' : 'copper 1, 2']
  const perKilometre = row?.[String(size)]
  return perKilometre === undefined ? undefined : perKilometre / 1000
}

/**
 * Resistance in Ω at 20 °C of the line conductor and one return conductor of a cable, in series: R1 + R2 with the
 * protective conductor, R1 + Rn with the neutral.
 *
 * @returns undefined where the cable has no such conductor, no stated length, or a size outside the table
 * @source R = r·l, r by IEC 60228
 */
export function lineAndReturn(cable: Cable, back: 'neutral' | 'protective'): number | undefined {
  const size = cable[back]
  if (size === undefined || cable.length === undefined) return undefined
  const out = conductorResistance(cable.line, cable.material, cable.conductor_class)
  const home = conductorResistance(size, cable.material, cable.conductor_class)
  return out === undefined || home === undefined ? undefined : (out + home) * cable.length
}
