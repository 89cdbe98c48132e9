import { describe, expect, it } from 'vitest'
import { explain } from '#core/read/explain.ts'
import { MAX_DEPTH, MAX_ITEMS, MAX_KEYS, MAX_PROBLEMS, MAX_SCALAR } from '#core/read/limits.ts'
import { read } from '#core/read/read.ts'

const problemsOf = (text: string) => {
  const result = read(text, explain)
  return result.ok ? [] : result.problems
}

describe('well-formed YAML that is not part of the format', () => {
  it.each([
    ['the end of a document in front', '# x\n... # y\na: 1', 'several-documents', 2, 1, []],
    ['a tag', 'a: !foo b', 'tag', 1, 4, ['a']],
    ['a tag that would run code elsewhere', 'a:\n  b: !!js/function "f"', 'tag', 2, 6, ['a', 'b']],
    ['a standard tag', '- !!str 1', 'tag', 1, 3, [0]],
    ['a tag on a block', 'a: !!map { b: 1 }', 'tag', 1, 4, ['a']],
    ['an anchor', 'a: &x 1', 'anchor', 1, 4, ['a']],
    ['an anchor on a list', 'a: &x [ 1 ]', 'anchor', 1, 4, ['a']],
    ['a merge key', 'a: { <<: { b: 1 } }', 'merge-key', 1, 6, ['a', '<<']],
    ['a second document', 'a: 1\n---\nb: 2\n', 'several-documents', 2, 1, []],
    ['a second document that is empty', 'a: 1\n---\n', 'several-documents', 2, 1, []],
    ['a second document without a dash', 'a: 1\n...\nb: 2\n', 'several-documents', 1, 5, []],
    ['a key that stands twice', 'a:\n  b: 1\n  b: 2\n', 'duplicate-key', 3, 3, ['a', 'b']],
    ['the same key in two ways of quoting', '{ a: 1, "a": 2 }', 'duplicate-key', 1, 10, ['a']],
    ['__proto__', 'a:\n  __proto__: { polluted: true }', 'reserved-key', 2, 3, ['a', '__proto__']],
    ['__proto__ in quotes', '"__proto__": 1', 'reserved-key', 1, 2, ['__proto__']],
    ['constructor', 'constructor: 1', 'reserved-key', 1, 1, ['constructor']],
    ['prototype', '- prototype: 1', 'reserved-key', 1, 3, [0, 'prototype']],
    ['a null key', '~: 1', 'key-not-text', 1, 1, ['~']],
    ['a key spelt null', 'null: 1', 'key-not-text', 1, 1, ['null']],
    ['no key at all', 'a: 1\n: 2\n', 'key-not-text', 1, 5, ['']],
    ['a list as key', '? [ a ]\n: b', 'key-not-text', 1, 3, ['']],
    ['a block as key', '{ { a: 1 }: b }', 'key-not-text', 1, 3, ['']],
    ['an invisible character by escape', 'a: "x\\u202ey"', 'forbidden-character', 1, 5, ['a']],
    ['a NUL by escape', 'a: "\\0"', 'forbidden-character', 1, 5, ['a']],
    ['half a surrogate pair by escape', 'a: "\\ud83d"', 'forbidden-character', 1, 5, ['a']],
    ['a code point beyond Unicode', 'a: "\\U0FFFFFFF"', 'forbidden-character', 1, 5, ['a']],
    ['a number with a leading zero', 'a: [ 1, 012 ]', 'number-leading-zero', 1, 9, ['a', 1]],
    ['a bound that YAML takes for a block of text', 'b:\n  a: >9\n', 'needs-quotes', 2, 1, ['b', 'a']],
    ['the same with blanks behind it', 'a: |2 # why\n     \nb: 1\n', 'needs-quotes', 1, 1, ['a']],
    ['the end of a document, twice', 'a: 1\n...\n# x\n...\n', 'several-documents', 4, 1, []],
    ['a decimal comma inside brackets', '{ loop: 1,5 ohm }', 'decimal-comma', 1, 9, ['5 ohm']],
    ['a colon without a space inside brackets', '{ a: 1, b:2 }', 'missing-space', 1, 9, ['b:2']],
  ])('%s', (_, text, code, line, column, path) => {
    expect(problemsOf(text)).toMatchObject([{ code, path, range: { line, column } }])
  })

  it('an alias is refused, and so is the anchor it points at', () => {
    expect(problemsOf('a: &x [ 1 ]\nb: *x\n')).toMatchObject([
      { code: 'anchor', range: { line: 1, column: 4, endColumn: 6 } },
      { code: 'anchor', path: ['b'], range: { line: 2, column: 4, endColumn: 6 } },
    ])
  })

  it('a million laughs are told line by line, not laughed', () => {
    const lines = Array.from({ length: 9 }, (_, level) => {
      const inner = level === 0 ? '"lol"' : `*l${level - 1}`
      return `l${level}: &l${level} [ ${Array(9).fill(inner).join(', ')} ]`
    })
    expect(new Set(problemsOf(lines.join('\n')).map(({ code }) => code))).toEqual(new Set(['anchor']))
  })

  it.each([
    ['nothing', ''],
    ['a comment', '# later\n'],
    ['a document that is empty', '---\n'],
    ['the word for nothing', '~\n'],
  ])('an empty file: %s', (_, text) => {
    expect(problemsOf(text)).toMatchObject([{ code: 'empty-file' }])
  })

  it.each(['Dear colleague, please find enclosed', '42', '"quoted"', 'true', '|1-\n- a\n'])(
    'a file without keys: %j',
    (text) => {
      expect(problemsOf(text)).toMatchObject([{ code: 'wrong-type', path: [] }])
    },
  )

  it.each([
    ['1: a', { 1: 'a' }],
    ['yes: a', { yes: 'a' }],
    ['1.0: a', { '1.0': 'a' }],
    ['012: a', { '012': 'a' }],
    ['"null": a', { null: 'a' }],
    ['"<<": a', { '<<': 'a' }],
    ['toString: a', { toString: 'a' }],
    ['---\na: 1\n...\n', { a: 1 }],
    ['a: "\\\\User"', { a: '\\User' }],
    ['a: "\\U0001F50C"', { a: '\u{1f50c}' }],
    ['{ "b:c", d: 1,5: 2 }', { 'b:c': null, d: 1, 5: 2 }],
    ['{ a: , b }', { a: null, b: null }],
    ['{ 5: , 6 }', { 5: null, 6: null }],
    ['a: >9\n', undefined],
    ['a: >\n  text\n', { a: 'text\n' }],
    ['a: >2\n\n', undefined],
    ['? a\n', { a: null }],
    ['- \n- ', [null, null]],
  ])('%j is taken for what it says', (text, tree) => {
    const result = read(text)
    expect(result.ok ? result.tree : undefined).toEqual(tree)
  })

  it('no file changes what objects inherit', () => {
    problemsOf('__proto__: { polluted: true }')
    const result = read('a: { hasOwnProperty: 1, valueOf: 2 }')
    expect(result).toMatchObject({ ok: true, tree: { a: { hasOwnProperty: 1, valueOf: 2 } } })
    expect(Reflect.get({}, 'polluted')).toBeUndefined()
  })
})

describe('limits', () => {
  const nested = (depth: number) => `${'['.repeat(depth)}${']'.repeat(depth)}`

  it.each([
    ['brackets', nested(MAX_DEPTH), nested(MAX_DEPTH + 1)],
    ['dashes', `${'- '.repeat(MAX_DEPTH)}x`, `${'- '.repeat(MAX_DEPTH + 1)}x`],
    ['indentation', indented(MAX_DEPTH), indented(MAX_DEPTH + 1)],
    ['far beyond', nested(1), nested(5000)],
  ])('nesting by %s', (_, sound, deep) => {
    expect(problemsOf(sound)).toEqual([])
    expect(problemsOf(deep)).toMatchObject([{ code: 'too-deep', range: { line: expect.any(Number) } }])
  })

  it('the depth that is too much is told at its path', () => {
    const path = Array.from({ length: MAX_DEPTH }, () => 0)
    expect(problemsOf(nested(MAX_DEPTH + 1))).toMatchObject([{ path }])
  })

  it('keys', () => {
    const keys = (count: number) => Array.from({ length: count }, (_, index) => `k${index}: 1`).join('\n')
    expect(problemsOf(keys(MAX_KEYS))).toEqual([])
    expect(problemsOf(keys(MAX_KEYS + 1))).toMatchObject([{ code: 'too-many-keys', range: { line: MAX_KEYS + 1 } }])
  })

  it('items', () => {
    const items = (count: number) => `[${'1,'.repeat(count)}]`
    expect(problemsOf(items(MAX_ITEMS))).toEqual([])
    expect(problemsOf(items(MAX_ITEMS + 1))).toMatchObject([{ code: 'too-many-items', path: [MAX_ITEMS] }])
  })

  it('the length of one value', () => {
    expect(problemsOf(`a: ${'x'.repeat(MAX_SCALAR)}`)).toEqual([])
    expect(problemsOf(`a: ${'x'.repeat(MAX_SCALAR + 1)}`)).toMatchObject([{ code: 'text-too-long', path: ['a'] }])
  })

  it('problems told: the rest is counted', () => {
    const found = problemsOf('- 012\n'.repeat(MAX_PROBLEMS + 3))
    expect(found).toHaveLength(MAX_PROBLEMS + 1)
    expect(found.at(-1)?.message).toMatch(/^3 more problems/)
  })

  it('a file of half a mebibyte that is wrong everywhere is answered at once', () => {
    const start = performance.now()
    expect(problemsOf(`{${'a: 01,'.repeat(80_000)}}`).at(-1)).toMatchObject({ code: 'too-many-problems' })
    expect(performance.now() - start).toBeLessThan(3000)
  })
})

/** Blocks below each other, the innermost with a value. */
function indented(depth: number): string {
  return Array.from({ length: depth }, (_, level) => `${' '.repeat(level)}k:`)
    .join('\n')
    .concat(' x')
}

describe('the documents that bring a parser down for good', () => {
  it('a hundred of them in a row, with and without their ends, through both readers', () => {
    for (let round = 0; round < 100; round++) {
      const depth = 1000 + round * 10
      const text =
        round % 3 === 0
          ? '['.repeat(depth)
          : round % 3 === 1
            ? '[{a: '.repeat(depth)
            : `${'['.repeat(depth)}${']'.repeat(depth)}`
      expect(problemsOf(text)).toMatchObject([{ code: 'too-deep' }])
      expect(explain(text)).toMatchObject([{ code: 'too-deep' }])
    }
  })

  it.each([
    ['dashes', '- '.repeat(2000)],
    ['question marks', '? '.repeat(2000)],
    ['blocks', indented(700)],
    ['brackets behind an error', `a: "\\d"\nb: ${'['.repeat(2000)}`],
    ['braces with keys', '{a: '.repeat(2000)],
  ])('%s', (_, text) => {
    expect(explain(text)).toMatchObject([{ code: 'too-deep' }])
  })
})
