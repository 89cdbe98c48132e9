import type { Circuit, Install } from '#core/install.ts'
import type { Topology, TopologyNode } from '#core/topology/topology.ts'
import { cableName, deviceName } from '../devices.ts'

/** One thing of the diagram with what hangs on it. */
export type Part = Single | Gathered

interface Single extends Common {
  readonly kind: Exclude<PartKind, 'circuits'>
}

/** Several circuits in one row. */
interface Gathered extends Common {
  readonly kind: 'circuits'
  readonly words: string
}

interface Common {
  readonly id: string
  readonly children: readonly Part[]
  /** Carries a link between neutral and earth of its own, which hangs below it. */
  readonly linked?: true
  /** A cable of its own is named below its ratings. */
  readonly cabled?: true
}

export type PartKind = TopologyNode['kind'] | 'meter' | 'main protection' | 'array' | 'battery' | 'link' | 'circuits'

/** Up to this many circuits each get a row of their own. */
const SINGLY = 60

const sameBuild = ({ device, cable, phases }: Circuit): string =>
  `${deviceName(device)}, ${cableName(cable)}, ${phases.length === 3 ? 'three lines' : 'one line'}`

function gathered(ids: readonly string[], install: Install, whole: boolean): Part[] {
  const groups = new Map<string, string[]>()
  for (const id of ids) {
    const circuit = install.circuits?.[id]
    const key = whole || !circuit ? '' : sameBuild(circuit)
    groups.set(key, [...(groups.get(key) ?? []), id])
  }
  return [...groups].map(([key, members]) => {
    const [first = '', last = ''] = [members[0], members.at(-1)]
    const names = members.length === 1 ? first : `${first} … ${last}`
    const count = members.length === 1 ? '1 circuit' : `${members.length} circuits`
    return {
      id: first,
      kind: 'circuits',
      children: [],
      words: [count, key, names].filter((word) => word !== '').join(' · '),
    }
  })
}

/** How circuits are shown: each alone, those of one build together, or all of one feeder together. */
type Gathering = 'each' | 'by build' | 'by feeder'

function gatheringOf(install: Install): Gathering {
  const circuits = Object.values(install.circuits ?? {})
  if (circuits.length <= SINGLY) return 'each'
  const builds = new Set(circuits.map((circuit) => `${circuit.fed_from} ${sameBuild(circuit)}`))
  return builds.size <= SINGLY ? 'by build' : 'by feeder'
}

interface Plan {
  readonly install: Install
  readonly gathering: Gathering
}

/** Circuits first, then what leads on, inverters last: the way down the page is the way down the building. */
const ORDER: readonly PartKind[] = [
  'circuit',
  'circuits',
  'board',
  'overcurrent device',
  'residual-current device',
  'changeover',
  'inverter',
  'link',
]

function childrenOf(node: TopologyNode, plan: Plan): Part[] {
  const { install, gathering } = plan
  const circuits = node.children.filter(({ kind }) => kind === 'circuit').map(({ id }) => id)
  const rows: Part[] =
    gathering === 'each'
      ? circuits.map((id) => ({ id, kind: 'circuit', children: [] }))
      : gathered(circuits, install, gathering === 'by feeder')
  const others = node.children.filter(({ kind }) => kind !== 'circuit').map((child) => partOf(child, plan))
  const links = Object.entries(install.links ?? {})
    .filter(([, { from }]) => from === node.id)
    .map(([id]): Part => ({ id, kind: 'link', children: [] }))
  return [...rows, ...others, ...links].toSorted((a, b) => ORDER.indexOf(a.kind) - ORDER.indexOf(b.kind))
}

function sourcesOf(id: string, { arrays = {}, batteries = {} }: Install): Part[] {
  const into = (all: Readonly<Record<string, { readonly into: string }>>, kind: 'array' | 'battery'): Part[] =>
    Object.entries(all)
      .filter(([, source]) => source.into === id)
      .map(([name]) => ({ id: name, kind, children: [] }))
  return [...into(arrays, 'array'), ...into(batteries, 'battery')]
}

function partOf(node: TopologyNode, plan: Plan): Part {
  const { id, kind } = node
  const children = kind === 'inverter' ? sourcesOf(id, plan.install) : childrenOf(node, plan)
  const { boards, inverters, overcurrent, residual_current } = plan.install
  const cable = (kind === 'overcurrent device' ? overcurrent : residual_current)?.[id]?.cable
  const link = (kind === 'inverter' ? inverters?.[id] : boards?.[id])?.neutral_link ?? 'none'
  return { id, kind, children, ...(link !== 'none' && { linked: true }), ...(cable && { cabled: true }) }
}

/** The parts of the diagram from the supply on: the meter and the main protection stand before the first board. */
export function partsOf(install: Install, topology: Topology): Part {
  const children = childrenOf(topology.supply, { install, gathering: gatheringOf(install) })
  const main: Part = { id: 'main protection', kind: 'main protection', children }
  const metered: Part = install.meter ? { id: install.meter.id, kind: 'meter', children: [main] } : main
  return { id: 'supply', kind: 'supply', children: [metered] }
}

/** How many rows of circuits the diagram has. */
export function rowCount({ kind, children }: Part): number {
  const own = kind === 'circuit' || kind === 'circuits' ? 1 : 0
  return children.reduce((sum, child) => sum + rowCount(child), own)
}
