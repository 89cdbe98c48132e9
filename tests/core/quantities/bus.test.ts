import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Bus, Meter } from '#core/install/meter.ts'
import { busFamily } from '#core/quantities/bus.ts'
import { biasVoltage, terminationExpected } from '#core/quantities/bus-electrical.ts'
import { meterFamily } from '#core/quantities/meter.ts'
import { solve } from '../../judges/ngspice.ts'
import { bakery } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

const ends = ['meter', 'inverter']
const link: Bus = { kind: 'RS-485', terminated_at: ends, bias: { voltage: 5, resistors: 560, unit_loads: 32 } }
const ofBus = (bus: Bus) => compute(busFamily, { bus }, sceneOf(bakery))
const ofMeter = (meter: Meter) => compute(meterFamily, meter, sceneOf(bakery))

describe('resistance across the pair', () => {
  test.each([
    [1, 120],
    [2, 60],
    [3, 40],
  ])('%d terminating resistors of 120 Ω: %d Ω', (count, ohms) => {
    expect(terminationExpected(count)).toBe(ohms)
  })

  test('no resistor, none stated, or no RS-485: nothing to expect', () => {
    expect(ofBus({ kind: 'RS-485', terminated_at: [] }).termination_expected).toBeUndefined()
    expect(ofBus({ kind: 'RS-485' }).termination_expected).toBeUndefined()
    expect(ofBus({ kind: 'Ethernet', terminated_at: ends }).termination_expected).toBeUndefined()
  })
})

describe('bias of the idle pair', () => {
  test.each([
    [560, 0, 254],
    [560, 32, 221],
    [680, 32, 183],
    [4700, 0, 32],
  ])(
    '5 V over two resistors of %d Ω, two ends terminated, %d unit loads: %d mV, as a circuit simulator finds',
    (resistors, loads, rounded) => {
      const receivers = loads === 0 ? [] : [`R5 a b ${12_000 / loads}`]
      const terminators = ['R3 a b 120', 'R4 a b 120']
      const netlist = ['V1 p 0 dc 0 ac 5 0', `R1 p a ${resistors}`, `R2 b 0 ${resistors}`, ...terminators, ...receivers]
      const [volts] = solve(netlist, ['mag(v(a,b))'])
      const ours = biasVoltage(5, resistors, 2, loads)
      expect(ours).toBeCloseTo(1000 * (volts ?? 0), 4)
      expect(Math.round(ours)).toBe(rounded)
    },
  )

  test('more receivers never raise it, and it never exceeds the supply of the bias', () => {
    const loads = fc.integer({ min: 0, max: 256 })
    fc.assert(
      fc.property(
        fc.integer({ min: 100, max: 10_000 }),
        fc.integer({ min: 0, max: 3 }),
        loads,
        (ohms, ended, count) => {
          const now = biasVoltage(5, ohms, ended, count)
          return now <= 5000 && biasVoltage(5, ohms, ended, count + 1) < now
        },
      ),
    )
  })

  test('no bias stated, or no word on the terminating resistors: nothing', () => {
    expect(ofBus({ kind: 'RS-485', terminated_at: ends }).bias_voltage).toBeUndefined()
    expect(ofBus({ kind: 'RS-485', bias: { voltage: 5, resistors: 560 } }).bias_voltage).toBeUndefined()
  })

  test('no unit loads stated: the terminating resistors alone', () => {
    const bias = { voltage: 5, resistors: 560 }
    expect(ofBus({ kind: 'RS-485', terminated_at: ends, bias }).bias_voltage).toBeCloseTo(254.24, 2)
  })
})

test('the meter shows what its link shows, and nothing without one', () => {
  const meter: Meter = { id: 'M1', at: 'connection point', link }
  expect(ofMeter(meter)).toEqual(ofBus(link))
  expect(ofMeter(meter).termination_expected).toBe(60)
  expect(ofMeter({ id: 'M1', at: 'connection point' })).toEqual({})
})
