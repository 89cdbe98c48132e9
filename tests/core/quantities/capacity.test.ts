import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Cable } from '#core/install.ts'
import {
  ambientFactor,
  cableCapacity,
  groupingFactor,
  referenceTemperature,
  tabulatedCapacity,
} from '#core/quantities/capacity.ts'
import { cable } from '../topology/bakery.ts'

const pvc = (line: number, method: NonNullable<Cable['method']>, more: Partial<Cable> = {}): Cable =>
  cable(line, line, 5, { insulation: 'pvc', method, ...more })

describe('tabulated capacity, IEC 60364-5-52:2009', () => {
  test.each([
    ['B.52.2: PVC, two loaded, 2.5 mm², method C', pvc(2.5, 'C'), 2, 27],
    ['B.52.4: PVC, three loaded, 6 mm², method C', pvc(6, 'C'), 3, 41],
    ['B.52.3: XLPE, two loaded, 1.5 mm², method A2', pvc(1.5, 'A2', { insulation: 'xlpe' }), 2, 18.5],
    ['B.52.5: XLPE, three loaded, 10 mm², method B2', pvc(10, 'B2', { insulation: 'xlpe' }), 3, 60],
    ['XLPE, three loaded, method C is not the column of another table', pvc(10, 'C', { insulation: 'xlpe' }), 3, 71],
    ['the IEC figure for 1.5 mm² in A1, not the German 15.5 A', pvc(1.5, 'A1'), 2, 14.5],
  ] as const)('%s', (_why, described, loaded, expected) => {
    expect(tabulatedCapacity(described, loaded)).toBe(expected)
  })

  test.each([
    ['insulation not stated', cable(2.5, 2.5, 3, { method: 'C' })],
    ['method not stated', cable(2.5, 2.5, 3, { insulation: 'pvc' })],
    ['aluminium', pvc(16, 'C', { material: 'aluminium' })],
    ['a size beyond the copies that agree', pvc(120, 'C')],
  ])('is not guessed: %s', (_why, described) => {
    expect(tabulatedCapacity(described, 2)).toBeUndefined()
    expect(cableCapacity(described, 2)).toBeUndefined()
  })
})

describe('factor for the ambient temperature', () => {
  const printed = {
    'pvc in air': {
      10: 1.22,
      15: 1.17,
      20: 1.12,
      25: 1.06,
      30: 1,
      35: 0.94,
      40: 0.87,
      45: 0.79,
      50: 0.71,
      55: 0.61,
      60: 0.5,
    },
    'xlpe in air': {
      10: 1.15,
      15: 1.12,
      20: 1.08,
      25: 1.04,
      30: 1,
      35: 0.96,
      40: 0.91,
      45: 0.87,
      50: 0.82,
      55: 0.76,
      60: 0.71,
      65: 0.65,
      70: 0.58,
      75: 0.5,
      80: 0.41,
    },
    'pvc in the ground': {
      10: 1.1,
      15: 1.05,
      20: 1,
      25: 0.95,
      30: 0.89,
      35: 0.84,
      40: 0.77,
      45: 0.71,
      50: 0.63,
      55: 0.55,
      60: 0.45,
    },
    'xlpe in the ground': {
      10: 1.07,
      15: 1.04,
      20: 1,
      25: 0.96,
      30: 0.93,
      35: 0.89,
      40: 0.85,
      45: 0.8,
      50: 0.76,
      55: 0.71,
      60: 0.65,
    },
  } as const

  test.each(Object.entries(printed))('every printed cell of %s (B.52.14, B.52.15)', (row, cells) => {
    const insulation = row.startsWith('pvc') ? 'pvc' : 'xlpe'
    const method = row.endsWith('ground') ? 'D1' : 'C'
    for (const [ambient, factor] of Object.entries(cells)) {
      expect(ambientFactor(cable(2.5, 2.5, 3, { insulation, method, ambient: Number(ambient) }))).toBe(factor)
    }
  })

  test('is not the column of a 60 °C conductor, which one calculator page prints for PVC', () => {
    expect(ambientFactor(pvc(2.5, 'C', { ambient: 40 }))).not.toBe(0.82)
  })

  test('is 1 where no temperature is stated, unknown where the insulation is not or has no reserve left', () => {
    expect(ambientFactor(cable(2.5, 2.5, 3))).toBe(1)
    expect(ambientFactor(cable(2.5, 2.5, 3, { ambient: 40 }))).toBeUndefined()
    expect(ambientFactor(pvc(2.5, 'C', { ambient: 70 }))).toBeUndefined()
    expect(cableCapacity(pvc(2.5, 'C', { ambient: 70 }), 2)).toBeUndefined()
    expect([referenceTemperature('D2'), referenceTemperature('E')]).toEqual([20, 30])
  })
})

describe('factor for grouping, B.52.17', () => {
  const grouped = (
    as: NonNullable<Cable['grouped']>['as'],
    circuits: number,
    method: NonNullable<Cable['method']> = 'C',
  ) => groupingFactor(pvc(2.5, method, { grouped: { as, circuits } }))

  test.each([
    ['bunched', 4, 0.65],
    ['bunched', 20, 0.38],
    ['single layer', 2, 0.85],
    ['single layer', 9, 0.7],
    ['single layer, spaced', 2, 0.94],
    ['under ceiling', 1, 0.95],
    ['under ceiling', 3, 0.72],
    ['under ceiling, spaced', 2, 0.85],
  ] as const)('%s, %i circuits: %d', (as, circuits, factor) => {
    expect(grouped(as, circuits)).toBe(factor)
  })

  test('a count between two columns takes the next larger one', () => {
    expect(grouped('bunched', 11)).toBe(0.45)
  })

  test('rows that end flat go on, the others end', () => {
    expect(grouped('single layer', 40)).toBe(0.7)
    expect(grouped('under ceiling, spaced', 12)).toBe(0.85)
    expect(grouped('bunched', 21)).toBeUndefined()
    expect(cableCapacity(pvc(2.5, 'C', { grouped: { as: 'bunched', circuits: 21 } }), 2)).toBeUndefined()
  })

  test('in the ground the rows for touching ducts (B.52.19) and cables (B.52.18) hold', () => {
    expect(grouped('bunched', 3, 'D1')).toBe(0.75)
    expect(grouped('bunched', 3, 'D2')).toBe(0.65)
    expect(grouped('single layer', 10, 'D2')).toBeUndefined()
  })

  test('is 1 for a cable that lies alone', () => {
    expect(groupingFactor(pvc(2.5, 'C'))).toBe(1)
  })
})

// "Cable sizing according to IEC installation method", instruction book of a machine, pp. 92 and 192: whole amperes at
// 30, 40, 45, 50 and 55 °C. The book prints 17.5 A as 17 and 16.47 A as 16.
const sized = {
  B2: {
    1.5: [15, 13, 12, 11, 9],
    2.5: [20, 17, 16, 14, 12],
    4: [27, 23, 21, 19, 16],
    6: [34, 30, 27, 24, 21],
    10: [46, 40, 36, 33, 28],
    16: [62, 54, 49, 44, 38],
    25: [80, 70, 63, 57, 49],
    35: [99, 86, 78, 70, 60],
    50: [118, 103, 93, 84, 72],
    70: [149, 130, 118, 106, 91],
    95: [179, 156, 141, 127, 109],
  },
  C: {
    1.5: [17, 15, 14, 12, 11],
    2.5: [24, 21, 19, 17, 15],
    4: [32, 28, 25, 23, 20],
    6: [41, 36, 32, 29, 25],
    10: [57, 50, 45, 40, 35],
    16: [76, 66, 60, 54, 46],
    25: [96, 84, 76, 68, 59],
    35: [119, 104, 94, 84, 73],
  },
} as const

describe('capacity as installed', () => {
  test.each(Object.entries(sized))('published sizing table, method %s, PVC, three loaded', (method, rows) => {
    for (const [size, amperes] of Object.entries(rows)) {
      for (const [index, ambient] of [30, 40, 45, 50, 55].entries()) {
        const described = pvc(Number(size), method === 'B2' ? 'B2' : 'C', { ambient })
        expect(Math.abs((cableCapacity(described, 3) ?? 0) - (amperes[index] ?? 0))).toBeLessThanOrEqual(1)
      }
    }
  })

  test('2.5 mm² in free air at 45 °C among four circuits carries 15.4 A, less than a load of 16 A (published example)', () => {
    const described = pvc(2.5, 'E', { ambient: 45, grouped: { as: 'bunched', circuits: 4 } })
    expect(cableCapacity(described, 2)).toBeCloseTo(15.405, 9)
  })

  test('more heat or more neighbours never raise it', () => {
    const as = fc.constantFrom(
      'bunched',
      'single layer',
      'under ceiling',
      'single layer, spaced',
      'under ceiling, spaced',
    )
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 19 }),
        fc.integer({ min: 10, max: 55 }),
        as,
        (circuits, ambient, arrangement) => {
          const at = (more: number, hotter: number) =>
            cableCapacity(
              pvc(2.5, 'C', { ambient: ambient + hotter, grouped: { as: arrangement, circuits: circuits + more } }),
              2,
            ) ?? 0
          expect(at(1, 0)).toBeLessThanOrEqual(at(0, 0))
          expect(at(0, 5)).toBeLessThanOrEqual(at(0, 0))
        },
      ),
    )
  })
})
