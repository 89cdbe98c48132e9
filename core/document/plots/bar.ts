import type { Span } from '#core/glossary.ts'
import { COLOUR } from '#core/paper/style.ts'
import { at, svgText } from '../svg-text.ts'

/** A reading against its limit. */
export interface Bar {
  readonly value: number
  readonly limit: number
  /** `most`: the limit is an upper one; `least`: a lower one. */
  readonly side: 'most' | 'least'
  readonly span?: Span
  readonly label: string
}

const WIDTH = 100
const HEIGHT = 11
/** Where the limit stands on the scale. */
const LIMIT_AT = 72

/** Upper limits on a scale from nought; lower ones by how far the reading lies above them, many times over on a log scale. */
function placeOf(value: number, limit: number, side: Bar['side']): number {
  if (side === 'most') return Math.min(WIDTH - 3, (value / limit) * LIMIT_AT)
  const decades = Math.log10(Math.max(value, limit / 1000) / limit)
  return Math.max(3, Math.min(WIDTH - 3, WIDTH - LIMIT_AT + decades * 24))
}

/** Draws a reading as a mark on a sounding line, with its uncertainty, against the limit. */
export function bar({ value, limit, side, span, label }: Bar): string {
  const mid = HEIGHT / 2
  const limitAt = side === 'most' ? LIMIT_AT : WIDTH - LIMIT_AT
  const x = placeOf(value, limit, side)
  const within = side === 'most' ? value <= limit : value >= limit
  const colour = within ? COLOUR.ink : COLOUR.alarm
  const [from, to] = side === 'most' ? [0, limitAt] : [limitAt, WIDTH]
  const ends = span
    ? [placeOf(span.low, limit, side), placeOf(Number.isFinite(span.high) ? span.high : limit * 1000, limit, side)]
    : []
  const [low, high] = ends
  const whisker =
    low === undefined || high === undefined
      ? ''
      : `<path d="M${at(low)} ${mid}H${at(high)}M${at(low)} ${mid - 2}v4M${at(high)} ${mid - 2}v4" stroke="${colour}" stroke-width="0.7" fill="none"/>`
  return `<svg role="img" aria-label="${svgText(label)}" viewBox="0 0 ${WIDTH} ${HEIGHT}" width="100%"><rect x="${at(from)}" y="${mid - 2.6}" width="${at(to - from)}" height="5.2" fill="${COLOUR.depth}"/><line x1="0" y1="${mid}" x2="${WIDTH}" y2="${mid}" stroke="${COLOUR.hairline}" stroke-width="0.5"/>${whisker}<line x1="${limitAt}" y1="0.5" x2="${limitAt}" y2="${HEIGHT - 0.5}" stroke="${COLOUR.alarm}" stroke-width="1.1"/><circle cx="${at(x)}" cy="${mid}" r="2.4" fill="${colour}"/></svg>`
}
