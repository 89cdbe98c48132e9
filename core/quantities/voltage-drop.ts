/** One stretch of cable, as the voltage drop sees it. */
export interface Stretch {
  /** m */
  readonly length: number
  /**
   * mm² of each conductor that adds to the drop: the line alone on balanced three-phase (Annex G: b = 1), line and
   * neutral on single-phase (b = 2 when both are alike).
   */
  readonly sizes: readonly number[]
  /** ρ1 in Ω·mm²/m at operating temperature */
  readonly resistivity: number
  /** λ in Ω/m */
  readonly reactance: number
}

/** A current by its two parts: I·cosφ and I·sinφ, A. */
export interface Current {
  readonly active: number
  readonly reactive: number
}

/** Splits a current in A by its power factor cosφ (0 to 1, taken as lagging). */
export function splitCurrent(current: number, powerFactor: number): Current {
  return { active: current * powerFactor, reactive: current * Math.sqrt(1 - powerFactor ** 2) }
}

/**
 * Voltage drop in V along a stretch: Σ over its conductors of (ρ1·L/S·cosφ + λ·L·sinφ)·I, which is Annex G's
 * u = b·(ρ1·L/S·cosφ + λ·L·sinφ)·I for equal conductors. The reactance term is not divided by S, as one reference page
 * prints it, and λ is in Ω/m (0.08 mΩ/m is 0.00008).
 *
 * @source IEC 60364-5-52:2009, Annex G, as printed by S. Fassbinder, ep Elektropraktiker
 */
export function voltageDrop({ length, sizes, resistivity, reactance }: Stretch, { active, reactive }: Current): number {
  return sizes.reduce((drop, size) => drop + length * ((resistivity / size) * active + reactance * reactive), 0)
}
