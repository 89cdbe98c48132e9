import type { State } from '#core/glossary.ts'
import { few } from './print.ts'
import type { ReportScene } from './scene.ts'

/** What cuts off a fault to earth of a circuit in a state: the devices by name, `overcurrent`, `source shut-down`, `none`; `dead` where nothing lives. */
export function clearedBy({ value }: ReportScene, id: string, state: State): string {
  if (value(id, 'live', state) === false) return 'dead'
  const means = value(id, `${state}_disconnection`)
  const ids = value(id, 'protected_by', state)
  if (means === 'residual current' && Array.isArray(ids)) return few(ids.map(String), 3)
  return means === undefined ? '–' : String(means)
}
