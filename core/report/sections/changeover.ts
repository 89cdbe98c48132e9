import type { Block, Entry, Section } from '../blocks.ts'
import { table } from '../blocks.ts'
import { cableLaid, cableName } from '../devices.ts'
import { verdictEntry } from '../entries.ts'
import { distinct } from '../names.ts'
import { amount, amountOr, printed } from '../print.ts'
import type { ReportScene } from '../scene.ts'

const LINK_WORDS = {
  'closes in island': 'closes in the island',
  fixed: 'fixed: closed in both states',
  none: 'none',
} as const

function device(scene: ReportScene): Entry[] {
  const { changeover } = scene.install
  const { id, operation, poles, rated_current, fed_from, cable, interlock, short_circuit_rating } = changeover
  return [
    { anchor: `changeover/${id}/device`, term: 'Changeover', detail: `${id}, ${operation}, fed from ${fed_from}` },
    {
      anchor: `changeover/${id}/poles`,
      term: 'Poles',
      detail: String(poles),
      note: `opens ${printed(scene.value(id, 'switched_poles'), '')}`,
    },
    {
      anchor: `changeover/${id}/rating`,
      term: 'Rated current',
      detail: amount(rated_current, 'A'),
      note: `upstream protection ${printed(scene.value(id, 'upstream_rating'), 'A')}`,
    },
    {
      anchor: `changeover/${id}/through`,
      term: 'Carries',
      detail: printed(scene.value(id, 'through_current'), 'A'),
      note: `backed-up load; inverter ${printed(scene.value(id, 'inverter_current'), 'A')}`,
    },
    {
      anchor: `changeover/${id}/short-circuit`,
      term: 'Short-circuit rating',
      detail: amountOr(short_circuit_rating, 'A', 'not stated'),
      note: `fault current there ${printed(scene.value(id, 'fault_current_at_device'), 'A')}`,
    },
    { anchor: `changeover/${id}/interlock`, term: 'Interlock', detail: interlock?.join(' and ') ?? 'not stated' },
    ...(cable
      ? [{ anchor: `changeover/${id}/cable`, term: 'Cable', detail: cableName(cable), note: cableLaid(cable) }]
      : []),
  ]
}

const circuitsText = (count: number): string => (count === 1 ? '1 circuit' : `${count} circuits`)

function neutral(scene: ReportScene): Entry[] {
  const { changeover } = scene.install
  const { id, neutral_link, neutral_opens } = changeover
  const links = scene.topology.neutralEarthLinks
  const joins = scene.topology.islandJoins
  const lost = scene.number(id, 'lost_neutral_voltage')
  const { backedUp, gridOnly } = scene.topology.circuits
  return [
    { anchor: `changeover/${id}/neutral-link`, term: 'Neutral–earth link', detail: LINK_WORDS[neutral_link] },
    {
      anchor: `changeover/${id}/neutral-opens`,
      term: 'Neutral contact opens',
      detail: neutral_opens ?? 'not stated',
      ...(lost !== undefined && { note: `${amount(Math.round(lost), 'V')} on a line if it opened first` }),
    },
    {
      anchor: `changeover/${id}/links/grid`,
      term: 'Links on the grid',
      detail: `${links.grid.length}`,
      note: links.grid.join(', '),
    },
    {
      anchor: `changeover/${id}/links/island`,
      term: 'Links in the island',
      detail: `${links.island.length}`,
      note: links.island.join(', ') || 'none',
    },
    { anchor: `changeover/${id}/joins`, term: 'Joins island to grid', detail: joins.join(', ') || 'nothing' },
    {
      anchor: `changeover/${id}/backed-up`,
      term: 'Lives on',
      detail: circuitsText(backedUp.length),
      note: backedUp.slice(0, 24).join(', ') || 'none',
    },
    {
      anchor: `changeover/${id}/grid-only`,
      term: 'Grid only',
      detail: circuitsText(gridOnly.length),
      note: gridOnly.slice(0, 24).join(', ') || 'none',
    },
  ]
}

/** The device that makes the island: poles, ratings, link, signals. */
export function changeover(scene: ReportScene): Section {
  const { id, signals = [] } = scene.install.changeover
  const names = distinct(signals.map(({ role }) => role))
  const rows = signals.map(({ role, terminal, configured }, index) => ({
    anchor: `changeover/${id}/signal/${names[index]}`,
    ...(terminal !== configured && { look: 'row-fails' as const }),
    head: { text: role },
    cells: [{ text: terminal }, { text: configured }, { text: terminal === configured ? 'the same' : 'differ' }],
  }))
  const blocks: Block[] = [
    {
      kind: 'particulars',
      anchor: `changeover/${id}`,
      beside: true,
      lists: [
        { title: 'Device', entries: device(scene) },
        {
          title: 'Neutral and sides',
          entries: [...neutral(scene), verdictEntry(`changeover/${id}/verdict`, scene.verdicts.of(id))],
        },
      ],
    },
  ]
  const columns = [
    { label: 'Signal', width: 40 },
    { label: 'Wired to', width: 20 },
    { label: 'Set in the inverter', width: 20 },
    { label: 'Comparison', width: 20 },
  ]
  if (rows.length > 0)
    blocks.push(table(`changeover/${id}/signals`, columns, [{ rows }], 'Signals between changeover and inverter'))
  return { anchor: 'changeover', title: 'Changeover', blocks }
}
