import { expect, test } from 'vitest'
import type { EarthingArrangement } from '#core/install/earthing.ts'
import type { Install } from '#core/install.ts'
import { earthingFamily } from '#core/quantities/earthing.ts'
import { bakery, plainCircuit } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

function facts(earthing: EarthingArrangement, more: Partial<Install> = {}) {
  return compute(earthingFamily, earthing, sceneOf({ ...bakery, ...more }))
}

test('the bakery: 10 mm² bonding for a combined neutral, 1,667 Ω for its 30 mA device', () => {
  const found = facts({ earthing_conductor: 16 })
  expect(found).toMatchObject({ earthing_conductor_minimum: 6, bonding_minimum: 10, largest_residual: 30 })
  expect(found.electrode_limit).toBeCloseTo(1666.7, 1)
})

test("the least sensitive device counts, also one inside a circuit's own device", () => {
  const circuits = { K: plainCircuit('MB', { residual_current: { type: 'A', residual: 300 } }) }
  const found = facts({}, { circuits })
  expect(found.electrode_limit).toBeCloseTo(166.7, 1)
})

test('lightning protection asks for 16 mm²; what is not stated is not computed', () => {
  expect(facts({ lightning_protection: true })).toMatchObject({
    earthing_conductor_minimum: 16,
    bonding_minimum: undefined,
  })
  const { residual_current: _none, circuits: _noCircuits, boards: _noBoards, ...rest } = bakery
  const overcurrent = { F35: { device: bakery.supply.main_protection, fed_from: 'supply' } }
  const found = compute(earthingFamily, {}, sceneOf({ ...rest, overcurrent }))
  expect([found.largest_residual, found.electrode_limit]).toEqual([undefined, undefined])
})
