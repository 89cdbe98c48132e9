import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { distance, nearest } from '#core/texts/nearest.ts'

describe('the nearest word', () => {
  const keys = ['fed_from', 'phases', 'device', 'cable', 'load']
  it.each([
    ['fedfrom', 'fed_from'],
    ['fed_form', 'fed_from'],
    ['Phases', 'phases'],
    ['phase', 'phases'],
    ['devcie', 'device'],
    ['cabel', 'cable'],
  ])('to %s is %s', (written, meant) => expect(nearest(written, keys)).toBe(meant))
  it.each(['colour', 'x', 'feeder', ''])('to %s is none', (written) => expect(nearest(written, keys)).toBeUndefined())
  it('is the first of equals', () => expect(nearest('K3', ['K1', 'K2'])).toBe('K1'))
})

describe('the number of slips', () => {
  it.each([
    // Published examples: Levenshtein 1966 distance of the two words, and the swap of Damerau 1964.
    ['kitten', 'sitting', 3],
    ['ca', 'abc', 3],
    ['ab', 'ba', 1],
    ['', 'abc', 3],
  ])('from %s to %s is %i', (from, to, slips) => expect(distance(from, to)).toBe(slips))
  it('is the same both ways, none for the same word, and no more than the longer word has letters', () => {
    const word = fc.string({ maxLength: 8 })
    fc.assert(
      fc.property(word, word, (a, b) => {
        expect(distance(a, b)).toBe(distance(b, a))
        expect(distance(a, b) === 0).toBe(a === b)
        expect(distance(a, b)).toBeLessThanOrEqual(Math.max(a.length, b.length))
      }),
    )
  })
})
