import type { Sheet, State } from '#core/glossary.ts'
import { cableName, deviceName } from '../diagram/captions.ts'
import { type Badge, type Block, badge, type Cell, type Column, type Row, type Section } from '../model.ts'
import { bar } from '../plots/bar.ts'
import { bare, numberOn, printed, type ReportScene, sheetsOf, worstOf } from '../scene.ts'

const text = (title: string, width?: string): Column => ({ title, look: '', ...(width !== undefined && { width }) })
const number = (title: string, width?: string): Column => ({
  title,
  look: 'num',
  ...(width !== undefined && { width }),
})
const figure = (value: string): Cell => ({ text: value, look: 'num' })

const look = (verdict: ReturnType<typeof worstOf>): Row['look'] => (verdict.startsWith('fails') ? 'row-fails' : '')
const mark = (verdict: ReturnType<typeof worstOf>): Badge => badge(verdict)

function schedule(scene: ReportScene): Block {
  const { circuits = {} } = scene.judged.install
  const rows = sheetsOf(scene, 'circuit').flatMap((sheet): Row[] => {
    const circuit = circuits[sheet.id]
    if (!circuit) return []
    const cells: Cell[] = [
      { text: circuit.serves },
      { text: sheet.values['backed_up'] === true ? 'island' : 'grid only' },
      { text: circuit.phases.join(' ') },
      { text: deviceName(circuit.device) },
      { text: cableName(circuit.cable) },
      figure(bare(sheet, 'design_current')),
      figure(bare(sheet, 'device_rated')),
      figure(bare(sheet, 'capacity')),
      figure(bare(sheet, 'voltage_drop_total_percent')),
    ]
    return [{ anchor: `circuit/${sheet.id}`, head: sheet.id, cells, look: '' }]
  })
  return {
    anchor: 'circuits/schedule',
    table: {
      caption: 'Circuits as designed',
      columns: [
        text('Circuit', '8%'),
        text('Serves', '19%'),
        text('Lives on', '10%'),
        text('Lines', '9%'),
        text('Device', '8%'),
        text('Cable', '15%'),
        number('Ib, A', '8%'),
        number('In, A', '7%'),
        number('Iz, A', '8%'),
        number('Drop, %', '8%'),
      ],
      rows,
    },
  }
}

function loopBar(sheet: Sheet, state: State): Cell {
  const [value, limit] = [numberOn(sheet, 'loop', state), numberOn(sheet, 'loop_limit_measured')]
  if (value === undefined || limit === undefined) return { text: '–' }
  const span = sheet.spansInState[state]['loop']
  return {
    svg: bar({
      value,
      limit,
      side: 'most',
      label: `${value} Ω read, at most ${limit.toFixed(3)} Ω`,
      ...(span && { span }),
    }),
  }
}

function insulationText(sheet: Sheet): string {
  const reading = bare(sheet, 'insulation')
  const bound = sheet.spans['insulation']?.high === Number.POSITIVE_INFINITY ? '>' : ''
  return reading === '–' ? reading : `${bound}${reading}`
}

function deadAndLive(scene: ReportScene): Block {
  const rows = sheetsOf(scene, 'circuit').map((sheet): Row => {
    const verdict = worstOf(scene, sheet.id)
    const cells: Cell[] = [
      figure(bare(sheet, 'continuity')),
      figure(bare(sheet, 'continuity_expected')),
      figure(insulationText(sheet)),
      { text: printed(sheet, 'polarity') },
      figure(bare(sheet, 'loop', 'grid')),
      figure(bare(sheet, 'loop_limit_measured')),
      loopBar(sheet, 'grid'),
      { badge: mark(verdict) },
    ]
    return { anchor: `circuit/${sheet.id}/tests`, head: sheet.id, cells, look: look(verdict) }
  })
  return {
    anchor: 'circuits/tests',
    table: {
      caption: 'Circuits as tested: dead, and on the grid',
      columns: [
        text('Circuit', '8%'),
        number('R1 + R2, Ω', '10%'),
        number('expected', '10%'),
        number('Insulation, MΩ', '12%'),
        text('Polarity', '10%'),
        number('Loop, Ω', '9%'),
        number('at most', '9%'),
        text('against its limit', '15%'),
        text('Verdict', '17%'),
      ],
      rows,
    },
  }
}

function inBothStates(scene: ReportScene): Block {
  const rows = sheetsOf(scene, 'circuit').map((sheet): Row => {
    const backedUp = sheet.values['backed_up'] === true
    const cells: Cell[] = [
      { text: printed(sheet, 'grid_disconnection') },
      figure(bare(sheet, 'fault_current_grid')),
      { text: backedUp ? printed(sheet, 'island_disconnection') : 'dead in the island' },
      figure(backedUp ? bare(sheet, 'fault_current_island') : '–'),
      figure(backedUp ? bare(sheet, 'loop', 'island') : '–'),
      figure(bare(sheet, 'operating_current')),
      figure(bare(sheet, 'disconnection_time')),
    ]
    return { anchor: `circuit/${sheet.id}/disconnection`, head: sheet.id, cells, look: '' }
  })
  return {
    anchor: 'circuits/disconnection',
    table: {
      caption: 'What cuts off a fault, in both states',
      columns: [
        text('Circuit', '9%'),
        text('On the grid by', '19%'),
        number('If, A', '10%'),
        text('In the island by', '20%'),
        number('If, A', '9%'),
        number('Loop, Ω', '11%'),
        number('Ia, A', '10%'),
        number('within, s', '12%'),
      ],
      rows,
    },
  }
}

/** Circuits: design, dead tests, and what clears a fault in both states. */
export function circuits(scene: ReportScene): Section {
  return {
    anchor: 'circuits',
    title: 'Circuits',
    newPage: true,
    blocks: [schedule(scene), deadAndLive(scene), inBothStates(scene)],
  }
}

function residualRow(scene: ReportScene, sheet: Sheet, state: State): Row {
  const verdict = worstOf(scene, sheet.id, state)
  const values = sheet.inState[state]
  const half = values['half_tripped']
  const cells: Cell[] = [
    { text: state === 'grid' ? 'grid' : 'island' },
    {
      text: `${String(sheet.values['type'])} ${String(sheet.values['residual'])} mA${sheet.values['delayed'] === true ? ' S' : ''}`,
    },
    { text: half === undefined ? '–' : half === true ? 'tripped' : 'no trip' },
    figure(bare(sheet, 'rated', state)),
    figure(bare(sheet, 'time_limit_rated')),
    figure(bare(sheet, 'double', state)),
    figure(bare(sheet, 'five_times', state)),
    figure(bare(sheet, 'time_limit_five_times')),
    figure(bare(sheet, 'ramp', state)),
    { badge: mark(verdict) },
  ]
  return {
    anchor: `residual-current/${sheet.id}/${state}`,
    head: sheet.id,
    cells,
    look: look(verdict) === 'row-fails' ? 'row-fails' : state === 'island' ? 'row-island' : '',
  }
}

/** Residual-current devices, each in the states in which it is live. */
export function residualCurrent(scene: ReportScene): Section | undefined {
  const rows = sheetsOf(scene, 'residual-current device').flatMap((sheet) =>
    (['grid', 'island'] as const)
      .filter((state) => sheet.inState[state]['live'] === true)
      .map((state) => residualRow(scene, sheet, state)),
  )
  if (rows.length === 0) return undefined
  return {
    anchor: 'residual-current',
    title: 'Residual-current protection',
    blocks: [
      {
        anchor: 'residual-current/words',
        paragraph:
          'Each device is tested in each state in which it is live. A reading on the grid never stands in for the island.',
      },
      {
        anchor: 'residual-current/tests',
        table: {
          caption:
            'Trip times in ms at half, once, twice and five times the rated residual current, and trip current in mA',
          columns: [
            text('Device', '9%'),
            text('State', '8%'),
            text('Type', '11%'),
            text('½', '8%'),
            number('1×', '7%'),
            number('at most', '9%'),
            number('2×', '7%'),
            number('5×', '7%'),
            number('at most', '9%'),
            number('Ramp', '8%'),
            text('Verdict', '17%'),
          ],
          rows,
        },
      },
    ],
  }
}

/** Arrays and their strings. */
export function arrays(scene: ReportScene): Section | undefined {
  const strings = sheetsOf(scene, 'string')
  if (strings.length === 0) return undefined
  const rows = strings.map((sheet): Row => {
    const verdict = worstOf(scene, sheet.id)
    const cells: Cell[] = [
      figure(bare(sheet, 'voc')),
      figure(bare(sheet, 'voc_expected')),
      figure(bare(sheet, 'isc')),
      figure(bare(sheet, 'isc_expected')),
      figure(bare(sheet, 'irradiance')),
      figure(bare(sheet, 'cell_temperature')),
      figure(insulationText(sheet)),
      figure(bare(sheet, 'insulation_tested_at')),
      { badge: mark(verdict) },
    ]
    return { anchor: `string/${sheet.id}`, head: sheet.id, cells, look: look(verdict) }
  })
  const design = sheetsOf(scene, 'array').map(
    (sheet): Row => ({
      anchor: `array/${sheet.id}`,
      head: sheet.id,
      cells: [
        { text: `${printed(sheet, 'strings')} × ${printed(sheet, 'modules_in_series')} modules` },
        figure(bare(sheet, 'power_stc')),
        figure(bare(sheet, 'voc_maximum')),
        figure(bare(sheet, 'max_input_voltage')),
        figure(bare(sheet, 'vmp_minimum')),
        figure(bare(sheet, 'current_maximum')),
        { text: sheet.values['fuse_needed'] === true ? printed(sheet, 'string_fuse') : 'not needed' },
      ],
      look: '',
    }),
  )
  return {
    anchor: 'arrays',
    title: 'Arrays',
    blocks: [
      {
        anchor: 'arrays/design',
        table: {
          caption: 'Arrays as designed',
          columns: [
            text('Array', '9%'),
            text('Strings', '18%'),
            number('Power, W', '11%'),
            number('Voc coldest, V', '13%'),
            number('inverter takes, V', '14%'),
            number('Vmp hottest, V', '13%'),
            number('I, A', '8%'),
            text('String fuse', '12%'),
          ],
          rows: design,
        },
      },
      {
        anchor: 'arrays/tests',
        table: {
          caption: 'Strings as tested',
          columns: [
            text('String', '10%'),
            number('Voc, V', '9%'),
            number('expected', '10%'),
            number('Isc, A', '9%'),
            number('expected', '10%'),
            number('W/m²', '8%'),
            number('°C', '7%'),
            number('MΩ', '9%'),
            number('at V', '8%'),
            text('Verdict', '17%'),
          ],
          rows,
        },
      },
    ],
  }
}
