import type { PvArray } from '#core/install.ts'
import { arrayFamily } from '#core/quantities/array.ts'
import { entered, type SheetPlan } from './plan.ts'

export interface ArrayItem {
  readonly id: string
  readonly array: PvArray
}

/** What the rules see of an array. */
export const arrayPlan: SheetPlan<ArrayItem> = {
  subject: 'array',
  items: ({ install }) => Object.entries(install.arrays ?? {}).map(([id, array]) => ({ id, array })),
  id: ({ id }) => id,
  path: ({ id }) => ['arrays', id],
  quantities: arrayFamily.quantities,
  entered: [
    entered(
      'modules_in_series',
      '',
      'Modules in series',
      ['modules_in_series'],
      ({ array }) => array.modules_in_series,
    ),
    entered('strings', '', 'Strings in parallel', ['strings'], ({ array }) => array.strings),
    entered('module_voc', 'V', 'Open-circuit voltage of a module', ['module', 'voc'], ({ array }) => array.module.voc),
    entered('module_isc', 'A', 'Short-circuit current of a module', ['module', 'isc'], ({ array }) => array.module.isc),
    entered(
      'module_vmp',
      'V',
      'Voltage of a module at its maximum power',
      ['module', 'vmp'],
      ({ array }) => array.module.vmp,
    ),
    entered(
      'module_imp',
      'A',
      'Current of a module at its maximum power',
      ['module', 'imp'],
      ({ array }) => array.module.imp,
    ),
    entered('module_pmax', 'W', 'Maximum power of a module', ['module', 'pmax'], ({ array }) => array.module.pmax),
    entered(
      'voc_coefficient',
      '%/K',
      'Temperature coefficient of the open-circuit voltage',
      ['module', 'voc_coefficient'],
      ({ array }) => array.module.voc_coefficient,
    ),
    entered(
      'vmp_coefficient',
      '%/K',
      'Temperature coefficient of the voltage at maximum power',
      ['module', 'vmp_coefficient'],
      ({ array }) => array.module.vmp_coefficient,
    ),
    entered(
      'isc_coefficient',
      '%/K',
      'Temperature coefficient of the short-circuit current',
      ['module', 'isc_coefficient'],
      ({ array }) => array.module.isc_coefficient,
    ),
    entered(
      'module_max_fuse',
      'A',
      'Highest series fuse of a module',
      ['module', 'max_fuse'],
      ({ array }) => array.module.max_fuse,
    ),
    entered(
      'rated_power_deviation',
      '%',
      'Voltage times current at maximum power, from the stated power',
      ['module', 'pmax'],
      ({ array: { module } }) => {
        const { vmp, imp, pmax } = module
        return vmp === undefined || imp === undefined || pmax === undefined
          ? undefined
          : ((vmp * imp - pmax) / pmax) * 100
      },
    ),
    entered(
      'max_input_voltage',
      'V',
      'Highest input voltage of the inverter',
      ['max_input_voltage'],
      ({ array }) => array.max_input_voltage,
    ),
    entered(
      'mpp_minimum_voltage',
      'V',
      "Start of the inverter's maximum-power-point window",
      ['into'],
      ({ array }, { install }) => install.inverters?.[array.into]?.mpp_minimum_voltage,
    ),
    entered('string_fuse', 'A', 'String fuse fitted', ['string_fuse'], ({ array }) => array.string_fuse),
    entered(
      'lowest_temperature',
      '°C',
      'Lowest temperature at the site',
      [],
      (_, { install }) => install.site.lowest_temperature,
    ),
    entered(
      'strings_read',
      '',
      'Strings with readings',
      [],
      ({ id }, { install }) => install.readings?.arrays?.[id]?.strings?.length ?? 0,
    ),
    entered(
      'has_readings',
      '',
      'Has readings',
      [],
      ({ id }, { install }) => install.readings?.arrays?.[id] !== undefined,
    ),
  ],
}
