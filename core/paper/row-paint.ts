import type { Canvas } from './canvas.ts'
import { COLOUR, HAIRLINE } from './style.ts'
import type { Row } from './tree.ts'

/** Where a row stands in its table. */
export interface RowPlace {
  readonly part: 'head' | 'body'
  readonly index: number
  /** Whether it is the last of its part. */
  readonly last: boolean
  /** Which of the groups of rows it belongs to, from 0. */
  readonly group: number
}

const GROUND: Readonly<Record<string, string>> = {
  group: COLOUR.depth,
  total: COLOUR.shoal,
  'row-fails': COLOUR.alarmTint,
  'row-island': COLOUR.lampTint,
}

const BAR: Readonly<Record<string, string>> = { 'row-fails': COLOUR.alarm, 'row-island': COLOUR.lamp }

/** A row that is one header over all columns names the group below it. */
const isGroup = ({ cells }: Row): boolean => cells.length === 1 && cells[0]?.header === true

const groundOf = (row: Row, table: readonly string[], place: RowPlace): string | undefined => {
  const own = row.classes.map((name) => GROUND[name]).find((colour) => colour)
  if (own) return own
  if (place.part === 'body' && isGroup(row)) return COLOUR.depth
  return place.part === 'body' && table.includes('zebra') && place.index % 2 === 1 ? COLOUR.shoal : undefined
}

/**
 * What lies under a row: its ground, the line above the first header row, and the line below.
 *
 * @param table the table's classes: `zebra` shades every second row, `plain` leaves out the lines between rows
 */
export const rowPainter =
  (row: Row, table: readonly string[], place: RowPlace, x: number, width: number) =>
  (canvas: Canvas, shift: number, y: number, height: number): void => {
    const left = x + shift
    const rule = (at: number, colour: string, weight: number) =>
      canvas.rule(left, at, left + width, at, { colour, width: weight })
    canvas.artifact('/Type /Layout', () => {
      const ground = groundOf(row, table, place)
      if (ground) canvas.rectangle(left, y, width, height, ground)
      const bar = row.classes.map((name) => BAR[name]).find((colour) => colour)
      if (bar) canvas.rectangle(left, y, 2.2, height, bar)
      if (place.part === 'head' && place.index === 0) rule(y, COLOUR.ink, 0.8)
      if (place.part === 'head' && place.last) rule(y + height, COLOUR.ink, HAIRLINE)
      if (place.part === 'body' && place.index === 0 && place.group > 0) rule(y, COLOUR.rule, HAIRLINE)
      if (place.part === 'body' && !place.last && !table.includes('plain')) rule(y + height, COLOUR.hairline, HAIRLINE * 0.8)
    })
  }
