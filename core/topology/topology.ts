import type { Line, Path, State } from '#core/glossary.ts'

export type NodeKind =
  | 'supply'
  | 'board'
  | 'overcurrent device'
  | 'changeover'
  | 'residual-current device'
  | 'inverter'
  | 'circuit'

/** One thing in the tree of supply. */
export interface TopologyNode {
  readonly id: string
  readonly kind: NodeKind
  /** Where it stands in the file. */
  readonly path: Path
  /** The node that feeds it on the grid; none for the supply. */
  readonly parent: TopologyNode | undefined
  readonly children: readonly TopologyNode[]
  /** True below the changeover: on its backed-up side. */
  readonly backedUp: boolean
  /** Ids of everything from the supply down to this node, the supply first, the node itself last. */
  readonly route: readonly string[]
}

/** The building as a tree by `fed_from`, and what follows from it in both states. */
export interface Topology {
  readonly supply: TopologyNode
  /** By id; what feeds stands before what it feeds. */
  readonly nodes: ReadonlyMap<string, TopologyNode>
  /** Whether the node is live in the state: everything on the grid, the changeover and its backed-up side in the island. */
  readonly live: (id: string, state: State) => boolean
  /** Nodes from the source of the state down to `id`: in the island they start at the changeover. Empty where it is dead. */
  readonly routeIn: (id: string, state: State) => readonly TopologyNode[]
  /** Links between neutral and earth that are closed in the state, by the id of what carries each. */
  readonly neutralEarthLinks: Readonly<Record<State, readonly string[]>>
  /** Ids of what would join the island to the grid while the changeover is open. */
  readonly islandJoins: readonly string[]
  /** Circuits below a node, by line. */
  readonly circuitsBelow: (id: string) => readonly string[]
  /** Circuits that live on in the island, and circuits that are dead in it. */
  readonly circuits: { readonly backedUp: readonly string[]; readonly gridOnly: readonly string[] }
  /** Overcurrent devices of the tree above a node, the nearest first; the main protection of the supply is not among them. */
  readonly overcurrentAbove: (id: string) => readonly string[]
  /** What sees a fault to earth at `id` in the state: residual-current devices and the circuit itself where its device is one. */
  readonly residualProtection: (id: string, state: State) => readonly string[]
  readonly inverters: {
    /** Backed-up inverters that can form an island. */
    readonly island: readonly string[]
    /** Backed-up inverters that only follow the island's voltage. */
    readonly following: readonly string[]
    readonly gridOnly: readonly string[]
  }
  readonly lines: readonly Line[]
}
