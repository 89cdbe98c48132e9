import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Site } from '#core/install/site.ts'
import type { PvArray, PvModule } from '#core/install.ts'
import { arrayFamily } from '#core/quantities/array.ts'
import { fuseMaximum, fuseNeeded } from '#core/quantities/array-fuse.ts'
import { altitudeFactor, arrayInsulationTest } from '#core/quantities/array-insulation.ts'
import { highestVoltage, lowestOperatingVoltage, tabulatedVoltageFactor } from '#core/quantities/array-voltage.ts'
import type { Parameters } from '#core/quantities/parameters.ts'
import { bakery } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

function array(modules: number, module: Partial<PvModule>, more: Partial<PvArray> = {}): PvArray {
  return {
    into: 'INV',
    modules_in_series: modules,
    strings: 1,
    module: { voc: 49.5, isc: 10, ...module },
    max_input_voltage: 1000,
    ...more,
  }
}

function quantities(item: PvArray, site: Partial<Site> = {}, book: Partial<Parameters> = {}) {
  const scene = sceneOf({ ...bakery, site: { ...bakery.site, ...site } }, book)
  return compute(arrayFamily, { id: 'A1', array: item }, scene)
}

const bakeryModule = { voc: 41.2, isc: 13.9, vmp: 34.5, imp: 13.1, pmax: 450, max_fuse: 25 }

describe('highest open-circuit voltage', () => {
  test('49.5 V at −0.27 %/K and −10 °C: 54.18 V a module, 11 stay under 600 V with 595.96 V: electrician course text', () => {
    expect(highestVoltage(array(1, { voc_coefficient: -0.27 }), -10)).toBeCloseTo(54.18, 2)
    expect(highestVoltage(array(11, { voc_coefficient: -0.27 }), -10)).toBeCloseTo(595.96, 2)
    expect(highestVoltage(array(12, { voc_coefficient: -0.27 }), -10)).toBeGreaterThan(600)
  })

  test('the same by the table: 56.43 V a module, only 10 stay under 600 V: electrician course text', () => {
    expect(highestVoltage(array(1, {}), -10)).toBeCloseTo(56.43, 2)
    expect(highestVoltage(array(10, {}), -10)).toBeLessThan(600)
    expect(highestVoltage(array(11, {}), -10)).toBeGreaterThan(600)
  })

  test('two modules of 38.9 V at −20 °C: 91.8 V by factor 1.18, not 79.3 V by the row for 24 °C: a course corrected', () => {
    expect(highestVoltage(array(2, { voc: 38.9 }), -20)).toBeCloseTo(91.8, 1)
  })

  test.each([
    [60, 1.02],
    [20, 1.02],
    [19.9, 1.04],
    [0, 1.1],
    [-0.5, 1.12],
    [-5.5, 1.14],
    [-16, 1.18],
    [-40, 1.25],
    [-40.1, undefined],
  ])('factor of NEC 690.7(A) at %d °C: %s', (lowest, factor) => {
    expect(tabulatedVoltageFactor(lowest)).toBe(factor)
  })

  test('colder is never lower', () => {
    fc.assert(
      fc.property(fc.integer({ min: -40, max: 60 }), fc.boolean(), (lowest, stated) => {
        const item = array(12, stated ? { voc_coefficient: -0.27 } : {})
        return (highestVoltage(item, lowest) ?? 0) >= (highestVoltage(item, lowest + 1) ?? 0)
      }),
    )
  })

  test('below −40 °C the table ends and only a coefficient helps', () => {
    expect(highestVoltage(array(12, {}), -45)).toBeUndefined()
    expect(highestVoltage(array(12, { voc_coefficient: -0.27 }), -45)).toBeGreaterThan(12 * 49.5)
  })
})

describe('lowest voltage at maximum power', () => {
  test('its own coefficient is used and that of the open circuit never stands in', () => {
    const module = { ...bakeryModule, voc_coefficient: -0.27 }
    expect(lowestOperatingVoltage(array(12, { ...module, vmp_coefficient: -0.35 }), 70)).toBeCloseTo(348.795, 3)
    expect(lowestOperatingVoltage(array(12, module), 70)).toBeUndefined()
    expect(lowestOperatingVoltage(array(12, { vmp_coefficient: -0.35 }), 70)).toBeUndefined()
  })
})

describe('string fuses, IEC 62548 as reproduced for IS/IEC 62548', () => {
  test('two strings of 12.28 A and a highest series fuse of 20 A need none; three do', () => {
    expect(fuseNeeded(array(16, { isc: 12.28, max_fuse: 20 }, { strings: 2 }))).toBe(false)
    expect(fuseNeeded(array(16, { isc: 12.28, max_fuse: 20 }, { strings: 3 }))).toBe(true)
  })

  test('the other strings just reach the highest series fuse: none needed', () => {
    expect(fuseNeeded(array(16, { isc: 10, max_fuse: 20 }, { strings: 3 }))).toBe(false)
  })

  test('a single string needs none whatever the datasheet says; several with nothing stated cannot be told', () => {
    expect(fuseNeeded(array(16, {}))).toBe(false)
    expect(fuseNeeded(array(16, {}, { strings: 2 }))).toBeUndefined()
  })

  test('the ceiling is 2.4 · Isc or the highest series fuse, whichever is smaller', () => {
    expect(fuseMaximum(array(16, { isc: 13.9, max_fuse: 25 }), 2.4)).toBe(25)
    expect(fuseMaximum(array(16, { isc: 5, max_fuse: 25 }), 2.4)).toBe(12)
    expect(fuseMaximum(array(16, { isc: 5 }), 2.4)).toBeUndefined()
  })

  test('11.2 A in the United States: 14.0 A to carry, fuse from 17.5 A: electrician course text', () => {
    const values = quantities(array(11, { isc: 11.2 }), {}, { string_fuse_floor: 1.25 * 1.25 })
    expect(values.current_maximum).toBeCloseTo(14, 9)
    expect(values.fuse_minimum).toBeCloseTo(17.5, 9)
  })

  test('three strings of 10.07 A: 37.76 A to carry: study notes', () => {
    expect(quantities(array(12, { isc: 10.07 }, { strings: 3 })).current_maximum).toBeCloseTo(37.76, 2)
  })
})

describe('insulation of the array, IEC 62446-1 as printed by a Swiss test house', () => {
  test.each([
    [100, 250, 0.5],
    [119.9, 250, 0.5],
    [120, 500, 1],
    [400, 500, 1],
    [500, 500, 1],
    [500.1, 1000, 1],
    [600, 1000, 1],
    [1000, 1000, 1],
    [1000.1, 1500, 1],
    [1200, 1500, 1],
  ])('a system voltage of %d V is tested with %d V and must show %d MΩ', (system, voltage, minimum) => {
    expect(arrayInsulationTest(system)).toEqual({ voltage, minimum })
  })

  test.each([
    [400, 1.15],
    [800, 1.15],
    [1200, 1.2],
    [1500, 1.2],
    [1800, 1.25],
  ])('at %d m the factor is %d', (altitude, factor) => {
    expect(altitudeFactor(altitude)).toBe(factor)
  })

  test('near the edge of a band the two ways ask for different test voltages', () => {
    const item = array(10, { voc: 41.2 })
    const position = { latitude: 47, longitude: 9, altitude: 400 }
    expect(quantities(item, { position })).toMatchObject({ system_voltage: 515, insulation_test_voltage: 1000 })
    expect(quantities(item, { position }, { array_band: 'altitude' })).toMatchObject({ insulation_test_voltage: 500 })
  })

  test('the factor by altitude shows only where the rule book goes by it', () => {
    const position = { latitude: 47, longitude: 9, altitude: 1200 }
    expect(quantities(array(10, {}), { position }, { array_band: 'altitude' }).altitude_factor).toBe(1.2)
    expect(quantities(array(10, {}), { position }).altitude_factor).toBeUndefined()
    expect(quantities(array(10, {}), {}, { array_band: 'altitude' }).altitude_factor).toBeUndefined()
  })

  test('by altitude with none stated nothing is guessed', () => {
    const values = quantities(array(10, {}), {}, { array_band: 'altitude' })
    expect(values.system_voltage).toBeUndefined()
    expect(values.insulation_test_voltage).toBeUndefined()
    expect(values.insulation_minimum).toBeUndefined()
  })
})

describe('the family', () => {
  test('the bakery at −12 °C and 70 °C', () => {
    const item = array(16, { ...bakeryModule, voc_coefficient: -0.27, vmp_coefficient: -0.35 })
    const values = quantities(item, { lowest_temperature: -12, highest_cell_temperature: 70 })
    expect(values.voc_maximum).toBeCloseTo(16 * 41.2 * (1 + 0.0027 * 37), 9)
    expect(values.vmp_minimum).toBeCloseTo(16 * 34.5 * (1 - 0.0035 * 45), 9)
    expect(values).toMatchObject({ power_stc: 7200, fuse_needed: false, fuse_maximum: 25, insulation_minimum: 1 })
  })

  test('what is not stated is not computed', () => {
    const values = quantities(array(16, {}))
    expect(values.voc_maximum).toBeUndefined()
    expect(values.vmp_minimum).toBeUndefined()
    expect(values.power_stc).toBeUndefined()
  })
})
