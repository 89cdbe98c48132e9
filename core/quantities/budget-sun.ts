import type { PvArray } from '#core/install.ts'
import { arrayPower } from './array.ts'
import type { Scene } from './quantity.ts'
import { type Place, sunPosition, sunset } from './sun.ts'
import { clearSkyIrradiance } from './sun-irradiance.ts'

/** What an array needs to state to have its power told under a clear sky. */
interface Panel {
  readonly power: number
  readonly orientation: NonNullable<PvArray['orientation']>
}

/** The sun over the island: when the hours start, and what the arrays give. */
export interface IslandSun {
  readonly sunset: Date
  /** Mean power in W over the hour that starts so many hours after sunset */
  readonly powerIn: (hour: number) => number
}

function panelOf(array: PvArray): Panel | undefined {
  const power = arrayPower(array)
  return power === undefined || array.orientation === undefined ? undefined : { power, orientation: array.orientation }
}

/** Arrays on one backed-up inverter. */
interface Source {
  /** VA, the inverter's rated power */
  readonly limit: number
  readonly panels: readonly Panel[]
}

/** Backed-up inverters with arrays. Undefined where there is none, or an array does not state power and orientation. */
function sourcesOfSun({ install, topology }: Scene): Source[] | undefined {
  const arrays = Object.values(install.arrays ?? {})
  const found: Source[] = []
  for (const [id, { rated_power }] of Object.entries(install.inverters ?? {})) {
    const own = topology.live(id, 'island') ? arrays.filter(({ into }) => into === id) : []
    const panels = own.flatMap((array) => panelOf(array) ?? [])
    if (panels.length < own.length) return undefined
    if (panels.length > 0) found.push({ limit: rated_power, panels })
  }
  return found.length > 0 ? found : undefined
}

function powerAt(moment: Date, place: Place, { limit, panels }: Source): number {
  const sun = sunPosition(moment, place)
  const power = (panel: Panel) => (panel.power * clearSkyIrradiance(sun, panel.orientation)) / 1000
  return Math.min(
    limit,
    panels.reduce((sum, panel) => sum + power(panel), 0),
  )
}

/**
 * What the backed-up arrays give under a clear sky, hour by hour after the sunset of the first day of the inspection:
 * rated power × irradiance/1000, taken in the middle of the hour, at most the rated power of the inverter. Heat, dirt and
 * losses are not in it: the most that a day of that season can give.
 *
 * @returns undefined where position, date, power or orientation is not stated, or the sun does not set on that day
 */
export function islandSun(scene: Scene): IslandSun | undefined {
  const { position } = scene.install.site
  const day = scene.install.report.inspected?.from
  const sources = sourcesOfSun(scene)
  if (position === undefined || day === undefined || sources === undefined) return undefined
  const start = sunset(day, position)
  if (start === undefined) return undefined
  const powerIn = (hour: number): number => {
    const middle = new Date(start.getTime() + (hour + 0.5) * 3_600_000)
    return sources.reduce((sum, source) => sum + powerAt(middle, position, source), 0)
  }
  return { sunset: start, powerIn }
}
