import type { Flow } from './flow.ts'
import { styled } from './flow.ts'
import { extent } from './lines.ts'
import { BLOCK, CELL, LIST } from './style.ts'
import type { Block, Cell, Table } from './tree.ts'

interface Extent {
  readonly least: number
  readonly most: number
}

/** A drawing in a cell asks for this much, in points, unless the column has a width. */
const PICTURE = 60

const measured = (block: Block, cell: Cell, flow: Flow): Extent => {
  if (block.kind === 'figure') return { least: PICTURE, most: PICTURE }
  if (block.kind === 'paragraph' || block.kind === 'heading') {
    const style = styled(cell.header ? BLOCK.rowHeader.text : BLOCK.cell.text, block.classes)
    return extent(flow.shaper.words(block.runs, style))
  }
  if (block.kind === 'list') {
    const inner = widest(block.items.flat(), cell, flow)
    return { least: inner.least + LIST.indent, most: inner.most + LIST.indent }
  }
  return block.kind === 'group' ? widest(block.blocks, cell, flow) : { least: PICTURE, most: flow.width / 2 }
}

const widest = (blocks: readonly Block[], cell: Cell, flow: Flow): Extent =>
  blocks.reduce<Extent>(
    (sum, block) => {
      const own = measured(block, cell, flow)
      return { least: Math.max(sum.least, own.least), most: Math.max(sum.most, own.most) }
    },
    { least: 0, most: 0 },
  )

/** What each column's own cells ask for, cells over several columns left out. */
const asked = (table: Table, flow: Flow): readonly Extent[] => {
  const columns = table.columns.map(() => ({ least: 0, most: 0 }))
  for (const row of [...table.head, ...table.bodies.flat()]) {
    let at = 0
    for (const cell of row.cells) {
      const column = columns[at]
      at += cell.span
      if (!column || cell.span > 1 || table.columns[at - 1]?.share !== undefined) continue
      const { least, most } = widest(cell.blocks, cell, flow)
      column.least = Math.max(column.least, least + 2 * CELL.x)
      column.most = Math.max(column.most, most + 2 * CELL.x)
    }
  }
  return columns
}

const total = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0)

/** Shares out `room` among columns: the least to each, the rest by what they would like, and what is left over by their size. */
const shared = (extents: readonly Extent[], room: number): readonly number[] => {
  const least = total(extents.map((column) => column.least))
  const most = total(extents.map((column) => column.most))
  if (most <= room) return extents.map((column) => column.most + ((room - most) * column.most) / (most || 1))
  if (least >= room) return extents.map((column) => (column.least * room) / least)
  return extents.map((column) => column.least + ((room - least) * (column.most - column.least)) / (most - least))
}

/**
 * The width of each column, in points; together they are as wide as the flow.
 *
 * @param table with shares in percent, or none where the content decides
 * @param flow where the table stands
 */
export const columnWidths = (table: Table, flow: Flow): readonly number[] => {
  const shares = table.columns.map(({ share }) => share)
  const given = total(shares.map((share) => share ?? 0))
  const free = shares.some((share) => share === undefined)
  if (!free) return shares.map((share) => ((share ?? 0) / given) * flow.width)
  const extents = asked(table, flow).filter((_, index) => shares[index] === undefined)
  const widths = [...shared(extents, Math.max(0, 1 - given / 100) * flow.width)]
  return shares.map((share) => (share === undefined ? (widths.shift() ?? 0) : (share / 100) * flow.width))
}
