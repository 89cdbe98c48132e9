import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { load } from 'js-yaml'
import { describe, expect, it } from 'vitest'
import type { ReportModel } from '#core/document/model.ts'
import { createdFrom, pageOf, renderFieldsheet, renderReport } from '#core/document/render.ts'
import { reportModel } from '#core/document/report.ts'
import { check, type Judged } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { toldFindings } from '#core/report/told.ts'
import { synthesize } from '#tools/bench/synthesize.ts'
import { readFonts } from '#tools/build/fonts.ts'

const fonts = readFonts()
const folder = mkdtempSync(join(tmpdir(), 'skerry-report-'))

function judged(text: string): Judged {
  const result = check(text, { find: shippedBook, names: SHIPPED_BOOKS })
  if (result.kind !== 'judged') throw new Error(result.problems.map(({ message }) => message).join('\n'))
  return result
}

const example = (name: string): string => readFileSync(`examples/${name}.skerry.yaml`, 'utf8')
const options = (text: string, of: Judged) => ({
  text,
  file: 'site.skerry.yaml',
  fonts,
  created: createdFrom(of.install),
  draft: true,
})
const model = (text: string): ReportModel =>
  reportModel(judged(text), { file: 'site.skerry.yaml', sourceHash: 'f'.repeat(64) })

function anchorsOf({ sections }: ReportModel): string[] {
  return sections.flatMap(({ anchor, blocks }) => [
    anchor,
    ...blocks.flatMap((block) => [block.anchor, ...(block.table?.rows ?? []).map((row) => row.anchor)]),
  ])
}

function paper(text: string, draw = renderReport): string {
  const of = judged(text)
  const file = join(folder, 'report.pdf')
  writeFileSync(file, draw(of, options(text, of)))
  return file
}

const wordsOf = (file: string): string =>
  spawnSync('pdftotext', ['-raw', file, '-'], { encoding: 'utf8' }).stdout.replace(/\s+/g, ' ')

const NAMES = [
  'alder-mill-bakery',
  'wrong-in-twenty-ways',
  'fell-side-dairy',
  'weir-mill-63',
  'reed-hall-design',
  'tern-farm-tt',
] as const

describe('the model of a report', () => {
  it.each(NAMES)('%s: each anchor is there once', (name) => {
    const anchors = anchorsOf(model(example(name)))
    expect(anchors.filter((anchor, index) => anchors.indexOf(anchor) !== index)).toEqual([])
  })

  it('keeps its anchors when the keys of the file change their order', () => {
    const turned = (value: unknown): unknown => {
      if (Array.isArray(value)) return value.map(turned)
      if (typeof value !== 'object' || value === null) return value
      return Object.fromEntries(
        Object.entries(value)
          .toReversed()
          .map(([key, inner]) => [key, turned(inner)]),
      )
    }
    const text = example('alder-mill-bakery')
    expect(anchorsOf(model(JSON.stringify(turned(load(text))))).toSorted()).toEqual(anchorsOf(model(text)).toSorted())
  })
})

describe('the report on paper', () => {
  it.each(NAMES)('%s: every finding is in its text, with its rule', (name) => {
    const text = example(name)
    const words = wordsOf(paper(text))
    for (const { rule, verdict } of toldFindings(judged(text))) {
      expect(words.replaceAll(' ', ''), `${rule} (${verdict})`).toContain(rule.replaceAll(' ', ''))
    }
  })

  it('passes qpdf, is tagged, numbered, marked as a draft, and carries its source byte for byte', () => {
    const text = example('alder-mill-bakery')
    const file = paper(text)
    expect(spawnSync('qpdf', ['--check', file], { encoding: 'utf8' }).stdout).toContain(
      'No syntax or stream encoding errors found',
    )
    const info = spawnSync('pdfinfo', [file], { encoding: 'utf8' }).stdout
    expect(info).toMatch(/Tagged:\s+yes/)
    const pages = Number(/Pages:\s+(\d+)/.exec(info)?.[1])
    const words = wordsOf(file)
    expect(words).toContain(`page ${pages} of ${pages}`)
    expect(words).toContain('End of the report')
    spawnSync('pdfdetach', ['-saveall', '-o', folder, file])
    expect(readFileSync(join(folder, 'site.skerry.yaml'), 'utf8')).toBe(text)
    expect(JSON.parse(readFileSync(join(folder, 'facts.json'), 'utf8'))['K1']['design_current'].unit).toBe('A')
  })

  it('names rule book, version and hash', () => {
    const book = shippedBook('iec')
    expect(wordsOf(paper(example('alder-mill-bakery'))).replaceAll(' ', '')).toContain(book?.hash ?? 'none')
  })

  it('is the same to the byte for the same input', () => {
    const text = example('tern-farm-tt')
    const of = judged(text)
    expect(
      Buffer.compare(
        Buffer.from(renderReport(of, options(text, of))),
        Buffer.from(renderReport(of, options(text, of))),
      ),
    ).toBe(0)
  })

  it('prints what people write as it is, never as a template or markup', () => {
    const text = example('alder-mill-bakery').replace(
      'name: Alder Mill Bakery',
      'name: "{{constructor}} <b>Mill</b> & ${7*7} <%=7*7%>"',
    )
    expect(wordsOf(paper(text))).toContain('{{constructor}} <b>Mill</b> & ${7*7} <%=7*7%>')
  })

  it('can be issued without the mark of a draft', () => {
    const text = example('tern-farm-tt')
    const of = judged(text)
    const file = join(folder, 'final.pdf')
    writeFileSync(file, renderReport(of, { ...options(text, of), draft: false }))
    expect(wordsOf(file)).not.toContain('Draft report')
  })

  it('holds 1,000 circuits', () => {
    expect(wordsOf(paper(synthesize(1000, 1)))).toContain('K1000')
  })
})

describe('the field sheet', () => {
  it('has a box for each reading of a design, and the limit beside it', () => {
    const of = judged(example('reed-hall-design'))
    const words = wordsOf(paper(example('reed-hall-design'), renderFieldsheet))
    for (const id of Object.keys(of.install.circuits ?? {})) expect(words).toContain(`${id} Continuity R1 + R2`)
    expect(words).toContain('at most 300 ms')
    expect(words).toContain('Voltage left on the grid terminal N')
  })

  it('shows a reading that is there already in place of its box', () => {
    expect(wordsOf(paper(example('alder-mill-bakery'), renderFieldsheet))).toContain('0.55 Ω ✓')
  })
})

it('the page is the same for the browser and the paper: one string', () => {
  expect(pageOf(model(example('alder-mill-bakery')))).toMatch(/^<div class="title-block">/)
})
