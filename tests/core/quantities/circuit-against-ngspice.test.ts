import { describe, expect, test } from 'vitest'
import { lineAndReturn } from '#core/quantities/cable-resistance.ts'
import { lostNeutralVoltages } from '#core/quantities/changeover-lost-neutral.ts'
import { faultCurrent } from '#core/quantities/loop-impedance.ts'
import { operatingCurrent } from '#core/quantities/overcurrent-operating.ts'
import { splitCurrent, voltageDrop } from '#core/quantities/voltage-drop.ts'
import { solve } from '../../judges/ngspice.ts'
import { cable } from '../topology/bakery.ts'

const b16 = { kind: 'breaker', curve: 'B', rated: 16 } as const

describe('our formulas against a circuit simulator', () => {
  test('fault loop: Ze 0.35 Ω and 30 m of 2.5/2.5 mm² drive 289.45 A and trip a B16', () => {
    const conductors = lineAndReturn(cable(2.5, 2.5, 3, { length: 30 }), 'protective') ?? 0
    const [simulated] = solve(['V1 s 0 dc 0 ac 230 0', 'R1 s m 0.35', 'R2 m e 0.2223', 'R3 e 0 0.2223'], ['mag(i(V1))'])
    const ours = faultCurrent(230, 0.35 + conductors)
    expect(simulated).toBeCloseTo(289.4538, 3)
    expect(ours).toBeCloseTo(simulated ?? 0, 4)
    expect(ours).toBeGreaterThan(operatingCurrent(b16, 0.4, 'IEC 60269-1') ?? 0)
  })

  test('the same circuit behind 5 kVA at twice their rating: 43.48 A leave the B16 closed', () => {
    const [simulated] = solve(['I1 0 m dc 0 ac 43.478 0', 'R2 m e 0.2223', 'Vm e 0 dc 0 ac 0 0'], ['mag(i(Vm))'])
    expect(simulated).toBeCloseTo(2 * (5000 / 230), 2)
    expect(simulated).toBeLessThan(operatingCurrent(b16, 0.4, 'IEC 60269-1') ?? 0)
  })

  test('voltage drop: 16 A over 30 m of 2.5 mm² at 7.41 mΩ/m drop 7.114 V, 3.093 %', () => {
    const [simulated] = solve(
      ['I1 s 0 dc 0 ac 16 0', 'R1 s l 0.2223', 'V1 l n dc 0 ac 0 0', 'R2 n 0 0.2223'],
      ['mag(v(s))'],
    )
    const stretch = { length: 30, sizes: [1, 1], resistivity: 0.00741, reactance: 0 }
    const ours = voltageDrop(stretch, splitCurrent(16, 1))
    expect(ours).toBeCloseTo(simulated ?? 0, 6)
    expect(ours).toBeCloseTo(7.1136, 4)
    expect((100 * ours) / 230).toBeCloseTo(3.093, 3)
  })

  test('voltage drop with reactance: the part in phase with the supply, as Annex G approximates it', () => {
    // 50 A at cosφ 0.8 through line and neutral of 0.09 Ω and 3.2 mΩ (at 50 Hz) each.
    const angle = -(Math.acos(0.8) * 180) / Math.PI
    const coil = 0.0032 / (2 * Math.PI * 50)
    const elements = [`I1 0 s dc 0 ac 50 ${angle}`, 'R1 s a 0.09', `L1 a l ${coil}`, 'R2 l b 0.09', `L2 b 0 ${coil}`]
    const [real] = solve(elements, ['real(v(s))'])
    const ours = voltageDrop(
      { length: 40, sizes: [10, 10], resistivity: 0.0225, reactance: 0.00008 },
      splitCurrent(50, 0.8),
    )
    expect(ours).toBeCloseTo(real ?? 0, 5)
  })

  test('lost neutral: 2,000, 500 and 100 W come to 85.31, 314.38 and 351.07 V', () => {
    const elements = [
      'V1 a 0 dc 0 ac 230 0',
      'V2 b 0 dc 0 ac 230 -120',
      'V3 c 0 dc 0 ac 230 120',
      'R1 a s 26.45',
      'R2 b s 105.8',
      'R3 c s 529',
    ]
    const simulated = solve(elements, ['mag(v(a,s))', 'mag(v(b,s))', 'mag(v(c,s))'])
    const ours = lostNeutralVoltages(230, [2000 / 230, 500 / 230, 100 / 230]) ?? []
    for (const [index, volts] of [85.31, 314.38, 351.07].entries()) {
      expect(simulated[index]).toBeCloseTo(volts, 2)
      expect(ours[index]).toBeCloseTo(simulated[index] ?? 0, 5)
    }
  })

  test('the simulator says so when it cannot solve', () => {
    expect(() => solve(['R1 a 0 1'], ['mag(v(nowhere))'])).toThrow('ngspice printed no mag(v(nowhere))')
  })
})
