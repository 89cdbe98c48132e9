import type { Flow } from './flow.ts'
import { styled } from './flow.ts'
import { extent } from './lines.ts'
import { BLOCK, CELL, LIST, type TextStyle } from './style.ts'
import type { Block, Cell, Row, Table } from './tree.ts'

interface Extent {
  readonly least: number
  readonly most: number
}

/** A drawing in a cell asks for this much, in points, unless the column has a width. */
const PICTURE = 60

/** How the words of a cell look: its own style, and every class that reaches it. */
interface Setting {
  readonly style: TextStyle
  readonly classes: readonly string[]
}

const measured = (block: Block, setting: Setting, flow: Flow): Extent => {
  if (block.kind === 'paragraph' || block.kind === 'heading') {
    const base = block.kind === 'heading' ? BLOCK[`h${block.level}`].text : setting.style
    return extent(flow.shaper.words(block.runs, styled(base, [...setting.classes, ...block.classes])))
  }
  if (block.kind === 'list') {
    const inner = widest(block.items.flat(), setting, flow)
    return { least: inner.least + LIST.indent, most: inner.most + LIST.indent }
  }
  if (block.kind === 'group') return widest(block.blocks, setting, flow)
  return { least: PICTURE, most: block.kind === 'figure' ? PICTURE : flow.width / 2 }
}

const widest = (blocks: readonly Block[], setting: Setting, flow: Flow): Extent =>
  blocks.reduce<Extent>(
    (sum, block) => {
      const own = measured(block, setting, flow)
      return { least: Math.max(sum.least, own.least), most: Math.max(sum.most, own.most) }
    },
    { least: 0, most: 0 },
  )

/** Each cell that alone fills a column without a width, with the column's number. */
const deciding = (table: Table, row: Row): readonly { readonly cell: Cell; readonly column: number }[] => {
  let at = 0
  return row.cells.flatMap((cell) => {
    const column = at
    at += cell.span
    return cell.span === 1 && table.columns[column]?.share === undefined ? [{ cell, column }] : []
  })
}

/** What each column's own cells ask for, cells over several columns left out. */
const asked = (table: Table, flow: Flow): readonly Extent[] => {
  const extents = table.columns.map((): Extent => ({ least: 0, most: 0 }))
  for (const row of [...table.head, ...table.bodies.flat()]) {
    for (const { cell, column } of deciding(table, row)) {
      const classes = [...flow.inherited, ...(table.columns[column]?.classes ?? []), ...row.classes, ...cell.classes]
      const style = cell.header ? BLOCK.rowHeader.text : BLOCK.cell.text
      const { least, most } = widest(cell.blocks, { style, classes }, flow)
      const before = extents[column] ?? { least: 0, most: 0 }
      extents[column] = {
        least: Math.max(before.least, least + 2 * CELL.x),
        most: Math.max(before.most, most + 2 * CELL.x),
      }
    }
  }
  return extents
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
