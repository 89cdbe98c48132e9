import type { State } from '#core/glossary.ts'
import type { Install, NeutralLink } from '#core/install.ts'
import type { TopologyNode } from './topology.ts'

interface Holder {
  readonly id: string
  readonly link: NeutralLink
  /** Connected to the neutral of the backed-up side whatever the changeover does. */
  readonly backedUp: boolean
}

/**
 * Whether the changeover opens the neutral together with the lines: it then has a pole more than the supply has line
 * conductors (four on three-phase, two on single-phase).
 */
export function neutralSwitched(install: Install): boolean {
  return install.changeover.poles > install.supply.nominal.phases
}

/**
 * The links between neutral and earth that are closed in each state and connected to the neutral that is in use then.
 * Exactly one is wanted in each state: with none, residual-current devices cannot act on a first fault; with two, load
 * current runs in the protective conductors.
 *
 * | link | on the grid | in the island, neutral switched | in the island, neutral continuous |
 * | --- | --- | --- | --- |
 * | the distributor's (TN-S, TN-C-S, TT) | counts | cut off | counts |
 * | `fixed`, changeover, board or inverter on the backed-up side | counts | counts | counts |
 * | `fixed`, board upstream of the changeover or past it on the grid side | counts | cut off | counts |
 * | `closes in island`, on the backed-up side | open | counts | counts |
 * | `closes in island`, on the grid side | open | cut off | counts |
 * | `none`, or an inverter that does not form the island | – | – | – |
 *
 * In TN-C-S the distributor's link is the point where the combined conductor is split. It is not stated again as the
 * link of the main board: a board's link is one more.
 *
 * Source: IET Wiring Matters 84 (March 2021), island mode earthing arrangements: live conductors with the neutral are
 * disconnected from the grid, the link closes by a relay in the island only, two links at once are forbidden;
 * IEC 60364-5-55, 551.4.3.2.1, as quoted there. Neutral kept continuous: AS/NZS 3000:2018, 7.3.8.1.2, in Energy Safe
 * Victoria EIS 004. The rows for links on boards follow from the wiring (own derivation).
 *
 * @param island ids of the inverters that form the island
 */
export function neutralEarthLinks(
  install: Install,
  nodes: ReadonlyMap<string, TopologyNode>,
  island: readonly string[],
): Record<State, string[]> {
  const holders: Holder[] = [{ id: 'supply', link: 'fixed', backedUp: false }, ...stated(install, nodes, island)]
  const cutOff = neutralSwitched(install)
  const closed = holders.filter(({ link }) => link !== 'none')
  return {
    grid: closed.filter(({ link }) => link === 'fixed').map(({ id }) => id),
    island: closed.filter(({ backedUp }) => backedUp || !cutOff).map(({ id }) => id),
  }
}

function stated(install: Install, nodes: ReadonlyMap<string, TopologyNode>, island: readonly string[]): Holder[] {
  const { changeover, boards = {}, inverters = {} } = install
  const links: [string, NeutralLink | undefined][] = [
    ...Object.entries(boards).map(([id, board]): [string, NeutralLink | undefined] => [id, board.neutral_link]),
    ...island.map((id): [string, NeutralLink | undefined] => [id, inverters[id]?.neutral_link]),
  ]
  return [
    // The changeover's own link sits at its backed-up terminals.
    { id: changeover.id, link: changeover.neutral_link, backedUp: true },
    ...links.map(([id, link = 'none']) => ({ id, link, backedUp: nodes.get(id)?.backedUp === true })),
  ]
}
