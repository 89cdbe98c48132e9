export interface Instrument {
  readonly kind: string
  readonly serial: string
  readonly calibrated: string
  readonly due: string
  /** % of the reading, by kind of measurement */
  readonly uncertainty?: Readonly<Partial<Record<UncertaintyKind, number>>>
}

export type UncertaintyKind =
  | 'insulation'
  | 'loop'
  | 'continuity'
  | 'electrode'
  | 'residual_time'
  | 'residual_current'
  | 'voltage'
  | 'frequency'
  | 'current'
  | 'irradiance'
  | 'time'
  | 'array_voltage'
  | 'array_current'
  | 'bus_resistance'

export interface InspectionItem {
  readonly item: string
  readonly result: 'good' | 'defect' | 'not applicable' | 'not inspected'
  readonly note?: string
  readonly photo?: string
}

export interface Person {
  readonly name: string
  readonly licence?: string
  readonly company?: string
}

export interface People {
  readonly designed_by?: Person
  readonly installed_by?: Person
  readonly tested_by?: Person
}

export interface Handover {
  readonly explained_to?: string
  readonly on?: string
  readonly documents?: readonly string[]
}
