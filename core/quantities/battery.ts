import type { Battery } from '#core/install/battery.ts'
import type { Circuit } from '#core/install.ts'
import { autonomy, feedsIsland, heldBackEnergy, meanLoad } from './battery-energy.ts'
import { dischargeTogether, powerTogether } from './battery-power.ts'
import { ventilation, ventOpening } from './battery-ventilation.ts'
import { knownNumber } from './circuit-item.ts'
import type { Family, Quantity, Scene } from './quantity.ts'

interface Item {
  readonly id: string
  readonly battery: Battery
}

/** Undefined where the battery cannot feed the island: a limit there would be held against loads that it never sees. */
function discharge(battery: Battery, scene: Scene): number | undefined {
  const { into, max_discharge } = battery
  const inverter = scene.install.inverters?.[into]
  if (!inverter || !feedsIsland(battery, scene)) return undefined
  return Math.min(inverter.island?.continuous ?? inverter.rated_power, max_discharge)
}

function autonomyOf(
  words: Pick<Quantity<Item>, 'name' | 'title'>,
  wanted: (circuit: Circuit) => boolean,
): Quantity<Item> {
  return {
    ...words,
    unit: 'h',
    formula: 'held-back energy · efficiency / mean load; mean load = Σ energy of a day / 24 h, else the power',
    source: 'common practice; the battery alone, without sun',
    from: ['held_back_energy', 'efficiency', 'circuits.load.daily_energy', 'circuits.load.power'],
    compute: ({ battery }, scene, known) => {
      const energy = knownNumber(known, 'held_back_energy')
      if (energy === undefined || !feedsIsland(battery, scene)) return undefined
      return autonomy(energy, battery.efficiency, meanLoad(scene, wanted))
    },
  }
}

/** Everything computed for a battery. */
export const batteryFamily: Family<Item> = {
  subject: 'battery',
  quantities: [
    {
      name: 'discharge_limit',
      unit: 'W',
      title: 'Highest power that it gives in the island',
      formula: 'smaller of the inverter’s continuous power and the highest discharge power',
      source: 'common practice',
      from: ['max_discharge', 'into', 'inverters.fed_from', 'inverters.island.continuous', 'inverters.rated_power'],
      compute: ({ battery }, scene) => discharge(battery, scene),
    },
    {
      name: 'discharge_limit_together',
      unit: 'W',
      title: 'Highest power that all batteries give in the island together',
      formula: 'Σ over the inverters of the smaller of its continuous power and Σ discharge power of its batteries',
      source: 'common practice',
      from: ['batteries', 'inverters.fed_from', 'inverters.island.continuous', 'inverters.rated_power'],
      compute: ({ battery }, scene) => (feedsIsland(battery, scene) ? dischargeTogether(scene) : undefined),
    },
    {
      name: 'must_run_load',
      unit: 'W',
      title: 'Load that must run in the island',
      formula: 'Σ active power of backed-up circuits marked so',
      source: 'definition of active power; without diversity',
      from: ['circuits.load.must_run', 'circuits.load.power', 'circuits.load.current'],
      compute: (_item, scene) => powerTogether(scene, ({ load }) => load?.must_run === true),
    },
    {
      name: 'held_back_energy',
      unit: 'Wh',
      title: 'Energy held back for the island',
      formula: 'usable energy · share held back',
      source: 'the inverter’s setting',
      from: ['usable', 'inverters.settings.held_back_charge'],
      compute: ({ battery }, scene) => heldBackEnergy(battery, scene),
    },
    autonomyOf({ name: 'autonomy', title: 'Hours that the held-back charge lasts' }, () => true),
    autonomyOf(
      { name: 'autonomy_must_run', title: 'Hours that the held-back charge lasts for what must run' },
      ({ load }) => load?.must_run === true,
    ),
    {
      name: 'ventilation',
      unit: 'm³/h',
      title: 'Air that its place needs',
      formula: 'factor · n · Igas · C · 10⁻³, lead-acid only',
      source: 'IEC 62485-2, as printed in two engineering texts (clause 7.2 from memory)',
      from: ['chemistry', 'cells', 'gas_current', 'capacity', 'book.ventilation_factor'],
      compute: ({ battery }, { parameters }) => ventilation(battery, parameters.ventilation_factor),
    },
    {
      name: 'vent_opening',
      unit: 'cm²',
      title: 'Free area of each of its two vents',
      formula: '28 · Q',
      source: 'IEC 62485-2, as printed in two engineering texts',
      from: ['ventilation'],
      compute: (_item, _scene, known) => {
        const flow = knownNumber(known, 'ventilation')
        return flow === undefined ? undefined : ventOpening(flow)
      },
    },
  ],
}
