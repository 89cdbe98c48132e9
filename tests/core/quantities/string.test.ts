import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Measured, NotTested } from '#core/glossary.ts'
import type { StringReadings } from '#core/install/readings.ts'
import type { PvArray, PvModule } from '#core/install.ts'
import { stringFamily } from '#core/quantities/string.ts'
import { median, modulesMissing } from '#core/quantities/string-spread.ts'
import { currentAtStc, expectedCurrent, expectedVoltage, voltageAtStc } from '#core/quantities/string-translation.ts'
import { bakery } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

const of = (value: number): Measured => ({ value })

function array(modules: number, module: Partial<PvModule> = {}): PvArray {
  return {
    into: 'INV',
    modules_in_series: modules,
    strings: 4,
    module: { voc: 49.5, isc: 9.8, ...module },
    max_input_voltage: 1000,
  }
}

function readStrings(item: PvArray, strings: readonly (StringReadings | NotTested)[]) {
  const scene = sceneOf({ ...bakery, arrays: { A1: item }, readings: { arrays: { A1: { strings } } } })
  return strings.map((string, index) => {
    const readings = 'not_tested' in string ? undefined : string
    return compute(stringFamily, { id: `A1/${index + 1}`, arrayId: 'A1', array: item, readings }, scene)
  })
}

describe('readings translated to standard test conditions', () => {
  const day = { irradiance: of(880), cell_temperature: of(52 + 2), isc: of(8.72), voc: of(748) }
  const datasheet = { isc_coefficient: 0.05, voc_coefficient: -0.3 }

  test('8.72 A at 880 W/m² and 54 °C are 9.77 A: a sample procedure for field readings', () => {
    expect(currentAtStc(array(16, datasheet), day)).toBeCloseTo(9.7675, 4)
  })

  test('748 V at 54 °C are 819 V: the same procedure', () => {
    expect(voltageAtStc(array(16, datasheet), day)).toBeCloseTo(819.28, 2)
  })

  test('12 modules of 49.5 V at −0.27 %/K and 40 °C: 569.94 V to be expected', () => {
    expect(expectedVoltage(array(12, { voc_coefficient: -0.27 }), { cell_temperature: of(40) })).toBeCloseTo(569.94, 1)
  })

  test('a cold morning below zero is a temperature like any other', () => {
    const expected = expectedVoltage(array(12, { voc_coefficient: -0.27 }), { cell_temperature: of(-5) })
    expect(expected).toBeCloseTo(12 * 49.5 * (1 + 0.0027 * 30), 9)
  })

  test('expecting and translating are each other’s reverse', () => {
    const finite = (min: number, max: number) => fc.double({ min, max, noNaN: true })
    fc.assert(
      fc.property(finite(100, 1200), finite(-30, 90), finite(-0.5, -0.1), finite(0, 0.1), (sun, cell, beta, alpha) => {
        const item = array(12, { voc_coefficient: beta, isc_coefficient: alpha })
        const readings = { irradiance: of(sun), cell_temperature: of(cell) }
        const voc = expectedVoltage(item, readings) ?? 0
        const isc = expectedCurrent(item, readings) ?? 0
        expect(voltageAtStc(item, { ...readings, voc: of(voc) })).toBeCloseTo(12 * 49.5, 6)
        expect(currentAtStc(item, { ...readings, isc: of(isc) })).toBeCloseTo(9.8, 6)
      }),
    )
  })

  test.each([
    ['no coefficient', {}, day],
    ['no temperature', datasheet, { irradiance: of(880), isc: of(8.72), voc: of(748) }],
    ['a temperature not tested', datasheet, { ...day, cell_temperature: { not_tested: 'no sensor' } }],
    [
      'a temperature beyond the instrument',
      datasheet,
      { ...day, cell_temperature: { value: 80, bound: 'above' as const } },
    ],
  ])('%s: nothing is expected', (_why, module, readings: StringReadings) => {
    expect(expectedVoltage(array(12, module), readings)).toBeUndefined()
    expect(expectedCurrent(array(12, module), readings)).toBeUndefined()
    expect(voltageAtStc(array(12, module), readings)).toBeUndefined()
    expect(currentAtStc(array(12, module), readings)).toBeUndefined()
  })

  test('the voltage can be expected without the irradiance, the current cannot', () => {
    const readings = { cell_temperature: of(30), isc: of(8), voc: of(500) }
    expect(expectedVoltage(array(12, datasheet), readings)).toBeGreaterThan(0)
    expect(expectedCurrent(array(12, datasheet), readings)).toBeUndefined()
    expect(currentAtStc(array(12, datasheet), readings)).toBeUndefined()
  })
})

describe('the sun when the string was read', () => {
  const position = { latitude: 47.31, longitude: 9.64 }
  const elevation = (readings: StringReadings | undefined, site: object) => {
    const scene = sceneOf({ ...bakery, site: { ...bakery.site, ...site } })
    return compute(stringFamily, { id: 'A1/1', arrayId: 'A1', array: array(12), readings }, scene).sun_elevation
  }

  test('an hour off by its offset turns a noon reading into one by night', () => {
    expect(elevation({ taken: '2026-06-16T12:00:00+02:00' }, { position })).toBeGreaterThan(55)
    expect(elevation({ taken: '2026-06-16T12:00:00-10:00' }, { position })).toBeLessThan(0)
  })

  test('without a time, a position or a reading it is not known', () => {
    expect(elevation({}, { position })).toBeUndefined()
    expect(elevation({ taken: '2026-06-16T12:00:00+02:00' }, {})).toBeUndefined()
    expect(elevation(undefined, { position })).toBeUndefined()
  })
})

describe('strings of an array against each other', () => {
  test('570.1, 571.8, 569.4 and 523.0 V: the fourth lies 8.21 % below the median of 569.75 V', () => {
    const strings = [570.1, 571.8, 569.4, 523].map((volts) => ({ voc: of(volts) }))
    const deviations = readStrings(array(12), strings).map((values) => Number(values.voc_deviation))
    expect(median([570.1, 571.8, 569.4, 523])).toBeCloseTo(569.75, 9)
    for (const [index, percent] of [0.06, 0.36, -0.06, -8.21].entries()) {
      expect(deviations[index]).toBeCloseTo(percent, 2)
    }
  })

  test('8.9, 9.0 and 8.4 A: the third lies 5.62 % below the median', () => {
    const values = readStrings(array(12), [{ isc: of(8.9) }, { isc: of(9) }, { isc: of(8.4) }])
    expect(values.map(({ isc_deviation }) => Number(isc_deviation).toFixed(2))).toEqual(['0.00', '1.12', '-5.62'])
  })

  test('under a changing sky translated currents agree where raw ones do not', () => {
    const item = array(12, { isc_coefficient: 0 })
    const sky = [1000, 500, 800].map((sun) => ({
      isc: of((9.8 * sun) / 1000),
      irradiance: of(sun),
      cell_temperature: of(25),
    }))
    expect(readStrings(item, sky).map(({ isc_deviation }) => Number(isc_deviation).toFixed(6))).toEqual([
      '0.000000',
      '0.000000',
      '0.000000',
    ])
    const [, second] = readStrings(item, [...sky.slice(0, 2), { isc: of(9.8) }])
    expect(second?.isc_deviation).toBeCloseTo(-50, 9)
  })

  test('strings not tested or beyond the instrument stay out of the median', () => {
    const values = readStrings(array(12), [
      { voc: of(570) },
      { voc: { value: 1000, bound: 'above' } },
      { not_tested: 'roof wet' },
      { voc: of(560) },
    ])
    expect(values[0]?.voc_deviation).toBeCloseTo((100 * 5) / 565, 9)
    expect(values[1]?.voc_deviation).toBeUndefined()
    expect(values[2]?.voc_deviation).toBeUndefined()
  })

  test('a string of an array that nobody read has nothing to be compared with', () => {
    const item = array(12)
    const readings = { voc: of(570) }
    const values = compute(stringFamily, { id: 'A1/1', arrayId: 'A1', array: item, readings }, sceneOf(bakery))
    expect(values.voc_deviation).toBeUndefined()
    expect(median([])).toBeUndefined()
  })

  test('the median lies between the extremes and does not depend on the order', () => {
    const values = fc.array(fc.double({ min: 1, max: 1000, noNaN: true }), { minLength: 1, maxLength: 9 })
    fc.assert(
      fc.property(values, (list) => {
        const middle = median(list) ?? 0
        expect(middle).toBeGreaterThanOrEqual(Math.min(...list))
        expect(middle).toBeLessThanOrEqual(Math.max(...list))
        expect(median(list.toReversed())).toBe(middle)
      }),
    )
  })
})

describe('a missing module', () => {
  test('12 modules: 8.3 % each; 22 modules: 4.5 %, inside a spread of 5 %', () => {
    expect(readStrings(array(12), [{}])[0]?.missing_module_voltage).toBeCloseTo(8.33, 2)
    expect(readStrings(array(22), [{}])[0]?.missing_module_voltage).toBeCloseTo(4.55, 2)
  })

  test('the estimate finds every whole number of modules that are not there', () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 30 }), fc.integer({ min: 0, max: 5 }), (modules, missing) => {
        expect(modulesMissing((-100 * missing) / modules, modules)).toBe(missing)
      }),
    )
  })

  test('more voltage than expected, or less than half a module too little, is none missing', () => {
    expect(modulesMissing(3, 12)).toBe(0)
    expect(modulesMissing(-4, 12)).toBe(0)
    expect(modulesMissing(-4.2, 12)).toBe(1)
  })

  test('a string of 22 with 21 modules in it is found although it lies within 5 %', () => {
    const item = array(22, { voc_coefficient: -0.27 })
    const [values] = readStrings(item, [{ voc: of(21 * 49.5), cell_temperature: of(25) }])
    expect(values?.voc_from_expected).toBeCloseTo(-4.545, 3)
    expect(values?.modules_missing_estimate).toBe(1)
  })
})

describe('the family', () => {
  test('the bakery’s string: 652 V and 9.8 A at 712 W/m² and 31 °C', () => {
    const module = { voc: 41.2, isc: 13.9, voc_coefficient: -0.27, isc_coefficient: 0.05 }
    const readings = { voc: of(652), isc: of(9.8), irradiance: of(712), cell_temperature: of(31) }
    const [values] = readStrings(array(16, module), [readings])
    expect(values?.voc_expected).toBeCloseTo(16 * 41.2 * (1 - 0.0027 * 6), 9)
    expect(values?.isc_expected).toBeCloseTo(13.9 * 0.712 * 1.003, 9)
    expect(values?.voc_from_expected).toBeCloseTo(0.54, 2)
    expect(values?.isc_from_expected).toBeCloseTo(-1.27, 2)
    expect(values).toMatchObject({
      voc_deviation: 0,
      isc_deviation: 0,
      modules_missing_estimate: 0,
      insulation_test_voltage: 1000,
      insulation_minimum: 1,
    })
  })

  test('a string that was not read has only what follows from the design', () => {
    const [values] = readStrings(array(12), [{ not_tested: 'roof wet' }])
    const known = Object.entries(values ?? {}).filter(([, value]) => value !== undefined)
    expect(known.map(([name]) => name)).toEqual([
      'missing_module_voltage',
      'system_voltage',
      'insulation_test_voltage',
      'insulation_minimum',
    ])
  })
})
