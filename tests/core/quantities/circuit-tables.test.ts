import { describe, expect, test } from 'vitest'
import adiabatic from '#schemas/tables/adiabatic-factors.json' with { type: 'json' }
import bonding from '#schemas/tables/bonding-conductors.json' with { type: 'json' }
import breakers from '#schemas/tables/breaker-bands.json' with { type: 'json' }
import resistance from '#schemas/tables/conductor-resistance.json' with { type: 'json' }
import sizes from '#schemas/tables/conductor-sizes.json' with { type: 'json' }
import capacities from '#schemas/tables/current-carrying-capacity.json' with { type: 'json' }
import times from '#schemas/tables/disconnection-times.json' with { type: 'json' }
import fuses from '#schemas/tables/fuse-currents.json' with { type: 'json' }
import grouping from '#schemas/tables/grouping-factors.json' with { type: 'json' }
import insulation from '#schemas/tables/insulation-minima.json' with { type: 'json' }
import intervals from '#schemas/tables/periodic-intervals.json' with { type: 'json' }
import protective from '#schemas/tables/protective-conductors.json' with { type: 'json' }

const tables = {
  adiabatic,
  bonding,
  breakers,
  capacities,
  fuses,
  grouping,
  insulation,
  intervals,
  protective,
  resistance,
  sizes,
  times,
}

const rising = (values: readonly number[]) =>
  values.every((value, index) => index === 0 || value > (values[index - 1] ?? 0))
const falling = (values: readonly number[]) =>
  values.every((value, index) => index === 0 || value <= (values[index - 1] ?? 0))
const bySize = (row: Readonly<Record<string, number>>) =>
  Object.entries(row)
    .toSorted(([a], [b]) => Number(a) - Number(b))
    .map(([, value]) => value)

test.each(Object.entries(tables))('the table of %s says what it holds, in which unit, after whom', (_name, table) => {
  expect(table.title.length).toBeGreaterThan(10)
  expect(typeof table.unit).toBe('string')
  expect(table.source.publication.length).toBeGreaterThan(5)
  expect(table.notes.length).toBeGreaterThan(0)
})

describe('a slip of transcription would break an order', () => {
  test.each(Object.entries(capacities.rows))('%s: a thicker conductor carries more, in every method', (_row, cells) => {
    const lines = Object.entries(cells)
      .toSorted(([a], [b]) => Number(a) - Number(b))
      .map(([, methods]) => methods)
    expect(lines).toHaveLength(11)
    for (const method of ['A1', 'A2', 'B1', 'B2', 'C', 'D1', 'D2', 'E'] as const) {
      expect(rising(lines.map((cell) => cell[method]))).toBe(true)
    }
    for (const { A1, A2, B1, B2, C, E } of lines) {
      expect(A2 <= A1 && A1 < B1 && B2 <= B1 && B1 < C && C < E).toBe(true)
    }
  })

  test('three loaded conductors carry less than two, PVC less than XLPE', () => {
    for (const [size, cell] of Object.entries(capacities.rows['pvc 2'])) {
      const key = size as keyof (typeof capacities.rows)['pvc 2']
      expect(capacities.rows['pvc 3'][key].C).toBeLessThan(cell.C)
      expect(capacities.rows['xlpe 2'][key].E).toBeGreaterThan(cell.E)
    }
  })

  test.each(Object.entries(grouping.rows))('%s: more circuits never raise the factor', (_row, factors) => {
    expect(falling(factors)).toBe(true)
    expect(factors.length).toBeLessThanOrEqual(grouping.counts.length)
  })

  test.each(Object.entries(resistance.rows))('%s: a thicker conductor resists less', (_row, ohms) => {
    expect(rising(bySize(ohms).toReversed())).toBe(true)
  })

  test.each(Object.entries(fuses.rows))('gG at %s s: a larger fuse takes more', (_time, amperes) => {
    expect(rising(bySize(amperes))).toBe(true)
  })

  test('a fuse takes more for 0.4 s than for 5 s', () => {
    expect(bySize(fuses.rows['0.4']).every((current, index) => current > (bySize(fuses.rows['5'])[index] ?? 0))).toBe(
      true,
    )
  })

  test('bands of voltage follow each other without a gap, and TT is the faster', () => {
    for (const [index, { above, TN, TT }] of times.bands.entries()) {
      if (index > 0) expect(above).toBe(times.bands[index - 1]?.upTo)
      expect(TT).toBeLessThan(TN)
    }
  })
})
