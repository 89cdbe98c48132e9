import type { PvArray, PvModule } from '#core/install.ts'
import factors from '#schemas/tables/voltage-temperature-factors.json' with { type: 'json' }

/** Cell temperature at standard test conditions, °C (IEC 60904-3). */
const STC = 25

/**
 * Factor by which a value of a module changes from standard test conditions to a cell temperature: 1 + c·(Tc − 25 °C).
 *
 * @param coefficient c in %/K
 * @param temperature Tc in °C
 * @source IAEI Magazine, photovoltaic systems mathematics (2019)
 */
export function temperatureFactor(coefficient: number, temperature: number): number {
  return 1 + (coefficient / 100) * (temperature - STC)
}

/**
 * Factor on the open-circuit voltage of crystalline silicon where the datasheet states no coefficient.
 *
 * @param lowest ambient temperature in °C, down to −40; undefined below
 * @source NEC 690.7(A), Table, as transcribed by a trade page
 */
export function tabulatedVoltageFactor(lowest: number): number | undefined {
  return factors.rows.find(({ downTo }) => lowest >= downTo)?.factor
}

/**
 * Highest open-circuit voltage of a string in V: N·Voc·(1 + β·(Tmin − 25 °C)), or by the table without a coefficient.
 *
 * @param lowest ambient temperature Tmin in °C
 * @returns undefined without a coefficient below −40 °C
 * @source IAEI Magazine (2019); NEC 690.7(A)
 */
export function highestVoltage({ module, modules_in_series }: PvArray, lowest: number): number | undefined {
  const factor = voltageFactor(module, lowest)
  return factor === undefined ? undefined : modules_in_series * module.voc * factor
}

function voltageFactor({ voc_coefficient }: PvModule, lowest: number): number | undefined {
  return voc_coefficient === undefined ? tabulatedVoltageFactor(lowest) : temperatureFactor(voc_coefficient, lowest)
}

/**
 * Lowest voltage of a string at its maximum power in V: N·Vmp·(1 + β·(Tmax − 25 °C)), β of the voltage at maximum
 * power, which is larger in size than the one of the open circuit and never replaced by it.
 *
 * @param highest cell temperature Tmax in °C
 * @returns undefined where the datasheet's voltage or coefficient is not stated
 * @source a discussion of string sizing on a designers' mailing list (2011)
 */
export function lowestOperatingVoltage({ module, modules_in_series }: PvArray, highest: number): number | undefined {
  const { vmp, vmp_coefficient } = module
  if (vmp === undefined || vmp_coefficient === undefined) return undefined
  return modules_in_series * vmp * temperatureFactor(vmp_coefficient, highest)
}
