import type { Circuit } from '#core/install.ts'
import type { Row, RowGroup } from './blocks.ts'
import { groupedBy, type Some } from './grouped-by.ts'
import type { ReportScene } from './scene.ts'

/** Circuits that hang on one thing, in the order of the file. */
export interface CircuitGroup {
  readonly feeder: string
  readonly title: string
  readonly circuits: Some<readonly [id: string, circuit: Circuit]>
}

/** Circuits by what feeds them, with a title that names the board and says whether it lives on. */
export function circuitsByFeeder({ install, topology }: ReportScene): CircuitGroup[] {
  const groups = groupedBy(Object.entries(install.circuits ?? {}), ([, { fed_from }]) => fed_from)
  return [...groups].map(([feeder, circuits]) => {
    const name = install.boards?.[feeder]?.name
    const alive = topology.live(circuits[0][0], 'island')
    const side = alive ? 'lives on in the island' : 'grid only'
    return { feeder, title: `${name === undefined ? `Fed from ${feeder}` : `${feeder} ${name}`} · ${side}`, circuits }
  })
}

/** One row for each circuit, under its board. */
export function rowsByFeeder(scene: ReportScene, row: (id: string, circuit: Circuit) => Row): RowGroup[] {
  return circuitsByFeeder(scene).map(({ title, circuits }) => ({
    title,
    rows: circuits.map(([id, circuit]) => row(id, circuit)),
  }))
}
