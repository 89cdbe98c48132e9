import { expect, it } from 'vitest'
import { limitationAt } from '#core/judge/limitation.ts'

const tree = {
  readings: {
    circuits: { K1: { not_tested: 'no access' }, K2: { loop: { island: { not_tested: 'battery empty' } } } },
    list: [{ not_tested: 'night' }, 3],
  },
}

it.each([
  ['covers everything below it', ['readings', 'circuits', 'K1', 'loop', 'grid'], 'no access'],
  ['is found in place of the reading', ['readings', 'circuits', 'K2', 'loop', 'island'], 'battery empty'],
  ['is found in a list', ['readings', 'list', 0, 'voc'], 'night'],
  ['does not cover its neighbours', ['readings', 'circuits', 'K2', 'loop', 'grid'], undefined],
  ['is not found beyond a plain value', ['readings', 'list', 1, 'voc'], undefined],
  ['is not found where nothing is', ['found', 'nowhere', 'at', 'all'], undefined],
])('a stated reason %s', (_, path, reason) => {
  expect(limitationAt(tree, path)).toBe(reason)
})

it('a file that is no block has no reasons', () => {
  expect(limitationAt(null, ['readings'])).toBeUndefined()
})
