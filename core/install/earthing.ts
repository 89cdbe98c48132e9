import type { Measured } from '#core/glossary.ts'

export interface EarthingArrangement {
  readonly electrode?: {
    readonly kind: 'foundation' | 'rod' | 'ring' | 'plate' | 'strip' /** Ω */
    readonly resistance?: Measured
  }
  /** mm² */
  readonly earthing_conductor?: number
  /** mm², Ω */
  readonly bonding?: readonly { readonly to: string; readonly size: number; readonly continuity?: Measured }[]
  readonly lightning_protection?: boolean
}
