import type { TopologyNode } from './topology.ts'

/**
 * Circuits below each node, in the order of the tree (depth first). All lists are stretches of one list of circuits,
 * cut out when first asked for, so that a file with a thousand circuits is walked once.
 *
 * @returns a function from an id to the ids of its circuits; a circuit's own id for a circuit, nothing for an unknown id
 */
export function circuitsBelow(root: TopologyNode): (id: string) => readonly string[] {
  const circuits: string[] = []
  const starts = new Map<string, number>()
  const ends = new Map<string, number>()
  const stack: { node: TopologyNode; leaving: boolean }[] = [{ node: root, leaving: false }]
  for (let step = stack.pop(); step; step = stack.pop()) {
    const { node, leaving } = step
    if (leaving) {
      ends.set(node.id, circuits.length)
      continue
    }
    starts.set(node.id, circuits.length)
    if (node.kind === 'circuit') circuits.push(node.id)
    stack.push({ node, leaving: true })
    for (const child of node.children.toReversed()) stack.push({ node: child, leaving: false })
  }
  const cut = new Map<string, readonly string[]>()
  return (id) => {
    const known = cut.get(id)
    if (known) return known
    const below = circuits.slice(starts.get(id) ?? 0, ends.get(id) ?? 0)
    cut.set(id, below)
    return below
  }
}
