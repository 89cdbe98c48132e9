import type { Line, Measured, NotTested, State } from '#core/glossary.ts'

export interface Readings {
  readonly with?: string
  readonly circuits?: Readonly<Record<string, CircuitReadings>>
  readonly residual_current?: Readonly<Record<string, ResidualReadings>>
  readonly arrays?: Readonly<Record<string, ArrayReadings>>
  readonly states?: Readonly<Partial<Record<State, StateReadings | NotTested>>>
  readonly transfers?: readonly Transfer[]
  readonly load_steps?: readonly LoadStep[]
}

export interface CircuitReadings {
  readonly with?: string
  readonly not_tested?: string
  /** Ω, R1 + R2 */
  readonly continuity?: Measured
  /** MΩ */
  readonly insulation?: Measured
  readonly polarity?: 'correct' | 'reversed'
  /** Ω */
  readonly loop?: Readonly<Partial<Record<State, Measured>>>
}

export interface ResidualReadings {
  readonly with?: string
  readonly not_tested?: string
  readonly grid?: ResidualTest | NotTested
  readonly island?: ResidualTest | NotTested
}

export interface ResidualTest {
  /** ms */
  readonly half?: Measured
  readonly rated?: Measured
  readonly double?: Measured
  readonly five_times?: Measured
  /** mA */
  readonly ramp?: Measured
}

export interface ArrayReadings {
  readonly with?: string
  readonly not_tested?: string
  readonly strings?: readonly (StringReadings | NotTested)[]
}

export interface StringReadings {
  /** V, A, W/m², °C, MΩ */
  readonly voc?: Measured
  readonly isc?: Measured
  readonly irradiance?: Measured
  readonly cell_temperature?: Measured
  readonly insulation?: Measured
  readonly polarity?: 'correct' | 'reversed'
  /** Local date and time, ISO 8601 with offset */
  readonly taken?: string
}

export interface StateReadings {
  /** V */
  readonly voltage?: Readonly<Partial<Record<Line, Measured>>>
  /** Hz */
  readonly frequency?: Measured
  readonly rotation?: 'clockwise' | 'counter-clockwise'
  /** V */
  readonly neutral_to_earth?: Measured
  /** Ω, of the neutral-earth link */
  readonly link_resistance?: Measured
}

export interface Transfer {
  readonly to: State
  readonly cause?: string
  /** s, from the loss of the grid to dead terminals, and to restored supply */
  readonly dark_after?: Measured
  readonly restored_after?: Measured
  /** V to earth at the grid side with the island running */
  readonly grid_terminals?: Readonly<Partial<Record<Line | 'N', Measured>>>
  /** s, from the grid's return to the transfer back; s of interruption */
  readonly observed?: Measured
  readonly gap?: Measured
  readonly not_tested?: string
}

export interface LoadStep {
  readonly step: string
  /** V, Hz */
  readonly lowest_voltage?: Measured
  readonly lowest_frequency?: Measured
  readonly tripped?: boolean
  readonly not_tested?: string
}
