import { lineAndReturn } from './cable-resistance.ts'
import { type CircuitItem, knownNumber, nominalVoltage } from './circuit-item.ts'
import { derived } from './derived.ts'
import { disconnectionTime } from './disconnection-time.ts'
import { faultCurrent, faultCurrentAlong, loopLimit, loopLimitMeasured } from './loop-impedance.ts'
import { usable } from './loop-reading.ts'
import { loopExpected, loopReading, resistanceToDevice } from './loop-route.ts'
import { operatingCurrent } from './overcurrent-operating.ts'
import type { Quantity } from './quantity.ts'

/** What a fault to earth has to drive, what it meets, and what it draws on the grid. */
export const circuitLoopQuantities: readonly Quantity<CircuitItem>[] = [
  {
    name: 'disconnection_time',
    unit: 's',
    title: 'Longest disconnection time',
    formula: 'Table 41.1 for sockets up to 63 A and fixed equipment up to 32 A; else 5 s in TN, 1 s in TT',
    source: 'IEC 60364-4-41, Table 41.1, 411.3.2.2 to 411.3.2.4',
    from: ['supply.earthing', 'supply.nominal.voltage', 'device', 'sockets'],
    compute: ({ circuit }, scene) =>
      disconnectionTime(
        scene.install.supply.earthing,
        nominalVoltage(scene),
        circuit.device.rated,
        circuit.sockets ?? false,
      ),
  },
  {
    name: 'operating_current',
    unit: 'A',
    title: 'Operating current of the device Ia',
    formula: 'B 5 · In, C 10 · In, D 20 · In; fuse gG by the rule book’s table for 0.4 s or 5 s',
    source:
      'IEC 60898-1; IEC 60269-1 as printed in the manual of a loop tester, p. 28; BS 88-2 by BS 7671:2018, Tables 41.2 and 41.4',
    from: ['device', 'disconnection_time', 'book.fuse_currents'],
    compute: ({ circuit }, { parameters }, known) => {
      const time = knownNumber(known, 'disconnection_time')
      return time === undefined ? undefined : operatingCurrent(circuit.device, time, parameters.fuse_currents)
    },
  },
  {
    name: 'loop_limit',
    unit: 'Ω',
    title: 'Highest fault-loop impedance',
    formula: 'U0 · c / Ia',
    source: 'IEC 60364-4-41, 411.4.4',
    from: ['operating_current', 'supply.nominal.voltage', 'book.loop_voltage_factor'],
    compute: (_item, scene, known) => {
      const operating = knownNumber(known, 'operating_current')
      if (operating === undefined) return undefined
      return loopLimit(nominalVoltage(scene), scene.parameters.loop_voltage_factor, operating)
    },
  },
  {
    name: 'loop_limit_measured',
    unit: 'Ω',
    title: 'Highest fault-loop reading, taken cold',
    formula: 'loop limit × factor of the rule book',
    source: 'IEC 60364-6, Annex D, 6.4.3.7.2',
    from: ['loop_limit', 'book.loop_reading_factor'],
    compute: (_item, { parameters }, known) => {
      const limit = knownNumber(known, 'loop_limit')
      return limit === undefined ? undefined : loopLimitMeasured(limit, parameters.loop_reading_factor)
    },
  },
  {
    name: 'continuity_expected',
    unit: 'Ω',
    title: 'Expected R1 + R2 at 20 °C',
    formula: '(r1 + r2) · L',
    source: 'IEC 60228',
    from: ['cable.line', 'cable.protective', 'cable.length', 'cable.conductor_class', 'cable.material'],
    compute: ({ circuit }) => lineAndReturn(circuit.cable, 'protective'),
  },
  derived(
    {
      name: 'continuity_highest',
      unit: 'Ω',
      title: 'Highest continuity reading that length and size explain',
      formula: '1.5 × continuity expected + 0.1 Ω for terminals and the way inside boards',
      source: 'common practice: own band, no standard gives one',
    },
    'continuity_expected',
    (expected) => 1.5 * expected + 0.1,
  ),
  derived(
    {
      name: 'continuity_lowest',
      unit: 'Ω',
      title: 'Lowest continuity reading that length and size explain',
      formula: '0.5 × continuity expected',
      source: 'common practice: own band, no standard gives one',
    },
    'continuity_expected',
    (expected) => 0.5 * expected,
  ),
  {
    name: 'loop_expected',
    unit: 'Ω',
    title: 'Expected fault-loop impedance on the grid, cold',
    formula: 'Ze + Σ(R1 + R2) of the route',
    source: 'Zs = Ze + (R1 + R2): guidance on verification, as quoted in three trade texts',
    from: ['supply.loop_impedance', 'continuity_expected', 'fed_from'],
    compute: ({ id }, scene) => loopExpected(id, scene),
  },
  derived(
    {
      name: 'loop_highest',
      unit: 'Ω',
      title: 'Highest loop reading that supply and cables explain',
      formula: '1.5 × loop expected + 0.1 Ω',
      source: 'common practice: own band, no standard gives one',
    },
    'loop_expected',
    (expected) => 1.5 * expected + 0.1,
  ),
  derived(
    {
      name: 'loop_lowest',
      unit: 'Ω',
      title: 'Lowest loop reading that supply and cables explain',
      formula: '0.5 × loop expected',
      source: 'common practice: own band, no standard gives one',
    },
    'loop_expected',
    (expected) => 0.5 * expected,
  ),
  {
    name: 'fault_current_grid',
    unit: 'A',
    title: 'Fault current to earth on the grid',
    formula: 'U0 / loop reading on the grid; without one, U0 / expected loop',
    source: 'IEC 60364-4-41, 411.4.4',
    from: ['readings.loop.grid', 'loop_expected', 'supply.nominal.voltage'],
    compute: ({ id }, scene, known) => {
      const loop = loopReading(id, 'grid', scene) ?? knownNumber(known, 'loop_expected')
      return loop === undefined ? undefined : faultCurrent(nominalVoltage(scene), loop)
    },
  },
  {
    name: 'fault_current_at_device',
    unit: 'A',
    title: 'Prospective fault current at the device',
    formula: 'U0 / √((U0 / Ipf)² + (ΣR)²), R of line and better return of the cables above, cold',
    source: 'Z = √(ΣR² + ΣX²): short-circuit study after IEC 60909; source taken as reactive, on the safe side',
    from: ['supply.fault_current', 'supply.nominal.voltage', 'fed_from'],
    compute: ({ id }, scene) => {
      const origin = usable(scene.install.supply.fault_current)
      const resistance = resistanceToDevice(id, scene)
      if (origin === undefined || resistance === undefined) return undefined
      return faultCurrentAlong(nominalVoltage(scene), origin, resistance)
    },
  },
]
