import type { Measured } from '#core/glossary.ts'

export interface Meter {
  readonly id: string
  readonly at: 'connection point' | 'generation' | 'consumption'
  /** A */
  readonly rated_current?: number
  readonly direction?: 'checked' | 'not checked' | 'reversed'
  readonly neutral_reference?: string
  readonly link?: Bus
}

export interface Bus {
  readonly kind: 'RS-485' | 'Ethernet' | 'wireless'
  readonly address?: number
  /** Addresses of the other devices on the same bus. */
  readonly other_addresses?: readonly number[]
  readonly terminated_at?: readonly string[]
  /** Ω, across the pair with the power off */
  readonly measured_across?: Measured
  /** m */
  readonly length?: number
  /** m, the longest that the device's datasheet allows */
  readonly length_limit?: number
  /** V, Ω each, count of receivers in unit loads */
  readonly bias?: { readonly voltage: number; readonly resistors: number; readonly unit_loads?: number }
}
