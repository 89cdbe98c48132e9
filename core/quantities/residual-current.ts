import type { ResidualCurrentDevice } from '#core/install.ts'
import { distributionCableQuantities } from './cable-distribution.ts'
import { mostLoadedLine } from './circuit-network.ts'
import { electrodeLimit } from './earthing-minimum.ts'
import { upstreamDevice } from './overcurrent-upstream.ts'
import type { Family, Quantity, Scene } from './quantity.ts'
import { longestTripTime, rampBand, shortestTripTime, type TestMultiple } from './residual-current-bands.ts'

interface Item {
  readonly id: string
  readonly device: ResidualCurrentDevice
}

const TIME_SOURCE = 'IEC 61008-1, Table 1, as printed in a tester manual'
const RAMP_SOURCE = 'EN 61008-1 for types AC and A; F as A; B from memory'

function tripTimes(name: string, multiple: TestMultiple, words: string): Quantity<Item>[] {
  const book = multiple === 'double' ? ['book.delayed_minimum_double'] : []
  return [
    {
      name: `time_limit_${name}`,
      unit: 'ms',
      title: `Longest trip time at ${words}`,
      formula: 'by the table, general or time-delayed',
      source: TIME_SOURCE,
      from: ['delay'],
      compute: ({ device }) => longestTripTime(device, multiple),
    },
    {
      name: `time_minimum_${name}`,
      unit: 'ms',
      title: `Shortest trip time at ${words}, time-delayed only`,
      formula: 'by the table',
      source: multiple === 'double' ? 'the rule book: publications differ' : TIME_SOURCE,
      from: ['delay', ...book],
      compute: ({ device }, { parameters }) => shortestTripTime(device, multiple, parameters.delayed_minimum_double),
    },
  ]
}

/** The nearest residual-current device of the tree above another one. */
function upstreamResidual(id: string, { install, topology }: Scene): ResidualCurrentDevice | undefined {
  const above = topology.routeIn(id, 'grid').slice(0, -1)
  const nearest = above.findLast(({ kind }) => kind === 'residual-current device')
  return nearest && install.residual_current?.[nearest.id]
}

/** Everything computed for a residual-current device. */
export const residualCurrentFamily: Family<Item> = {
  subject: 'residual-current device',
  quantities: [
    ...tripTimes('rated', 'rated', 'its rated residual current'),
    ...tripTimes('double', 'double', 'twice its rated residual current'),
    ...tripTimes('five_times', 'five times', 'five times its rated residual current'),
    {
      name: 'ramp_minimum',
      unit: 'mA',
      title: 'Lowest trip current under a rising residual current',
      formula: 'AC and B 0.5 · IΔn, A and F 0.35 · IΔn',
      source: RAMP_SOURCE,
      from: ['type', 'residual'],
      compute: ({ device }) => rampBand(device).lowest,
    },
    {
      name: 'ramp_maximum',
      unit: 'mA',
      title: 'Highest trip current under a rising residual current',
      formula: 'AC 1.0 · IΔn, A and F 1.4 · IΔn (up to 10 mA 2.0 · IΔn), B 2.0 · IΔn',
      source: RAMP_SOURCE,
      from: ['type', 'residual'],
      compute: ({ device }) => rampBand(device).highest,
    },
    {
      name: 'electrode_limit',
      unit: 'Ω',
      title: 'Highest resistance of the electrode that it protects with',
      formula: 'UL / IΔn',
      source: 'IEC 60364-4-41, 411.5.3',
      from: ['residual', 'book.touch_voltage'],
      compute: ({ device }, { parameters }) => electrodeLimit(parameters.touch_voltage, device.residual),
    },
    {
      name: 'upstream_residual',
      unit: 'mA',
      title: 'Rated residual current of the next such device upstream',
      formula: 'nearest residual-current device above on the grid',
      source: 'the tree of supply',
      from: ['fed_from', 'residual_current'],
      compute: ({ id }, scene) => upstreamResidual(id, scene)?.residual,
    },
    {
      name: 'upstream_delayed',
      unit: '',
      title: 'The next such device upstream is time-delayed',
      formula: 'delay S of the nearest residual-current device above on the grid',
      source: 'the tree of supply',
      from: ['fed_from', 'residual_current'],
      compute: ({ id }, scene) => {
        const upstream = upstreamResidual(id, scene)
        return upstream && upstream.delay === 'S'
      },
    },
    {
      name: 'upstream_residual_needed',
      unit: 'mA',
      title: 'Rated residual current that a selective device upstream needs',
      formula: '3 × IΔn',
      source: 'IEC 61008-1 practice as printed in a switchgear catalogue, p. 119',
      from: ['residual'],
      compute: ({ device }) => 3 * device.residual,
    },
    {
      name: 'load_current',
      unit: 'A',
      title: 'Load below it on the most loaded line',
      formula: 'largest over the lines of Σ design currents of the circuits below whose load is stated',
      source: 'own choice, without diversity',
      from: ['circuits', 'fed_from'],
      compute: ({ id }, scene) => mostLoadedLine(id, scene).current,
    },
    {
      name: 'upstream_rating',
      unit: 'A',
      title: 'Rating of the overcurrent device upstream',
      formula: 'the nearest overcurrent device above, else the main protection',
      source: 'the tree of supply',
      from: ['fed_from', 'overcurrent', 'supply.main_protection'],
      compute: ({ id }, scene) => upstreamDevice(id, scene).rated,
    },
    ...distributionCableQuantities<Item>(({ id }) => id),
  ],
}
