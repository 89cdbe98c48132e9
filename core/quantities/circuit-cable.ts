import { ambientFactor, capacity, groupingFactor, tabulatedCapacity } from './capacity.ts'
import { circuitDesignCurrent, connectionOf } from './circuit-design-current.ts'
import { type CircuitItem, knownNumber, nominalVoltage } from './circuit-item.ts'
import { derived } from './derived.ts'
import { conventionalOperatingCurrent } from './overcurrent-operating.ts'
import type { Quantity } from './quantity.ts'

function loadedConductors({ circuit }: CircuitItem): 2 | 3 {
  const connection = connectionOf(circuit)
  return connection === 'line to neutral' || connection === 'line to line' ? 2 : 3
}

/** Load, capacity and overload protection of a circuit. */
export const circuitCableQuantities: readonly Quantity<CircuitItem>[] = [
  {
    name: 'design_current',
    unit: 'A',
    title: 'Design current Ib',
    formula: 'P / (U0 · cosφ) on one line, P / (√3 · U · cosφ) on three; the stated current where there is one',
    source: 'IEC 60364-1, 311; definition of active power',
    from: ['load.power', 'load.current', 'load.power_factor', 'phases', 'supply.nominal.voltage'],
    compute: ({ circuit }, scene) => circuitDesignCurrent(circuit, nominalVoltage(scene)),
  },
  {
    name: 'tabulated_capacity',
    unit: 'A',
    title: 'Capacity of the cable by the table',
    formula: 'table of insulation, count of loaded conductors, size and reference method',
    source: 'IEC 60364-5-52:2009, Tables B.52.2 to B.52.5, as transcribed',
    from: ['cable.line', 'cable.insulation', 'cable.method', 'cable.material', 'phases'],
    compute: (item) => tabulatedCapacity(item.circuit.cable, loadedConductors(item)),
  },
  {
    name: 'ambient_factor',
    unit: '',
    title: 'Factor for the ambient temperature',
    formula: '√((θmax − θa) / (θmax − θref)), rounded to two decimals',
    source: 'IEC 60364-5-52:2009, Tables B.52.14 and B.52.15',
    from: ['cable.ambient', 'cable.insulation', 'cable.method'],
    compute: ({ circuit }) => ambientFactor(circuit.cable),
  },
  {
    name: 'grouping_factor',
    unit: '',
    title: 'Factor for circuits that lie together',
    formula: 'table of arrangement and count of circuits',
    source: 'IEC 60364-5-52:2009, Tables B.52.17 to B.52.19, as transcribed',
    from: ['cable.grouped', 'cable.method'],
    compute: ({ circuit }) => groupingFactor(circuit.cable),
  },
  {
    name: 'capacity',
    unit: 'A',
    title: 'Capacity of the cable as installed Iz',
    formula: 'It × Ca × Cg',
    source: 'IEC 60364-5-52, 523',
    from: ['tabulated_capacity', 'ambient_factor', 'grouping_factor'],
    compute: (_item, _scene, known) => {
      const [tabulated, ambient, grouping] = ['tabulated_capacity', 'ambient_factor', 'grouping_factor'].map((name) =>
        knownNumber(known, name),
      )
      if (tabulated === undefined || ambient === undefined || grouping === undefined) return undefined
      return capacity(tabulated, ambient, grouping)
    },
  },
  {
    name: 'device_rated',
    unit: 'A',
    title: 'Rating of the device In',
    formula: 'as stated',
    source: 'IEC 60364-4-43, 433.1',
    from: ['device'],
    compute: ({ circuit }) => circuit.device.rated,
  },
  {
    name: 'conventional_operating_current',
    unit: 'A',
    title: 'Conventional operating current I2',
    formula: 'breaker 1.45 · In; fuse gG 1.6 · In from 16 A, 1.9 · In from 6 A',
    source: 'IEC 60898-1; IEC 60364-4-43, 433.1 (fuses from 16 A from memory)',
    from: ['device'],
    compute: ({ circuit }) => conventionalOperatingCurrent(circuit.device),
  },
  derived(
    {
      name: 'overload_limit',
      unit: 'A',
      title: 'Highest conventional operating current that the cable bears',
      formula: '1.45 × Iz',
      source: 'IEC 60364-4-43, 433.1',
    },
    'capacity',
    (iz) => 1.45 * iz,
  ),
  {
    name: 'cores_needed',
    unit: '',
    title: 'Cores that lines, neutral and protective conductor need',
    formula: 'count of lines + 2',
    source: 'count',
    from: ['phases'],
    compute: ({ circuit }) => circuit.phases.length + 2,
  },
]
