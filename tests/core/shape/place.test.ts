import { describe, expect, it } from 'vitest'
import { exampleOf, found, listed, titleOf } from '#core/shape/describe.ts'
import { locate, valueAt } from '#core/shape/locate.ts'
import { placeAt } from '#core/shape/place.ts'
import { rangeFault } from '#core/shape/range.ts'
import { installSchema } from '#core/shape/schema.ts'

describe('a place of the schema', () => {
  it('brings its own title before that of the part it refers to', () => {
    const place = placeAt(installSchema(), ['supply', 'main_protection'])
    expect([place.title, place['x-shorthand']]).toEqual(['Main protection', 'device'])
  })
  it('is found in maps and lists', () => {
    expect(placeAt(installSchema(), ['circuits', 'K1', 'phases', 0]).enum).toEqual(['L1', 'L2', 'L3'])
  })
  it.each([[['nowhere']], [['site', 0]], [['site', 'name', 'deeper']], [['constructor']]])(
    'is empty at %j, which is none',
    (path) => {
      expect(placeAt(installSchema(), path)).toEqual({})
    },
  )
})

describe('a JSON Pointer', () => {
  it('is turned into keys and numbers, escapes undone', () => {
    expect(locate('/a~1b/0/c~0d', { 'a/b': [{ 'c~d': 1 }] })).toEqual(['a/b', 0, 'c~d'])
  })
  it('leads to nothing where there is nothing', () => {
    expect(valueAt({ a: [1] }, ['a', 0])).toBe(1)
    expect(valueAt({ a: [1] }, ['b', 'c'])).toBeUndefined()
  })
})

describe('words for what was found', () => {
  it('name each kind of value', () => {
    expect([undefined, [1], {}, 'x', 2, false].map(found)).toEqual([
      'empty',
      'a list',
      'a block of keys',
      'the text “x”',
      'the number 2',
      '“false”',
    ])
  })
  it('join words', () => expect([[], ['a'], ['a', 'b', 'c']].map(listed)).toEqual(['', 'a', 'a, b and c']))
  it('have something to say of a place without words', () => {
    expect([titleOf({}), exampleOf({ examples: [[]] }), exampleOf({ examples: [{}] })]).toEqual([
      '“this place”',
      '[]',
      '…',
    ])
  })
})

describe('a range', () => {
  it('holds its ends, an exclusive one not', () => {
    const bounds = { minimum: 0, maximum: 100 }
    expect([0, 100].map((value) => rangeFault(value, bounds, '%'))).toEqual([undefined, undefined])
    expect(rangeFault(0, { exclusiveMinimum: 0 }, '')?.message).toBe(
      '0 cannot be right here, the value is more than 0: correct it.',
    )
    expect(rangeFault(-0.1, bounds, '%')?.message).toMatch(/0 or more/)
    expect(rangeFault(5, {}, 'A')).toBeUndefined()
  })
})
