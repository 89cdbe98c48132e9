import { describe, expect, it } from 'vitest'
import { decode, guard } from '#core/read/guard.ts'
import { MAX_BYTES, MAX_PROBLEMS } from '#core/read/limits.ts'
import { read } from '#core/read/read.ts'

const codes = (text: string) => guard(text).map(({ code }) => code)

describe('what is refused before any parser sees the text', () => {
  it.each([
    ['a NUL', 'a: b\u0000c'],
    ['a bell', 'a: b\u0007c'],
    ['an escape that would colour a terminal', 'a: \u001b[31mred'],
    ['a delete', 'a: b\u007f'],
    ['a control of the second set', 'a: b\u0085c'],
    ['left-to-right override', 'a: \u202dabc'],
    ['right-to-left override', 'a: \u202eabc'],
    ['a direction isolate', 'a: \u2066abc\u2069'],
    ['a byte order mark inside', 'a: b\ufeffc'],
    ['half a surrogate pair', 'a: \ud83d'],
    ['a code point that is no character', 'a: \uffff'],
    ['a carriage return alone', 'a: 1\rb: 2'],
  ])('%s', (_, text) => {
    expect(codes(text)).toContain('forbidden-character')
  })

  it.each([
    ['a byte order mark in front', '\ufeffa: 1'],
    ['tabs inside a line, CRLF, a whole surrogate pair', 'a: b\tc\r\nd: \u{1f50c}\r\n'],
    ['letters of other scripts and the units of the trade', 'a: Ω µ ² ° ≥ København Ελλάδα'],
  ])('accepts %s', (_, text) => {
    expect(guard(text)).toEqual([])
    expect(read(text)).toMatchObject({ ok: true })
  })

  it('says where the character is and what it is called', () => {
    const [first] = guard('name: Mill\r\nnote: ab\u202ecd\r\n')
    expect(first).toMatchObject({
      range: { line: 2, column: 9, endLine: 2, endColumn: 10, offset: 20, endOffset: 21 },
      message: expect.stringContaining('U+202E'),
    })
  })

  it('names each kind of character by what is to be done', () => {
    expect(
      guard('a\u0007')
        .map(({ message }) => message)
        .join(),
    ).toContain('cannot be seen')
    expect(
      guard('a\rb')
        .map(({ message }) => message)
        .join(),
    ).toContain('LF or CRLF')
  })

  it('tells the first two hundred and counts the rest', () => {
    const found = guard(`\ufeff${'\u0000'.repeat(MAX_PROBLEMS + 17)}`)
    expect(found).toHaveLength(MAX_PROBLEMS + 1)
    expect(found.at(-1)).toMatchObject({ code: 'too-many-problems', message: expect.stringMatching(/^17 more/) })
  })
})

describe('the size limit', () => {
  it.each([
    ['exactly the limit, one byte a character', 'x'.repeat(MAX_BYTES), []],
    ['one byte more', 'x'.repeat(MAX_BYTES + 1), ['too-large']],
    ['exactly the limit, two bytes a character', 'é'.repeat(MAX_BYTES / 2), []],
    ['two bytes more', 'é'.repeat(MAX_BYTES / 2 + 1), ['too-large']],
    ['three bytes a character', '€'.repeat(Math.ceil(MAX_BYTES / 3)), ['too-large']],
    ['exactly the limit, four bytes a character', '\u{1f50c}'.repeat(MAX_BYTES / 4), []],
    ['four bytes more', '\u{1f50c}'.repeat(MAX_BYTES / 4 + 1), ['too-large']],
  ])('%s', (_, text, expected) => {
    expect(codes(text)).toEqual(expected)
  })
})

describe('tabs', () => {
  it('in front of a line are all told, whatever they indent', () => {
    expect(guard('a:\n\tb: 1\n  \t\tc: 2\r\n\t\n')).toMatchObject([
      { code: 'tab', range: { line: 2, column: 1, endColumn: 2 } },
      { code: 'tab', range: { line: 3, column: 3, endColumn: 5 } },
      { code: 'tab', range: { line: 4, column: 1 } },
    ])
  })

  it('inside a line are left to the parser', () => {
    expect(guard('a:\tb\t# note\n')).toEqual([])
  })
})

describe('directives', () => {
  it.each([
    ['%YAML 1.1, which would change what “no” means', '%YAML 1.1\n---\na: no\n', 1],
    ['behind a byte order mark, blank lines and comments', '\ufeff\n# note\r\n  # note\n%TAG ! x\n---\na: 1\n', 4],
    ['an unknown one', '%FOO bar\n---\na: 1\n', 1],
    ['right behind a byte order mark', '\ufeff%YAML 1.1\n---\na: 1\n', 1],
    ['an indented one', '\n  %YAML 1.1\n---\na: 1\n', 2],
  ])('%s', (_, text, line) => {
    expect(guard(text)).toMatchObject([{ code: 'directive', range: { line, column: expect.any(Number) } }])
  })

  it('tells all of them', () => {
    expect(codes('%YAML 1.2\n%TAG ! x\n---\na: 1\n')).toEqual(['directive', 'directive'])
  })

  it('a start mark that is indented', () => {
    expect(codes(' --- a\n')).toEqual(['indentation'])
    expect(codes('\ufeff ...\n')).toEqual(['indentation'])
  })

  it.each(['...x: 1\n', 'a: |\n...\n', ' ---x: 1\n'])(
    'leaves dots alone that are no mark, or stand behind the values: %j',
    (text) => {
      expect(guard(text)).toEqual([])
    },
  )

  it('leaves a line alone that begins with a percent sign inside a text', () => {
    expect(guard('note: |\n% of the charge\n')).toEqual([])
  })
})

describe('bytes', () => {
  it('are read as UTF-8, the byte order mark kept so that offsets agree', () => {
    const bytes = new Uint8Array([0xef, 0xbb, 0xbf, 0xce, 0xa9])
    expect(decode(bytes)).toEqual({ ok: true, text: '\ufeffΩ' })
  })

  it.each([
    ['Latin-1', [0x61, 0x3a, 0x20, 0xe9]],
    ['UTF-16', [0xff, 0xfe, 0x61, 0x00]],
    ['an over-long form', [0xc0, 0xaf]],
    ['half a surrogate pair', [0xed, 0xa0, 0x80]],
  ])('%s is refused', (_, bytes) => {
    expect(decode(new Uint8Array(bytes))).toMatchObject({ ok: false, problem: { code: 'not-utf8' } })
  })

  it('are not decoded when there are too many', () => {
    expect(decode(new Uint8Array(MAX_BYTES + 1))).toMatchObject({ ok: false, problem: { code: 'too-large' } })
    expect(decode(new Uint8Array(MAX_BYTES).fill(0x61))).toMatchObject({ ok: true })
  })
})
