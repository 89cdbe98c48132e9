import type { Measured } from '#core/glossary.ts'
import { LINES, STATES, type State } from '#core/glossary.ts'
import type { LoadStep, StateReadings, Transfer } from '#core/install/readings.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { type Block, type Row, type Section, table } from '../blocks.ts'
import { capital, readingText, rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'

function readingsIn({ install }: ReportScene, state: State): StateReadings | undefined {
  const found = install.readings?.states?.[state]
  return found && !('not_tested' in found) ? found : undefined
}

const STATE_FIELDS = [
  ['frequency', 'Frequency', 'Hz', 1],
  ['neutral_to_earth', 'Neutral to earth', 'V', 1],
  ['link_resistance', 'Neutral–earth link', 'Ω', 2],
] as const

function stateRows(scene: ReportScene): Row[] {
  const row = (
    name: string,
    title: string,
    unit: string,
    text: (readings: StateReadings | undefined) => string,
  ): Row => ({
    anchor: `state/${name}`,
    ...(STATES.some((state) => scene.verdicts.fails('installation', { state, fields: [name] })) && {
      look: 'row-fails' as const,
    }),
    head: { text: title },
    cells: STATES.flatMap((state) => {
      const cell = scene.verdicts.cell('installation', { state, fields: [name] }, `state/${name}/${state}/verdict`)
      const words = text(readingsIn(scene, state))
      return [
        { anchor: `state/${name}/${state}`, text: unit === '' || words === '–' ? words : `${words}\u00a0${unit}` },
        cell,
      ]
    }),
  })
  const lines = LINES.slice(0, scene.install.supply.nominal.phases)
  return [
    ...lines.map((line) =>
      row(`voltage_${line}`, `Voltage ${line}`, 'V', (readings) => readingText(readings?.voltage?.[line], 0)),
    ),
    ...STATE_FIELDS.map(([name, title, unit, least]) =>
      row(name, title, unit, (readings) => readingText(readings?.[name], least)),
    ),
    ...(lines.length === 3 ? [row('rotation', 'Rotation', '', (readings) => readings?.rotation ?? '–')] : []),
  ]
}

const seconds = (measured: Measured | undefined): string => {
  const text = readingText(measured, 0)
  return text === '–' || text === 'not tested' ? text : `${text}\u00a0s`
}

function leftOver({ grid_terminals = {} }: Transfer): string {
  const poles = Object.entries(grid_terminals).map(([pole, measured]) => `${pole} ${readingText(measured, 0)}`)
  return poles.length === 0 ? '–' : `${poles.join(', ')}\u00a0V`
}

function transferRow(scene: ReportScene, transfer: Transfer, index: number): Row {
  const id = `transfer ${index + 1}`
  const anchor = `transfer/${index + 1}`
  const toIsland = transfer.to === 'island'
  return {
    anchor,
    ...(scene.verdicts.fails(id, {}) && { look: 'row-fails' as const }),
    head: { text: `To the ${transfer.to}`, note: transfer.not_tested ?? transfer.cause ?? '' },
    cells: [
      {
        text: seconds(toIsland ? transfer.dark_after : transfer.observed),
        anchor: `${anchor}/first`,
        note: toIsland ? 'until dark' : 'wait',
      },
      {
        text: seconds(toIsland ? transfer.restored_after : transfer.gap),
        anchor: `${anchor}/second`,
        note: toIsland ? 'until restored' : 'interrupted',
      },
      { text: toIsland ? leftOver(transfer) : '–', anchor: `${anchor}/grid-terminals` },
      scene.verdicts.cell(id, {}, `${anchor}/verdict`),
    ],
  }
}

function stepRow(scene: ReportScene, step: LoadStep, index: number): Row {
  const id = `load step ${index + 1}`
  const anchor = `load-step/${index + 1}`
  return {
    anchor,
    ...(scene.verdicts.fails(id, {}) && { look: 'row-fails' as const }),
    head: { text: capital(step.step), note: step.not_tested ?? '' },
    cells: [
      {
        text: readingText(step.lowest_voltage, 0),
        anchor: `${anchor}/voltage`,
        note: `≥ ${rounded(scene.number(id, 'voltage_floor'), 1)}`,
      },
      {
        text: readingText(step.lowest_frequency, 1),
        anchor: `${anchor}/frequency`,
        note: `≥ ${rounded(scene.number(id, 'frequency_floor'), 1)}`,
      },
      { text: step.tripped === undefined ? '–' : step.tripped ? 'tripped' : 'held' },
      scene.verdicts.cell(id, {}, `${anchor}/verdict`),
    ],
  }
}

const STATE_COLUMNS = [
  { label: 'Reading', width: 24 },
  { label: capital(STATE_WORDS.grid), width: 19, align: 'num' },
  { label: 'Verdict', width: 19 },
  { label: capital(STATE_WORDS.island), width: 19, align: 'num' },
  { label: 'Verdict', width: 19 },
] as const

const TRANSFER_COLUMNS = [
  { label: 'Transfer', width: 34 },
  { label: 'First time', width: 12, align: 'num' },
  { label: 'Second time', width: 13, align: 'num' },
  { label: 'Left on the grid terminals', width: 24 },
  { label: 'Verdict', width: 17 },
] as const

const STEP_COLUMNS = [
  { label: 'Load step in the island', width: 38 },
  { label: 'Lowest voltage', unit: 'V', width: 15, align: 'num' },
  { label: 'Lowest frequency', unit: 'Hz', width: 15, align: 'num' },
  { label: 'Supply', width: 14 },
  { label: 'Verdict', width: 18 },
] as const

/** Both states as measured, the transfers between them, and loads switched on in the island. */
export function states(scene: ReportScene): Section {
  const { states: found, transfers = [], load_steps = [] } = scene.install.readings ?? {}
  const blocks: Block[] = [
    ...(found ? [table('state/readings', STATE_COLUMNS, [{ rows: stateRows(scene) }], 'Measured in each state')] : []),
    ...(transfers.length > 0
      ? [
          table(
            'transfer/list',
            TRANSFER_COLUMNS,
            [{ rows: transfers.map((transfer, index) => transferRow(scene, transfer, index)) }],
            'Transfers through the changeover',
          ),
        ]
      : []),
    ...(load_steps.length > 0
      ? [
          table(
            'load-step/list',
            STEP_COLUMNS,
            [{ rows: load_steps.map((step, index) => stepRow(scene, step, index)) }],
            'Load steps',
          ),
        ]
      : []),
  ]
  return { anchor: 'states', title: 'States and transfers', blocks }
}
