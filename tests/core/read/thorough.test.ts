import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readThoroughly } from '#core/read/thorough.ts'
import { EXAMPLES } from '../../schemas/corpus.ts'

/** Codes and lines of what is found, and the values that are certain all the same. */
function told(text: string): { found: string[]; tree: unknown } {
  const result = readThoroughly(text)
  if (result.ok) throw new Error('This file is sound.')
  return { found: result.problems.map(({ code, range }) => `${code} ${range?.line}`), tree: result.certain?.tree }
}

describe('a file of which no key is left', () => {
  it('is told of at its beginning, like any other problem', () => {
    const result = readThoroughly('>#@ Shows: a dwelling\nskerry: 1\n')
    if (result.ok) throw new Error('It cannot be read.')
    expect(result.problems.length).toBeGreaterThan(1)
    for (const { range } of result.problems) expect(range).toBeDefined()
  })
})

describe('a sentence about a line of which something was covered', () => {
  it('shows no cover', () => {
    const text = 'skerry: 1\ninspection:\n  - { item: notices, r\u202e #esult: good }\n'
    const result = readThoroughly(text)
    if (result.ok) throw new Error('It cannot be read.')
    expect(result.problems.length).toBeGreaterThan(1)
    for (const { message } of result.problems) expect(message).not.toMatch(/[\ue000-\uf8ff]/)
  })
})

describe('what one error would have hidden', () => {
  it('syntax does not hide numbers, nor characters syntax', () => {
    const { found, tree } = told('a: si\u202ate\nb: @home\nc: { d: 1,5 m, e: 7 }\nf: 0x1F\ng: right\n')
    expect(found).toEqual(['forbidden-character 1', 'needs-quotes 2', 'decimal-comma 3', 'number-radix 4'])
    expect(tree).toMatchObject({ c: { e: 7 }, g: 'right' })
  })

  it.each([
    ['a directive', '%YAML 1.2\na: 1_0\nb: 2\n', ['directive 1', 'number-separator 2']],
    ['a tab between values', 'x: { y: \t1 }\na: 1_0\nb: 2\n', ['tab 1', 'number-separator 2']],
    ['several tabs', 'x: { y: \t1 }\na: { y: \t1_0 }\nb: 2\n', ['tab 1', 'tab 2', 'number-separator 2']],
    [
      'a tag',
      'a: !!str 1_0\nc: !!map\n  d: 012\nb: 2\n',
      ['tag 1', 'number-separator 1', 'tag 2', 'number-leading-zero 3'],
    ],
    ['an anchor and its alias', 'x: &one 3\na: *one\nc: 1_0\nb: 2\n', ['anchor 1', 'anchor 2', 'number-separator 3']],
    ['a bound without quotes', 'a: >9\nc: >999 MΩ\nb: 2\n', ['needs-quotes 2', 'needs-quotes 1']],
    ['a second colon', 'a: b: c\nc: 1_0\nb: 2\n', ['needs-quotes 1', 'number-separator 2']],
    [
      'two of one line',
      'a: { c: @x, d: @y, e: 1_0 }\nb: 2\n',
      ['needs-quotes 1', 'needs-quotes 1', 'number-separator 1'],
    ],
    ['an escape', 'a: "\\q"\nc: 1_0\nb: 2\n', ['bad-escape 1', 'number-separator 2']],
    ['a comment that is glued', 'a: "x"#y\nc: 1_0\nb: 2\n', ['missing-space 1', 'number-separator 2']],
    ['a colon that is glued', 'a: { c:1, d: 1_0 }\nb: 2\n', ['missing-space 1', 'number-separator 1']],
    ['a key that stands twice', 'a: 1\na: 1_0\nb: 2\n', ['duplicate-key 2', 'number-separator 2']],
    ['two commas that make the same key', 'c: { x: 1,5 m, y: 2,5 m }\nb: 2\n', ['decimal-comma 1', 'decimal-comma 1']],
  ])('%s does not end the reading', (_, text, found) => {
    const result = told(text)
    expect(result.found.toSorted()).toEqual(found.toSorted())
    expect(result.tree).toMatchObject({ b: 2 })
  })

  it.each([
    ['a quote that is never closed', 'a: "x\nc: 1_0\n', 'unclosed-quote 1'],
    ['a line without a colon', 'a: 1\nx\nc: 1_0\n', 'missing-colon 2'],
    ['a tab in front of a line', 'a:\n\tb: 1_0\n', 'tab 2'],
    ['a second document', 'a: 1\n---\nb: 1_0\n', 'several-documents 2'],
  ])('%s leaves the rest in doubt, and nothing is said of it', (_, text, first) => {
    const { found, tree } = told(text)
    expect(found[0]).toBe(first)
    expect(tree).toBeUndefined()
  })
})

describe('a sound file', () => {
  it.each(EXAMPLES.filter(({ name }) => !name.startsWith('wrong-in-shape')))(
    '$name is read as ever',
    ({ text, tree }) => {
      const result = readThoroughly(text)
      expect(result.ok && result.tree).toEqual(tree)
    },
  )
})

/** Spoils one value of a line `key: value # …`, in a way that is told by its code. */
const SPOILS: readonly (readonly [code: string, value: string])[] = [
  ['number-separator', '1_000'],
  ['number-radix', '0x1F'],
  ['number-leading-zero', '007'],
  ['needs-quotes', '@home'],
  ['bad-escape', '"\\q"'],
  ['tag', '!x 5'],
]

describe('errors of single values', () => {
  it('are all told, however many there are and wherever they stand', () => {
    fc.assert(
      fc.property(fc.array(fc.option(fc.constantFrom(...SPOILS)), { minLength: 1, maxLength: 12 }), (lines) => {
        const text = lines.map((spoil, index) => `k${index}: ${spoil?.[1] ?? 'sound'}\n`).join('')
        const result = readThoroughly(text)
        const wanted = lines.flatMap((spoil, index) => (spoil ? [`${spoil[0]} ${index + 1}`] : []))
        expect(result.ok ? [] : result.problems.map(({ code, range }) => `${code} ${range?.line}`).toSorted()).toEqual(
          wanted.toSorted(),
        )
        lines.forEach((spoil, index) => {
          if (!spoil) expect(result.ok ? result.tree : result.certain?.tree).toHaveProperty(`k${index}`, 'sound')
        })
      }),
    )
  })
})
