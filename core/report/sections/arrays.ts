import type { StringReadings } from '#core/install/readings.ts'
import type { PvArray } from '#core/install.ts'
import { type Block, type Entry, type Row, type Section, table } from '../blocks.ts'
import { verdictEntry } from '../entries.ts'
import { amount, amountOr, printed, readingText, rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { stringPlot } from '../string-plot.ts'

function moduleEntries(id: string, { module, orientation, modules_in_series, strings }: PvArray): Entry[] {
  const coefficient = (value: number | undefined) => amountOr(value, '%/K', 'not stated')
  return [
    { anchor: `array/${id}/size`, term: 'Size', detail: `${strings} × ${modules_in_series} modules` },
    {
      anchor: `array/${id}/module`,
      term: 'Module at STC',
      detail: `${amount(module.voc, 'V')} open, ${amount(module.isc, 'A')} short`,
      note: `at maximum power ${amountOr(module.vmp, 'V')}, ${amountOr(module.imp, 'A')}, ${amountOr(module.pmax, 'W')}`,
    },
    {
      anchor: `array/${id}/coefficients`,
      term: 'Coefficients',
      detail: `${coefficient(module.voc_coefficient)} voltage, ${coefficient(module.isc_coefficient)} current`,
    },
    {
      anchor: `array/${id}/orientation`,
      term: 'Orientation',
      detail: orientation ? `tilt ${orientation.tilt}°, azimuth ${orientation.azimuth}° from north` : 'not stated',
    },
  ]
}

function limitEntries(scene: ReportScene, id: string, array: PvArray): Entry[] {
  const show = (name: string, unit: string) => printed(scene.value(id, name), unit)
  const needed = scene.value(id, 'fuse_needed')
  return [
    {
      anchor: `array/${id}/voc_maximum`,
      term: 'Highest voltage',
      detail: show('voc_maximum', 'V'),
      note: `at ${amountOr(scene.install.site.lowest_temperature, '°C')}; the input takes ${amount(array.max_input_voltage, 'V')}`,
    },
    { anchor: `array/${id}/vmp_minimum`, term: 'Lowest voltage, hot', detail: show('vmp_minimum', 'V') },
    { anchor: `array/${id}/current_maximum`, term: 'Highest current', detail: show('current_maximum', 'A') },
    {
      anchor: `array/${id}/fuse`,
      term: 'String fuses',
      detail: array.string_fuse === undefined ? 'none fitted' : `${amount(array.string_fuse, 'A')} fitted`,
      note: needed === true ? `needed: ${show('fuse_minimum', 'A')} to ${show('fuse_maximum', 'A')}` : 'not needed',
    },
    {
      anchor: `array/${id}/insulation_minimum`,
      term: 'Insulation',
      detail: `at least ${show('insulation_minimum', 'MΩ')} at ${show('insulation_test_voltage', 'V')}`,
    },
    verdictEntry(`array/${id}/verdict`, scene.verdicts.of(id)),
  ]
}

function taken(readings: unknown): StringReadings | undefined {
  return readings !== undefined && typeof readings === 'object' && readings !== null && !('not_tested' in readings)
    ? (readings as StringReadings)
    : undefined
}

function stringRow(scene: ReportScene, arrayId: string, index: number): Row {
  const id = `${arrayId}/${index + 1}`
  const entry = scene.install.readings?.arrays?.[arrayId]?.strings?.[index]
  const read = taken(entry)
  const reason = entry && 'not_tested' in entry ? entry.not_tested : undefined
  const { verdicts } = scene
  const insulation = read?.insulation
  const at =
    insulation && 'value' in insulation && insulation.at !== undefined ? `at ${amount(insulation.at, 'V')}` : ''
  const cell = verdicts.cell(id, {}, `string/${id}/verdict`)
  return {
    anchor: `string/${id}`,
    ...(verdicts.fails(id, {}) && { look: 'row-fails' as const }),
    head: { text: id },
    cells: [
      {
        text: readingText(read?.irradiance, 0),
        note: read?.cell_temperature ? `${readingText(read.cell_temperature, 0)}\u00a0°C` : '',
      },
      {
        text: readingText(read?.voc, 0),
        note: `of ${rounded(scene.number(id, 'voc_expected'), 0)}`,
        anchor: `string/${id}/voc`,
      },
      { text: rounded(scene.number(id, 'voc_from_expected'), 1), anchor: `string/${id}/voc_from_expected` },
      {
        text: readingText(read?.isc, 1),
        note: `of ${rounded(scene.number(id, 'isc_expected'), 2)}`,
        anchor: `string/${id}/isc`,
      },
      { text: rounded(scene.number(id, 'isc_from_expected'), 1), anchor: `string/${id}/isc_from_expected` },
      { text: readingText(insulation, 0), note: at, anchor: `string/${id}/insulation` },
      { text: read?.polarity ?? '–', anchor: `string/${id}/polarity` },
      { ...cell, ...(reason !== undefined && { note: reason }) },
    ],
  }
}

const COLUMNS = [
  { label: 'String', width: 10 },
  { label: 'Light', unit: 'W/m²', width: 10, align: 'num' },
  { label: 'V_oc', unit: 'V', width: 11, align: 'num' },
  { label: 'off by', unit: '%', width: 9, align: 'num' },
  { label: 'I_sc', unit: 'A', width: 11, align: 'num' },
  { label: 'off by', unit: '%', width: 9, align: 'num' },
  { label: 'Insulation', unit: 'MΩ', width: 13, align: 'num' },
  { label: 'Polarity', width: 10 },
  { label: 'Verdict', width: 17 },
] as const

function arrayBlocks(scene: ReportScene, id: string, array: PvArray): Block[] {
  const rows = Array.from({ length: array.strings }, (_, index) => stringRow(scene, id, index))
  const plot = stringPlot(scene, id, array.strings)
  const instrument = scene.install.readings?.arrays?.[id]?.with ?? scene.install.readings?.with
  const read = scene.install.readings?.arrays?.[id] !== undefined
  return [
    {
      kind: 'particulars',
      anchor: `array/${id}`,
      title: `Array ${id}, into ${array.into}`,
      beside: true,
      lists: [{ entries: moduleEntries(id, array) }, { entries: limitEntries(scene, id, array) }],
    },
    ...(read
      ? [
          table(
            `array/${id}/strings`,
            COLUMNS,
            [{ rows }],
            `Strings of ${id}, read with ${instrument ?? 'an instrument that is not named'}`,
          ),
        ]
      : []),
    ...(plot === undefined
      ? []
      : [
          {
            kind: 'figure' as const,
            anchor: `array/${id}/plot`,
            svg: plot,
            caption: `Strings of ${id} against the datasheet at the light and temperature of the reading.`,
          },
        ]),
  ]
}

/** The arrays: what they can give, what they were read at, string by string. */
export function arrays(scene: ReportScene): Section {
  return {
    anchor: 'arrays',
    title: 'Photovoltaics',
    blocks: Object.entries(scene.install.arrays ?? {}).flatMap(([id, array]) => arrayBlocks(scene, id, array)),
  }
}
