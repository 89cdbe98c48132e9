import type { State } from '#core/glossary.ts'
import { few } from './print.ts'
import type { ReportScene } from './scene.ts'

/**
 * The most that a loop may read for the overcurrent device, in Ω; undefined in the island where something else cuts off,
 * and in a TT system. On the grid of a TN system it is a yardstick even then: a loop beyond it has a cause.
 */
export function loopYardstick({ value, number, install }: ReportScene, id: string, state: State): number | undefined {
  const means = value(id, `${state}_disconnection`)
  const other = means === 'residual current' || means === 'source shut-down'
  if (other && (state === 'island' || install.supply.earthing === 'TT')) return undefined
  return number(id, 'loop_limit_measured')
}

/** What cuts off a fault to earth of a circuit in a state: the devices by name, `overcurrent`, `source shut-down`, `none`; `dead` where nothing lives. */
export function clearedBy({ value }: ReportScene, id: string, state: State): string {
  if (value(id, 'live', state) === false) return 'dead'
  const means = value(id, `${state}_disconnection`)
  const ids = value(id, 'protected_by', state)
  if (means === 'residual current' && Array.isArray(ids)) return few(ids.map(String), 3)
  return means === undefined ? '–' : String(means)
}
