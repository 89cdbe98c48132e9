import type { Mark, Tiles } from '../blocks.ts'
import { amount, few, hoursText } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import type { Standing } from '../standing.ts'
import { sure } from '../sure.ts'

type Tile = Tiles['tiles'][number]

function outcomeTile({ word, counts }: Standing): Tile {
  const marks: readonly { readonly mark: Mark; readonly count: number }[] = counts.filter(({ count }) => count > 0)
  return { anchor: 'report/outcome', box: 'box', label: 'Outcome', figure: word, lines: [], marks }
}

function islandLines(scene: ReportScene, batteries: readonly string[], held: number): string[] {
  const mustRun = batteries.flatMap((id) => scene.number(id, 'autonomy_must_run') ?? []).filter(Number.isFinite)
  const limits = batteries.flatMap((id) => scene.number(id, 'discharge_limit') ?? [])
  const power = limits.reduce((sum, limit) => sum + limit, 0)
  return [
    `from ${amount(held, 'Wh')} held back, giving ${amount(power, 'W')} at most`,
    ...(mustRun.length > 0 ? [`${hoursText(Math.min(...mustRun))} for what must run`] : []),
  ]
}

function islandTile(scene: ReportScene): Tile {
  const batteries = Object.keys(scene.install.batteries ?? {})
  const hours = batteries.flatMap((id) => scene.number(id, 'autonomy') ?? [])
  const held = batteries.reduce((sum, id) => sum + (scene.number(id, 'held_back_energy') ?? 0), 0)
  const known = hours.length > 0
  return {
    anchor: 'report/island-hours',
    box: 'box-island',
    label: 'In the island, without sun',
    figure: known ? hoursText(Math.min(...hours)) : 'not known',
    lines: known ? islandLines(scene, batteries, held) : ['held-back charge or load not stated'],
    marks: [],
  }
}

function circuitsTile({ install, topology }: ReportScene): Tile {
  const { backedUp, gridOnly } = topology.circuits
  const names = (ids: readonly string[]) =>
    few(
      ids.map((id) => sure(install.circuits?.[id], id).serves),
      4,
    )
  const total = backedUp.length + gridOnly.length
  return {
    anchor: 'report/lives-on',
    box: 'box',
    label: 'What lives on',
    figure: `${backedUp.length} of ${total}`,
    lines: [
      ...(backedUp.length > 0 ? [names(backedUp)] : []),
      ...(gridOnly.length > 0 ? [`On the grid only: ${names(gridOnly)}`] : []),
    ],
    marks: [],
  }
}

/** The three figures that a reader wants first. */
export function frontTiles(scene: ReportScene, standing: Standing): Tiles {
  return {
    kind: 'tiles',
    anchor: 'report/front',
    tiles: [outcomeTile(standing), islandTile(scene), circuitsTile(scene)],
  }
}
