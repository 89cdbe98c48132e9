import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { standardSize } from '#core/quantities/adiabatic.ts'
import { splitCurrent, voltageDrop } from '#core/quantities/voltage-drop.ts'

const reactance = 0.00008

// Lengths at which 16 A through 1.5 mm² drop 6.9 V, 3 % of 230 V, at cosφ 0.8.
const lengths = [
  ['cold pocket formula with κ = 56', 22.64, 1 / 56, 0],
  ['Annex G', 17.9, 0.0225, reactance],
  ['Annex G with the reactance taken in Ω/m, as some do', 3.594, 0.0225, 0.08],
] as const

describe('voltage drop, Annex G', () => {
  test.each(lengths)(
    'length for 3 %%, %s: %d m (S. Fassbinder, ep Elektropraktiker)',
    (_how, length, resistivity, lambda) => {
      const stretch = { length, sizes: [1.5, 1.5], resistivity, reactance: lambda }
      expect(voltageDrop(stretch, splitCurrent(16, 0.8))).toBeCloseTo(6.9, 1)
    },
  )

  test('16 A over 30 m within 6.9 V need 2.44 mm², so 2.5 mm² (published calculation)', () => {
    const stretch = { length: 30, sizes: [2.435, 2.435], resistivity: 0.0175, reactance: 0 }
    expect(voltageDrop(stretch, splitCurrent(16, 1))).toBeCloseTo(6.9, 2)
    expect(standardSize(2.435)).toBe(2.5)
  })

  test('2.5 mm² at 18 mV/A/m over 40 m with 32 A drops 23.04 V (published calculation)', () => {
    const stretch = { length: 40, sizes: [2.5, 2.5], resistivity: 0.0225, reactance: 0 }
    expect(voltageDrop(stretch, splitCurrent(32, 1))).toBeCloseTo(23.04, 6)
  })

  test('three-phase, 0.87 and 0.08 Ω/km, 84.9 A, cosφ 0.85, 100 m: 11.49 V between lines, not the 11.8 V that one page prints', () => {
    const stretch = { length: 100, sizes: [1], resistivity: 0.00087, reactance }
    expect(Math.sqrt(3) * voltageDrop(stretch, splitCurrent(84.9, 0.85))).toBeCloseTo(11.49, 2)
  })

  test('25 m of 2.5 mm² with 16 A: 2.48 % with κ = 56, but 3.13 % with ρ1 at operating temperature', () => {
    const percent = (resistivity: number) =>
      (100 / 230) * voltageDrop({ length: 25, sizes: [2.5, 2.5], resistivity, reactance: 0 }, splitCurrent(16, 1))
    expect(percent(1 / 56)).toBeCloseTo(2.48, 2)
    expect(percent(0.0225)).toBeCloseTo(3.13, 2)
  })

  test('a longer or thinner cable and a larger current never lower it; the neutral doubles it', () => {
    const number = (min: number, max: number) => fc.double({ min, max, noNaN: true })
    fc.assert(
      fc.property(number(0, 200), number(0.5, 95), number(0, 100), number(0.1, 1), (length, size, current, cosine) => {
        const at = (more: { length?: number; size?: number; current?: number; twice?: boolean }) => {
          const one = more.size ?? size
          const stretch = {
            length: more.length ?? length,
            sizes: more.twice ? [one, one] : [one],
            resistivity: 0.0225,
            reactance,
          }
          return voltageDrop(stretch, splitCurrent(more.current ?? current, cosine))
        }
        expect(at({ length: length + 1 })).toBeGreaterThanOrEqual(at({}))
        expect(at({ size: size / 2 })).toBeGreaterThanOrEqual(at({}))
        expect(at({ current: current * 2 })).toBeGreaterThanOrEqual(at({}))
        expect(at({ twice: true })).toBeCloseTo(2 * at({}), 9)
      }),
    )
  })
})
