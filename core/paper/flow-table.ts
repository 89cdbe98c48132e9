import type { StructureElement } from 'pdfkit'
import { beside } from './beside.ts'
import type { Canvas } from './canvas.ts'
import { columnWidths } from './columns.ts'
import { child, type Flow, type Laid, styled, textStrips } from './flow.ts'
import { flowInto } from './flow-list.ts'
import { type RowPlace, rowPainter } from './row-paint.ts'
import { changeFirst, type Frame, framed, type Hold, type Strip, stackHeight } from './strips.ts'
import { BLOCK, type BlockStyle, CELL, COLOUR, CONTENT } from './style.ts'
import type { Cell, Row, Table } from './tree.ts'

/** A table below this height, in points, is not divided between pages. */
const SMALL = 150

const SCOPE: Readonly<Record<string, string>> = { col: 'Column', colgroup: 'Column', row: 'Row', rowgroup: 'Row' }

const cellElement = (cell: Cell, parent: StructureElement, flow: Flow): StructureElement => {
  const element = child({ ...flow, parent }, cell.header ? 'TH' : 'TD')
  const scope = SCOPE[cell.scope ?? '']
  if (cell.header || cell.span > 1) {
    element.dictionary.data.A = { O: 'Table', Scope: scope, ColSpan: cell.span > 1 ? cell.span : undefined }
  }
  return element
}

const cellStyle = (cell: Cell, inHead: boolean): BlockStyle => {
  const style = cell.header ? (inHead ? BLOCK.header : BLOCK.rowHeader) : BLOCK.cell
  return { ...style, after: 2 }
}

/** Lays out rows of one table; the same widths and the same flow for all of them. */
class Rows {
  readonly #table: Table
  readonly #flow: Flow
  readonly #widths: readonly number[]

  constructor(table: Table, flow: Flow) {
    this.#table = table
    this.#flow = flow
    this.#widths = columnWidths(table, flow)
  }

  /** One strip a row, more only for a row that is taller than `limit`. */
  strips(row: Row, parent: StructureElement, place: RowPlace, limit: number): readonly Strip[] {
    const element = child({ ...this.#flow, parent }, 'TR')
    let column = 0
    const sides = row.cells.map((cell) => {
      const strips = this.#cell(cell, row, element, column, place.part === 'head')
      column += cell.span
      return { strips, shift: 0 }
    })
    const paint = rowPainter(row, this.#table.classes, place, this.#flow.x, this.#flow.width)
    return beside(sides, { top: CELL.top, bottom: CELL.bottom }, limit, paint)
  }

  #cell(cell: Cell, row: Row, parent: StructureElement, column: number, inHead: boolean): readonly Strip[] {
    const left = this.#widths.slice(0, column).reduce((sum, width) => sum + width, 0)
    const width = this.#widths.slice(column, column + cell.span).reduce((sum, one) => sum + one, 0)
    const alone = this.#table.columns.slice(column, cell.span === 1 ? column + 1 : column)
    const classes = alone.flatMap((one) => one.classes)
    const inner: Flow = {
      ...this.#flow,
      x: this.#flow.x + left + CELL.x,
      width: Math.max(1, width - 2 * CELL.x),
      base: cellStyle(cell, inHead),
      inherited: [...this.#flow.inherited, ...classes, ...row.classes, ...cell.classes],
    }
    return flowInto(cell.blocks, cellElement(cell, parent, this.#flow), inner)
  }
}

const held = (strips: readonly Strip[], hold: Hold): readonly Strip[] => strips.map((one) => ({ ...one, hold }))

const captionStrips = (table: Table, element: StructureElement, flow: Flow): readonly Strip[] => {
  if (table.caption.length === 0) return []
  const caption = child({ ...flow, parent: element }, 'Caption')
  const lines = held(textStrips(flow, caption, table.caption, styled(BLOCK.caption.text, [])), 2)
  return lines
}

const headStrips = (table: Table, element: StructureElement, flow: Flow, rows: Rows): readonly Strip[] => {
  if (table.head.length === 0) return []
  const part = child({ ...flow, parent: element }, 'THead')
  const last = table.head.length - 1
  const strips = table.head.flatMap((row, index) =>
    rows.strips(row, part, { part: 'head', index, last: index === last, group: 0 }, CONTENT.height / 2),
  )
  return held(strips, 2)
}

/** The first two rows and the last two stay together; groups of a table with several, and tables with `keep`, stay whole. */
const holdOf = (index: number, count: number, whole: boolean): Hold => {
  if (index === count - 1) return 0
  if (whole) return 1
  return index === 0 || index === count - 2 ? 1 : 0
}

const bodyStrips = (
  table: Table,
  element: StructureElement,
  flow: Flow,
  rows: Rows,
  limit: number,
): readonly Strip[] => {
  const groups = table.bodies.map((body, group) => {
    const part = child({ ...flow, parent: element }, 'TBody')
    return body.flatMap((row, index) =>
      rows.strips(row, part, { part: 'body', index, last: index === body.length - 1, group }, limit),
    )
  })
  const small = groups.reduce((sum, group) => sum + stackHeight(group), 0) < SMALL
  return groups.flatMap((group, at) =>
    group.map((one, index) => {
      const end = index === group.length - 1
      const hold = small && end && at < groups.length - 1 ? 1 : holdOf(index, group.length, small || groups.length > 1)
      return { ...one, hold }
    }),
  )
}

/** A table: caption above, header rows repeated at the top of each page that it reaches, a closing line below. */
export const flowTable = (table: Table, flow: Flow): Laid => {
  const element = child(flow, 'Table')
  const rows = new Rows(table, flow)
  const caption = captionStrips(table, element, flow)
  const head = headStrips(table, element, flow, rows)
  const body = bodyStrips(table, element, flow, rows, CONTENT.height - stackHeight(head))
  const close = (canvas: Canvas, shift: number, _top: number, bottom: number) => {
    const [left, right] = [flow.x + shift, flow.x + shift + flow.width]
    canvas.artifact('/Type /Layout', () => canvas.rule(left, bottom, right, bottom, { colour: COLOUR.ink, width: 0.8 }))
  }
  const frame: Frame = { head, over: close }
  const inner = framed([...head, ...body], frame)
  const spaced = caption.length > 0 ? changeFirst(inner, { before: BLOCK.caption.after }) : inner
  return { strips: [...caption, ...spaced], before: BLOCK.table.before, after: BLOCK.table.after }
}
