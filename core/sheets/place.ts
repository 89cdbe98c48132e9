import type { Scene } from '#core/quantities/quantity.ts'
import type { TopologyNode } from '#core/topology/topology.ts'

/** The node of the tree under a name, or undefined for a name that stands outside the tree. */
export function fromTree(id: string, { topology }: Scene): TopologyNode | undefined {
  return topology.nodes.get(id)
}
