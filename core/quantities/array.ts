import type { PvArray } from '#core/install.ts'
import { fuseMaximum, fuseNeeded } from './array-fuse.ts'
import { altitudeFactor } from './array-insulation.ts'
import { arrayInsulationQuantities } from './array-insulation-quantities.ts'
import { highestVoltage, lowestOperatingVoltage } from './array-voltage.ts'
import type { Family } from './quantity.ts'

interface Item {
  readonly id: string
  readonly array: PvArray
}

const FUSE_SOURCE = 'IEC 62548:2016, as reproduced for IS/IEC 62548'

/**
 * Power of an array at standard test conditions in W.
 *
 * @returns undefined where the module's power is not stated
 */
export function arrayPower({ modules_in_series, strings, module }: PvArray): number | undefined {
  return module.pmax === undefined ? undefined : modules_in_series * strings * module.pmax
}

/** Everything computed for an array. */
export const arrayFamily: Family<Item> = {
  subject: 'array',
  quantities: [
    {
      name: 'voc_maximum',
      unit: 'V',
      title: 'Highest open-circuit voltage',
      formula: 'N · Voc · (1 + β · (Tmin − 25 °C)); without a coefficient N · Voc · factor by temperature',
      source: 'IAEI Magazine (2019); factors of NEC 690.7(A) as transcribed by a trade page',
      from: ['modules_in_series', 'module.voc', 'module.voc_coefficient', 'site.lowest_temperature'],
      compute: ({ array }, { install }) => {
        const lowest = install.site.lowest_temperature
        return lowest === undefined ? undefined : highestVoltage(array, lowest)
      },
    },
    {
      name: 'vmp_minimum',
      unit: 'V',
      title: 'Lowest voltage at maximum power',
      formula: 'N · Vmp · (1 + βVmp · (Tmax − 25 °C))',
      source: 'a discussion of string sizing on a designers’ mailing list (2011)',
      from: ['modules_in_series', 'module.vmp', 'module.vmp_coefficient', 'site.highest_cell_temperature'],
      compute: ({ array }, { install }) => {
        const highest = install.site.highest_cell_temperature
        return highest === undefined ? undefined : lowestOperatingVoltage(array, highest)
      },
    },
    {
      name: 'current_maximum',
      unit: 'A',
      title: 'Current that its circuit must carry',
      formula: 'k · strings · Isc',
      source: 'NEC 690.8(A)(1), as taught in a course text; common practice',
      from: ['strings', 'module.isc', 'book.array_current_factor'],
      compute: ({ array }, { parameters }) => parameters.array_current_factor * array.strings * array.module.isc,
    },
    {
      name: 'power_stc',
      unit: 'W',
      title: 'Power at standard test conditions',
      formula: 'N · strings · Pmax',
      source: 'definition',
      from: ['modules_in_series', 'strings', 'module.pmax'],
      compute: ({ array }) => arrayPower(array),
    },
    {
      name: 'fuse_needed',
      unit: '',
      title: 'Strings need fuses',
      formula: '(strings − 1) · Isc > highest series fuse of the module',
      source: FUSE_SOURCE,
      from: ['strings', 'module.isc', 'module.max_fuse'],
      compute: ({ array }) => fuseNeeded(array),
    },
    {
      name: 'fuse_minimum',
      unit: 'A',
      title: 'Smallest string fuse',
      formula: 'k · Isc',
      source: FUSE_SOURCE,
      from: ['module.isc', 'book.string_fuse_floor'],
      compute: ({ array }, { parameters }) => parameters.string_fuse_floor * array.module.isc,
    },
    {
      name: 'fuse_maximum',
      unit: 'A',
      title: 'Largest string fuse',
      formula: 'k · Isc, at most the highest series fuse of the module',
      source: FUSE_SOURCE,
      from: ['module.isc', 'module.max_fuse', 'book.string_fuse_ceiling'],
      compute: ({ array }, { parameters }) => fuseMaximum(array, parameters.string_fuse_ceiling),
    },
    {
      name: 'altitude_factor',
      unit: '',
      title: 'Factor from open-circuit to system voltage by altitude',
      formula: '1.15 up to 800 m, 1.20 up to 1500 m, 1.25 above; only where the rule book goes by altitude',
      source: 'EN 62446-1:2019, Swiss practice, as printed by a test house',
      from: ['site.position.altitude', 'book.array_band'],
      compute: (_item, { install, parameters }) => {
        const altitude = install.site.position?.altitude
        return altitude === undefined || parameters.array_band === 'factor' ? undefined : altitudeFactor(altitude)
      },
    },
    ...arrayInsulationQuantities<Item>(),
  ],
}
