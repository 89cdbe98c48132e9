import type { Earthing } from '#core/install.ts'
import table from '#schemas/tables/disconnection-times.json' with { type: 'json' }

interface Band {
  readonly above: number
  /** Inclusive; null for the last band. */
  readonly upTo: number | null
  readonly TN: number
  readonly TT: number
}
const BANDS: readonly Band[] = table.bands

function systemOf(earthing: Earthing): 'TN' | 'TT' {
  return earthing === 'TT' ? 'TT' : 'TN'
}

/**
 * Longest time in s that may pass until a fault to earth in a final circuit is disconnected.
 *
 * @param voltage U0 in V; up to 50 V no disconnection is required: undefined
 * @param rated rating of the circuit's device in A
 * @param sockets whether the circuit has socket-outlets: Table 41.1 then reaches to 63 A, otherwise to 32 A, both
 * inclusive; above, the time for distribution circuits holds (5 s in TN, 1 s in TT)
 * @source IEC 60364-4-41, Table 41.1, 411.3.2.2 to 411.3.2.4
 */
export function disconnectionTime(
  earthing: Earthing,
  voltage: number,
  rated: number,
  sockets: boolean,
): number | undefined {
  const band = BANDS.find(({ above, upTo }) => voltage > above && voltage <= (upTo ?? Number.POSITIVE_INFINITY))
  if (!band) return undefined
  if (rated > (sockets ? table.scope.sockets : table.scope.fixed)) return distributionTime(earthing)
  return band[systemOf(earthing)]
}

/**
 * Longest disconnection time in s of a distribution circuit: 5 s in TN, 1 s in TT.
 *
 * @source IEC 60364-4-41, 411.3.2.3 and 411.3.2.4
 */
export function distributionTime(earthing: Earthing): number {
  return table.others[systemOf(earthing)]
}
