import { beside } from './beside.ts'
import { paintBox } from './boxes.ts'
import type { Canvas } from './canvas.ts'
import { child, type Flow, type Laid } from './flow.ts'
import { changeFirst, changeLast, type Frame, framed, room, type Strip, stackHeight } from './strips.ts'
import { BOX, type BoxStyle, CONTENT, GAP, GRID } from './style.ts'
import type { Block, Group } from './tree.ts'

/** The box that one of the classes stands for. */
export const boxOf = (classes: readonly string[]): BoxStyle | undefined =>
  classes.map((name) => BOX[name]).find((box) => box)

/** How many columns one of the classes asks for. */
export const gridOf = (classes: readonly string[]): number | undefined =>
  classes.map((name) => GRID[name]).find((count) => count)

const inside = (group: Group, box: BoxStyle, flow: Flow): readonly Strip[] => {
  const left = box.pad.x + (box.bar?.width ?? 0)
  const right = box.pad.x + (box.reserve ?? 0)
  const inner = {
    ...flow,
    parent: child(flow, group.tag === 'section' ? 'Sect' : 'Div'),
    x: flow.x + left,
    width: flow.width - left - right,
    inherited: [...flow.inherited, ...group.classes],
  }
  const columns = gridOf(group.classes)
  return columns ? flowGrid(group, columns, inner).strips : flow.blocks(group.blocks, inner)
}

/** A box with room around its content. It may go over a page break; each part gets its own ground and bar. */
export const flowBox = (group: Group, box: BoxStyle, flow: Flow): Laid => {
  const frame: Frame = {
    head: [],
    under: (canvas, shift, top, bottom) =>
      paintBox(canvas, flow.shaper, box, flow.x + shift, top, flow.width, bottom - top),
  }
  const content = changeFirst(inside(group, box, flow), { before: 0 })
  const strips = [room(box.pad.y, 2), ...changeLast(content, { hold: 2 }), room(box.pad.y, 0)]
  return { strips: framed(strips, frame), before: GAP.rows, after: GAP.rows }
}

interface Cell {
  readonly strips: readonly Strip[]
  readonly box: BoxStyle | undefined
  readonly x: number
}

const flowCell = (block: Block, flow: Flow): Cell => {
  const box = block.kind === 'group' ? boxOf(block.classes) : undefined
  if (block.kind !== 'group' || !box) return { strips: flow.blocks([block], flow), box, x: flow.x }
  return { strips: changeFirst(inside(block, box, flow), { before: 0 }), box, x: flow.x }
}

const gridRow = (blocks: readonly Block[], width: number, flow: Flow): readonly Strip[] => {
  const sides = blocks.map((block, index) =>
    flowCell(block, { ...flow, x: flow.x + index * (width + GAP.columns), width }),
  )
  const pad = Math.max(0, ...sides.map(({ box }) => box?.pad.y ?? 0))
  const ground = (canvas: Canvas, shift: number, y: number, height: number) => {
    for (const { box, x } of sides) if (box) paintBox(canvas, flow.shaper, box, x + shift, y, width, height)
  }
  return beside(
    sides.map(({ strips }) => ({ strips, shift: 0 })),
    { top: pad, bottom: pad },
    CONTENT.height,
    ground,
  )
}

/** Children beside each other, row by row; text that is not cut into divs is divided evenly among the columns. */
export const flowGrid = (group: Group, columns: number, flow: Flow): Laid => {
  const width = (flow.width - (columns - 1) * GAP.columns) / columns
  if (!group.blocks.every((block) => block.kind === 'group' || block.kind === 'figure'))
    return flowColumns(group, columns, width, flow)
  const rows: Strip[] = []
  for (let at = 0; at < group.blocks.length; at += columns) {
    const row = gridRow(group.blocks.slice(at, at + columns), width, flow)
    rows.push(...changeFirst(row, { before: at === 0 ? 0 : GAP.rows }))
  }
  return { strips: rows, before: GAP.rows, after: GAP.rows }
}

/** Cuts strips into columns no taller than `height`, never behind a strip that holds on to the next. */
const poured = (strips: readonly Strip[], height: number): readonly (readonly Strip[])[] => {
  let open: Strip[] = []
  const columns = [open]
  let chunk: Strip[] = []
  for (const one of strips) {
    chunk.push(one)
    if (one.hold > 0) continue
    if (open.length > 0 && stackHeight([...open, ...chunk]) > height) {
      open = chunk
      columns.push(open)
    } else open.push(...chunk)
    chunk = []
  }
  open.push(...chunk)
  return columns
}

/** The least height, in steps of a quarter line, at which the strips fit the columns. */
const evenHeight = (strips: readonly Strip[], columns: number): number => {
  let height = stackHeight(strips) / columns
  while (poured(strips, height).length > columns) height += 3
  return height
}

const flowColumns = (group: Group, columns: number, width: number, flow: Flow): Laid => {
  const strips = flow.blocks(group.blocks, { ...flow, width })
  const all = poured(strips, Math.min(CONTENT.height, evenHeight(strips, columns)))
  const rows: Strip[] = []
  for (let at = 0; at < all.length; at += columns) {
    const sides = all
      .slice(at, at + columns)
      .map((side, index) => ({ strips: side, shift: index * (width + GAP.columns) }))
    rows.push(...beside(sides, { top: 0, bottom: 0 }, CONTENT.height, () => undefined))
  }
  return { strips: rows, before: 0, after: flow.base.after }
}
