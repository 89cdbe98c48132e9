import type { Inverter } from '#core/install.ts'
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
