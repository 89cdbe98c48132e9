import { islandBudget } from '#core/quantities/budget.ts'
import { phaseLoads } from '#core/quantities/inverter-load.ts'
import { limitBar } from '../bars.ts'
import { type Block, type Entry, type Row, type Section, table } from '../blocks.ts'
import { budgetCurve } from '../curve.ts'
import { verdictEntry } from '../entries.ts'
import { amount, hoursText, printed } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { sure } from '../sure.ts'

function batteryEntries(
  scene: ReportScene,
  id: string,
): readonly { readonly title: string; readonly entries: readonly Entry[] }[] {
  const battery = sure(scene.install.batteries?.[id], id)
  const hours = (name: string) => {
    const value = scene.number(id, name)
    return value === undefined ? 'not known' : hoursText(value)
  }
  const ventilation = scene.number(id, 'ventilation')
  return [
    {
      title: `Battery ${id}`,
      entries: [
        { anchor: `battery/${id}/chemistry`, term: 'Chemistry', detail: battery.chemistry },
        { anchor: `battery/${id}/place`, term: 'Place', detail: battery.place },
        {
          anchor: `battery/${id}/usable`,
          term: 'Usable',
          detail: amount(battery.usable, 'Wh'),
          note: `${amount(battery.efficiency, '%')} efficiency to a.c.`,
        },
        {
          anchor: `battery/${id}/discharge`,
          term: 'Gives at most',
          detail: printed(scene.value(id, 'discharge_limit'), 'W'),
        },
        ...(ventilation === undefined
          ? []
          : [{ anchor: `battery/${id}/ventilation`, term: 'Air needed', detail: amount(ventilation, 'm³/h') }]),
      ],
    },
    {
      title: 'Hours without sun',
      entries: [
        {
          anchor: `battery/${id}/held_back_energy`,
          term: 'Held back',
          detail: printed(scene.value(id, 'held_back_energy'), 'Wh'),
        },
        { anchor: `battery/${id}/autonomy`, term: 'All backed-up loads', detail: hours('autonomy') },
        { anchor: `battery/${id}/autonomy_must_run`, term: 'What must run', detail: hours('autonomy_must_run') },
        verdictEntry(`battery/${id}/verdict`, scene.verdicts.of(id)),
      ],
    },
  ]
}

/** A computed load: three digits count. */
const roundedLoad = (load: number): string => amount(Number(load.toPrecision(3)), 'VA')

function lineRows(scene: ReportScene, id: string): Row[] {
  const limit = sure(scene.number(id, 'phase_limit'), `The limit of ${id}`)
  return Object.entries(phaseLoads(scene.quantities)).map(([line, load]) => {
    const bar = limitBar({ value: Math.round(load), most: limit, unit: 'VA', name: `load on ${line}`, size: 'wide' })
    return {
      anchor: `inverter/${id}/phase_load/${line}`,
      ...(load > limit && { look: 'row-fails' as const }),
      head: { text: `${id} ${line}` },
      cells: [{ text: roundedLoad(load) }, { text: roundedLoad(limit) }, { svg: bar }],
    }
  })
}

function startRow(scene: ReportScene, id: string): Row {
  const start = sure(scene.number(id, 'starting_current'), `The start at ${id}`)
  const limit = scene.number(id, 'phase_peak_limit')
  const bar =
    limit === undefined
      ? undefined
      : limitBar({ value: Number(start.toFixed(1)), most: limit, unit: 'A', name: 'starting current', size: 'wide' })
  return {
    anchor: `inverter/${id}/starting_current`,
    ...(limit !== undefined && start > limit && { look: 'row-fails' as const }),
    head: { text: `${id} largest start` },
    cells: [
      { text: printed(start, 'A') },
      { text: limit === undefined ? 'not stated' : printed(limit, 'A') },
      bar === undefined ? { text: '' } : { svg: bar },
    ],
  }
}

function curve(scene: ReportScene): Block[] {
  const budget = islandBudget(scene.quantities)
  if (!budget) return []
  const caption = `Charge hour by hour after a grid failure at sunset. ${budget.model} ${budget.source}`
  return [{ kind: 'figure', anchor: 'island/curve', svg: budgetCurve(budget), caption }]
}

/** The island's budget: lines, starts, hours, and the charge hour by hour. */
export function island(scene: ReportScene): Section {
  const { install, topology } = scene
  const batteries = Object.keys(install.batteries ?? {})
  const rows = topology.inverters.island.flatMap((id) => [...lineRows(scene, id), startRow(scene, id)])
  const columns = [
    { label: 'In the island', width: 26 },
    { label: 'Load', width: 17, align: 'num' as const },
    { label: 'Given', width: 17, align: 'num' as const },
    { label: 'Against what is given', width: 40 },
  ]
  return {
    anchor: 'island',
    title: 'Battery and the island’s budget',
    blocks: [
      ...batteries.map(
        (id): Block => ({
          kind: 'particulars',
          anchor: `battery/${id}`,
          beside: true,
          lists: batteryEntries(scene, id),
        }),
      ),
      ...(rows.length > 0 ? [table('island/lines', columns, [{ rows }], 'Power and starts, line by line')] : []),
      ...curve(scene),
    ],
  }
}
