import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { PaperDocument } from '#core/paper/document.ts'
import { breakLines } from '#core/paper/lines.ts'
import type { Word } from '#core/paper/shape.ts'
import { page } from './page.ts'
import { flat, Objects, structureOf } from './pdf-objects.ts'
import { greyJpeg } from './sample.ts'
import { run, withFile, wordsOf } from './tools.ts'

interface Spot {
  readonly word: string
  readonly left: number
  readonly top: number
  readonly right: number
}

/** Where each word stands, in points from the top left. */
const spotsOf = (html: string): readonly Spot[] => {
  const boxes = withFile('page.pdf', page(html), (path) => run('pdftotext', '-bbox', path, '-'))
  return [...boxes.matchAll(/<word xMin="([\d.]+)" yMin="([\d.]+)" xMax="([\d.]+)" yMax="[\d.]+">(.*?)<\/word>/g)].map(
    ([, left, top, right, word = '']) => ({ word, left: Number(left), top: Number(top), right: Number(right) }),
  )
}

const spot = (spots: readonly Spot[], word: string): Spot => {
  const found = spots.find((one) => one.word === word)
  if (!found) throw new Error(`no word ${word}`)
  return found
}

const row = (...cells: readonly string[]) => `<tr>${cells.map((cell) => `<td>${cell}</td>`).join('')}</tr>`

describe('tables', () => {
  test('figures of a num column end at the same place', () => {
    const spots = spotsOf(
      `<table><colgroup><col><col class="num"></colgroup><tbody>${row('a', '7')}${row('b', '1234')}</tbody></table>`,
    )
    expect(spot(spots, '7').right).toBeCloseTo(spot(spots, '1234').right, 1)
  })

  test('columns have the widths that they ask for', () => {
    const spots = spotsOf(
      `<table><colgroup><col width="25%"><col style="width:25%" span="2"><col width="25%"></colgroup><tbody>${row('a', 'b', 'c', 'd')}</tbody></table>`,
    )
    const steps = ['b', 'c', 'd'].map((word, index) => spot(spots, word).left - spot(spots, 'abc'.charAt(index)).left)
    for (const step of steps) expect(step).toBeCloseTo((595.28 - (35 * 72) / 25.4) / 4, 0)
  })

  test('where the content decides, no word is broken while there is room, whatever the cells hold', () => {
    const cells = [
      '<ul><li>Selectivity</li><li>two</li></ul>',
      '<div><p>Disconnection</p></div>',
      '<h4>Heading</h4>',
      '<dl><dt>Term</dt><dd>detail</dd></dl>',
      '<figure><svg role="img" aria-label="dot" viewBox="0 0 4 4"><circle r="1"/></svg></figure>',
      '',
      'words that go on over several lines in their cell<br>and break',
    ]
    const words = spotsOf(
      `<h1>a</h1><h2>b</h2><h3>c</h3><table><tbody>${row(...cells)}${row('1', '2', '3', '4', '5', '6', '7')}</tbody></table>`,
    ).map(({ word }) => word)
    expect(words).toEqual(
      expect.arrayContaining(['Selectivity', 'Disconnection', 'Heading', 'Term', 'detail', 'break']),
    )
  })

  test('a table that asks for more than the page still keeps inside it', () => {
    const spots = spotsOf(
      `<table><tbody>${row(...Array.from({ length: 12 }, (_, i) => `Disconnectiontime${i}`))}</tbody></table>`,
    )
    expect(Math.max(...spots.map(({ right }) => right))).toBeLessThan(595.28 - 42)
  })

  test('columns without a width share what the others leave, even when that is nothing', () => {
    const html = `<table class="plain"><colgroup><col width="100%"><col></colgroup><tbody>${row('a', '')}</tbody></table>`
    expect(wordsOf(page(html))).toContain('a')
  })

  test('columns that only cells across them fill are equally wide, and their words stand on the page', () => {
    const across = '<tr><td colspan="2">words that go across</td><td>end</td></tr>'
    const spots = spotsOf(
      `<table><colgroup><col><col><col width="50%"></colgroup><tbody>${across}${across}</tbody></table>`,
    )
    const [words, end] = [spot(spots, 'words'), spot(spots, 'end')]
    expect(end.left - words.left).toBeCloseTo((595.28 - (35 * 72) / 25.4) / 2, 0)
    expect(spot(spots, 'across').top).toBeCloseTo(words.top, 1)
  })

  test('text in the middle of its cell', () => {
    const spots = spotsOf('<table><tbody><tr><td class="centre">mid</td></tr></tbody></table>')
    const middle = (spot(spots, 'mid').left + spot(spots, 'mid').right) / 2
    expect(middle).toBeCloseTo((20 * 72) / 25.4 + (595.28 - (35 * 72) / 25.4) / 2, 0)
  })
})

describe('boxes and columns', () => {
  test('divs of a grid stand beside each other, the next row below', () => {
    const cells = ['one', 'two', 'three'].map((word) => `<div class="box"><p>${word}</p></div>`)
    const spots = spotsOf(`<div class="grid-2">${cells.join('')}</div>`)
    expect(spot(spots, 'one').top).toBe(spot(spots, 'two').top)
    expect(spot(spots, 'three').left).toBe(spot(spots, 'one').left)
    expect(spot(spots, 'three').top).toBeGreaterThan(spot(spots, 'one').top)
  })

  test('a box may hold a grid, and a grid a box beside a plain section', () => {
    const spots = spotsOf(
      '<section class="box columns-2"><div><p>left</p></div><section class="box-note"><p>right</p></section></section>',
    )
    expect(spot(spots, 'right').left).toBeGreaterThan(spot(spots, 'left').left + 200)
  })

  test('a drawing may stand beside a box', () => {
    const drawing =
      '<figure><svg role="img" aria-label="dot" viewBox="0 0 4 4"><circle r="1"/></svg><figcaption>dot</figcaption></figure>'
    const spots = spotsOf(`<div class="grid-2">${drawing}<div class="box"><p>beside</p></div></div>`)
    expect(spot(spots, 'beside').left).toBeGreaterThan(spot(spots, 'dot').left + 200)
  })

  test('a box in balanced columns is drawn in its own column', () => {
    const text = '<p>words of a column that fill a few lines here and there</p>'
    const spots = spotsOf(`<div class="columns-2">${text.repeat(3)}<div class="box"><p>boxed</p></div></div>`)
    expect(spot(spots, 'boxed').left).toBeGreaterThan(300)
  })

  test('an empty box is no trouble', () => {
    expect(wordsOf(page('<div class="box"></div><div class="columns-3"></div><ul></ul><dl></dl><p>end</p>'))).toBe(
      'end ',
    )
  })
})

describe('lists', () => {
  test('terms take less room, or half of it', () => {
    const list = (classes: string) => `<dl class="${classes}"><dt>term</dt><dd>detail</dd></dl>`
    const narrow = spot(spotsOf(list('plain')), 'detail').left
    expect(spot(spotsOf(list('wide-terms')), 'detail').left).toBeGreaterThan(narrow + 80)
  })

  test('an item of several blocks keeps its number beside the first', () => {
    const spots = spotsOf('<ol><li><p>first</p><p>second</p></li><li></li></ol>')
    expect(spot(spots, '1.').top).toBe(spot(spots, 'first').top)
    expect(spot(spots, 'second').left).toBe(spot(spots, 'first').left)
  })
})

describe('text', () => {
  test('a superscript stands higher, a subscript lower', () => {
    const content = (html: string) => {
      const objects = new Objects(page(html))
      const [first] = objects.list(objects.dictionary(objects.catalog['/Pages'])['/Kids'])
      const text = new TextDecoder('latin1').decode(objects.stream(objects.dictionary(first)['/Contents']))
      return [...text.matchAll(/1 0 0 -1 [\d.]+ ([\d.]+) Tm/g)].map(([, y]) => Number(y))
    }
    const [base = 0, up = 0, down = 0] = content('<p>a<sup>b</sup><sub>c</sub></p>')
    expect(up).toBeLessThan(base)
    expect(down).toBeGreaterThan(base)
  })

  test('lines that the author makes, also empty ones', () => {
    const spots = spotsOf('<p>one<br><br>three<br></p>')
    expect(spot(spots, 'three').top - spot(spots, 'one').top).toBeCloseTo(2 * 12.8, 1)
  })

  test('a hyphen between letters ends a line, one before a number does not', () => {
    const html = `<table><colgroup><col width="10%"><col width="90%"></colgroup><tbody>${row('change-over 5 −20', 'b')}</tbody></table>`
    expect(spotsOf(html).map(({ word }) => word)).toEqual(expect.arrayContaining(['change-', 'over', '−20']))
  })

  test('a line may end behind a dash, but a dash is never the start of one', () => {
    const lines = new Map<number, string[]>()
    for (const { word, top } of spotsOf(`<p>${'grid—island—'.repeat(30)}end</p>`))
      lines.set(top, [...(lines.get(top) ?? []), word])
    const texts = [...lines.values()].map((words) => words.join(''))
    expect(texts.length).toBeGreaterThan(1)
    for (const text of texts) expect(text).toMatch(/^(?:grid|island|end)/)
    expect(wordsOf(page('<p>ends in a dash—</p>'))).toContain('dash—')
  })

  test('a drawing may be as wide as asked', () => {
    const objects = new Objects(
      page('<figure><svg role="img" aria-label="dot" viewBox="0 0 4 4" width="25%"><circle r="1"/></svg></figure>'),
    )
    const [figure] = flat(structureOf(objects)).filter(({ type }) => type === '/Figure')
    const [left = 0, , right = 0] = objects.list(objects.dictionary(figure?.entries['/A'])['/BBox']).map(Number)
    expect(right - left).toBeCloseTo((595.28 - (35 * 72) / 25.4) / 4, 0)
  })
})

describe('pictures', () => {
  /** The grey picture with an EXIF block that says how the camera was held (TIFF 6, tag 274). */
  const held = (orientation: number): Uint8Array => {
    const exif = [0xff, 0xe1, 0, 34, 0x45, 0x78, 0x69, 0x66, 0, 0, 0x4d, 0x4d, 0, 42, 0, 0, 0, 8, 0, 1]
    const entry = [1, 0x12, 0, 3, 0, 0, 0, 1, 0, orientation, 0, 0, 0, 0, 0, 0]
    const bytes = [...greyJpeg.subarray(0, 2), ...exif, ...entry, ...greyJpeg.subarray(2)]
    const high = bytes.findIndex((byte, at) => byte === 0xff && bytes[at + 1] === 0xc0) + 6
    return new Uint8Array(bytes.map((byte, at) => (at === high ? 16 : byte)))
  }

  const boxOf = (jpeg: Uint8Array) => {
    const objects = new Objects(page('<figure><img src="a" alt="a board"></figure>', { pictures: { a: jpeg } }))
    const [figure] = flat(structureOf(objects)).filter(({ type }) => type === '/Figure')
    const [left = 0, bottom = 0, right = 0, top = 0] = objects
      .list(objects.dictionary(figure?.entries['/A'])['/BBox'])
      .map(Number)
    return { width: right - left, height: top - bottom }
  }

  test('a photo is no larger than its dots allow, and stands upright as the camera was held', () => {
    const upright = boxOf(held(1))
    expect(upright.width).toBeCloseTo((8 * 72) / 150, 1)
    expect(upright.height).toBeCloseTo((16 * 72) / 150, 1)
    const turned = boxOf(held(6))
    expect([turned.width, turned.height]).toEqual(
      [upright.height, upright.width].map((side) => expect.closeTo(side, 1)),
    )
  })
})

describe('small things', () => {
  test('a verdict in a column that is too narrow for it keeps its letters', () => {
    const html = `<table><colgroup><col width="4%"><col width="96%"></colgroup><tbody>${row('<span class="verdict-limited">limited</span>', '')}</tbody></table>`
    expect(wordsOf(page(html)).replaceAll(' ', '')).toBe('limited')
  })

  test('an empty side of the running head prints nothing', () => {
    expect(
      wordsOf(page('<p>a</p>', { header: { left: '', right: 'only\u00a0{page}' } }))
        .trim()
        .split(' '),
    ).toEqual(expect.arrayContaining(['a', 'only', '1']))
  })

  test('a heading of two lines is one entry of the outline', () => {
    const objects = new Objects(page('<h1>one<br>two</h1><h2 class="right">three</h2><p class="right">four</p>'))
    const first = objects.dictionary(objects.dictionary(objects.catalog['/Outlines'])['/First'])
    expect(first['/Title']).toBe('u:one two')
  })

  test('more different words than are remembered between pages', () => {
    const words = Array.from({ length: 20_050 }, (_, i) => i.toString(36))
    expect(
      wordsOf(page(`<p>${words.join(' ')}</p>`))
        .trim()
        .split(' '),
    ).toHaveLength(words.length)
  })

  test('an object that is opened and not ended does not go unnoticed', () => {
    const about = {
      title: '',
      author: '',
      subject: undefined,
      language: 'en',
      producer: '',
      part: 3,
      conformance: 'A',
    } as const
    const doc = new PaperDocument({ ...about, created: new Date(0) })
    doc.addPage()
    doc.ref()
    expect(() => doc.finish()).toThrow('A PDF object was opened and not ended.')
  })
})

describe('setting lines', () => {
  const word = (width: number): Word => ({
    pieces: [
      {
        face: 'regular',
        size: 10,
        rise: 0,
        colour: '#000000',
        spacing: 0,
        width,
        run: { glyphs: [{ id: 1, codePoint: 97, width: width * 100, kern: 0 }], width: width * 100 },
      },
    ],
    width,
    space: undefined,
    forced: false,
  })

  test('no line is wider than its column unless a single letter is, and no word is lost', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0.1, max: 90, noNaN: true }), { minLength: 1 }), (widths) => {
        const lines = breakLines(widths.map(word), 100)
        expect(lines.flatMap(({ pieces }) => pieces)).toHaveLength(widths.length)
        for (const line of lines) expect(line.width).toBeLessThanOrEqual(100.02)
      }),
    )
  })
})
