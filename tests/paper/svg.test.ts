import { describe, expect, test } from 'vitest'
import { onPaper } from '#core/paper/operators.ts'
import { readPath as read } from '#core/paper/svg-path.ts'
import { rectangle } from '#core/paper/svg-shapes.ts'
import { page } from './page.ts'
import { Objects } from './pdf-objects.ts'
import { wordsOf } from './tools.ts'

const readPath = (data: string) => read(data, (sentence) => new Error(sentence))

const rounded = (segments: readonly (readonly (string | number)[])[]) =>
  segments.map((segment) =>
    segment.map((value) => (typeof value === 'number' ? Math.round(value * 1000) / 1000 : value)),
  )

describe('paths', () => {
  test('small letters count from where the pen stands, repeated numbers repeat the command', () => {
    expect(readPath('m1 1 2 0h3v-1l1,1 1 1z m1 0')).toEqual([
      ['M', 1, 1],
      ['L', 3, 1],
      ['L', 6, 1],
      ['L', 6, 0],
      ['L', 7, 1],
      ['L', 8, 2],
      ['Z'],
      ['M', 2, 1],
    ])
  })

  test('numbers may touch, as drawing programs write them', () => {
    expect(readPath('M.5.5-1-1e1L+2,3')).toEqual([
      ['M', 0.5, 0.5],
      ['L', -1, -10],
      ['L', 2, 3],
    ])
  })

  test('a quadratic curve becomes the cubic one with the same middle', () => {
    expect(rounded(readPath('M0 0Q3 6 6 0'))).toEqual([
      ['M', 0, 0],
      ['C', 2, 4, 4, 4, 6, 0],
    ])
    expect(rounded(readPath('M1 1q3 6 6 0c1 1 2 2 3 3'))[2]).toEqual(['C', 8, 2, 9, 3, 10, 4])
  })

  test.each([
    ['0 0', 3],
    ['0 1', 1],
    ['1 0', 3],
    ['1 1', 1],
  ])('an arc with flags %s keeps to its circle', (flags) => {
    const curves = readPath(`M0 0A5 5 0 ${flags} 5 5`).slice(1)
    const [large, sweep] = flags.split(' ')
    const centre = large !== sweep ? [0, 5] : [5, 0]
    for (const curve of curves) {
      const [x, y] = curve.slice(-2).map(Number)
      expect(Math.hypot((x ?? 0) - (centre[0] ?? 0), (y ?? 0) - (centre[1] ?? 0))).toBeCloseTo(5, 9)
    }
    expect(curves).toHaveLength(large === '1' ? 3 : 1)
    expect(curves.at(-1)?.slice(-2)).toEqual([5, 5])
  })

  test('radii that are too small grow until they reach, no radius is a line, no way is nothing', () => {
    expect(rounded(readPath('M0 0A1 1 0 0 1 10 0'))[1]?.slice(-2)).toEqual([5, -5])
    expect(readPath('M0 0A0 1 0 0 1 10 0')[1]).toEqual(['L', 10, 0])
    expect(readPath('M0 0A1 1 0 0 1 0 0')).toHaveLength(1)
    expect(readPath('M0 0a4 2 90 0 1 4 0').at(-1)?.slice(-2)).toEqual([4, 0])
  })
})

test('a corner is never rounder than half the shorter side', () => {
  expect(rectangle(0, 0, 10, 4, 9)[0]).toEqual(['M', 2, 0])
})

const drawn = (inner: string, options = {}) => {
  const objects = new Objects(
    page(
      `<figure><svg role="img" aria-label="drawing" viewBox="0 0 100 10" width="96">${inner}</svg></figure>`,
      options,
    ),
  )
  const [first] = objects.list(objects.dictionary(objects.catalog['/Pages'])['/Kids'])
  return new TextDecoder('latin1').decode(objects.stream(objects.dictionary(first)['/Contents']))
}

describe('what is drawn', () => {
  test('a class wins over an attribute, and both over what is inherited', () => {
    const content = drawn(
      '<g fill="#f00"><rect width="1" height="1"/><rect width="1" height="1" fill="#0f0"/><rect class="blue" width="1" height="1" fill="#0f0"/></g>',
      {
        svgStyles: { blue: { fill: '#0000ff' } },
      },
    )
    expect(content.match(/^[\d. ]+ rg$/gm)).toEqual(expect.arrayContaining(['1 0 0 rg', '0 1 0 rg', '0 0 1 rg']))
  })

  test('strokes have width, dash, cap and join', () => {
    const content = drawn(
      '<path d="M0 0L9 9" fill="none" stroke="#000000" stroke-width="2" stroke-dasharray="1, 2" stroke-linecap="round" stroke-linejoin="bevel"/>',
    )
    expect(content).toContain('0 0 0 RG 2 w\n[1 2] 0 d\n1 J\n2 j\n0 0 m\n9 9 l\nS')
    expect(drawn('<path d="M0 0L9 9" fill="white" stroke="black" stroke-dasharray="none"/>')).toContain(
      '0 0 m\n9 9 l\nB',
    )
  })

  test('nothing is drawn without a colour', () => {
    expect(drawn('<path d="M0 0L9 9" fill="none"/><text fill="none">a</text><text></text>')).not.toMatch(/TJ|9 9 l/)
  })

  test('opacity is transparency, and a mixed colour where PDF/A-1 forbids it', () => {
    const half = '<g opacity="0.5"><rect width="1" height="1" fill="#000" stroke="#000" stroke-opacity=".5"/></g>'
    expect(drawn(half)).toMatch(/Gs\d gs/)
    expect(drawn(half, { flavour: 'PDF/A-1b' })).not.toContain(' gs')
    expect(drawn(half, { flavour: 'PDF/A-1b' })).toContain('0.502 0.502 0.502 rg')
    expect(
      drawn('<rect width="1" height="1" class="faint unknown"/>', { svgStyles: { faint: { opacity: 0.25 } } }),
    ).toMatch(/Gs\d gs/)
    expect(onPaper('#000000', 0.25)).toBe('#bfbfbf')
  })

  test('a shape without its geometry, and a text without words, are nothing', () => {
    const strokes = (inner: string) => drawn(inner).match(/ (?:m|l|c)$| TJ/gm)?.length ?? 0
    for (const empty of ['<polygon fill="#102030"/>', '<path fill="#102030"/>', '<text fill="#102030"></text>'])
      expect(strokes(empty), empty).toBe(strokes(''))
  })

  test('a comment in a text is not printed, and a line break in a title parts its words', () => {
    const figure = (inner: string) => page(`<figure><svg role="img" viewBox="0 0 90 90">${inner}</svg></figure>`)
    expect(wordsOf(figure('<title>Flow<br>of power</title><text x="2" y="9">a<!-- b -->c</text>'))).toContain('ac')
    expect(Buffer.from(figure('<title>Flow<br>of power</title>')).toString('latin1')).toContain('Flow of power')
  })

  test('transforms apply from right to left', () => {
    expect(drawn('<g transform="translate(10 20) scale(2)"><line x2="1" stroke="#000"/></g>')).toContain(
      '2 0 0 2 10 20 cm',
    )
    expect(drawn('<g transform="rotate(90 5 5)"><line x2="1" stroke="#000"/></g>')).toContain('0 1 -1 0 10 0 cm')
    expect(drawn('<g transform=" "><line x2="1" stroke="#000"/></g>')).not.toContain('0 1 -1 0')
  })

  test('text stands at its anchor in the weight that it asks for', () => {
    const at = (anchor: string) =>
      Number(
        /Tf 1 0 0 -1 ([\d.-]+) /.exec(
          drawn(`<text x="50" y="5" font-size="4" font-weight="500" text-anchor="${anchor}">mmmm</text>`),
        )?.[1],
      )
    expect(at('start')).toBe(50)
    expect(at('middle')).toBeCloseTo((50 + at('end')) / 2, 2)
    expect(at('end')).toBeLessThan(40)
    expect(
      drawn(
        '<text y="5" dy="0.5em" font-size="4" opacity="0.5">m</text><text y="1" dy="2" font-weight="bold">m</text>',
      ),
    ).toContain('1 0 0 -1 0 7 Tm')
  })
})
