import type { TopologyNode } from '#core/topology/topology.ts'

/** A node of the diagram with its place: columns run from the supply to the loads, rows from top to bottom. */
export interface Placed {
  readonly node: TopologyNode
  readonly column: number
  readonly row: number
  readonly children: readonly Placed[]
  /** More circuits than are drawn one by one: how many this one stands for. */
  readonly stands: number
}

/** Circuits below one board that are drawn one by one; more are drawn as one with their count. */
const MOST_CIRCUITS = 14

interface Rows {
  next: number
}

function grouped(children: readonly TopologyNode[]): {
  readonly shown: readonly TopologyNode[]
  readonly rest: number
} {
  const circuits = children.filter(({ kind }) => kind === 'circuit')
  if (circuits.length <= MOST_CIRCUITS) return { shown: children, rest: 0 }
  const kept = new Set(circuits.slice(0, MOST_CIRCUITS))
  return {
    shown: children.filter((child) => child.kind !== 'circuit' || kept.has(child)),
    rest: circuits.length - MOST_CIRCUITS,
  }
}

function place(node: TopologyNode, column: number, rows: Rows, stands: number): Placed {
  const { shown, rest } = grouped(node.children)
  const last = shown.findLastIndex(({ kind }) => kind === 'circuit')
  const children = shown.map((child, index) => place(child, column + 1, rows, index === last ? rest : 0))
  const [first] = children
  const end = children.at(-1)
  if (!first || !end) {
    const row = rows.next
    rows.next += 1
    return { node, column, row, children, stands }
  }
  return { node, column, row: first.row, children, stands }
}

/** Places a tree: each leaf has a row of its own, each node stands level with its first child. */
export function placeTree(root: TopologyNode): {
  readonly root: Placed
  readonly rows: number
  readonly columns: number
} {
  const rows: Rows = { next: 0 }
  const placed = place(root, 0, rows, 0)
  return { root: placed, rows: rows.next, columns: deepest(placed) + 1 }
}

function deepest({ column, children }: Placed): number {
  return children.reduce((most, child) => Math.max(most, deepest(child)), column)
}

/** Every placed node, from the supply on. */
export function flat(placed: Placed): Placed[] {
  return [placed, ...placed.children.flatMap(flat)]
}
