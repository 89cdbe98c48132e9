import fc from 'fast-check'
import { expect, test } from 'vitest'
import type { Transfer } from '#core/install/readings.ts'
import { changeoverClass, transferFamily } from '#core/quantities/transfer.ts'
import { bakery } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

test.each([
  [0, 'uninterrupted'],
  [0.02, 'very short'],
  [0.1, 'very short'],
  [0.15, 'very short'],
  [0.151, 'short'],
  [0.5, 'short'],
  [0.501, 'average'],
  [4, 'average'],
  [5, 'average'],
  [5.01, 'medium'],
  [15, 'medium'],
  [15.1, 'long'],
])('%d s without supply are %s: classes of IEC 60364-5-56 as printed in OVE E 8101', (seconds, word) => {
  expect(changeoverClass(seconds)).toBe(word)
})

test('a longer time never falls into a shorter class', () => {
  const order = ['uninterrupted', 'very short', 'short', 'average', 'medium', 'long']
  const seconds = fc.double({ min: 0, max: 30, noNaN: true })
  fc.assert(
    fc.property(seconds, seconds, (time, more) => {
      return order.indexOf(changeoverClass(time)) <= order.indexOf(changeoverClass(time + more))
    }),
  )
})

const classOf = (transfer: Transfer) => compute(transferFamily, { transfer }, sceneOf(bakery)).changeover_class

test('to the island the restored supply counts, not the moment at which the loads went dark', () => {
  expect(classOf({ to: 'island', dark_after: { value: 0.02 }, restored_after: { value: 1.8 } })).toBe('average')
  expect(classOf({ to: 'island', gap: { value: 0 }, restored_after: { value: 0.3 } })).toBe('short')
})

test('to the grid the interruption counts; none at all is uninterrupted', () => {
  expect(classOf({ to: 'grid', observed: { value: 65 }, gap: { value: 0 } })).toBe('uninterrupted')
  expect(classOf({ to: 'grid', gap: { value: 0.1 }, restored_after: { value: 9 } })).toBe('very short')
})

test('not read, not tested, or beyond the instrument: no word for it', () => {
  expect(classOf({ to: 'island', dark_after: { value: 0.02 } })).toBeUndefined()
  expect(classOf({ to: 'island', restored_after: { not_tested: 'no access' } })).toBeUndefined()
  expect(classOf({ to: 'island', restored_after: { value: 10, bound: 'above' } })).toBeUndefined()
})
