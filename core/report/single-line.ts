import type { State } from '#core/glossary.ts'
import { COLOUR } from '#core/paper/style.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { type DiagramScene, paintPart } from './draw/paint.ts'
import { partsOf, rowCount } from './draw/parts.ts'
import { everyPlaced, place } from './draw/place.ts'
import { drawing, group } from './draw/svg.ts'

/** Room for the words behind each circuit. */
const WORDS = 246
const LEAST = 576

/**
 * The installation as a single-line diagram in one state, as one SVG text: symbols after IEC 60617, live parts in ink,
 * dead parts grey and dashed, the links between neutral and earth as they stand in the state.
 *
 * @param state which contacts are open and what is live
 */
export function singleLine(scene: Pick<DiagramScene, 'install' | 'topology'>, state: State): string {
  const parts = partsOf(scene.install, scene.topology)
  const { root, height } = place(parts, rowCount(parts))
  const all = everyPlaced(root)
  const words = Math.max(...all.map(({ out }) => out)) + 14
  const width = Math.max(LEAST, words + WORDS)
  const label = `Single-line diagram ${STATE_WORDS[state]}`
  const painted = all.map((placed) => paintPart(placed, { ...scene, state, words: width - WORDS, width }))
  return drawing(width, height + 4, label, [group({ stroke: COLOUR.ink, 'stroke-width': 1.1, fill: 'none' }, painted)])
}
