import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Instrument, UncertaintyKind } from '#core/install/record.ts'
import { spanOf, uncertaintyOf } from '#core/quantities/uncertainty.ts'

const plain: Instrument = { kind: 'tester', serial: '1', calibrated: '2026-03-02', due: '2027-03-02' }
const exact: Instrument = { ...plain, uncertainty: { insulation: 5, array_voltage: 1 } }
const infinity = Number.POSITIVE_INFINITY

describe('relative uncertainty', () => {
  test.each([
    ['insulation', 30],
    ['loop', 30],
    ['continuity', 30],
    ['electrode', 30],
    ['residual_time', 10],
    ['residual_current', 10],
    ['voltage', 0],
    ['time', 0],
    ['array_current', 0],
  ] as const)('%s: %d %% at the widest, by IEC 61557 or none stated', (kind, percent) => {
    expect(uncertaintyOf(kind).percent).toBe(percent)
    expect(uncertaintyOf(kind, plain).percent).toBe(percent)
  })

  test('what the instrument states comes first, kind by kind', () => {
    expect(uncertaintyOf('insulation', exact)).toEqual({ percent: 5, source: 'stated by the instrument' })
    expect(uncertaintyOf('loop', exact).percent).toBe(30)
  })
})

describe('the interval of a reading', () => {
  test('1 MΩ of insulation may be 0.7 to 1.3 MΩ; 1.43 MΩ clear the limit of 1 MΩ: guard band', () => {
    expect(spanOf({ value: 1 }, 'insulation')).toEqual({ low: 0.7, high: 1.3 })
    expect(spanOf({ value: 1.43 }, 'insulation').low).toBeGreaterThan(1)
    expect(spanOf({ value: 1.42 }, 'insulation').low).toBeLessThan(1)
  })

  test('an instrument that is better has a narrower one', () => {
    expect(spanOf({ value: 100 }, 'insulation', exact)).toEqual({ low: 95, high: 105 })
  })

  test('beyond the range: over 200 MΩ has no upper end, under 0.05 Ω starts at nothing', () => {
    expect(spanOf({ value: 200, bound: 'above' }, 'insulation')).toEqual({ low: 140, high: infinity })
    expect(spanOf({ value: 0.05, bound: 'below' }, 'loop')).toEqual({ low: 0, high: expect.closeTo(0.065, 9) })
  })

  test('a device that did not trip never tripped, at both ends', () => {
    expect(spanOf({ value: infinity, noTrip: true }, 'residual_time')).toEqual({ low: infinity, high: infinity })
  })

  test('the value lies in its interval, below zero too', () => {
    const kinds = fc.constantFrom<UncertaintyKind>('insulation', 'loop', 'residual_time', 'irradiance', 'voltage')
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), kinds, (value, kind) => {
        const { low, high } = spanOf({ value }, kind)
        return low <= value && value <= high
      }),
    )
  })
})
