import { circuitCableQuantities } from './circuit-cable.ts'
import { circuitDisconnectionQuantities } from './circuit-disconnection.ts'
import { circuitDropQuantities } from './circuit-drop.ts'
import type { CircuitItem } from './circuit-item.ts'
import { circuitLoopQuantities } from './circuit-loop.ts'
import { circuitNeutralQuantities } from './circuit-neutral.ts'
import { circuitProtectiveQuantities } from './circuit-protective.ts'
import type { Family } from './quantity.ts'

/** Everything computed for a circuit; later entries draw on earlier ones. */
export const circuitFamily: Family<CircuitItem> = {
  subject: 'circuit',
  quantities: [
    ...circuitCableQuantities,
    ...circuitDropQuantities,
    ...circuitLoopQuantities,
    ...circuitDisconnectionQuantities,
    ...circuitProtectiveQuantities,
    ...circuitNeutralQuantities,
  ],
}
