import type { Cable, Circuit } from '#core/install.ts'
import type { TopologyNode } from '#core/topology/topology.ts'
import { connectionOf } from './circuit-design-current.ts'
import { cableOf, mostLoadedLine, protectingDevice } from './circuit-network.ts'
import type { Scene } from './quantity.ts'
import { type Current, splitCurrent, voltageDrop } from './voltage-drop.ts'

function drop(cable: Cable, sizes: readonly number[], current: Current, { parameters }: Scene): number | undefined {
  if (cable.length === undefined) return undefined
  const resistivity = cable.material === 'copper' ? parameters.copper_resistivity : parameters.aluminium_resistivity
  const stretch = { length: cable.length, sizes, resistivity, reactance: parameters.conductor_reactance }
  return voltageDrop(stretch, current)
}

/** Voltage drop in V along a circuit's own cable at its design current (A); undefined where no length is stated. */
export function circuitDrop(circuit: Circuit, designCurrent: number, scene: Scene): number | undefined {
  const { cable, load } = circuit
  const current = splitCurrent(designCurrent, load?.power_factor ?? 1)
  switch (connectionOf(circuit)) {
    case 'three lines':
      return drop(cable, [cable.line], current, scene)
    case 'line to line':
      return drop(cable, [cable.line, cable.line], current, scene)
    default:
      return drop(cable, [cable.line, cable.neutral ?? cable.line], current, scene)
  }
}

/** A circuit's drop in % of the voltage that its load works with: U0, or √3·U0 between two lines. */
export function circuitDropPercent(circuit: Circuit, volts: number, voltage: number): number {
  const reference = connectionOf(circuit) === 'line to line' ? Math.sqrt(3) * voltage : voltage
  return (100 * volts) / reference
}

/** Whether a distribution cable carries all three lines: on a three-phase supply, with four cores or more. */
export function carriesThreeLines(cable: Cable, { install }: Scene): boolean {
  return install.supply.nominal.phases === 3 && cable.cores >= 4
}

/**
 * The current that a distribution cable is taken to carry, A: the sum of the stated design currents of the circuits
 * below on the most loaded line, without diversity, but no more than the device that protects the cable lets through.
 */
export function distributionCurrent(node: TopologyNode, scene: Scene): Current & { readonly current: number } {
  const { current, active, reactive } = mostLoadedLine(node.id, scene)
  const { rated } = protectingDevice(node, scene)
  const share = current > rated ? rated / current : 1
  return { current: current * share, active: active * share, reactive: reactive * share }
}

/**
 * Voltage drop in V along a node's cable at `distributionCurrent`, as Annex G has it: a three-phase cable is taken as
 * balanced at its most loaded line (b = 1), a single-phase one has line and neutral (b = 2). The parts of each load's
 * current in phase and out of phase are added apart.
 *
 * @returns 0 for a node without a cable, undefined for a cable of unknown length
 * @source IEC 60364-5-52:2009, Annex G
 */
export function distributionDrop(node: TopologyNode, scene: Scene): number | undefined {
  const cable = cableOf(node, scene)
  if (!cable) return 0
  const sizes = carriesThreeLines(cable, scene) ? [cable.line] : [cable.line, cable.neutral ?? cable.line]
  return drop(cable, sizes, distributionCurrent(node, scene), scene)
}

/** Voltage drop in % of U0 from the origin down to and along the cables of all nodes above `id`; undefined where a length is missing. */
export function dropAbove(id: string, scene: Scene): number | undefined {
  let sum = 0
  for (const node of scene.topology.routeIn(id, 'grid').slice(0, -1)) {
    const volts = distributionDrop(node, scene)
    if (volts === undefined) return undefined
    sum += volts
  }
  return (100 * sum) / scene.install.supply.nominal.voltage
}
