import { describe, expect, it, test } from 'vitest'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import type { Parameters } from '#core/quantities/parameters.ts'
import { judgedBase } from '../report/judged.ts'

/**
 * What the national books answer where publications contradict each other. The numbers stand here once more, apart from
 * the books, as they are printed in the texts that the books name: a slip of the pen in a book fails.
 */
const ANSWERS: readonly (readonly [keyof Parameters, iec: unknown, gb: unknown, de: unknown, au: unknown])[] = [
  ['loop_voltage_factor', 1, 0.95, 1, 1],
  ['loop_reading_factor', 2 / 3, 0.8, 1 / (1.3 * 1.24), 2 / 3],
  ['fuse_currents', 'IEC 60269-1', 'BS 88-2', 'IEC 60269-1', 'IEC 60269-1'],
  ['changeover_neutral', 'as demanded', 'switched', 'as demanded', 'continuous'],
  ['island_electrode', true, true, true, false],
  ['bonding_minimum_combined', 6, 10, 6, 6],
  ['interface_u_high', null, 1.14 * 230, 1.1 * 230, 265],
  ['interface_u_low', null, 0.8 * 230, 0.8 * 230, 180],
  ['interface_f_high', null, 52, 51.5, 52],
  ['interface_f_low', null, 47.5, 47.5, 47],
  ['reconnect_after', 60, 20, 60, 60],
  ['unbalance', null, null, 4600, 21.7 * 230],
  ['array_band', 'factor', 'factor', 'altitude', 'factor'],
  ['array_band_factor', 1.25, 1.25, 1.25, 1.25],
  ['string_fuse_floor', 1.5, 1.1 * 1.25, 1.1 * 1.25, 1.5],
]

describe.each(ANSWERS)('%s', (name, ...answers) => {
  it.each(['iec', 'gb', 'de', 'au'].map((id, index) => [id, answers[index]] as const))('in %s', (id, answer) => {
    const value = shippedBook(id)?.parameters[name]
    if (typeof answer === 'number') expect(value).toBeCloseTo(answer, 6)
    else expect(value).toBe(answer)
  })
})

test('no book was left out above', () => {
  expect(SHIPPED_BOOKS.toSorted()).toEqual(['au', 'de', 'gb', 'iec'])
})

function sheetValue(book: string, set: Readonly<Record<string, unknown>>, id: string, name: string): unknown {
  const { sheets } = judgedBase({ set: { 'report.rulebook': book, ...set } })
  return sheets.find((sheet) => sheet.id === id)?.values[name]
}

describe('one installation by four books', () => {
  test('B16: the reading that still meets is 1.917, 2.185, 1.783 and 1.917 Ω', () => {
    const limits = ['iec', 'gb', 'de', 'au'].map((book) => sheetValue(book, {}, 'K2', 'loop_limit_measured'))
    expect(limits.map((limit) => Number(limit).toFixed(3))).toEqual(['1.917', '2.185', '1.783', '1.917'])
  })

  test.each([
    [16, 2.43],
    [20, 1.68],
    [32, 0.99],
    [63, 0.44],
  ])('a fuse of %i A has the British limit of %f Ω', (rated, limit) => {
    const device = { 'circuits.K2.device': { fuse: `gG ${rated}`, breaking: '50 kA' } }
    expect(Number(sheetValue('gb', device, 'K2', 'loop_limit'))).toBeCloseTo(limit, 9)
    expect(Number(sheetValue('iec', device, 'K2', 'loop_limit'))).not.toBeCloseTo(limit, 2)
  })

  test('a string fuse of 1.4 times the short-circuit current is large enough in two of them', () => {
    const fuse = { 'arrays.A1.string_fuse': '19.5 A' }
    const verdicts = ['iec', 'gb', 'de', 'au'].map(
      (book) =>
        judgedBase({ set: { 'report.rulebook': book, ...fuse } }).findings.find(
          ({ rule }) => rule === 'string-fuse-does-not-trip-in-sunshine',
        )?.verdict,
    )
    expect(verdicts).toEqual(['fails', 'meets', 'meets', 'fails'])
  })

  test('an array of 420 V in the lowlands is tested at 1000 V, and at 500 V where the altitude decides', () => {
    const array = {
      'arrays.A1.modules_in_series': 10,
      'arrays.A1.module.voc': '42 V',
      'site.position.altitude': '420 m',
    }
    const voltages = ['iec', 'gb', 'de', 'au'].map((book) => sheetValue(book, array, 'A1', 'insulation_test_voltage'))
    expect(voltages).toEqual([1000, 1000, 500, 1000])
  })
})
