import type { Install } from '#core/install.ts'
import type { Scene } from '#core/quantities/quantity.ts'
import { type EnteredField, entered } from './plan.ts'

/** By how much an island may run beside its setting before somebody should look: our own figure, no standard's. */
const BESIDE_SETTING = 0.05

/** The first voltage that an inverter of the island is set to, in V. */
function setting({ install, topology }: Scene): number | undefined {
  return topology.inverters.island
    .map((id) => install.inverters?.[id]?.settings?.island_voltage)
    .find((voltage) => voltage !== undefined)
}

function settingTimes(factor: number): (install: Install, scene: Scene) => number | undefined {
  return (_, scene) => {
    const voltage = setting(scene)
    return voltage === undefined ? undefined : voltage * factor
  }
}

/** What the rules see of the island as a whole: what it is set to, and what must run in it. */
export const islandFields: readonly EnteredField<Install>[] = [
  entered('island_voltage', 'V', 'Island voltage set', ['inverters'], settingTimes(1)),
  entered('island_voltage_floor', 'V', 'Island voltage set less 5 %', ['inverters'], settingTimes(1 - BESIDE_SETTING)),
  entered('island_voltage_ceiling', 'V', 'Island voltage set and 5 %', ['inverters'], settingTimes(1 + BESIDE_SETTING)),
  entered('must_run_circuits', '', 'Circuits that must run in the island', ['circuits'], ({ circuits }, { topology }) =>
    topology.circuits.backedUp.filter((id) => circuits?.[id]?.load?.must_run === true),
  ),
]
