import type { Bounds } from '#core/shape/range.ts'

/** A number or text with a unit. */
export interface QuantityPlan {
  readonly as: 'quantity'
  readonly kind: string
  readonly unit: string
  readonly bounds: Bounds
}

/** What an instrument showed, or the reason why there is nothing. */
export interface ReadingPlan {
  readonly as: 'reading'
  readonly kind: string
  readonly unit: string
  readonly bounds: Bounds
}

/** An object with known keys. Keys that need no work are not listed. */
export interface ObjectPlan {
  readonly as: 'object'
  readonly keys: Readonly<Record<string, Plan>>
  readonly defaults?: Readonly<Record<string, string | number>>
}

/** A breaker, fuse or cable, in short or long. */
export interface ShorthandPlan {
  readonly as: 'device' | 'cable'
  readonly keys: Readonly<Record<string, Plan>>
  readonly defaults?: Readonly<Record<string, string | number>>
}

/** Items by id. */
export interface MapPlan {
  readonly as: 'map'
  readonly each: Plan
}

export interface ListPlan {
  readonly as: 'list'
  readonly each: Plan
}

/** What the normaliser does at one place of the file. Derived from the schema when the project is built. */
export type Plan = QuantityPlan | ReadingPlan | ObjectPlan | ShorthandPlan | MapPlan | ListPlan
