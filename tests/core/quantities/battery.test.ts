import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Battery } from '#core/install/battery.ts'
import type { Circuit, Install, Inverter } from '#core/install.ts'
import { batteryFamily } from '#core/quantities/battery.ts'
import { autonomy } from '#core/quantities/battery-energy.ts'
import { ventilation } from '#core/quantities/battery-ventilation.ts'
import { bakery, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

const lithium: Battery = {
  into: 'INV',
  chemistry: 'lithium iron phosphate',
  usable: 9600,
  max_discharge: 5100,
  efficiency: 95,
  place: 'utility room',
}
const lead: Battery = { ...lithium, chemistry: 'lead-acid, valve-regulated', cells: 24, capacity: 100, gas_current: 8 }

function installWith(inverter: Partial<Inverter>, circuits: Record<string, Circuit> = {}): Install {
  const INV = { fed_from: 'CO.load', phases: 3, rated_power: 10_000, settings: { held_back_charge: 40 }, ...inverter }
  return { ...bakery, inverters: { INV: INV as Inverter }, circuits }
}

const quantities = (battery: Battery, install: Install) =>
  compute(batteryFamily, { id: 'BAT', battery }, sceneOf(install))

const fridge = plainCircuit('EB', { load: { power: 1400, must_run: true, daily_energy: 9000 } })
const sockets = plainCircuit('EB', { load: { power: 1200, daily_energy: 3000 } })

describe('discharge limit', () => {
  test('5 kWh at one hour’s rate behind 6 kW: 5 kW', () => {
    const install = installWith({ island: { continuous: 6000 } })
    expect(quantities({ ...lithium, max_discharge: 5000 }, install).discharge_limit).toBe(5000)
  })

  test('the inverter limits a larger battery, by its rated power where nothing is said of the island', () => {
    expect(quantities(lithium, installWith({ island: { continuous: 3000 } })).discharge_limit).toBe(3000)
    expect(quantities(lithium, installWith({ rated_power: 4000 })).discharge_limit).toBe(4000)
  })

  test('a battery on the grid side gives the island nothing, so no limit is held against its loads', () => {
    expect(quantities(lithium, installWith({ fed_from: 'MB' })).discharge_limit).toBeUndefined()
  })

  test('no such inverter: nothing', () => {
    expect(quantities({ ...lithium, into: 'nowhere' }, installWith({})).discharge_limit).toBeUndefined()
  })
})

describe('all batteries of the island together', () => {
  const B = (into: string, max_discharge: number): Battery => ({ ...lithium, into, max_discharge })
  const inverter = (more: Partial<Inverter>): Inverter => ({
    fed_from: 'CO.load',
    phases: 3,
    rated_power: 4000,
    ...more,
  })
  const together = (batteries: Record<string, Battery>, inverters: Record<string, Inverter>) =>
    quantities(B('INV', 2000), { ...installWith({}), inverters, batteries }).discharge_limit_together

  test('two on one inverter add up, as far as it passes them on', () => {
    const batteries = { B1: B('INV', 2000), B2: B('INV', 3000) }
    expect(together(batteries, { INV: inverter({ island: { continuous: 6000 } }) })).toBe(5000)
    expect(together(batteries, { INV: inverter({}) })).toBe(4000)
  })

  test('an inverter without a battery gives nothing at night, one on the grid side nothing in the island', () => {
    const batteries = { B1: B('INV', 2000), B2: B('OUT', 3000) }
    const inverters = { INV: inverter({}), SUN: inverter({}), OUT: inverter({ fed_from: 'MB' }) }
    expect(together(batteries, inverters)).toBe(2000)
    expect(together(batteries, { ...inverters, INV: inverter({ fed_from: 'MB' }) })).toBeUndefined()
  })

  test('what must run adds up by power, or by current where only that is stated', () => {
    const circuits = {
      K1: fridge,
      K2: sockets,
      K3: plainCircuit('EB', { load: { current: 2, must_run: true } }),
      K4: plainCircuit('EB', { load: { must_run: true } }),
      K7: plainCircuit('MB', { load: { power: 9000, must_run: true } }),
    }
    expect(quantities(lithium, installWith({}, circuits)).must_run_load).toBeCloseTo(1400 + 460, 9)
    expect(quantities(lithium, installWith({}, circuits)).discharge_limit_together).toBe(0)
  })
})

describe('how long it lasts', () => {
  test('the bakery: 40 % of 9.6 kWh at 95 % for 12 kWh a day: 7.3 h; what must run: 9.7 h', () => {
    const values = quantities(lithium, installWith({}, { K1: fridge, K2: sockets }))
    expect(values.held_back_energy).toBeCloseTo(3840, 9)
    expect(values.autonomy).toBeCloseTo((3840 * 0.95) / 500, 9)
    expect(values.autonomy_must_run).toBeCloseTo((3840 * 0.95) / 375, 9)
  })

  test('6,000 Wh a day for three days take 18,000 Wh: a sizing guide for deep-cycle batteries', () => {
    expect(autonomy(18_000, 100, 6000 / 24)).toBeCloseTo(72, 9)
  })

  test('1,860 Wh a day from 310 Ah at 12 V, half of it used: one day: a sizing guide', () => {
    expect(autonomy(310 * 12 * 0.5, 100, 1860 / 24)).toBeCloseTo(24, 9)
  })

  test('a load without energy of a day counts as if it ran all day; one that states nothing does not count', () => {
    const circuits = { K1: plainCircuit('EB', { load: { current: 2 } }), K2: plainCircuit('EB') }
    expect(quantities(lithium, installWith({}, circuits)).autonomy).toBeCloseTo((3840 * 0.95) / 460, 9)
  })

  test('more charge lasts longer, more load shorter, and energy is neither made nor lost on the way', () => {
    const amount = fc.double({ min: 1, max: 100_000, noNaN: true })
    fc.assert(
      fc.property(amount, fc.double({ min: 1, max: 100, noNaN: true }), amount, (energy, efficiency, load) => {
        const hours = autonomy(energy, efficiency, load) ?? 0
        expect((hours * load) / ((energy * efficiency) / 100)).toBeCloseTo(1, 9)
        expect(autonomy(energy + 1, efficiency, load)).toBeGreaterThan(hours)
        expect(autonomy(energy, efficiency, load + 1)).toBeLessThan(hours)
      }),
    )
  })

  test('loads past the changeover do not count', () => {
    const circuits = { K1: fridge, K7: plainCircuit('MB', { load: { power: 15_000 } }) }
    expect(quantities(lithium, installWith({}, circuits)).autonomy).toBeCloseTo((3840 * 0.95) / 375, 9)
  })

  test('nothing held back stated, no load, or an inverter on the grid side: no autonomy', () => {
    expect(quantities(lithium, installWith({ settings: {} }, { K1: fridge })).autonomy).toBeUndefined()
    expect(quantities(lithium, installWith({})).autonomy).toBeUndefined()
    expect(quantities(lithium, installWith({ fed_from: 'MB' }, { K1: fridge })).autonomy).toBeUndefined()
    expect(quantities(lithium, installWith({}, { K2: sockets })).autonomy_must_run).toBeUndefined()
  })
})

describe('ventilation of lead-acid batteries, IEC 62485-2', () => {
  test('24 cells of 100 Ah at 8 mA/Ah: 0.96 m³/h; by the older factor 1.056 m³/h and 29.57 cm²: a battery maker', () => {
    const scene = installWith({})
    expect(quantities(lead, scene).ventilation).toBeCloseTo(0.96, 9)
    const older = compute(batteryFamily, { id: 'BAT', battery: lead }, sceneOf(scene, { ventilation_factor: 0.055 }))
    expect(older.ventilation).toBeCloseTo(1.056, 9)
    expect(older.vent_opening).toBeCloseTo(29.57, 2)
  })

  test('gastight cells need none, and a lead-acid battery that states too little shows none', () => {
    expect(quantities(lithium, installWith({})).ventilation).toBeUndefined()
    expect(quantities(lithium, installWith({})).vent_opening).toBeUndefined()
    for (const missing of ['cells', 'capacity', 'gas_current'] as const) {
      const { [missing]: _left, ...rest } = lead
      expect(ventilation(rest, 0.05)).toBeUndefined()
    }
  })
})
