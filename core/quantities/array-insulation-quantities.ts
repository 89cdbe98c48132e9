import type { PvArray } from '#core/install.ts'
import { insulationTestOf, systemVoltage } from './array-insulation.ts'
import type { Quantity } from './quantity.ts'

/** What insulation is tested with and held against, alike for an array and for each of its strings. */
export function arrayInsulationQuantities<Item extends { readonly array: PvArray }>(): Quantity<Item>[] {
  const from = [
    'modules_in_series',
    'module.voc',
    'book.array_band',
    'book.array_band_factor',
    'site.position.altitude',
  ]
  const source = 'IEC 62446-1:2016+A1:2018, 6.7, as printed for EN 62446-1:2019 by a Swiss test house'
  return [
    {
      name: 'system_voltage',
      unit: 'V',
      title: 'System voltage that selects the test voltage',
      formula:
        'N · Voc · factor of the rule book, or · kT by altitude: 1.15 up to 800 m, 1.20 up to 1500 m, 1.25 above',
      source: 'the rule book; kT as printed by a Swiss test house',
      from,
      compute: ({ array }, scene) => systemVoltage(array, scene),
    },
    {
      name: 'insulation_test_voltage',
      unit: 'V',
      title: 'Test voltage for the insulation resistance',
      formula: '250 V below 120 V, 500 V up to 500 V, 1000 V up to 1000 V, 1500 V above',
      source,
      from: ['system_voltage'],
      compute: ({ array }, scene) => insulationTestOf(array, scene)?.voltage,
    },
    {
      name: 'insulation_minimum',
      unit: 'MΩ',
      title: 'Smallest insulation resistance',
      formula: '0.5 MΩ below 120 V, 1 MΩ from there',
      source,
      from: ['system_voltage'],
      compute: ({ array }, scene) => insulationTestOf(array, scene)?.minimum,
    },
  ]
}
