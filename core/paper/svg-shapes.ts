import type { Segment } from './svg-path.ts'

/** How far the control points of a quarter circle stand out, as a part of the radius. */
const PULL = (4 / 3) * (Math.SQRT2 - 1)

/** An ellipse as four curves. */
export const ellipse = (cx: number, cy: number, rx: number, ry: number): readonly Segment[] => {
  const [px, py] = [rx * PULL, ry * PULL]
  return [
    ['M', cx + rx, cy],
    ['C', cx + rx, cy + py, cx + px, cy + ry, cx, cy + ry],
    ['C', cx - px, cy + ry, cx - rx, cy + py, cx - rx, cy],
    ['C', cx - rx, cy - py, cx - px, cy - ry, cx, cy - ry],
    ['C', cx + px, cy - ry, cx + rx, cy - py, cx + rx, cy],
    ['Z'],
  ]
}

/** A rectangle, its corners rounded by `r` where that is above zero and at most half the shorter side. */
export const rectangle = (x: number, y: number, width: number, height: number, r: number): readonly Segment[] => {
  const [right, bottom] = [x + width, y + height]
  if (r <= 0) return [['M', x, y], ['L', right, y], ['L', right, bottom], ['L', x, bottom], ['Z']]
  const round = Math.min(r, width / 2, height / 2)
  const rest = round * (1 - PULL)
  return [
    ['M', x + round, y],
    ['L', right - round, y],
    ['C', right - rest, y, right, y + rest, right, y + round],
    ['L', right, bottom - round],
    ['C', right, bottom - rest, right - rest, bottom, right - round, bottom],
    ['L', x + round, bottom],
    ['C', x + rest, bottom, x, bottom - rest, x, bottom - round],
    ['L', x, y + round],
    ['C', x, y + rest, x + rest, y, x + round, y],
    ['Z'],
  ]
}

/** Straight lines from point to point, from an even number of coordinates. */
export const polyline = (points: readonly number[], closed: boolean): readonly Segment[] => {
  const segments: Segment[] = []
  for (let i = 0; i + 1 < points.length; i += 2) {
    segments.push([i === 0 ? 'M' : 'L', Number(points[i]), Number(points[i + 1])])
  }
  return closed ? [...segments, ['Z']] : segments
}
