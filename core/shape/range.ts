import type { Fault } from '#core/errors.ts'

/** Limits of a number in its place, in the unit of the place. */
export interface Bounds {
  readonly minimum?: number
  readonly exclusiveMinimum?: number
  readonly maximum?: number
}

/**
 * Whether a number keeps the limits of its place.
 *
 * @param value the number, in the unit of the place
 * @param bounds limits in the same unit; each may be missing
 * @param unit for the sentence; may be empty
 * @returns why not, or undefined
 */
export function rangeFault(value: number, bounds: Bounds, unit: string): Fault | undefined {
  const { minimum, exclusiveMinimum, maximum } = bounds
  if (minimum !== undefined && value < minimum) return fault(value, unit, `${minimum} or more`)
  if (exclusiveMinimum !== undefined && value <= exclusiveMinimum)
    return fault(value, unit, `more than ${exclusiveMinimum}`)
  if (maximum !== undefined && value > maximum) return fault(value, unit, `${maximum} or less`)
  return undefined
}

function fault(value: number, unit: string, allowed: string): Fault {
  const inUnit = unit === '' ? '' : ` ${unit}`
  return {
    code: 'out-of-range',
    message: `${value}${inUnit} cannot be right here, the value is ${allowed}: correct it.`,
  }
}
