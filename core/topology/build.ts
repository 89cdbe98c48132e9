import { LINES, type Problem, type State } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import { askedOnce } from './by-state.ts'
import { circuitsBelow } from './circuits-below.ts'
import { duplicateNames } from './duplicates.ts'
import { otherEntries, treeEntries } from './entries.ts'
import { feederProblems } from './feeders.ts'
import { islandJoins } from './island-joins.ts'
import { loops } from './loops.ts'
import { neutralEarthLinks } from './neutral-earth-links.ts'
import { referenceProblems } from './references.ts'
import { residualProtection } from './residual-protection.ts'
import type { Topology, TopologyNode } from './topology.ts'
import { growTree } from './tree.ts'

/**
 * The tree of supply of a normalised install file, and every reference that leads nowhere.
 *
 * @returns `problems`: duplicate and dangling names, things fed from what feeds nothing, rings, surplus readings, each
 * at its place in the file. `topology` is undefined when the tree itself could not be grown; a bad reference beside the
 * tree (an instrument, say) leaves it standing.
 */
export function buildTopology(install: Install): { topology: Topology | undefined; problems: Problem[] } {
  const tree = treeEntries(install)
  const all = [...tree, ...otherEntries(install)]
  const beside = referenceProblems(install, new Set(tree.map(({ id }) => id)))
  const duplicates = duplicateNames(all, install.changeover.id)
  // Rings can be told only where every name means one thing.
  const rings = duplicates.length > 0 ? [] : loops(tree, install)
  const broken = [...duplicates, ...feederProblems(all, install), ...rings]
  if (broken.length > 0) return { topology: undefined, problems: [...broken, ...beside] }
  const { root, nodes } = growTree(tree, install)
  return { topology: topologyOf(install, root, nodes), problems: beside }
}

function topologyOf(install: Install, supply: TopologyNode, nodes: ReadonlyMap<string, TopologyNode>): Topology {
  const changeover = install.changeover.id
  const inverters = sortInverters(install, nodes)
  const links = neutralEarthLinks(install, nodes, inverters.island)

  const live = (id: string, state: State): boolean => {
    const node = nodes.get(id)
    if (!node) return false
    return state === 'grid' || node.backedUp || node.kind === 'changeover'
  }
  const routeIn = askedOnce((id, state): readonly TopologyNode[] => {
    const route: TopologyNode[] = []
    if (!live(id, state)) return route
    for (let node = nodes.get(id); node; node = node.parent) {
      route.push(node)
      if (state === 'island' && node.id === changeover) break
    }
    return route.reverse()
  })
  const wiring = { install, nodes, routeIn, neutralEarthLinks: links, sources: inverters.island }
  const below = circuitsBelow(supply)
  const isBackedUp = (id: string) => live(id, 'island')
  return {
    supply,
    nodes,
    live,
    routeIn,
    neutralEarthLinks: links,
    islandJoins: islandJoins(install, nodes),
    circuitsBelow: below,
    circuits: { backedUp: below(changeover), gridOnly: below(supply.id).filter((id) => !isBackedUp(id)) },
    overcurrentAbove: (id) => overcurrentAbove(nodes.get(id)),
    residualProtection: askedOnce((id, state) => residualProtection(id, state, wiring)),
    inverters,
    lines: LINES.slice(0, install.supply.nominal.phases),
  }
}

function overcurrentAbove(node: TopologyNode | undefined): string[] {
  const found: string[] = []
  for (let above = node?.parent; above; above = above.parent) {
    if (above.kind === 'overcurrent device') found.push(above.id)
  }
  return found
}

/**
 * Inverters by side. Of the backed-up ones those that state `island` form it; where none states it, none can be told
 * apart and all are taken to form it.
 */
function sortInverters(install: Install, nodes: ReadonlyMap<string, TopologyNode>): Topology['inverters'] {
  const inverters = Object.entries(install.inverters ?? {})
  const gridOnly = inverters.filter(([id]) => !nodes.get(id)?.backedUp)
  const backedUp = inverters.filter(([id]) => nodes.get(id)?.backedUp)
  const stated = backedUp.filter(([, { island }]) => island)
  const forming = stated.length > 0 ? stated : backedUp
  const ids = (list: typeof inverters) => list.map(([id]) => id)
  return {
    island: ids(forming),
    following: ids(backedUp.filter((inverter) => !forming.includes(inverter))),
    gridOnly: ids(gridOnly),
  }
}
