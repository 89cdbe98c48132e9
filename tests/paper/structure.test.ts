import { describe, expect, test } from 'vitest'
import { page, sample } from './page.ts'
import { flat, isDictionary, Objects, structureOf } from './pdf-objects.ts'
import { sampleOptions } from './sample.ts'

const objects = new Objects(sample())
const tags = flat(structureOf(objects))
const ofType = (type: string) => tags.filter((tag) => tag.type === type)
const xmpOf = (pdf: Objects) => new TextDecoder().decode(pdf.stream(pdf.catalog['/Metadata']))

describe('what PDF/A-3a and PDF/UA-1 ask of the catalog', () => {
  test('marked, in a language, showing its title, with an sRGB output intent', () => {
    const { catalog } = objects
    expect(objects.dictionary(catalog['/MarkInfo'])).toMatchObject({ '/Marked': true })
    expect(catalog['/Lang']).toBe('u:en')
    expect(objects.dictionary(catalog['/ViewerPreferences'])).toMatchObject({ '/DisplayDocTitle': true })
    const intent = objects.dictionary(objects.list(catalog['/OutputIntents'])[0])
    expect(intent).toMatchObject({ '/S': '/GTS_PDFA1', '/OutputConditionIdentifier': 'u:sRGB IEC61966-2.1' })
    const profile = Buffer.from(objects.stream(intent['/DestOutputProfile']))
    expect(profile.readUInt32BE(0)).toBe(profile.length)
    expect(profile.toString('latin1', 36, 40)).toBe('acsp')
  })

  test('the XMP packet is well formed, names its parts, and repeats title and author', () => {
    const xmp = xmpOf(objects)
    expect(xmp).toContain('<pdfaid:part>3</pdfaid:part><pdfaid:conformance>A</pdfaid:conformance>')
    expect(xmp).toContain('<pdfuaid:part>1</pdfuaid:part>')
    expect(xmp).toContain('<pdfaSchema:prefix>pdfuaid</pdfaSchema:prefix>')
    expect(xmp).toContain('Alder Mill Bakery &#38; Sons: report &#60;FM-2026-031&#62;')
    expect(xmp).toContain('Fenn &#34;Electric&#34; Ltd')
    expect(unbalanced(xmp)).toEqual([])
  })

  test('each page takes its tab order from the structure', () => {
    const pages = objects.list(objects.dictionary(objects.catalog['/Pages'])['/Kids'])
    for (const one of pages) expect(objects.dictionary(one)['/Tabs']).toBe('/S')
  })

  test('embedded files say what they are to the page', () => {
    const files = objects.list(objects.catalog['/AF']).map((file) => objects.dictionary(file))
    expect(files.map((file) => [file['/UF'], file['/AFRelationship']])).toEqual([
      ['u:install.yaml', '/Source'],
      ['u:facts.json', '/Data'],
    ])
    const stored = objects.dictionary(objects.dictionary(files[0]?.['/EF'])['/F'])
    expect(stored['/Subtype']).toBe('/application/yaml')
    expect(objects.dictionary(stored['/Params'])['/ModDate']).toBe('u:D:20261013160000Z')
  })
})

/** Tags of an XML text that are opened and not closed, or closed and not opened. */
const unbalanced = (xml: string): readonly string[] => {
  const open: string[] = []
  for (const [, close, name, empty] of xml.matchAll(/<(\/?)([\w:]+)[^<>]*?(\/?)>/g)) {
    if (name === undefined || empty) continue
    if (!close) open.push(name)
    else if (open.at(-1) === name) open.pop()
    else return [`</${name}>`]
  }
  return open
}

describe('the structure tree', () => {
  test('has the elements that the HTML has', () => {
    for (const type of [
      '/Document',
      '/Sect',
      '/H1',
      '/H2',
      '/H3',
      '/H4',
      '/P',
      '/L',
      '/LI',
      '/Lbl',
      '/LBody',
      '/Caption',
      '/Div',
    ]) {
      expect(ofType(type).length, type).toBeGreaterThan(0)
    }
    expect(ofType('/Table')).toHaveLength(2)
    expect(ofType('/TBody')).toHaveLength(5)
    expect(ofType('/TR')).toHaveLength(2 + 46 + 1 + 40)
  })

  test('every figure has words and a box inside the page', () => {
    const figures = ofType('/Figure')
    expect(figures).toHaveLength(49)
    for (const { entries } of figures) {
      expect(String(entries['/Alt']).length).toBeGreaterThan(5)
      const box = objects.list(objects.dictionary(entries['/A'])['/BBox']).map(Number)
      expect(box).toHaveLength(4)
      expect(Math.min(...box)).toBeGreaterThan(0)
      expect(box[2]).toBeLessThan(596)
    }
  })

  test('every header cell has a scope, cells over several columns say so', () => {
    const headers = ofType('/TH')
    expect(headers.length).toBeGreaterThan(60)
    for (const { entries } of headers)
      expect(String(objects.dictionary(entries['/A'])['/Scope'])).toMatch(/^\/(Row|Column)$/)
    const spans = headers
      .map(({ entries }) => objects.dictionary(entries['/A'])['/ColSpan'])
      .filter((span) => span !== undefined)
    expect(spans).toEqual([2, 4, 4, 4, 4])
  })

  test('repeated header rows are decoration: the structure holds each once', () => {
    expect(ofType('/THead')).toHaveLength(2)
    expect(
      ofType('/THead')
        .flatMap(flat)
        .filter(({ type }) => type === '/TH'),
    ).toHaveLength(14 + 4 - 1)
  })

  test('lists say how they count', () => {
    const kinds = ofType('/L').map(({ entries }) => objects.dictionary(entries['/A'])['/ListNumbering'])
    expect(new Set(kinds)).toEqual(new Set(['/Disc', '/Decimal', '/None']))
  })

  test('everything drawn is either part of an element or an artifact', () => {
    const pages = objects.list(objects.dictionary(objects.catalog['/Pages'])['/Kids'])
    for (const one of pages) {
      const content = new TextDecoder('latin1').decode(objects.stream(objects.dictionary(one)['/Contents']))
      const depths = paintDepths(content)
      expect(depths.length).toBeGreaterThan(2)
      expect(new Set(depths)).toEqual(new Set([1]))
    }
  })
})

/** For each operator that leaves ink: inside how many marked contents it stands. */
const paintDepths = (content: string): readonly number[] => {
  let depth = 0
  return content.split('\n').flatMap((line) => {
    if (/ BDC$/.test(line)) depth++
    if (line === 'EMC') depth--
    return / TJ| S$| f$|^[BfS]$| B$| Do$/.test(line) ? [depth] : []
  })
}

describe('the outline', () => {
  test('follows the headings, counts what shows when opened, and points at the heading', () => {
    const outline = objects.dictionary(objects.catalog['/Outlines'])
    const top = objects.dictionary(outline['/First'])
    expect(top['/Title']).toBe('u:Alder Mill Bakery')
    expect(outline['/Count']).toBe(5)
    expect(top['/Count']).toBe(4)
    const first = objects.dictionary(top['/First'])
    expect(first['/Title']).toBe('u:1 Summary')
    expect(first['/Count']).toBe(-2)
    expect(objects.list(first['/Dest'])[1]).toBe('/XYZ')
  })

  test('is left out when there is no heading', () => {
    expect(new Objects(page('<p>words</p>')).catalog).not.toHaveProperty('/Outlines')
  })

  test('ids are named destinations', () => {
    const names = objects.dictionary(objects.dictionary(objects.catalog['/Names'])['/Dests'])
    expect(objects.list(names['/Names']).filter((name) => typeof name === 'string' && name.startsWith('u:'))).toEqual([
      'u:loops',
      'u:summary',
    ])
  })
})

test('without a subject, header, footer or watermark none is written', () => {
  const bare = new Objects(page('<h1>Words</h1>'))
  expect(xmpOf(bare)).not.toContain('dc:description')
  expect(bare.dictionary(bare.trailer['/Info'])).not.toHaveProperty('/Subject')
})

test('the name of a font that is not used does not appear', () => {
  const names = new Objects(page('<p>words</p>')).all
    .filter(isDictionary)
    .map(({ value }) => (isDictionary(value) ? String(value['/FontName'] ?? '') : ''))
  expect(names.filter((name) => name !== '')).toEqual([expect.stringContaining('IBMPlexSans-Regular')])
  expect(sampleOptions.fonts.fallback.length).toBeGreaterThan(1000)
})
