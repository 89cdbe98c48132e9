import type { SheetValue } from '#core/glossary.ts'
import type { Inverter } from '#core/install.ts'
import { nominalVoltage } from './circuit-item.ts'
import { islandInverter, phaseLimit } from './inverter-lines.ts'
import { largestPhaseLoad, phaseLoads, startingCurrent, unbalance, unfedLines } from './inverter-load.ts'
import type { Family, Quantity, Scene } from './quantity.ts'

interface Item {
  readonly id: string
  readonly inverter: Inverter
}

/** A quantity that only an inverter that feeds the island has. */
function inIsland(
  words: Omit<Quantity<Item>, 'compute'>,
  value: (inverter: Inverter, scene: Scene) => SheetValue | undefined,
): Quantity<Item> {
  return {
    ...words,
    compute: ({ id }, scene) => {
      const inverter = islandInverter(id, scene)
      return inverter && value(inverter, scene)
    },
  }
}

const LOADS = ['circuits', 'fed_from', 'supply.nominal.voltage']

/** Everything computed for an inverter. */
export const inverterFamily: Family<Item> = {
  subject: 'inverter',
  quantities: [
    inIsland(
      {
        name: 'phase_limit',
        unit: 'VA',
        title: 'Highest power on one line in the island',
        formula: 'as stated, else S / 3 on three lines, S on one',
        source: 'a German trade text on backup supplies: each phase gives one third',
        from: ['island.per_phase', 'island.continuous', 'rated_power', 'phases'],
      },
      phaseLimit,
    ),
    inIsland(
      {
        name: 'phase_load',
        unit: 'VA',
        title: 'Backed-up load by line',
        formula: 'U0 · Σ design currents of the backed-up circuits whose load is stated',
        source: 'definition of apparent power; without diversity',
        from: LOADS,
      },
      (_inverter, scene) => phaseLoads(scene),
    ),
    inIsland(
      {
        name: 'largest_phase_load',
        unit: 'VA',
        title: 'Largest load that it carries on one line',
        formula: 'largest over its lines of phase load · its share where several inverters feed the line',
        source: 'sharing in proportion to what each can give (from memory)',
        from: ['phase_load', 'phase_limit', 'line'],
      },
      largestPhaseLoad,
    ),
    inIsland(
      {
        name: 'starting_current',
        unit: 'A',
        title: 'Highest current on one line while a load starts',
        formula: 'largest over its lines of Σ I + largest (k − 1) · I',
        source: 'starting current k · I; the worst moment is own choice',
        from: ['circuits.load.start', ...LOADS],
      },
      startingCurrent,
    ),
    inIsland(
      {
        name: 'phase_peak_limit',
        unit: 'A',
        title: 'Peak current on one line',
        formula: 'peak power / (lines · U0)',
        source: 'definition of apparent power',
        from: ['island.peak', 'phases', 'supply.nominal.voltage'],
      },
      ({ island, phases }, scene) =>
        island?.peak === undefined ? undefined : island.peak / (phases * nominalVoltage(scene)),
    ),
    inIsland(
      {
        name: 'unbalance',
        unit: 'VA',
        title: 'Backed-up load: most loaded line less least loaded line',
        formula: 'largest − smallest phase load',
        source: 'the unbalance of national conditions, max S − min S',
        from: ['phase_load'],
      },
      (_inverter, scene) => unbalance(phaseLoads(scene)),
    ),
    {
      name: 'feed_in_unbalance',
      unit: 'VA',
      title: 'Unbalance that it feeds into a three-phase supply',
      formula: 'rated power where it feeds one line of three, else 0',
      source: 'the unbalance of national conditions, max S − min S',
      from: ['rated_power', 'phases', 'supply.nominal.phases'],
      compute: ({ inverter }, { install }) =>
        inverter.phases === 1 && install.supply.nominal.phases === 3 ? inverter.rated_power : 0,
    },
    {
      name: 'rated_current',
      unit: 'A',
      title: 'Rated current on each line',
      formula: 'rated power / (lines · U0)',
      source: 'definition of apparent power',
      from: ['rated_power', 'phases', 'supply.nominal.voltage'],
      compute: ({ inverter }, scene) => inverter.rated_power / (inverter.phases * nominalVoltage(scene)),
    },
    inIsland(
      {
        name: 'total_load',
        unit: 'VA',
        title: 'Backed-up load, all lines',
        formula: 'Σ phase load',
        source: 'definition of apparent power; without diversity',
        from: ['phase_load'],
      },
      (_inverter, scene) => Object.values(phaseLoads(scene)).reduce((sum, load) => sum + load, 0),
    ),
    inIsland(
      {
        name: 'unfed_lines',
        unit: '',
        title: 'Lines with backed-up load that no inverter feeds in the island',
        formula: 'phase load above 0 and no inverter of the island on the line',
        source: 'the tree of supply',
        from: ['phase_load', 'phases', 'line'],
      },
      (_inverter, scene) => unfedLines(scene),
    ),
  ],
}
