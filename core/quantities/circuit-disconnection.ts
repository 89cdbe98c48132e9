import { type CircuitItem, knownNumber } from './circuit-item.ts'
import { islandFaultCurrent, islandLoop, shutdownTime } from './disconnection-island.ts'
import { gridMeans, islandMeans } from './disconnection-means.ts'
import { loopReading } from './loop-route.ts'
import type { Quantity } from './quantity.ts'

/** By what a circuit is disconnected on the grid and in the island. */
export const circuitDisconnectionQuantities: readonly Quantity<CircuitItem>[] = [
  {
    name: 'fault_current_island',
    unit: 'A',
    title: 'Fault current to earth in the island',
    formula: "Σ fault currents of the island's inverters on the line, at most U0 / loop where the loop is known",
    source: 'datasheet of the inverter; IEC 60364-4-41:2005+A1:2017, 419 (from memory)',
    from: ['inverters.island.fault_current', 'readings.loop.island', 'cable', 'phases', 'supply.nominal.voltage'],
    compute: ({ id, circuit }, scene) => islandFaultCurrent(id, circuit.phases, scene),
  },
  {
    name: 'residual_protection',
    unit: '',
    title: 'Residual-current protection that sees a fault of the circuit',
    formula:
      'devices on the route of each state; in the island those between the inverters, the link to earth and the fault',
    source: 'own derivation from the wiring; devices must work in both states: Energy Safe Victoria, EIS 004',
    from: ['fed_from', 'residual_current', 'changeover.neutral_link'],
    compute: ({ id }, { topology }) => ({
      grid: topology.residualProtection(id, 'grid'),
      island: topology.residualProtection(id, 'island'),
    }),
  },
  {
    name: 'grid_disconnection',
    unit: '',
    title: 'Means of disconnection on the grid',
    formula: 'overcurrent where the loop is within the limit for a cold reading, else residual current, else none',
    source: 'IEC 60364-4-41, 411.4.4, 411.4.5 and 411.5',
    from: ['readings.loop.grid', 'loop_expected', 'loop_limit_measured', 'residual_protection'],
    compute: ({ id }, scene, known) =>
      gridMeans(
        loopReading(id, 'grid', scene) ?? knownNumber(known, 'loop_expected'),
        knownNumber(known, 'loop_limit_measured'),
        scene.topology.residualProtection(id, 'grid').length > 0,
      ),
  },
  {
    name: 'island_disconnection',
    unit: '',
    title: 'Means of disconnection in the island',
    formula:
      'overcurrent where the inverters drive Ia, else residual current, else shut-down of the source in time, else none',
    source: 'IEC 60364-4-41, 411.4.4 and 411.3.2.5 (the latter from memory)',
    from: [
      'fault_current_island',
      'operating_current',
      'residual_protection',
      'inverters.island.shuts_down_within',
      'disconnection_time',
    ],
    compute: ({ id }, scene, known) => {
      if (!scene.topology.live(id, 'island')) return undefined
      return islandMeans({
        current: knownNumber(known, 'fault_current_island'),
        operating: knownNumber(known, 'operating_current'),
        loopKnown: islandLoop(id, scene) !== undefined,
        residual: scene.topology.residualProtection(id, 'island').length > 0,
        shutdown: shutdownTime(scene),
        time: knownNumber(known, 'disconnection_time'),
      })
    },
  },
]
