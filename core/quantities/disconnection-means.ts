/** By what a fault to earth is cut off in time. */
export type DisconnectionMeans = 'overcurrent' | 'residual current' | 'source shut-down' | 'none'

/**
 * Means of disconnection on the grid.
 *
 * @param loop fault-loop impedance in Ω, cold: the reading, or the expected value
 * @param limit highest reading, taken cold, at which the overcurrent device still operates in time, Ω
 * @param residual whether residual-current protection sees the fault
 * @returns undefined where neither means can be told from what is known
 * @source IEC 60364-4-41, 411.4.4, 411.4.5 and 411.5
 */
export function gridMeans(
  loop: number | undefined,
  limit: number | undefined,
  residual: boolean,
): DisconnectionMeans | undefined {
  const judged = loop !== undefined && limit !== undefined
  if (judged && loop <= limit) return 'overcurrent'
  if (residual) return 'residual current'
  return judged ? 'none' : undefined
}

/** What the means of disconnection in the island follow from. */
export interface IslandFault {
  /** A, what the inverters feed into the fault */
  readonly current: number | undefined
  /** A, Ia of the circuit's device */
  readonly operating: number | undefined
  /** Whether the loop is known, so that `current` is what really flows and not only what the source could give */
  readonly loopKnown: boolean
  /** Whether residual-current protection sees the fault in the island */
  readonly residual: boolean
  /** s, until the inverters have shut down; undefined where they state none, and then nothing is made of it */
  readonly shutdown: number | undefined
  /** s, required disconnection time */
  readonly time: number | undefined
}

/**
 * Means of disconnection in the island, the first that holds: the overcurrent device, where the weak source drives its
 * operating current; residual-current protection; the inverters' own shut-down within the time required.
 *
 * @returns `none` where the current is known to be too small and nothing else is stated; undefined where the current
 * that decides is not known
 * @source IEC 60364-4-41: 411.4.4, 411.3.2.5 (shut-down of the source; from memory); residual-current protection where a
 * breaker will not trip on a storage inverter: FAQ of an Austrian switchgear maker
 */
export function islandMeans(fault: IslandFault): DisconnectionMeans | undefined {
  const { current, operating, loopKnown, residual, shutdown, time } = fault
  const possible = current === undefined || operating === undefined ? undefined : current >= operating
  if (possible && loopKnown) return 'overcurrent'
  if (residual) return 'residual current'
  if (shutdown !== undefined && time !== undefined && shutdown <= time) return 'source shut-down'
  return possible === false ? 'none' : undefined
}
