import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, test } from 'vitest'
import { page, sample } from './page.ts'
import { attachments } from './sample.ts'
import { pagesOf, run, withFile, wordsOf } from './tools.ts'

const pdf = sample()

describe('the sample that uses everything', () => {
  test('qpdf finds nothing wrong in the file', () => {
    expect(withFile('page.pdf', pdf, (path) => run('qpdf', '--check', path))).toContain(
      'No syntax or stream encoding errors found',
    )
  })

  test('poppler calls it tagged, A4, and knows title, author and dates', () => {
    const info = withFile('page.pdf', pdf, (path) => run('pdfinfo', '-isodates', path))
    expect(info).toMatch(/^Title: +Alder Mill Bakery & Sons: report <FM-2026-031>$/m)
    expect(info).toMatch(/^Author: +Fenn "Electric" Ltd$/m)
    expect(info).toMatch(/^CreationDate: +2026-10-13T16:05:00Z$/m)
    expect(info).toMatch(/^Tagged: +yes$/m)
    expect(info).toMatch(/^Page size: +595\.28 x 841\.89 pts \(A4\)$/m)
  })

  test('every font is embedded, cut down to what is used, and maps back to Unicode', () => {
    const lines = withFile('page.pdf', pdf, (path) => run('pdffonts', path))
      .trim()
      .split('\n')
      .slice(2)
    expect(lines).toHaveLength(5)
    for (const line of lines) expect(line).toMatch(/yes yes yes\s+\d+\s+0$/)
  })

  test('every page says which of how many it is', () => {
    const pages = pagesOf(pdf)
    expect(pages.length).toBeGreaterThan(5)
    pages.forEach((text, index) => expect(text).toContain(`page ${index + 1} of ${pages.length}`))
    expect(pages[0]).toContain('Set by Skerry')
    expect(pages[1]).not.toContain('Set by Skerry')
  })

  test('signs of the trade and of HTML survive', () => {
    expect(wordsOf(pdf)).toContain('signs: & < > " Ω µ ² → ≤ ≥ Δ − ± ✓ ✗ ☐ ☑.')
  })

  test('words of headings, lists, tables, captions, drawings and boxes are all there', () => {
    const words = wordsOf(pdf)
    const expected = [
      'Alder Mill Bakery',
      'Caution',
      'With all loads on',
      'Main protection',
      'K46',
      'Table 2. Readings by state',
    ]
    for (const phrase of [...expected, 'cold store starts: 221 V ≥ 207 V', 'Photo 1. Main board', '4.9 Step'])
      expect(words).toContain(phrase)
  })

  test('attachments come out byte for byte', () => {
    withFile('page.pdf', pdf, (path, folder) => {
      run('pdfdetach', '-saveall', '-o', folder, path)
      for (const { name, bytes } of attachments) expect(new Uint8Array(readFileSync(join(folder, name)))).toEqual(bytes)
    })
  })

  test('the header rows of a long table stand on each page that it reaches', () => {
    const reached = pagesOf(pdf).filter((text) => /^\s*K\d+ /m.test(text) && text.includes('2.30'))
    expect(reached.length).toBeGreaterThan(1)
    for (const text of reached) expect(text).toMatch(/Circuit\s+Serves\s+Device\s+Loop impedance, Ω/)
  })

  test('no word leaves the page or its margins', () => {
    const boxes = withFile('page.pdf', pdf, (path) => run('pdftotext', '-bbox', path, '-'))
    const words = [
      ...boxes.matchAll(/<word xMin="([\d.-]+)" yMin="([\d.-]+)" xMax="([\d.-]+)" yMax="([\d.-]+)">(.*?)<\/word>/g),
    ]
    expect(words.length).toBeGreaterThan(1000)
    const inked = words.filter(([, , , , word]) => word !== 'DRAFT' && (word?.length ?? 0) > 0)
    for (const [, left, top, right, bottom] of inked) {
      expect(Number(left)).toBeGreaterThanOrEqual(30)
      expect(Number(top)).toBeGreaterThanOrEqual(20)
      expect(Number(right)).toBeLessThanOrEqual(595.28 - 42)
      expect(Number(bottom)).toBeLessThanOrEqual(841.89 - 20)
    }
  })
})

describe('page breaks', () => {
  const line = '<p>One line of text.</p>'

  test('a heading goes over with the first lines of what follows', () => {
    for (let lines = 30; lines < 40; lines++) {
      const pages = pagesOf(
        page(`<h1>Top</h1>${line.repeat(lines)}<h2>Heading</h2><p>${'words that fill lines '.repeat(30)}</p>`),
      )
      const withHeading = pages.find((text) => text.includes('Heading')) ?? ''
      expect(withHeading.match(/words that fill/g)?.length ?? 0).toBeGreaterThan(1)
    }
  })

  test('a paragraph with the class with-next goes over with the first lines of what follows', () => {
    for (let lines = 25; lines < 40; lines++) {
      const pages = pagesOf(
        page(`${line.repeat(lines)}<p class="with-next">lead</p><table><tbody><tr><td>row</td></tr></tbody></table>`),
      )
      const at = (word: string) => pages.findIndex((text) => text.includes(word))
      expect(at('lead')).toBe(at('row'))
    }
  })

  test('no page starts or ends with a single line of a paragraph', () => {
    for (let lines = 25; lines < 40; lines++) {
      const pages = pagesOf(
        page(`${line.repeat(lines)}<p>${Array.from({ length: 5 }, (_, i) => `part${i}`).join('<br>')}</p>`),
      )
      const counts = pages.map((text) => text.match(/part\d/g)?.length ?? 0).filter((count) => count > 0)
      expect(Math.min(...counts)).toBeGreaterThan(1)
    }
  })

  test('a group of rows stays whole, one taller than a page is divided between rows', () => {
    const group = (name: string, rows: number) =>
      `<tbody>${Array.from({ length: rows }, (_, i) => `<tr><td>${name}${i}</td></tr>`).join('')}</tbody>`
    const pages = pagesOf(
      page(`<table>${['a', 'b', 'c', 'd'].map((name) => group(name, 12)).join('')}${group('e', 60)}</table>`),
    )
    for (const name of ['a', 'b', 'c', 'd']) {
      expect(pages.filter((text) => new RegExp(`\\b${name}\\d`).test(text))).toHaveLength(1)
    }
    expect(pages.filter((text) => /\be\d/.test(text)).length).toBeGreaterThan(1)
    expect(pages.join(' ').match(/\be\d+\b/g)).toHaveLength(60)
  })

  test('a row taller than a page is divided, and keeps all its words', () => {
    const words = Array.from({ length: 2500 }, (_, i) => `w${i}`)
    const pages = pagesOf(
      page(
        `<table><thead><tr><th scope="col">Head</th><th scope="col">B</th></tr></thead><tbody><tr><td>${words.join(' ')}</td><td>short</td></tr></tbody></table>`,
      ),
    )
    expect(pages.length).toBeGreaterThan(2)
    expect(pages.join(' ').match(/\bw\d+\b/g)).toHaveLength(2500)
    for (const text of pages) expect(text).toContain('Head')
  })

  test('a table with the class keep, and a box, go over to the next page in one piece', () => {
    const rows = Array.from({ length: 14 }, (_, i) => `<tr><td>row${i}</td></tr>`).join('')
    const pages = pagesOf(page(`${line.repeat(25)}<table class="keep"><tbody>${rows}</tbody></table>`))
    expect(pages.filter((text) => text.includes('row'))).toHaveLength(1)
  })

  test('page-break starts a page, but never leaves an empty one', () => {
    expect(
      pagesOf(page('<section class="page-break"><p>one</p></section><section class="page-break"><p>two</p></section>')),
    ).toHaveLength(2)
  })

  test('text in columns that is longer than a page goes on in columns', () => {
    const text = Array.from({ length: 3000 }, (_, i) => `c${i}`).join(' ')
    const pages = pagesOf(page(`<div class="columns-2"><p>${text}</p></div>`))
    expect(pages.length).toBeGreaterThan(1)
    expect(pages.join(' ').match(/\bc\d+\b/g)).toHaveLength(3000)
  })

  test('an empty page is a page', () => {
    expect(pagesOf(page(''))).toHaveLength(1)
  })
})

describe('words', () => {
  test('white space collapses over elements as a browser does it', () => {
    expect(wordsOf(page('<p> one <strong> two</strong>\n three<em>four</em> </p>'))).toBe('one two threefour ')
  })

  test('a word wider than its column is broken rather than drawn over the next column', () => {
    const long = 'x'.repeat(120)
    const text = wordsOf(
      page(
        `<table><colgroup><col width="20%"><col width="80%"></colgroup><tbody><tr><td>${long}</td><td>beside</td></tr></tbody></table>`,
      ),
    )
    expect(text.match(/x/g)).toHaveLength(120)
  })

  test('spaces that hold words together are plain spaces for whoever copies the text', () => {
    expect(wordsOf(page('<p>230\u00a0V, 1\u202f000\u00a0Ω, a\u200bb</p>'))).toBe('230 V, 1 000 Ω, ab ')
  })

  test('accents in two parts become one letter', () => {
    expect(wordsOf(page('<p>Gera\u0308t</p>'))).toBe('Gerät ')
  })

  test('capital letters are never made: a small label keeps mΩ', () => {
    expect(wordsOf(page('<p class="small-label">limit in mΩ</p>'))).toBe('limit in mΩ ')
  })
})
