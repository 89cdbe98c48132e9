import type { Measured } from '#core/glossary.ts'

/**
 * The number of a reading that formulas may go on from: positive and inside the instrument's range. Undefined for a
 * missing reading, a stated limitation, and a reading that only says `>999` or `<0.05`.
 */
export function usable(reading: Measured | undefined): number | undefined {
  if (!reading || 'not_tested' in reading) return undefined
  if (reading.bound !== undefined || !Number.isFinite(reading.value) || reading.value <= 0) return undefined
  return reading.value
}
