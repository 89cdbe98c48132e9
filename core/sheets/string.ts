import type { StringReadings } from '#core/install/readings.ts'
import type { PvArray } from '#core/install.ts'
import type { Scene } from '#core/quantities/quantity.ts'
import { stringFamily } from '#core/quantities/string.ts'
import { entered, type MeasuredField, type SheetPlan } from './plan.ts'

/** One string of an array, `A1/1`: with its readings where there are any. */
export interface StringItem {
  readonly id: string
  readonly arrayId: string
  readonly array: PvArray
  /** From 0. */
  readonly index: number
  readonly readings: StringReadings | undefined
}

function stringsOf(arrayId: string, array: PvArray, { install }: Scene): StringItem[] {
  return Array.from({ length: array.strings }, (_, index) => {
    const readings = install.readings?.arrays?.[arrayId]?.strings?.[index]
    return {
      id: `${arrayId}/${index + 1}`,
      arrayId,
      array,
      index,
      readings: readings && !('not_tested' in readings) ? readings : undefined,
    }
  })
}

const readingPath = ({ arrayId, index }: StringItem, name: string) => [
  'readings',
  'arrays',
  arrayId,
  'strings',
  index,
  name,
]

function stringReading(
  name: 'voc' | 'isc' | 'irradiance' | 'cell_temperature' | 'insulation',
  unit: string,
  title: string,
  kind: MeasuredField<StringItem>['kind'],
): MeasuredField<StringItem> {
  return {
    name,
    unit,
    title,
    kind,
    path: (item) => readingPath(item, name),
    reading: ({ readings }) => readings?.[name],
  }
}

/** What the rules see of a string. */
export const stringPlan: SheetPlan<StringItem> = {
  subject: 'string',
  items: (scene) => Object.entries(scene.install.arrays ?? {}).flatMap(([id, array]) => stringsOf(id, array, scene)),
  id: ({ id }) => id,
  path: ({ arrayId }) => ['arrays', arrayId],
  instrument: ({ arrayId }, { install }) => install.readings?.arrays?.[arrayId]?.with,
  quantities: stringFamily.quantities,
  entered: [
    entered('array', '', 'Array', [], ({ arrayId }) => arrayId),
    entered(
      'modules_in_series',
      '',
      'Modules in series',
      ['modules_in_series'],
      ({ array }) => array.modules_in_series,
    ),
    entered('strings', '', 'Strings in the array', ['strings'], ({ array }) => array.strings),
    entered(
      'polarity',
      '',
      'Polarity',
      (item) => readingPath(item, 'polarity'),
      ({ readings }) => readings?.polarity,
    ),
    entered(
      'taken',
      '',
      'When it was read',
      (item) => readingPath(item, 'taken'),
      ({ readings }) => readings?.taken,
    ),
    entered(
      'insulation_tested_at',
      'V',
      'Test voltage used',
      (item) => readingPath(item, 'insulation'),
      ({ readings }) => {
        const insulation = readings?.insulation
        return insulation && 'value' in insulation ? insulation.at : undefined
      },
    ),
    entered(
      'string_spread_floor',
      '%',
      'How far below a string may lie',
      [],
      (_, { parameters }) => -parameters.string_spread,
    ),
    entered('read', '', 'Has readings', [], ({ readings }) => readings !== undefined),
  ],
  measured: [
    stringReading('voc', 'V', 'Open-circuit voltage', 'array_voltage'),
    stringReading('isc', 'A', 'Short-circuit current', 'array_current'),
    stringReading('irradiance', 'W/m²', 'Irradiance in the plane', 'irradiance'),
    stringReading('cell_temperature', '°C', 'Cell temperature', 'irradiance'),
    stringReading('insulation', 'MΩ', 'Insulation resistance', 'insulation'),
  ],
}
