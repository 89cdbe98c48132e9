import { describe, expect, it } from 'vitest'
import { faultAt, PROBLEM_CODES, problem } from '#core/errors.ts'

describe('problem codes', () => {
  it.each(Object.entries(PROBLEM_CODES))('%s is in kebab case and has one sentence', (code, meaning) => {
    expect(code).toMatch(/^[a-z0-9]+(?:-[a-z0-9]+)*$/)
    expect(meaning).toMatch(/^[A-Z“].*\.$/)
  })
})

describe('putting a problem together', () => {
  const range = { line: 1, column: 1, endLine: 1, endColumn: 2, offset: 0, endOffset: 1 }

  it('has a range only where one is known', () => {
    expect(problem('loop', ['a'], 'x', range)).toEqual({ code: 'loop', path: ['a'], message: 'x', range })
    expect(problem('loop', ['a'], 'x')).toEqual({ code: 'loop', path: ['a'], message: 'x' })
  })

  it('gives a fault its place', () => {
    expect(faultAt({ code: 'loop', message: 'x' }, ['a'])).toMatchObject({ path: ['a'] })
    expect(faultAt({ code: 'loop', message: 'x', at: ['b', 0] }, ['a'])).toMatchObject({ path: ['a', 'b', 0] })
  })
})
