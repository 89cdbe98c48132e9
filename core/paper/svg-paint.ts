import { attribute, classesOf, type Element, problem } from './markup.ts'
import { COLOUR, type SvgStyle } from './style.ts'

/** How a node of a drawing looks, everything inherited. Colours are `#rrggbb` or `none`. */
export interface Paint {
  readonly fill: string
  readonly stroke: string
  readonly strokeWidth: number
  readonly dash: readonly number[]
  readonly fillOpacity: number
  readonly strokeOpacity: number
  readonly fontSize: number
  readonly fontWeight: number
  readonly anchor: 'start' | 'middle' | 'end'
  readonly cap: 'butt' | 'round' | 'square'
  readonly join: 'miter' | 'round' | 'bevel'
}

export const FIRST_PAINT: Paint = {
  fill: COLOUR.ink,
  stroke: 'none',
  strokeWidth: 1,
  dash: [],
  fillOpacity: 1,
  strokeOpacity: 1,
  fontSize: 12,
  fontWeight: 400,
  anchor: 'start',
  cap: 'butt',
  join: 'miter',
}

const NAMED: Readonly<Record<string, string>> = {
  none: 'none',
  transparent: 'none',
  currentColor: COLOUR.ink,
  black: '#000000',
  white: '#ffffff',
}

const colourOf = (element: Element, name: string, value: string): string => {
  const named = NAMED[value]
  if (named) return named
  if (/^#[0-9a-fA-F]{6}$/.test(value)) return value.toLowerCase()
  const short = /^#([0-9a-fA-F])([0-9a-fA-F])([0-9a-fA-F])$/.exec(value)
  if (short)
    return `#${short
      .slice(1)
      .map((digit) => digit + digit)
      .join('')}`.toLowerCase()
  throw problem('svg-value', element, `${name} is “${value}”. Write #rgb, #rrggbb, none, currentColor, black or white.`)
}

/** A number in user units; `px` may stand behind it. */
export const numberOf = (element: Element, name: string, value: string): number => {
  const digits = value.trim().replace(/px$/, '')
  if (/^[+-]?(\d+\.?\d*|\.\d+)([eE][+-]?\d+)?$/.test(digits)) return Number(digits)
  throw problem('svg-value', element, `${name} of <${element.tagName}> is “${value}”. Write a plain number.`)
}

const wordOf = <Word extends string>(element: Element, name: string, value: string, words: readonly Word[]): Word => {
  const word = words.find((candidate) => candidate === value)
  if (word) return word
  throw problem('svg-value', element, `${name} is “${value}”. Allowed: ${words.join(', ')}.`)
}

const weightOf = (element: Element, value: string): number =>
  ({ normal: 400, bold: 600 })[value] ?? numberOf(element, 'font-weight', value)

const dashOf = (element: Element, value: string): readonly number[] =>
  value === 'none'
    ? []
    : value
        .trim()
        .split(/[\s,]+/)
        .map((part) => numberOf(element, 'stroke-dasharray', part))

type Reader = (paint: Paint, element: Element, value: string) => Partial<Paint>

/** Attributes that style a node. `opacity` lies on everything inside; overlaps inside one group show through, unlike in a browser. */
export const PAINT_ATTRIBUTES: Readonly<Record<string, Reader>> = {
  fill: (_, element, value) => ({ fill: colourOf(element, 'fill', value) }),
  stroke: (_, element, value) => ({ stroke: colourOf(element, 'stroke', value) }),
  'stroke-width': (_, element, value) => ({ strokeWidth: numberOf(element, 'stroke-width', value) }),
  'stroke-dasharray': (_, element, value) => ({ dash: dashOf(element, value) }),
  'stroke-linecap': (_, element, value) => ({
    cap: wordOf(element, 'stroke-linecap', value, ['butt', 'round', 'square']),
  }),
  'stroke-linejoin': (_, element, value) => ({
    join: wordOf(element, 'stroke-linejoin', value, ['miter', 'round', 'bevel']),
  }),
  'fill-opacity': (paint, element, value) => ({
    fillOpacity: paint.fillOpacity * numberOf(element, 'fill-opacity', value),
  }),
  'stroke-opacity': (paint, element, value) => ({
    strokeOpacity: paint.strokeOpacity * numberOf(element, 'stroke-opacity', value),
  }),
  opacity: (paint, element, value) => faded(paint, numberOf(element, 'opacity', value)),
  'font-size': (_, element, value) => ({ fontSize: numberOf(element, 'font-size', value) }),
  'font-weight': (_, element, value) => ({ fontWeight: weightOf(element, value) }),
  'text-anchor': (_, element, value) => ({ anchor: wordOf(element, 'text-anchor', value, ['start', 'middle', 'end']) }),
}

const faded = (paint: Paint, opacity: number): Partial<Paint> => ({
  fillOpacity: paint.fillOpacity * opacity,
  strokeOpacity: paint.strokeOpacity * opacity,
})

const classed = (paint: Paint, style: SvgStyle): Paint => {
  const { opacity, ...plain } = style
  return { ...paint, ...plain, ...(opacity === undefined ? {} : faded(paint, opacity)) }
}

/** The look of a node: what it inherits, then its attributes, then its classes, as a style sheet in a browser would win. */
export const paintOf = (element: Element, inherited: Paint, styles: Readonly<Record<string, SvgStyle>>): Paint => {
  let paint = inherited
  for (const [name, read] of Object.entries(PAINT_ATTRIBUTES)) {
    const value = attribute(element, name)
    if (value !== undefined) paint = { ...paint, ...read(paint, element, value) }
  }
  return classesOf(element).reduce((look, name) => classed(look, styles[name] ?? {}), paint)
}
