import { describe, expect, it } from 'vitest'
import { type BookFolder, resolveBook } from '#core/judge/book.ts'
import type { RuleRecord } from '#core/judge/rule.ts'

const rule = (id: string, more: Partial<RuleRecord> = {}): RuleRecord => ({
  id,
  title: 'Something holds',
  subject: 'circuit',
  state: 'none',
  severity: 'failure',
  must: { properties: { loop: { maximum: 1 } } },
  says: 'It does not hold.',
  do: 'Make it hold.',
  why: 'Because it must.',
  cites: [{ publication: 'common practice' }],
  examples: [],
  ...more,
})

const base: BookFolder = {
  book: {
    id: 'base',
    title: 'Base',
    version: '1.0.0',
    note: 'The start.',
    parameters: {
      limit: { value: 1, unit: 'Ω', title: 'A limit', source: 'here' },
      other: { value: 2, source: 'there' },
    },
  },
  chapters: { circuits: [rule('first-rule'), rule('second-rule')] },
}

const overlay = (book: Partial<BookFolder['book']>, records: RuleRecord[] = []): BookFolder => ({
  book: { id: 'house', title: 'House', version: '2.0.0', extends: 'base', parameters: {}, ...book },
  chapters: { local: records },
})

const shelf = (...folders: BookFolder[]) => new Map(folders.map((folder) => [folder.book.id, folder]))

function resolved(...folders: BookFolder[]) {
  const resolution = resolveBook(folders.at(-1)?.book.id ?? '', shelf(...folders))
  if (!resolution.ok) throw new Error(resolution.problems.map(({ message }) => message).join('\n'))
  return resolution.book
}

function refused(...folders: BookFolder[]): string[] {
  const resolution = resolveBook(folders.at(-1)?.book.id ?? '', shelf(...folders))
  return resolution.ok ? [] : resolution.problems.map(({ message }) => message)
}

describe('a base book', () => {
  it('holds its own rules and parameters', () => {
    const book = resolved(base)
    expect(book.rules.map(({ record }) => record.id)).toEqual(['first-rule', 'second-rule'])
    expect(book.lineage).toEqual(['base'])
    expect(book.note).toBe('The start.')
  })

  it('refuses two rules of one name', () => {
    expect(refused({ ...base, chapters: { one: [rule('first-rule')], two: [rule('first-rule')] } })).toEqual([
      'Two rules are called first-rule: give one of them another name.',
    ])
  })

  it('needs no note', () => {
    const { note: _note, ...book } = base.book
    expect(resolved({ book, chapters: {} }).note).toBe('')
  })
})

describe('an overlay', () => {
  it('inherits every rule and parameter that it does not mention', () => {
    const book = resolved(base, overlay({}))
    expect(book.rules).toHaveLength(2)
    expect(book.parameters['limit']?.value).toBe(1)
    expect(book.lineage).toEqual(['base', 'house'])
  })

  it('sets a parameter with its own source and keeps the unit', () => {
    const book = resolved(base, overlay({ note: 'Ours.', parameters: { limit: { value: 0.5, source: 'our own' } } }))
    expect(book.parameters['limit']).toEqual({ value: 0.5, unit: 'Ω', title: 'A limit', source: 'our own' })
    expect(book.note).toBe('Ours.')
  })

  it('replaces a rule in its place, with a reason', () => {
    const book = resolved(
      base,
      overlay({}, [rule('first-rule', { replaces_because: 'We ask for more.', title: 'More holds' })]),
    )
    expect(book.rules.map(({ record, from }) => [record.title, from])).toEqual([
      ['More holds', 'house'],
      ['Something holds', 'base'],
    ])
  })

  it('switches a rule off and says why', () => {
    const book = resolved(base, overlay({ off: [{ rule: 'second-rule', reason: 'Not here.' }] }))
    expect(book.rules.map(({ record }) => record.id)).toEqual(['first-rule'])
    expect(book.off).toEqual([{ rule: 'second-rule', reason: 'Not here.', by: 'house' }])
  })

  it('adds a rule of its own at the end', () => {
    expect(resolved(base, overlay({}, [rule('house-rule')])).rules.at(-1)?.record.id).toBe('house-rule')
  })

  it('can be extended in turn', () => {
    const second: BookFolder = { book: { ...overlay({}).book, id: 'room', extends: 'house' }, chapters: {} }
    const book = resolved(base, overlay({ off: [{ rule: 'second-rule', reason: 'Not here.' }] }), second)
    expect(book.lineage).toEqual(['base', 'house', 'room'])
    expect(book.off).toHaveLength(1)
  })

  it.each([
    [
      'an unknown parameter',
      overlay({ parameters: { limt: { value: 1, source: 'x' } } }),
      'The parameter limt is unknown to base. It knows: limit, other.',
    ],
    [
      'switching off what is not there',
      overlay({ off: [{ rule: 'no-rule', reason: 'x' }] }),
      'Cannot switch off no-rule: base has no such rule.',
    ],
    [
      'replacing without a reason',
      overlay({}, [rule('first-rule')]),
      'first-rule takes the place of the rule of base without a reason: add replaces_because.',
    ],
    [
      'replacing what is not there',
      overlay({}, [rule('new-rule', { replaces_because: 'x' })]),
      'new-rule says that it replaces a rule, but base has none of that name.',
    ],
    [
      'two rules of one name',
      overlay({}, [rule('new-rule'), rule('new-rule')]),
      'Two rules are called new-rule: give one of them another name.',
    ],
    [
      'extending a book that is not there',
      overlay({ extends: 'nowhere' }),
      'There is no rule book nowhere. At hand: base, house.',
    ],
    ['extending itself', overlay({ extends: 'house' }), 'The books extend each other in a circle: house → house.'],
  ])('refuses %s', (_, folder, message) => {
    expect(refused(base, folder)).toEqual([message])
  })
})
