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

interface Rule {
  readonly at: 'top' | 'bottom'
  readonly colour: string
  readonly width: number
}

const OPENING: Rule = { at: 'top', colour: COLOUR.ink, width: 0.8 }
const UNDER_HEAD: Rule = { at: 'bottom', colour: COLOUR.ink, width: HAIRLINE }
const BETWEEN_GROUPS: Rule = { at: 'top', colour: COLOUR.rule, width: HAIRLINE }
const BETWEEN_ROWS: Rule = { at: 'bottom', colour: COLOUR.hairline, width: HAIRLINE * 0.8 }

const rulesOf = ({ part, index, last, group }: RowPlace, plain: boolean): readonly Rule[] => {
  const first = index === 0
  if (part === 'head') return [...(first ? [OPENING] : []), ...(last ? [UNDER_HEAD] : [])]
  return [...(first && group > 0 ? [BETWEEN_GROUPS] : []), ...(last || plain ? [] : [BETWEEN_ROWS])]
}

/**
 * What lies under a row: its ground, the line above the first header row, and the line below.
 *
 * @param table the table's classes: `zebra` shades every second row, `plain` leaves out the lines between rows
 */
export const rowPainter = (row: Row, table: readonly string[], place: RowPlace, x: number, width: number) => {
  const ground = groundOf(row, table, place)
  const bar = row.classes.map((name) => BAR[name]).find((colour) => colour)
  const rules = rulesOf(place, table.includes('plain'))
  return (canvas: Canvas, shift: number, y: number, height: number): void => {
    const left = x + shift
    canvas.artifact('/Type /Layout', () => {
      if (ground) canvas.rectangle(left, y, width, height, ground)
      if (bar) canvas.rectangle(left, y, 2.2, height, bar)
      for (const rule of rules) {
        const at = rule.at === 'top' ? y : y + height
        canvas.rule(left, at, left + width, at, rule)
      }
    })
  }
}
