/** Attributes of a drawing's element; numbers are rounded to hundredths. */
export type Look = Readonly<Record<string, string | number>>

const number = (value: number): string => String(Math.round(value * 100) / 100)

/** Text for inside an element or an attribute. */
export function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;')
}

const attributes = (look: Look): string =>
  Object.entries(look)
    .map(([name, value]) => ` ${name}="${typeof value === 'number' ? number(value) : escaped(value)}"`)
    .join('')

const element = (tag: string, look: Look): string => `<${tag}${attributes(look)}/>`

/** A straight line. */
export function line(x1: number, y1: number, x2: number, y2: number, look: Look = {}): string {
  return element('line', { x1, y1, x2, y2, ...look })
}

/** A rectangle by its upper left corner. */
export function rect(x: number, y: number, width: number, height: number, look: Look = {}): string {
  return element('rect', { x, y, width, height, ...look })
}

/** A circle. */
export function circle(cx: number, cy: number, r: number, look: Look = {}): string {
  return element('circle', { cx, cy, r, ...look })
}

/** A path as its `d` says. */
export function path(d: string, look: Look = {}): string {
  return element('path', { d, ...look })
}

const points = (flat: readonly number[]): string => flat.map(number).join(' ')

/** A closed shape through points, x and y in turn. */
export function polygon(flat: readonly number[], look: Look = {}): string {
  return element('polygon', { points: points(flat), ...look })
}

/** An open line through points, x and y in turn. */
export function polyline(flat: readonly number[], look: Look = {}): string {
  return element('polyline', { points: points(flat), ...look })
}

/** Words with their base line at a point. */
export function text(x: number, y: number, words: string, look: Look = {}): string {
  return words === '' ? '' : `<text${attributes({ x, y, ...look })}>${escaped(words)}</text>`
}

/** Elements that share a look. */
export function group(look: Look, content: readonly string[]): string {
  return `<g${attributes(look)}>${content.join('')}</g>`
}

/** A whole drawing; `label` says in words what it shows. `width` of the figure in % of what it stands in. */
export function drawing(width: number, height: number, label: string, content: readonly string[], share = 100): string {
  const head = {
    viewBox: `0 0 ${number(width)} ${number(height)}`,
    role: 'img',
    'aria-label': label,
    width: `${share}%`,
  }
  return `<svg${attributes(head)}>${content.join('')}</svg>`
}
