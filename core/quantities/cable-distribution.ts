import type { Cable } from '#core/install.ts'
import type { TopologyNode } from '#core/topology/topology.ts'
import { cableCapacity, tabulatedCapacity } from './capacity.ts'
import { cableOf } from './circuit-network.ts'
import type { Quantity, Scene } from './quantity.ts'
import { carriesThreeLines, distributionCurrent, distributionDrop } from './voltage-drop-route.ts'

function loadedConductors(cable: Cable, scene: Scene): 2 | 3 {
  return carriesThreeLines(cable, scene) ? 3 : 2
}

/** Nodes whose cables a node's overcurrent device protects: itself and everything below, down to the next device or circuit. */
export function protectedNodes(id: string, { topology }: Scene): readonly TopologyNode[] {
  const found = [topology.nodes.get(id)].filter((node) => node !== undefined)
  // Grows while it is walked, so that it reaches all the way down.
  for (const { children } of found) {
    found.push(...children.filter(({ kind }) => kind !== 'overcurrent device' && kind !== 'circuit'))
  }
  return found
}

/** Ids of the nodes whose cables a node's overcurrent device protects. */
export function cablesProtected(id: string, scene: Scene): string[] {
  return protectedNodes(id, scene)
    .filter((node) => cableOf(node, scene))
    .map((node) => node.id)
}

/** Smallest capacity Iz (A) of the cables that a node's overcurrent device protects; undefined where there is none, or one that cannot be told. */
export function smallestCapacity(id: string, scene: Scene): number | undefined {
  const cables = protectedNodes(id, scene).flatMap((node) => cableOf(node, scene) ?? [])
  const capacities = cables.map((cable) => cableCapacity(cable, loadedConductors(cable, scene)))
  const known = capacities.filter((capacity) => capacity !== undefined)
  return known.length === 0 || known.length < capacities.length ? undefined : Math.min(...known)
}

/**
 * The quantities of a distribution cable, for any kind of subject that carries one.
 *
 * @param idOf the subject's id in the tree of supply
 */
export function distributionCableQuantities<Item>(idOf: (item: Item) => string): Quantity<Item>[] {
  const node = (item: Item, { topology }: Scene) => topology.nodes.get(idOf(item))
  const withCable = <Value>(
    item: Item,
    scene: Scene,
    compute: (cable: Cable, node: TopologyNode) => Value | undefined,
  ): Value | undefined => {
    const at = node(item, scene)
    const cable = at && cableOf(at, scene)
    return at && cable ? compute(cable, at) : undefined
  }
  const drop = (item: Item, scene: Scene) => withCable(item, scene, (_cable, at) => distributionDrop(at, scene))
  return [
    {
      name: 'cable_current',
      unit: 'A',
      title: 'Current of its cable',
      formula:
        'Σ design currents below on the most loaded line, at most the rating of the device that protects the cable',
      source: 'own choice, without diversity',
      from: ['circuits', 'fed_from', 'cable'],
      compute: (item, scene) => withCable(item, scene, (_cable, at) => distributionCurrent(at, scene).current),
    },
    {
      name: 'cable_tabulated_capacity',
      unit: 'A',
      title: 'Capacity of its cable by the table',
      formula: 'table of insulation, count of loaded conductors, size and reference method',
      source: 'IEC 60364-5-52:2009, Tables B.52.2 to B.52.5, as transcribed',
      from: ['cable'],
      compute: (item, scene) =>
        withCable(item, scene, (cable) => tabulatedCapacity(cable, loadedConductors(cable, scene))),
    },
    {
      name: 'cable_capacity',
      unit: 'A',
      title: 'Capacity of its cable as installed Iz',
      formula: 'It × Ca × Cg',
      source: 'IEC 60364-5-52, 523',
      from: ['cable'],
      compute: (item, scene) => withCable(item, scene, (cable) => cableCapacity(cable, loadedConductors(cable, scene))),
    },
    {
      name: 'cable_voltage_drop',
      unit: 'V',
      title: 'Voltage drop along its cable',
      formula: 'b · (ρ1 · L/S · I·cosφ + λ · L · I·sinφ), b = 1 on three lines, 2 otherwise',
      source: 'IEC 60364-5-52:2009, Annex G, as printed by S. Fassbinder, ep Elektropraktiker',
      from: ['cable', 'cable_current'],
      compute: drop,
    },
    {
      name: 'cable_voltage_drop_percent',
      unit: '%',
      title: 'Voltage drop along its cable, in % of the nominal voltage',
      formula: '100 · u / U0',
      source: 'IEC 60364-5-52:2009, Annex G',
      from: ['cable_voltage_drop', 'supply.nominal.voltage'],
      compute: (item, scene) => {
        const volts = drop(item, scene)
        return volts === undefined ? undefined : (100 * volts) / scene.install.supply.nominal.voltage
      },
    },
  ]
}
