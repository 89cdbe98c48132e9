import type { Measured } from '#core/glossary.ts'
import type { StringReadings } from '#core/install/readings.ts'
import type { PvArray } from '#core/install.ts'
import { temperatureFactor } from './array-voltage.ts'
import { usable } from './loop-reading.ts'

/** Irradiance at standard test conditions, W/m² (IEC 60904-3). */
const STC = 1000

/** The exact reading of a temperature, which may lie below zero. */
function temperature(reading: Measured | undefined): number | undefined {
  return reading && 'value' in reading && reading.bound === undefined ? reading.value : undefined
}

/** Factor from standard test conditions to the day's cell temperature; undefined where one of the two is not stated. */
function thermal(coefficient: number | undefined, readings: StringReadings): number | undefined {
  const cell = temperature(readings.cell_temperature)
  return coefficient === undefined || cell === undefined ? undefined : temperatureFactor(coefficient, cell)
}

/** Factor on the short-circuit current: irradiance and cell temperature. */
function currentFactor({ module }: PvArray, readings: StringReadings): number | undefined {
  const heat = thermal(module.isc_coefficient, readings)
  const irradiance = usable(readings.irradiance)
  return heat === undefined || irradiance === undefined ? undefined : (irradiance / STC) * heat
}

const times = (value: number | undefined, factor: number | undefined): number | undefined =>
  value === undefined || factor === undefined ? undefined : value * factor

const over = (value: number | undefined, factor: number | undefined): number | undefined =>
  value === undefined || factor === undefined ? undefined : value / factor

/**
 * Open-circuit voltage in V that the datasheet lets expect of a string at the cell temperature of the reading:
 * N·Voc·(1 + β·(Tc − 25 °C)). The irradiance, whose influence is small, is left out.
 *
 * @source a field procedure for string readings; IAEI Magazine (2019)
 */
export function expectedVoltage(array: PvArray, readings: StringReadings): number | undefined {
  return times(array.modules_in_series * array.module.voc, thermal(array.module.voc_coefficient, readings))
}

/**
 * Short-circuit current in A that the datasheet lets expect at the irradiance G and cell temperature of the reading:
 * Isc·G/1000·(1 + α·(Tc − 25 °C)).
 *
 * @source a field procedure for string readings
 */
export function expectedCurrent(array: PvArray, readings: StringReadings): number | undefined {
  return times(array.module.isc, currentFactor(array, readings))
}

/**
 * Open-circuit voltage of a reading in V, translated to 25 °C: Voc/(1 + β·(Tc − 25 °C)).
 *
 * @source a field procedure for string readings
 */
export function voltageAtStc(array: PvArray, readings: StringReadings): number | undefined {
  return over(usable(readings.voc), thermal(array.module.voc_coefficient, readings))
}

/**
 * Short-circuit current of a reading in A, translated to 1000 W/m² and 25 °C: Isc·(1000/G)/(1 + α·(Tc − 25 °C)).
 *
 * @source a field procedure for string readings; an instrument maker's manual prints the same structure
 */
export function currentAtStc(array: PvArray, readings: StringReadings): number | undefined {
  return over(usable(readings.isc), currentFactor(array, readings))
}
