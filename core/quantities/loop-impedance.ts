/**
 * Highest fault-loop impedance in Ω at which a device still operates in time: U0·c/Ia.
 *
 * @param voltage U0 in V
 * @param voltageFactor c, 1 or a country's factor for a low supply voltage (0.95 in Great Britain)
 * @param operating Ia in A, above 0
 * @source IEC 60364-4-41, 411.4.4; BS 7671, 411.4.5 for c
 */
export function loopLimit(voltage: number, voltageFactor: number, operating: number): number {
  return (voltage * voltageFactor) / operating
}

/**
 * Limit in Ω that a loop reading, taken cold, is held against.
 *
 * @param factor the rule book's: 2/3 or 0.8
 * @source IEC 60364-6, Annex D, 6.4.3.7.2 (two thirds); BS 7671 practice (0.8)
 */
export function loopLimitMeasured(limit: number, factor: number): number {
  return limit * factor
}

/**
 * Current in A that a voltage drives through a loop: U0/Zs.
 *
 * @param loop Ω, above 0
 */
export function faultCurrent(voltage: number, loop: number): number {
  return voltage / loop
}

/**
 * Prospective current in A further down the line, from the one at the origin and the resistance of the conductors
 * between (line and return, cold). The source's impedance is taken as purely reactive, so it adds at a right angle and
 * the result is never below the true one: what a breaking capacity has to be held against.
 *
 * @param atOrigin A, above 0
 * @param resistance Ω between origin and device, 0 or more
 * @source R and X are added apart, Z = √(ΣR² + ΣX²): short-circuit study after IEC 60909; reactive source: own choice, on the safe side
 */
export function faultCurrentAlong(voltage: number, atOrigin: number, resistance: number): number {
  return voltage / Math.hypot(voltage / atOrigin, resistance)
}
