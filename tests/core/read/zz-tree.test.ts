import { readdirSync, readFileSync } from 'node:fs'
import fc from 'fast-check'
import { dump } from 'js-yaml'
import { describe, expect, it } from 'vitest'
import { stringify } from 'yaml'
import { explain, readWithComments } from '#core/read/explain.ts'
import { read } from '#core/read/read.ts'
import { slowTree } from './slow-reader.ts'

const FOLDER = new URL('../../fixtures/yaml/', import.meta.url)
const FIXTURES = readdirSync(FOLDER).map((name) => [name, readFileSync(new URL(name, FOLDER), 'utf8')] as const)

describe.each(FIXTURES)('%s', (_, text) => {
  it('gives the same values through both readers', () => {
    const fast = read(text)
    expect(fast).toMatchObject({ ok: true })
    expect(fast.ok && { tree: fast.tree }).toEqual(slowTree(text))
  })

  it('is read with its comments, to the same values', () => {
    const fast = read(text)
    const slow = readWithComments(text)
    expect(slow.ok && slow.tree).toEqual(fast.ok && fast.tree)
    expect(slow.ok && slow.document.toJS()).toEqual(fast.ok && fast.tree)
  })

  it('has nothing to explain', () => {
    expect(explain(text)).toEqual([])
  })
})

/** Texts that tempt a reader: numbers, words, indicators, blanks at the ends. */
const text = fc.oneof(
  fc.constantFrom(
    'B16',
    '3G2.5',
    '>999 MΩ',
    '1,5 ohm',
    '0417-A',
    'no trip',
    'yes',
    'null',
    '~',
    '',
    ' ',
    '012',
    '1:30',
    '- x',
    '# x',
  ),
  fc.constantFrom(
    'a: b',
    'it’s',
    "it's",
    '"q"',
    'line\nline',
    'line\n\n  line\n',
    '2026-10-12',
    '@x',
    '`x`',
    '%',
    '{x}',
    '[',
    '\\n',
    'Ω',
  ),
  fc.string({ maxLength: 12, unit: fc.constantFrom(...'aB1 .:-#,\'"[]{}|>&*!?%@\\~µΩ\n') }),
)
const number = fc
  .double({ noNaN: true, noDefaultInfinity: true, min: -1e9, max: 1e9 })
  .map((any) => Number(any.toFixed(4)))
const key = fc.oneof(
  fc.constantFrom('K1', 'fed_from', '1', 'yes', 'a b', 'a: b', '2.0'),
  fc.string({ minLength: 1, maxLength: 5 }),
)
const { tree } = fc.letrec((tie) => ({
  tree: fc.oneof(
    { maxDepth: 3, depthSize: 'small' },
    text,
    number.map((value) => (value === 0 ? 0 : value)),
    fc.boolean(),
    fc.array(tie('tree'), { maxLength: 4 }),
    fc.dictionary(key, tie('tree'), { maxKeys: 4, noNullPrototype: true }),
  ),
}))

const STYLES: Readonly<Record<string, (value: unknown) => string>> = {
  'blocks, as the package yaml prints them': (value) => stringify(value, { aliasDuplicateObjects: false }),
  'brackets, as the package yaml prints them': (value) =>
    stringify(value, { collectionStyle: 'flow', aliasDuplicateObjects: false }),
  'blocks indented by four, single quotes': (value) =>
    stringify(value, { indent: 4, singleQuote: true, aliasDuplicateObjects: false }),
  'everything in double quotes': (value) =>
    stringify(value, { defaultStringType: 'QUOTE_DOUBLE', aliasDuplicateObjects: false }),
  'long texts as blocks of text': (value) =>
    stringify(value, { lineWidth: 20, blockQuote: 'literal', aliasDuplicateObjects: false }),
  'blocks, as js-yaml prints them': (value) => dump(value, { noRefs: true }),
  'brackets from the second level, as js-yaml prints them': (value) => dump(value, { noRefs: true, flowLevel: 1 }),
  JSON: (value) => JSON.stringify(value, null, 1),
  'CRLF line ends': (value) => stringify(value, { aliasDuplicateObjects: false }).replaceAll('\n', '\r\n'),
}

describe('both readers agree on generated files', () => {
  it.each(Object.keys(STYLES))('%s', (style) => {
    fc.assert(
      fc.property(tree, (value) => {
        const file = STYLES[style]?.({ top: value }) ?? ''
        const fast = read(file)
        const slow = slowTree(file)
        expect(fast.ok ? { tree: fast.tree } : undefined).toEqual(slow)
      }),
      { numRuns: 150 },
    )
  })
})

/** What the fast way refuses on purpose although it is well-formed, and where it is stricter about tabs and margins. */
const STRICTER: ReadonlySet<string> = new Set([
  'decimal-comma',
  'missing-space',
  'needs-quotes',
  'forbidden-character',
  'tab',
  'syntax',
])

const PIECES = [
  ' ',
  '  ',
  '\n',
  '\t',
  '-',
  '- ',
  '? ',
  ': ',
  ':',
  ',',
  '[',
  ']',
  '{',
  '}',
  '#',
  ' #',
  '"',
  "'",
  '|',
  '>',
  '|-\n',
  '&a',
  '*a',
  '!t ',
  '%',
  '@',
  '`',
  '0',
  '1',
  '.',
  '~',
  '\r\n',
  '---\n',
  '...\n',
  '\\',
  'null',
  '\u00a0',
  '\ufeff',
  '<<',
  '1e5',
]
const PARTS = FIXTURES.flatMap(([, file]) => file.split(/\n(?=\S)/))

describe('a file of JSON', () => {
  it('is YAML, and gives the values that it states', () => {
    fc.assert(
      fc.property(tree, (value) => {
        const result = read(JSON.stringify({ top: value }))
        if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join())
        expect(result.tree).toEqual({ top: value })
      }),
    )
  })
})

describe('both readers agree on files that somebody spoilt', () => {
  it('what the fast one accepts, the slow one reads the same; what it refuses, the slow one refuses', () => {
    const mutation = fc.tuple(fc.nat(), fc.constantFrom(...PIECES, undefined), fc.nat(3))
    let accepted = 0
    let refused = 0
    fc.assert(
      fc.property(fc.constantFrom(...PARTS), fc.array(mutation, { maxLength: 3 }), (part, mutations) => {
        const file = mutations.reduce((now, [place, piece, cut]) => {
          const at = place % (now.length + 1)
          return now.slice(0, at) + (piece ?? '') + now.slice(at + (piece === undefined ? cut : 0))
        }, part)
        const fast = read(file)
        const slow = slowTree(file)
        if (fast.ok) {
          accepted++
          expect(slow).toEqual({ tree: fast.tree })
        } else if (slow !== undefined) {
          expect(STRICTER).toContain(fast.problems[0]?.code)
        } else {
          refused++
          expect(fast.problems.length).toBeGreaterThan(0)
        }
      }),
      { numRuns: 60000 },
    )
    expect(accepted).toBeGreaterThan(200)
    expect(refused).toBeGreaterThan(200)
  })
})

describe('what does not matter to the values', () => {
  it('the order of keys', () => {
    fc.assert(
      fc.property(fc.dictionary(key, text, { maxKeys: 6, noNullPrototype: true }), (value) => {
        const turned = Object.fromEntries(Object.entries(value).reverse())
        const one = read(stringify({ top: value }))
        const other = read(stringify({ top: turned }))
        expect(one.ok && one.tree).toEqual(other.ok && other.tree)
      }),
    )
  })

  it('comments and blank lines', () => {
    const plain = read('a: 1\nb: [ 2 ]\n')
    const commented = read('# top\n\na: 1 # one\n\n# between\nb: [ # open\n  2 ] # two\n# end\n')
    expect(commented.ok && commented.tree).toEqual(plain.ok && plain.tree)
  })
})
