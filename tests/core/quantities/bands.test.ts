import { describe, expect, it } from 'vitest'
import type { Install } from '#core/install.ts'
import { arrayPower } from '#core/quantities/array.ts'
import { inverterCurrent } from '#core/quantities/changeover-load.ts'
import { islandFaultCurrent, shutdownTime } from '#core/quantities/disconnection-island.ts'
import { linesFed } from '#core/quantities/inverter-lines.ts'
import { resistanceToDevice } from '#core/quantities/loop-route.ts'
import { factsOf } from '#core/report/facts.ts'
import { judgedBase } from '../report/judged.ts'
import { sceneOf } from './circuit-scene.ts'

type Changes = Parameters<typeof judgedBase>[0]

/** A computed number of the base file, with changes. */
function fact(subject: string, name: string, changes: Changes = {}): number | undefined {
  const value = factsOf(judgedBase(changes))[subject]?.[name]?.value
  return typeof value === 'number' ? value : undefined
}

const installOf = (changes: Changes): Install => judgedBase(changes).install

describe('the bands in which a reading is believed', () => {
  it.each([
    ['continuity', 1.5, 0.1, 0.5],
    ['loop', 1.5, 0.1, 0.5],
  ])('%s: half of what is expected, to one and a half of it and a tenth of an ohm', (name, factor, more, low) => {
    const expected = fact('K3', `${name}_expected`) ?? Number.NaN
    expect(expected).toBeGreaterThan(0.5)
    expect(fact('K3', `${name}_highest`)).toBeCloseTo(factor * expected + more, 9)
    expect(fact('K3', `${name}_lowest`)).toBeCloseTo(low * expected, 9)
  })

  it('the fault current at the origin: no less than nine tenths of 230 V through 0.20 Ω', () => {
    expect(fact('supply', 'earth_fault_current_floor')).toBeCloseTo(1035, 9)
    expect(fact('supply', 'earth_fault_current_floor', { remove: ['supply.loop_impedance'] })).toBeUndefined()
  })

  it('overload: 1.45 times what the cable carries (IEC 60364-4-43, 433.1)', () => {
    const carries = fact('K2', 'capacity') ?? Number.NaN
    expect(carries).toBeGreaterThan(10)
    expect(fact('K2', 'overload_limit')).toBeCloseTo(1.45 * carries, 9)
  })
})

describe('counts', () => {
  it('a cable needs a core for each line, one for the neutral and one for the protective conductor', () => {
    expect([fact('K1', 'cores_needed'), fact('K7', 'cores_needed')]).toEqual([3, 5])
  })

  it('an array has the power of all modules of all strings', () => {
    const array = installOf({}).arrays?.['A1']
    expect(array?.strings).toBe(3)
    expect(array && arrayPower(array)).toBe(3 * 12 * 450)
  })
})

describe('the test voltage of the insulation', () => {
  it('follows the voltage between lines where a circuit has several (IEC 60364-6, Table 6.1: 1000 V above 500 V)', () => {
    const high = { set: { 'supply.nominal.voltage': '400 V' } }
    expect(fact('K1', 'insulation_test_voltage', high)).toBe(500)
    expect(fact('K7', 'insulation_test_voltage', high)).toBe(1000)
    expect([fact('K1', 'insulation_test_voltage'), fact('K7', 'insulation_test_voltage')]).toEqual([500, 500])
  })
})

/** A second inverter of the island on the backed-up side, both on one line each. */
const pair = (first: object, second: object): Install =>
  installOf({
    remove: ['arrays', 'batteries', 'readings'],
    set: {
      'inverters.INV': { fed_from: 'CO.load', phases: 1, rated_power: '4.6 kVA', ...first },
      'inverters.INV2': { fed_from: 'CO.load', phases: 1, rated_power: '3 kVA', ...second },
    },
  })

const source = { continuous: '3 kVA', fault_current: '40 A', shuts_down_within: '0.2 s' }

describe('several inverters', () => {
  it('load the changeover by line: 4.6 kVA on one are 20 A there, whatever feeds the others', () => {
    expect(inverterCurrent(sceneOf(pair({ line: 'L1' }, { line: 'L2' })))).toBeCloseTo(20, 9)
    expect(inverterCurrent(sceneOf(pair({ line: 'L1' }, { line: 'L1' })))).toBeCloseTo(7600 / 230, 9)
  })

  it('load it nobody knows how, when one of them does not say its line', () => {
    expect(inverterCurrent(sceneOf(pair({ line: 'L1' }, {})))).toBeUndefined()
  })

  it('have shut down when the slowest has, and nobody knows when if one does not say', () => {
    const slow = { ...source, shuts_down_within: '0.5 s' }
    expect(shutdownTime(sceneOf(pair({ line: 'L1', island: source }, { line: 'L2', island: slow })))).toBe(0.5)
    const silent = { continuous: '3 kVA' }
    expect(shutdownTime(sceneOf(pair({ line: 'L1', island: source }, { line: 'L2', island: silent })))).toBeUndefined()
  })

  it('feed a fault on their own line; on several lines the weakest counts, and one that is silent leaves it open', () => {
    const weak = { ...source, fault_current: '30 A' }
    const scene = sceneOf(pair({ line: 'L1', island: source }, { line: 'L2', island: weak }))
    expect(islandFaultCurrent('K1', ['L1'], scene)).toBe(40)
    expect(islandFaultCurrent('K1', ['L1', 'L2'], scene)).toBe(30)
    expect(islandFaultCurrent('K7', ['L1'], scene)).toBeUndefined()
    const silent = sceneOf(pair({ line: 'L1', island: source }, { line: 'L2', island: { continuous: '3 kVA' } }))
    expect(islandFaultCurrent('K1', ['L1'], silent)).toBeUndefined()
  })

  it('feed all lines on three phases, or where they do not say, or where there is only one', () => {
    const { inverters = {} } = pair({ line: 'L2' }, {})
    const [stated, silent] = Object.values(inverters)
    if (!stated || !silent) throw new Error('two inverters are expected')
    const [three, one] = [
      sceneOf(installOf({})),
      sceneOf(
        installOf({
          remove: ['readings', 'circuits.K2', 'circuits.K3', 'circuits.K7'],
          set: { 'supply.nominal.phases': 1, 'changeover.poles': 2, 'inverters.INV.phases': 1 },
        }),
      ),
    ]
    expect(linesFed(stated, three)).toEqual(['L2'])
    expect(linesFed(silent, three)).toEqual(['L1', 'L2', 'L3'])
    expect(linesFed({ ...stated, phases: 3 }, three)).toEqual(['L1', 'L2', 'L3'])
    expect(linesFed(stated, one)).toEqual(['L1'])
  })
})

describe('the largest fault current at a device', () => {
  it('returns by the better of neutral and protective conductor', () => {
    const scene = (cable: object) =>
      sceneOf(installOf({ set: { 'residual_current.RCD1.cable': { length: '20 m', insulation: 'pvc', ...cable } } }))
    const with4 = resistanceToDevice('EB', scene({ type: '5G4' })) ?? Number.NaN
    const reduced = { line: '4 mm²', neutral: '4 mm²', protective: '1.5 mm²', cores: 5, material: 'copper' }
    expect(resistanceToDevice('EB', scene({ type: undefined, ...reduced, conductor_class: 1 }))).toBeCloseTo(with4, 9)
  })

  it('is not told where the way to one thing behind the device is not known', () => {
    expect(fact('F35', 'loop_expected')).toBeGreaterThan(0.2)
    expect(fact('F35', 'loop_expected', { remove: ['changeover.cable.length'] })).toBeUndefined()
  })
})
