import { adiabaticFactor, adiabaticMinimum, energyOf, protectiveConductorByTable } from './adiabatic.ts'
import { connectionOf } from './circuit-design-current.ts'
import { insulationTest } from './circuit-insulation.ts'
import { type CircuitItem, knownNumber, nominalVoltage } from './circuit-item.ts'
import type { Known, Quantity, Scene } from './quantity.ts'

function faultEnergy({ circuit }: CircuitItem, known: Known): number | undefined {
  if (circuit.device.let_through !== undefined) return circuit.device.let_through
  const current = knownNumber(known, 'fault_current_grid')
  const time = knownNumber(known, 'disconnection_time')
  return current === undefined || time === undefined ? undefined : energyOf(current, time)
}

function insulationOf({ circuit }: CircuitItem, scene: Scene) {
  const voltage = nominalVoltage(scene)
  return insulationTest(connectionOf(circuit) === 'line to neutral' ? voltage : Math.sqrt(3) * voltage)
}

/** Protective conductor and insulation of a circuit. */
export const circuitProtectiveQuantities: readonly Quantity<CircuitItem>[] = [
  {
    name: 'protective_conductor_minimum',
    unit: 'mm²',
    title: 'Smallest protective conductor by the adiabatic equation',
    formula:
      '√(I² · t) / k at the grid fault current and the disconnection time; √(let-through energy) / k where it is given',
    source: 'IEC 60364-5-54, 543.1.2 and Table 54.3',
    from: ['fault_current_grid', 'disconnection_time', 'device.let_through', 'cable.insulation', 'cable.material'],
    compute: (item, _scene, known) => {
      const k = adiabaticFactor(item.circuit.cable)
      const energy = faultEnergy(item, known)
      return k === undefined || energy === undefined ? undefined : adiabaticMinimum(energy, k)
    },
  },
  {
    name: 'protective_conductor_table',
    unit: 'mm²',
    title: 'Smallest protective conductor by the table',
    formula: 'S up to 16 mm², 16 mm² up to 35 mm², above that S/2 rounded up to a standard size',
    source: 'IEC 60364-5-54:2011, Table 54.2',
    from: ['cable.line'],
    compute: ({ circuit }) => protectiveConductorByTable(circuit.cable.line),
  },
  {
    name: 'insulation_minimum',
    unit: 'MΩ',
    title: 'Smallest insulation resistance',
    formula: 'table of nominal voltage',
    source: 'IEC 60364-6:2016, Table 6.1',
    from: ['supply.nominal.voltage', 'phases'],
    compute: (item, scene) => insulationOf(item, scene).minimum,
  },
  {
    name: 'insulation_test_voltage',
    unit: 'V',
    title: 'Test voltage for the insulation resistance',
    formula: 'table of nominal voltage',
    source: 'IEC 60364-6:2016, Table 6.1',
    from: ['supply.nominal.voltage', 'phases'],
    compute: (item, scene) => insulationOf(item, scene).voltage,
  },
]
