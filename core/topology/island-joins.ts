import type { Install } from '#core/install.ts'
import { feederId } from './feeders.ts'
import type { TopologyNode } from './topology.ts'

/**
 * What would join the island to the grid while the changeover is open:
 * - the changeover itself, when it has fewer poles than the supply has line conductors, so that a line stays through;
 * - a link beside the tree (a service bypass) between the backed-up and the grid side that is closed, or that nothing
 *   keeps open while the island runs (`interlocked: false`).
 *
 * A link's end that names the changeover means its backed-up side, as in `fed_from`.
 * Source: no parallel connection with the public supply, IEC 60364-5-55, 551.6.1 (from memory).
 */
export function islandJoins(install: Install, nodes: ReadonlyMap<string, TopologyNode>): string[] {
  const { changeover, supply, links = {} } = install
  const inIsland = (name: string) => {
    const node = nodes.get(feederId(name, install))
    return node !== undefined && (node.backedUp || node.kind === 'changeover')
  }
  const bypasses = Object.entries(links)
    .filter(([, { from, to }]) => inIsland(from) !== inIsland(to))
    .filter(([, { position, interlocked }]) => position === 'closed' || !interlocked)
    .map(([id]) => id)
  return changeover.poles < supply.nominal.phases ? [changeover.id, ...bypasses] : bypasses
}
