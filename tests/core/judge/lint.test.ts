import { describe, expect, it } from 'vitest'
import { lintRule } from '#core/judge/lint.ts'
import type { RuleRecord } from '#core/judge/rule.ts'

const field = (name: string) => [name, { name, unit: 'Ω', title: name }] as const
const vocabulary = {
  fieldsOf: () => new Map([field('loop'), field('loop_limit'), field('live')]),
  stateFieldsOf: () => new Set(['loop', 'live']),
  parameters: new Set(['touch_voltage']),
}

const rule = (more: Partial<RuleRecord> = {}): RuleRecord => ({
  id: 'a-rule',
  title: 'Something holds',
  subject: 'circuit',
  state: 'grid',
  severity: 'failure',
  when: { properties: { live: { const: true } } },
  must: { properties: { loop: { maximum: { $data: '/loop_limit' } } } },
  at: ['loop'],
  says: 'The loop of {{name}} reads {{show "loop"}} {{state}}.',
  do: 'Bring it below {{show "book.touch_voltage"}}.',
  why: 'Because.',
  cites: [],
  examples: [],
  ...more,
})

const faults = (more: Partial<RuleRecord>) => lintRule(rule(more), vocabulary)

describe('a rule in words that exist', () => {
  it('has no faults', () => {
    expect(faults({})).toEqual([])
  })
})

describe('a rule is told', () => {
  it.each([
    [
      'of a field that no sheet has, with the nearest',
      { at: ['lop'] },
      'There is no field lop on the sheet of a circuit: did you mean loop?',
    ],
    [
      'of a field far from any',
      { needs: ['colour_of_the_door'] },
      'There is no field colour_of_the_door on the sheet of a circuit.',
    ],
    [
      'of an unknown field in its condition',
      { when: { required: ['lve', 7] } },
      'There is no field lve on the sheet of a circuit: did you mean live?',
    ],
    [
      'of an unknown field in its words',
      { says: 'It reads {{show "lop"}}.' },
      'There is no field lop on the sheet of a circuit: did you mean loop?',
    ],
    [
      'of a parameter that the book lacks',
      { must: { properties: { loop: { maximum: { $data: '/book/colour' } } } } },
      'The book has no parameter colour.',
    ],
    [
      'of a parameter in its condition',
      { when: { properties: { book: { properties: { colour: { type: 'number' } } } } } },
      'The book has no parameter colour.',
    ],
    [
      'of an expression that templates do not know',
      { do: 'Do {{#if loop}}.' },
      'do uses {{#if loop}}; a template knows {{name}}, {{state}}, {{show "field"}} and {{list "field"}}.',
    ],
  ] as const)('%s', (_, more, message) => {
    expect(faults(more as Partial<RuleRecord>)).toEqual([message])
  })

  it('that a field of one state needs a state', () => {
    const { when: _when, ...anytime } = rule({ state: 'none', at: [], says: 'No.', do: 'Do.' })
    expect(lintRule(anytime, vocabulary)).toEqual([
      'loop holds in one state, and the rule is judged in none: set state to grid, island or each.',
    ])
  })

  it('nothing of the book itself, nor of pointers into the sheet', () => {
    expect(faults({ when: { properties: { book: true } } as unknown as NonNullable<RuleRecord['when']> })).toEqual([])
    expect(
      faults({ must: { allOf: [{ properties: { loop: { maximum: { $data: '/loop_limit' }, enum: [1] } } }] } }),
    ).toEqual([])
  })
})
