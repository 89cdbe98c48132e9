import { describe, expect, it } from 'vitest'
import { fieldsheetModel } from '#core/report/fieldsheet.ts'
import { anchorsOf, judgedBase, judgedExample, modelOf, textsOf } from './judged.ts'

interface Point {
  readonly anchor: string
  readonly text: string | undefined
  readonly note: string | undefined
  readonly box: boolean
}

/** Every cell of a sheet that is a test point. */
function pointsOf(part: unknown): Point[] {
  if (Array.isArray(part)) return part.flatMap(pointsOf)
  if (typeof part !== 'object' || part === null) return []
  const { anchor, cells, rows, text, note, svg } = part as Record<string, unknown>
  const isPoint =
    typeof anchor === 'string' &&
    anchor.startsWith('point/') &&
    cells === undefined &&
    rows === undefined &&
    !('groups' in part)
  const own = isPoint
    ? [{ anchor, text: text as string | undefined, note: note as string | undefined, box: svg !== undefined }]
    : []
  return [...own, ...Object.values(part).flatMap(pointsOf)]
}

const sheetOf = (judged: ReturnType<typeof judgedBase>) =>
  new Map(pointsOf(fieldsheetModel(judged)).map((point) => [point.anchor, point]))

describe('the field sheet', () => {
  it('has a box for each test point that is not read, and the reading where it is', () => {
    for (const judged of [judgedExample('reed-hall-design'), judgedExample('alder-mill-bakery'), judgedBase()]) {
      const points = [...sheetOf(judged).values()]
      expect(points.length).toBeGreaterThan(20)
      expect(points.filter(({ box, text }) => box === (text !== undefined && text !== ''))).toEqual([])
    }
  })

  it('asks of every circuit for continuity, insulation, polarity and loops in the states in which it lives', () => {
    const judged = judgedExample('reed-hall-design')
    const sheet = sheetOf(judged)
    const ids = Object.keys(judged.install.circuits ?? {})
    expect(ids.length).toBe(4)
    for (const id of ids)
      for (const name of ['continuity', 'insulation', 'polarity', 'loop/grid'])
        expect(sheet.get(`point/circuit/${id}/${name}`)?.box).toBe(true)
    expect(sheet.has('point/circuit/K1/loop/island')).toBe(true)
    expect(sheet.has('point/circuit/G1/loop/island')).toBe(false)
  })

  it('goes from dead to the grid, the island, and the transfers', () => {
    const { sections } = fieldsheetModel(judgedExample('reed-hall-design'))
    expect(sections.map(({ anchor }) => anchor)).toEqual([
      'sheet/before',
      'sheet/looks',
      'sheet/dead',
      'sheet/strings',
      'sheet/grid',
      'sheet/settings',
      'sheet/island',
      'sheet/transfers',
    ])
  })

  it('prints the limits that the readings will be held against', () => {
    const sheet = sheetOf(judgedExample('reed-hall-design'))
    expect(sheet.get('point/circuit/K1/insulation')?.note).toBe('≥ 1 at 500\u00a0V')
    expect(sheet.get('point/residual/RCD1/rated/island')?.note).toBe('≤ 300')
    expect(textsOf(fieldsheetModel(judgedExample('reed-hall-design')))).toContain('195.5 to 253.0')
  })

  it('asks a time-delayed device for its time at twice the residual current, with the time that it has to wait', () => {
    const sheet = sheetOf(judgedBase({ remove: ['readings.residual_current'] }))
    expect(sheet.get('point/residual/RCD0/rated/grid')?.note).toBe('130 to 500')
    expect(sheet.get('point/residual/RCD0/double/grid')).toMatchObject({ note: '60 to 200', box: true })
    expect(sheet.get('point/residual/RCD0/five_times/grid')?.note).toBe('50 to 150')
    expect(sheet.has('point/residual/RCD1/double/grid')).toBe(false)
    expect(sheet.has('point/residual/RCD1/double/island')).toBe(false)
  })

  it('keeps a reading at twice the residual current that was taken of a general device', () => {
    const sheet = sheetOf(judgedBase())
    expect(sheet.get('point/residual/RCD1/double/island')).toMatchObject({ note: '≤ 150', box: false })
  })

  it('asks for what the rule book wants looked at, and for nothing of another country', () => {
    const item = 'point/inspection/emergency services sign'
    expect(sheetOf(judgedBase({ set: { 'report.rulebook': 'au' } })).get(item)?.box).toBe(true)
    expect(sheetOf(judgedBase()).has(item)).toBe(false)
    expect(sheetOf(judgedBase()).has('point/inspection/terminals tight')).toBe(true)
  })

  it('puts the cautions first', () => {
    const [first] = fieldsheetModel(judgedExample('reed-hall-design')).sections
    expect(first?.blocks[0]).toMatchObject({ kind: 'notice', box: 'box-caution' })
  })

  it('asks for signals, settings and the meter’s direction, and takes what is known', () => {
    const sheet = sheetOf(judgedExample('reed-hall-design'))
    expect(sheet.get('point/changeover/CO/signal/changeover command')?.box).toBe(true)
    expect(sheet.get('point/changeover/CO/neutral-opens')?.text).toBe('last')
    expect(sheet.get('point/meter/M1/direction')?.box).toBe(true)
    expect(sheet.get('point/inverter/INV/held_back_charge')?.box).toBe(true)
    const known = sheetOf(judgedExample('tern-farm-tt'))
    expect(known.get('point/meter/M1/direction')?.text).toBe('checked')
    expect(known.get('point/inverter/INV/held_back_charge')?.text).toBe('read back')
  })

  it('asks no sequence of a changeover that leaves the neutral closed, and keeps signals of one name apart', () => {
    const lines = sheetOf(judgedExample('osier-lane-three-pole'))
    expect(lines.has('point/changeover/CO/neutral-opens')).toBe(false)
    const twice = judgedBase({
      set: {
        'changeover.signals': [
          { role: 'changeover command', terminal: 'DO1', configured: 'DO1' },
          { role: 'changeover command', terminal: 'DO2', configured: 'DO2' },
        ],
      },
    })
    expect([...sheetOf(twice).keys()].filter((anchor) => anchor.includes('/signal/'))).toEqual([
      'point/changeover/CO/signal/changeover command',
      'point/changeover/CO/signal/changeover command/2',
    ])
    const anchors = anchorsOf(modelOf(twice))
    expect(new Set(anchors).size).toBe(anchors.length)
  })

  it('holds a loop to the overcurrent device where that is a yardstick, and not where something else cuts off', () => {
    const loop = (text: string, state: string) =>
      fieldsheetModel(judgedExample(text))
        .sections.find(({ anchor }) => anchor === `sheet/${state}`)
        ?.blocks.flatMap((block) => (block.kind === 'table' ? block.groups.flatMap(({ rows }) => rows) : []))
        .find(({ anchor }) => anchor === `point/circuit/K1/${state}`)?.cells[2]?.text
    expect(loop('reed-hall-design', 'grid')).toBe('≤ 3.07')
    expect(loop('reed-hall-design', 'island')).toBe('–')
    expect(loop('tern-farm-tt', 'grid')).toBe('–')
  })

  it('tells where a reading is left out on purpose', () => {
    const skipped = () => ({ not_tested: 'no access' })
    const judged = judgedBase({
      remove: ['readings.load_steps', 'readings.transfers'],
      set: {
        'readings.circuits.K1': skipped(),
        'readings.residual_current.RCD1.island': skipped(),
        'readings.residual_current.RCD0': skipped(),
        'readings.arrays.A1.strings': [skipped(), skipped(), skipped()],
        'readings.states.island': skipped(),
        'readings.transfers': [
          { to: 'island', not_tested: 'no access' },
          { to: 'grid', not_tested: 'no access' },
        ],
        'readings.load_steps': [{ step: 'pump started', not_tested: 'no access' }],
      },
    })
    const sheet = sheetOf(judged)
    for (const anchor of [
      'point/circuit/K1/continuity',
      'point/circuit/K1/loop/grid',
      'point/residual/RCD1/half/island',
      'point/residual/RCD0/half/grid',
      'point/string/A1/2/voc',
      'point/state/frequency/island',
      'point/transfer/island/dark',
      'point/transfer/grid/gap',
      'point/load-step/1/voltage',
    ])
      expect(sheet.get(anchor), anchor).toMatchObject({ text: 'not tested', note: 'no access', box: false })
    expect(sheet.get('point/circuit/K1/polarity')?.text).toBe('no access')
    expect(sheet.get('point/state/rotation/island')?.text).toBe('no access')
  })

  it('asks for the start of each load that draws more at its start, else for the largest load', () => {
    const starting = judgedBase({ remove: ['readings'], set: { 'circuits.K1.load.start': '3x' } })
    expect(textsOf(fieldsheetModel(starting)).join('\n')).toContain('started: lowest voltage')
    const loads = Object.keys(starting.install.circuits ?? {}).filter(
      (id) => starting.install.circuits?.[id]?.load?.start !== undefined,
    )
    const steady = judgedBase({ remove: ['readings', ...loads.map((id) => `circuits.${id}.load`)] })
    expect(textsOf(fieldsheetModel(steady))).toContain('Largest load started: lowest voltage')
  })

  it('says to write down what has no limit yet', () => {
    const bare = judgedBase({
      remove: [
        'readings',
        'inspection',
        'instruments',
        'people',
        'report.inspected',
        'earthing',
        'meter.link',
        'residual_current',
        'circuits.K1.cable.length',
        'inverters.INV.interface_protection',
        'inverters.INV.settings',
      ],
      set: { 'boards.MB.fed_from': 'supply', 'boards.EB.fed_from': 'CO', 'circuits.K7.fed_from': 'MB' },
    })
    const sheet = sheetOf(bare)
    expect(sheet.get('point/circuit/K1/continuity')?.note).toBe('write it down')
    expect(sheet.get('point/head/date')?.box).toBe(true)
    expect(textsOf(fieldsheetModel(bare)).join('\n')).toMatch(/INV, charge held back\nwrite it down/)
    expect([...sheet.keys()]).not.toContain('point/inverter/INV/u_high')
    expect(
      [...sheet.keys()].filter((anchor) => anchor.startsWith('point/residual') || anchor.startsWith('point/earthing')),
    ).toEqual([])
  })

  it('asks for three poles less on a single-phase supply, and for no rotation', () => {
    const anchors = anchorsOf(fieldsheetModel(judgedExample('heron-ford-dwelling')))
    expect(anchors).toContain('point/transfer/island/terminal/N')
    expect(anchors).not.toContain('point/transfer/island/terminal/L2')
    expect(anchors).not.toContain('point/state/rotation/grid')
  })
})
