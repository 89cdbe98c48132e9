import type { Flow } from './flow.ts'
import { styled } from './flow.ts'
import { extent } from './lines.ts'
import { BLOCK, CELL, LIST, type TextStyle } from './style.ts'
import type { Block, Cell, Column, Row, Table } from './tree.ts'

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

/** Each cell that alone fills a column without a width, with the column and its number. */
const deciding = (
  table: Table,
  row: Row,
): readonly { readonly cell: Cell; readonly column: Column; readonly index: number }[] => {
  let at = 0
  return row.cells.flatMap((cell) => {
    const index = at
    at += cell.span
    const column = table.columns[index]
    return cell.span === 1 && column && column.share === undefined ? [{ cell, column, index }] : []
  })
}

/** What a column asks for by its own cells, cells over several columns left out. */
interface Asked extends Extent {
  readonly share: number | undefined
}

const asked = (table: Table, flow: Flow): readonly Asked[] => {
  const cells = [...table.head, ...table.bodies.flat()].flatMap((row) =>
    deciding(table, row).map(({ cell, column, index }) => {
      const classes = [...flow.inherited, ...column.classes, ...row.classes, ...cell.classes]
      const style = cell.header ? BLOCK.rowHeader.text : BLOCK.cell.text
      const { least, most } = widest(cell.blocks, { style, classes }, flow)
      return { index, least: least + 2 * CELL.x, most: most + 2 * CELL.x }
    }),
  )
  return table.columns.map(({ share }, index) => {
    const own = cells.filter((cell) => cell.index === index)
    return {
      share,
      least: Math.max(0, ...own.map(({ least }) => least)),
      most: Math.max(0, ...own.map(({ most }) => most)),
    }
  })
}

const total = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0)

/**
 * Shares out `room` among columns: the least to each, the rest by what they would like, and what is left over by their
 * size; evenly where no column has a cell of its own.
 */
const sharing = (columns: readonly Extent[], room: number): ((column: Extent) => number) => {
  const least = total(columns.map((column) => column.least))
  const most = total(columns.map((column) => column.most))
  if (most === 0) return () => room / columns.length
  if (most <= room) return (column) => column.most + ((room - most) * column.most) / most
  if (least >= room) return (column) => (column.least * room) / least
  return (column) => column.least + ((room - least) * (column.most - column.least)) / (most - least)
}

/**
 * The width of each column, in points; together they are as wide as the flow.
 *
 * @param table with shares in percent, or none where the content decides
 * @param flow where the table stands
 */
export const columnWidths = (table: Table, flow: Flow): readonly number[] => {
  const shares = table.columns.flatMap(({ share }) => share ?? [])
  const given = total(shares)
  if (shares.length === table.columns.length) return shares.map((share) => (share / given) * flow.width)
  const columns = asked(table, flow)
  const open = columns.filter(({ share }) => share === undefined)
  const width = sharing(open, Math.max(0, 1 - given / 100) * flow.width)
  return columns.map((column) => (column.share === undefined ? width(column) : (column.share / 100) * flow.width))
}
