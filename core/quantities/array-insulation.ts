import type { PvArray } from '#core/install.ts'
import altitudes from '#schemas/tables/altitude-factors.json' with { type: 'json' }
import bands from '#schemas/tables/array-insulation.json' with { type: 'json' }
import type { InsulationTest } from './circuit-insulation.ts'
import type { Scene } from './quantity.ts'

/**
 * Factor kT from the open-circuit voltage to the system voltage by the altitude of the site.
 *
 * @param altitude m above sea level
 * @source EN 62446-1:2019, Swiss practice, as printed by a test house
 */
export function altitudeFactor(altitude: number): number {
  return (altitudes.rows.find(({ upTo }) => altitude <= upTo) ?? altitudes.above).factor
}

/**
 * Test voltage and smallest insulation resistance of an array: 250 V and 0.5 MΩ below 120 V, 500 V up to 500 V,
 * 1,000 V up to 1,000 V, 1,500 V above, each with 1 MΩ.
 *
 * @param system system voltage in V, above 0
 * @source IEC 62446-1, 6.7, as printed for EN 62446-1:2019 by a Swiss test house
 */
export function arrayInsulationTest(system: number): InsulationTest {
  const row =
    system < bands.below.voltage ? bands.below : (bands.rows.find(({ upTo }) => system <= upTo) ?? bands.above)
  return { voltage: row.testVoltage, minimum: row.minimum }
}

/**
 * System voltage of an array in V: N·Voc at standard test conditions, times the rule book's factor or kT by altitude.
 *
 * @returns undefined where the rule book goes by altitude and the site states none
 */
export function systemVoltage({ modules_in_series, module }: PvArray, scene: Scene): number | undefined {
  const factor = bandFactor(scene)
  return factor === undefined ? undefined : modules_in_series * module.voc * factor
}

function bandFactor({ install, parameters }: Scene): number | undefined {
  if (parameters.array_band === 'factor') return parameters.array_band_factor
  const altitude = install.site.position?.altitude
  return altitude === undefined ? undefined : altitudeFactor(altitude)
}

/** Test voltage and smallest insulation resistance of an array; undefined where its system voltage is. */
export function insulationTestOf(array: PvArray, scene: Scene): InsulationTest | undefined {
  const system = systemVoltage(array, scene)
  return system === undefined ? undefined : arrayInsulationTest(system)
}
