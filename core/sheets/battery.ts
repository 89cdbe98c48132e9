import type { Battery } from '#core/install/battery.ts'
import { batteryFamily } from '#core/quantities/battery.ts'
import { powerTogether } from '#core/quantities/battery-power.ts'
import { entered, type SheetPlan } from './plan.ts'

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
