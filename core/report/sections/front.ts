import type { Mark, Tiles } from '../blocks.ts'
import { amount, few, hoursText } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import type { Standing } from '../standing.ts'

type Tile = Tiles['tiles'][number]

function outcomeTile({ word, counts }: Standing): Tile {
  const marks: readonly { readonly mark: Mark; readonly count: number }[] = counts.filter(({ count }) => count > 0)
  return { anchor: 'report/outcome', box: 'box', label: 'Outcome', figure: word, lines: [], marks }
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
    lines: [known ? `from ${amount(held, 'Wh')} held back` : 'held-back charge or load not stated'],
    marks: [],
  }
}

function circuitsTile({ install, topology }: ReportScene): Tile {
  const { backedUp, gridOnly } = topology.circuits
  const names = backedUp.map((id) => install.circuits?.[id]?.serves ?? id)
  const total = backedUp.length + gridOnly.length
  return {
    anchor: 'report/lives-on',
    box: 'box',
    label: 'What lives on',
    figure: `${backedUp.length} of ${total}`,
    lines: [names.length === 0 ? 'no circuit is backed up' : few(names, 4)],
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
