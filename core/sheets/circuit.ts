import type { CircuitReadings } from '#core/install/readings.ts'
import type { Circuit } from '#core/install.ts'
import { circuitFamily } from '#core/quantities/circuit.ts'
import type { Scene } from '#core/quantities/quantity.ts'
import { fromTree } from './place.ts'
import { entered, type SheetPlan } from './plan.ts'
import { additionalResidual, residualIds } from './protection.ts'

export interface CircuitItem {
  readonly id: string
  readonly circuit: Circuit
}

const readingsOf = ({ id }: CircuitItem, { install }: Scene): CircuitReadings | undefined =>
  install.readings?.circuits?.[id]

const readingPath = ({ id }: CircuitItem, ...rest: string[]) => ['readings', 'circuits', id, ...rest]

/** What the rules see of a circuit. */
export const circuitPlan: SheetPlan<CircuitItem> = {
  subject: 'circuit',
  items: ({ install }) => Object.entries(install.circuits ?? {}).map(([id, circuit]) => ({ id, circuit })),
  id: ({ id }) => id,
  path: ({ id }) => ['circuits', id],
  instrument: (item, scene) => readingsOf(item, scene)?.with,
  quantities: circuitFamily.quantities,
  entered: [
    entered('serves', '', 'What it serves', ['serves'], ({ circuit }) => circuit.serves),
    entered('fed_from', '', 'What feeds it', ['fed_from'], ({ circuit }) => circuit.fed_from),
    entered('lines', '', 'Line conductors', ['phases'], ({ circuit }) => circuit.phases),
    entered('phases', '', 'Count of line conductors', ['phases'], ({ circuit }) => circuit.phases.length),
    entered(
      'supply_phases',
      '',
      'Line conductors of the supply',
      ['phases'],
      (_, { install }) => install.supply.nominal.phases,
    ),
    entered('backed_up', '', 'Lives on in the island', ['fed_from'], ({ id }, scene) => fromTree(id, scene)?.backedUp),
    entered('earthing_system', '', 'Earthing system', ['fed_from'], (_, { install }) => install.supply.earthing),
    entered('premises', '', 'Kind of premises', ['serves'], (_, { install }) => install.site.premises),
    entered('device_kind', '', 'Kind of device', ['device'], ({ circuit }) => circuit.device.kind),
    entered('device_curve', '', 'Characteristic', ['device'], ({ circuit }) => circuit.device.curve),
    entered(
      'breaking_capacity',
      'A',
      'Breaking capacity of the device',
      ['device', 'breaking'],
      ({ circuit }) => circuit.device.breaking,
    ),
    entered('line_size', 'mm²', 'Line conductor', ['cable'], ({ circuit }) => circuit.cable.line),
    entered('neutral_size', 'mm²', 'Neutral conductor', ['cable'], ({ circuit }) => circuit.cable.neutral),
    entered('protective_size', 'mm²', 'Protective conductor', ['cable'], ({ circuit }) => circuit.cable.protective),
    entered('cable_cores', '', 'Cores of the cable', ['cable'], ({ circuit }) => circuit.cable.cores),
    entered('cable_material', '', 'Conductor material', ['cable'], ({ circuit }) => circuit.cable.material),
    entered(
      'cable_insulation',
      '',
      'Insulation of the cable',
      ['cable', 'insulation'],
      ({ circuit }) => circuit.cable.insulation,
    ),
    entered(
      'cable_method',
      '',
      'Reference method of installation',
      ['cable', 'method'],
      ({ circuit }) => circuit.cable.method,
    ),
    entered('cable_length', 'm', 'Length of the cable', ['cable', 'length'], ({ circuit }) => circuit.cable.length),
    entered('sockets', '', 'Has socket-outlets', ['sockets'], ({ circuit }) => circuit.sockets ?? false),
    entered('lighting', '', 'Lighting circuit', ['lighting'], ({ circuit }) => circuit.lighting ?? false),
    entered('load_power', 'W', 'Power of the load', ['load', 'power'], ({ circuit }) => circuit.load?.power),
    entered('load_current', 'A', 'Current of the load', ['load', 'current'], ({ circuit }) => circuit.load?.current),
    entered('power_factor', '', 'Power factor', ['load', 'power_factor'], ({ circuit }) => circuit.load?.power_factor),
    entered('start', '', 'Starting current, as a multiple', ['load', 'start'], ({ circuit }) => circuit.load?.start),
    entered(
      'must_run',
      '',
      'Must run in the island',
      ['load', 'must_run'],
      ({ circuit }) => circuit.load?.must_run ?? false,
    ),
    entered(
      'daily_energy',
      'Wh',
      'Energy in a day',
      ['load', 'daily_energy'],
      ({ circuit }) => circuit.load?.daily_energy,
    ),
    entered(
      'polarity',
      '',
      'Polarity',
      (item) => readingPath(item, 'polarity'),
      (item, scene) => readingsOf(item, scene)?.polarity,
    ),
    entered(
      'insulation_tested_at',
      'V',
      'Test voltage used',
      (item) => readingPath(item, 'insulation'),
      (item, scene) => {
        const reading = readingsOf(item, scene)?.insulation
        return reading && 'value' in reading ? reading.at : undefined
      },
    ),
    entered(
      'additional_protection',
      'mA',
      'Lowest rated residual current on the way',
      ['fed_from'],
      ({ id, circuit }, scene) => additionalResidual(id, circuit, scene, 'grid'),
    ),
  ],
  inState: [
    {
      name: 'live',
      unit: '',
      title: 'Live',
      at: ['fed_from'],
      value: ({ id }, { topology }, state) => topology.live(id, state),
    },
    {
      name: 'protected_by',
      unit: '',
      title: 'Residual-current protection on the way',
      at: ['fed_from'],
      value: ({ id, circuit }, scene, state) => residualIds(id, circuit, scene, state),
    },
    {
      name: 'residual_available',
      unit: '',
      title: 'Has residual-current protection',
      at: ['fed_from'],
      value: ({ id, circuit }, scene, state) => residualIds(id, circuit, scene, state).length > 0,
    },
    {
      name: 'smallest_residual',
      unit: 'mA',
      title: 'Lowest rated residual current on the way',
      at: ['fed_from'],
      value: ({ id, circuit }, scene, state) => additionalResidual(id, circuit, scene, state),
    },
    {
      name: 'neutral_earth_links',
      unit: '',
      title: 'Links between neutral and earth',
      at: [],
      value: (_, { topology }, state) => topology.neutralEarthLinks[state].length,
    },
  ],
  measured: [
    {
      name: 'continuity',
      unit: 'Ω',
      title: 'Continuity R1 + R2',
      kind: 'continuity',
      path: (item) => readingPath(item, 'continuity'),
      reading: (item, scene) => readingsOf(item, scene)?.continuity,
    },
    {
      name: 'insulation',
      unit: 'MΩ',
      title: 'Insulation resistance',
      kind: 'insulation',
      path: (item) => readingPath(item, 'insulation'),
      reading: (item, scene) => readingsOf(item, scene)?.insulation,
    },
  ],
  measuredInState: [
    {
      name: 'loop',
      unit: 'Ω',
      title: 'Fault-loop impedance',
      kind: 'loop',
      path: (item, state) => readingPath(item, 'loop', state),
      reading: (item, scene, state) => readingsOf(item, scene)?.loop?.[state],
    },
  ],
}
