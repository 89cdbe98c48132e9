import { describe, expect, test } from 'vitest'
import type { Changeover, Install, NeutralLink, SupplyLink } from '#core/install.ts'
import { buildTopology } from '#core/topology/build.ts'
import { bakery, plainCircuit } from './bakery.ts'

function changed(changeover: Partial<Changeover>, more: Partial<Install> = {}): Install {
  return { ...bakery, changeover: { ...bakery.changeover, ...changeover }, ...more }
}

function withLinks(
  links: { MB?: NeutralLink; EB?: NeutralLink; INV?: NeutralLink },
  changeover: Partial<Changeover>,
): Install {
  const boards = {
    MB: { name: 'Main board', fed_from: 'supply', ...(links.MB && { neutral_link: links.MB }) },
    EB: { name: 'Backed-up board', fed_from: 'RCD1', ...(links.EB && { neutral_link: links.EB }) },
  }
  const inverters = {
    INV: { fed_from: 'CO.load', phases: 3, rated_power: 10_000, ...(links.INV && { neutral_link: links.INV }) },
  } as const
  return changed(changeover, { boards, inverters })
}

// The rows of the decision table, after IET Wiring Matters 84 (March 2021).
const rows: readonly [string, Install, { grid: string[]; island: string[] }][] = [
  ['relay at the changeover, neutral switched: one in each state', bakery, { grid: ['supply'], island: ['CO'] }],
  [
    'relay at the changeover, neutral continuous: two in the island',
    changed({ poles: 3 }),
    { grid: ['supply'], island: ['supply', 'CO'] },
  ],
  [
    "no link of its own, neutral continuous: the distributor's in both",
    changed({ poles: 3, neutral_link: 'none' }),
    { grid: ['supply'], island: ['supply'] },
  ],
  [
    'no link of its own, neutral switched: none in the island',
    changed({ neutral_link: 'none' }),
    { grid: ['supply'], island: [] },
  ],
  [
    'fixed at the changeover: a second one on the grid',
    changed({ neutral_link: 'fixed' }),
    { grid: ['supply', 'CO'], island: ['CO'] },
  ],
  [
    'fixed at the backed-up board: a second one on the grid',
    withLinks({ EB: 'fixed' }, { neutral_link: 'none' }),
    { grid: ['supply', 'EB'], island: ['EB'] },
  ],
  [
    'relay at the inverter',
    withLinks({ INV: 'closes in island' }, { neutral_link: 'none' }),
    { grid: ['supply'], island: ['INV'] },
  ],
  [
    'relays at the inverter and at the changeover: two in the island',
    withLinks({ INV: 'closes in island' }, {}),
    { grid: ['supply'], island: ['CO', 'INV'] },
  ],
  [
    'fixed at the main board, neutral switched: cut off in the island',
    withLinks({ MB: 'fixed' }, {}),
    { grid: ['supply', 'MB'], island: ['CO'] },
  ],
  [
    'fixed at the main board, neutral continuous: stays in the island',
    withLinks({ MB: 'fixed' }, { poles: 3, neutral_link: 'none' }),
    { grid: ['supply', 'MB'], island: ['supply', 'MB'] },
  ],
  [
    'closing in the island at the main board, neutral switched: cut off',
    withLinks({ MB: 'closes in island' }, {}),
    { grid: ['supply'], island: ['CO'] },
  ],
]

describe('links between neutral and earth', () => {
  test.each(rows)('%s', (_why, install, links) => {
    expect(buildTopology(install).topology?.neutralEarthLinks).toEqual(links)
  })

  test('two poles switch the neutral on single-phase, but not on three-phase', () => {
    const nominal = { ...bakery.supply.nominal, phases: 1 } as const
    const single = changed({ poles: 2 }, { supply: { ...bakery.supply, nominal } })
    expect(buildTopology(single).topology?.neutralEarthLinks.island).toEqual(['CO'])
    expect(buildTopology(changed({ poles: 2 })).topology?.neutralEarthLinks.island).toEqual(['supply', 'CO'])
  })

  test('an inverter that does not form the island keeps its link out of the count', () => {
    const inverters = {
      ...bakery.inverters,
      PV2: { fed_from: 'EB', phases: 1, rated_power: 3000, neutral_link: 'fixed' },
    } as const
    expect(buildTopology({ ...bakery, inverters }).topology?.neutralEarthLinks).toEqual({
      grid: ['supply'],
      island: ['CO'],
    })
  })

  test('a file without boards has the links that remain', () => {
    const { boards: _none, circuits: _noCircuits, ...rest } = bakery
    const overcurrent = { F35: { device: bakery.supply.main_protection, fed_from: 'supply' } }
    expect(buildTopology({ ...rest, overcurrent }).topology?.neutralEarthLinks.island).toEqual(['CO'])
  })
})

describe('what would join the island to the grid', () => {
  const bypass = (link: Partial<SupplyLink>): Install => ({
    ...bakery,
    links: { BY: { from: 'MB', to: 'EB', position: 'open', interlocked: true, ...link } },
  })

  test.each([
    ['an open and interlocked service bypass does not', bypass({}), []],
    ['a closed bypass does', bypass({ position: 'closed' }), ['BY']],
    ['an open bypass that nothing keeps open does', bypass({ interlocked: false }), ['BY']],
    ['a bypass that ends at the backed-up terminals does', bypass({ to: 'CO.load', position: 'closed' }), ['BY']],
    ['a closed link inside the backed-up side does not', bypass({ from: 'CO', position: 'closed' }), []],
    ['a closed link inside the grid side does not', bypass({ to: 'supply', position: 'closed' }), []],
    ['a link to nowhere counts as one to the grid side', bypass({ from: 'nowhere', position: 'closed' }), ['BY']],
    ['a changeover with fewer poles than lines does', changed({ poles: 2 }), ['CO']],
    ['three poles on three lines do not', changed({ poles: 3 }), []],
  ])('%s', (_why, install, joins) => {
    expect(buildTopology(install).topology?.islandJoins).toEqual(joins)
  })
})

describe('residual-current protection that sees a fault', () => {
  const seen = (install: Install, id: string) => {
    const { topology } = buildTopology(install)
    return [topology?.residualProtection(id, 'grid'), topology?.residualProtection(id, 'island')]
  }

  test('a device below the changeover acts in both states', () => {
    expect(seen(bakery, 'K1')).toEqual([['RCD1'], ['RCD1']])
  })

  test('a circuit on the grid side is seen by neither, and dead in the island', () => {
    expect(seen(bakery, 'K7')).toEqual([[], []])
  })

  test("the circuit's own device counts, after those upstream", () => {
    const circuits = { K1: plainCircuit('EB', { residual_current: { type: 'A', residual: 30 } }) }
    expect(seen({ ...bakery, circuits }, 'K1')).toEqual([
      ['RCD1', 'K1'],
      ['RCD1', 'K1'],
    ])
  })

  test('a device upstream of the changeover acts on the grid only', () => {
    const residual_current = {
      RCD1: { fed_from: 'CO', type: 'A', rated_current: 40, residual: 30 },
      RCD0: { fed_from: 'MB', type: 'A', rated_current: 63, residual: 300, delay: 'S' },
    } as const
    const overcurrent = { F35: { device: bakery.supply.main_protection, fed_from: 'RCD0' } }
    expect(seen({ ...bakery, residual_current, overcurrent }, 'K1')).toEqual([['RCD0', 'RCD1'], ['RCD1']])
  })

  test('without a link between neutral and earth no device acts in the island', () => {
    expect(seen(changed({ neutral_link: 'none' }), 'K1')).toEqual([['RCD1'], []])
  })

  test('a link below the device lets the fault current past it in the island', () => {
    expect(seen(withLinks({ EB: 'closes in island' }, { neutral_link: 'none' }), 'K1')).toEqual([['RCD1'], []])
  })

  test('an inverter fed in below the device feeds the fault past it', () => {
    const inverters = { INV: { fed_from: 'EB', phases: 3, rated_power: 10_000 } } as const
    expect(seen({ ...bakery, inverters }, 'K1')).toEqual([['RCD1'], []])
  })
})
