import type { StringReadings } from '#core/install/readings.ts'
import type { PvArray } from '#core/install.ts'
import { arrayInsulationQuantities } from './array-insulation-quantities.ts'
import { knownNumber } from './circuit-item.ts'
import { usable } from './loop-reading.ts'
import type { Family, Quantity } from './quantity.ts'
import { deviation, modulesMissing, percentFrom, type StringReadingName } from './string-spread.ts'
import { currentAtStc, expectedCurrent, expectedVoltage, voltageAtStc } from './string-translation.ts'
import { sunPosition } from './sun.ts'

interface Item {
  readonly id: string
  readonly arrayId: string
  readonly array: PvArray
  readonly readings: StringReadings | undefined
}

const FIELD = 'a field procedure for string readings'
const WORDS = { voc: 'Open-circuit voltage', isc: 'Short-circuit current' } as const

/** A value that follows from the array's datasheet and the string's readings. */
function translated(
  words: Omit<Quantity<Item>, 'compute' | 'source'>,
  value: (array: PvArray, readings: StringReadings) => number | undefined,
): Quantity<Item> {
  return { ...words, source: FIELD, compute: ({ array, readings }) => readings && value(array, readings) }
}

function fromMedian(name: StringReadingName): Quantity<Item> {
  return {
    name: `${name}_deviation`,
    unit: '%',
    title: `${WORDS[name]}: deviation from the median of its array`,
    formula: '100 · (x − median) / median, of values at standard test conditions where all strings read have them',
    source: 'IEC 62446-1, 6.4 and 6.5, from memory; the median is own choice',
    from: [name, 'irradiance', 'cell_temperature'],
    compute: ({ array, arrayId, readings }, scene) => readings && deviation(array, arrayId, readings, name, scene),
  }
}

function fromExpected(name: StringReadingName): Quantity<Item> {
  return {
    name: `${name}_from_expected`,
    unit: '%',
    title: `${WORDS[name]}: deviation from the datasheet`,
    formula: '100 · (x − expected) / expected',
    source: 'definition',
    from: [name, `${name}_expected`],
    compute: ({ readings }, _scene, known) => {
      const expected = knownNumber(known, `${name}_expected`)
      const value = usable(readings?.[name])
      return expected === undefined || value === undefined ? undefined : percentFrom(value, expected)
    },
  }
}

/** Everything computed for a string. */
export const stringFamily: Family<Item> = {
  subject: 'string',
  quantities: [
    translated(
      {
        name: 'voc_expected',
        unit: 'V',
        title: 'Open-circuit voltage to be expected',
        formula: 'N · Voc · (1 + β · (Tc − 25 °C))',
        from: ['modules_in_series', 'module.voc', 'module.voc_coefficient', 'cell_temperature'],
      },
      expectedVoltage,
    ),
    translated(
      {
        name: 'isc_expected',
        unit: 'A',
        title: 'Short-circuit current to be expected',
        formula: 'Isc · G / 1000 W/m² · (1 + α · (Tc − 25 °C))',
        from: ['module.isc', 'module.isc_coefficient', 'irradiance', 'cell_temperature'],
      },
      expectedCurrent,
    ),
    translated(
      {
        name: 'voc_at_stc',
        unit: 'V',
        title: 'Open-circuit voltage at standard test conditions',
        formula: 'Voc / (1 + β · (Tc − 25 °C))',
        from: ['voc', 'module.voc_coefficient', 'cell_temperature'],
      },
      voltageAtStc,
    ),
    translated(
      {
        name: 'isc_at_stc',
        unit: 'A',
        title: 'Short-circuit current at standard test conditions',
        formula: 'Isc · (1000 W/m² / G) / (1 + α · (Tc − 25 °C))',
        from: ['isc', 'module.isc_coefficient', 'irradiance', 'cell_temperature'],
      },
      currentAtStc,
    ),
    fromMedian('voc'),
    fromMedian('isc'),
    fromExpected('voc'),
    fromExpected('isc'),
    {
      name: 'missing_module_voltage',
      unit: '%',
      title: 'What one module is of the voltage',
      formula: '100 / N',
      source: 'own derivation',
      from: ['modules_in_series'],
      compute: ({ array }) => 100 / array.modules_in_series,
    },
    {
      name: 'modules_missing_estimate',
      unit: '',
      title: 'Modules that the string seems to be short of',
      formula: 'deviation of the voltage from the datasheet, below it, in whole modules',
      source: 'own derivation',
      from: ['voc_from_expected', 'modules_in_series'],
      compute: ({ array }, _scene, known) => {
        const short = knownNumber(known, 'voc_from_expected')
        return short === undefined ? undefined : modulesMissing(short, array.modules_in_series)
      },
    },
    {
      name: 'sun_elevation',
      unit: '°',
      title: 'Height of the sun when it was read',
      formula: 'at the stated time and the position of the site',
      source: 'suncalc 2.0.2 after Meeus, Astronomical Algorithms',
      from: ['site.position', 'taken'],
      compute: ({ readings }, { install: { site } }) =>
        readings?.taken === undefined || site.position === undefined
          ? undefined
          : sunPosition(new Date(readings.taken), site.position).elevation,
    },
    ...arrayInsulationQuantities<Item>(),
  ],
}
