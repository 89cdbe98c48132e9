import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Line } from '#core/glossary.ts'
import type { Circuit, Install, Inverter, Load } from '#core/install.ts'
import { inverterFamily } from '#core/quantities/inverter.ts'
import { linesFed, phaseLimit, shareOf, sourcesOf } from '#core/quantities/inverter-lines.ts'
import { phaseLoads, unbalance } from '#core/quantities/inverter-load.ts'
import { bakery, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

const threePhase: Inverter = { fed_from: 'CO.load', phases: 3, rated_power: 10_000 }
const onePhase: Inverter = { fed_from: 'CO.load', phases: 1, rated_power: 5000 }

function load(phases: Line[], power: number, more: Load = {}): Circuit {
  return plainCircuit('EB', { phases, load: { power, ...more } })
}

function installWith(inverters: Record<string, Inverter>, circuits: Record<string, Circuit> = {}): Install {
  return { ...bakery, inverters, circuits }
}

function quantities(install: Install, id = 'INV') {
  const inverter = install.inverters?.[id]
  if (!inverter) throw new Error(`no ${id}`)
  return compute(inverterFamily, { id, inverter }, sceneOf(install))
}

const singlePhaseSupply = { ...bakery.supply, nominal: { voltage: 230, phases: 1, frequency: 50 } } as const

describe('power on one line', () => {
  test.each([
    ['as stated', { ...threePhase, island: { continuous: 10_000, per_phase: 3330 } }, 3330],
    ['a third of the continuous power', { ...threePhase, island: { continuous: 9000 } }, 3000],
    ['a third of the rated power where nothing is said of the island', threePhase, 10_000 / 3],
    ['all of it on one phase', { ...onePhase, island: { continuous: 4600 } }, 4600],
  ])('%s', (_how, inverter, limit) => {
    expect(phaseLimit(inverter)).toBeCloseTo(limit, 9)
  })

  test.each([
    [4600, 1, 20],
    [5000, 1, 21.74],
    [10_000, 3, 14.49],
  ] as const)(
    'rated current of %d VA on %d line: %d A: German, Australian and British thresholds',
    (rated_power, phases, amperes) => {
      const values = quantities(installWith({ INV: { ...threePhase, phases, rated_power } }))
      expect(values.rated_current).toBeCloseTo(amperes, 2)
    },
  )
})

describe('backed-up load by line', () => {
  test('the bakery: the cold store counts with its apparent power, the oven past the changeover does not', () => {
    const values = quantities(bakery)
    expect(values.phase_load).toEqual({ L1: expect.closeTo(1400 / 0.85, 6), L2: expect.closeTo(1200, 6), L3: 0 })
    expect(values.total_load).toBeCloseTo(1400 / 0.85 + 1200, 6)
    expect(values.largest_phase_load).toBeCloseTo(1400 / 0.85, 6)
    expect(values.unfed_lines).toEqual([])
  })

  test('a load on three lines is split evenly', () => {
    const values = quantities(installWith({ INV: threePhase }, { K1: load(['L1', 'L2', 'L3'], 6000) }))
    for (const line of ['L1', 'L2', 'L3'] as const) {
      expect(values.phase_load).toHaveProperty(line, expect.closeTo(2000, 6))
    }
    expect(values.unbalance).toBeCloseTo(0, 6)
  })

  test('5.0, 0.3 and 0.0 kVA are 5.0 kVA apart: above 4.6 kVA', () => {
    const values = quantities(installWith({ INV: threePhase }, { K1: load(['L1'], 5000), K2: load(['L2'], 300) }))
    expect(values.unbalance).toBeCloseTo(5000, 6)
    expect(unbalance({ L1: 5000, L2: 300, L3: 0 })).toBe(5000)
  })

  test('only the lines of the supply are named', () => {
    const install = { ...installWith({ INV: onePhase }, { K1: load(['L1'], 900) }), supply: singlePhaseSupply }
    const values = quantities(install)
    expect(values.phase_load).toEqual({ L1: expect.closeTo(900, 6) })
    expect(values.unbalance).toBe(0)
  })

  test('a changeover with nothing behind it carries nothing on any line', () => {
    const install: Install = {
      ...installWith({ PV: { ...threePhase, fed_from: 'MB' } }),
      boards: { MB: { name: 'Main board', fed_from: 'supply' } },
      residual_current: {},
    }
    expect(phaseLoads(sceneOf(install))).toEqual({ L1: 0, L2: 0, L3: 0 })
  })

  test('no circuits: no load and no line left without a source', () => {
    const { circuits: _none, ...install } = installWith({ INV: threePhase })
    expect(quantities(install)).toMatchObject({ total_load: 0, starting_current: 0, unfed_lines: [] })
  })
})

describe('lines and shares', () => {
  const three = {
    I1: { ...onePhase, line: 'L1' },
    I2: { ...onePhase, line: 'L2' },
    I3: { ...onePhase, line: 'L3' },
  } as const

  test('three single-phase inverters: each carries its own line', () => {
    const install = installWith(three, { K1: load(['L1'], 2000), K2: load(['L2'], 900) })
    expect(quantities(install, 'I1').largest_phase_load).toBeCloseTo(2000, 6)
    expect(quantities(install, 'I2').largest_phase_load).toBeCloseTo(900, 6)
    expect(quantities(install, 'I3').largest_phase_load).toBe(0)
  })

  test('two inverters on one line share its load by what each can give', () => {
    const install = installWith(
      { I1: { ...onePhase, line: 'L1', rated_power: 4000 }, I2: { ...onePhase, line: 'L1', rated_power: 2000 } },
      { K1: load(['L1'], 3000, { start: 2 }) },
    )
    expect(quantities(install, 'I1').largest_phase_load).toBeCloseTo(2000, 6)
    expect(quantities(install, 'I2').largest_phase_load).toBeCloseTo(1000, 6)
    expect(quantities(install, 'I2').starting_current).toBeCloseTo((2 * 3000) / 230 / 3, 6)
  })

  test('a file without inverters has no source on any line', () => {
    const { inverters: _none, ...install } = installWith({})
    expect(sourcesOf('L1', sceneOf(install))).toEqual([])
  })

  test('a load on a line that nobody feeds is named', () => {
    const install = installWith({ I1: three.I1 }, { K1: load(['L1'], 2000), K2: load(['L2'], 900) })
    expect(quantities(install, 'I1').unfed_lines).toEqual(['L2'])
  })

  test('a single-phase inverter that does not say its line is held against every line', () => {
    const scene = sceneOf(installWith({ INV: onePhase }))
    expect(linesFed(onePhase, scene)).toEqual(['L1', 'L2', 'L3'])
    expect(linesFed(threePhase, scene)).toEqual(['L1', 'L2', 'L3'])
  })

  test('the shares of a line make one', () => {
    const rated = fc.integer({ min: 1000, max: 20_000 })
    const inverter = fc.record({ rated_power: rated, phases: fc.constantFrom(1 as const, 3 as const) })
    fc.assert(
      fc.property(fc.array(inverter, { minLength: 1, maxLength: 4 }), (list) => {
        const inverters = Object.fromEntries(
          list.map((one, index) => [`I${index}`, { ...one, fed_from: 'CO.load', line: 'L1' as const }]),
        )
        const scene = sceneOf(installWith(inverters))
        const shares = Object.values(inverters).map((one) => shareOf(one, 'L1', scene))
        expect(shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 9)
      }),
    )
  })
})

describe('starting', () => {
  test('the load with the largest extra current starts while all others run', () => {
    const install = installWith(
      { INV: threePhase },
      {
        K1: load(['L1'], 1150, { start: 3 }),
        K2: load(['L1'], 460, { start: 6 }),
        K3: load(['L2'], 2300),
        K4: plainCircuit('EB'),
      },
    )
    // Both have 10 A more at the start: 5 A + 2 A run.
    expect(quantities(install).starting_current).toBeCloseTo(7 + 10, 6)
  })

  test('a motor of 70 A started directly at six times: 420 A: a wiring page', () => {
    const motor = plainCircuit('EB', { phases: ['L1', 'L2', 'L3'], load: { current: 70, start: 6 } })
    expect(quantities(installWith({ INV: threePhase }, { K1: motor })).starting_current).toBeCloseTo(420, 9)
  })

  test('a motor of 58.3 A directly, in star-delta, soft and by a drive: 350, 117, 175 and 70 A: a motor maker', () => {
    const currents = [6, 2, 3, 1.2].map((start) => {
      const motor = plainCircuit('EB', { phases: ['L1', 'L2', 'L3'], load: { current: 58.3, start } })
      return Math.round(Number(quantities(installWith({ INV: threePhase }, { K1: motor })).starting_current))
    })
    expect(currents).toEqual([350, 117, 175, 70])
  })

  test('peak of 12 kVA over three lines: 17.4 A; none stated: none', () => {
    const peak = { ...threePhase, island: { continuous: 10_000, peak: 12_000 } }
    expect(quantities(installWith({ INV: peak })).phase_peak_limit).toBeCloseTo(17.39, 2)
    expect(quantities(installWith({ INV: threePhase })).phase_peak_limit).toBeUndefined()
    expect(quantities(bakery).phase_peak_limit).toBeUndefined()
  })
})

describe('an inverter that does not feed the island', () => {
  test('has only what it feeds into the grid', () => {
    const install = installWith({ INV: threePhase, PV: { fed_from: 'MB', phases: 1, line: 'L2', rated_power: 4600 } })
    const known = Object.entries(quantities(install, 'PV')).filter(([, value]) => value !== undefined)
    expect(Object.fromEntries(known)).toEqual({ feed_in_unbalance: 4600, rated_current: 20 })
  })

  test('three phases, or a single-phase supply, are not unbalanced by it', () => {
    expect(quantities(installWith({ INV: threePhase })).feed_in_unbalance).toBe(0)
    expect(quantities({ ...installWith({ INV: onePhase }), supply: singlePhaseSupply }).feed_in_unbalance).toBe(0)
  })
})
