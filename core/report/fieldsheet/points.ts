import type { Measured } from '#core/glossary.ts'
import { CELL, COLOUR, CONTENT } from '#core/paper/style.ts'
import type { Cell } from '../blocks.ts'
import { drawing, rect } from '../draw/svg.ts'
import { readingWithUnit } from '../print.ts'

/** Points: high enough for a pen on a knee. */
const HEIGHT = 23

/**
 * An empty box to write a reading into, equally high in every column.
 *
 * @param name what is written there
 * @param column width of the column in % of the table
 */
export function writingBox(name: string, column: number): string {
  const width = (CONTENT.width * column) / 100 - 2 * CELL.x
  return drawing(width, HEIGHT, `Box for ${name}`, [
    rect(0.5, 0.5, width - 1, HEIGHT - 1, { fill: COLOUR.paper, stroke: COLOUR.rule, 'stroke-width': 0.8 }),
  ])
}

/** One test point: what is read, and what it is held against. */
export interface Point {
  readonly anchor: string
  readonly name: string
  readonly unit: string
  readonly limit: string
  readonly measured: Measured | undefined
  /** Decimals that a reading has at least. */
  readonly least: number
}

/** A test point that is told in a word, such as the polarity. */
export interface WordPoint {
  readonly anchor: string
  readonly name: string
  readonly word: string | undefined
  readonly limit?: string
}

/** A test point as a cell: its limit, and a box; the reading where there is one already. */
export function pointCell({ anchor, name, unit, limit, measured, least }: Point, column: number): Cell {
  const given = limit === '' ? {} : { note: limit }
  if (measured === undefined) return { anchor, ...given, svg: writingBox(`${name} in ${unit}`, column) }
  if (!('value' in measured)) return { anchor, text: 'not tested', note: measured.not_tested }
  return { anchor, text: readingWithUnit(measured, unit, least), ...given }
}

/** The same for what is told in a word. */
export function wordCell({ anchor, name, word, limit }: WordPoint, column: number): Cell {
  const given = limit === undefined ? {} : { note: limit }
  return word === undefined ? { anchor, ...given, svg: writingBox(name, column) } : { anchor, text: word }
}
