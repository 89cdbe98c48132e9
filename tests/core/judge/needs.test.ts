import { describe, expect, it } from 'vitest'
import { needsOf, readsOf, whenSchema } from '#core/judge/needs.ts'
import type { RuleRecord } from '#core/judge/rule.ts'

const withMust = (must: RuleRecord['must'], needs?: string[]): RuleRecord => ({
  id: 'a-rule',
  title: 't',
  subject: 'circuit',
  state: 'none',
  severity: 'note',
  must,
  says: '',
  do: '',
  why: '',
  cites: [],
  examples: [],
  ...(needs && { needs }),
})

describe('what a rule needs to be shown', () => {
  it('is every field that it names and every computed limit that it reaches', () => {
    const record = withMust({ properties: { loop: { type: 'number', maximum: { $data: '/loop_limit' } } } })
    expect(needsOf(record)).toEqual(['loop', 'loop_limit'])
  })

  it('leaves out the parameters of the book, which are always there', () => {
    expect(needsOf(withMust({ properties: { electrode: { maximum: { $data: '/book/electrode_stable' } } } }))).toEqual([
      'electrode',
    ])
  })

  it('takes every part of allOf, and limits inside lists', () => {
    const record = withMust({ allOf: [{ properties: { a: { enum: [1, { $data: '/b' }] } } }, { required: ['z'] }] })
    expect(needsOf(record)).toEqual(['a', 'b'])
  })

  it('leaves out what stands in a choice, which may be missing', () => {
    const record = withMust({
      anyOf: [{ properties: { a: { const: 1 } } }, { not: { properties: { b: { const: 1 } } } }],
    })
    expect(needsOf(record)).toEqual([])
    expect(readsOf(record)).toEqual(['a', 'b'])
  })

  it('looks into choices within allOf for what is read', () => {
    expect(readsOf(withMust({ allOf: [{ anyOf: [{ properties: { c: {} } }] }] }))).toEqual(['c'])
  })

  it("follows the rule's own list where there is one", () => {
    expect(needsOf(withMust({ properties: { a: { const: 1 } } }, ['b']))).toEqual(['b'])
  })

  it('ignores pointers that are relative', () => {
    expect(needsOf(withMust({ properties: { a: { maximum: { $data: '1/b' } } } }))).toEqual(['a'])
  })
})

describe('when a rule applies', () => {
  it('asks for every field that it names', () => {
    expect(whenSchema({ properties: { live: { const: true } }, required: ['loop'] })).toEqual({
      properties: { live: { const: true } },
      required: ['loop', 'live'],
    })
  })

  it('asks for nothing where it names nothing', () => {
    expect(whenSchema({ not: { required: ['a'] } })).toEqual({ not: { required: ['a'] }, required: [] })
  })
})
