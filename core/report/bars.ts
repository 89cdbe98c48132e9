import { COLOUR } from '#core/paper/style.ts'
import { circle, drawing, group, line, polygon, rect } from './draw/svg.ts'

/** A reading held against a limit that it may not exceed. */
export interface LimitBar {
  readonly value: number
  readonly most: number
  readonly unit: string
  /** What it is, for those who do not see it. */
  readonly name: string
  /** The interval in which the true value lies; open ends are drawn to the edge. */
  readonly span?: { readonly low: number; readonly high: number }
}

const WIDTH = 120
const HEIGHT = 12
const AXIS = 7
/** Where the limit stands, so that limits line up down a column. */
const LIMIT_AT = 84
/** As on a chart: the shallower the water left under the keel, the paler. */
const DEPTHS = [
  { over: 0.5, tint: COLOUR.deep },
  { over: 0.2, tint: COLOUR.depth },
  { over: 0, tint: COLOUR.shoal },
] as const

const place = (value: number, most: number): number => Math.max(2, Math.min(WIDTH - 3, (value / most) * LIMIT_AT))

/**
 * A reading as a point on a line from zero, its uncertainty as a whisker, the limit as a mark; the water between reading
 * and limit is the deeper the larger the margin.
 *
 * @param bar value and limit in one unit, the limit above zero
 */
export function limitBar({ value, most, unit, name, span }: LimitBar): string {
  const at = place(value, most)
  const margin = (most - value) / most
  const tint = DEPTHS.find(({ over }) => margin > over)?.tint
  const words = `${name}: ${value} ${unit}, at most ${Number(most.toPrecision(4))} ${unit}`
  const whisker = span
    ? group({ stroke: COLOUR.ink, 'stroke-width': 0.9 }, [
        line(place(span.low, most), AXIS, place(span.high, most), AXIS),
        line(place(span.low, most), AXIS - 2.6, place(span.low, most), AXIS + 2.6),
        line(place(span.high, most), AXIS - 2.6, place(span.high, most), AXIS + 2.6),
      ])
    : ''
  const over = value > most
  return drawing(WIDTH, HEIGHT, words, [
    tint === undefined ? '' : rect(at, AXIS - 3.4, LIMIT_AT - at, 6.8, { fill: tint }),
    line(0, AXIS, WIDTH, AXIS, { stroke: COLOUR.hairline, 'stroke-width': 0.7 }),
    line(LIMIT_AT, 1.5, LIMIT_AT, HEIGHT, { stroke: COLOUR.alarm, 'stroke-width': 1.3 }),
    whisker,
    over
      ? polygon([at - 3, AXIS - 3, at + 3, AXIS - 3, at + 3, AXIS + 3, at - 3, AXIS + 3], { fill: COLOUR.alarm })
      : circle(at, AXIS, 2.7, { fill: COLOUR.ink }),
  ])
}
