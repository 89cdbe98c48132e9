import { describe, expect, test } from 'vitest'
import type { Cable, Install, OvercurrentDevice } from '#core/install.ts'
import { overcurrentFamily } from '#core/quantities/overcurrent.ts'
import { supplyFamily } from '#core/quantities/supply.ts'
import { bakery, cable, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

const laid = (line: number, more: Partial<Cable> = {}) =>
  cable(line, line, 5, { insulation: 'pvc', method: 'C', length: 10, ...more })

const fuse32: OvercurrentDevice = { device: { kind: 'fuse', curve: 'gG', rated: 32 }, fed_from: 'MB' }

function facts(device: OvercurrentDevice = fuse32, more: Partial<Install> = {}) {
  const install = { ...bakery, overcurrent: { F35: device }, ...more }
  return compute(overcurrentFamily, { id: 'F35', device }, sceneOf(install))
}

describe('an overcurrent device in the tree', () => {
  test('ratings, load below, disconnection of a distribution circuit', () => {
    const found = facts()
    expect(found).toMatchObject({
      upstream_rating: 63,
      selectivity_ratio: 63 / 32,
      conventional_operating_current: 51.2,
      cables_protected: ['CO'],
      smallest_cable_capacity: 60,
      disconnection_time: 5,
      operating_current: 150,
      loop_limit: 230 / 150,
    })
    expect(found.loop_limit_measured).toBeCloseTo((2 / 3) * (230 / 150), 9)
    expect(found.loop_expected).toBeCloseTo(0.24 + 0.00366 * 6, 9)
    expect(found.through_current).toBeCloseTo(1400 / (230 * 0.85), 9)
    expect(found.fault_current_at_device).toBeCloseTo(2100, 6)
    expect(found.cable_capacity).toBeUndefined()
  })

  test('a device with a cable: that cable counts, carries at most its rating, and comes after the device', () => {
    const circuits = { A: plainCircuit('EB', { load: { current: 50 } }) }
    const found = facts({ ...fuse32, cable: laid(6) }, { circuits })
    expect(found).toMatchObject({ cables_protected: ['F35', 'CO'], smallest_cable_capacity: 41, cable_current: 32 })
    expect(found.fault_current_at_device).toBeCloseTo(2100, 6)
    expect(found.loop_expected).toBeCloseTo(0.24 + 0.00616 * 10 + 0.00366 * 6, 9)
  })

  test("the cables that it protects end at the next device; an inverter's cable is one of them", () => {
    const install: Partial<Install> = {
      overcurrent: {
        F35: fuse32,
        F16: { device: { kind: 'fuse', curve: 'gG', rated: 16 }, fed_from: 'CO', cable: laid(4) },
      },
      inverters: { INV: { fed_from: 'CO', phases: 3, rated_power: 10_000, cable: laid(2.5) } },
      residual_current: { RCD1: { fed_from: 'CO', type: 'A', rated_current: 40, residual: 30, cable: laid(10) } },
      boards: {
        MB: { name: 'Main board', fed_from: 'supply', cable: laid(16) },
        EB: { name: 'Board', fed_from: 'RCD1', cable: laid(6) },
      },
    }
    const found = facts(fuse32, install)
    expect(found.cables_protected).toEqual(['CO', 'RCD1', 'INV', 'EB'])
    expect(found.smallest_cable_capacity).toBe(24)
    const inner = { device: { kind: 'fuse', curve: 'gG', rated: 16 }, fed_from: 'CO', cable: laid(4) } as const
    expect(compute(overcurrentFamily, { id: 'F16', device: inner }, sceneOf({ ...bakery, ...install }))).toMatchObject({
      upstream_rating: 32,
      selectivity_ratio: 2,
      cables_protected: ['F16'],
    })
  })

  test('a breaker has no ratio of fuses; a cable that cannot be told leaves the smallest capacity open', () => {
    const breaker: OvercurrentDevice = {
      device: { kind: 'breaker', curve: 'C', rated: 32 },
      fed_from: 'MB',
      cable: cable(6, 6, 5),
    }
    expect(facts(breaker)).toMatchObject({
      selectivity_ratio: undefined,
      smallest_cable_capacity: undefined,
      loop_expected: undefined,
    })
  })

  test('a fuse that the table does not hold has no operating current and no limit', () => {
    const found = facts({ ...fuse32, device: { kind: 'fuse', curve: 'gG', rated: 35 } })
    expect(found).toMatchObject({ operating_current: undefined, loop_limit: undefined, loop_limit_measured: undefined })
  })

  test('no reading at the origin, no current at the device', () => {
    const { fault_current: _none, ...supply } = bakery.supply
    expect(facts(fuse32, { supply }).fault_current_at_device).toBeUndefined()
  })
})

describe('the supply', () => {
  const of = (supply = bakery.supply, more: Partial<Install> = {}) =>
    compute(supplyFamily, supply, sceneOf({ ...bakery, ...more, supply }))

  test('voltage between lines, main protection, load, fault currents', () => {
    const found = of()
    expect(found.line_voltage).toBeCloseTo(398.37, 2)
    expect(found).toMatchObject({
      main_rating: 63,
      fault_current_highest: 2100,
      cables_protected: [],
      smallest_cable_capacity: undefined,
    })
    expect(found.conventional_operating_current).toBeCloseTo(100.8, 9)
    expect(found.earth_fault_current).toBeCloseTo(230 / 0.24, 9)
    expect(found.through_current).toBeCloseTo(15_000 / 690 + 1400 / (230 * 0.85), 9)
  })

  test('a stated current below U0 / Ze is not the highest', () => {
    expect(of({ ...bakery.supply, fault_current: { value: 900 } }).fault_current_highest).toBeCloseTo(230 / 0.24, 9)
  })

  test('single-phase without readings', () => {
    const { loop_impedance: _loop, fault_current: _current, ...rest } = bakery.supply
    const found = of({ ...rest, nominal: { ...rest.nominal, phases: 1 } })
    expect(found).toMatchObject({ line_voltage: 230, earth_fault_current: undefined, fault_current_highest: undefined })
  })

  test('the cable to the main board is protected by the main protection', () => {
    const boards = { ...bakery.boards, MB: { name: 'Main board', fed_from: 'supply', cable: laid(16) } }
    expect(of(bakery.supply, { boards })).toMatchObject({ cables_protected: ['MB'], smallest_cable_capacity: 76 })
  })

  test('a file without circuits draws nothing', () => {
    const { circuits: _none, ...rest } = bakery
    expect(compute(supplyFamily, bakery.supply, sceneOf(rest)).through_current).toBe(0)
  })
})
