import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Battery } from '#core/install/battery.ts'
import type { Install, PvArray } from '#core/install.ts'
import { islandBudget } from '#core/quantities/budget.ts'
import { courseOf } from '#core/quantities/budget-charge.ts'
import { islandSun } from '#core/quantities/budget-sun.ts'
import { sunPosition } from '#core/quantities/sun.ts'
import { clearSkyIrradiance } from '#core/quantities/sun-irradiance.ts'
import { bakery, plainCircuit } from '../topology/bakery.ts'
import { sceneOf } from './circuit-scene.ts'

const store = { held: 3840, usable: 9600, efficiency: 0.95 }
const dark = () => 0

const battery: Battery = {
  into: 'INV',
  chemistry: 'lithium iron phosphate',
  usable: 9600,
  max_discharge: 5100,
  efficiency: 95,
  place: 'utility room',
}
const array: PvArray = {
  into: 'INV',
  modules_in_series: 16,
  strings: 1,
  module: { voc: 41.2, isc: 13.9, pmax: 450 },
  orientation: { tilt: 30, azimuth: 170 },
  max_input_voltage: 1000,
}
const inverter = { fed_from: 'CO.load', phases: 3, rated_power: 10_000, settings: { held_back_charge: 40 } } as const

const island: Install = {
  ...bakery,
  report: { ...bakery.report, inspected: { from: '2026-06-16' } },
  site: { ...bakery.site, position: { latitude: 47.31, longitude: 9.64 } },
  inverters: { INV: inverter },
  arrays: { A1: array },
  batteries: { BAT: battery },
  circuits: {
    K1: plainCircuit('EB', { load: { power: 1400, must_run: true, daily_energy: 9000 } }),
    K2: plainCircuit('EB', { load: { power: 1200, daily_energy: 3000 } }),
  },
}
const budgetOf = (more: Partial<Install> = {}) => islandBudget(sceneOf({ ...island, ...more }))

describe('the course of a charge', () => {
  test('3.84 kWh at 95 % carry 500 W for 7.296 h', () => {
    const { charge, lasts } = courseOf(store, 500, dark, 48)
    expect(lasts).toBeCloseTo(7.296, 9)
    expect(charge).toHaveLength(49)
    expect(charge.slice(0, 2)).toEqual([3840, expect.closeTo(3840 - 500 / 0.95, 9)])
    expect(charge.at(-1)).toBe(0)
  })

  test('a surplus fills it up and no further; it is not lost again for the load of the next hour', () => {
    const { charge, lasts } = courseOf(store, 500, (hour) => (hour < 2 ? 4500 : 500), 3)
    expect(charge).toEqual([3840, 7840, 9600, 9600])
    expect(lasts).toBeUndefined()
  })

  test('empty at night, charged again by day: the first end counts', () => {
    const { charge, lasts } = courseOf(
      { ...store, held: 500, efficiency: 1 },
      1000,
      (hour) => (hour === 1 ? 3000 : 0),
      3,
    )
    expect(lasts).toBe(0.5)
    expect(charge).toEqual([500, 0, 2000, 1000])
  })

  test('empty just as the sun takes over: the load was never left without', () => {
    const { charge, lasts } = courseOf(
      { ...store, held: 1000, efficiency: 1 },
      1000,
      (hour) => (hour === 1 ? 3000 : 0),
      3,
    )
    expect(charge).toEqual([1000, 0, 2000, 1000])
    expect(lasts).toBeUndefined()
  })

  test('nothing held back lasts no time', () => {
    expect(courseOf({ ...store, held: 0 }, 500, dark, 4).lasts).toBe(0)
  })

  test('a charge stays between empty and full, and more sun never shortens it', () => {
    const watts = fc.array(fc.integer({ min: 0, max: 9000 }), { minLength: 48, maxLength: 48 })
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), watts, (load, sun) => {
        const { charge, lasts = 49 } = courseOf(store, load, (hour) => sun[hour] ?? 0, 48)
        const without = courseOf(store, load, dark, 48).lasts ?? 49
        expect(Math.min(...charge)).toBeGreaterThanOrEqual(0)
        expect(Math.max(...charge)).toBeLessThanOrEqual(store.usable)
        expect(lasts).toBeGreaterThanOrEqual(without)
      }),
    )
  })
})

describe('the island’s budget', () => {
  test('the bakery in June: out of charge in the first night, carried by the sun from the morning on', () => {
    const budget = budgetOf()
    expect(budget).toMatchObject({ hours: 48, held: 3840, usable: 9600, load: 500, mustRunLoad: 375 })
    expect(budget?.withoutSun.lasts).toBeCloseTo(7.296, 9)
    expect(budget?.mustRun?.lasts).toBeCloseTo((3840 * 0.95) / 375, 9)
    // Sunset about 21:20 by the clock there.
    expect(budget?.sunset?.slice(0, 13)).toBe('2026-06-16T19')
    expect(budget?.sun.slice(0, 6)).toEqual([0, 0, 0, 0, 0, 0])
    expect(Math.max(...(budget?.sun ?? []))).toBeGreaterThan(6000)
    expect(Math.max(...(budget?.withSun?.charge ?? []))).toBe(9600)
  })

  test('a clear June day gives such an array about as much energy as its rated power in eight to eleven hours', () => {
    const energy = (budgetOf()?.sun ?? []).slice(0, 24).reduce((sum, power) => sum + power, 0)
    expect(energy / 7200).toBeGreaterThan(8)
    expect(energy / 7200).toBeLessThan(11)
  })

  test('the inverter gives no more than its rated power', () => {
    const budget = budgetOf({ inverters: { INV: { ...inverter, rated_power: 3000 } } })
    expect(Math.max(...(budget?.sun ?? []))).toBe(3000)
  })

  test('several batteries are held as one', () => {
    const budget = budgetOf({ batteries: { B1: battery, B2: { ...battery, usable: 4800, efficiency: 80 } } })
    expect(budget).toMatchObject({ held: expect.closeTo(5760, 9), usable: 14_400 })
    expect(budget?.withoutSun.lasts).toBeCloseTo((5760 * 0.9) / 500, 9)
  })

  test.each([
    ['no position', { site: bakery.site }],
    ['no date', { report: bakery.report }],
    ['no arrays', { arrays: {} }],
    ['an array without orientation', { arrays: { A1: { ...array, orientation: undefined } } }],
    ['a module without power', { arrays: { A1: { ...array, module: { voc: 41.2, isc: 13.9 } } } }],
    ['a sun that does not set', { site: { ...bakery.site, position: { latitude: 75, longitude: 20 } } }],
  ])('%s: the budget goes without the sun', (_why, more) => {
    const budget = budgetOf(more as Partial<Install>)
    expect(budget?.withSun).toBeUndefined()
    expect(budget?.sunset).toBeUndefined()
    expect(budget?.sun).toEqual([])
    expect(budget?.withoutSun.lasts).toBeCloseTo(7.296, 9)
  })

  test('each hour stands for its middle', () => {
    const sun = islandSun(sceneOf(island))
    const middle = new Date((sun?.sunset.getTime() ?? 0) + 12.5 * 3_600_000)
    const position = sunPosition(middle, { latitude: 47.31, longitude: 9.64 })
    const irradiance = clearSkyIrradiance(position, { tilt: 30, azimuth: 170 })
    expect(sun?.powerIn(12)).toBeCloseTo((16 * 450 * irradiance) / 1000, 6)
  })

  test('one array that cannot be told leaves the sun out: half a sum would look like a whole one', () => {
    const { orientation: _none, ...unknown } = array
    expect(budgetOf({ arrays: { A1: array, A2: unknown } })?.withSun).toBeUndefined()
    expect(budgetOf({ arrays: { A1: array, A2: array } })?.withSun).toBeDefined()
  })

  test('an array on the grid side gives the island nothing', () => {
    const inverters = { INV: inverter, PV: { fed_from: 'MB', phases: 3, rated_power: 8000 } as const }
    expect(budgetOf({ inverters, arrays: { A1: { ...array, into: 'PV' } } })?.withSun).toBeUndefined()
  })

  test('a file without inverters or arrays has no sun over its island', () => {
    const { arrays: _arrays, inverters: _inverters, ...bare } = island
    expect(islandSun(sceneOf(bare))).toBeUndefined()
  })

  test('nothing marked as must run: no course for it', () => {
    const circuits = { K2: plainCircuit('EB', { load: { power: 200 } }) }
    expect(budgetOf({ circuits })).toMatchObject({ mustRunLoad: 0, mustRun: undefined })
  })

  test('no battery, nothing stated as held back, no load, or a battery on the grid side: no budget', () => {
    expect(budgetOf({ batteries: {} })).toBeUndefined()
    const { batteries: _batteries, arrays: _arrays, inverters: _inverters, ...bare } = island
    expect(islandBudget(sceneOf(bare))).toBeUndefined()
    expect(budgetOf({ inverters: { INV: { ...inverter, settings: {} } } })).toBeUndefined()
    expect(budgetOf({ circuits: { K2: plainCircuit('EB') } })).toBeUndefined()
    expect(budgetOf({ inverters: { INV: { ...inverter, fed_from: 'MB' } } })).toBeUndefined()
  })

  test('one battery that does not say what it holds back leaves the sum open', () => {
    const inverters = { INV: inverter, IN2: { fed_from: 'CO.load', phases: 3, rated_power: 5000 } as const }
    expect(budgetOf({ inverters, batteries: { B1: battery, B2: { ...battery, into: 'IN2' } } })).toBeUndefined()
  })

  test('the model and its source are stated for the report', () => {
    expect(budgetOf()?.model).toContain('clear sky')
    expect(budgetOf()?.model).toContain('no cloud')
    expect(budgetOf()?.source).toContain('Meinel')
  })

  test('without the sun in it the words claim neither a sunset nor a clear sky', () => {
    const budget = budgetOf({ arrays: {} })
    expect(budget?.model).toContain('The sun is not in it')
    expect(budget?.model).not.toMatch(/sunset|clear sky/)
    expect(budget?.source).not.toContain('Meinel')
  })
})
