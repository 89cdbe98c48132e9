import { expect, test } from 'vitest'
import { changeoverClass } from '#core/quantities/transfer.ts'

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
  [15, 'medium'],
  [15.1, 'long'],
])('%d s without supply are %s: classes of IEC 60364-5-56 as printed in OVE E 8101', (seconds, word) => {
  expect(changeoverClass(seconds)).toBe(word)
})
