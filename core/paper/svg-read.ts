import { attribute, content, type Element, elements, isElement, isText, type Node, placeOf, problem } from './markup.ts'
import type { Place } from './problems.ts'
import type { SvgStyle } from './style.ts'
import { FIRST_PAINT, numberOf, PAINT_ATTRIBUTES, type Paint, paintOf } from './svg-paint.ts'
import { readPath, type Segment } from './svg-path.ts'
import { ellipse, polyline, rectangle } from './svg-shapes.ts'
import { readTransform, type Transform } from './svg-transform.ts'

/** A drawing, checked and ready to be drawn at any size. */
export interface SvgPicture {
  readonly box: { readonly x: number; readonly y: number; readonly width: number; readonly height: number }
  readonly nodes: readonly SvgNode[]
}

export type SvgNode = { readonly transform: Transform | undefined } & (
  | { readonly kind: 'group'; readonly nodes: readonly SvgNode[] }
  | { readonly kind: 'path'; readonly segments: readonly Segment[]; readonly paint: Paint }
  | {
      readonly kind: 'text'
      readonly text: string
      readonly x: number
      readonly y: number
      readonly paint: Paint
      readonly place: Place
    }
)

type Styles = Readonly<Record<string, SvgStyle>>

const GEOMETRY: Readonly<Record<string, readonly string[]>> = {
  svg: ['viewBox', 'role', 'aria-label', 'width', 'height', 'xmlns', 'preserveAspectRatio', 'focusable'],
  g: [],
  path: ['d'],
  line: ['x1', 'y1', 'x2', 'y2'],
  polyline: ['points'],
  polygon: ['points'],
  rect: ['x', 'y', 'width', 'height', 'rx'],
  circle: ['cx', 'cy', 'r'],
  ellipse: ['cx', 'cy', 'rx', 'ry'],
  text: ['x', 'y', 'dy'],
  title: [],
  desc: [],
}
const EVERYWHERE = ['class', 'id', 'transform', 'aria-hidden']

const checkNode = (element: Element): void => {
  const own = GEOMETRY[element.tagName]
  if (!own) {
    const known = Object.keys(GEOMETRY).map((tag) => `<${tag}>`)
    throw problem(
      'unknown-tag',
      element,
      `<${element.tagName}> is not part of the drawings' SVG. Allowed: ${known.join(', ')}.`,
    )
  }
  for (const { name } of element.attrs) {
    if (own.includes(name) || EVERYWHERE.includes(name) || name in PAINT_ATTRIBUTES || name.startsWith('data-'))
      continue
    throw problem(
      'unknown-attribute',
      element,
      `<${element.tagName}> has an attribute ${name}, which drawings do not know.`,
    )
  }
}

const number = (element: Element, name: string, missing = 0): number => {
  const value = attribute(element, name)
  return value === undefined ? missing : numberOf(element, name, value)
}

const points = (element: Element): readonly number[] => {
  const parts = (attribute(element, 'points') ?? '')
    .trim()
    .split(/[\s,]+/)
    .filter((part) => part !== '')
  if (parts.length % 2 === 0) return parts.map((part) => numberOf(element, 'points', part))
  throw problem('svg-value', element, `points of <${element.tagName}> has an odd count of numbers. Each point is x,y.`)
}

const pathOf = (element: Element): readonly Segment[] =>
  readPath(attribute(element, 'd') ?? '', (sentence) => problem('svg-value', element, sentence))

const SHAPES: Readonly<Record<string, (element: Element) => readonly Segment[]>> = {
  path: pathOf,
  line: (e) => [
    ['M', number(e, 'x1'), number(e, 'y1')],
    ['L', number(e, 'x2'), number(e, 'y2')],
  ],
  polyline: (e) => polyline(points(e), false),
  polygon: (e) => polyline(points(e), true),
  rect: (e) => rectangle(number(e, 'x'), number(e, 'y'), number(e, 'width'), number(e, 'height'), number(e, 'rx')),
  circle: (e) => ellipse(number(e, 'cx'), number(e, 'cy'), number(e, 'r'), number(e, 'r')),
  ellipse: (e) => ellipse(number(e, 'cx'), number(e, 'cy'), number(e, 'rx'), number(e, 'ry')),
}

/** `dy` moves text by user units, or by its own size when written in em. */
const shift = (element: Element, paint: Paint): number => {
  const value = attribute(element, 'dy') ?? '0'
  return value.endsWith('em')
    ? numberOf(element, 'dy', value.slice(0, -2)) * paint.fontSize
    : numberOf(element, 'dy', value)
}

const words = (element: Element): string => {
  const inner = elements(element)[0]
  if (inner)
    throw problem('misplaced-tag', inner, `<${inner.tagName}> may not stand in <text>. Use one <text> for each piece.`)
  return element.childNodes
    .map((node) => (isText(node) ? node.value : ''))
    .join('')
    .replace(/\s+/g, ' ')
    .trim()
}

const readNode = (element: Element, inherited: Paint, styles: Styles): readonly SvgNode[] => {
  checkNode(element)
  if (element.tagName === 'title' || element.tagName === 'desc') return []
  const paint = paintOf(element, inherited, styles)
  const transform = readTransform(element)
  if (element.tagName === 'g') return [{ kind: 'group', transform, nodes: readNodes(content(element), paint, styles) }]
  if (element.tagName === 'text') {
    const place = { x: number(element, 'x'), y: number(element, 'y') + shift(element, paint), place: placeOf(element) }
    return [{ kind: 'text', transform, text: words(element), ...place, paint }]
  }
  const shape = SHAPES[element.tagName]
  if (shape) return [{ kind: 'path', transform, segments: shape(element), paint }]
  throw problem('misplaced-tag', element, `<${element.tagName}> may not stand inside a drawing.`)
}

const readNodes = (nodes: readonly Node[], paint: Paint, styles: Styles): readonly SvgNode[] =>
  nodes.flatMap((node) => {
    if (isText(node) && node.value.trim() !== '')
      throw problem('loose-text', node, 'Text in a drawing stands in <text>.')
    return isElement(node) ? readNode(node, paint, styles) : []
  })

const viewBox = (element: Element): SvgPicture['box'] => {
  const numbers = (attribute(element, 'viewBox') ?? '')
    .trim()
    .split(/[\s,]+/)
    .map(Number)
  const [x, y, width, height] = numbers
  const complete = numbers.length === 4 && numbers.every(Number.isFinite)
  if (complete && x !== undefined && y !== undefined && width && height && width > 0 && height > 0)
    return { x, y, width, height }
  throw problem('svg-value', element, '<svg> needs viewBox="x y width height" with a width and height above zero.')
}

/**
 * Reads a drawing: svg, g, path, line, polyline, polygon, rect, circle, ellipse and text, with their colours, strokes and transforms.
 *
 * @param element the `<svg>` element
 * @param styles what each class means; a class wins over an attribute, as a style sheet does in a browser
 * @throws PaperError unknown-tag, unknown-attribute, svg-value, loose-text, misplaced-tag
 */
export const readSvg = (element: Element, styles: Styles): SvgPicture => {
  checkNode(element)
  const box = viewBox(element)
  return { box, nodes: readNodes(content(element), paintOf(element, FIRST_PAINT, styles), styles) }
}
