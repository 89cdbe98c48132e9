import type { Inverter } from '#core/install.ts'
import { type Block, type Entry, type Row, type Section, table } from '../blocks.ts'
import { verdictEntry } from '../entries.ts'
import { amount, amountOr, decimals, printed } from '../print.ts'
import type { ReportScene } from '../scene.ts'

type Put = (name: string, term: string, detail: string, note?: string) => Entry

const putter =
  (id: string): Put =>
  (name, term, detail, note) => ({
    anchor: `inverter/${id}/${name}`,
    term,
    detail,
    ...(note !== undefined && { note }),
  })

function machine(scene: ReportScene, id: string, inverter: Inverter): Entry[] {
  const put = putter(id)
  const { phases, line, rated_power, residual_monitoring, separation, residual_type_needed, fed_from } = inverter
  return [
    put('fed_from', 'Connected at', fed_from),
    put(
      'rated_power',
      'Rated',
      amount(rated_power, 'VA'),
      phases === 3 ? 'three-phase' : `single-phase${line ? ` on ${line}` : ''}`,
    ),
    put('monitoring', 'Residual monitoring', residual_monitoring ?? 'not stated'),
    put('separation', 'Separation d.c. to a.c.', separation ?? 'not stated'),
    put('residual_type', 'Asks for RCD type', residual_type_needed ?? 'not stated'),
    put('feed_in', 'Unbalance', printed(scene.value(id, 'unbalance'), 'VA'), 'between the lines of the backed-up load'),
  ]
}

function island(scene: ReportScene, id: string, { island: source, settings }: Inverter): Entry[] {
  const put = putter(id)
  const peak =
    source?.peak === undefined
      ? 'not stated'
      : `${amount(source.peak, 'VA')}${source.peak_time === undefined ? '' : ` for ${amount(source.peak_time, 's')}`}`
  return [
    put(
      'island',
      'In the island',
      source ? amount(source.continuous, 'VA') : 'forms no island',
      source ? `peak ${peak}` : undefined,
    ),
    put('fault_current', 'Fault current', amountOr(source?.fault_current, 'A', 'not stated'), 'from the datasheet'),
    put(
      'shuts_down',
      'Shuts down within',
      amountOr(source?.shuts_down_within, 's', 'not stated'),
      'after a fault in the island',
    ),
    put(
      'held_back',
      'Charge held back',
      amountOr(settings?.held_back_charge, '%', 'not stated'),
      `low-charge alarm at ${amountOr(settings?.low_charge_alarm, '%', 'no stated charge')}`,
    ),
    put(
      'read_back',
      'Settings',
      settings?.read_back === true ? 'read back from the inverter' : 'not read back',
      settings?.country_profile,
    ),
    verdictEntry(`inverter/${id}/verdict`, scene.verdicts.of(id)),
  ]
}

/** Settings of the interface protection: name, title, unit, the book's parameter, decimals at least. */
export const PROTECTION_SETTINGS = [
  ['u_high', 'Overvoltage', 'V', 'interface_u_high', 0],
  ['u_low', 'Undervoltage', 'V', 'interface_u_low', 0],
  ['f_high', 'Overfrequency', 'Hz', 'interface_f_high', 1],
  ['f_low', 'Underfrequency', 'Hz', 'interface_f_low', 1],
  ['reconnect_after', 'Waits before it reconnects', 's', 'reconnect_after', 0],
] as const

function settingRow(
  scene: ReportScene,
  id: string,
  inverter: Inverter,
  [name, title, unit, parameter, least]: (typeof PROTECTION_SETTINGS)[number],
): Row {
  const set = inverter.interface_protection?.[name]
  const asked = scene.judged.book.parameters[parameter]
  const wanted = { fields: [name] }
  return {
    anchor: `inverter/${id}/setting/${name}`,
    ...(scene.verdicts.fails(id, wanted) && { look: 'row-fails' as const }),
    head: { text: title },
    cells: [
      { text: set === undefined ? 'not stated' : `${decimals(set, least)}\u00a0${unit}` },
      { text: asked === null ? 'left to the operator' : `${decimals(asked, least)}\u00a0${unit}` },
      scene.verdicts.cell(id, wanted, `inverter/${id}/setting/${name}/verdict`),
    ],
  }
}

function inverterBlocks(scene: ReportScene, id: string, inverter: Inverter): Block[] {
  const columns = [
    { label: 'Interface protection', width: 34 },
    { label: 'Set to', width: 20, align: 'num' as const },
    { label: 'Rule book', width: 24, align: 'num' as const },
    { label: 'Verdict', width: 22 },
  ]
  return [
    {
      kind: 'particulars',
      anchor: `inverter/${id}`,
      title: `Inverter ${id}`,
      beside: true,
      lists: [{ entries: machine(scene, id, inverter) }, { entries: island(scene, id, inverter) }],
    },
    table(`inverter/${id}/settings`, columns, [
      { rows: PROTECTION_SETTINGS.map((setting) => settingRow(scene, id, inverter, setting)) },
    ]),
  ]
}

/** Inverters: what they are, what they give in the island, and what their protection is set to. */
export function inverters(scene: ReportScene): Section {
  return {
    anchor: 'inverters',
    title: 'Inverter and settings',
    blocks: Object.entries(scene.install.inverters ?? {}).flatMap(([id, inverter]) =>
      inverterBlocks(scene, id, inverter),
    ),
  }
}
