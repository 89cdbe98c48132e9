import { protectedNodes } from './cable-distribution.ts'
import { knownNumber, nominalVoltage } from './circuit-item.ts'
import { distributionTime } from './disconnection-time.ts'
import { faultCurrentAlong, loopLimit, loopLimitMeasured } from './loop-impedance.ts'
import { usable } from './loop-reading.ts'
import { loopExpected, resistanceToDevice } from './loop-route.ts'
import type { OvercurrentItem } from './overcurrent-item.ts'
import { operatingCurrent } from './overcurrent-operating.ts'
import type { Quantity, Scene } from './quantity.ts'

function largestLoop(id: string, scene: Scene): number | undefined {
  const loops = protectedNodes(id, scene)
    .filter(({ kind }) => kind !== 'inverter')
    .map((node) => loopExpected(node.id, scene))
  const known = loops.filter((loop) => loop !== undefined)
  return known.length === 0 || known.length < loops.length ? undefined : Math.max(...known)
}

/** What an overcurrent device in the tree meets at a fault on the grid. */
export const overcurrentFaultQuantities: readonly Quantity<OvercurrentItem>[] = [
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
  {
    name: 'disconnection_time',
    unit: 's',
    title: 'Longest disconnection time of the distribution circuit',
    formula: '5 s in TN, 1 s in TT',
    source: 'IEC 60364-4-41, 411.3.2.3 and 411.3.2.4',
    from: ['supply.earthing'],
    compute: (_item, { install }) => distributionTime(install.supply.earthing),
  },
  {
    name: 'operating_current',
    unit: 'A',
    title: 'Operating current of the device Ia',
    formula: 'B 5 · In, C 10 · In, D 20 · In; fuse gG by the rule book’s table for 5 s',
    source:
      'IEC 60898-1; IEC 60269-1 as printed in the manual of a loop tester, p. 28; BS 88-2 by BS 7671:2018, Table 41.4',
    from: ['device', 'disconnection_time', 'book.fuse_currents'],
    compute: ({ device }, { install, parameters }) =>
      operatingCurrent(device.device, distributionTime(install.supply.earthing), parameters.fuse_currents),
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
    title: 'Highest fault-loop impedance, cold',
    formula: 'loop limit × factor of the rule book',
    source: 'IEC 60364-6, Annex D, 6.4.3.7.2',
    from: ['loop_limit', 'book.loop_reading_factor'],
    compute: (_item, { parameters }, known) => {
      const limit = knownNumber(known, 'loop_limit')
      return limit === undefined ? undefined : loopLimitMeasured(limit, parameters.loop_reading_factor)
    },
  },
  {
    name: 'loop_expected',
    unit: 'Ω',
    title: 'Largest expected fault-loop impedance of the cables that it protects, cold',
    formula: 'Ze + Σ(R1 + R2) to the far end',
    source: 'Zs = Ze + (R1 + R2): guidance on verification, as quoted in three trade texts',
    from: ['supply.loop_impedance', 'cables_protected'],
    compute: ({ id }, scene) => largestLoop(id, scene),
  },
]
