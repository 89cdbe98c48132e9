/**
 * The install file after normalising: shorthand expanded, every quantity a plain number in the unit that the schema
 * names for its place (given here in brackets). The schema under `schemas/` is the norm; this is its shape in TypeScript.
 */
import type { Line, Measured } from './glossary.ts'
import type { Battery } from './install/battery.ts'
import type { EarthingArrangement } from './install/earthing.ts'
import type { Meter } from './install/meter.ts'
import type { Readings } from './install/readings.ts'
import type { Handover, InspectionItem, Instrument, People } from './install/record.ts'
import type { ReportHead, Site } from './install/site.ts'

export type Earthing = 'TN-S' | 'TN-C-S' | 'TT'

export type NeutralLink = 'closes in island' | 'fixed' | 'none'

export interface Install {
  readonly skerry: 1
  readonly report: ReportHead
  readonly site: Site
  readonly supply: Supply
  readonly earthing?: EarthingArrangement
  readonly meter?: Meter
  readonly boards?: Readonly<Record<string, Board>>
  readonly overcurrent?: Readonly<Record<string, OvercurrentDevice>>
  readonly changeover: Changeover
  readonly residual_current?: Readonly<Record<string, ResidualCurrentDevice>>
  readonly links?: Readonly<Record<string, SupplyLink>>
  readonly inverters?: Readonly<Record<string, Inverter>>
  readonly arrays?: Readonly<Record<string, PvArray>>
  readonly batteries?: Readonly<Record<string, Battery>>
  readonly circuits?: Readonly<Record<string, Circuit>>
  readonly instruments?: Readonly<Record<string, Instrument>>
  readonly inspection?: readonly InspectionItem[]
  readonly readings?: Readings
  readonly departures?: readonly {
    readonly rule: string
    readonly subject: string
    readonly reason: string
    readonly agreed_by: string
    readonly on: string
  }[]
  readonly people?: People
  readonly handover?: Handover
}

export interface Supply {
  readonly operator: string
  readonly earthing: Earthing
  /** V line to neutral, count of line conductors, Hz */
  readonly nominal: { readonly voltage: number; readonly phases: 1 | 3; readonly frequency: number }
  readonly main_protection: Device
  /** A a line, what the operator provides for */
  readonly rated_current?: number
  /** Ω, external earth-fault loop impedance Ze */
  readonly loop_impedance?: Measured
  /** A, prospective fault current at the origin, the larger of line-neutral and line-earth */
  readonly fault_current?: Measured
  readonly separation?: { readonly required: 'all poles' | 'line poles'; readonly stated_in?: string }
}

export interface Board {
  readonly name: string
  readonly fed_from: string
  readonly cable?: Cable
  readonly neutral_link?: NeutralLink
}

export type Device = Breaker | Fuse

export interface Breaker {
  readonly kind: 'breaker'
  readonly curve: 'B' | 'C' | 'D'
  readonly rated: number
  /** A */
  readonly breaking?: number
  /** A²s let through at the prospective fault current */
  readonly let_through?: number
}

export interface Fuse {
  readonly kind: 'fuse'
  readonly curve: 'gG'
  readonly rated: number
  readonly breaking?: number
  readonly let_through?: number
}

export interface OvercurrentDevice {
  readonly device: Device
  /** A */
  readonly breaking?: number
  readonly fed_from: string
  readonly cable?: Cable
}

export interface Cable {
  /** mm² */
  readonly line: number
  /** mm²; absent where no neutral is run */
  readonly neutral?: number
  /** mm²; absent where no protective conductor is run in the cable */
  readonly protective?: number
  readonly cores: number
  readonly material: 'copper' | 'aluminium'
  /** 1 solid, 2 stranded, 5 flexible: IEC 60228 */
  readonly conductor_class: 1 | 2 | 5
  readonly insulation?: 'pvc' | 'xlpe'
  /** Reference method of IEC 60364-5-52 */
  readonly method?: 'A1' | 'A2' | 'B1' | 'B2' | 'C' | 'D1' | 'D2' | 'E'
  /** m */
  readonly length?: number
  /** °C; the table's reference temperature when left out */
  readonly ambient?: number
  readonly grouped?: {
    readonly circuits: number
    readonly as: 'bunched' | 'single layer' | 'single layer, spaced' | 'under ceiling' | 'under ceiling, spaced'
  }
}

export interface Changeover {
  readonly id: string
  readonly fed_from: string
  readonly operation: 'automatic' | 'manual'
  readonly poles: 1 | 2 | 3 | 4
  /** A */
  readonly rated_current: number
  readonly neutral_link: NeutralLink
  /** Order of the neutral contact when opening. */
  readonly neutral_opens?: 'last' | 'with the lines' | 'first'
  readonly interlock?: readonly ('electrical' | 'mechanical')[]
  /** A, conditional short-circuit current with the upstream device, from the datasheet */
  readonly short_circuit_rating?: number
  readonly cable?: Cable
  readonly signals?: readonly Signal[]
}

export interface Signal {
  readonly role: 'changeover command' | 'changeover confirmation' | 'grid contactor open'
  /** As labelled on the device */
  readonly terminal: string
  /** As set in the inverter */
  readonly configured: string
}

export type ResidualType = 'AC' | 'A' | 'F' | 'B'

export interface ResidualProtection {
  readonly type: ResidualType
  /** mA */
  readonly residual: number
  /** `S`: time-delayed (selective) */
  readonly delay?: 'S'
}

export interface ResidualCurrentDevice extends ResidualProtection {
  readonly fed_from: string
  /** A */
  readonly rated_current: number
  readonly cable?: Cable
}

export interface SupplyLink {
  readonly from: string
  readonly to: string
  readonly position: 'open' | 'closed'
  readonly interlocked: boolean
}

export interface Inverter {
  readonly fed_from: string
  readonly phases: 1 | 3
  /** The line of a single-phase inverter on a three-phase supply */
  readonly line?: Line
  /** VA */
  readonly rated_power: number
  readonly island?: IslandSource
  readonly residual_monitoring?: 'integrated' | 'external' | 'none'
  /** Galvanic separation between the d.c. and the a.c. side */
  readonly separation?: 'simple' | 'none'
  /** The residual-current device type that the datasheet asks for at the backed-up output */
  readonly residual_type_needed?: ResidualType
  /** V, V, Hz, Hz, s (V of line to neutral) */
  readonly interface_protection?: InterfaceProtection
  readonly settings?: InverterSettings
  /** V, start of the maximum-power-point window */
  readonly mpp_minimum_voltage?: number
  readonly neutral_link?: NeutralLink
  readonly cable?: Cable
}

export interface IslandSource {
  /** VA */
  readonly continuous: number
  /** VA */
  readonly per_phase?: number
  /** VA, s */
  readonly peak?: number
  readonly peak_time?: number
  /** A, at a short circuit in the island */
  readonly fault_current?: number
  /** s, from a fault to no voltage */
  readonly shuts_down_within?: number
}

export interface InterfaceProtection {
  readonly u_high?: number
  readonly u_low?: number
  readonly f_high?: number
  readonly f_low?: number
  readonly reconnect_after?: number
}

export interface InverterSettings {
  /** V */
  readonly island_voltage?: number
  /** % of the usable charge that is held back for the island */
  readonly held_back_charge?: number
  /** % */
  readonly low_charge_alarm?: number
  readonly country_profile?: string
  readonly read_back?: boolean
}

export interface PvArray {
  readonly into: string
  readonly modules_in_series: number
  readonly strings: number
  readonly module: PvModule
  /** °, 0 flat; °, clockwise from north */
  readonly orientation?: { readonly tilt: number; readonly azimuth: number }
  /** V */
  readonly max_input_voltage: number
  /** A, where string fuses are fitted */
  readonly string_fuse?: number
}

export interface PvModule {
  /** V, A, V, A, W at standard test conditions */
  readonly voc: number
  readonly isc: number
  readonly vmp?: number
  readonly imp?: number
  readonly pmax?: number
  /** %/K, negative */
  readonly voc_coefficient?: number
  /** %/K, negative; larger in size than the one for open circuit */
  readonly vmp_coefficient?: number
  /** %/K, positive */
  readonly isc_coefficient?: number
  /** A, highest series fuse that the module allows */
  readonly max_fuse?: number
}

export interface Circuit {
  readonly serves: string
  readonly fed_from: string
  readonly phases: readonly Line[]
  readonly device: Device
  readonly cable: Cable
  readonly load?: Load
  readonly sockets?: boolean
  readonly lighting?: boolean
  /** Residual-current protection built into the circuit's own device */
  readonly residual_current?: ResidualProtection
}

export interface Load {
  /** W */
  readonly power?: number
  /** A, where the datasheet gives the current */
  readonly current?: number
  /** 1 when left out */
  readonly power_factor?: number
  /** Starting current as a multiple of the running current */
  readonly start?: number
  readonly must_run?: boolean
  /** Wh */
  readonly daily_energy?: number
}
