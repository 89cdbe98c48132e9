import type { Install } from '#core/install.ts'
import type { TreeEntry } from './entries.ts'
import { feederId } from './feeders.ts'
import type { TopologyNode } from './topology.ts'

interface Growing extends TopologyNode {
  readonly children: Growing[]
}

/**
 * The tree of supply, grown from the supply downwards, breadth first, so that the map holds what feeds before what it
 * feeds. Siblings keep the order of `entries`. Time and memory grow linearly with the count of entries at a given depth.
 *
 * @param entries the tree's entries without dangling names, duplicates or loops, the supply first
 */
export function growTree(
  entries: readonly TreeEntry[],
  install: Install,
): { root: TopologyNode; nodes: Map<string, TopologyNode> } {
  const fedBy = new Map<string, TreeEntry[]>()
  for (const entry of entries) {
    if (entry.fedFrom === undefined) continue
    const feeder = feederId(entry.fedFrom, install)
    const siblings = fedBy.get(feeder)
    if (siblings) siblings.push(entry)
    else fedBy.set(feeder, [entry])
  }
  const root: Growing = {
    id: 'supply',
    kind: 'supply',
    path: ['supply'],
    parent: undefined,
    children: [],
    backedUp: false,
    route: ['supply'],
  }
  const nodes = new Map<string, Growing>([[root.id, root]])
  // A Map's iterator also meets what is added on the way, so this walks the whole tree.
  for (const parent of nodes.values()) {
    for (const { id, kind, path } of fedBy.get(parent.id) ?? []) {
      const backedUp = parent.backedUp || parent.kind === 'changeover'
      const node: Growing = { id, kind, path, parent, children: [], backedUp, route: [...parent.route, id] }
      parent.children.push(node)
      nodes.set(id, node)
    }
  }
  return { root, nodes }
}
