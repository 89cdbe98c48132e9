import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Circuit, Install } from '#core/install.ts'
import { circuitFamily } from '#core/quantities/circuit.ts'
import type { Parameters } from '#core/quantities/parameters.ts'
import { bakery, cable, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

function facts(id: string, install: Install = bakery, changed: Partial<Parameters> = {}) {
  const circuit = install.circuits?.[id]
  if (!circuit) throw new Error(`no circuit ${id}`)
  return compute(circuitFamily, { id, circuit }, sceneOf(install, changed))
}

function only(circuit: Circuit, more: Partial<Install> = {}): Install {
  return { ...bakery, ...more, circuits: { K: circuit } }
}

describe('the circuits of the bakery', () => {
  test('cold store: load, capacity, drop and loop by hand', () => {
    const store = facts('K1')
    expect(store.design_current).toBeCloseTo(1400 / (230 * 0.85), 9)
    expect(store).toMatchObject({ tabulated_capacity: 27, ambient_factor: 1, grouping_factor: 0.85, device_rated: 16 })
    expect(store.capacity).toBeCloseTo(22.95, 9)
    expect(store.conventional_operating_current).toBeCloseTo(23.2, 9)
    // 2 × 18 m × (0.0225/2.5 × 1400/230 A in phase + 0.00008 × 7.161 A × 0.5268 out of phase)
    expect(store.voltage_drop).toBeCloseTo(36 * (0.009 * (1400 / 230) + 0.00008 * 7.1611 * 0.526783), 4)
    expect(store.voltage_drop_percent).toBeCloseTo((100 * Number(store.voltage_drop)) / 230, 9)
    expect(store).toMatchObject({ disconnection_time: 0.4, operating_current: 160, loop_limit: 1.4375 })
    expect(store.loop_limit_measured).toBeCloseTo(0.95833, 5)
    expect(store.continuity_expected).toBeCloseTo(0.01482 * 18, 9)
    expect(store.loop_expected).toBeCloseTo(0.24 + 0.00366 * 6 + 0.01482 * 18, 9)
    expect(store.fault_current_grid).toBeCloseTo(230 / 0.52872, 3)
    expect(store.protective_conductor_minimum).toBeCloseTo((435.01 * Math.sqrt(0.4)) / 115, 3)
    expect(store).toMatchObject({
      protective_conductor_table: 2.5,
      insulation_minimum: 1,
      insulation_test_voltage: 500,
    })
  })

  test('cold store in the island: 24 A never move a C16, the residual-current device must', () => {
    expect(facts('K1')).toMatchObject({
      fault_current_island: 24,
      residual_protection: { grid: ['RCD1'], island: ['RCD1'] },
      grid_disconnection: 'overcurrent',
      island_disconnection: 'residual current',
    })
  })

  test("drop from the origin adds the changeover's cable at the most loaded line", () => {
    const store = facts('K1')
    const active = 1400 / 230
    const reactive = (1400 / (230 * 0.85)) * Math.sqrt(1 - 0.85 ** 2)
    const above = 6 * ((0.0225 / 10) * active + 0.00008 * reactive)
    expect(store.voltage_drop_total_percent).toBeCloseTo(Number(store.voltage_drop_percent) + (100 * above) / 230, 9)
  })

  test('deck oven: three lines, on the grid only', () => {
    const oven = facts('K7')
    expect(oven.design_current).toBeCloseTo(15_000 / (Math.sqrt(3) * Math.sqrt(3) * 230), 9)
    expect(oven).toMatchObject({ tabulated_capacity: 41, operating_current: 160 })
    expect(oven.voltage_drop).toBeCloseTo(14 * (0.0225 / 6) * (15_000 / 690), 9)
    expect(oven.fault_current_island).toBeUndefined()
    expect(oven.island_disconnection).toBeUndefined()
    expect(oven).toMatchObject({ residual_protection: { grid: [], island: [] }, grid_disconnection: 'overcurrent' })
  })

  test('a circuit sees the larger of line-neutral and line-earth currents at its device', () => {
    const atStore = Number(facts('K1').fault_current_at_device)
    expect(atStore).toBeCloseTo(230 / Math.hypot(230 / 2100, 0.00366 * 6), 6)
    expect(facts('K7').fault_current_at_device).toBeCloseTo(2100, 6)
  })
})

describe('what is read wins over what is expected', () => {
  test('a loop reading on the grid gives the fault current', () => {
    const readings = { circuits: { K1: { loop: { grid: { value: 0.55 } } } } }
    expect(facts('K1', { ...bakery, readings }).fault_current_grid).toBeCloseTo(230 / 0.55, 9)
  })

  test('a loop reading in the island limits what flows there', () => {
    const readings = { circuits: { K1: { loop: { island: { value: 23 } } } } }
    expect(facts('K1', { ...bakery, readings }).fault_current_island).toBeCloseTo(10, 9)
  })

  test('let-through energy of the device stands in for current and time', () => {
    const device = { kind: 'breaker', curve: 'B', rated: 16, let_through: 15_000 } as const
    expect(facts('K', only(plainCircuit('EB', { device }))).protective_conductor_minimum).toBeCloseTo(
      Math.sqrt(15_000) / 115,
      9,
    )
  })

  test('the stated current of a load wins over its power', () => {
    expect(facts('K', only(plainCircuit('EB', { load: { current: 9, power: 230 } }))).design_current).toBe(9)
  })
})

describe('how the load lies between the conductors', () => {
  const load = { power: 6900 }
  const { neutral: _none, ...withoutNeutral } = cable(2.5, 2.5, 3, { insulation: 'pvc', method: 'C', length: 20 })

  test('between two lines: √3 · U0, two loaded conductors, drop in % of the voltage between lines', () => {
    const found = facts('K', only(plainCircuit('EB', { phases: ['L1', 'L2'], cable: withoutNeutral, load })))
    expect(found.design_current).toBeCloseTo(6900 / (Math.sqrt(3) * 230), 9)
    expect(found.tabulated_capacity).toBe(27)
    expect(found.voltage_drop_percent).toBeCloseTo((100 * Number(found.voltage_drop)) / (Math.sqrt(3) * 230), 9)
  })

  test('over two lines and neutral: each carries half, three loaded conductors', () => {
    const found = facts('K', only(plainCircuit('EB', { phases: ['L1', 'L2'], load })))
    expect(found).toMatchObject({ design_current: 15, tabulated_capacity: 24 })
  })

  test('a single-phase cable without a stated neutral is taken to have one of the same size', () => {
    const full = Number(facts('K', only(plainCircuit('EB', { load }))).voltage_drop)
    expect(facts('K', only(plainCircuit('EB', { load, cable: withoutNeutral }))).voltage_drop).toBeCloseTo(full, 9)
  })

  test('aluminium takes its own resistivity', () => {
    const metal = (material: 'copper' | 'aluminium') =>
      Number(
        facts('K', only(plainCircuit('EB', { load, cable: cable(16, 16, 3, { material, length: 20 }) }))).voltage_drop,
      )
    expect(metal('aluminium') / metal('copper')).toBeCloseTo(0.036 / 0.0225, 9)
  })
})

describe('nothing is guessed where something is missing', () => {
  const missing = (circuit: Circuit, more: Partial<Install> = {}) =>
    Object.entries(facts('K', only(circuit, more)))
      .filter(([, value]) => value === undefined)
      .map(([name]) => name)

  test('no load: no current and no drop', () => {
    expect(missing(plainCircuit('EB'))).toEqual([
      'design_current',
      'voltage_drop',
      'voltage_drop_percent',
      'voltage_drop_total_percent',
    ])
  })

  test('a cable that only has a size: neither capacity nor lengths; the island is limited by the inverter', () => {
    const circuit = plainCircuit('EB', { cable: cable(2.5, 2.5, 3), load: { power: 230 } })
    expect(missing(circuit)).toEqual([
      'tabulated_capacity',
      'capacity',
      'overload_limit',
      'voltage_drop',
      'voltage_drop_percent',
      'voltage_drop_total_percent',
      'continuity_expected',
      'continuity_highest',
      'continuity_lowest',
      'loop_expected',
      'loop_highest',
      'loop_lowest',
      'fault_current_grid',
      'protective_conductor_minimum',
    ])
    expect(facts('K', only(circuit))).toMatchObject({
      fault_current_island: 24,
      grid_disconnection: 'residual current',
    })
  })

  test('a cable of unknown length on the way: no drop from the origin, no loop, no current at the device', () => {
    const changeover = { ...bakery.changeover, cable: cable(10, 10, 5) }
    const unknown = [
      'voltage_drop_total_percent',
      'loop_expected',
      'loop_highest',
      'loop_lowest',
      'fault_current_grid',
      'fault_current_at_device',
      'protective_conductor_minimum',
    ]
    expect(missing(plainCircuit('EB', { load: { power: 230 } }), { changeover })).toEqual(unknown)
  })

  test('no reading at the origin: neither loop nor current', () => {
    const { loop_impedance: _loop, fault_current: _current, ...supply } = bakery.supply
    const unknown = [
      'loop_expected',
      'loop_highest',
      'loop_lowest',
      'fault_current_grid',
      'fault_current_at_device',
      'grid_disconnection',
      'protective_conductor_minimum',
    ]
    expect(
      missing(plainCircuit('MB', { load: { power: 230 } }), { supply }).filter((name) => !name.includes('island')),
    ).toEqual(unknown)
  })

  test('up to 50 V no disconnection is asked for, so nothing follows from it', () => {
    const supply = { ...bakery.supply, nominal: { ...bakery.supply.nominal, voltage: 48 } }
    expect(missing(plainCircuit('EB', { load: { power: 48 } }), { supply })).toEqual([
      'disconnection_time',
      'operating_current',
      'loop_limit',
      'loop_limit_measured',
      'protective_conductor_minimum',
    ])
  })
})

describe('properties', () => {
  const metres = fc.double({ min: 0.1, max: 200, noNaN: true })
  const made = (length: number, power: number) =>
    facts(
      'K',
      only(
        plainCircuit('EB', { load: { power }, cable: cable(2.5, 2.5, 3, { insulation: 'pvc', method: 'C', length }) }),
      ),
    )

  test('a longer cable never lowers drop or loop and never raises a fault current', () => {
    fc.assert(
      fc.property(metres, metres, fc.integer({ min: 0, max: 3000 }), (length, more, power) => {
        const short = made(length, power)
        const long = made(length + more, power)
        for (const name of ['voltage_drop', 'voltage_drop_total_percent', 'continuity_expected', 'loop_expected']) {
          expect(Number(long[name])).toBeGreaterThanOrEqual(Number(short[name]))
        }
        for (const name of ['fault_current_grid', 'fault_current_island', 'protective_conductor_minimum']) {
          expect(Number(long[name])).toBeLessThanOrEqual(Number(short[name]))
        }
      }),
      { numRuns: 50 },
    )
  })

  test('a second load on another circuit of the same line never lowers the drop from the origin', () => {
    const total = (power: number) => {
      const circuits = {
        K: plainCircuit('EB', { load: { power: 1000 } }),
        Other: plainCircuit('EB', { load: { power } }),
      }
      return Number(facts('K', { ...bakery, circuits }).voltage_drop_total_percent)
    }
    // Beyond the cap only the rounding of the last digit moves.
    const rounding = 1e-9
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 20_000 }), (power) => total(power + 500) >= total(power) - rounding),
    )
    // 35 A is all that the fuse upstream lets through for long.
    expect(total(1_000_000)).toBeCloseTo(total(100_000), 9)
  })
})

test('every quantity says what it is, by what formula, after whom, from what', () => {
  const names = circuitFamily.quantities.map(({ name }) => name)
  expect(new Set(names).size).toBe(names.length)
  for (const { title, formula, source, from } of circuitFamily.quantities) {
    expect(Math.min(title.length, formula.length, source.length, from.length)).toBeGreaterThan(0)
  }
})
