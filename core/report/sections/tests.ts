import { STATES, type State } from '#core/glossary.ts'
import type { CircuitReadings } from '#core/install/readings.ts'
import type { Circuit } from '#core/install.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { limitBar } from '../bars.ts'
import { type Cell, type Row, type RowGroup, type Section, tables } from '../blocks.ts'
import { rowsByFeeder } from '../by-board.ts'
import { clearedBy } from '../clearing.ts'
import { amount, amountOr, capital, readingText, rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'

/** Fields of a circuit that are read with the supply off. */
export const DEAD_FIELDS: readonly string[] = ['continuity', 'insulation', 'insulation_tested_at', 'polarity']

const DEAD = { state: null, fields: DEAD_FIELDS } as const

const readingsOf = ({ install }: ReportScene, id: string): CircuitReadings | undefined =>
  install.readings?.circuits?.[id]

function insulationCell(scene: ReportScene, id: string): Cell {
  const insulation = readingsOf(scene, id)?.insulation
  const at =
    insulation && 'value' in insulation && insulation.at !== undefined ? `at ${amount(insulation.at, 'V')}` : ''
  return {
    anchor: `circuit/${id}/insulation`,
    text: readingText(insulation, 0),
    ...(at !== '' && { note: at }),
  }
}

function deadRow(scene: ReportScene, id: string, { serves }: Circuit): Row {
  const readings = readingsOf(scene, id)
  const { verdicts } = scene
  const [voltage, least] = [scene.number(id, 'insulation_test_voltage'), scene.number(id, 'insulation_minimum')]
  return {
    anchor: `circuit/${id}/dead`,
    ...(verdicts.fails(id, DEAD) && { look: 'row-fails' as const }),
    head: { text: id },
    cells: [
      { text: serves },
      { text: readingText(readings?.continuity, 2), anchor: `circuit/${id}/continuity` },
      { text: rounded(scene.number(id, 'continuity_expected'), 2) },
      insulationCell(scene, id),
      { text: amountOr(least, ''), ...(voltage !== undefined && { note: `at ${amount(voltage, 'V')}` }) },
      { text: readings?.polarity ?? '–', anchor: `circuit/${id}/polarity` },
      { text: readings?.with ?? scene.install.readings?.with ?? '–' },
      verdicts.cell(id, DEAD, `circuit/${id}/dead/verdict`),
    ],
  }
}

/** Whether the loop decides: where residual current or the source's shut-down cuts off, its limit is not the overcurrent device's. */
function decides({ value }: ReportScene, id: string, state: State): boolean {
  const means = value(id, `${state}_disconnection`)
  return means === 'overcurrent' || means === 'none'
}

function loopBar(scene: ReportScene, id: string, state: State): string | undefined {
  const value = scene.number(id, 'loop', state)
  const most = decides(scene, id, state) ? scene.number(id, 'loop_limit_measured') : undefined
  if (value === undefined || most === undefined || !Number.isFinite(value)) return undefined
  const span = scene.sheet(id).spansInState[state]['loop']
  return limitBar({ value, most, unit: 'Ω', name: `loop of ${id} ${STATE_WORDS[state]}`, ...(span && { span }) })
}

function loopRow(scene: ReportScene, id: string, { serves }: Circuit, state: State): Row {
  const { verdicts } = scene
  const bar = loopBar(scene, id, state)
  return {
    anchor: `circuit/${id}/${state}`,
    ...(verdicts.fails(id, { state }) && { look: 'row-fails' as const }),
    head: { text: id },
    cells: [
      { text: serves },
      { text: clearedBy(scene, id, state) },
      { text: readingText(readingsOf(scene, id)?.loop?.[state], 2), anchor: `circuit/${id}/loop/${state}` },
      { text: decides(scene, id, state) ? rounded(scene.number(id, 'loop_limit_measured'), 2) : '–' },
      bar === undefined ? { text: '' } : { svg: bar },
      verdicts.cell(id, { state }, `circuit/${id}/${state}/verdict`),
    ],
  }
}

function loopGroups(scene: ReportScene): RowGroup[] {
  const all = Object.entries(scene.install.circuits ?? {})
  return STATES.map((state) => ({
    title: capital(STATE_WORDS[state]),
    rows: all
      .filter(([id]) => scene.topology.live(id, state))
      .map(([id, circuit]) => loopRow(scene, id, circuit, state)),
  }))
}

/** What was read on the circuits: with the supply off, then in each state. */
export function tests(scene: ReportScene): Section {
  const dead = tables(
    'tests/dead',
    [
      { label: 'Circuit', width: 8 },
      { label: 'Serves', width: 20 },
      { label: 'R_1 + R_2', unit: 'Ω', width: 9, align: 'num' },
      { label: 'expected', unit: 'Ω', width: 10, align: 'num' },
      { label: 'Insulation', unit: 'MΩ', width: 12, align: 'num' },
      { label: 'at least', unit: 'MΩ', width: 10, align: 'num' },
      { label: 'Polarity', width: 10 },
      { label: 'With', width: 7 },
      { label: 'Verdict', width: 14 },
    ],
    rowsByFeeder(scene, (id, circuit) => deadRow(scene, id, circuit)),
    'Dead: continuity, insulation, polarity',
  )
  const loops = tables(
    'tests/loop',
    [
      { label: 'Circuit', width: 8 },
      { label: 'Serves', width: 20 },
      { label: 'Cleared by', width: 15 },
      { label: 'Loop read', unit: 'Ω', width: 9, align: 'num' },
      { label: 'at most', unit: 'Ω', width: 12, align: 'num' },
      { label: 'Reading, its uncertainty, and the limit', width: 22 },
      { label: 'Verdict', width: 14 },
    ],
    loopGroups(scene),
    'Live: fault loop and what clears a fault, in each state',
  )
  return { anchor: 'tests', title: 'Tests of the circuits', blocks: [...dead, ...loops] }
}
