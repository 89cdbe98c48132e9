import type { State } from '#core/glossary.ts'
import type { TopologyNode } from '#core/topology/topology.ts'
import { lineAndReturn } from './cable-resistance.ts'
import { cableOf } from './circuit-network.ts'
import { usable } from './loop-reading.ts'
import type { Scene } from './quantity.ts'

function sumOver(
  nodes: readonly TopologyNode[],
  resistance: (node: TopologyNode) => number | undefined,
): number | undefined {
  let sum = 0
  for (const node of nodes) {
    const more = resistance(node)
    if (more === undefined) return undefined
    sum += more
  }
  return sum
}

function earthReturn(node: TopologyNode, scene: Scene): number | undefined {
  const cable = cableOf(node, scene)
  return cable ? lineAndReturn(cable, 'protective') : 0
}

/**
 * Fault-loop impedance in Ω to be expected at the end of a node's cable on the grid, cold: Ze + Σ(R1 + R2) of every
 * cable on its route. Undefined where Ze is not read, or a cable has no length or protective conductor stated.
 *
 * @source Zs = Ze + (R1 + R2), IET guidance for verification, as quoted in three trade texts
 */
export function loopExpected(id: string, scene: Scene): number | undefined {
  const external = usable(scene.install.supply.loop_impedance)
  const inside = sumOver(scene.topology.routeIn(id, 'grid'), (node) => earthReturn(node, scene))
  return external === undefined || inside === undefined ? undefined : external + inside
}

/**
 * Resistance in Ω of the conductors in the island's fault loop, cold: Σ(R1 + R2) from the changeover to the end of the
 * node's cable, and the longest way through an inverter's own cable. The changeover's cable lies on the grid side.
 *
 * @returns undefined where the node is dead in the island or a cable is not fully described
 */
export function islandConductors(id: string, scene: Scene): number | undefined {
  const { install, topology } = scene
  const route = topology.routeIn(id, 'island')
  const inside = sumOver(route.slice(1), (node) => earthReturn(node, scene))
  if (route.length === 0 || inside === undefined) return undefined
  let feeding = 0
  for (const source of topology.inverters.island) {
    const cable = install.inverters?.[source]?.cable
    const resistance = cable ? lineAndReturn(cable, 'protective') : 0
    if (resistance === undefined) return undefined
    feeding = Math.max(feeding, resistance)
  }
  return inside + feeding
}

/**
 * Resistance in Ω between the origin and a device, for the largest fault current there: line and the better of the two
 * returns (neutral or protective) of every cable above. The cable that leaves the device itself is not in it.
 */
export function resistanceToDevice(id: string, scene: Scene): number | undefined {
  return sumOver(scene.topology.routeIn(id, 'grid').slice(0, -1), (node) => {
    const cable = cableOf(node, scene)
    if (!cable) return 0
    const returns = [lineAndReturn(cable, 'neutral'), lineAndReturn(cable, 'protective')]
    const known = returns.filter((resistance) => resistance !== undefined)
    return known.length === 0 ? undefined : Math.min(...known)
  })
}

/** The loop reading (Ω) of a circuit in a state, where one was taken inside the instrument's range. */
export function loopReading(id: string, state: State, { install }: Scene): number | undefined {
  return usable(install.readings?.circuits?.[id]?.loop?.[state])
}
