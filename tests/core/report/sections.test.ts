import { readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { fieldsheetModel } from '#core/report/fieldsheet.ts'
import { reportModel } from '#core/report/model.ts'
import { judgedBase, judgedExample, modelOf, textsOf } from './judged.ts'

const EXAMPLES = readdirSync('examples')
  .filter((file) => file.endsWith('.skerry.yaml'))
  .map((file) => file.replace('.skerry.yaml', ''))
  .filter((name) => name !== 'wrong-in-shape')

/** The base file with everything left out that may be left out. */
const SPARSE = [
  'report.inspected',
  'report.next_due',
  'report.extent',
  'site.customer',
  'site.position',
  'site.premises',
  'supply.loop_impedance',
  'supply.fault_current',
  'supply.separation',
  'earthing',
  'meter',
  'changeover.short_circuit_rating',
  'changeover.interlock',
  'changeover.signals',
  'changeover.cable',
  'changeover.neutral_opens',
  'inverters.INV.island',
  'inverters.INV.residual_monitoring',
  'inverters.INV.separation',
  'inverters.INV.residual_type_needed',
  'inverters.INV.interface_protection',
  'inverters.INV.settings',
  'arrays.A1.string_fuse',
  'arrays.A1.orientation',
  'arrays.A1.module.pmax',
  'circuits.K1.load',
  'instruments',
  'inspection',
  'readings',
  'people',
  'handover',
]

const sparse = () => judgedBase({ remove: SPARSE })

const plain = (part: unknown): string => textsOf(part).join('\n').replaceAll('\u00a0', ' ')

describe('the sections of a report', () => {
  it.each(EXAMPLES)('never print what is undefined, not a number or an object, in %s', (name) => {
    const judged = judgedExample(name)
    for (const model of [modelOf(judged), fieldsheetModel(judged)])
      expect(textsOf(model).filter((text) => /undefined|NaN|\[object|Infinity/.test(text))).toEqual([])
  })

  it('say of a sparse file what is not stated, and print nothing that is not there', () => {
    const judged = sparse()
    for (const model of [modelOf(judged), fieldsheetModel(judged)])
      expect(textsOf(model).filter((text) => /undefined|NaN|\[object|Infinity/.test(text))).toEqual([])
    const words = plain(modelOf(judged))
    for (const part of [
      'not yet inspected',
      'The extent is not stated.',
      'none of its own',
      'forms no island',
      'not read back',
      'none fitted',
      'not known',
    ])
      expect(words.includes(part), part).toBe(true)
    expect(words).not.toContain('Meter and link')
  })

  it('name whoever did the work, with licence and company, and who has still to sign', () => {
    const words = plain(
      modelOf(
        judgedBase({ set: { 'people.tested_by': { name: 'B. Tester', licence: 'FM-1', company: 'Fenn & Co' } } }),
      ),
    )
    expect(words).toMatch(/Tested by\nB\. Tester\nFM-1\nFenn & Co/)
    expect(words).toContain('not yet: this is a draft')
    const anonymous = plain(
      modelOf(judgedBase({ set: { 'people.installed_by': { name: 'C. Fitter' } }, remove: ['people.tested_by'] })),
    )
    expect(anonymous).toMatch(/Installed by\nC\. Fitter\n–\n–/)
  })

  it('leave the signature open in what is issued', () => {
    const judged = judgedBase()
    const words = plain(reportModel(judged, { file: 'a', hash: '00', draft: false }))
    expect(words.includes('this is a draft') || words.includes('not issued')).toBe(false)
    expect(words).toContain('Authorised by')
  })

  it('print the settings beside those of the national book, and the rules that it switches off or adds', () => {
    const words = plain(
      modelOf(judgedBase({ set: { 'report.rulebook': 'de', 'inverters.INV.interface_protection.u_high': '264 V' } })),
    )
    expect(words).toMatch(/Overvoltage\n264 V\n253 V\nfails/)
    expect(words).toContain('iec, then de')
    expect(plain(modelOf(judgedBase()))).toMatch(/Overvoltage\n253 V\nleft to the operator/)
    const southern = plain(modelOf(judgedBase({ set: { 'report.rulebook': 'au' } })))
    expect(southern).toMatch(/neutral-opens-no-sooner-than-the-lines\nau\nThere is no neutral contact to open\./)
  })

  it('tell a single-phase supply and a line of a single-phase inverter', () => {
    expect(plain(modelOf(judgedExample('heron-ford-dwelling')))).toContain('230 V line to neutral, single-phase, 50 Hz')
  })

  it('show the air that a lead-acid battery needs', () => {
    const lead = {
      'batteries.BAT.chemistry': 'lead-acid, vented',
      'batteries.BAT.cells': 24,
      'batteries.BAT.capacity': '200 Ah',
      'batteries.BAT.gas_current': '5 mA/Ah',
    }
    expect(plain(modelOf(judgedBase({ set: lead })))).toMatch(/Air needed\n1\.2 m³\/h/)
  })

  it('hold the resistance of an electrode against what the residual-current device allows', () => {
    const words = plain(modelOf(judgedExample('tern-farm-tt')))
    expect(words).toContain('at most 166.7 Ω by touch voltage and residual current')
  })

  it('show the loop’s limit only where the loop decides', () => {
    expect(plain(modelOf(judgedExample('tern-farm-tt')))).toMatch(/K1\nMilk cooler\nRCDS, K1\n13\.80\n–\n/)
    expect(plain(modelOf(judgedExample('alder-mill-bakery')))).toMatch(/K1\nCold store\novercurrent\n0\.55\n0\.96\n/)
  })

  it('mark a signal that is set to another terminal than it is wired to', () => {
    const words = plain(modelOf(judgedBase({ set: { 'changeover.signals.1.configured': 'DI3' } })))
    expect(words).toMatch(/changeover confirmation\nDI1\nDI3\ndiffer/)
  })

  it('list every inspection item with its result, note and photo', () => {
    const words = plain(modelOf(judgedExample('alder-mill-bakery')))
    expect(words).toMatch(/Fire sealing\ndefect\nverdict-fails\nGland missing at EB top entry\n–/)
    expect(words).toMatch(/Dual-supply notices\ngood\nverdict-meets\n–\nnotice-mb\.jpg/)
  })

  it('print stated uncertainties of an instrument, and the widest permitted where it states none', () => {
    const words = plain(modelOf(judgedBase({ set: { 'instruments.T1.uncertainty': { loop: '8 %' } } })))
    expect(words).toContain('loop ±8 %')
    expect(words).toMatch(/insulation\n±30 %\nIEC 61557-2:2019, 6\.2/)
  })

  it('tell why a state, a string, a transfer, a load step or a device was not tested', () => {
    const skipped = (reason: string) => ({ not_tested: reason })
    const judged = judgedBase({
      set: {
        'readings.residual_current.RCD1.island': skipped('no test socket'),
        'readings.residual_current.RCD0': skipped('sealed'),
        'readings.arrays.A1.strings.1': skipped('dusk'),
        'readings.transfers.0': { to: 'island', not_tested: 'bakery at work' },
        'readings.load_steps.0': { step: 'oven', not_tested: 'oven was hot' },
        'readings.states.island': skipped('no outage allowed'),
      },
    })
    const words = plain(modelOf(judged))
    for (const reason of ['no test socket', 'sealed', 'dusk', 'bakery at work', 'oven was hot'])
      expect(words.includes(reason), reason).toBe(true)
  })

  it('tell a load step that tripped the island', () => {
    expect(plain(modelOf(judgedBase({ set: { 'readings.load_steps.0.tripped': true } })))).toContain('tripped')
  })
})
