import { describe, expect, it } from 'vitest'
import type { ResolvedBook } from '#core/judge/book.ts'
import { lintRule } from '#core/judge/lint.ts'
import type { RuleRecord } from '#core/judge/rule.ts'
import { firstCite, storedBook, storedRule } from '#core/judge/stored.ts'
import { fieldsOf, stateFieldsOf } from '#core/sheets/plans.ts'

const record: RuleRecord = {
  id: 'short-cables',
  title: 'Cables are short',
  subject: 'circuit',
  state: 'none',
  severity: 'caution',
  must: { properties: { cable_length: { maximum: 20 } } },
  says: 'The cable of {{name}} is {{show "cable_length"}} long.',
  do: 'Shorten it.',
  why: 'A fault trips early.',
  cites: [{ publication: 'common practice' }],
  examples: [],
}

const stored = (changes: Partial<RuleRecord> = {}) =>
  storedRule({ record: { ...record, ...changes }, chapter: 'local', from: 'house' }, () => 's0')

describe('a rule as the judge holds it', () => {
  it('points to what it reads, unless it says where to look', () => {
    expect(stored().at).toEqual(['cable_length'])
    expect(stored({ at: ['serves'] }).at).toEqual(['serves'])
  })

  it('applies to every sheet unless it has a condition', () => {
    expect(stored().when).toBeNull()
    expect(stored({ when: { required: ['sockets'] } }).when).toBe('s0')
  })

  it('is cited by the clause of its first source, or by the source alone', () => {
    expect(firstCite(record)).toBe('common practice')
    expect(firstCite({ ...record, cites: [{ publication: 'IEC 60364-6:2016', clause: '6.4' }] })).toBe(
      'IEC 60364-6:2016, 6.4',
    )
  })
})

describe('a book as the judge holds it', () => {
  it('gives a parameter without a unit none', () => {
    const book: ResolvedBook = {
      id: 'house',
      title: 'House',
      version: '1.0.0',
      note: '',
      lineage: ['house'],
      parameters: {
        factor: { value: 2, source: 'common practice' },
        length: { value: 20, unit: 'm', source: 'common practice' },
      },
      rules: [{ record, chapter: 'local', from: 'house' }],
      off: [],
    }
    expect(storedBook(book, () => 7)).toMatchObject({ units: { factor: '', length: 'm' }, rules: [7] })
  })
})

describe('a rule that leads somewhere', () => {
  it('may lead only to fields of its sheet', () => {
    const vocabulary = { fieldsOf, stateFieldsOf, parameters: new Set<string>() }
    expect(lintRule(record, vocabulary)).toEqual([])
    expect(lintRule({ ...record, at: ['cable_lenght'] }, vocabulary)).toEqual([
      'There is no field cable_lenght on the sheet of a circuit: did you mean cable_length?',
    ])
  })
})
