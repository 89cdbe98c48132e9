import type { State } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import type { TopologyNode } from './topology.ts'

interface Wiring {
  readonly install: Install
  readonly nodes: ReadonlyMap<string, TopologyNode>
  readonly routeIn: (id: string, state: State) => readonly TopologyNode[]
  readonly neutralEarthLinks: Readonly<Record<State, readonly string[]>>
  /** Ids of the inverters that form the island. */
  readonly sources: readonly string[]
}

/**
 * What sees a fault to earth at a node and cuts it off: the residual-current devices on its route, then the circuit
 * itself where its own device has residual-current protection. A device counts in a state only
 * - while some link between neutral and earth is closed then (otherwise a first fault drives no current);
 * - in the island, while it lies between the island's inverters and the fault: the route of an inverter that is fed in
 *   below the device bypasses it;
 * - in the island, while every closed link lies on its source side: below the device, the fault current returns
 *   through the link without passing the device.
 *
 * Source: the link belongs on the source side of the device, without any link the device cannot act (article on earthing
 * of island inverters, January 2022); devices must work in both states (Energy Safe Victoria, EIS 004); the rest follows
 * from the wiring (own derivation).
 */
export function residualProtection(id: string, state: State, wiring: Wiring): string[] {
  const { install, nodes, routeIn, neutralEarthLinks, sources } = wiring
  const route = routeIn(id, state)
  const links = neutralEarthLinks[state]
  if (route.length === 0 || links.length === 0) return []
  const beyond = state === 'island' ? [...sources, ...links] : []
  const bypassed = (device: string) => beyond.some((holder) => nodes.get(holder)?.route.includes(device))
  const devices = route
    .filter((node) => node.kind === 'residual-current device' && !bypassed(node.id))
    .map((node) => node.id)
  return install.circuits?.[id]?.residual_current ? [...devices, id] : devices
}
