import { describe, expect, it } from 'vitest'
import { sameTree, withValue } from '#core/read/tree.ts'

describe('a copy of a tree with one value set', () => {
  it.each([
    [{ a: 1 }, ['a'], { a: 'x' }],
    [{ a: 1 }, ['b', 'c'], { a: 1, b: { c: 'x' } }],
    [{ a: null }, ['a', 0], { a: ['x'] }],
    [[1, 2], [2], [1, 2, 'x']],
    [1, [], 'x'],
  ])('%j at %j is %j', (tree, path, expected) => {
    const before = structuredClone(tree)
    expect(withValue(tree, path, 'x')).toEqual(expected)
    expect(tree).toEqual(before)
  })
})

describe('two trees', () => {
  it.each([
    [1, 1, true],
    [1, '1', false],
    [null, null, true],
    [null, {}, false],
    [{}, null, false],
    [{ a: 1, b: 2 }, { b: 2, a: 1 }, true],
    [{ a: 1 }, { a: 1, b: 2 }, false],
    [{ toString: 1 }, { a: 1 }, false],
    [[1, 2], [1, 2], true],
    [[1, 2], [2, 1], false],
    [[1], [1, 2], false],
    [[], {}, false],
    [{}, [], false],
  ])('%j and %j: %s', (one, other, same) => {
    expect(sameTree(one, other)).toBe(same)
  })
})
