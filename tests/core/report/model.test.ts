import { readdirSync } from 'node:fs'
import { load } from 'js-yaml'
import { describe, expect, it } from 'vitest'
import { fieldsheetModel } from '#core/report/fieldsheet.ts'
import { findingAnchor } from '#core/report/finding-blocks.ts'
import { anchorsOf, exampleText, judgedBase, judgedExample, judgedText, modelOf, textsOf } from './judged.ts'

const EXAMPLES = readdirSync('examples')
  .filter((file) => file.endsWith('.skerry.yaml'))
  .filter((name) => name.endsWith('.skerry.yaml'))
  .map((file) => file.replace('.skerry.yaml', ''))
  .filter((name) => name !== 'wrong-in-shape')

/** The same file with the keys of every mapping in the opposite order; lists stay as they are. */
function turned(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(turned)
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value)
      .toReversed()
      .map(([key, inner]) => [key, turned(inner)]),
  )
}

describe('the model of a report', () => {
  it.each(EXAMPLES)('gives each part of %s an anchor of its own, in report and field sheet', (name) => {
    const judged = judgedExample(name)
    for (const model of [modelOf(judged), fieldsheetModel(judged)]) {
      const anchors = anchorsOf(model)
      expect(anchors.length).toBeGreaterThan(60)
      expect(anchors.filter((anchor, index) => anchors.indexOf(anchor) !== index)).toEqual([])
    }
  })

  it.each(EXAMPLES)('keeps the anchors of %s when the keys of the file are turned round', (name) => {
    const other = judgedText(JSON.stringify(turned(load(exampleText(name))), null, 2))
    const anchors = anchorsOf(modelOf(judgedExample(name)))
    expect(new Set(anchorsOf(modelOf(other)))).toEqual(new Set(anchors))
  })

  it('keeps the anchor of a reading when circuits are added before it', () => {
    const more = judgedBase({
      set: {
        'circuits.AA': {
          serves: 'New',
          fed_from: 'EB',
          phases: ['L1'],
          device: { breaker: 'B16', breaking: '6 kA' },
          cable: { type: '3G2.5', insulation: 'pvc', method: 'C', length: '9 m' },
        },
      },
    })
    for (const anchor of [
      'circuit/K1/loop/grid',
      'circuit/K1/insulation',
      'changeover/CO',
      'residual/RCD1/rated/island',
    ])
      for (const judged of [judgedBase(), more]) expect(anchorsOf(modelOf(judged))).toContain(anchor)
  })

  it('has examples of which something is left to tell', () => {
    expect(
      EXAMPLES.filter((name) => judgedExample(name).findings.some(({ verdict }) => verdict === 'fails')),
    ).not.toEqual([])
  })

  it.each(EXAMPLES)('tells every finding of %s that is not simply met, under its rule, subject and state', (name) => {
    const judged = judgedExample(name)
    const open = judged.findings.filter(({ verdict }) => verdict !== 'meets' && verdict !== 'not applicable')
    const anchors = new Set(anchorsOf(modelOf(judged)))
    expect(open.map(findingAnchor).filter((anchor) => !anchors.has(anchor))).toEqual([])
  })

  it('lists every rule of the book with its verdicts, whether it applies or not', () => {
    const judged = judgedExample('alder-mill-bakery')
    const anchors = new Set(anchorsOf(modelOf(judged)))
    expect(judged.book.rules.length).toBeGreaterThan(100)
    expect(judged.book.rules.filter(({ id }) => !anchors.has(`judged/${id}`))).toEqual([])
  })

  it('prints every parameter of the book with its source', () => {
    const judged = judgedExample('alder-mill-bakery')
    const anchors = new Set(anchorsOf(modelOf(judged)))
    expect(Object.keys(judged.book.parameters).filter((name) => !anchors.has(`parameter/${name}`))).toEqual([])
  })

  it('leaves out sections with nothing in them and numbers the rest without a gap', () => {
    const bare = judgedBase({ remove: ['meter', 'arrays', 'readings', 'inspection', 'instruments', 'batteries'] })
    const { sections } = modelOf(bare)
    expect(sections.map(({ anchor }) => anchor)).not.toContain('metering')
    expect(sections.map(({ anchor }) => anchor)).not.toContain('arrays')
    expect(sections.map(({ number }) => number)).toEqual(sections.map((_, index) => index + 1))
    expect(sections.filter(({ blocks }) => blocks.length === 0)).toEqual([])
  })

  it('says in a draft that it is not issued, and nothing of the kind otherwise', () => {
    const judged = judgedBase()
    expect(textsOf(modelOf(judged))).toContain('not issued: a draft')
  })

  it('names the file, the book and both hashes', () => {
    const judged = judgedBase()
    const texts = textsOf(modelOf(judged)).join('\n')
    expect(texts).toContain('a.skerry.yaml')
    expect(texts).toContain(`SHA-256 ${'abababab '.repeat(8).trim()}`)
    expect(texts).toContain(`${judged.book.id} ${judged.book.version}`)
    expect(texts.replaceAll(' ', '')).toContain(judged.book.hash)
  })
})

describe('what is shown of the outcome', () => {
  const standing = (judged: ReturnType<typeof judgedBase>) => {
    const [summary] = modelOf(judged).sections
    const [notice] = summary?.blocks ?? []
    return notice?.kind === 'notice' ? notice : undefined
  }

  it('a sound file can be issued', () => {
    expect(standing(judgedBase())).toMatchObject({
      title: 'It can be issued: nothing fails and nothing is missing',
      items: [],
    })
  })

  it('a rule that fails keeps it from being issued', () => {
    const notice = standing(judgedBase({ set: { 'changeover.poles': 3 } }))
    expect(notice).toMatchObject({ title: 'It cannot be issued as it stands', box: 'box-caution' })
  })

  it('a missing reading keeps it from being issued, and is counted', () => {
    const notice = standing(judgedBase({ remove: ['readings.circuits.K1.insulation'] }))
    expect(notice?.items).toEqual(['1 verdict lacks a reading or an entry.'])
    expect(notice?.box).toBe('box-note')
  })

  it('a stated limitation waits for the reviewer, with its reason under the extent', () => {
    const judged = judgedBase({ set: { 'readings.circuits.K1.insulation': { not_tested: 'tenant was away' } } })
    expect(standing(judged)?.items).toEqual(['1 limitation waits for the reviewer.'])
    expect(textsOf(modelOf(judged))).toContain('Tenant was away')
  })

  it('a departure stands in the place of the verdict, with its reason and who agreed', () => {
    const departure = {
      rule: 'changeover-opens-the-poles-demanded',
      subject: 'CO',
      reason: 'Agreed by letter',
      agreed_by: 'operator',
      on: '2026-06-01',
    }
    const judged = judgedBase({ set: { 'changeover.poles': 3, departures: [departure] } })
    const texts = textsOf(modelOf(judged))
    expect(texts).toContain('departs on purpose')
    expect(texts).toContain('Departs on purpose: Agreed by letter (agreed by operator, 1\u00a0June\u00a02026)')
    expect(standing(judged)?.items).toContain('1 departure waits for the reviewer.')
  })

  it('a caution that is not met is told as a caution, and does not keep it from being issued', () => {
    const judged = judgedBase({ remove: ['changeover.short_circuit_rating'] })
    expect(standing(judged)?.title).toBe('It can be issued: nothing fails and nothing is missing')
    expect(textsOf(modelOf(judged))).toContain('caution: not met')
  })
})
