export interface Battery {
  readonly into: string
  readonly chemistry:
    | 'lithium iron phosphate'
    | 'lithium nickel manganese cobalt'
    | 'lead-acid, vented'
    | 'lead-acid, valve-regulated'
    | 'sodium-ion'
  /** Wh */
  readonly usable: number
  /** W */
  readonly max_discharge: number
  /** %, charge to a.c. output */
  readonly efficiency: number
  readonly place: string
  /** m, to the nearest door, window or vent, for a battery outdoors */
  readonly distance_to_opening?: number
  /** lead-acid: count of cells in series, Ah, mA per Ah at the end of charge (IEC 62485-2) */
  readonly cells?: number
  readonly capacity?: number
  readonly gas_current?: number
}
