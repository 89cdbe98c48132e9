import type { Measured } from '#core/glossary.ts'
import type { EarthingArrangement } from '#core/install/earthing.ts'
import type { Supply } from '#core/install.ts'
import { earthingFamily } from '#core/quantities/earthing.ts'
import { supplyFamily } from '#core/quantities/supply.ts'
import { entered, type SheetPlan } from './plan.ts'

/** What the rules see of the supply. */
export const supplyPlan: SheetPlan<Supply> = {
  subject: 'supply',
  items: ({ install }) => [install.supply],
  id: () => 'supply',
  path: () => ['supply'],
  quantities: supplyFamily.quantities,
  entered: [
    entered('operator', '', 'Grid operator', ['operator'], (supply) => supply.operator),
    entered('earthing_system', '', 'Earthing system', ['earthing'], (supply) => supply.earthing),
    entered(
      'voltage',
      'V',
      'Nominal voltage, line to neutral',
      ['nominal', 'voltage'],
      (supply) => supply.nominal.voltage,
    ),
    entered('phases', '', 'Line conductors', ['nominal', 'phases'], (supply) => supply.nominal.phases),
    entered('frequency', 'Hz', 'Nominal frequency', ['nominal', 'frequency'], (supply) => supply.nominal.frequency),
    entered('main_kind', '', 'Kind of main protection', ['main_protection'], (supply) => supply.main_protection.kind),
    entered(
      'main_rated',
      'A',
      'Rating of the main protection',
      ['main_protection'],
      (supply) => supply.main_protection.rated,
    ),
    entered('rated_current', 'A', 'Rated current of the supply', ['rated_current'], (supply) => supply.rated_current),
    entered(
      'main_breaking',
      'A',
      'Breaking capacity of the main protection',
      ['main_protection', 'breaking'],
      (supply) => supply.main_protection.breaking,
    ),
    entered(
      'separation_required',
      '',
      'Poles that the operator wants opened',
      ['separation', 'required'],
      (supply) => supply.separation?.required,
    ),
    entered(
      'separation_stated_in',
      '',
      'Where the operator says so',
      ['separation', 'stated_in'],
      (supply) => supply.separation?.stated_in,
    ),
  ],
  measured: [
    {
      name: 'loop_impedance',
      unit: 'Ω',
      title: 'External fault-loop impedance Ze',
      kind: 'loop',
      path: () => ['supply', 'loop_impedance'],
      reading: (supply) => supply.loop_impedance,
    },
    {
      name: 'fault_current',
      unit: 'A',
      title: 'Prospective fault current at the origin',
      kind: 'loop',
      path: () => ['supply', 'fault_current'],
      reading: (supply) => supply.fault_current,
    },
  ],
}

/** How bad a reading is: the highest comes first, then one that was not taken for a stated reason, then a missing one. */
function badness(reading: Measured | undefined): number {
  if (reading === undefined) return -2
  return 'value' in reading ? reading.value : -1
}

/** Which main bond reads worst, so that one rule can judge them all; the first one where none was read. */
function worstBond({ bonding = [] }: EarthingArrangement): number {
  const scores = bonding.map(({ continuity }) => badness(continuity))
  return Math.max(0, scores.indexOf(Math.max(...scores)))
}

/** What the rules see of the earthing arrangement. */
export const earthingPlan: SheetPlan<EarthingArrangement> = {
  subject: 'earthing',
  items: ({ install }) => [install.earthing ?? {}],
  id: () => 'earthing',
  path: () => ['earthing'],
  quantities: earthingFamily.quantities,
  entered: [
    entered('earthing_system', '', 'Earthing system', [], (_, { install }) => install.supply.earthing),
    entered('electrode_kind', '', 'Kind of electrode', ['electrode', 'kind'], (earthing) => earthing.electrode?.kind),
    entered(
      'has_electrode',
      '',
      'Has an electrode of its own',
      ['electrode'],
      (earthing) => earthing.electrode !== undefined,
    ),
    entered(
      'earthing_conductor',
      'mm²',
      'Earthing conductor',
      ['earthing_conductor'],
      (earthing) => earthing.earthing_conductor,
    ),
    entered(
      'lightning_protection',
      '',
      'Lightning protection fitted',
      ['lightning_protection'],
      (earthing) => earthing.lightning_protection ?? false,
    ),
    entered('bonding_count', '', 'Bonded parts', ['bonding'], (earthing) => earthing.bonding?.length ?? 0),
    entered('bonding_smallest', 'mm²', 'Smallest main bonding conductor', ['bonding'], ({ bonding }) =>
      bonding && bonding.length > 0 ? Math.min(...bonding.map(({ size }) => size)) : undefined,
    ),
    entered('bonding_unread', '', 'Bonded parts that were left out', ['bonding'], ({ bonding = [] }) => {
      const unread = bonding.filter(({ continuity }) => continuity === undefined)
      return unread.length === bonding.length ? undefined : unread.map(({ to }) => to)
    }),
    entered(
      'neutral_switched',
      '',
      'The changeover opens the neutral',
      [],
      (_, { install }) => install.changeover.poles === 4 || install.changeover.poles === 2,
    ),
  ],
  measured: [
    {
      name: 'electrode_resistance',
      unit: 'Ω',
      title: 'Resistance of the electrode',
      kind: 'electrode',
      path: () => ['earthing', 'electrode', 'resistance'],
      reading: (earthing) => earthing.electrode?.resistance,
    },
    {
      name: 'bonding_continuity',
      unit: 'Ω',
      title: 'Highest continuity reading of the main bonding',
      kind: 'continuity',
      path: (earthing) => ['earthing', 'bonding', worstBond(earthing), 'continuity'],
      reading: (earthing) => earthing.bonding?.[worstBond(earthing)]?.continuity,
    },
  ],
}
