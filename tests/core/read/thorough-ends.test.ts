import { describe, expect, it } from 'vitest'
import { cover } from '#core/read/masks.ts'
import { readThoroughly } from '#core/read/thorough.ts'

function told(text: string) {
  const result = readThoroughly(text)
  if (result.ok) throw new Error('This file is sound.')
  return { found: result.problems.map(({ code, range }) => `${code} ${range?.line}`), tree: result.certain?.tree }
}

describe('the ends of reading on', () => {
  it('more errors than anybody reads leave the rest in doubt: they are counted, and nothing is believed', () => {
    for (const spoiled of ['1_0', '@home']) {
      const { found, tree } = told(Array.from({ length: 250 }, (_, line) => `k${line}: ${spoiled}`).join('\n'))
      expect(found).toHaveLength(201)
      expect(found[0]).toBe('too-many-problems undefined')
      expect(tree).toBeUndefined()
    }
  })

  it('a tab in a last line that does not end', () => {
    expect(told('b: 2\nx: { y: \t1 }')).toEqual({ found: ['tab 2'], tree: { b: 2, x: { y: 1 } } })
  })

  it('a line end of old machines is no line end, and one more problem', () => {
    expect(told('a: 1\rb: 2\n').found).toContain('forbidden-character 1')
    expect(told('a: "x\ry"\nc: 1_0\n')).toEqual({
      found: ['forbidden-character 1', 'number-separator 2'],
      tree: expect.objectContaining({ a: 'x y' }),
    })
  })

  it('a colon that is glued to a key without a list around it', () => {
    expect(told('a:"x"\nc: 1_0\n')).toEqual({ found: ['missing-space 1'], tree: undefined })
  })

  it('a problem without a place cannot be covered', () => {
    expect(cover('a: 1_0\n', [{ code: 'number-separator', path: ['a'], message: 'Write 10.' }], 0)).toBeUndefined()
  })
})

it('a dash that is glued to its entry leaves in doubt what it starts', () => {
  const range = { line: 1, column: 1, endLine: 1, endColumn: 3, offset: 0, endOffset: 2 }
  expect(cover('-b\n', [{ code: 'missing-space', path: [], range, message: 'Write - b.' }], 0)).toBeUndefined()
})
