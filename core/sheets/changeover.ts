import type { Changeover } from '#core/install.ts'
import { changeoverFamily } from '#core/quantities/changeover.ts'
import { entered, type SheetPlan } from './plan.ts'

const ROLES = ['changeover command', 'changeover confirmation', 'grid contactor open'] as const

/** What the rules see of the changeover. */
export const changeoverPlan: SheetPlan<Changeover> = {
  subject: 'changeover',
  items: ({ install }) => [install.changeover],
  id: ({ id }) => id,
  path: () => ['changeover'],
  quantities: changeoverFamily.quantities,
  entered: [
    entered('operation', '', 'Automatic or manual', ['operation'], (changeover) => changeover.operation),
    entered('poles', '', 'Poles', ['poles'], (changeover) => changeover.poles),
    entered(
      'phases',
      '',
      'Line conductors of the supply',
      ['poles'],
      (_, { install }) => install.supply.nominal.phases,
    ),
    entered('rated_current', 'A', 'Rated current', ['rated_current'], (changeover) => changeover.rated_current),
    entered(
      'neutral_link',
      '',
      'Link between neutral and earth',
      ['neutral_link'],
      (changeover) => changeover.neutral_link,
    ),
    entered(
      'neutral_opens',
      '',
      'When the neutral contact opens',
      ['neutral_opens'],
      (changeover) => changeover.neutral_opens,
    ),
    entered('interlocks', '', 'Interlocks', ['interlock'], (changeover) => changeover.interlock),
    entered(
      'short_circuit_rating',
      'A',
      'Conditional short-circuit current',
      ['short_circuit_rating'],
      (changeover) => changeover.short_circuit_rating,
    ),
    entered(
      'separation_required',
      '',
      'Poles that the operator wants opened',
      ['poles'],
      (_, { install }) => install.supply.separation?.required,
    ),
    entered('earthing_system', '', 'Earthing system', ['neutral_link'], (_, { install }) => install.supply.earthing),
    entered('signal_roles', '', 'Signals wired', ['signals'], ({ signals }) => signals?.map(({ role }) => role)),
    entered('signals_missing', '', 'Signals not named', ['signals'], ({ signals }) => {
      const named = new Set(signals?.map(({ role }) => role))
      return ROLES.filter((role) => !named.has(role))
    }),
    entered(
      'signals_swapped',
      '',
      'Signals set to another terminal than they are wired to',
      ['signals'],
      ({ signals }) => signals?.filter(({ terminal, configured }) => terminal !== configured).map(({ role }) => role),
    ),
    entered('terminals_shared', '', 'Terminals used twice', ['signals'], ({ signals }) => {
      const terminals = signals?.map(({ terminal }) => terminal) ?? []
      return terminals.filter((terminal, index) => terminals.indexOf(terminal) !== index)
    }),
    entered(
      'island_joins',
      '',
      'What joins the island to the grid',
      ['fed_from'],
      (_, { topology }) => topology.islandJoins,
    ),
    entered(
      'island_sources',
      '',
      'Inverters that feed the island',
      ['fed_from'],
      (_, { topology }) => topology.inverters.island,
    ),
    entered(
      'grid_only_inverters',
      '',
      'Inverters on the grid side',
      ['fed_from'],
      (_, { topology }) => topology.inverters.gridOnly,
    ),
    entered('line_size', 'mm²', 'Line conductor of its cable', ['cable'], ({ cable }) => cable?.line),
    entered('neutral_size', 'mm²', 'Neutral conductor of its cable', ['cable'], ({ cable }) => cable?.neutral),
    entered('protective_size', 'mm²', 'Protective conductor of its cable', ['cable'], ({ cable }) => cable?.protective),
  ],
  inState: [
    {
      name: 'neutral_earth_links',
      unit: '',
      title: 'Links between neutral and earth',
      at: ['neutral_link'],
      value: (_, { topology }, state) => topology.neutralEarthLinks[state].length,
    },
  ],
}
