import type { Supply } from '#core/install.ts'
import { cablesProtected, smallestCapacity } from './cable-distribution.ts'
import { mostLoadedLine } from './circuit-network.ts'
import { faultCurrent } from './loop-impedance.ts'
import { usable } from './loop-reading.ts'
import { conventionalOperatingCurrent } from './overcurrent-operating.ts'
import type { Family } from './quantity.ts'

function earthFaultCurrent({ nominal, loop_impedance }: Supply): number | undefined {
  const loop = usable(loop_impedance)
  return loop === undefined ? undefined : faultCurrent(nominal.voltage, loop)
}

/** Everything computed for the supply. */
export const supplyFamily: Family<Supply> = {
  subject: 'supply',
  quantities: [
    {
      name: 'line_voltage',
      unit: 'V',
      title: 'Nominal voltage between lines',
      formula: '√3 · U0 on three-phase, U0 on single-phase',
      source: 'definition',
      from: ['nominal.voltage', 'nominal.phases'],
      compute: ({ nominal }) => (nominal.phases === 3 ? Math.sqrt(3) * nominal.voltage : nominal.voltage),
    },
    {
      name: 'main_rating',
      unit: 'A',
      title: 'Rating of the main protection',
      formula: 'as stated',
      source: 'IEC 60364-4-43, 433.1',
      from: ['main_protection'],
      compute: ({ main_protection }) => main_protection.rated,
    },
    {
      name: 'conventional_operating_current',
      unit: 'A',
      title: 'Conventional operating current of the main protection I2',
      formula: 'breaker 1.45 · In; fuse gG 1.6 · In from 16 A, 1.9 · In from 6 A',
      source: 'IEC 60898-1; IEC 60364-4-43, 433.1 (fuses from 16 A from memory)',
      from: ['main_protection'],
      compute: ({ main_protection }) => conventionalOperatingCurrent(main_protection),
    },
    {
      name: 'through_current',
      unit: 'A',
      title: 'Load of the installation on its most loaded line',
      formula: 'largest over the lines of Σ design currents of the circuits whose load is stated',
      source: 'own choice, without diversity',
      from: ['circuits'],
      compute: (_supply, scene) => mostLoadedLine('supply', scene).current,
    },
    {
      name: 'earth_fault_current',
      unit: 'A',
      title: 'Fault current to earth at the origin',
      formula: 'U0 / Ze',
      source: 'IEC 60364-4-41, 411.4.4',
      from: ['nominal.voltage', 'loop_impedance'],
      compute: earthFaultCurrent,
    },
    {
      name: 'earth_fault_current_floor',
      unit: 'A',
      title: 'Lowest fault current that agrees with the loop impedance',
      formula: '0.9 × U0 / Ze',
      source: 'common practice: own band',
      from: ['earth_fault_current'],
      compute: (supply) => {
        const current = earthFaultCurrent(supply)
        return current === undefined ? undefined : 0.9 * current
      },
    },
    {
      name: 'fault_current_highest',
      unit: 'A',
      title: 'Highest known prospective fault current at the origin',
      formula: 'larger of the stated fault current and U0 / Ze',
      source: 'the larger value counts for the breaking capacity (from memory)',
      from: ['fault_current', 'earth_fault_current'],
      compute: (supply) => {
        const known = [usable(supply.fault_current), earthFaultCurrent(supply)].filter(
          (current) => current !== undefined,
        )
        return known.length === 0 ? undefined : Math.max(...known)
      },
    },
    {
      name: 'cables_protected',
      unit: '',
      title: 'What the cables that the main protection protects lead to',
      formula: 'nodes with a cable down to the next overcurrent device',
      source: 'the tree of supply',
      from: ['boards', 'changeover.cable', 'residual_current', 'inverters'],
      compute: (_supply, scene) => cablesProtected('supply', scene),
    },
    {
      name: 'smallest_cable_capacity',
      unit: 'A',
      title: 'Smallest capacity Iz of the cables that the main protection protects',
      formula: 'least of It × Ca × Cg over those cables',
      source: 'IEC 60364-5-52, 523; IEC 60364-4-43, 433.1',
      from: ['cables_protected'],
      compute: (_supply, scene) => smallestCapacity('supply', scene),
    },
  ],
}
