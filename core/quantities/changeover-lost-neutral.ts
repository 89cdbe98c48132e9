/**
 * Voltages in V at single-phase loads in star when the neutral behind them is lost: the star point moves to
 * Σ(E·Y)/ΣY. Loads are resistances, given by the current that each draws at U0; the source is stiff and balanced.
 *
 * @param voltage U0 in V
 * @param currents A on L1, L2, L3, each 0 or more
 * @returns one voltage for each line, also where its load is 0; undefined where nothing is loaded
 * @source nodal analysis (Millman's theorem)
 */
export function lostNeutralVoltages(voltage: number, currents: readonly number[]): number[] | undefined {
  const total = currents.reduce((sum, current) => sum + current, 0)
  if (total === 0) return undefined
  const phasors = currents.map((current, index) => {
    const angle = (-2 * Math.PI * index) / currents.length
    return { weight: current / total, real: voltage * Math.cos(angle), imaginary: voltage * Math.sin(angle) }
  })
  const starReal = phasors.reduce((sum, { weight, real }) => sum + weight * real, 0)
  const starImaginary = phasors.reduce((sum, { weight, imaginary }) => sum + weight * imaginary, 0)
  return phasors.map(({ real, imaginary }) => Math.hypot(real - starReal, imaginary - starImaginary))
}

/** The highest of those voltages over the lines that carry load; undefined where nothing is loaded. */
export function highestLostNeutral(voltage: number, currents: readonly number[]): number | undefined {
  const voltages = lostNeutralVoltages(voltage, currents)
  return voltages && Math.max(...voltages.filter((_volts, index) => currents[index] !== 0))
}
