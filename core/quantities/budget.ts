import type { Battery } from '#core/install/battery.ts'
import { feedsIsland, heldBackEnergy, meanLoad } from './battery-energy.ts'
import { type Course, courseOf, type Store } from './budget-charge.ts'
import { islandSun } from './budget-sun.ts'
import type { Scene } from './quantity.ts'

/** How many hours the budget looks ahead. */
const HOURS = 48

/** The island's energy, hour by hour from a grid failure on: at sunset, where the sun is in it. */
export interface IslandBudget {
  readonly hours: number
  /** ISO 8601, UTC; undefined where the sun is not in the budget */
  readonly sunset: string | undefined
  /** Wh held back at the start, and the usable energy of the batteries */
  readonly held: number
  readonly usable: number
  /** W, mean of a day */
  readonly load: number
  readonly mustRunLoad: number
  /** W given in each hour under a clear sky; empty where it cannot be told */
  readonly sun: readonly number[]
  readonly withoutSun: Course
  /** Undefined where position, date, power or orientation is not stated */
  readonly withSun: Course | undefined
  /** What must run, without sun; undefined where nothing is marked so */
  readonly mustRun: Course | undefined
  /** The model and its source, for the report */
  readonly model: string
  readonly source: string
}

const LOAD = 'Load: the mean of a day.'
const WITH_SUN = {
  model:
    `The grid fails at sunset with only the held-back charge left. ${LOAD} ` +
    'Sun: clear sky, rated power × irradiance / 1000 W/m², at most the inverter’s rated power; ' +
    'no cloud, haze, shade, heat or losses: no forecast.',
  source:
    'Sun: suncalc 2.0.2 after Meeus. Irradiance: Meinel and Meinel (1976), air mass by Kasten and Young (1989), ' +
    'as printed in a public course on photovoltaics. Energy: own derivation.',
}
const WITHOUT_SUN = {
  model: `The grid fails with only the held-back charge left. ${LOAD} The sun is not in it.`,
  source: 'Energy: own derivation.',
}

/** All batteries that can feed the island as one; undefined where there is none, or one does not say what it holds back. */
function storeOf(scene: Scene): Store | undefined {
  const batteries = Object.values(scene.install.batteries ?? {}).filter((battery) => feedsIsland(battery, scene))
  const held = batteries.map((battery) => heldBackEnergy(battery, scene)).filter((energy) => energy !== undefined)
  if (held.length === 0 || held.length < batteries.length) return undefined
  const sum = (value: (battery: Battery) => number) => batteries.reduce((total, battery) => total + value(battery), 0)
  const usable = sum((battery) => battery.usable)
  return {
    held: held.reduce((total, energy) => total + energy, 0),
    usable,
    efficiency: sum((battery) => battery.usable * battery.efficiency) / usable / 100,
  }
}

/**
 * The island's energy over 48 h from sunset: without sun, with a clear sky, and for what must run alone.
 *
 * @returns undefined where no battery feeds the island, one does not state its held-back charge, or no load is stated
 * @source autonomy: common practice; sun: suncalc after Meeus; clear sky: Meinel and Meinel (1976)
 */
export function islandBudget(scene: Scene): IslandBudget | undefined {
  const store = storeOf(scene)
  const load = meanLoad(scene, () => true)
  const mustRunLoad = meanLoad(scene, (circuit) => circuit.load?.must_run === true)
  if (store === undefined || load === 0) return undefined
  const sun = islandSun(scene)
  const given = sun ? Array.from({ length: HOURS }, (_, hour) => sun.powerIn(hour)) : []
  const dark = () => 0
  return {
    hours: HOURS,
    sunset: sun?.sunset.toISOString(),
    held: store.held,
    usable: store.usable,
    load,
    mustRunLoad,
    sun: given,
    withoutSun: courseOf(store, load, dark, HOURS),
    withSun: sun && courseOf(store, load, sun.powerIn, HOURS),
    mustRun: mustRunLoad > 0 ? courseOf(store, mustRunLoad, dark, HOURS) : undefined,
    ...(sun ? WITH_SUN : WITHOUT_SUN),
  }
}
