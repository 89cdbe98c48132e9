import type { Bus } from '#core/install/meter.ts'
import { busQuantities } from './bus-electrical.ts'
import type { Family } from './quantity.ts'

/** Everything computed for the link between meter and inverter. */
export const busFamily: Family<{ readonly bus: Bus }> = {
  subject: 'bus',
  quantities: busQuantities<{ readonly bus: Bus }>(({ bus }) => bus, ''),
}
