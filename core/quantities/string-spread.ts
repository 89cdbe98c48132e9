import type { StringReadings } from '#core/install/readings.ts'
import type { PvArray } from '#core/install.ts'
import { usable } from './loop-reading.ts'
import type { Scene } from './quantity.ts'
import { currentAtStc, voltageAtStc } from './string-translation.ts'

/** What strings are compared by. */
export type StringReadingName = 'voc' | 'isc'

const TRANSLATED = { voc: voltageAtStc, isc: currentAtStc } as const

/** The middle value; the mean of the two middle ones of an even count. Undefined for no values. */
export function median(values: readonly number[]): number | undefined {
  const sorted = values.toSorted((one, other) => one - other)
  const upper = sorted[Math.floor(sorted.length / 2)]
  const lower = sorted[Math.floor((sorted.length - 1) / 2)]
  return upper === undefined || lower === undefined ? undefined : (lower + upper) / 2
}

/** By how many per cent a value lies above a reference; below, the result is negative. */
export function percentFrom(value: number, reference: number): number {
  return (100 * (value - reference)) / reference
}

interface Read {
  readonly asRead: number
  readonly translated: number | undefined
}

function compare(array: PvArray, readings: StringReadings, name: StringReadingName): Read | undefined {
  const asRead = usable(readings[name])
  return asRead === undefined ? undefined : { asRead, translated: TRANSLATED[name](array, readings) }
}

/**
 * Deviation in % of a string from the median of its array. Values translated to standard test conditions are compared
 * where every string read can be translated, else the values as read: then only strings read one after the other under
 * a steady sky can be compared.
 *
 * @returns undefined where the string itself was not read
 * @source IEC 62446-1, 6.4 and 6.5, from memory; the reference, the median, is own choice
 */
export function deviation(
  array: PvArray,
  arrayId: string,
  own: StringReadings,
  name: StringReadingName,
  scene: Scene,
): number | undefined {
  const value = compare(array, own, name)
  const strings = scene.install.readings?.arrays?.[arrayId]?.strings ?? []
  const all = strings.flatMap((readings) => ('not_tested' in readings ? [] : (compare(array, readings, name) ?? [])))
  const translated = all.flatMap(({ translated }) => translated ?? [])
  const complete = translated.length === all.length
  const middle = median(complete ? translated : all.map(({ asRead }) => asRead))
  const compared = complete ? value?.translated : value?.asRead
  return middle === undefined || compared === undefined ? undefined : percentFrom(compared, middle)
}

/**
 * How many modules a string seems to be short of: its voltage's distance below the expected one, in whole modules.
 *
 * @param fromExpected deviation of the voltage from the expected one in %
 * @param modules modules in series, 1 or more
 * @source one module is 1/N of the voltage; own derivation
 */
export function modulesMissing(fromExpected: number, modules: number): number {
  return Math.max(0, Math.round((-fromExpected * modules) / 100))
}
