import type { PvArray } from '#core/install.ts'

/**
 * Whether strings need overcurrent protection: the other strings together can drive more than a module's highest series
 * fuse backwards through one, (Ns − 1)·Isc > Imax.
 *
 * @returns undefined with several strings and no highest series fuse stated
 * @source IEC 62548, as reproduced for IS/IEC 62548
 */
export function fuseNeeded({ strings, module }: PvArray): boolean | undefined {
  if (strings === 1) return false
  return module.max_fuse === undefined ? undefined : (strings - 1) * module.isc > module.max_fuse
}

/**
 * Highest rating of a string fuse in A: k·Isc, no more than the module's highest series fuse.
 *
 * @param ceiling k, the rule book's
 * @returns undefined where the module's highest series fuse is not stated
 * @source IEC 62548, as reproduced for IS/IEC 62548
 */
export function fuseMaximum({ module }: PvArray, ceiling: number): number | undefined {
  return module.max_fuse === undefined ? undefined : Math.min(ceiling * module.isc, module.max_fuse)
}
