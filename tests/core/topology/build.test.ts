import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Circuit, Install } from '#core/install.ts'
import { buildTopology } from '#core/topology/build.ts'
import type { Topology } from '#core/topology/topology.ts'
import { bakery, plainCircuit } from './bakery.ts'

function tree(install: Install): Topology {
  const { topology, problems } = buildTopology(install)
  expect(problems).toEqual([])
  if (!topology) throw new Error('no tree of supply')
  return topology
}

const ids = (nodes: readonly { readonly id: string }[]) => nodes.map(({ id }) => id)

describe('the tree of supply', () => {
  test('a backed-up circuit hangs below the changeover, a grid-only one beside it', () => {
    const { nodes } = tree(bakery)
    expect(nodes.get('K1')).toMatchObject({ kind: 'circuit', backedUp: true, path: ['circuits', 'K1'] })
    expect(nodes.get('K1')?.route).toEqual(['supply', 'MB', 'F35', 'CO', 'RCD1', 'EB', 'K1'])
    expect(nodes.get('K7')).toMatchObject({ backedUp: false, parent: { id: 'MB' } })
    expect(nodes.get('CO')).toMatchObject({ kind: 'changeover', backedUp: false })
  })

  test('everything is live on the grid; in the island the changeover and what lies below it', () => {
    const { live } = tree(bakery)
    expect(['supply', 'MB', 'K7', 'K1', 'INV'].map((id) => live(id, 'grid'))).toEqual([true, true, true, true, true])
    expect(['supply', 'MB', 'K7', 'F35'].map((id) => live(id, 'island'))).toEqual([false, false, false, false])
    expect(['CO', 'RCD1', 'EB', 'K1', 'INV'].map((id) => live(id, 'island'))).toEqual([true, true, true, true, true])
    expect(live('nobody', 'grid')).toBe(false)
  })

  test('the way to a circuit starts at the supply on the grid and at the changeover in the island', () => {
    const { routeIn } = tree(bakery)
    expect(ids(routeIn('K1', 'grid'))).toEqual(['supply', 'MB', 'F35', 'CO', 'RCD1', 'EB', 'K1'])
    expect(ids(routeIn('K1', 'island'))).toEqual(['CO', 'RCD1', 'EB', 'K1'])
    expect(routeIn('K7', 'island')).toEqual([])
    expect(routeIn('nobody', 'grid')).toEqual([])
  })

  test('circuits are listed below every node, and split by the changeover', () => {
    const { circuitsBelow, circuits } = tree(bakery)
    expect(circuitsBelow('supply').toSorted()).toEqual(['K1', 'K2', 'K7'])
    expect(circuitsBelow('CO')).toEqual(['K1', 'K2'])
    expect(circuitsBelow('CO')).toBe(circuitsBelow('CO'))
    expect(circuitsBelow('K7')).toEqual(['K7'])
    expect(circuitsBelow('INV')).toEqual([])
    expect(circuitsBelow('nobody')).toEqual([])
    expect(circuits).toEqual({ backedUp: ['K1', 'K2'], gridOnly: ['K7'] })
  })

  test('overcurrent devices above a node come nearest first', () => {
    const sub = { device: { kind: 'breaker', curve: 'C', rated: 25 }, fed_from: 'EB' } as const
    const install = {
      ...bakery,
      overcurrent: { ...bakery.overcurrent, F25: sub },
      circuits: { ...bakery.circuits, K3: plainCircuit('F25') },
    }
    const { overcurrentAbove } = tree(install)
    expect(overcurrentAbove('K3')).toEqual(['F25', 'F35'])
    expect(overcurrentAbove('F25')).toEqual(['F35'])
    expect(overcurrentAbove('K7')).toEqual([])
    expect(overcurrentAbove('nobody')).toEqual([])
  })

  test('the lines are those of the supply', () => {
    expect(tree(bakery).lines).toEqual(['L1', 'L2', 'L3'])
    const nominal = { ...bakery.supply.nominal, phases: 1 } as const
    expect(tree({ ...bakery, supply: { ...bakery.supply, nominal } }).lines).toEqual(['L1'])
  })

  test('a name and the same name with .load feed alike', () => {
    const renamed = { RCD1: { fed_from: 'CO.load', type: 'A', rated_current: 40, residual: 30 } } as const
    const { nodes } = tree({ ...bakery, residual_current: renamed })
    expect(nodes.get('RCD1')?.route).toEqual(['supply', 'MB', 'F35', 'CO', 'RCD1'])
  })
})

describe('inverters by side', () => {
  const inverter = { fed_from: 'EB', phases: 1, rated_power: 3000 } as const

  test('the backed-up inverter that states an island forms it, a second one follows, one at the main board is grid-only', () => {
    const install = {
      ...bakery,
      inverters: { ...bakery.inverters, PV2: inverter, PV3: { ...inverter, fed_from: 'MB' } },
    }
    expect(tree(install).inverters).toEqual({ island: ['INV'], following: ['PV2'], gridOnly: ['PV3'] })
  })

  test('where no backed-up inverter states an island, all of them are taken to form it', () => {
    expect(tree({ ...bakery, arrays: {}, inverters: { PV2: inverter } }).inverters).toEqual({
      island: ['PV2'],
      following: [],
      gridOnly: [],
    })
  })

  test('a file without inverters has none', () => {
    const { inverters: _none, arrays: _noArrays, ...rest } = bakery
    expect(tree(rest).inverters).toEqual({ island: [], following: [], gridOnly: [] })
  })
})

describe('properties', () => {
  const circuits = fc.dictionary(
    fc.stringMatching(/^C[0-9]{1,3}$/),
    fc.constantFrom('MB', 'EB', 'CO', 'CO.load', 'RCD1', 'F35', 'supply').map((feeder) => plainCircuit(feeder)),
    { maxKeys: 30 },
  )
  const reversed = <Value>(record: Readonly<Record<string, Value>>) =>
    Object.fromEntries(Object.entries(record).toReversed())

  test('the order of keys changes no route, no state and no link', () => {
    fc.assert(
      fc.property(circuits, (more) => {
        const one = tree({ ...bakery, circuits: more })
        const other = tree({ ...bakery, circuits: reversed(more), boards: reversed(bakery.boards ?? {}) })
        for (const [id, node] of one.nodes) {
          expect(other.nodes.get(id)?.route).toEqual(node.route)
          expect(other.live(id, 'island')).toBe(one.live(id, 'island'))
          expect(other.circuitsBelow(id).toSorted()).toEqual(one.circuitsBelow(id).toSorted())
        }
        expect(other.neutralEarthLinks).toEqual(one.neutralEarthLinks)
      }),
      { numRuns: 40 },
    )
  })

  test('every circuit is either backed up or grid-only, and those below a board are the sum of its branches', () => {
    fc.assert(
      fc.property(circuits, (more) => {
        const { circuits: sides, circuitsBelow, nodes } = tree({ ...bakery, circuits: more })
        expect([...sides.backedUp, ...sides.gridOnly].toSorted()).toEqual(Object.keys(more).toSorted())
        for (const node of nodes.values()) {
          if (node.kind === 'circuit') continue
          expect(circuitsBelow(node.id)).toEqual(node.children.flatMap((child) => circuitsBelow(child.id)))
        }
      }),
      { numRuns: 40 },
    )
  })

  test('a thousand circuits on one board cost about ten times a hundred, not a hundred times', () => {
    const many = (count: number): Install => {
      const made = Array.from({ length: count }, (_, index): [string, Circuit] => [`C${index}`, plainCircuit('EB')])
      return { ...bakery, circuits: Object.fromEntries(made) }
    }
    const { topology } = buildTopology(many(1000))
    expect(topology?.circuitsBelow('supply')).toHaveLength(1000)
    // Shared lists: asking for one board a thousand times must not build a thousand lists.
    const lists = new Set(Array.from({ length: 1000 }, () => topology?.circuitsBelow('EB')))
    expect(lists.size).toBe(1)
  })
})
