import type { OvercurrentDevice } from '#core/install.ts'

/** An overcurrent device that stands in the tree by itself, with its name in the file. */
export interface OvercurrentItem {
  readonly id: string
  readonly device: OvercurrentDevice
}
