import { describe, expect, it } from 'vitest'
import type { Path } from '#core/glossary.ts'
import { setValues } from '#core/read/edit.ts'
import { explain } from '#core/read/explain.ts'

const FILE = `# top
readings:
  circuits:   # by name
    K1: { continuity: 0.29 ohm, loop: { grid: 0.55 ohm } }   # note
    K2: {}
    K4: { }
    K5: { a, b: }

  # after
  residual_current:
    RCD1:
      grid:   { half: no trip,  rated: 24 ms }   # aligned
  transfers:
    - { to: island }   # first
    - to: grid
      gap: "0 s"
      cause: 'it''s'
    -
  empty:          # later
  list: [ a, b ]
  none: []
  pair: [ a: 1 ]
  text: |
    two
    lines
  last: { a: 1
     }
  kept: |+
    end

people: { name: A }
`

/** Lines that went, and lines that came, in order. */
function difference(before: string, after: string): { gone: string[]; come: string[] } {
  const old = before.split('\n')
  const now = after.split('\n')
  return { gone: old.filter((line) => !now.includes(line)), come: now.filter((line) => !old.includes(line)) }
}

function changed(path: Path, text: string, file = FILE): { gone: string[]; come: string[] } {
  const result = setValues(file, [{ path, text }])
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join())
  return difference(file, result.text)
}

describe('a value that stands there already', () => {
  it.each<[string, Path, string, string]>([
    [
      'in braces',
      ['readings', 'residual_current', 'RCD1', 'grid', 'rated'],
      '26 ms',
      '      grid:   { half: no trip,  rated: 26 ms }   # aligned',
    ],
    [
      'that needs quotes now',
      ['readings', 'circuits', 'K1', 'continuity'],
      '>999 MΩ',
      '    K1: { continuity: ">999 MΩ", loop: { grid: 0.55 ohm } }   # note',
    ],
    ['in double quotes keeps them', ['readings', 'transfers', 1, 'gap'], '1 s', '      gap: "1 s"'],
    ['in single quotes keeps them', ['readings', 'transfers', 1, 'cause'], "that's", "      cause: 'that''s'"],
    ['in single quotes that cannot hold it', ['readings', 'transfers', 1, 'cause'], 'a\tb', '      cause: "a\\tb"'],
    ['a number loses its quotes', ['readings', 'transfers', 1, 'gap'], '1', '      gap: 1'],
    ['a block of text becomes one line', ['readings', 'text'], 'one line', '  text: one line'],
    [
      'a nested block in braces',
      ['readings', 'circuits', 'K1', 'loop'],
      '0.3 ohm',
      '    K1: { continuity: 0.29 ohm, loop: 0.3 ohm }   # note',
    ],
    ['an item of a list', ['readings', 'list', 0], 'c, d', '  list: [ "c, d", b ]'],
    ['nothing yet', ['readings', 'empty'], '5', '  empty: 5          # later'],
    ['nothing yet in a list', ['readings', 'transfers', 2], 'x', '    - x'],
    ['nothing yet in braces, without a colon', ['readings', 'circuits', 'K5', 'a'], '1', '    K5: { a: 1, b: }'],
    ['nothing yet in braces, with one', ['readings', 'circuits', 'K5', 'b'], '1', '    K5: { a, b: 1 }'],
    ['in the brackets of a list of pairs', ['readings', 'pair', 0, 'a'], '2', '  pair: [ a: 2 ]'],
  ])('%s', (_, path, text, line) => {
    expect(changed(path, text).come).toEqual([line])
  })
})

describe('a key that is missing', () => {
  it.each<[string, Path, string, string[]]>([
    [
      'goes last in its braces',
      ['readings', 'circuits', 'K1', 'insulation'],
      '>999 MΩ at 500 V',
      ['    K1: { continuity: 0.29 ohm, loop: { grid: 0.55 ohm }, insulation: ">999 MΩ at 500 V" }   # note'],
    ],
    [
      'goes last in the inner braces',
      ['readings', 'circuits', 'K1', 'loop', 'island'],
      '0.6 ohm',
      ['    K1: { continuity: 0.29 ohm, loop: { grid: 0.55 ohm, island: 0.6 ohm } }   # note'],
    ],
    ['fills empty braces', ['readings', 'circuits', 'K2', 'loop', 'grid'], '1', ['    K2: { loop: { grid: 1 } }']],
    ['fills empty braces with a blank', ['readings', 'circuits', 'K4', 'a'], '1', ['    K4: { a: 1 }']],
    ['goes behind a key without a value', ['readings', 'circuits', 'K5', 'c'], '1', ['    K5: { a, b:, c: 1 }']],
    [
      'stands in braces like its neighbours',
      ['readings', 'circuits', 'K3', 'loop', 'grid'],
      '1',
      ['    K3: { loop: { grid: 1 } }'],
    ],
    [
      'stands in lines like its neighbours',
      ['readings', 'residual_current', 'RCD2', 'grid', 'rated'],
      '24 ms',
      ['    RCD2:', '      grid:', '        rated: 24 ms'],
    ],
    ['stands in lines in a list item', ['readings', 'transfers', 1, 'observed'], '65 s', ['      observed: 65 s']],
    ['behind a block of text that keeps its line ends', ['readings', 'more'], '1', ['  more: 1']],
    ['behind a brace on a line of its own', ['readings', 'last', 'b'], '2', ['  last: { a: 1, b: 2']],
    ['under a key left empty', ['readings', 'empty', 'x', 'y'], '5', ['    x:', '      y: 5']],
    [
      'as a list under a key left empty',
      ['readings', 'empty', 0, 'voc'],
      '5',
      ['  empty: [ { voc: 5 } ]          # later'],
    ],
    ['in a list item left empty', ['readings', 'transfers', 2, 'to'], 'grid', ['    - { to: grid }']],
    [
      'under a key left empty in braces',
      ['readings', 'circuits', 'K5', 'a', 'b'],
      '1',
      ['    K5: { a: { b: 1 }, b: }'],
    ],
    ['as a further item in brackets', ['readings', 'list', 2], 'c', ['  list: [ a, b, c ]']],
    ['as the first item in brackets', ['readings', 'none', 0, 'a'], 'c', ['  none: [ { a: c } ]']],
    ['as a further item behind a dash', ['readings', 'transfers', 3, 'to'], 'island', ['    - { to: island }']],
    ['at the top of the file', ['site', 'name'], 'Mill', ['site: { name: Mill }']],
    ['as a list of lists', ['readings', 'new', 'a', 0, 0], '1', ['  new:', '    a: [ [ 1 ] ]']],
    ['whose name needs quotes', ['people', 'a: b'], '1', ['people: { name: A, "a: b": 1 }']],
    ['whose name is the word for nothing', ['people', 'null'], '1', ['people: { name: A, "null": 1 }']],
  ])('%s', (_, path, text, lines) => {
    const { come } = changed(path, text)
    expect(come).toEqual(lines.filter((line) => !FILE.split('\n').includes(line)))
  })

  it('goes behind the last line of its block, in front of the comment that belongs to the next', () => {
    const result = setValues(FILE, [{ path: ['readings', 'circuits', 'K9', 'a'], text: '1' }])
    expect(result.ok && result.text).toContain('    K5: { a, b: }\n    K9: { a: 1 }\n\n  # after\n')
  })

  it('keeps CRLF line ends, a missing final line end, and the indentation of the file', () => {
    const file = 'a:\r\n    b:\r\n        c: 1 # one'
    const result = setValues(file, [{ path: ['a', 'd', 'e'], text: '2' }])
    expect(result).toEqual({ ok: true, text: 'a:\r\n    b:\r\n        c: 1 # one\r\n    d:\r\n        e: 2' })
  })

  it('indents by two where the file shows no indentation', () => {
    expect(setValues('a: 1\n', [{ path: ['b', 'c'], text: '2' }])).toEqual({ ok: true, text: 'a: 1\nb:\n  c: 2\n' })
  })

  it('is written into a file in braces', () => {
    expect(setValues('{ a: 1 }', [{ path: ['b', 'c'], text: 'x, y' }])).toEqual({
      ok: true,
      text: '{ a: 1, b: { c: "x, y" } }',
    })
  })
})

describe('how a value is written', () => {
  it.each([
    ['0.29 ohm', 'a: 0.29 ohm'],
    ['-12 °C', 'a: -12 °C'],
    ['24', 'a: 24'],
    ['true', 'a: true'],
    ['<0.05 ohm', 'a: <0.05 ohm'],
    ['>999 MΩ', 'a: ">999 MΩ"'],
    ['x, y', 'a: x, y'],
    ['0417-A', 'a: 0417-A'],
    ['012', 'a: "012"'],
    ['1:30', 'a: "1:30"'],
    ['null', 'a: "null"'],
    ['', 'a: ""'],
    [' x', 'a: " x"'],
    ['x ', 'a: "x "'],
    ['a: b', 'a: "a: b"'],
    ['a:', 'a: "a:"'],
    ['a #b', 'a: "a #b"'],
    ['a#b', 'a: a#b'],
    ['- a', 'a: "- a"'],
    ['---', 'a: "---"'],
    ['"a"', 'a: "\\"a\\""'],
    ['a\nb', 'a: "a\\nb"'],
    ['@home', 'a: "@home"'],
    ['C:\\data', 'a: C:\\data'],
  ])('%j', (text, line) => {
    const result = setValues('a: 1\n', [{ path: ['a'], text }])
    expect(result).toEqual({ ok: true, text: `${line}\n` })
  })
})

describe('what is refused, and then nothing is changed', () => {
  it.each<[string, Path, string]>([
    ['a block in place of a value', ['readings', 'circuits', 'K1', 'continuity', 'x'], '1'],
    ['a value in place of a block', ['readings'], '1'],
    ['a value in place of braces over several lines', ['readings', 'last'], '1'],
    ['an item beyond the end of a list', ['readings', 'transfers', 9, 'to'], 'x'],
    ['an index where keys are', ['readings', 0], 'x'],
    ['a second item of a list that is not there', ['readings', 'none', 0, 1], 'x'],
    ['a further key in a pair without braces', ['readings', 'pair', 0, 'b'], '1'],
    ['a key that nothing may be called', ['readings', '__proto__'], '1'],
    ['the whole file', [], 'x'],
    ['half a character', ['readings', 'list', 0], '\ud800'],
  ])('%s', (_, path, text) => {
    const result = setValues(FILE, [
      { path: ['people', 'name'], text: 'B' },
      { path, text },
    ])
    expect(result).toMatchObject({
      ok: false,
      problems: [{ code: 'edit-refused', path, range: { line: expect.any(Number) } }],
    })
  })

  it('every edit that cannot be done is told', () => {
    const edits = [0, 1, 2].map((index) => ({ path: [index], text: 'x' }))
    expect(setValues(FILE, edits)).toMatchObject({ ok: false, problems: [{}, {}, {}] })
  })

  it('a file that is not sound', () => {
    expect(setValues('a: @x', [], explain)).toMatchObject({ ok: false, problems: [{ code: 'needs-quotes' }] })
    expect(setValues('a: @x', [{ path: ['a'], text: '1' }])).toMatchObject({
      ok: false,
      problems: [{ code: 'syntax' }],
    })
  })
})
