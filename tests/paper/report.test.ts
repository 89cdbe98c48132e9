import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import type { Judged } from '#core/engine.ts'
import { factsOf } from '#core/report/facts.ts'
import { createdFrom, renderFieldsheet, renderReport } from '#core/report/render.ts'
import { anchorsOf, exampleText, judgedBase, judgedText, modelOf, textsOf } from '../core/report/judged.ts'
import { fonts } from './fonts.ts'
import { pagesOf, run, withFile } from './tools.ts'

const optionsOf = (judged: Judged, text: string, draft = true) => ({
  text,
  file: 'alder-mill.skerry.yaml',
  fonts,
  created: createdFrom(judged.install),
  draft,
})

function reportOf(name: string): { readonly judged: Judged; readonly text: string; readonly pdf: Uint8Array } {
  const text = exampleText(name)
  const judged = judgedText(text)
  return { judged, text, pdf: renderReport(judged, optionsOf(judged, text)) }
}

/** Letters and digits only: where lines end and words are parted does not count. */
const bare = (text: string): string => text.replaceAll(/[\s\u00a0\u00ad-]+/g, '')

/** The words of a PDF in the order in which they are drawn. */
const drawnWords = (pdf: Uint8Array): string =>
  withFile('report.pdf', pdf, (path) => run('pdftotext', '-raw', path, '-'))

const textOf = (pdf: Uint8Array): string => bare(drawnWords(pdf))

describe('the report on paper', () => {
  it.each(['alder-mill-bakery', 'tern-farm-tt', 'reed-hall-design', 'wrong-in-twenty-ways'])(
    'holds every finding of %s, in its words',
    (name) => {
      const { judged, pdf } = reportOf(name)
      const words = textOf(pdf)
      const findings = modelOf(judged)
        .sections.flatMap(({ blocks }) => blocks)
        .flatMap((block) => (block.kind === 'findings' ? block.findings : []))
      const sound = findings.length === 0 ? ['Every rule that applies is met.'] : []
      const told = findings.flatMap(({ title, says, remedy, rule, subjects }) => [
        title,
        says,
        remedy,
        rule,
        ...subjects.map(({ name: subject }) => subject),
      ])
      expect([...sound, ...told].filter((text) => !words.includes(bare(text)))).toEqual([])
    },
  )

  it('holds every text of the model', () => {
    const { judged, pdf } = reportOf('alder-mill-bakery')
    const words = textOf(pdf)
    const skipped =
      /^(verdict-|row-|box|num$|centre$|table$|figure$|prose$|notice$|tiles$|findings$|particulars$|report|summary$|usual$)/
    const texts = textsOf(modelOf(judged)).filter((part) => !skipped.test(part) && !/^[a-z]+$/.test(part))
    expect(texts.length).toBeGreaterThan(500)
    const missing = texts.filter(
      (part) =>
        !words.includes(bare(part)) &&
        !words.includes(bare(part.replaceAll('_', ''))) &&
        !part.includes('SHA-256') &&
        part !== 'a.skerry.yaml',
    )
    expect(missing).toEqual([])
  })

  it('carries the reference and the site, its number and the count of pages on each page, and a clear end', () => {
    const { pdf } = reportOf('tern-farm-tt')
    const pages = pagesOf(pdf)
    expect(pages.length).toBeGreaterThan(5)
    pages.forEach((page, index) => {
      expect(page).toContain('FM-2026-052 · Tern Farm')
      expect(page).toContain(`page ${index + 1} of ${pages.length}`)
    })
    expect(pages.at(-1)).toContain('End of report FM-2026-052')
  })

  it('carries what a report must: title, place, customer, dates, method, instruments, people, decision rule, limits of its meaning', () => {
    const words = drawnWords(reportOf('tern-farm-tt').pdf).replaceAll(/\s+/g, ' ')
    for (const part of [
      'Test report',
      'Upper Moss 2, Fennmark',
      'K. Tern',
      '17 to 18 June 2026',
      'not issued: a draft',
      'International base, iec 1.0.0',
      'The results relate to this installation only',
      'Decision rule: simple acceptance',
      'ILAC-G8:09/2019',
      'IEC 61557',
      'Authorised by',
      'Tested by',
      'Local codes and licensed practice come before anything printed here',
    ])
      expect(words.includes(part), part).toBe(true)
  })

  it('says DRAFT across each page of a draft only', () => {
    const text = exampleText('tern-farm-tt')
    const judged = judgedText(text)
    const marks = (draft: boolean) =>
      bare(drawnWords(renderReport(judged, optionsOf(judged, text, draft)))).split('DRAFT').length - 1
    expect(marks(true)).toBe(pagesOf(renderReport(judged, optionsOf(judged, text))).length)
    expect(marks(false)).toBe(0)
  })

  it('is the same, byte for byte, each time', () => {
    const [first, second] = [reportOf('alder-mill-bakery').pdf, reportOf('alder-mill-bakery').pdf]
    expect(Buffer.compare(first, second)).toBe(0)
  })

  it('carries the file as it was entered, and every quantity with unit, formula and source', () => {
    const { judged, text, pdf } = reportOf('alder-mill-bakery')
    withFile('report.pdf', pdf, (path, folder) => {
      run('pdfdetach', '-saveall', '-o', folder, path)
      expect(readFileSync(join(folder, 'alder-mill.skerry.yaml'), 'utf8')).toBe(text)
      expect(JSON.parse(readFileSync(join(folder, 'facts.json'), 'utf8'))).toEqual(
        JSON.parse(JSON.stringify(factsOf(judged))),
      )
    })
  })

  it('prints odd text as it was written, in every text field, and runs none of it', () => {
    const odd = [
      '{{constructor}}',
      '{{{{raw}}}} {{/raw}}',
      '<b>bold</b>',
      '${1234567*2}',
      '<%=1234567*2%>',
      '</td></table>',
      'Tür & Sohn “Öl” ²Ω',
      '&lt;',
      '\'`="',
      'file:///etc/hosts',
      'a_b_c',
    ]
    const fields = [
      'site.name',
      'site.customer',
      'report.extent',
      'report.remarks',
      'circuits.K1.serves',
      'boards.EB.name',
      'supply.operator',
      'instruments.T1.kind',
      'people.tested_by.name',
      'inspection.0.note',
      'batteries.BAT.place',
    ]
    expect(fields.length).toBe(odd.length)
    for (const turn of [0, 3, 7]) {
      const texts = fields.map((_, index) => odd[(index + turn) % odd.length] ?? '')
      const judged = judgedBase({ set: Object.fromEntries(fields.map((field, index) => [field, texts[index]])) })
      const words = textOf(renderReport(judged, optionsOf(judged, 'x: 1')))
      expect(odd.filter((text) => !words.includes(bare(text)))).toEqual([])
      expect(words.includes('2469134')).toBe(false)
      const sheet = textOf(renderFieldsheet(judged, optionsOf(judged, 'x: 1')))
      expect([texts[0], texts[4], texts[5]].filter((text = '') => !sheet.includes(bare(text)))).toEqual([])
    }
  })

  it('dates a file without an inspection the same on every day', () => {
    const judged = judgedBase({ remove: ['report.inspected'] })
    expect(createdFrom(judged.install)).toBe('2000-01-01T00:00:00Z')
    const oneDay = judgedBase({ remove: ['report.inspected.to'] })
    expect(createdFrom(oneDay.install)).toBe('2026-06-16T00:00:00Z')
    expect(createdFrom(judgedBase().install)).toBe('2026-06-17T00:00:00Z')
  })

  it('takes a building of a thousand circuits, each in the schedule and in the tests', { timeout: 120_000 }, () => {
    const circuits = Object.fromEntries(
      Array.from({ length: 1000 }, (_, index) => [
        `N${index}`,
        {
          serves: `Room ${index}`,
          fed_from: 'MB',
          phases: ['L1'],
          device: { breaker: 'B16', breaking: '6 kA' },
          cable: { type: '3G2.5', insulation: 'pvc', method: 'C', length: '12 m' },
          load: { power: '10 W' },
        },
      ]),
    )
    const judged = judgedBase({
      set: Object.fromEntries(Object.entries(circuits).map(([id, circuit]) => [`circuits.${id}`, circuit])),
    })
    const anchors = new Set(anchorsOf(modelOf(judged)))
    expect(
      Object.keys(circuits).filter(
        (id) => !anchors.has(`circuit/${id}/design`) || !anchors.has(`circuit/${id}/loop/grid`),
      ),
    ).toEqual([])
    const words = textOf(renderReport(judged, optionsOf(judged, 'x: 1')))
    expect(Object.keys(circuits).filter((id) => !words.includes(id))).toEqual([])
  })
})

describe('the field sheet on paper', () => {
  it('has no mark of a draft, and ends clearly', () => {
    const text = exampleText('reed-hall-design')
    const judged = judgedText(text)
    const pages = pagesOf(renderFieldsheet(judged, optionsOf(judged, text)))
    expect(pages.join('')).not.toContain('DRAFT')
    expect(pages.at(-1)).toContain('End of field sheet FM-2026-071')
  })
})
