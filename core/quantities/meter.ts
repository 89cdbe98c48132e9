import type { Meter } from '#core/install/meter.ts'
import { busQuantities } from './bus-electrical.ts'
import type { Family } from './quantity.ts'

/** Everything computed for the meter: what its link should show. */
export const meterFamily: Family<Meter> = {
  subject: 'meter',
  quantities: busQuantities<Meter>(({ link }) => link, 'link.'),
}
