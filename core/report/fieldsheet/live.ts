import type { Measured } from '#core/glossary.ts'
import { LINES, type State } from '#core/glossary.ts'
import type { ResidualTest } from '#core/install/readings.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { type Block, type Row, table, tables } from '../blocks.ts'
import { circuitsByFeeder } from '../by-board.ts'
import { clearedBy, loopYardstick } from '../clearing.ts'
import { residualName } from '../devices.ts'
import { rounded } from '../print.ts'
import { rampBand } from '../ramp.ts'
import type { ReportScene } from '../scene.ts'
import { sure } from '../sure.ts'
import { plainPoints } from './plain.ts'
import { type Point, pointCell, wordCell } from './points.ts'

const WIDTH = { loop: 26, device: 16, rotation: 26 } as const

function originPoints({ install }: ReportScene): Point[] {
  const { loop_impedance, fault_current } = install.supply
  return [
    {
      anchor: 'point/supply/loop',
      name: 'External loop at the origin',
      unit: 'Ω',
      limit: 'write it down',
      measured: loop_impedance,
      least: 2,
    },
    {
      anchor: 'point/supply/fault',
      name: 'Fault current at the origin, the larger',
      unit: 'A',
      limit: 'no more than any device breaks',
      measured: fault_current,
      least: 0,
    },
  ]
}

const between = (scene: ReportScene, kind: 'voltage' | 'frequency', count: number): string => {
  const low = rounded(scene.number('installation', `${kind}_floor`), count)
  return `${low} to ${rounded(scene.number('installation', `${kind}_ceiling`), count)}`
}

function statePoints(scene: ReportScene, state: State): Block[] {
  const { install, topology } = scene
  const found = install.readings?.states?.[state]
  const reason: Measured | undefined = found && 'not_tested' in found ? found : undefined
  const read = found && !('not_tested' in found) ? found : undefined
  const point = (
    name: string,
    title: string,
    unit: string,
    limit: string,
    measured: Measured | undefined,
    least: number,
  ): Point => ({
    anchor: `point/state/${name}/${state}`,
    name: title,
    unit,
    limit,
    measured: measured ?? reason,
    least,
  })
  const lines = LINES.slice(0, install.supply.nominal.phases)
  const points = [
    ...(state === 'grid' ? originPoints(scene) : []),
    ...lines.map((line) =>
      point(
        `voltage_${line}`,
        `Voltage ${line} to neutral`,
        'V',
        between(scene, 'voltage', 1),
        read?.voltage?.[line],
        0,
      ),
    ),
    point('frequency', 'Frequency', 'Hz', between(scene, 'frequency', 1), read?.frequency, 1),
    point('neutral_to_earth', 'Neutral to earth', 'V', 'near zero: one link', read?.neutral_to_earth, 1),
    ...(state === 'island'
      ? [
          point(
            'link_resistance',
            'Link between neutral and earth',
            'Ω',
            `closed: ${topology.neutralEarthLinks.island.join(', ') || 'none'}`,
            read?.link_resistance,
            2,
          ),
        ]
      : []),
  ]
  return plainPoints(`point/state/${state}`, `At the ${state === 'grid' ? 'origin' : 'backed-up board'}`, points)
}

function loopRow(scene: ReportScene, id: string, serves: string, state: State): Row {
  const limit = loopYardstick(scene, id, state)
  const read = scene.install.readings?.circuits?.[id]
  const skipped = read?.not_tested === undefined ? undefined : { not_tested: read.not_tested }
  return {
    anchor: `point/circuit/${id}/${state}`,
    head: { text: id },
    cells: [
      { text: serves },
      { text: clearedBy(scene, id, state) },
      { text: limit === undefined ? '–' : `≤ ${rounded(limit, 2)}` },
      { text: rounded(scene.number(id, 'loop_expected'), 2) },
      pointCell(
        {
          anchor: `point/circuit/${id}/loop/${state}`,
          name: `loop of ${id} ${STATE_WORDS[state]}`,
          unit: 'Ω',
          limit: '',
          measured: read?.loop?.[state] ?? skipped,
          least: 2,
        },
        WIDTH.loop,
      ),
    ],
  }
}

function loops(scene: ReportScene, state: State): Block[] {
  const groups = circuitsByFeeder(scene).map(({ title, circuits }) => ({
    title,
    rows: circuits
      .filter(([id]) => scene.topology.live(id, state))
      .map(([id, { serves }]) => loopRow(scene, id, serves, state)),
  }))
  const columns = [
    { label: 'Circuit', width: 9 },
    { label: 'Serves', width: 25 },
    { label: 'Cleared by', width: 18 },
    { label: 'Limit', unit: 'Ω', width: 11, align: 'num' as const },
    { label: 'expected', unit: 'Ω', width: 11, align: 'num' as const },
    { label: 'Loop', unit: 'Ω', width: WIDTH.loop },
  ]
  return tables(`point/loop/${state}`, columns, groups, 'Fault loop at the far end of each circuit')
}

interface TimeColumn {
  readonly name: 'rated' | 'double' | 'five_times'
  readonly label: string
}

/** Times by multiple of the rated residual current. Twice it is asked of time-delayed devices only, and kept where it was read. */
function timeColumns(scene: ReportScene, ids: readonly string[], state: State): readonly TimeColumn[] {
  const double = ids.some((id) => asksForDouble(scene, id, state))
  return [
    { name: 'rated', label: '1 × IΔ_n' },
    ...(double ? [{ name: 'double', label: '2 × IΔ_n' } as const] : []),
    { name: 'five_times', label: '5 × IΔ_n' },
  ]
}

function asksForDouble({ install }: ReportScene, id: string, state: State): boolean {
  const found = install.readings?.residual_current?.[id]?.[state]
  return install.residual_current?.[id]?.delay === 'S' || (found !== undefined && 'double' in found)
}

/** `≤ 300`, or `130 to 500` where the device has to wait. */
function timeLimit(scene: ReportScene, id: string, name: TimeColumn['name']): string {
  const most = rounded(scene.number(id, `time_limit_${name}`), 0)
  const least = scene.number(id, `time_minimum_${name}`)
  return least === undefined ? `≤ ${most}` : `${rounded(least, 0)} to ${most}`
}

function residualRow(scene: ReportScene, id: string, state: State, times: readonly TimeColumn[], width: number): Row {
  const device = sure(scene.install.residual_current?.[id], id)
  const readings = scene.install.readings?.residual_current?.[id]
  const found =
    readings?.[state] ?? (readings?.not_tested === undefined ? undefined : { not_tested: readings.not_tested })
  const reason: Measured | undefined =
    found && 'not_tested' in found ? { not_tested: String(found.not_tested) } : undefined
  const test: ResidualTest = found && !('not_tested' in found) ? found : {}
  const point = (name: keyof ResidualTest, unit: string, limit: string) =>
    pointCell(
      {
        anchor: `point/residual/${id}/${name}/${state}`,
        name: `${name} of ${id} ${STATE_WORDS[state]}`,
        unit,
        limit,
        measured: test[name] ?? reason,
        least: 0,
      },
      width,
    )
  const time = ({ name }: TimeColumn) =>
    name === 'double' && !asksForDouble(scene, id, state)
      ? { text: '–' }
      : point(name, 'ms', timeLimit(scene, id, name))
  return {
    anchor: `point/residual/${id}/${state}`,
    head: { text: id, note: residualName(device) },
    cells: [point('half', 'ms', 'no trip'), ...times.map(time), point('ramp', 'mA', rampBand(scene, id))],
  }
}

function residual(scene: ReportScene, state: State): Block[] {
  const ids = Object.keys(scene.install.residual_current ?? {}).filter((id) => scene.topology.live(id, state))
  if (ids.length === 0) return []
  const times = timeColumns(scene, ids, state)
  const width = (100 - WIDTH.device) / (times.length + 2)
  const columns = [
    { label: 'Device', width: WIDTH.device },
    { label: '½ IΔ_n', unit: 'ms', width },
    ...times.map(({ label }) => ({ label, unit: 'ms', width })),
    { label: 'Ramp', unit: 'mA', width },
  ]
  const rows = ids.map((id) => residualRow(scene, id, state, times, width))
  return [table(`point/residual/${state}`, columns, [{ rows }], 'Residual-current devices')]
}

function rotation({ install }: ReportScene, state: State): Block[] {
  if (install.supply.nominal.phases !== 3) return []
  const found = install.readings?.states?.[state]
  const word = found && 'not_tested' in found ? found.not_tested : found?.rotation
  const cells = [
    { text: 'the same in both states' },
    wordCell({ anchor: `point/state/rotation/${state}`, name: `rotation ${STATE_WORDS[state]}`, word }, WIDTH.rotation),
  ]
  const columns = [
    { label: 'Test point', width: 38 },
    { label: 'Limit', width: 36 },
    { label: 'Found', width: WIDTH.rotation },
  ]
  return [
    table(`point/rotation/${state}`, columns, [
      { rows: [{ anchor: `point/rotation/${state}/row`, head: { text: 'Direction of rotation' }, cells }] },
    ]),
  ]
}

/** What is read with the supply of a state on. */
export function livePoints(scene: ReportScene, state: State): Block[] {
  return [...statePoints(scene, state), ...rotation(scene, state), ...residual(scene, state), ...loops(scene, state)]
}
