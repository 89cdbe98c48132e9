import { rounded } from './print.ts'
import type { ReportScene } from './scene.ts'

/** An end of the band in mA; tenths count in small ones only. */
const edge = (current: number): string => rounded(current, current < 100 ? 1 : 0)

/** The band in which a residual-current device trips under a rising current, in mA: `10.5 to 42.0`. */
export function rampBand(scene: ReportScene, id: string): string | undefined {
  const [low, high] = [scene.number(id, 'ramp_minimum'), scene.number(id, 'ramp_maximum')]
  return low === undefined || high === undefined ? undefined : `${edge(low)} to ${edge(high)}`
}
