import type { TopologyNode } from '#core/topology/topology.ts'
import { type Block, type Row, type Section, table } from '../blocks.ts'
import { cableLaid, cableName, deviceName, residualName } from '../devices.ts'
import { amountOr, few, printed } from '../print.ts'
import type { ReportScene } from '../scene.ts'

const sideOf = (node: TopologyNode | undefined): string => (node?.backedUp ? 'lives on' : 'grid only')

function boardRows({ install, topology }: ReportScene): Row[] {
  return Object.entries(install.boards ?? {}).map(([id, { name, fed_from, cable, neutral_link }]) => ({
    anchor: `board/${id}`,
    head: { text: id },
    cells: [
      { text: name },
      { text: fed_from },
      { text: sideOf(topology.nodes.get(id)) },
      cable ? { text: cableName(cable), note: cableLaid(cable) } : { text: '–' },
      { text: neutral_link ?? 'none' },
    ],
  }))
}

function overcurrentRows(scene: ReportScene): Row[] {
  const { install, verdicts } = scene
  return Object.entries(install.overcurrent ?? {}).map(([id, { device, breaking, fed_from, cable }]) => ({
    anchor: `overcurrent/${id}`,
    ...(verdicts.fails(id, {}) && { look: 'row-fails' as const }),
    head: { text: id },
    cells: [
      { text: deviceName(device) },
      { text: fed_from },
      { text: amountOr(breaking ?? device.breaking, 'A', 'not stated') },
      { text: printed(scene.value(id, 'fault_current_at_device'), 'A') },
      { text: printed(scene.value(id, 'through_current'), 'A') },
      cable ? { text: cableName(cable), note: cableLaid(cable) } : { text: '–' },
      verdicts.cell(id, {}, `overcurrent/${id}/verdict`),
    ],
  }))
}

function residualRows(scene: ReportScene): Row[] {
  const { install, topology, verdicts } = scene
  return Object.entries(install.residual_current ?? {}).map(([id, device]) => ({
    anchor: `residual/${id}`,
    ...(verdicts.fails(id, { state: null }) && { look: 'row-fails' as const }),
    head: { text: id },
    cells: [
      { text: residualName(device) },
      { text: device.fed_from, note: sideOf(topology.nodes.get(id)) },
      { text: amountOr(device.rated_current, 'A') },
      { text: printed(scene.value(id, 'load_current'), 'A') },
      { text: few(topology.circuitsBelow(id), 8) || 'none' },
      verdicts.cell(id, { state: null }, `residual/${id}/verdict`),
    ],
  }))
}

/** Boards, and the devices that stand in the tree by themselves. */
export function boards(scene: ReportScene): Section {
  const groups: readonly Block[] = [
    table(
      'boards/list',
      [
        { label: 'Board', width: 9 },
        { label: 'Name', width: 24 },
        { label: 'Fed from', width: 12 },
        { label: 'In the island', width: 13 },
        { label: 'Cable', width: 26 },
        { label: 'Neutral link', width: 16 },
      ],
      [{ rows: boardRows(scene) }],
      'Boards',
    ),
    table(
      'overcurrent/list',
      [
        { label: 'Device', width: 10 },
        { label: 'Kind', width: 10 },
        { label: 'Fed from', width: 12 },
        { label: 'Breaks', width: 11, align: 'num' },
        { label: 'Fault there', width: 12, align: 'num' },
        { label: 'Carries', width: 10, align: 'num' },
        { label: 'Cable', width: 15 },
        { label: 'Verdict', width: 20 },
      ],
      [{ rows: overcurrentRows(scene) }],
      'Overcurrent devices upstream of the circuits',
    ),
    table(
      'residual/list',
      [
        { label: 'Device', width: 10 },
        { label: 'Type', width: 15 },
        { label: 'Fed from', width: 13 },
        { label: 'Rated', width: 10, align: 'num' },
        { label: 'Carries', width: 10, align: 'num' },
        { label: 'Protects', width: 22 },
        { label: 'Verdict', width: 20 },
      ],
      [{ rows: residualRows(scene) }],
      'Residual-current devices',
    ),
  ]
  return {
    anchor: 'boards',
    title: 'Boards and devices',
    blocks: groups.filter((block) => block.kind !== 'table' || block.groups.length > 0),
  }
}
