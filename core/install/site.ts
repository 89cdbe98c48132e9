export interface ReportHead {
  readonly reference: string
  readonly purpose: 'initial verification' | 'periodic verification' | 'alteration'
  /** A book's id; `iec` when left out. */
  readonly rulebook?: string
  readonly inspected?: { readonly from: string; readonly to?: string }
  readonly next_due?: string
  /** What the report covers, and what it leaves out. */
  readonly extent?: string
  readonly remarks?: string
}

export interface Site {
  readonly name: string
  readonly address: readonly string[]
  readonly customer?: string
  /** degrees, degrees, m above sea level */
  readonly position?: { readonly latitude: number; readonly longitude: number; readonly altitude?: number }
  /** °C, lowest ambient temperature expected */
  readonly lowest_temperature?: number
  /** °C, highest module cell temperature expected */
  readonly highest_cell_temperature?: number
  readonly premises?: 'dwelling' | 'commercial' | 'industrial' | 'agricultural' | 'public'
}
