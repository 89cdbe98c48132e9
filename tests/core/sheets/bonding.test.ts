import { describe, expect, test } from 'vitest'
import type { EarthingArrangement } from '#core/install/earthing.ts'
import { earthingPlan } from '#core/sheets/origin.ts'
import { sceneOf } from '../quantities/circuit-scene.ts'
import { bakery } from '../topology/bakery.ts'

type Bond = NonNullable<EarthingArrangement['bonding']>[number]

const water: Bond = { to: 'water pipe', size: 10, continuity: { value: 0.03 } }
const gas: Bond = { to: 'gas pipe', size: 10, continuity: { value: 0.4 } }
const frame: Bond = { to: 'array frame', size: 10 }
const boiler: Bond = { to: 'boiler', size: 10, continuity: { not_tested: 'not reachable' } }

const measured = earthingPlan.measured?.find(({ name }) => name === 'bonding_continuity')
const reading = (...bonding: Bond[]) => measured?.reading({ bonding }, sceneOf(bakery))
const place = (...bonding: Bond[]) => measured?.path({ bonding })
const unread = (...bonding: Bond[]) =>
  earthingPlan.entered.find(({ name }) => name === 'bonding_unread')?.value({ bonding }, sceneOf(bakery))

describe('the main bond that reads worst', () => {
  test('is judged, and pointed to', () => {
    expect(reading(water, gas, frame, boiler)).toEqual({ value: 0.4 })
    expect(place(water, gas)).toEqual(['earthing', 'bonding', 1, 'continuity'])
  })

  test('a stated reason comes before silence, so that it shows as a limitation', () => {
    expect(reading(frame, boiler)).toEqual({ not_tested: 'not reachable' })
    expect(place(frame, boiler)).toEqual(['earthing', 'bonding', 1, 'continuity'])
  })

  test('without any bond or any reading there is none', () => {
    expect(reading(frame)).toBeUndefined()
    expect(place(frame)).toEqual(['earthing', 'bonding', 0, 'continuity'])
    expect(measured?.reading({}, sceneOf(bakery))).toBeUndefined()
    expect(measured?.path({})).toEqual(['earthing', 'bonding', 0, 'continuity'])
  })
})

test('bonds that were left out are named where others were read', () => {
  expect(unread(water, frame)).toEqual(['array frame'])
  expect(unread(water, boiler)).toEqual([])
  expect(unread(frame)).toBeUndefined()
  expect(unread()).toBeUndefined()
})
