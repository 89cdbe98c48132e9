import type { Circuit } from '#core/install.ts'
import { feedsIsland } from './battery-energy.ts'
import { circuitPower } from './circuit-design-current.ts'
import { nominalVoltage } from './circuit-item.ts'
import { backedUpCircuits } from './inverter-load.ts'
import type { Scene } from './quantity.ts'

/**
 * Power in W that all batteries of the island give together without sun: for each inverter the smaller of its continuous
 * power in the island and what its batteries give, added up.
 *
 * @source common practice: the smaller of the inverter's and the battery's limit counts
 */
export function dischargeTogether(scene: Scene): number {
  const { inverters = {}, batteries = {} } = scene.install
  return Object.entries(inverters).reduce((sum, [id, { island, rated_power }]) => {
    const given = Object.values(batteries)
      .filter((battery) => battery.into === id && feedsIsland(battery, scene))
      .reduce((power, battery) => power + battery.max_discharge, 0)
    return sum + Math.min(given, island?.continuous ?? rated_power)
  }, 0)
}

/**
 * Active power in W of the backed-up circuits, all at once. Circuits that state neither power nor current are not in it.
 *
 * @param wanted which circuits count: all, or those that must run
 * @source definition of active power; without diversity
 */
export function powerTogether(scene: Scene, wanted: (circuit: Circuit) => boolean): number {
  return backedUpCircuits(scene)
    .filter(wanted)
    .reduce((sum, circuit) => sum + (circuitPower(circuit, nominalVoltage(scene)) ?? 0), 0)
}
