import { describe, expect, it } from 'vitest'
import { check } from '#core/engine.ts'
import type { BookFolder } from '#core/judge/book.ts'
import { ownBook } from '#core/judge/own-book.ts'
import { rulePage } from '#core/judge/pages.ts'
import type { RuleRecord } from '#core/judge/rule.ts'
import { ruleCite, ruleTitle, ruleWordsFor } from '#core/texts/words.ts'
import { patched } from './patch.ts'

const houseRule: RuleRecord = {
  id: 'short-cables-only',
  title: 'No cable of the house is longer than the house rule allows',
  subject: 'circuit',
  state: 'none',
  severity: 'caution',
  when: { properties: { sockets: { const: true } } },
  must: { properties: { cable_length: { maximum: 20 } } },
  at: ['cable_length'],
  says: 'The cable of {{name}} is {{show "cable_length"}} long.',
  do: 'Shorten it to 20 m.',
  why: 'The house keeps its socket circuits short, so that a fault trips early.',
  cites: [{ publication: 'common practice' }],
  examples: [
    { subject: 'K2', set: { 'circuits.K2.cable.length': '20 m' }, gives: 'meets' },
    { subject: 'K2', set: { 'circuits.K2.cable.length': '20.1 m' }, gives: 'fails' },
  ],
}

let count = 0
const folder = (book: Partial<BookFolder['book']> = {}, records: RuleRecord[] = [houseRule]): BookFolder => {
  count += 1
  return {
    book: { id: `house-${count}`, title: 'House', version: '1.0.0', extends: 'iec', parameters: {}, ...book },
    chapters: { local: records },
  }
}

function made(given: BookFolder) {
  const own = ownBook(given)
  if (!own.ok) throw new Error(own.problems.join('\n'))
  return own.book
}

const refused = (given: BookFolder): readonly string[] => {
  const own = ownBook(given)
  return own.ok ? [] : own.problems
}

describe("a rule book of one's own", () => {
  it('judges by its own rules and by those that it inherits', () => {
    const book = made(folder())
    const result = check(patched({ set: { 'circuits.K2.cable.length': '25 m' } }), { find: () => book, names: [] })
    if (result.kind !== 'judged') throw new Error('The base file cannot be judged.')
    const finding = result.findings.find(({ rule, subject }) => rule === 'short-cables-only' && subject === 'K2')
    expect(finding).toMatchObject({ verdict: 'fails', path: ['circuits', 'K2', 'cable', 'length'] })
    expect(book.rules.length).toBeGreaterThan(1)
  })

  it('brings its words and pages along', () => {
    const book = made(folder())
    const rule = book.rules.find(({ id }) => id === 'short-cables-only')
    const result = check(patched({}), { find: () => book, names: [] })
    if (result.kind !== 'judged' || !rule) throw new Error('The base file cannot be judged.')
    const sheet = result.sheets.find(({ id }) => id === 'K2')
    if (!sheet) throw new Error('There is no K2.')
    const words = ruleWordsFor(rule.key, { sheet, state: null, parameters: book.parameters, units: book.units })
    expect(words).toEqual({ says: 'The cable of circuit K2 (Sockets) is 22 m long.', do: 'Shorten it to 20 m.' })
    expect(rulePage(rule.key).record.title).toBe(houseRule.title)
  })

  it('sets parameters, and its hash tells it from its base', () => {
    const plain = made(folder({}, []))
    const strict = made(folder({ parameters: { touch_voltage: { value: 25, source: 'our own' } } }, []))
    expect(strict.parameters.touch_voltage).toBe(25)
    expect(strict.hash).not.toBe(plain.hash)
  })

  it('can be read again after it was changed, and has its new words', () => {
    const before = folder()
    made(before)
    const changed = { ...houseRule, title: 'No cable of the house is long' }
    const { rules } = made({ ...before, chapters: { local: [changed] } })
    const key = rules.find(({ id }) => id === houseRule.id)?.key ?? ''
    expect(ruleTitle(key)).toBe('No cable of the house is long')
    expect(ruleCite(key)).toBe('common practice')
  })

  it.each([
    ['without a base', folder({ extends: 'atlantis' }), /extends must name one of .*iec.*; found “atlantis”/],
    ['with the name of a book that ships', folder({ id: 'iec' }), /the name iec is taken/],
    [
      'that names an unknown field',
      folder({}, [{ ...houseRule, at: ['cable_lenght'] }]),
      /local\.yaml, rule 1 \(short-cables-only\): There is no field cable_lenght .* did you mean cable_length\?/,
    ],
    [
      'whose rule is not in shape',
      folder({}, [{ ...houseRule, severity: 'fatal' } as unknown as RuleRecord]),
      /\/severity/,
    ],
    ['whose record is no rule at all', folder({}, [null] as unknown as RuleRecord[]), /local\.yaml, rule 1:/],
    [
      'whose schema cannot be compiled',
      folder({}, [{ ...houseRule, must: { properties: { cable_length: { maximum: 'far' } } } }]),
      /rule 1/,
    ],
    [
      'with an unknown parameter',
      folder({ parameters: { colour: { value: 1, source: 'x' } } }),
      /The parameter colour is unknown/,
    ],
  ])('is refused %s', (_, given, message) => {
    expect(refused(given).join('\n')).toMatch(message)
  })

  it('is refused without any base', () => {
    const { extends: _extends, ...book } = folder().book
    expect(refused({ book, chapters: {} })).toHaveLength(1)
  })

  it('lists all that is wrong at once', () => {
    expect(refused(folder({}, [{ ...houseRule, at: ['x_y'], needs: ['z_w'] }])).length).toBe(2)
  })

  it('may judge every sheet, without a condition', () => {
    const { when: _when, ...always } = houseRule
    expect(made(folder({}, [always])).rules.at(-1)?.when).toBeUndefined()
  })
})
