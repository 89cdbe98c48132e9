/** A cubic curve's two control points and its end. */
export type Curve = readonly [number, number, number, number, number, number]

interface Arc {
  readonly rx: number
  readonly ry: number
  readonly rotation: number
  readonly large: boolean
  readonly sweep: boolean
}

const QUARTER = Math.PI / 2

/** Signed angle from one vector to another, in radians. */
const angle = (ux: number, uy: number, vx: number, vy: number): number =>
  Math.atan2(ux * vy - uy * vx, ux * vx + uy * vy)

/** Centre, start angle, and turn of an arc given by its end points (SVG 2, B.2.4), radii made large enough (B.2.5). */
const centred = (x0: number, y0: number, arc: Arc, x: number, y: number) => {
  const cos = Math.cos(arc.rotation)
  const sin = Math.sin(arc.rotation)
  const dx = (x0 - x) / 2
  const dy = (y0 - y) / 2
  const px = cos * dx + sin * dy
  const py = -sin * dx + cos * dy
  const reach = Math.sqrt((px / arc.rx) ** 2 + (py / arc.ry) ** 2)
  const rx = arc.rx * Math.max(1, reach)
  const ry = arc.ry * Math.max(1, reach)
  const rest = (rx * ry) ** 2 - (rx * py) ** 2 - (ry * px) ** 2
  const factor = Math.sqrt(Math.max(0, rest) / ((rx * py) ** 2 + (ry * px) ** 2)) * (arc.large === arc.sweep ? -1 : 1)
  const ox = (factor * rx * py) / ry
  const oy = (-factor * ry * px) / rx
  const start = angle(1, 0, (px - ox) / rx, (py - oy) / ry)
  const turn = angle((px - ox) / rx, (py - oy) / ry, (-px - ox) / rx, (-py - oy) / ry)
  const full = 2 * Math.PI
  const swept = arc.sweep && turn < 0 ? turn + full : !arc.sweep && turn > 0 ? turn - full : turn
  return {
    cx: cos * ox - sin * oy + (x0 + x) / 2,
    cy: sin * ox + cos * oy + (y0 + y) / 2,
    rx,
    ry,
    cos,
    sin,
    start,
    swept,
  }
}

/**
 * An elliptical arc as cubic curves, one for each started quarter turn (error below 0.03 % of the radius).
 *
 * @param x0 start, in the drawing's units
 * @param arc radii above zero, rotation in radians, and which of the four possible arcs is meant
 * @param x end
 * @source SVG 2 (W3C Candidate Recommendation 2018), appendix B.2
 */
export const arcCurves = (x0: number, y0: number, arc: Arc, x: number, y: number): readonly Curve[] => {
  if (x0 === x && y0 === y) return []
  const { cx, cy, rx, ry, cos, sin, start, swept } = centred(x0, y0, arc, x, y)
  const count = Math.max(1, Math.ceil(Math.abs(swept) / QUARTER - 1e-9))
  const step = swept / count
  const pull = (4 / 3) * Math.tan(step / 4)
  const point = (ex: number, ey: number): [number, number] => [
    cx + cos * rx * ex - sin * ry * ey,
    cy + sin * rx * ex + cos * ry * ey,
  ]
  return Array.from({ length: count }, (_, index) => {
    const from = start + index * step
    const to = from + step
    const first = point(Math.cos(from) - pull * Math.sin(from), Math.sin(from) + pull * Math.cos(from))
    const second = point(Math.cos(to) + pull * Math.sin(to), Math.sin(to) - pull * Math.cos(to))
    const end: [number, number] = index === count - 1 ? [x, y] : point(Math.cos(to), Math.sin(to))
    return [...first, ...second, ...end] as const
  })
}
