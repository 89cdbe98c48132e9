import type { Battery, Inverter, PvArray } from '#core/install.ts'
import { arrayFamily } from '#core/quantities/array.ts'
import { batteryFamily } from '#core/quantities/battery.ts'
import { powerTogether } from '#core/quantities/battery-power.ts'
import { inverterFamily } from '#core/quantities/inverter.ts'
import { entered, type SheetPlan } from './plan.ts'

export interface InverterItem {
  readonly id: string
  readonly inverter: Inverter
}

/** What the rules see of an inverter. */
export const inverterPlan: SheetPlan<InverterItem> = {
  subject: 'inverter',
  items: ({ install }) => Object.entries(install.inverters ?? {}).map(([id, inverter]) => ({ id, inverter })),
  id: ({ id }) => id,
  path: ({ id }) => ['inverters', id],
  quantities: inverterFamily.quantities,
  entered: [
    entered('phases', '', 'Line conductors fed', ['phases'], ({ inverter }) => inverter.phases),
    entered('line', '', 'Line fed by a single-phase inverter', ['line'], ({ inverter }) => inverter.line),
    entered(
      'supply_phases',
      '',
      'Line conductors of the supply',
      ['phases'],
      (_, { install }) => install.supply.nominal.phases,
    ),
    entered('rated_power', 'VA', 'Rated power', ['rated_power'], ({ inverter }) => inverter.rated_power),
    entered('forms_island', '', 'Feeds the island', ['fed_from'], ({ id }, { topology }) =>
      topology.inverters.island.includes(id),
    ),
    entered(
      'island_continuous',
      'VA',
      'Continuous power in the island',
      ['island', 'continuous'],
      ({ inverter }) => inverter.island?.continuous,
    ),
    entered(
      'island_peak',
      'VA',
      'Peak power in the island',
      ['island', 'peak'],
      ({ inverter }) => inverter.island?.peak,
    ),
    entered(
      'island_peak_time',
      's',
      'For how long',
      ['island', 'peak_time'],
      ({ inverter }) => inverter.island?.peak_time,
    ),
    entered(
      'island_fault_current',
      'A',
      'Fault current in the island',
      ['island', 'fault_current'],
      ({ inverter }) => inverter.island?.fault_current,
    ),
    entered(
      'shuts_down_within',
      's',
      'Shuts down after a fault within',
      ['island', 'shuts_down_within'],
      ({ inverter }) => inverter.island?.shuts_down_within,
    ),
    entered(
      'residual_monitoring',
      '',
      'Residual-current monitoring',
      ['residual_monitoring'],
      ({ inverter }) => inverter.residual_monitoring,
    ),
    entered(
      'separation',
      '',
      'Separation between d.c. and a.c.',
      ['separation'],
      ({ inverter }) => inverter.separation,
    ),
    entered(
      'neutral_link',
      '',
      'Link between neutral and earth',
      ['neutral_link'],
      ({ inverter }) => inverter.neutral_link,
    ),
    entered(
      'has_interface_protection',
      '',
      'Interface protection stated',
      ['interface_protection'],
      ({ inverter }) => inverter.interface_protection !== undefined,
    ),
    entered(
      'u_high',
      'V',
      'Overvoltage setting',
      ['interface_protection', 'u_high'],
      ({ inverter }) => inverter.interface_protection?.u_high,
    ),
    entered(
      'u_low',
      'V',
      'Undervoltage setting',
      ['interface_protection', 'u_low'],
      ({ inverter }) => inverter.interface_protection?.u_low,
    ),
    entered(
      'f_high',
      'Hz',
      'Overfrequency setting',
      ['interface_protection', 'f_high'],
      ({ inverter }) => inverter.interface_protection?.f_high,
    ),
    entered(
      'f_low',
      'Hz',
      'Underfrequency setting',
      ['interface_protection', 'f_low'],
      ({ inverter }) => inverter.interface_protection?.f_low,
    ),
    entered(
      'reconnect_after',
      's',
      'Waits before it reconnects',
      ['interface_protection', 'reconnect_after'],
      ({ inverter }) => inverter.interface_protection?.reconnect_after,
    ),
    entered(
      'island_voltage',
      'V',
      'Island voltage set',
      ['settings', 'island_voltage'],
      ({ inverter }) => inverter.settings?.island_voltage,
    ),
    entered(
      'nominal_voltage',
      'V',
      'Nominal voltage of the supply',
      ['settings', 'island_voltage'],
      (_, { install }) => install.supply.nominal.voltage,
    ),
    entered(
      'held_back_charge',
      '%',
      'Charge held back for the island',
      ['settings', 'held_back_charge'],
      ({ inverter }) => inverter.settings?.held_back_charge,
    ),
    entered(
      'low_charge_alarm',
      '%',
      'Low-charge alarm',
      ['settings', 'low_charge_alarm'],
      ({ inverter }) => inverter.settings?.low_charge_alarm,
    ),
    entered(
      'country_profile',
      '',
      'Country profile',
      ['settings', 'country_profile'],
      ({ inverter }) => inverter.settings?.country_profile,
    ),
    entered(
      'read_back',
      '',
      'Settings read back',
      ['settings', 'read_back'],
      ({ inverter }) => inverter.settings?.read_back,
    ),
    entered(
      'mpp_minimum_voltage',
      'V',
      'Start of its maximum-power-point window',
      ['mpp_minimum_voltage'],
      ({ inverter }) => inverter.mpp_minimum_voltage,
    ),
    entered('batteries', '', 'Batteries on it', [], ({ id }, { install }) =>
      Object.entries(install.batteries ?? {})
        .filter(([, battery]) => battery.into === id)
        .map(([name]) => name),
    ),
    entered('arrays', '', 'Arrays on it', [], ({ id }, { install }) =>
      Object.entries(install.arrays ?? {})
        .filter(([, array]) => array.into === id)
        .map(([name]) => name),
    ),
  ],
}

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

export interface BatteryItem {
  readonly id: string
  readonly battery: Battery
}

/** What the rules see of a battery. */
export const batteryPlan: SheetPlan<BatteryItem> = {
  subject: 'battery',
  items: ({ install }) => Object.entries(install.batteries ?? {}).map(([id, battery]) => ({ id, battery })),
  id: ({ id }) => id,
  path: ({ id }) => ['batteries', id],
  quantities: batteryFamily.quantities,
  entered: [
    entered('chemistry', '', 'Chemistry', ['chemistry'], ({ battery }) => battery.chemistry),
    entered('usable', 'Wh', 'Usable energy', ['usable'], ({ battery }) => battery.usable),
    entered('max_discharge', 'W', 'Highest discharge power', ['max_discharge'], ({ battery }) => battery.max_discharge),
    entered('efficiency', '%', 'Efficiency from charge to a.c.', ['efficiency'], ({ battery }) => battery.efficiency),
    entered('place', '', 'Place', ['place'], ({ battery }) => battery.place),
    entered(
      'distance_to_opening',
      'm',
      'Distance to the nearest opening',
      ['distance_to_opening'],
      ({ battery }) => battery.distance_to_opening,
    ),
    entered('premises', '', 'Kind of premises', ['place'], (_, { install }) => install.site.premises),
    entered('backed_up_load', 'W', 'Backed-up load', [], (_, scene) => powerTogether(scene, () => true)),
  ],
}
