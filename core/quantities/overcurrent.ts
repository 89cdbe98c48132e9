import { cablesProtected, distributionCableQuantities, smallestCapacity } from './cable-distribution.ts'
import { mostLoadedLine } from './circuit-network.ts'
import { overcurrentFaultQuantities } from './overcurrent-fault.ts'
import type { OvercurrentItem } from './overcurrent-item.ts'
import { conventionalOperatingCurrent } from './overcurrent-operating.ts'
import { upstreamDevice } from './overcurrent-upstream.ts'
import type { Family } from './quantity.ts'

/** Everything computed for an overcurrent device in the tree. */
export const overcurrentFamily: Family<OvercurrentItem> = {
  subject: 'overcurrent device',
  quantities: [
    {
      name: 'upstream_rating',
      unit: 'A',
      title: 'Rating of the next overcurrent device upstream',
      formula: 'the nearest overcurrent device above, else the main protection',
      source: 'the tree of supply',
      from: ['fed_from', 'overcurrent', 'supply.main_protection'],
      compute: ({ id }, scene) => upstreamDevice(id, scene).rated,
    },
    {
      name: 'selectivity_ratio',
      unit: '',
      title: 'Rating upstream as a multiple of its own, fuses gG only',
      formula: 'upstream rating / In',
      source: 'gG fuses are selective from 1.6 to 1: application guidance of a fuse maker',
      from: ['upstream_rating', 'device'],
      compute: ({ id, device }, scene) => {
        const upstream = upstreamDevice(id, scene)
        const fuses = upstream.kind === 'fuse' && device.device.kind === 'fuse'
        return fuses ? upstream.rated / device.device.rated : undefined
      },
    },
    {
      name: 'through_current',
      unit: 'A',
      title: 'Load below it on the most loaded line',
      formula: 'largest over the lines of Σ design currents of the circuits below whose load is stated',
      source: 'own choice, without diversity',
      from: ['circuits', 'fed_from'],
      compute: ({ id }, scene) => mostLoadedLine(id, scene).current,
    },
    {
      name: 'conventional_operating_current',
      unit: 'A',
      title: 'Conventional operating current I2',
      formula: 'breaker 1.45 · In; fuse gG 1.6 · In from 16 A, 1.9 · In from 6 A',
      source: 'IEC 60898-1; IEC 60364-4-43, 433.1 (fuses from 16 A from memory)',
      from: ['device'],
      compute: ({ device }) => conventionalOperatingCurrent(device.device),
    },
    {
      name: 'cables_protected',
      unit: '',
      title: 'What the cables that it protects lead to',
      formula: 'nodes with a cable from here down to the next overcurrent device',
      source: 'the tree of supply',
      from: ['fed_from', 'cable'],
      compute: ({ id }, scene) => cablesProtected(id, scene),
    },
    {
      name: 'smallest_cable_capacity',
      unit: 'A',
      title: 'Smallest capacity Iz of the cables that it protects',
      formula: 'least of It × Ca × Cg over those cables',
      source: 'IEC 60364-5-52, 523; IEC 60364-4-43, 433.1',
      from: ['cables_protected', 'cable'],
      compute: ({ id }, scene) => smallestCapacity(id, scene),
    },
    ...distributionCableQuantities<OvercurrentItem>(({ id }) => id),
    ...overcurrentFaultQuantities,
  ],
}
