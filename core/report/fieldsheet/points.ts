import type { Measured } from '#core/install.ts'
import { COLOUR } from '#core/paper/style.ts'
import type { Cell } from '../blocks.ts'
import { drawing, rect } from '../draw/svg.ts'
import { readingWithUnit } from '../print.ts'

/** An empty box to write a reading into. */
export function writingBox(name: string, width = 100): string {
  return drawing(width, 22, `Box for ${name}`, [
    rect(0.5, 0.5, width - 1, 21, { fill: COLOUR.paper, stroke: COLOUR.rule, 'stroke-width': 0.8 }),
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

/** A test point as a cell: its limit, and a box; the reading where there is one already. */
export function pointCell({ anchor, name, unit, limit, measured, least }: Point): Cell {
  const given = limit === '' ? {} : { note: limit }
  if (measured === undefined) return { anchor, ...given, svg: writingBox(`${name} in ${unit}`) }
  if (!('value' in measured)) return { anchor, text: 'not tested', note: measured.not_tested }
  return { anchor, text: readingWithUnit(measured, unit, least), ...given }
}

/** The same for what is told in a word, such as the polarity. */
export function wordCell(anchor: string, name: string, word: string | undefined, limit = ''): Cell {
  const given = limit === '' ? {} : { note: limit }
  return word === undefined ? { anchor, ...given, svg: writingBox(name) } : { anchor, text: word }
}
