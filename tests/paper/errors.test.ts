import { parseFragment } from 'parse5'
import { describe, expect, test } from 'vitest'
import { placeOf } from '#core/paper/markup.ts'
import type { PaperOptions } from '#core/paper/options.ts'
import { PaperError } from '#core/paper/problems.ts'
import { page } from './page.ts'
import { attachments, greyJpeg } from './sample.ts'

const refusal = (html: string, changes: Partial<PaperOptions> = {}): PaperError => {
  try {
    page(html, changes)
  } catch (error) {
    if (error instanceof PaperError) return error
    throw error
  }
  throw new Error('the page was typeset')
}

const svg = (inner: string, more = '') =>
  `<figure><svg role="img" aria-label="x" viewBox="0 0 9 9"${more}>${inner}</svg></figure>`
const table = (inner: string) => `<table>${inner}</table>`
const row = '<tr><td>1</td></tr>'

const CASES: readonly [name: string, html: string, code: string, line: number, column: number, says: RegExp][] = [
  ['an unknown tag', '<p>a</p>\n  <blockquote>b</blockquote>', 'unknown-tag', 2, 3, /<blockquote> is not part/],
  ['an unknown tag inside words', '<p>a <b>c</b></p>', 'unknown-tag', 1, 6, /Allowed here: <strong>/],
  ['an unknown attribute', '<p style="color:red">a</p>', 'unknown-attribute', 1, 1, /attribute style/],
  ['loose text', '<section>\nwords</section>', 'loose-text', 1, 10, /“words” stands directly in <section>/],
  ['a block inside words', '<h1><ul><li>a</li></ul></h1>', 'misplaced-tag', 1, 5, /<ul> may not stand in <h1>/],
  ['an unclosed tag', '<div><p>a</div>', 'unclosed-tag', 1, 6, /<p> is not closed/],
  ['broken HTML', '<p>a</p\n', 'broken-html', 2, 1, /eof in tag/],
  ['a row outside a group', table(row), 'misplaced-tag', 1, 8, /Write <tbody> around it/],
  [
    'a cell outside a row and a group, told where the cell stands',
    table('\n<td>1</td>'),
    'misplaced-tag',
    2,
    1,
    /A row stands outside <tbody>/,
  ],
  [
    'a tag with a name of the language',
    '<constructor>a</constructor>',
    'unknown-tag',
    1,
    1,
    /<constructor> is not part/,
  ],
  ['a col outside a colgroup', table('<col><tbody></tbody>'), 'misplaced-tag', 1, 8, /stands outside <colgroup>/],
  ['a first heading that is not h1', '<h2>a</h2>', 'heading-jump', 1, 1, /first heading must be <h1>/],
  [
    'a heading that skips a level',
    '<h1>a</h1><div>\n<h3>b<br>c</h3></div>',
    'heading-jump',
    2,
    1,
    /“b c” skips a level. After <h1> comes at most <h2>/,
  ],
  [
    'a header cell without scope',
    table('<tbody><tr><th>a</th></tr></tbody>'),
    'header-without-scope',
    1,
    19,
    /scope="col"/,
  ],
  [
    'a header cell with a wrong scope',
    table('<tbody><tr><th scope="column">a</th></tr></tbody>'),
    'header-without-scope',
    1,
    19,
    /scope/,
  ],
  [
    'rows of different length',
    table('<tbody><tr><td>1</td></tr>\n<tr><td>1</td><td>2</td></tr></tbody>'),
    'table-shape',
    2,
    1,
    /has 2 columns, the table 1/,
  ],
  ['a table without rows', table('<tbody></tbody>'), 'table-shape', 1, 1, /no row/],
  [
    'a column width in points',
    table(`<colgroup><col width="30pt"></colgroup><tbody>${row}</tbody>`),
    'table-shape',
    1,
    18,
    /30pt/,
  ],
  [
    'column widths above the whole',
    table(
      '<colgroup><col width="60%"><col style="width: 50%;"></colgroup><tbody><tr><td>1</td><td>2</td></tr></tbody>',
    ),
    'table-shape',
    1,
    1,
    /add up to 110%/,
  ],
  [
    'a colspan that is none',
    table('<tbody><tr><td colspan="0">1</td></tr></tbody>'),
    'table-shape',
    1,
    19,
    /colspan is “0”/,
  ],
  ['a detail before its term', '<dl><dd>a</dd></dl>', 'misplaced-tag', 1, 5, /before the first <dt>/],
  ['a photo without words', '<figure><img src="a.jpg"></figure>', 'missing-alternative', 1, 9, /no alt text/],
  [
    'a photo that was not handed over',
    '<figure><img src="b.jpg" alt="b"></figure>',
    'unknown-picture',
    1,
    9,
    /at hand: a.jpg, c.jpg, d.jpg/,
  ],
  ['a figure without a picture', '<figure><figcaption>a</figcaption></figure>', 'misplaced-tag', 1, 1, /exactly one/],
  [
    'a drawing without role',
    '<figure><svg aria-label="x" viewBox="0 0 1 1"></svg></figure>',
    'missing-alternative',
    1,
    9,
    /role="img"/,
  ],
  [
    'a drawing without words',
    '<figure><svg role="img" viewBox="0 0 1 1"></svg></figure>',
    'missing-alternative',
    1,
    9,
    /<title>/,
  ],
  ['a drawing without viewBox', '<figure><svg role="img" aria-label="x"></svg></figure>', 'svg-value', 1, 9, /viewBox/],
  ['an unknown element in a drawing', svg('\n<use href="#a"/>'), 'unknown-tag', 2, 1, /<use> is not part/],
  ['an unknown attribute in a drawing', svg('<g filter="x"></g>'), 'unknown-attribute', 1, 58, /filter/],
  ['a drawing in a drawing', svg('<svg></svg>'), 'misplaced-tag', 1, 58, /inside a drawing/],
  ['words between shapes', svg('words'), 'loose-text', 1, 58, /<text>/],
  ['shapes between words', svg('<text>a<g></g></text>'), 'misplaced-tag', 1, 65, /one <text> for each/],
  ['a path with an unknown command', svg('<path d="M0 0 T1 1"/>'), 'svg-value', 1, 58, /“T”/],
  ['a path that breaks off', svg('<path d="M0 0 L1"/>'), 'svg-value', 1, 58, /wants a number/],
  ['a path that does not start with a move', svg('<path d="L1 1"/>'), 'svg-value', 1, 58, /start with M/],
  ['a number behind Z', svg('<path d="M0 0Z5"/>'), 'svg-value', 1, 58, /after Z/],
  ['a path with a stray sign', svg('<path d="M0 0 #"/>'), 'svg-value', 1, 58, /wants a number/],
  ['points that do not pair', svg('<polyline points="1 2 3"/>'), 'svg-value', 1, 58, /odd count/],
  ['a colour by name', svg('<circle r="1" fill="red"/>'), 'svg-value', 1, 58, /#rrggbb/],
  ['a length with a unit', svg('<circle r="1em"/>'), 'svg-value', 1, 58, /plain number/],
  ['an unknown line cap', svg('<path stroke-linecap="flat" d=""/>'), 'svg-value', 1, 58, /butt, round, square/],
  ['an unknown transform', svg('<g transform="skewX(3)"></g>'), 'svg-value', 1, 58, /rotate\(degrees x y\)/],
  ['a shift without numbers', svg('<g transform="translate()"></g>'), 'svg-value', 1, 58, /translate\(\)/],
  ['a scale without numbers', svg('<g transform="scale()"></g>'), 'svg-value', 1, 58, /scale\(\)/],
  ['a turn by a word', svg('<g transform="rotate(left)"></g>'), 'svg-value', 1, 58, /rotate\(left\)/],
  ['a transform without numbers', svg('<g transform="rotate()"></g>'), 'svg-value', 1, 58, /rotate/],
  ['a character that no font has', '<p>one</p>\n<p>two\nthree ⏚</p>', 'unknown-character', 3, 7, /“⏚” \(U\+23DA\)/],
  ['a character that no font has, in its first line', '<p>two ⏚</p>', 'unknown-character', 1, 8, /“⏚”/],
  ['a character written as an entity', '<p>a &#x23DA;</p>', 'unknown-character', 1, 4, /U\+23DA/],
  ['a character in a drawing', svg('<text>⏚</text>'), 'unknown-character', 1, 58, /⏚/],
  ['a picture that is no JPEG', '<figure><img src="c.jpg" alt="c"></figure>', 'picture-format', 0, 0, /not a JPEG/],
  ['a picture in CMYK', '<figure><img src="d.jpg" alt="d"></figure>', 'picture-format', 0, 0, /RGB or grey/],
]

/** The grey picture with four colour components in its frame header. */
const cmykJpeg = greyJpeg.map((byte, index) => (index === greyJpeg.lastIndexOf(0xc0) + 8 ? 4 : byte))
const pictures = { 'a.jpg': greyJpeg, 'c.jpg': new Uint8Array([1, 2]), 'd.jpg': cmykJpeg }

describe('what is refused, and where', () => {
  test.each(CASES)('%s', (_, html, code, line, column, says) => {
    const error = refusal(html, { pictures })
    expect(error.message).toMatch(says)
    expect([error.code, error.line ?? 0, error.column ?? 0]).toEqual([code, line, column])
  })

  test('without pictures the error says that there are none', () => {
    expect(refusal('<figure><img alt="a"></figure>').message).toContain('at hand: none')
  })

  test('a running head with a character that no font has', () => {
    const error = refusal('<p>a</p>', { header: { left: '⏚', right: '' } })
    expect([error.code, error.line]).toEqual(['unknown-character', undefined])
  })

  test('PDF/A-1b with attachments', () => {
    expect(refusal('<p>a</p>', { attachments, flavour: 'PDF/A-1b' }).code).toBe('flavour')
  })

  test('what stands nowhere in the HTML is told at its start', () => {
    const [node] = parseFragment('<p>a</p>').childNodes
    expect(node && placeOf(node)).toEqual({ line: 1, column: 1 })
  })

  test('a date that is none', () => {
    expect(() => page('<p>a</p>', { created: 'today' })).toThrow('created is “today”. Write an ISO 8601 date and time.')
  })
})
