import { describe, expect, it } from 'vitest'
import { fieldsheetModel } from '#core/report/fieldsheet.ts'
import { findings } from '#core/report/sections/findings.ts'
import { rules } from '#core/report/sections/rules.ts'
import { standingOf } from '#core/report/standing.ts'
import { judgedBase, modelOf, sceneOf, textsOf } from './judged.ts'

const plain = (part: unknown): string => textsOf(part).join('\n').replaceAll('\u00a0', ' ')
const report = (changes: Parameters<typeof judgedBase>[0]): string => plain(modelOf(judgedBase(changes)))

/** The row of an anchor, wherever it stands. */
function rowOf(part: unknown, anchor: string): Record<string, unknown> | undefined {
  if (Array.isArray(part)) return part.map((one) => rowOf(one, anchor)).find((found) => found)
  if (typeof part !== 'object' || part === null) return undefined
  if ('anchor' in part && part.anchor === anchor && 'cells' in part) return { ...part }
  return Object.values(part)
    .map((one) => rowOf(one, anchor))
    .find((found) => found)
}

describe('rows that fail', () => {
  it.each([
    [
      'an overcurrent device that cannot break the fault current',
      'overcurrent/F35',
      { 'overcurrent.F35.breaking': '1 kA' },
    ],
    [
      'a residual-current device below the load that it carries',
      'residual/RCD1',
      { 'residual_current.RCD1.rated_current': '6 A' },
    ],
    [
      'a residual-current device that trips too late in the island',
      'residual/RCD1/island',
      { 'readings.residual_current.RCD1.island.rated': '400 ms' },
    ],
  ])('%s', (_, anchor, set) => {
    expect(rowOf(modelOf(judgedBase({ set })), anchor)).toMatchObject({ look: 'row-fails' })
    expect(rowOf(modelOf(judgedBase()), anchor)).not.toHaveProperty('look')
  })
})

it('a state fails in its row once a book makes of a caution about it a failure', () => {
  const judged = judgedBase({ set: { 'readings.states.island.frequency': '55 Hz' } })
  const binding = { ...judged, findings: judged.findings.map((one) => ({ ...one, severity: 'failure' as const })) }
  expect(rowOf(modelOf(binding), 'state/frequency')).toMatchObject({ look: 'row-fails' })
  expect(rowOf(modelOf(judged), 'state/frequency')).not.toHaveProperty('look')
})

describe('particulars that are not stated', () => {
  it('leave the instrument of a string unnamed', () => {
    expect(report({ remove: ['readings.with', 'readings.arrays.A1.with'] })).toContain(
      'Strings of A1, read with an instrument that is not named',
    )
  })

  it('leave a handover with nobody to whom it was explained, on no day, with no documents', () => {
    expect(report({ set: { handover: {} } })).toMatch(
      /Explained to\nnot stated\nOn\nnot stated\nDocuments\nnone stated/,
    )
  })

  it('leave the meter without a link and without a neutral of its own', () => {
    const words = report({ remove: ['meter.link', 'meter.neutral_reference'] })
    expect(words).toMatch(/Measuring neutral\nnot stated/)
    expect(words).not.toContain('Across the pair')
  })

  it('leave a peak without a time, and a single-phase inverter without a line', () => {
    const words = report({
      remove: ['inverters.INV.island.peak_time'],
      set: { 'inverters.INV.phases': 1, 'inverters.INV.line': 'L2' },
    })
    expect(words).toContain('peak 15 kVA\n')
    expect(words).toContain('single-phase on L2')
    expect(report({ set: { 'inverters.INV.phases': 1 } })).toMatch(/single-phase\n/)
  })

  it('leave a residual-current device that protects nothing yet', () => {
    const words = report({
      set: { 'residual_current.RCD9': { fed_from: 'MB', type: 'A', rated_current: '25 A', residual: '30 mA' } },
    })
    expect(words).toMatch(/RCD9\n.*\n.*\n.*\n.*\n.*\nnone/)
  })

  it('leave the hours of what must run unknown where nothing must', () => {
    const words = report({ remove: ['circuits.K1.load.must_run'] })
    expect(words).not.toContain('for what must run')
    expect(report({})).toContain('for what must run')
  })
})

describe('a battery on the grid side', () => {
  it('gives nothing to the island, neither power nor hours', () => {
    const set = {
      'inverters.INV2': { fed_from: 'MB', phases: 3, rated_power: '5 kVA' },
      'batteries.BAT2': {
        into: 'INV2',
        chemistry: 'lithium iron phosphate',
        usable: '5 kWh',
        max_discharge: '3 kW',
        efficiency: '95 %',
        place: 'cellar',
      },
    }
    const tile = (words: string) => /from .* held back, giving .* at most/.exec(words)?.[0]
    expect(tile(report({ set }))).toMatch(/giving 5\.1 kW at most/)
  })
})

describe('particulars that are stated', () => {
  it('place a site south of the equator and west of Greenwich, at no stated height', () => {
    expect(report({ set: { 'site.position': { latitude: -12.5, longitude: -71.25 } } })).toContain('12.5° S, 71.25° W')
    expect(report({})).toContain('47.31° N, 9.64° E, 420 m above sea level')
  })

  it('name the rated current of the supply', () => {
    expect(report({ set: { 'supply.rated_current': '63 A' } })).toMatch(/Rated current\n63 A a line/)
  })

  it('name lightning protection', () => {
    expect(report({ set: { 'earthing.lightning_protection': true } })).toMatch(/Lightning protection\nfitted/)
  })

  it('name the cable to an overcurrent device, and what the device itself says that it breaks', () => {
    const words = report({
      remove: ['overcurrent.F35.breaking'],
      set: {
        'overcurrent.F35.device': { breaker: 'C35', breaking: '6 kA' },
        'overcurrent.F35.cable': { type: '5G16', insulation: 'xlpe', method: 'B2', length: '4 m' },
      },
    })
    expect(words).toMatch(/F35\nC35\nMB\n6 kA\n/)
    expect(words).toContain('5G16')
  })

  it('say nothing of the grid only where every circuit lives on', () => {
    const words = report({ set: { 'circuits.K7.fed_from': 'EB' } })
    expect(words).toMatch(/What lives on\n4 of 4\n/)
    expect(words).not.toContain('On the grid only')
  })
})

describe('the findings of a report', () => {
  it('say that every rule is met where nothing is left to tell', () => {
    const scene = sceneOf(judgedBase())
    const none = {
      ...standingOf(scene.judged),
      failing: [],
      departing: [],
      notShown: [],
      limited: [],
      insideUncertainty: [],
      cautions: [],
      notes: [],
    }
    expect(plain(findings(scene, none))).toContain('Every rule that applies is met.')
  })

  it('list no idle rules where every rule of the book applies', () => {
    const scene = sceneOf(judgedBase())
    const { book } = scene.judged
    const applying = book.rules.filter(({ id }) => id === 'insulation-is-high-enough')
    expect(applying.length).toBe(1)
    const words = plain(rules({ ...scene, judged: { ...scene.judged, book: { ...book, rules: applying } } }))
    expect(words).not.toContain('Rules that do not apply')
    expect(plain(rules(scene))).toContain('Rules that do not apply')
  })
})

describe('a field sheet without limits', () => {
  it('has the electrode and the link written down where nothing says what to expect', () => {
    const sheet = plain(
      fieldsheetModel(
        judgedBase({
          remove: ['readings', 'residual_current', 'meter.link.terminated_at'],
          set: { 'boards.MB.fed_from': 'supply', 'boards.EB.fed_from': 'CO', 'circuits.K7.fed_from': 'MB' },
        }),
      ),
    )
    expect(sheet).toMatch(/Electrode, foundation\nwrite it down/)
    expect(sheet).toMatch(/Across the pair, power off\nwrite it down/)
  })
})
