import { describe, expect, it } from 'vitest'
import { explain, readWithComments } from '#core/read/explain.ts'
import { MAX_ITEMS, MAX_KEYS, MAX_PROBLEMS, MAX_SCALAR, MAX_TOKENS } from '#core/read/limits.ts'
import { read } from '#core/read/read.ts'
import { wordsFor } from '#core/read/syntax-words.ts'

describe('syntax errors in plain words', () => {
  it.each([
    [
      'an insulation reading without quotes',
      'a: 1\nb: >999 MΩ at 500 V\n',
      'needs-quotes',
      2,
      'write ">999 MΩ at 500 V"',
    ],
    ['the same inside braces', 'K1: { insulation: >999 MΩ, polarity: correct }', 'needs-quotes', 1, 'write ">999 MΩ"'],
    ['a bar without quotes', 'a: | x\n  y\n', 'needs-quotes', 1, 'write "| x"'],
    ['an at sign', 'a: @home # note\n', 'needs-quotes', 1, 'write "@home"'],
    ['a back quote', 'a: `x`\n', 'needs-quotes', 1, 'needs quotes'],
    ['a percent sign in front', 'a: %x\n', 'needs-quotes', 1, 'write "%x"'],
    ['a second colon', 'note: cause: unknown\n', 'needs-quotes', 1, '“cause: unknown” has a second colon'],
    ['a tab after a dash', '-\ta: 1\n-\tb:\n', 'tab', 1, 'replace it by spaces'],
    ['a quote that is never closed', 'a: 1\nb: "abc\nc: 2\n', 'unclosed-quote', 2, 'The quote " that opens here'],
    ['a single quote that is never closed', "a: 'it\n", 'unclosed-quote', 1, "write ' at the end of"],
    ['a bracket that is never closed', 'a: [1, 2\nb: 3\n', 'unclosed-bracket', 1, 'not closed by “]”'],
    ['a brace whose content is not indented', 'a: { b: 1,\nc: 2 }\n', 'unclosed-bracket', 1, 'indent what is inside'],
    [
      'brackets that are crossed',
      'a: { b: [1,2}, c: 1 }\n',
      'unclosed-bracket',
      1,
      '“[1,2}, c: 1 }” is not closed by “]”',
    ],
    ['an inner bracket that is closed', 'a: [ [1], 2\nb: 3\n', 'unclosed-bracket', 1, '“[ [1], 2” is not closed'],
    ['a bracket that was never opened', 'a: }\n', 'unclosed-bracket', 1, 'never opened'],
    ['no space after the colon', 'a:1\nb: 2\n', 'missing-space', 1, 'write “a: 1”'],
    ['no space before a comment', 'a: "x"#y\n', 'missing-space', 1, 'in front of “#y”'],
    ['no space after a colon in braces', 'a: { b:1, c: 2 }\n', 'missing-space', 1, 'write b: 1'],
    ['no colon', 'key\nb: 1\n', 'missing-colon', 1, '“key” stands where a key belongs'],
    ['no colon in the middle', 'a: 1\n"b"\nc: 2\n', 'missing-colon', 2, 'has a key without a colon'],
    ['a list among keys', 'a: 1\n- b\n', 'indentation', 2, 'put the list under a key'],
    ['a key among list items', '- a\nb: 1\n', 'syntax', 2, 'does not belong to what stands before it'],
    ['a line indented too little', 'a:\n   b: 1\n  c: 2\n', 'indentation', 3, 'begins with 2 spaces'],
    ['one space', 'a:\n  b: 1\n c: 2\n', 'indentation', 3, 'begins with 1 space,'],
    ['a line indented too much', 'a: 1\n  b: 2\n', 'indentation', 1, 'The next line is indented'],
    ['a comma missing between entries', 'a: { b: 1 c: 2 }\n', 'missing-comma', 1, 'A comma is missing in “1 c: 2 }”'],
    ['a comma missing between quotes', 'a: [ "b" "c" ]\n', 'missing-comma', 1, 'in front of “"c" ]”'],
    ['two commas', 'a: [ 1,, 2 ]\n', 'missing-comma', 1, 'nothing in front of it'],
    ['text behind a quote', 'a: "x" y\n', 'unclosed-quote', 1, 'The quotes end in front of “y”'],
    ['a quote inside quotes', "note: 'it's fine'\n", 'unclosed-quote', 1, 'use the other kind of quotes'],
    ['text behind brackets', 'a: [ 1 ] x\n', 'syntax', 1, '“x” does not belong'],
    ['a list on the line of its key', 'a: - b\n   - c\n', 'indentation', 1, 'put “- b” on the line below'],
    ['dashes inside brackets', 'a: [ - b ]\n', 'indentation', 1, 'delete the dash'],
    ['dashes inside brackets, line by line', 'a: [\n  - b\n  - c ]\n', 'indentation', 2, 'delete the dash'],
    ['an escape that is none', 'a: "C:\\data"\n', 'bad-escape', 1, '“\\d” means nothing'],
    ['a key of a thousand letters', `${'k'.repeat(1100)}: 1\n? "\\d"\n`, 'text-too-long', 1, 'missing colon or quote'],
  ])('%s', (_, text, code, line, words) => {
    const result = read(text, explain)
    expect(result).toMatchObject({ ok: false })
    expect(result.ok ? [] : result.problems[0]).toMatchObject({
      code,
      range: { line },
      message: expect.stringContaining(words),
    })
  })

  it('all of them at once, in the order of the file, the first of each line', () => {
    const text = 'a: @x\nb: fine\nc: "\\d \\e \\q"\nd: { e: @1, f: @2 }\ng: `y`\n'
    expect(explain(text).map(({ range }) => range?.line)).toEqual([1, 3, 4, 5])
  })

  it('but not the echoes of one that made the parser lose its place', () => {
    expect(explain('a: {b: 1}}\nc: 2\nd: 3\n')).toMatchObject([{ code: 'unclosed-bracket' }])
  })

  it('and what is refused besides, where the slow reader comes across it', () => {
    const text = [
      'a: "\\d"',
      'b: 1',
      'bcd: 1',
      'bcd: 2',
      '? [ x ]',
      ': y',
      'c: !foo 1',
      'd: !!set [ x ]',
      'e: &x &y 1',
      'f: !a !b 1',
      'g: &z *x',
    ]
    expect(explain(text.join('\n')).map(({ code, range }) => [range?.line, code])).toEqual([
      [1, 'bad-escape'],
      [4, 'duplicate-key'],
      [5, 'key-not-text'],
      [7, 'tag'],
      [8, 'tag'],
      [9, 'anchor'],
      [10, 'tag'],
      [11, 'anchor'],
    ])
    expect(explain(text.join('\n'))[1]?.message).toContain('“bcd”')
    expect(explain('a: "\\d"\n---\nb: 1\n').at(-1)).toMatchObject({ code: 'several-documents' })
  })

  it('two hundred are told, the rest is counted', () => {
    const found = explain('- "\\d"\n'.repeat(MAX_PROBLEMS + 5))
    expect(found).toHaveLength(MAX_PROBLEMS + 1)
    expect(found.at(-1)?.message).toMatch(/^5 more/)
  })

  it.each([
    ['keys', `x: "\\d"\n${'? a\n'.repeat(MAX_KEYS + 1)}`, 'too-many-keys'],
    ['items', `x: "\\d"\ny: [${'1,'.repeat(MAX_ITEMS + MAX_KEYS + 1)}]`, 'too-many-items'],
    ['characters in a text', `a: "${'\\d'.repeat(MAX_SCALAR)}"`, 'text-too-long'],
    ['words', '{}'.repeat(MAX_TOKENS / 2 + 1), 'too-large'],
  ])('a broken file with too many %s is not parsed by the slow reader', (_, text, code) => {
    expect(read(text, explain)).toMatchObject({ ok: false, problems: [{ code }] })
  })

  it('lines are counted as an editor does, byte order mark or not', () => {
    expect(explain('\ufeffa: "\\d"\r\n\r\nb: @x')).toMatchObject([
      { range: { line: 1, column: 6 } },
      { range: { line: 3, column: 4 } },
    ])
  })
})

describe('an error of the parser', () => {
  const scene = { reason: 'Something new', rest: 'rest', line: 'line' }

  it('that nobody has put into words is told in its own', () => {
    expect(wordsFor({ ...scene, code: 'IMPOSSIBLE' })).toEqual({
      code: 'syntax',
      message: 'This is not well-formed YAML (Something new): look at this line and the one before.',
    })
  })

  it('about the space after a colon in braces', () => {
    const reason = 'Missing space after : in flow map'
    expect(wordsFor({ ...scene, code: 'MISSING_CHAR', reason })).toMatchObject({ code: 'missing-space' })
  })
})

describe('reading without an explainer', () => {
  it('tells the first error and that there may be more', () => {
    expect(read('a: 1\nb: @x\nc: @y\n')).toMatchObject({
      ok: false,
      brief: true,
      problems: [{ code: 'syntax', range: { line: 2 }, message: expect.stringContaining('the one before') }],
    })
  })

  it('an error at the end of the file is inside the file', () => {
    const text = 'a: ['
    expect(read(text)).toMatchObject({ ok: false, problems: [{ range: { line: 1, endOffset: text.length } }] })
  })

  it('what the slow reader lets pass is told in the fast one’s words', () => {
    const inBraces = read('c:\n  { d:\n1 }\n', () => [])
    expect(inBraces).toMatchObject({ ok: false, problems: [{ code: 'syntax' }] })
    const result = read('a:\n  b: { c: \td }\n', explain)
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'tab', range: { line: 2 } }] })
    expect(result).not.toHaveProperty('brief')
  })
})

describe('reading with comments', () => {
  it('gives the document with its comments', () => {
    const result = readWithComments('# head\na: 1 # one\n')
    expect(result.ok && result.document.toString()).toBe('# head\na: 1 # one\n')
    expect(result.ok && result.locate(['a'])).toMatchObject({ line: 2, column: 4 })
  })

  it('gives the problems of a file that is not sound', () => {
    expect(readWithComments('a: @x\n')).toMatchObject({ ok: false, problems: [{ code: 'needs-quotes' }] })
    expect(readWithComments('a: !x 1\n')).toMatchObject({ ok: false, problems: [{ code: 'tag' }] })
    expect(readWithComments(`${'k'.repeat(1100)}: 1`)).toMatchObject({
      ok: false,
      problems: [{ code: 'text-too-long' }],
    })
  })
})
