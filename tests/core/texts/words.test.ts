import { describe, expect, it } from 'vitest'
import type { Sheet } from '#core/glossary.ts'
import { labelOf } from '#core/texts/label.ts'
import { plainNumber, withUnit } from '#core/texts/number.ts'
import { joined, shown } from '#core/texts/value.ts'

describe('a number as people read it', () => {
  it.each([
    [0, '0'],
    [16, '16'],
    [0.5287, '0.529'],
    [22.95, '22.95'],
    [1666.6667, '1667'],
    [725.054, '725.1'],
    [0.00004, '0'],
    [-8.213, '−8.213'],
    [Number.POSITIVE_INFINITY, '∞'],
  ])('%f is %s', (value, text) => {
    expect(plainNumber(value)).toBe(text)
  })

  it('carries its unit, and stands alone without one', () => {
    expect(withUnit(0.55, 'Ω')).toBe('0.55 Ω')
    expect(withUnit(0.85, '')).toBe('0.85')
  })
})

describe('a value as people read it', () => {
  it.each([
    [undefined, '', 'not stated'],
    [true, '', 'yes'],
    [false, '', 'no'],
    ['clockwise', '', 'clockwise'],
    [Number.POSITIVE_INFINITY, 'ms', 'no trip'],
    [Number.POSITIVE_INFINITY, 'Ω', '∞ Ω'],
    [['L1', 'L2', 'L3'], '', 'L1, L2 and L3'],
    [[], '', 'none'],
    [{ L1: 1647.06, L2: 1200 }, 'VA', 'L1 1647 VA and L2 1200 VA'],
  ] as const)('%j %s', (value, unit, text) => {
    expect(shown(value, unit)).toBe(text)
  })

  it('joins words', () => {
    expect(joined([])).toBe('')
    expect(joined(['N'])).toBe('N')
    expect(joined(['L1', 'N'])).toBe('L1 and N')
  })
})

describe('what a finding calls its subject', () => {
  const of = (subject: Sheet['subject'], id: string, values: Sheet['values'] = {}) => labelOf({ subject, id, values })

  it.each([
    [of('circuit', 'K1', { serves: 'Cold store' }), 'circuit K1 (Cold store)'],
    [of('supply', 'supply'), 'the supply'],
    [of('transfer', 'transfer 1'), 'transfer 1'],
    [of('person', 'tested by', { person: 'A. Fenn' }), 'A. Fenn (tested by)'],
    [of('changeover', 'CO'), 'changeover CO'],
  ])('%s', (given, wanted) => {
    expect(given).toBe(wanted)
  })
})
