import type { State } from '#core/glossary.ts'
import type { ResidualTest } from '#core/install/readings.ts'
import type { OvercurrentDevice, ResidualCurrentDevice } from '#core/install.ts'
import { overcurrentFamily } from '#core/quantities/overcurrent.ts'
import type { Scene } from '#core/quantities/quantity.ts'
import { residualCurrentFamily } from '#core/quantities/residual-current.ts'
import { fromTree } from './place.ts'
import { entered, type SheetPlan, type StateMeasuredField } from './plan.ts'

export interface ResidualItem {
  readonly id: string
  readonly device: ResidualCurrentDevice
}

function testOf({ id }: ResidualItem, { install }: Scene, state: State): ResidualTest | undefined {
  const test = install.readings?.residual_current?.[id]?.[state]
  return test && !('not_tested' in test) ? test : undefined
}

function residualReading(
  name: keyof ResidualTest,
  unit: string,
  title: string,
  kind: 'residual_time' | 'residual_current',
): StateMeasuredField<ResidualItem> {
  return {
    name,
    unit,
    title,
    kind,
    path: ({ id }, state) => ['readings', 'residual_current', id, state, name],
    reading: (item, scene, state) => testOf(item, scene, state)?.[name],
  }
}

/** The kinds of residual-current device that the island's inverters ask for on their datasheets. */
function typesNeeded({ install, topology }: Scene): string[] {
  const types = topology.inverters.island.flatMap((id) => install.inverters?.[id]?.residual_type_needed ?? [])
  return [...new Set(types)]
}

/** What the rules see of a residual-current device. */
export const residualCurrentPlan: SheetPlan<ResidualItem> = {
  subject: 'residual-current device',
  items: ({ install }) => Object.entries(install.residual_current ?? {}).map(([id, device]) => ({ id, device })),
  id: ({ id }) => id,
  path: ({ id }) => ['residual_current', id],
  instrument: ({ id }, { install }) => install.readings?.residual_current?.[id]?.with,
  quantities: residualCurrentFamily.quantities,
  entered: [
    entered('type', '', 'Type', ['type'], ({ device }) => device.type),
    entered('rated_current', 'A', 'Rated current', ['rated_current'], ({ device }) => device.rated_current),
    entered('residual', 'mA', 'Rated residual current', ['residual'], ({ device }) => device.residual),
    entered('delayed', '', 'Time-delayed', ['delay'], ({ device }) => device.delay === 'S'),
    entered('backed_up', '', 'On the backed-up side', ['fed_from'], ({ id }, scene) => fromTree(id, scene)?.backedUp),
    entered(
      'feeds_changeover',
      '',
      'Upstream of the changeover',
      ['fed_from'],
      ({ id }, { install, topology }) => topology.nodes.get(install.changeover.id)?.route.includes(id) ?? false,
    ),
    entered('circuits_below', '', 'Circuits that it protects', ['fed_from'], ({ id }, { topology }) =>
      topology.circuitsBelow(id),
    ),
    entered('types_needed', '', "Types that the island's inverters ask for", ['type'], (_, scene) =>
      typesNeeded(scene),
    ),
    entered(
      'island_separation',
      '',
      "Separation between d.c. and a.c. in the island's inverters",
      ['type'],
      (_, { install, topology }) =>
        topology.inverters.island.flatMap((id) => install.inverters?.[id]?.separation ?? []),
    ),
    entered('earthing_system', '', 'Earthing system', ['fed_from'], (_, { install }) => install.supply.earthing),
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
      name: 'half_tripped',
      unit: '',
      title: 'Operated at half its rated residual current',
      at: ({ id }, state) => ['readings', 'residual_current', id, state, 'half'],
      value: (item, scene, state) => {
        const half = testOf(item, scene, state)?.half
        return half && 'value' in half ? half.noTrip !== true : undefined
      },
    },
    {
      name: 'rated_tripped',
      unit: '',
      title: 'Operated at its rated residual current',
      at: ({ id }, state) => ['readings', 'residual_current', id, state, 'rated'],
      value: (item, scene, state) => {
        const rated = testOf(item, scene, state)?.rated
        return rated && 'value' in rated ? rated.noTrip !== true : undefined
      },
    },
  ],
  measuredInState: [
    residualReading('half', 'ms', 'Test at half the rated residual current', 'residual_time'),
    residualReading('rated', 'ms', 'Trip time at the rated residual current', 'residual_time'),
    residualReading('double', 'ms', 'Trip time at twice the rated residual current', 'residual_time'),
    residualReading('five_times', 'ms', 'Trip time at five times the rated residual current', 'residual_time'),
    residualReading('ramp', 'mA', 'Trip current under a rising residual current', 'residual_current'),
  ],
}

export interface OvercurrentItem {
  readonly id: string
  readonly device: OvercurrentDevice
}

/** What the rules see of an overcurrent device that stands in the tree by itself. */
export const overcurrentPlan: SheetPlan<OvercurrentItem> = {
  subject: 'overcurrent device',
  items: ({ install }) => Object.entries(install.overcurrent ?? {}).map(([id, device]) => ({ id, device })),
  id: ({ id }) => id,
  path: ({ id }) => ['overcurrent', id],
  quantities: overcurrentFamily.quantities,
  entered: [
    entered('kind', '', 'Kind of device', ['device'], ({ device }) => device.device.kind),
    entered('curve', '', 'Characteristic', ['device'], ({ device }) => device.device.curve),
    entered('rated', 'A', 'Rating', ['device'], ({ device }) => device.device.rated),
    entered(
      'breaking_capacity',
      'A',
      'Breaking capacity',
      ['breaking'],
      ({ device }) => device.breaking ?? device.device.breaking,
    ),
    entered('backed_up', '', 'On the backed-up side', ['fed_from'], ({ id }, scene) => fromTree(id, scene)?.backedUp),
    entered('circuits_below', '', 'Circuits that it protects', ['fed_from'], ({ id }, { topology }) =>
      topology.circuitsBelow(id),
    ),
  ],
}
