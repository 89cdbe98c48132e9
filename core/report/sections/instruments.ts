import type { Instrument, UncertaintyKind } from '#core/install/record.ts'
import { uncertaintyOf } from '#core/quantities/uncertainty.ts'
import { type Section, table } from '../blocks.ts'
import { amount, dateText } from '../print.ts'
import type { ReportScene } from '../scene.ts'

const KINDS = [
  'continuity',
  'insulation',
  'loop',
  'electrode',
  'residual_time',
  'residual_current',
  'voltage',
  'frequency',
  'current',
  'irradiance',
  'time',
  'array_voltage',
  'array_current',
] as const satisfies readonly UncertaintyKind[]

function statedText({ uncertainty = {} }: Instrument): string {
  const stated = Object.entries(uncertainty).map(
    ([kind, percent]) => `${kind.replaceAll('_', ' ')} ±${amount(percent, '%')}`,
  )
  return stated.length === 0 ? 'none stated' : stated.join(', ')
}

/** What the readings were taken with, and how far each kind of reading can be off. */
export function instruments({ install, verdicts }: ReportScene): Section {
  const entries = Object.entries(install.instruments ?? {})
  const rows = entries.map(([id, instrument]) => ({
    anchor: `instrument/${id}`,
    ...(verdicts.fails(id, {}) && { look: 'row-fails' as const }),
    head: { text: id },
    cells: [
      { text: instrument.kind, note: `serial ${instrument.serial}` },
      { text: dateText(instrument.calibrated) },
      { text: dateText(instrument.due) },
      { text: statedText(instrument) },
      verdicts.cell(id, {}, `instrument/${id}/verdict`),
    ],
  }))
  const kinds = KINDS.flatMap((kind) => {
    const { percent, source } = uncertaintyOf(kind)
    if (percent === 0) return []
    return [
      {
        anchor: `uncertainty/${kind}`,
        head: { text: kind.replaceAll('_', ' ') },
        cells: [{ text: `±${amount(percent, '%')}` }, { text: source }],
      },
    ]
  })
  const columns = [
    { label: 'Instrument', width: 11 },
    { label: 'Kind', width: 28 },
    { label: 'Calibrated', width: 17 },
    { label: 'Due', width: 17 },
    { label: 'Uncertainty', width: 14 },
    { label: 'Verdict', width: 13 },
  ]
  const widest = table(
    'instruments/uncertainty',
    [
      { label: 'Kind of reading', width: 30 },
      { label: 'Of the reading', width: 20, align: 'num' },
      { label: 'Source', width: 50 },
    ],
    [{ rows: kinds }],
    'Where the instrument states none: the widest uncertainty that the standard permits, and nothing for other kinds',
  )
  return {
    anchor: 'instruments',
    title: 'Instruments and uncertainty',
    blocks: rows.length === 0 ? [] : [table('instruments/list', columns, [{ rows }]), widest],
  }
}
