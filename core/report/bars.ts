import { COLOUR } from '#core/paper/style.ts'
import { circle, drawing, group, line, polygon, rect } from './draw/svg.ts'

/** A reading held against a limit that it may not exceed. */
export interface LimitBar {
  readonly value: number
  readonly most: number
  readonly unit: string
  /** What it is, for those who do not see it. */
  readonly name: string
  /** For a narrow column, for a usual one, or with room to spare. */
  readonly size?: keyof typeof SIZES
  /** The interval in which the true value lies; open ends are drawn to the edge. */
  readonly span?: { readonly low: number; readonly high: number }
}

/** Widths, so that strokes come out alike wherever a bar stands. */
const SIZES = { narrow: 48, usual: 120, wide: 220 } as const
/** A point that leaves its whisker to be seen, also where a few percent are a few hundredths of an inch. */
const POINT = { narrow: 1.5, usual: 2.4, wide: 2.4 } as const
const HEIGHT = 12
const AXIS = 7
/** Where the limit stands, as a part of the width, so that limits line up down a column. */
const LIMIT_AT = 0.7
/** As on a chart: the shallower the water left under the keel, the paler. */
const DEPTHS = [
  { over: 0.5, tint: COLOUR.deep },
  { over: 0.2, tint: COLOUR.depth },
  { over: 0, tint: COLOUR.shoal },
] as const

const placed = (value: number, most: number, width: number): number =>
  Math.max(3, Math.min(width - 3, (value / most) * LIMIT_AT * width))

/**
 * A reading as a point on a line from zero, its uncertainty as a whisker, the limit as a mark; the water between reading
 * and limit is the deeper the larger the margin.
 *
 * @param bar value and limit in one unit, the limit above zero
 */
export function limitBar({ value, most, unit, name, span, size = 'usual' }: LimitBar): string {
  const width = SIZES[size]
  const limit = LIMIT_AT * width
  const place = (reading: number): number => placed(reading, most, width)
  const at = place(value)
  const margin = (most - value) / most
  const tint = DEPTHS.find(({ over }) => margin > over)?.tint
  const words = `${name}: ${value} ${unit}, at most ${Number(most.toPrecision(4))} ${unit}`
  const whisker = span
    ? group({ stroke: COLOUR.ink, 'stroke-width': 0.7 }, [
        line(place(span.low), AXIS, place(span.high), AXIS),
        line(place(span.low), AXIS - 2.6, place(span.low), AXIS + 2.6),
        line(place(span.high), AXIS - 2.6, place(span.high), AXIS + 2.6),
      ])
    : ''
  const over = value > most
  return drawing(width, HEIGHT, words, [
    tint === undefined ? '' : rect(at, AXIS - 3.4, limit - at, 6.8, { fill: tint }),
    line(0, AXIS, width, AXIS, { stroke: COLOUR.hairline, 'stroke-width': 0.7 }),
    line(limit, 1.5, limit, HEIGHT, { stroke: COLOUR.alarm, 'stroke-width': 1.3 }),
    whisker,
    over
      ? polygon([at - 3, AXIS - 3, at + 3, AXIS - 3, at + 3, AXIS + 3, at - 3, AXIS + 3], { fill: COLOUR.alarm })
      : circle(at, AXIS, POINT[size], { fill: COLOUR.ink }),
  ])
}
