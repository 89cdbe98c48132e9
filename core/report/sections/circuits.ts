import type { Circuit } from '#core/install.ts'
import { limitBar } from '../bars.ts'
import { type Cell, type Row, type Section, tables } from '../blocks.ts'
import { rowsByFeeder } from '../by-board.ts'
import { clearedBy } from '../clearing.ts'
import { cableLaid, cableName, deviceName, residualName } from '../devices.ts'
import { printed, rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { DEAD_FIELDS } from './tests.ts'

const DESIGN = { state: null, without: DEAD_FIELDS } as const

function dropCell(scene: ReportScene, id: string, { lighting }: Circuit): Cell {
  const drop = scene.number(id, 'voltage_drop_total_percent')
  const anchor = `circuit/${id}/voltage_drop`
  if (drop === undefined) return { text: '–', anchor }
  const { voltage_drop_lighting, voltage_drop_other } = scene.judged.book.parameters
  const most = lighting ? voltage_drop_lighting : voltage_drop_other
  const bar = {
    value: Number(drop.toFixed(2)),
    most,
    unit: '%',
    name: `voltage drop of ${id}`,
    size: 'narrow',
  } as const
  return { text: rounded(drop, 2), anchor, svg: limitBar(bar) }
}

function deviceCell({ device, residual_current }: Circuit): Cell {
  return { text: deviceName(device), ...(residual_current && { note: residualName(residual_current) }) }
}

function designRow(scene: ReportScene, id: string, circuit: Circuit): Row {
  const { verdicts } = scene
  const { cable } = circuit
  return {
    anchor: `circuit/${id}/design`,
    ...(verdicts.fails(id, DESIGN) && { look: 'row-fails' as const }),
    head: { text: id },
    cells: [
      { text: circuit.serves, note: circuit.phases.join(' '), anchor: `circuit/${id}/serves` },
      { ...deviceCell(circuit), anchor: `circuit/${id}/device` },
      { text: cableName(cable), note: cableLaid(cable), anchor: `circuit/${id}/cable` },
      { text: rounded(scene.number(id, 'design_current'), 1), anchor: `circuit/${id}/design_current` },
      { text: printed(scene.value(id, 'device_rated'), '') },
      { text: rounded(scene.number(id, 'capacity'), 1), anchor: `circuit/${id}/capacity` },
      dropCell(scene, id, circuit),
      verdicts.cell(id, DESIGN, `circuit/${id}/design/verdict`),
    ],
  }
}

function faultRow(scene: ReportScene, id: string): Row {
  const cell = (name: string, count: number): Cell => ({
    anchor: `circuit/${id}/${name}`,
    text: rounded(scene.number(id, name), count),
  })
  return {
    anchor: `circuit/${id}/fault`,
    head: { text: id },
    cells: [
      cell('disconnection_time', 1),
      cell('operating_current', 0),
      cell('loop_limit', 2),
      cell('loop_limit_measured', 2),
      cell('loop_expected', 2),
      cell('fault_current_grid', 0),
      { text: clearedBy(scene, id, 'grid') },
      cell('fault_current_island', 0),
      { text: clearedBy(scene, id, 'island') },
      cell('protective_conductor_minimum', 1),
    ],
  }
}

const DESIGN_COLUMNS = [
  { label: 'Circuit', width: 8 },
  { label: 'Serves', width: 19 },
  { label: 'Device', width: 11 },
  { label: 'Cable', width: 19 },
  { label: 'I_b', unit: 'A', width: 6.5, align: 'num' },
  { label: 'I_n', unit: 'A', width: 6.5, align: 'num' },
  { label: 'I_z', unit: 'A', width: 6.5, align: 'num' },
  { label: 'Drop', unit: '%', width: 9, align: 'num' },
  { label: 'Verdict', width: 14.5 },
] as const

const FAULT_COLUMNS = [
  { label: 'Circuit', width: 8 },
  { label: 'Clear in', unit: 's', width: 7.5, align: 'num' },
  { label: 'I_a', unit: 'A', width: 6.5, align: 'num' },
  { label: 'Loop limit', unit: 'Ω', width: 8, align: 'num' },
  { label: 'for a reading', unit: 'Ω', width: 9, align: 'num' },
  { label: 'expected', unit: 'Ω', width: 9.5, align: 'num' },
  { label: 'Fault, grid', unit: 'A', width: 8, align: 'num' },
  { label: 'cleared by', width: 13 },
  { label: 'Fault, island', unit: 'A', width: 8.5, align: 'num' },
  { label: 'cleared by', width: 13 },
  { label: 'PE least', unit: 'mm²', width: 9, align: 'num' },
] as const

/** The circuits as designed: what protects, what carries, and what clears a fault in each state. */
export function circuits(scene: ReportScene): Section {
  const design = tables(
    'circuits/design',
    DESIGN_COLUMNS,
    rowsByFeeder(scene, (id, circuit) => designRow(scene, id, circuit)),
    'Design: load, device, cable, voltage drop from the origin',
  )
  const faults = tables(
    'circuits/fault',
    FAULT_COLUMNS,
    rowsByFeeder(scene, (id) => faultRow(scene, id)),
    'Faults to earth: what must clear them, and what does, in each state',
  )
  return { anchor: 'circuits', title: 'Circuits', blocks: [...design, ...faults] }
}
