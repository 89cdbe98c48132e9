import { attribute, type Element, problem } from './markup.ts'

/** The six numbers of a PDF or SVG matrix: a b c d e f. */
export type Transform = readonly [number, number, number, number, number, number]

/** First `inner`, then `outer`. */
const after = (outer: Transform, inner: Transform): Transform => {
  const [a, b, c, d, e, f] = outer
  const [p, q, r, s, t, u] = inner
  return [a * p + c * q, b * p + d * q, a * r + c * s, b * r + d * s, a * t + c * u + e, b * t + d * u + f]
}

const turned = (degrees: number, x: number, y: number): Transform => {
  const angle = (degrees * Math.PI) / 180
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)]
  return [cos, sin, -sin, cos, x - cos * x + sin * y, y - sin * x - cos * y]
}

const MAKERS: Readonly<Record<string, (values: readonly number[]) => Transform | undefined>> = {
  translate: ([x, y = 0]) => (x === undefined ? undefined : [1, 0, 0, 1, x, y]),
  scale: ([x, y = x]) => (x === undefined || y === undefined ? undefined : [x, 0, 0, y, 0, 0]),
  rotate: ([degrees, x = 0, y = 0]) => (degrees === undefined ? undefined : turned(degrees, x, y)),
}

/**
 * The `transform` of a node: translate(x y), scale(x y), rotate(degrees x y), one or several.
 *
 * @returns the matrix, or nothing when there is no such attribute
 * @throws PaperError svg-value for any other transform
 */
export const readTransform = (element: Element): Transform | undefined => {
  const value = attribute(element, 'transform')?.trim()
  if (value === undefined || value === '') return undefined
  let matrix: Transform = [1, 0, 0, 1, 0, 0]
  const rest = value.replace(/([a-zA-Z]+)\s*\(([^)]*)\)[\s,]*/g, (part, name: string, list: string) => {
    const numbers = list
      .split(/[\s,]+/)
      .filter((word) => word !== '')
      .map(Number)
    const made = numbers.every(Number.isFinite) ? MAKERS[name]?.(numbers) : undefined
    if (!made) return part
    matrix = after(matrix, made)
    return ''
  })
  if (rest === '') return matrix
  throw problem(
    'svg-value',
    element,
    `transform is “${value}”. Allowed: translate(x y), scale(x y), rotate(degrees x y).`,
  )
}
