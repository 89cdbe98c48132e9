import { describe, expect, test } from 'vitest'
import type { Changeover, Install, Inverter } from '#core/install.ts'
import { changeoverFamily } from '#core/quantities/changeover.ts'
import { switchedPoles } from '#core/quantities/changeover-load.ts'
import { highestLostNeutral, lostNeutralVoltages } from '#core/quantities/changeover-lost-neutral.ts'
import { mostLoadedLine } from '#core/quantities/circuit-network.ts'
import { bakery, cable, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

function facts(changed: Partial<Changeover> = {}, more: Partial<Install> = {}) {
  const install = { ...bakery, ...more, changeover: { ...bakery.changeover, ...changed } }
  return compute(changeoverFamily, install.changeover, sceneOf(install))
}

describe('the changeover of the bakery', () => {
  test('35 A upstream; its load is that of the more loaded line of the two backed-up circuits', () => {
    const found = facts()
    expect(found).toMatchObject({
      upstream_rating: 35,
      switched_poles: 'all poles',
      backed_up_power: 2600,
      backed_up_circuits: ['K1', 'K2'],
      grid_only_circuits: ['K7'],
      circuits_without_load: [],
      fault_current_at_device: 2100,
    })
    expect(found.through_current).toBeCloseTo(1400 / (230 * 0.85), 9)
    expect(found.inverter_current).toBeCloseTo(10_000 / 3 / 230, 9)
  })

  test('its cable: 5G10, XLPE, method B2, three loaded', () => {
    const found = facts()
    expect(found).toMatchObject({ cable_tabulated_capacity: 60, cable_capacity: 60 })
    expect(found.cable_current).toBeCloseTo(1400 / (230 * 0.85), 9)
    expect(Number(found.cable_voltage_drop_percent)).toBeCloseTo((100 * Number(found.cable_voltage_drop)) / 230, 9)
  })

  test('without a cable nothing is said about one; with one of unknown length nothing about its drop', () => {
    const { cable: _none, ...without } = bakery.changeover
    const install = { ...bakery, changeover: without }
    expect(compute(changeoverFamily, without, sceneOf(install)).cable_capacity).toBeUndefined()
    expect(facts({ cable: cable(10, 10, 5) }).cable_voltage_drop_percent).toBeUndefined()
  })

  test('a three-core cable feeds one line: two loaded conductors, line and neutral drop', () => {
    const described = { insulation: 'xlpe', method: 'B2', length: 6 } as const
    const found = facts({ cable: cable(10, 10, 3, described) })
    expect(found.cable_tabulated_capacity).toBe(69)
    expect(Number(found.cable_voltage_drop)).toBeCloseTo(2 * Number(facts().cable_voltage_drop), 9)
    const { neutral: _none, ...unstated } = cable(10, 10, 3, described)
    expect(facts({ cable: unstated }).cable_voltage_drop).toBe(found.cable_voltage_drop)
  })

  test('fed straight from the main board, the main protection is what stands upstream', () => {
    expect(facts({ fed_from: 'MB' }).upstream_rating).toBe(63)
  })

  test('a load given by its current adds to the power; one not given is named', () => {
    const circuits = {
      A: plainCircuit('EB', { load: { current: 10 } }),
      B: plainCircuit('EB', { load: { current: 10, power_factor: 0.5 }, phases: ['L1', 'L2', 'L3'] }),
      C: plainCircuit('EB'),
    }
    expect(facts({}, { circuits })).toMatchObject({
      backed_up_power: 2300 + 3450,
      circuits_without_load: ['C'],
      through_current: 20,
    })
  })

  test('a changeover with nothing behind it carries nothing', () => {
    const { circuits: _circuits, inverters: _inverters, arrays: _arrays, residual_current: _devices, ...rest } = bakery
    const boards = { MB: { name: 'Main board', fed_from: 'supply' } }
    const found = compute(changeoverFamily, rest.changeover, sceneOf({ ...rest, boards }))
    expect(found).toMatchObject({ through_current: 0, backed_up_power: 0, circuits_without_load: [] })
    expect([found.lost_neutral_voltage, found.inverter_current]).toEqual([undefined, undefined])
  })

  test('a name outside the tree carries nothing', () => {
    expect(mostLoadedLine('nobody', sceneOf(bakery)).current).toBe(0)
  })

  test('no reading at the origin, no current at the device', () => {
    const { fault_current: _none, ...supply } = bakery.supply
    expect(facts({}, { supply }).fault_current_at_device).toBeUndefined()
  })
})

test.each([
  [4, 3, 'all poles'],
  [3, 3, 'line poles'],
  [2, 3, 'not all lines'],
  [2, 1, 'all poles'],
  [1, 1, 'line poles'],
] as const)('%i poles on %i lines open %s (IET Wiring Matters 84, 2021)', (poles, phases, opened) => {
  expect(switchedPoles(poles, phases)).toBe(opened)
})

describe('rated current of backed-up inverters', () => {
  const single = (more: Partial<Inverter>): Inverter => ({ fed_from: 'CO', phases: 1, rated_power: 4600, ...more })
  const current = (inverters: Record<string, Inverter>, more: Partial<Install> = {}) =>
    facts({}, { arrays: {}, inverters, ...more }).inverter_current

  test('4.6 kVA at 230 V are 20 A; two on one line are 40 A; one at the main board does not count', () => {
    expect(current({ A: single({ line: 'L2' }) })).toBeCloseTo(20, 9)
    expect(current({ A: single({ line: 'L2' }), B: single({ line: 'L2' }) })).toBeCloseTo(40, 9)
    expect(current({ A: single({ line: 'L2' }), B: single({ line: 'L2', fed_from: 'MB' }) })).toBeCloseTo(20, 9)
  })

  test('a single-phase supply has one line to feed', () => {
    const nominal = { ...bakery.supply.nominal, phases: 1 } as const
    expect(current({ A: single({}) }, { supply: { ...bakery.supply, nominal } })).toBeCloseTo(20, 9)
  })

  test('is not guessed for an unknown line, and absent without an inverter', () => {
    expect(current({ A: single({}) })).toBeUndefined()
    expect(current({})).toBeUndefined()
  })
})

describe('a lost neutral in the island', () => {
  test('2,000, 500 and 100 W come to 85.3, 314.4 and 351.1 V', () => {
    const circuits = {
      A: plainCircuit('EB', { load: { power: 2000 } }),
      B: plainCircuit('EB', { phases: ['L2'], load: { power: 500 } }),
      C: plainCircuit('EB', { phases: ['L3'], load: { power: 100 } }),
    }
    expect(facts({}, { circuits }).lost_neutral_voltage).toBeCloseTo(351.07, 2)
  })

  test('an even load stays at its voltage; a line without load does not count', () => {
    for (const volts of lostNeutralVoltages(230, [4, 4, 4]) ?? []) expect(volts).toBeCloseTo(230, 9)
    expect(highestLostNeutral(230, [4, 4, 0])).toBeCloseTo(115 * Math.sqrt(3), 9)
  })

  test('nothing loaded or one line only: no such voltage', () => {
    expect(highestLostNeutral(230, [0, 0, 0])).toBeUndefined()
    const nominal = { ...bakery.supply.nominal, phases: 1 } as const
    expect(facts({ poles: 2 }, { supply: { ...bakery.supply, nominal } }).lost_neutral_voltage).toBeUndefined()
  })
})
