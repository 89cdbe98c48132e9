import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseCsv } from '#cli/csv.ts'
import { globPattern } from '#cli/select.ts'

describe('a table of readings', () => {
  it.each([
    [
      'cells between commas',
      'a,b\n1,2\n',
      [
        ['a', 'b'],
        ['1', '2'],
      ],
    ],
    [
      'cells in quotes, with commas, line ends and doubled quotes',
      'a,b\n"1,5 ""x""","two\nlines"\n',
      [
        ['a', 'b'],
        ['1,5 "x"', 'two\nlines'],
      ],
    ],
    [
      'semicolons, as a spreadsheet writes them where the comma is the decimal sign',
      'a;b\n1,5;2\n',
      [
        ['a', 'b'],
        ['1,5', '2'],
      ],
    ],
    [
      'Windows line ends, a byte order mark and no last line end',
      '\uFEFFa,b\r\n1,2',
      [
        ['a', 'b'],
        ['1', '2'],
      ],
    ],
    [
      'no empty rows',
      'a,b\n,\n\n1,2\n',
      [
        ['a', 'b'],
        ['1', '2'],
      ],
    ],
    ['a quote inside a bare cell as it is', 'a\n5" pipe\n', [['a'], ['5" pipe']]],
    ['an empty file', '', []],
  ])('has %s', (_, text, wanted) => {
    expect(parseCsv(text).map(({ cells }) => cells)).toEqual(wanted)
  })

  it('knows the line on which a row begins', () => {
    expect(parseCsv('a\n"x\ny"\nz\n').map(({ line }) => line)).toEqual([1, 2, 4])
  })

  it('gives back what was written', () => {
    const cell = fc.string().map((text) => text.replaceAll('\r', ' ').trim())
    fc.assert(
      fc.property(fc.array(fc.tuple(cell, cell, fc.constant('end')), { minLength: 1 }), (rows) => {
        const text = [['head', 'second', 'third'], ...rows]
          .map((cells) => cells.map((value) => `"${value.replaceAll('"', '""')}"`).join(','))
          .join('\n')
        expect(
          parseCsv(text)
            .slice(1)
            .map(({ cells }) => cells),
        ).toEqual(rows)
      }),
    )
  })
})

describe('a glob', () => {
  it.each([
    ['sites/*.yaml', 'sites/a.yaml', true],
    ['sites/*.yaml', 'sites/sub/a.yaml', false],
    ['**/*.yaml', 'sites/sub/a.yaml', true],
    ['**/*.yaml', 'a.yaml', true],
    ['site-?.yaml', 'site-1.yaml', true],
    ['site-{a,b}.yaml', 'site-b.yaml', true],
    ['site-[12].yaml', 'site-3.yaml', false],
    ['a+b.yaml', 'aab.yaml', false],
  ])('%s and %s: %s', (glob, path, matches) => {
    expect(globPattern(glob).test(path)).toBe(matches)
  })
})
