import { describe, expect, test } from 'vitest'
import type { Install, Inverter } from '#core/install.ts'
import { circuitFamily } from '#core/quantities/circuit.ts'
import { inverterFaultCurrent } from '#core/quantities/disconnection-island.ts'
import { gridMeans, islandMeans } from '#core/quantities/disconnection-means.ts'
import { bakery, cable, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

describe('means of disconnection on the grid', () => {
  test.each([
    ['a loop at the limit is enough for the overcurrent device', 1.917, 1.917, false, 'overcurrent'],
    ['above the limit nothing is left', 1.918, 1.917, false, 'none'],
    ['above the limit residual-current protection does it', 140, 1.44, true, 'residual current'],
    [
      'an unknown loop does not stand in the way of residual-current protection',
      undefined,
      1.44,
      true,
      'residual current',
    ],
    ['an unknown loop alone shows nothing', undefined, 1.44, false, undefined],
    ['an unknown limit alone shows nothing', 0.5, undefined, false, undefined],
  ] as const)('%s', (_why, loop, limit, residual, means) => {
    expect(gridMeans(loop, limit, residual)).toBe(means)
  })
})

describe('means of disconnection in the island', () => {
  const weak = { current: 43.48, operating: 80, loopKnown: true, residual: false, shutdown: undefined, time: 0.4 }

  test.each([
    ['5 kVA at twice its rating do not move a B16: nothing is left', {}, 'none'],
    ['residual-current protection does it', { residual: true }, 'residual current'],
    ['the source shuts down in time', { shutdown: 0.4 }, 'source shut-down'],
    ['the source shuts down too late', { shutdown: 0.5 }, 'none'],
    ['a source that drives Ia moves the breaker', { current: 80 }, 'overcurrent'],
    ['through a loop that nobody knows it is not shown', { current: 80, loopKnown: false }, undefined],
    [
      'residual-current protection is enough where the loop is unknown',
      { current: 80, loopKnown: false, residual: true },
      'residual current',
    ],
    ['an unknown fault current shows nothing', { current: undefined }, undefined],
    ['an unknown operating current shows nothing', { operating: undefined }, undefined],
    [
      'a shut-down without a required time shows nothing',
      { current: undefined, time: undefined, shutdown: 0.1 },
      undefined,
    ],
  ] as const)('%s', (_why, changed, means) => {
    expect(islandMeans({ ...weak, ...changed })).toBe(means)
  })
})

describe('one circuit on the grid and in the island: B16, 0.80 Ω, an inverter that feeds 50 A', () => {
  const pair = (changed: Partial<Install> = {}, inverter: Partial<Inverter> = {}) => {
    const install: Install = {
      ...bakery,
      circuits: { K: plainCircuit('EB') },
      inverters: {
        INV: {
          fed_from: 'CO',
          phases: 3,
          rated_power: 10_000,
          island: { continuous: 10_000, fault_current: 50 },
          ...inverter,
        },
      },
      readings: { circuits: { K: { loop: { grid: { value: 0.8 } } } } },
      ...changed,
    }
    return compute(circuitFamily, { id: 'K', circuit: plainCircuit('EB') }, sceneOf(install))
  }

  test('287 A trip the breaker on the grid; the island needs the 30 mA device', () => {
    const found = pair()
    expect(found.fault_current_grid).toBeCloseTo(287.5, 9)
    expect(found).toMatchObject({
      fault_current_island: 50,
      grid_disconnection: 'overcurrent',
      island_disconnection: 'residual current',
    })
  })

  test('without a link between neutral and earth the device does not count', () => {
    const changeover = { ...bakery.changeover, neutral_link: 'none' } as const
    expect(pair({ changeover }).island_disconnection).toBe('none')
  })

  test('then the shut-down of the source may do it', () => {
    const changeover = { ...bakery.changeover, neutral_link: 'none' } as const
    const island = { continuous: 10_000, fault_current: 50, shuts_down_within: 0.2 }
    expect(pair({ changeover }, { island }).island_disconnection).toBe('source shut-down')
  })

  test('an inverter that states no fault current leaves it unknown', () => {
    expect(pair({}, { island: { continuous: 10_000 } }).fault_current_island).toBeUndefined()
    expect(pair({ inverters: {}, arrays: {} }).fault_current_island).toBeUndefined()
  })

  test("a long cable to the inverter is part of the island's loop", () => {
    const found = pair(
      {},
      { island: { continuous: 10_000, fault_current: 500 }, cable: cable(2.5, 2.5, 5, { length: 1000 }) },
    )
    expect(found.fault_current_island).toBeCloseTo(230 / (0.01482 * 1020), 6)
  })

  test('an inverter cable of unknown length leaves the loop unknown, the inverter still limits', () => {
    const found = pair({}, { cable: cable(2.5, 2.5, 5) })
    expect(found.fault_current_island).toBe(50)
  })
})

describe('single-phase inverters on three lines', () => {
  const inverter = (more: Partial<Inverter>): Inverter => ({
    fed_from: 'CO',
    phases: 1,
    rated_power: 5000,
    island: { continuous: 5000, fault_current: 40 },
    ...more,
  })

  test('each feeds its own line', () => {
    const scene = sceneOf({
      ...bakery,
      arrays: {},
      inverters: { I1: inverter({ line: 'L1' }), I2: inverter({ line: 'L2' }) },
    })
    expect([inverterFaultCurrent('L1', scene), inverterFaultCurrent('L3', scene)]).toEqual([40, 0])
  })

  test('one that does not say its line leaves it unknown; on a single-phase supply there is no question', () => {
    const install = { ...bakery, arrays: {}, inverters: { I1: inverter({}) } }
    expect(inverterFaultCurrent('L1', sceneOf(install))).toBeUndefined()
    const nominal = { ...bakery.supply.nominal, phases: 1 } as const
    expect(inverterFaultCurrent('L1', sceneOf({ ...install, supply: { ...bakery.supply, nominal } }))).toBe(40)
  })
})
