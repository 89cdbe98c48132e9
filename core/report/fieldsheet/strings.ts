import type { NotTested } from '#core/glossary.ts'
import type { StringReadings } from '#core/install/readings.ts'
import type { PvArray } from '#core/install.ts'
import { type Block, type Row, table } from '../blocks.ts'
import { rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { pointCell, wordCell } from './points.ts'

const WIDTH = { irradiance: 14, cell_temperature: 14, voc: 15, isc: 15, insulation: 18, polarity: 15 } as const

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
    pointCell(
      {
        anchor: `point/string/${id}/${name}`,
        name: `${name} of ${id}`,
        unit,
        limit,
        measured: read?.[name] ?? reason,
        least,
      },
      WIDTH[name],
    )
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
      wordCell(
        {
          anchor: `point/string/${id}/polarity`,
          name: `polarity of ${id}`,
          word: read?.polarity ?? reason?.not_tested,
          limit: 'correct',
        },
        WIDTH.polarity,
      ),
    ],
  }
}

const COLUMNS = [
  { label: 'String', width: 9 },
  { label: 'Light', unit: 'W/m²', width: WIDTH.irradiance },
  { label: 'Cells', unit: '°C', width: WIDTH.cell_temperature },
  { label: 'V_oc', unit: 'V', width: WIDTH.voc },
  { label: 'I_sc', unit: 'A', width: WIDTH.isc },
  { label: 'Insulation', unit: 'MΩ', width: WIDTH.insulation },
  { label: 'Polarity', width: WIDTH.polarity },
] as const

/** What is read on the strings, in daylight and with the inverter off. */
export function stringPoints(scene: ReportScene): Block[] {
  return Object.entries(scene.install.arrays ?? {}).map(([id, array]: [string, PvArray]) => {
    const rows = Array.from({ length: array.strings }, (_, index) => stringRow(scene, id, index))
    return table(`point/array/${id}`, COLUMNS, [{ rows }], `Array ${id}`)
  })
}
