import type { Cable } from '#core/install.ts'
import factors from '#schemas/tables/adiabatic-factors.json' with { type: 'json' }
import sizes from '#schemas/tables/conductor-sizes.json' with { type: 'json' }
import rules from '#schemas/tables/protective-conductors.json' with { type: 'json' }

/**
 * Factor k in A·√s/mm² of a conductor that is a core of a cable; undefined where the insulation is not stated.
 *
 * @source IEC 60364-5-54, Table 54.3
 */
export function adiabaticFactor({ insulation, material }: Cable): number | undefined {
  return insulation === undefined ? undefined : factors.rows[material][insulation]
}

/**
 * Energy I²t in A²s of a current that flows for a time.
 *
 * @param current A
 * @param time s, up to 5; below 0.1 s the let-through energy of the device counts instead
 */
export function energyOf(current: number, time: number): number {
  return current ** 2 * time
}

/**
 * Smallest protective conductor in mm² that a fault does not overheat: √(I²t)/k. Not rounded to a standard size.
 *
 * @param energy I²t in A²s
 * @param k A·√s/mm², above 0
 * @source IEC 60364-5-54, 543.1.2
 */
export function adiabaticMinimum(energy: number, k: number): number {
  return Math.sqrt(energy) / k
}

/** The next standard cross-section in mm² that is not below `size`; undefined beyond 120 mm². */
export function standardSize(size: number): number | undefined {
  return sizes.rows.find((standard) => standard >= size)
}

/**
 * Smallest protective conductor in mm² by the size of the line conductor, same metal: alike up to 16 mm², 16 mm² up
 * to 35 mm², above that half, rounded up to a standard size.
 *
 * @returns undefined where half the size is beyond the standard sizes held (120 mm²)
 * @source IEC 60364-5-54:2011, Table 54.2
 */
export function protectiveConductorByTable(line: number): number | undefined {
  const rule = rules.rows.find(({ upTo }) => line <= upTo)
  if (!rule) return standardSize(line * rules.above.share)
  return typeof rule.size === 'number' ? rule.size : line
}
