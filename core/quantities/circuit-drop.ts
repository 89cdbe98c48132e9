import { type CircuitItem, knownNumber, nominalVoltage } from './circuit-item.ts'
import type { Quantity } from './quantity.ts'
import { circuitDrop, circuitDropPercent, dropAbove } from './voltage-drop-route.ts'

const SOURCE = 'IEC 60364-5-52:2009, Annex G, as printed by S. Fassbinder, ep Elektropraktiker'

/** Voltage drop of a circuit, alone and from the origin. */
export const circuitDropQuantities: readonly Quantity<CircuitItem>[] = [
  {
    name: 'voltage_drop',
    unit: 'V',
    title: 'Voltage drop along the circuit',
    formula: 'b · (ρ1 · L/S · cosφ + λ · L · sinφ) · Ib, b = 1 on three lines, 2 otherwise',
    source: SOURCE,
    from: [
      'design_current',
      'load.power_factor',
      'cable.line',
      'cable.neutral',
      'cable.length',
      'book.copper_resistivity',
      'book.aluminium_resistivity',
      'book.conductor_reactance',
    ],
    compute: ({ circuit }, scene, known) => {
      const current = knownNumber(known, 'design_current')
      return current === undefined ? undefined : circuitDrop(circuit, current, scene)
    },
  },
  {
    name: 'voltage_drop_percent',
    unit: '%',
    title: 'Voltage drop along the circuit, in % of the nominal voltage',
    formula: '100 · u / U0',
    source: SOURCE,
    from: ['voltage_drop', 'supply.nominal.voltage'],
    compute: ({ circuit }, scene, known) => {
      const volts = knownNumber(known, 'voltage_drop')
      return volts === undefined ? undefined : circuitDropPercent(circuit, volts, nominalVoltage(scene))
    },
  },
  {
    name: 'voltage_drop_total_percent',
    unit: '%',
    title: 'Voltage drop from the origin, in % of the nominal voltage',
    formula:
      'own drop + Σ over the cables on the route, each at the design currents below it on the most loaded line, at most the rating of the device above',
    source: `${SOURCE}; loads of the cables above: own choice, without diversity`,
    from: [
      'voltage_drop_percent',
      'fed_from',
      'circuits',
      'boards',
      'overcurrent',
      'changeover.cable',
      'residual_current',
    ],
    compute: ({ id }, scene, known) => {
      const own = knownNumber(known, 'voltage_drop_percent')
      const above = dropAbove(id, scene)
      return own === undefined || above === undefined ? undefined : own + above
    },
  },
]
