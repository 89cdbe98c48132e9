import { rounded } from './print.ts'
import type { ReportScene } from './scene.ts'
import { sure } from './sure.ts'

/** An end of the band in mA; tenths count in small ones only. */
const edge = (current: number): string => rounded(current, current < 100 ? 1 : 0)

/** The band in which a residual-current device trips under a rising current, in mA: `10.5 to 42.0`. */
export function rampBand(scene: ReportScene, id: string): string {
  const end = (name: string): string => edge(sure(scene.number(id, name), `${name} of ${id}`))
  return `${end('ramp_minimum')} to ${end('ramp_maximum')}`
}
