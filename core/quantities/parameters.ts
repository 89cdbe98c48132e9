/**
 * Values on which countries and editions differ. A rule book gives each of them a value and a source
 * (`schemas/rules/<book>/book.yaml`); code only names them. `null` means that the book sets no such limit.
 */
export interface Parameters {
  /** Factor c on the nominal voltage in U0·c/Ia */
  readonly loop_voltage_factor: number
  /** Factor on the loop limit before a cold reading is held against it */
  readonly loop_reading_factor: number
  /** Which publication's fuses stand behind `gG` */
  readonly fuse_currents: 'IEC 60269-1' | 'BS 88-2'
  /** Ω·mm²/m at operating temperature, copper and aluminium, for the voltage drop */
  readonly copper_resistivity: number
  readonly aluminium_resistivity: number
  /** Ω/m */
  readonly conductor_reactance: number
  /** % of the nominal voltage, from the origin */
  readonly voltage_drop_lighting: number
  readonly voltage_drop_other: number
  /** V, highest touch voltage allowed to stand */
  readonly touch_voltage: number
  /** Ω, above which an electrode is held to be unstable */
  readonly electrode_stable: number
  /** mA, highest rated residual current that counts as additional protection */
  readonly additional_residual: number
  /** ms, shortest time that a time-delayed device may take at twice its rated residual current */
  readonly delayed_minimum_double: number
  /** `switched`, `continuous`, or `as demanded` by the grid operator */
  readonly changeover_neutral: 'switched' | 'continuous' | 'as demanded'
  /** Whether the island needs an electrode of its own in a TN system */
  readonly island_electrode: boolean
  /** mm² */
  readonly earthing_conductor_minimum: number
  readonly bonding_minimum: number
  readonly bonding_minimum_combined: number
  /** V, V, Hz, Hz, s: what the interface protection is set to */
  readonly interface_u_high: number | null
  readonly interface_u_low: number | null
  readonly interface_f_high: number | null
  readonly interface_f_low: number | null
  readonly reconnect_after: number | null
  /** VA between the most and the least loaded line */
  readonly unbalance: number | null
  /** How the array's test voltage is chosen: open-circuit voltage times a factor, or times one by altitude */
  readonly array_band: 'factor' | 'altitude'
  readonly array_band_factor: number
  /** String fuse as a multiple of the module's short-circuit current */
  readonly string_fuse_floor: number
  readonly string_fuse_ceiling: number
  /** Multiple of the short-circuit current that an array circuit must carry */
  readonly array_current_factor: number
  /** % by which strings may differ from the median of their array */
  readonly string_spread: number
  /** Factor in the ventilation of lead-acid batteries, m³/Ah */
  readonly ventilation_factor: number
}
