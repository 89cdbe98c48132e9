import type { Install } from '#core/install.ts'
import { type Block, type Entry, type Section, table } from '../blocks.ts'
import { deviceText } from '../devices.ts'
import { verdictEntry } from '../entries.ts'
import { distinct } from '../names.ts'
import { amount, amountOr, printed, readingWithUnit } from '../print.ts'
import type { ReportScene } from '../scene.ts'

const SYSTEMS: Readonly<Record<Install['supply']['earthing'], string>> = {
  'TN-S': 'neutral and protective conductor apart from the source on',
  'TN-C-S': 'combined up to the origin, apart from there on',
  TT: 'earthed by the installation’s own electrode',
}

function supplyEntries(scene: ReportScene): Entry[] {
  const { supply } = scene.install
  const { nominal } = supply
  const voltage = `${amount(nominal.voltage, 'V')} line to neutral, ${nominal.phases === 3 ? 'three-phase' : 'single-phase'}`
  return [
    { anchor: 'supply/earthing', term: 'Earthing system', detail: supply.earthing, note: SYSTEMS[supply.earthing] },
    { anchor: 'supply/nominal', term: 'Nominal', detail: `${voltage}, ${amount(nominal.frequency, 'Hz')}` },
    { anchor: 'supply/main-protection', term: 'Main protection', detail: deviceText(supply.main_protection) },
    ...(supply.rated_current === undefined
      ? []
      : [{ anchor: 'supply/rated', term: 'Rated current', detail: `${amount(supply.rated_current, 'A')} a line` }]),
    { anchor: 'supply/loop', term: 'External loop Z_e', detail: readingWithUnit(supply.loop_impedance, 'Ω', 2) },
    {
      anchor: 'supply/fault-current',
      term: 'Fault current I_pf',
      detail:
        supply.fault_current && 'value' in supply.fault_current
          ? amount(supply.fault_current.value, 'A')
          : readingWithUnit(supply.fault_current, 'A', 0),
      note: 'prospective, the larger of line–neutral and line–earth',
    },
    {
      anchor: 'supply/separation',
      term: 'Operator wants opened',
      detail: supply.separation?.required ?? 'not stated',
      note: supply.separation?.stated_in ?? 'without a source',
    },
    verdictEntry('supply/verdict', scene.verdicts.of('supply')),
  ]
}

function earthingEntries(scene: ReportScene): Entry[] {
  const { electrode, earthing_conductor, lightning_protection } = scene.install.earthing ?? {}
  const limit = scene.number('earthing', 'electrode_limit')
  return [
    {
      anchor: 'earthing/electrode',
      term: 'Electrode',
      detail: electrode ? `${electrode.kind}, ${readingWithUnit(electrode.resistance, 'Ω', 1)}` : 'none of its own',
      ...(limit !== undefined && { note: `at most ${amount(limit, 'Ω')} by touch voltage and residual current` }),
    },
    {
      anchor: 'earthing/conductor',
      term: 'Earthing conductor',
      detail: amountOr(earthing_conductor, 'mm²', 'not stated'),
      note: `at least ${printed(scene.value('earthing', 'earthing_conductor_minimum'), 'mm²')}`,
    },
    {
      anchor: 'earthing/bonding-minimum',
      term: 'Main bonding',
      detail: `at least ${printed(scene.value('earthing', 'bonding_minimum'), 'mm²')}`,
    },
    {
      anchor: 'earthing/lightning',
      term: 'Lightning protection',
      detail: lightning_protection ? 'fitted' : 'none stated',
    },
    {
      anchor: 'earthing/links',
      term: 'Neutral–earth links',
      detail: `${scene.topology.neutralEarthLinks.grid.join(', ')} on the grid; ${scene.topology.neutralEarthLinks.island.join(', ') || 'none'} in the island`,
    },
    verdictEntry('earthing/verdict', scene.verdicts.of('earthing')),
  ]
}

/** The origin: what comes in, and what it is earthed to. */
export function supply(scene: ReportScene): Section {
  const bonding = scene.install.earthing?.bonding ?? []
  const names = distinct(bonding.map(({ to }) => to))
  const rows = bonding.map(({ to, size, continuity }, index) => ({
    anchor: `bonding/${names[index]}`,
    head: { text: to },
    cells: [
      { text: amount(size, 'mm²') },
      { text: readingWithUnit(continuity, 'Ω', 2), anchor: `bonding/${names[index]}/continuity` },
    ],
  }))
  const blocks: Block[] = [
    {
      kind: 'particulars',
      anchor: 'supply/particulars',
      beside: true,
      lists: [
        { title: 'Supply', entries: supplyEntries(scene) },
        { title: 'Earthing', entries: earthingEntries(scene) },
      ],
    },
  ]
  const columns = [
    { label: 'Bonded to', width: 50 },
    { label: 'Conductor', width: 25, align: 'num' as const },
    { label: 'Continuity', width: 25, align: 'num' as const },
  ]
  if (rows.length > 0) blocks.push(table('earthing/bonding', columns, [{ rows }], 'Main bonding'))
  return { anchor: 'supply', title: 'Supply and earthing', blocks }
}
