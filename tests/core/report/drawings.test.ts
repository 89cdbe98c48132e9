import { describe, expect, it } from 'vitest'
import { readMarkup } from '#core/paper/markup.ts'
import { readBlocks } from '#core/paper/read-blocks.ts'
import { islandBudget } from '#core/quantities/budget.ts'
import { limitBar } from '#core/report/bars.ts'
import { budgetCurve } from '#core/report/curve.ts'
import { singleLine } from '#core/report/single-line.ts'
import { stringPlot } from '#core/report/string-plot.ts'
import { judgedBase, judgedExample, sceneOf } from './judged.ts'

/** Throws where the paper cannot draw it. */
const drawn = (svg: string): string => {
  readBlocks(readMarkup(`<figure>${svg}</figure>`), { svgStyles: {}, pictures: new Set() })
  return svg
}

const wordsOf = (svg: string): string[] =>
  [...svg.matchAll(/<text[^>]*>([^<]*)<\/text>/g)].map(([, words = '']) => words)

/** The group of one part of the diagram. */
const partOf = (svg: string, id: string): string => {
  const start = svg.indexOf(`data-part="${id}"`)
  const from = svg.lastIndexOf('<g', start)
  const next = svg.indexOf('data-part="', start + 1)
  return svg.slice(from, next === -1 ? undefined : svg.lastIndexOf('<g', next))
}

const DASHED = 'stroke-dasharray="3 2" data-part'
const dead = (svg: string, id: string): boolean => partOf(svg, id).slice(0, 200).includes(DASHED)

describe('the single-line diagram', () => {
  it.each([
    'alder-mill-bakery',
    'tern-farm-tt',
    'heron-ford-dwelling',
    'osier-lane-three-pole',
    'smithy-past-the-device',
    'weir-mill-63',
    'fell-side-dairy',
    'reed-hall-design',
    'wrong-in-twenty-ways',
  ])('of %s shows every board, device, source and circuit by name in both states', (name) => {
    const judged = judgedExample(name)
    const { install } = judged
    const ids = [
      install.boards,
      install.overcurrent,
      install.residual_current,
      install.inverters,
      install.arrays,
      install.batteries,
      install.circuits,
    ].flatMap((all) => Object.keys(all ?? {}))
    for (const state of ['grid', 'island'] as const) {
      const svg = drawn(singleLine(judged, state))
      expect(ids.filter((id) => !svg.includes(`data-part="${id}"`))).toEqual([])
      const words = wordsOf(svg).join('\n')
      expect(ids.filter((id) => !words.includes(id))).toEqual([])
    }
  })

  it('names the cable that leads to a board, a device, the changeover and an inverter', () => {
    const cable = (type: string) => ({ type, insulation: 'xlpe', method: 'B2', length: '9 m' })
    const svg = (changes: Record<string, unknown>) => singleLine(judgedBase({ set: changes }), 'grid')
    const laid = svg({
      'boards.EB.cable': cable('5G4'),
      'residual_current.RCD1.cable': cable('5G6'),
      'changeover.cable': cable('5G10'),
      'overcurrent.F35.cable': cable('5G16'),
      'inverters.INV.cable': cable('5G25'),
    })
    for (const [id, name] of [
      ['EB', '5G4'],
      ['RCD1', '5G6'],
      ['CO', '5G10'],
      ['F35', '5G16'],
      ['INV', '5G25'],
    ] as const)
      expect(wordsOf(partOf(laid, id)).join(), id).toContain(name)
  })

  it('dashes in the island what only the grid feeds, and nothing on the grid', () => {
    const judged = judgedExample('alder-mill-bakery')
    const [grid, island] = [singleLine(judged, 'grid'), singleLine(judged, 'island')]
    for (const id of ['supply', 'M1', 'main protection', 'MB', 'F35', 'K7']) {
      expect(dead(grid, id)).toBe(false)
      expect(dead(island, id)).toBe(true)
    }
    for (const id of ['CO', 'RCD1', 'EB', 'K1', 'K2', 'INV', 'A1', 'BAT']) expect(dead(island, id)).toBe(false)
  })

  it('opens the changeover in the island and closes its link to earth', () => {
    const judged = judgedExample('alder-mill-bakery')
    const [grid, island] = [partOf(singleLine(judged, 'grid'), 'CO'), partOf(singleLine(judged, 'island'), 'CO')]
    expect(grid).not.toBe(island)
    const open = judgedBase({ set: { 'changeover.neutral_link': 'none' } })
    expect(wordsOf(partOf(singleLine(open, 'grid'), 'CO'))).not.toContain('N–PE')
    expect(wordsOf(island)).toContain('N–PE')
  })

  it('draws a link of a board or an inverter to earth where one is stated', () => {
    const judged = judgedBase({ set: { 'boards.EB.neutral_link': 'fixed', 'inverters.INV.neutral_link': 'fixed' } })
    const svg = drawn(singleLine(judged, 'island'))
    expect(wordsOf(partOf(svg, 'EB'))).toContain('N–PE')
    expect(wordsOf(partOf(svg, 'INV'))).toContain('N–PE')
  })

  it('shows a service bypass with its position, closed or open, interlocked or not', () => {
    const link = (position: string, interlocked: boolean) =>
      judgedBase({ set: { links: { Q9: { from: 'MB', to: 'EB', position, interlocked } } } })
    expect(wordsOf(drawn(singleLine(link('open', true), 'grid')))).toContain('Q9 to EB · open · interlocked')
    expect(wordsOf(drawn(singleLine(link('closed', false), 'island')))).toContain('Q9 to EB · closed · not interlocked')
  })

  it('draws a breaker above the circuits as one, with its breaking current only where one is stated', () => {
    const drawing = (set: Record<string, unknown>, remove: readonly string[] = []) =>
      partOf(drawn(singleLine(sceneOf(judgedBase({ set, remove: [...remove] })), 'grid')), 'F35')
    const breaker = drawing({ 'overcurrent.F35.device': { breaker: 'C35', breaking: '6 kA' } }, [
      'overcurrent.F35.breaking',
    ])
    const bare = drawing({ 'overcurrent.F35.device': { breaker: 'C35' } }, ['overcurrent.F35.breaking'])
    expect(wordsOf(breaker)).toEqual(['F35', 'C35', '6\u00a0kA'])
    expect(wordsOf(bare)).toEqual(['F35', 'C35'])
    expect(wordsOf(drawing({}))).toEqual(['F35', 'gG 35', '50\u00a0kA'])
    const shape = (svg: string): string => svg.replaceAll(/<text.*?<\/text>/g, '')
    expect(shape(breaker)).toBe(shape(bare))
    expect(shape(breaker)).not.toBe(shape(drawing({})))
  })

  it('draws a board on which nothing hangs yet', () => {
    const scene = sceneOf(judgedBase({ set: { 'boards.SB': { name: 'Spare board', fed_from: 'MB' } } }))
    expect(wordsOf(partOf(drawn(singleLine(scene, 'grid')), 'SB'))).toEqual(['SB Spare board'])
  })

  it('keeps names literal that look like markup', () => {
    const judged = judgedBase({ set: { 'circuits.K1.serves': '<b>&"x', 'supply.operator': '<script>' } })
    const svg = drawn(singleLine(judged, 'grid'))
    expect(svg).toContain('&lt;b&gt;&amp;&quot;x')
    expect(svg).not.toContain('<script>')
  })

  const SIZES = [1.5, 2.5, 4, 6, 10, 16, 25]
  const RATINGS = [10, 13, 16, 20, 25]
  const circuit = (index: number, builds: number) => ({
    serves: `Load ${index}`,
    fed_from: index % 2 ? 'EB' : 'MB',
    phases: ['L1'],
    device: { breaker: `B${RATINGS[(index % builds) % 5]}`, breaking: '6 kA' },
    cable: { type: `3G${SIZES[(index % builds) % 7]}`, insulation: 'pvc', method: 'C', length: '9 m' },
  })
  /** So many circuits more, of so many builds on each of two boards. */
  const many = (count: number, builds: number) =>
    judgedBase({
      set: Object.fromEntries(
        Array.from({ length: count }, (_, index) => [`circuits.X${index}`, circuit(index, builds)]),
      ),
    })

  it('gives each of up to sixty circuits a row, closer together when there are many', () => {
    const judged = many(50, 1)
    const words = wordsOf(drawn(singleLine(judged, 'grid')))
    expect(Array.from({ length: 50 }, (_, index) => `X${index}`).filter((id) => !words.includes(id))).toEqual([])
  })

  it('puts circuits of one build into one row when there are more', () => {
    const words = wordsOf(drawn(singleLine(many(90, 1), 'grid')))
    expect(words.some((text) => /^\d+ circuits · B10, 3G1.5, one line · X/.test(text))).toBe(true)
    expect(words).not.toContain('X7')
  })

  it('puts all circuits of a board into one row when there are too many builds', () => {
    const words = wordsOf(drawn(singleLine(many(140, 70), 'grid')))
    expect(words.filter((text) => /^\d+ circuits? · \w+ … \w+$/.test(text)).length).toBeGreaterThanOrEqual(2)
    expect(words.filter((text) => text.includes('3G'))).toEqual([])
  })

  it('draws an installation without meter, arrays and batteries', () => {
    const judged = judgedBase({
      remove: ['meter', 'arrays', 'batteries', 'readings', 'residual_current.RCD0'],
      set: { 'circuits.K7.fed_from': 'MB', 'boards.MB.fed_from': 'supply', 'supply.main_protection': 'C63' },
    })
    expect(wordsOf(drawn(singleLine(judged, 'grid')))).toContain('C63')
  })
})

describe('a reading drawn against its limit', () => {
  const numbers = (svg: string, name: string) => Number(new RegExp(`${name}="([\\d.]+)"`).exec(svg)?.[1])

  it('is a disc where it keeps the limit, and a square where it does not', () => {
    expect(drawn(limitBar({ value: 0.5, most: 1, unit: 'Ω', name: 'loop' }))).toContain('<circle')
    const over = drawn(limitBar({ value: 1.2, most: 1, unit: 'Ω', name: 'loop' }))
    expect(over).not.toContain('<circle')
    expect(over).toContain('<polygon')
  })

  it('says in words what it shows', () => {
    expect(limitBar({ value: 0.55, most: 0.9583333, unit: 'Ω', name: 'loop of K1' })).toContain(
      'aria-label="loop of K1: 0.55 Ω, at most 0.9583 Ω"',
    )
  })

  it('stands at seven tenths of the limit where it is half of it, in each size', () => {
    for (const [size, width] of [
      ['narrow', 48],
      ['usual', 120],
      ['wide', 220],
    ] as const)
      expect(numbers(limitBar({ value: 1, most: 2, unit: 'A', name: 'x', size }), 'cx')).toBeCloseTo(0.35 * width, 1)
  })

  it('tints the water by the margin: deep, middling, shoal, and none beyond the limit', () => {
    const tints = [0.2, 0.7, 0.9, 1.1].map(
      (value) => /<rect[^>]*fill="(#\w+)"/.exec(limitBar({ value, most: 1, unit: '', name: 'x' }))?.[1],
    )
    expect(new Set(tints).size).toBe(4)
    expect(tints[3]).toBeUndefined()
  })

  it('draws the uncertainty from end to end, and to the edge where it is open', () => {
    const bar = (high: number) =>
      drawn(limitBar({ value: 0.5, most: 1, unit: 'Ω', name: 'x', span: { low: 0.4, high } }))
    expect(bar(0.6).match(/<line/g)?.length).toBe(
      (limitBar({ value: 0.5, most: 1, unit: 'Ω', name: 'x' }).match(/<line/g)?.length ?? 0) + 3,
    )
    expect(bar(Number.POSITIVE_INFINITY)).toContain('x2="117"')
  })
})

describe('the budget of the island as a curve', () => {
  it('shows the hours without sun, under a clear sky, and for what must run', () => {
    const budget = islandBudget(sceneOf(judgedExample('alder-mill-bakery')).quantities)
    if (!budget) throw new Error('The bakery has a budget.')
    const svg = drawn(budgetCurve(budget))
    expect(wordsOf(svg)).toEqual(
      expect.arrayContaining([
        'without sun: empty after 7\u00a0h 18\u00a0min',
        'clear sky',
        'what must run, without sun: empty after 9\u00a0h 44\u00a0min',
        '48 h',
      ]),
    )
    expect(svg.match(/<polyline/g)).toHaveLength(3)
    expect(svg.match(/<circle/g)).toHaveLength(2)
  })

  it('leaves out the sun where it cannot be told, and the end where there is none', () => {
    const budget = islandBudget(sceneOf(judgedExample('alder-mill-bakery')).quantities)
    if (!budget) throw new Error('The bakery has a budget.')
    const { withoutSun } = budget
    const svg = drawn(
      budgetCurve({
        ...budget,
        sun: [],
        withSun: undefined,
        mustRun: undefined,
        withoutSun: { ...withoutSun, lasts: undefined },
      }),
    )
    expect(svg.match(/<polyline/g)).toHaveLength(1)
    expect(wordsOf(svg).join()).not.toMatch(/empty|clear sky|must run/)
    expect(svg).toContain('it lasts throughout')
  })
})

describe('strings against the datasheet', () => {
  it('are one row each, voltage and current', () => {
    const judged = judgedBase()
    const svg = drawn(stringPlot(sceneOf(judged), 'A1', 3) ?? '')
    expect(wordsOf(svg)).toEqual(
      expect.arrayContaining(['A1/1', 'A1/2', 'A1/3', 'as the datasheet', '+5 %', '−10 %', 'band ± 5 %']),
    )
  })

  it('show the voltage alone where no current was read', () => {
    const judged = judgedBase({ remove: ['readings.arrays.A1.strings.0.isc'] })
    const all = stringPlot(sceneOf(judgedBase()), 'A1', 3)?.match(/<polygon/g)?.length ?? 0
    expect(stringPlot(sceneOf(judged), 'A1', 3)?.match(/<polygon/g)).toHaveLength(all - 1)
  })

  it('are not drawn where fewer than two were read, or where there are too many', () => {
    expect(stringPlot(sceneOf(judgedBase({ remove: ['readings'] })), 'A1', 3)).toBeUndefined()
    expect(stringPlot(sceneOf(judgedBase()), 'A1', 25)).toBeUndefined()
  })
})
