import type { Bus, Meter } from '#core/install/meter.ts'
import { busFamily } from '#core/quantities/bus.ts'
import { meterFamily } from '#core/quantities/meter.ts'
import { entered, type SheetPlan } from './plan.ts'

/** What the rules see of the meter at the connection point. */
export const meterPlan: SheetPlan<Meter> = {
  subject: 'meter',
  items: ({ install }) => (install.meter ? [install.meter] : []),
  id: ({ id }) => id,
  path: () => ['meter'],
  quantities: meterFamily.quantities,
  entered: [
    entered('place', '', 'Place', ['at'], (meter) => meter.at),
    entered('rated_current', 'A', 'Rated current', ['rated_current'], (meter) => meter.rated_current),
    entered('direction', '', 'Direction of counting', ['direction'], (meter) => meter.direction),
    entered(
      'neutral_reference',
      '',
      'Where its measuring neutral is taken',
      ['neutral_reference'],
      (meter) => meter.neutral_reference,
    ),
    entered('has_link', '', 'Linked to the inverter', ['link'], (meter) => meter.link !== undefined),
    entered(
      'main_rated',
      'A',
      'Rating of the main protection',
      ['rated_current'],
      (_, { install }) => install.supply.main_protection.rated,
    ),
  ],
}

/** What the rules see of the meter's link. */
export const busPlan: SheetPlan<{ readonly meter: Meter; readonly bus: Bus }> = {
  subject: 'bus',
  items: ({ install: { meter } }) => (meter?.link ? [{ meter, bus: meter.link }] : []),
  id: ({ meter }) => `${meter.id}/link`,
  path: () => ['meter', 'link'],
  quantities: busFamily.quantities,
  entered: [
    entered('kind', '', 'Kind of link', ['kind'], ({ bus }) => bus.kind),
    entered('address', '', 'Address', ['address'], ({ bus }) => bus.address),
    entered('address_shared', '', 'Address used by another device', ['address'], ({ bus }) =>
      bus.address === undefined ? undefined : (bus.other_addresses ?? []).includes(bus.address),
    ),
    entered('terminated_at', '', 'Ends with a terminating resistor', ['terminated_at'], ({ bus }) => bus.terminated_at),
    entered('terminators', '', 'Terminating resistors', ['terminated_at'], ({ bus }) => bus.terminated_at?.length),
    entered('length', 'm', 'Length', ['length'], ({ bus }) => bus.length),
    entered('length_limit', 'm', 'Longest that the datasheet allows', ['length_limit'], ({ bus }) => bus.length_limit),
  ],
  measured: [
    {
      name: 'measured_across',
      unit: 'Ω',
      title: 'Resistance across the pair',
      kind: 'bus_resistance',
      path: () => ['meter', 'link', 'measured_across'],
      reading: ({ bus }) => bus.measured_across,
    },
  ],
}
