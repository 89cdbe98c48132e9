import fc from 'fast-check'
import { expect, test } from 'vitest'
import { neutralMinimum } from '#core/quantities/circuit-neutral.ts'
import sizes from '#schemas/tables/conductor-sizes.json' with { type: 'json' }

const size = fc.constantFrom(...sizes.rows)
const material = fc.constantFrom('copper' as const, 'aluminium' as const)

test('on one line the neutral is as large as the line, however large that is', () => {
  fc.assert(
    fc.property(size, material, (line, of) => {
      expect(neutralMinimum({ line, material: of }, 1)).toBe(line)
    }),
  )
})

test.each([
  [16, 'copper', 16],
  [25, 'copper', 16],
  [95, 'copper', 16],
  [16, 'aluminium', 16],
  [25, 'aluminium', 25],
  [35, 'aluminium', 25],
] as const)('beside lines of %i mm² %s on three phases: %i mm²', (line, of, least) => {
  expect(neutralMinimum({ line, material: of }, 3)).toBe(least)
  expect(neutralMinimum({ line, material: of }, 2)).toBe(least)
})

test('is never larger than the line', () => {
  fc.assert(
    fc.property(size, material, fc.integer({ min: 1, max: 3 }), (line, of, lines) => {
      expect(neutralMinimum({ line, material: of }, lines)).toBeLessThanOrEqual(line)
    }),
  )
})
