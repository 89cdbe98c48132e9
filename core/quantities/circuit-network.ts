import { LINES, type Line } from '#core/glossary.ts'
import type { Cable, Device } from '#core/install.ts'
import type { Topology, TopologyNode } from '#core/topology/topology.ts'
import { circuitDesignCurrent } from './circuit-design-current.ts'
import { upstreamDevice } from './overcurrent-upstream.ts'
import type { Scene } from './quantity.ts'
import { type Current, splitCurrent } from './voltage-drop.ts'

/** What the circuits below a node draw together on one line, A. */
export interface LineLoad extends Current {
  /** Sum of the design currents, whatever their power factor */
  readonly current: number
}
type LineLoads = Partial<Record<Line, LineLoad>>

const NOTHING: LineLoad = { current: 0, active: 0, reactive: 0 }

// A file has up to a thousand circuits, each asking for the load of every cable above it: summed once for each tree.
const summed = new WeakMap<Topology, ReadonlyMap<string, LineLoads>>()

function add(loads: LineLoads, line: Line, more: LineLoad): void {
  const { current, active, reactive } = loads[line] ?? NOTHING
  loads[line] = { current: current + more.current, active: active + more.active, reactive: reactive + more.reactive }
}

function ownLoad(id: string, { install }: Scene): LineLoads {
  const circuit = install.circuits?.[id]
  const current = circuit && circuitDesignCurrent(circuit, install.supply.nominal.voltage)
  if (circuit === undefined || current === undefined) return {}
  const load = { current, ...splitCurrent(current, circuit.load?.power_factor ?? 1) }
  return Object.fromEntries(circuit.phases.map((line) => [line, load]))
}

function sumLoads(scene: Scene): ReadonlyMap<string, LineLoads> {
  const sums = new Map<string, LineLoads>()
  // What feeds stands before what it feeds, so backwards every branch is summed before what feeds it.
  for (const node of [...scene.topology.nodes.values()].reverse()) {
    const sum = ownLoad(node.id, scene)
    for (const child of node.children) {
      for (const line of LINES) add(sum, line, sums.get(child.id)?.[line] ?? NOTHING)
    }
    sums.set(node.id, sum)
  }
  return sums
}

/** Loads of the circuits below a node, by line. */
export function loadsByLine(id: string, scene: Scene): LineLoads {
  let sums = summed.get(scene.topology)
  if (!sums) {
    sums = sumLoads(scene)
    summed.set(scene.topology, sums)
  }
  return sums.get(id) ?? {}
}

/**
 * Load of the most loaded line at a node: the sum over the circuits below it whose load is stated. Currents are added
 * by their size on each line (no diversity, no displacement between power factors in `current`).
 */
export function mostLoadedLine(id: string, scene: Scene): LineLoad {
  const loads = Object.values(loadsByLine(id, scene))
  return loads.reduce((most, load) => (load.current > most.current ? load : most), NOTHING)
}

/** The overcurrent device that limits what a node's cable can carry for long: its own for an overcurrent device, else the nearest above. */
export function protectingDevice(node: TopologyNode, scene: Scene): Device {
  const own = node.kind === 'overcurrent device' ? scene.install.overcurrent?.[node.id]?.device : undefined
  return own ?? upstreamDevice(node.id, scene)
}

/**
 * The cable of a node of the tree: what leads to a board, a changeover or a residual-current device, and what leaves
 * an overcurrent device. A circuit's cable leaves its own device. An inverter's cable carries no load of a circuit.
 */
export function cableOf(node: TopologyNode, { install }: Scene): Cable | undefined {
  switch (node.kind) {
    case 'supply':
      return undefined
    case 'board':
      return install.boards?.[node.id]?.cable
    case 'overcurrent device':
      return install.overcurrent?.[node.id]?.cable
    case 'changeover':
      return install.changeover.cable
    case 'residual-current device':
      return install.residual_current?.[node.id]?.cable
    case 'inverter':
      return install.inverters?.[node.id]?.cable
    case 'circuit':
      return install.circuits?.[node.id]?.cable
  }
}
