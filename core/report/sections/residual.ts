import { STATES, type State } from '#core/glossary.ts'
import type { ResidualTest } from '#core/install/readings.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { limitBar } from '../bars.ts'
import { type Cell, type Row, type Section, tables } from '../blocks.ts'
import { residualName } from '../devices.ts'
import { capital, readingText, rounded } from '../print.ts'
import { rampBand } from '../ramp.ts'
import type { ReportScene } from '../scene.ts'
import { sure } from '../sure.ts'

const TIMES = [
  ['half', undefined],
  ['rated', 'time_limit_rated'],
  ['double', 'time_limit_double'],
  ['five_times', 'time_limit_five_times'],
] as const

function testOf({ install }: ReportScene, id: string, state: State): ResidualTest | string | undefined {
  const readings = install.readings?.residual_current?.[id]
  const test = readings?.[state]
  if (test && 'not_tested' in test) return test.not_tested
  return test ?? readings?.not_tested
}

function timeCell(
  scene: ReportScene,
  id: string,
  state: State,
  test: ResidualTest,
  [name, limit]: (typeof TIMES)[number],
): Cell {
  const text = readingText(test[name], 0)
  const most = limit === undefined ? undefined : scene.number(id, limit)
  const value = scene.number(id, name, state)
  const span = scene.sheet(id).spansInState[state][name]
  const anchor = `residual/${id}/${name}/${state}`
  if (most === undefined || value === undefined || !Number.isFinite(value)) return { anchor, text }
  const bar = {
    value,
    most,
    unit: 'ms',
    name: `${name} of ${id} ${STATE_WORDS[state]}`,
    size: 'narrow' as const,
    ...(span && { span }),
  }
  return { anchor, text, note: `≤ ${rounded(most, 0)}`, svg: limitBar(bar) }
}

function rampCell(scene: ReportScene, id: string, state: State, { ramp }: ResidualTest): Cell {
  return {
    anchor: `residual/${id}/ramp/${state}`,
    text: readingText(ramp, 0),
    ...(ramp !== undefined && { note: rampBand(scene, id) }),
  }
}

function testRow(scene: ReportScene, id: string, state: State): Row {
  const { verdicts, install } = scene
  const device = sure(install.residual_current?.[id], id)
  const test = testOf(scene, id, state)
  const taken = typeof test === 'object' ? test : {}
  return {
    anchor: `residual/${id}/${state}`,
    ...(verdicts.fails(id, { state }) && { look: 'row-fails' as const }),
    head: { text: id, note: residualName(device) },
    cells: [
      ...TIMES.map((time) => timeCell(scene, id, state, taken, time)),
      rampCell(scene, id, state, taken),
      { text: install.readings?.residual_current?.[id]?.with ?? install.readings?.with ?? '–' },
      typeof test === 'string'
        ? { anchor: `residual/${id}/${state}/verdict`, ...verdicts.cell(id, { state }, ''), note: test }
        : verdicts.cell(id, { state }, `residual/${id}/${state}/verdict`),
    ],
  }
}

/** Residual-current devices as tested in each state: a reading of one state never stands for the other. */
export function residual(scene: ReportScene): Section {
  const ids = Object.keys(scene.install.residual_current ?? {})
  const groups = STATES.map((state) => ({
    title: capital(STATE_WORDS[state]),
    rows: ids.filter((id) => scene.topology.live(id, state)).map((id) => testRow(scene, id, state)),
  }))
  const tests = tables(
    'residual/tests',
    [
      { label: 'Device', width: 14 },
      { label: '½ IΔ_n', unit: 'ms', width: 10, align: 'num' },
      { label: '1 × IΔ_n', unit: 'ms', width: 14, align: 'num' },
      { label: '2 × IΔ_n', unit: 'ms', width: 14, align: 'num' },
      { label: '5 × IΔ_n', unit: 'ms', width: 14, align: 'num' },
      { label: 'Ramp', unit: 'mA', width: 12, align: 'num' },
      { label: 'With', width: 7 },
      { label: 'Verdict', width: 15 },
    ],
    groups,
    'Trip times and trip currents',
  )
  return {
    anchor: 'residual',
    title: 'Residual-current devices, tested',
    blocks: tests,
  }
}
