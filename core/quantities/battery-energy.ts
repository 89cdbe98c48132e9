import type { Battery } from '#core/install/battery.ts'
import type { Circuit } from '#core/install.ts'
import { circuitPower } from './circuit-design-current.ts'
import { nominalVoltage } from './circuit-item.ts'
import { backedUpCircuits } from './inverter-load.ts'
import type { Scene } from './quantity.ts'

/**
 * Energy in Wh that a battery holds back for the island: usable energy × the share set in its inverter.
 *
 * @returns undefined where the inverter states no share
 */
export function heldBackEnergy({ into, usable }: Battery, { install }: Scene): number | undefined {
  const share = install.inverters?.[into]?.settings?.held_back_charge
  return share === undefined ? undefined : (usable * share) / 100
}

/** Whether a battery can feed the island: its inverter lies on the backed-up side. */
export function feedsIsland({ into }: Battery, { topology }: Scene): boolean {
  return topology.live(into, 'island')
}

/**
 * Mean load in W of backed-up circuits over a day: the sum of their energy of a day over 24 h; where a circuit states
 * none, its power as if it ran all day. Circuits that state neither are not in it.
 *
 * @param wanted which circuits count: all, or those that must run
 * @source a common way of sizing a battery bank: energy of a day
 */
export function meanLoad(scene: Scene, wanted: (circuit: Circuit) => boolean): number {
  return backedUpCircuits(scene)
    .filter(wanted)
    .reduce((sum, circuit) => sum + circuitMean(circuit, nominalVoltage(scene)), 0)
}

function circuitMean(circuit: Circuit, voltage: number): number {
  const energy = circuit.load?.daily_energy
  return energy === undefined ? (circuitPower(circuit, voltage) ?? 0) : energy / 24
}

/**
 * Hours that a charge lasts: E·η/P.
 *
 * @param energy E in Wh
 * @param efficiency η from charge to a.c. output in %
 * @param load P in W
 * @returns undefined without a load: nothing would ever end it
 * @source common practice: autonomy = usable energy × efficiency / load
 */
export function autonomy(energy: number, efficiency: number, load: number): number | undefined {
  return load > 0 ? (energy * efficiency) / 100 / load : undefined
}
