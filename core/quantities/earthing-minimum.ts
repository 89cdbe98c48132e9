import type { Earthing } from '#core/install.ts'
import table from '#schemas/tables/bonding-conductors.json' with { type: 'json' }

/**
 * Smallest earthing conductor in mm² of copper.
 *
 * @param minimum the rule book's smallest size, mm²
 * @param lightning whether lightning protection is connected to it: then 16 mm²
 * @source IEC 60364-5-54, 542.3.1, as in the Korean transcription
 */
export function earthingConductorMinimum(minimum: number, lightning: boolean): number {
  return lightning ? Math.max(minimum, table.earthing.lightningProtection) : minimum
}

/**
 * Smallest main bonding conductor in mm² of copper: half the earthing conductor, never below the rule book's smallest
 * size; 25 mm² is enough.
 *
 * @param earthingConductor as fitted, mm²
 * @param minimum the rule book's smallest size, mm²
 * @param combined the rule book's smallest size where the supply has a combined neutral and earth (TN-C-S), mm²
 * @source IEC 60364-5-54, 544.1.1; TN-C-S: BS 7671, Table 54.8, as summarised by a British regulations site
 */
export function bondingMinimum(
  earthingConductor: number,
  earthing: Earthing,
  minimum: number,
  combined: number,
): number {
  const floor = earthing === 'TN-C-S' ? Math.max(minimum, combined) : minimum
  return Math.max(floor, Math.min(table.bonding.enough, earthingConductor * table.bonding.share))
}

/**
 * Highest resistance in Ω of the electrode and its conductor that keeps the touch voltage in bounds: UL/IΔn.
 *
 * @param touchVoltage UL in V
 * @param residual IΔn in mA, above 0
 * @source IEC 60364-4-41, 411.5.3
 */
export function electrodeLimit(touchVoltage: number, residual: number): number {
  return touchVoltage / (residual / 1000)
}
