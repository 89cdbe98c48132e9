import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Install, ResidualCurrentDevice } from '#core/install.ts'
import { residualCurrentFamily } from '#core/quantities/residual-current.ts'
import { longestTripTime, rampBand, shortestTripTime } from '#core/quantities/residual-current-bands.ts'
import { bakery, cable, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

const general = { type: 'A', residual: 30 } as const
const delayed = { type: 'A', residual: 300, delay: 'S' } as const

function quantities(id: string, install: Install, double = 60) {
  const device = install.residual_current?.[id]
  if (!device) throw new Error(`no ${id}`)
  return compute(residualCurrentFamily, { id, device }, sceneOf(install, { delayed_minimum_double: double }))
}

function withDevices(devices: Record<string, ResidualCurrentDevice>): Install {
  return { ...bakery, residual_current: devices }
}

describe('trip times, IEC 61008-1, Table 1, as printed in a tester manual', () => {
  test('a general device breaks within 300, 150 and 40 ms and need not wait', () => {
    expect((['rated', 'double', 'five times'] as const).map((at) => longestTripTime(general, at))).toEqual([
      300, 150, 40,
    ])
    expect(shortestTripTime(general, 'rated', 60)).toBeUndefined()
    expect(shortestTripTime(general, 'double', 60)).toBeUndefined()
  })

  test('a time-delayed device breaks within 500, 200 and 150 ms and holds 130 and 50 ms', () => {
    expect((['rated', 'double', 'five times'] as const).map((at) => longestTripTime(delayed, at))).toEqual([
      500, 200, 150,
    ])
    expect(shortestTripTime(delayed, 'rated', 60)).toBe(130)
    expect(shortestTripTime(delayed, 'five times', 60)).toBe(50)
  })

  test('what it holds at twice its rated residual current is for the rule book to say: 60 or 50 ms', () => {
    expect([60, 50].map((double) => shortestTripTime(delayed, 'double', double))).toEqual([60, 50])
  })
})

describe('trip current under a rising residual current, EN 61008-1; type B from memory', () => {
  test.each([
    ['AC', 30, 15, 30],
    ['A', 30, 10.5, 42],
    ['F', 30, 10.5, 42],
    ['A', 300, 105, 420],
    ['A', 10, 3.5, 20],
    ['AC', 10, 5, 10],
    ['B', 30, 15, 60],
  ] as const)('type %s with %d mA trips between %d and %d mA', (type, residual, lowest, highest) => {
    const band = rampBand({ type, residual })
    expect(band.lowest).toBeCloseTo(lowest, 9)
    expect(band.highest).toBeCloseTo(highest, 9)
  })

  test('every band holds the rated residual current', () => {
    const types = fc.constantFrom('AC' as const, 'A' as const, 'F' as const, 'B' as const)
    fc.assert(
      fc.property(types, fc.integer({ min: 6, max: 1000 }), (type, residual) => {
        const { lowest, highest } = rampBand({ type, residual })
        return lowest < residual && residual <= highest
      }),
    )
  })
})

describe('a residual-current device in its tree', () => {
  test('the bakery: nothing above it, loads of K1 and K2 below, a fuse of 35 A upstream', () => {
    const values = quantities('RCD1', bakery)
    expect(values).toMatchObject({
      time_limit_rated: 300,
      time_limit_double: 150,
      time_limit_five_times: 40,
      ramp_minimum: 10.5,
      ramp_maximum: 42,
      upstream_rating: 35,
    })
    expect(values.time_minimum_rated).toBeUndefined()
    expect(values.upstream_residual).toBeUndefined()
    expect(values.upstream_delayed).toBeUndefined()
    // Three times 30 mA: practice of IEC 61008-1 as printed in a switchgear catalogue.
    expect(values.upstream_residual_needed).toBe(90)
    expect(values.electrode_limit).toBeCloseTo(50 / 0.03, 6)
    expect(values.load_current).toBeCloseTo(1400 / 230 / 0.85, 6)
  })

  test('200 Ω of electrode are enough for 250 mA and 50 V: UK on-site guidance', () => {
    const install = withDevices({ RCD1: { fed_from: 'CO', type: 'A', rated_current: 40, residual: 250 } })
    expect(quantities('RCD1', install).electrode_limit).toBeCloseTo(200, 9)
  })

  test('the nearest device upstream counts, even on the other side of the changeover', () => {
    const install: Install = {
      ...withDevices({
        RCD9: { fed_from: 'supply', type: 'A', rated_current: 63, residual: 500 },
        RCD0: { fed_from: 'RCD9', type: 'A', rated_current: 63, residual: 300, delay: 'S' },
        RCD1: { fed_from: 'CO', type: 'A', rated_current: 40, residual: 30, cable: cable(6, 6, 5) },
      }),
      boards: { MB: { name: 'Main board', fed_from: 'RCD0' }, EB: { name: 'Backed-up board', fed_from: 'RCD1' } },
    }
    expect(quantities('RCD1', install)).toMatchObject({ upstream_residual: 300, upstream_delayed: true })
    expect(quantities('RCD0', install, 50)).toMatchObject({
      upstream_residual: 500,
      upstream_delayed: false,
      time_minimum_rated: 130,
      time_minimum_double: 50,
      time_minimum_five_times: 50,
      upstream_rating: 63,
    })
    expect(quantities('RCD1', install).cable_current).toBeCloseTo(1400 / 230 / 0.85, 6)
  })

  test('a device with no load stated below it carries nothing', () => {
    const install = { ...bakery, circuits: { K3: plainCircuit('EB') } }
    expect(quantities('RCD1', install).load_current).toBe(0)
  })
})
