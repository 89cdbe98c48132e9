import type { NotTested } from '#core/glossary.ts'
import type { PvArray, StringReadings } from '#core/install.ts'
import { type Block, type Row, table } from '../blocks.ts'
import { rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { pointCell, wordCell } from './points.ts'

function stringRow(scene: ReportScene, arrayId: string, index: number): Row {
  const id = `${arrayId}/${index + 1}`
  const entry: StringReadings | NotTested | undefined = scene.install.readings?.arrays?.[arrayId]?.strings?.[index]
  const reason = entry && 'not_tested' in entry ? entry : undefined
  const read = entry && !('not_tested' in entry) ? entry : undefined
  const point = (
    name: 'irradiance' | 'cell_temperature' | 'voc' | 'isc' | 'insulation',
    unit: string,
    limit: string,
    least: number,
  ) =>
    pointCell({
      anchor: `point/string/${id}/${name}`,
      name: `${name} of ${id}`,
      unit,
      limit,
      measured: read?.[name] ?? reason,
      least,
    })
  const expected = (name: string, unit: string) => {
    const value = scene.number(id, name)
    return value === undefined ? 'write it down' : `about ${rounded(value, unit === 'A' ? 1 : 0)}`
  }
  return {
    anchor: `point/string/${id}`,
    head: { text: id },
    cells: [
      point('irradiance', 'W/m²', '≥ 400', 0),
      point('cell_temperature', '°C', 'write it down', 0),
      point('voc', 'V', expected('voc_expected', 'V'), 0),
      point('isc', 'A', expected('isc_expected', 'A'), 1),
      point(
        'insulation',
        'MΩ',
        `≥ ${rounded(scene.number(id, 'insulation_minimum'), 1)} at ${rounded(scene.number(id, 'insulation_test_voltage'), 0)} V`,
        0,
      ),
      wordCell(`point/string/${id}/polarity`, `polarity of ${id}`, read?.polarity ?? reason?.not_tested, 'correct'),
    ],
  }
}

const COLUMNS = [
  { label: 'String', width: 10 },
  { label: 'Light', unit: 'W/m²', width: 14 },
  { label: 'Cells', unit: '°C', width: 12 },
  { label: 'V_oc', unit: 'V', width: 15 },
  { label: 'I_sc', unit: 'A', width: 15 },
  { label: 'Insulation', unit: 'MΩ', width: 18 },
  { label: 'Polarity', width: 16 },
] as const

/** What is read on the strings, in daylight and with the inverter off. */
export function stringPoints(scene: ReportScene): Block[] {
  return Object.entries(scene.install.arrays ?? {}).map(([id, array]: [string, PvArray]) => {
    const rows = Array.from({ length: array.strings }, (_, index) => stringRow(scene, id, index))
    return table(`point/array/${id}`, COLUMNS, [{ rows }], `Array ${id}`)
  })
}
