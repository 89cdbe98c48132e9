import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type LineChange, lineChanges } from '#cli/line-changes.ts'

const told = (before: string[], after: string[]): string[] =>
  lineChanges(before.join('\n'), after.join('\n')).map(({ sign, number, text }) => `${sign}${number} ${text}`)

/** What a reader makes of the changes: the lines of the old text without those that go, with those that come. */
function applied(before: string, changes: readonly LineChange[]): string {
  const gone = new Set(changes.filter(({ sign }) => sign === '-').map(({ number }) => number))
  const lines = before.split('\n').filter((_, index) => !gone.has(index + 1))
  for (const { sign, number, text } of changes) if (sign === '+') lines.splice(number - 1, 0, text)
  return lines.join('\n')
}

describe('what filling changed', () => {
  it('is nothing where nothing changed', () => {
    expect(told(['a', 'b'], ['a', 'b'])).toEqual([])
  })

  it('is a line that goes and the one in its place', () => {
    expect(told(['K1: 1', 'K2: 2', 'K3: 3'], ['K1: 1', 'K2: 9', 'K3: 3'])).toEqual(['-2 K2: 2', '+2 K2: 9'])
  })

  it('is lines that were put in', () => {
    expect(told(['a', 'b'], ['a', 'x', 'y', 'b'])).toEqual(['+2 x', '+3 y'])
  })

  it('tells a changed line also where another one reads the same', () => {
    expect(told(['loop: 1', 'loop: 2', 'loop: 1'], ['loop: 2', 'loop: 2', 'loop: 1'])).toEqual([
      '-1 loop: 1',
      '+1 loop: 2',
    ])
  })

  it('leads from the old text to the new one, whatever they are', () => {
    const text = fc.array(fc.constantFrom('a', 'b', 'c', '')).map((lines) => lines.join('\n'))
    fc.assert(
      fc.property(text, text, (before, after) => {
        expect(applied(before, lineChanges(before, after))).toBe(after)
      }),
    )
  })
})
