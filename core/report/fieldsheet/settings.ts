import type { Inverter } from '#core/install.ts'
import { type Block, table } from '../blocks.ts'
import { distinct } from '../names.ts'
import { amount, decimals } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { PROTECTION_SETTINGS } from '../sections/inverters.ts'
import { type WordPoint, wordCell } from './points.ts'

/** Something to look up, set or try: what is expected stands beside it. */
interface Check extends WordPoint {
  readonly expected: string
}

const FOUND = 26

function changeoverChecks(scene: ReportScene): Check[] {
  const { id, signals = [], neutral_opens: word } = scene.install.changeover
  const opensNeutral = scene.value(id, 'switched_poles') === 'all poles'
  const names = distinct(signals.map(({ role }) => role))
  return [
    ...(opensNeutral
      ? [
          {
            anchor: `point/changeover/${id}/neutral-opens`,
            name: 'Neutral contact opens',
            expected: 'not before the lines',
            word,
          },
        ]
      : []),
    ...signals.map(({ role, terminal, configured }, index) => ({
      anchor: `point/changeover/${id}/signal/${names[index]}`,
      name: `Signal ${role}, tried on and off`,
      expected: `wired to ${terminal}, set to ${configured}`,
      word: undefined,
    })),
  ]
}

function meterChecks({ install: { meter } }: ReportScene): Check[] {
  if (!meter) return []
  const { id, direction: word } = meter
  return [
    {
      anchor: `point/meter/${id}/direction`,
      name: `Meter ${id}, direction`,
      expected: 'the sign follows a load that is switched',
      word,
    },
  ]
}

/** What an inverter is set to; a value that is not stated is written down on site. */
function settingsOf({ interface_protection, settings }: Inverter): [name: string, title: string, value: string][] {
  const stated = (value: number | undefined, unit: string) =>
    value === undefined ? 'write it down' : amount(value, unit)
  return [
    ['island_voltage', 'voltage in the island', stated(settings?.island_voltage, 'V')],
    ['held_back_charge', 'charge held back', stated(settings?.held_back_charge, '%')],
    ['low_charge_alarm', 'low-charge alarm', stated(settings?.low_charge_alarm, '%')],
    ...PROTECTION_SETTINGS.flatMap(([name, title, unit, , least]): [string, string, string][] => {
      const value = interface_protection?.[name]
      return value === undefined ? [] : [[name, title.toLowerCase(), `${decimals(value, least)}\u00a0${unit}`]]
    }),
  ]
}

function inverterChecks({ install }: ReportScene): Check[] {
  return Object.entries(install.inverters ?? {}).flatMap(([id, inverter]) =>
    settingsOf(inverter).map(([name, title, expected]) => ({
      anchor: `point/inverter/${id}/${name}`,
      name: `${id}, ${title}`,
      expected,
      word: inverter.settings?.read_back === true ? 'read back' : undefined,
    })),
  )
}

/** Signals, settings and the meter's direction: what is proved by trying it and by reading it back. */
export function settingPoints(scene: ReportScene): Block[] {
  const checks = [...changeoverChecks(scene), ...meterChecks(scene), ...inverterChecks(scene)]
  const rows = checks.map(({ expected, ...point }) => ({
    anchor: `${point.anchor}/row`,
    head: { text: point.name },
    cells: [{ text: expected }, wordCell(point, FOUND)],
  }))
  const columns = [
    { label: 'To prove', width: 40 },
    { label: 'Expected', width: 34 },
    { label: 'Found', width: FOUND },
  ]
  return [table('point/settings', columns, [{ rows }])]
}
