import type { Canvas } from './canvas.ts'
import { matrix, num, onPaper, pathOperators, rgb } from './operators.ts'
import type { Shaper } from './shape.ts'
import type { FaceName } from './style.ts'
import type { Paint } from './svg-paint.ts'
import type { SvgNode, SvgPicture } from './svg-read.ts'

const CAP = { butt: 0, round: 1, square: 2 } as const
const JOIN = { miter: 0, round: 1, bevel: 2 } as const
const ANCHOR = { start: 0, middle: 0.5, end: 1 } as const

/** Draws checked SVG nodes as vectors, with the page's own fonts. */
class Drawing {
  readonly #canvas: Canvas
  readonly #shaper: Shaper

  constructor(canvas: Canvas, shaper: Shaper) {
    this.#canvas = canvas
    this.#shaper = shaper
  }

  nodes(nodes: readonly SvgNode[]): void {
    for (const node of nodes) {
      const { transform } = node
      if (!transform) {
        this.#node(node)
        continue
      }
      this.#canvas.saved(() => {
        this.#canvas.write(matrix(transform))
        this.#node(node)
      })
    }
  }

  #node(node: SvgNode): void {
    if (node.kind === 'group') return this.nodes(node.nodes)
    if (node.kind === 'text') return this.#text(node)
    const { fill, stroke, strokeWidth } = node.paint
    const filled = fill !== 'none'
    const stroked = stroke !== 'none' && strokeWidth > 0
    if ((!filled && !stroked) || node.segments.length === 0) return
    this.#canvas.saved(() => {
      this.#state(node.paint, filled, stroked)
      this.#canvas.write(`${pathOperators(node.segments)}\n${filled && stroked ? 'B' : filled ? 'f' : 'S'}`)
    })
  }

  #state(paint: Paint, filled: boolean, stroked: boolean): void {
    const write = (operators: string) => this.#canvas.write(operators)
    if (filled) write(`${rgb(this.#seen(paint.fill, paint.fillOpacity))} rg`)
    if (filled && paint.fillOpacity < 1 && !this.#canvas.flat) this.#canvas.doc.fillOpacity(paint.fillOpacity)
    if (!stroked) return
    write(`${rgb(this.#seen(paint.stroke, paint.strokeOpacity))} RG ${num(paint.strokeWidth)} w`)
    if (paint.strokeOpacity < 1 && !this.#canvas.flat) this.#canvas.doc.strokeOpacity(paint.strokeOpacity)
    if (paint.dash.length > 0) write(`[${paint.dash.map(num).join(' ')}] 0 d`)
    if (paint.cap !== 'butt') write(`${CAP[paint.cap]} J`)
    if (paint.join !== 'miter') write(`${JOIN[paint.join]} j`)
  }

  /** Where transparency is forbidden, a colour is mixed with the paper instead. */
  #seen(colour: string, opacity: number): string {
    return this.#canvas.flat && opacity < 1 ? onPaper(colour, opacity) : colour
  }

  #text({ text, x, y, paint, place }: Extract<SvgNode, { kind: 'text' }>): void {
    if (paint.fill === 'none' || text === '') return
    const face: FaceName = paint.fontWeight >= 600 ? 'semibold' : paint.fontWeight >= 500 ? 'medium' : 'regular'
    const colour = paint.fillOpacity < 1 ? onPaper(paint.fill, paint.fillOpacity) : paint.fill
    const look = { face, size: paint.fontSize, rise: 0, colour, spacing: 0 }
    const pieces = this.#shaper.pieces(text, look, { place, from: 0, to: 0 })
    const width = pieces.reduce((sum, piece) => sum + piece.width, 0)
    this.#canvas.text(pieces, x - width * ANCHOR[paint.anchor], y)
  }
}

/**
 * Draws a picture into a rectangle of the page, its proportions kept (the rectangle has those of the view box).
 *
 * @param x left edge, `y` top edge, `width`: points
 * @throws PaperError unknown-character, when a text holds a character that no font has
 */
export const drawSvg = (
  canvas: Canvas,
  shaper: Shaper,
  picture: SvgPicture,
  x: number,
  y: number,
  width: number,
): void => {
  const { box, nodes } = picture
  const scale = width / box.width
  canvas.saved(() => {
    canvas.write(matrix([scale, 0, 0, scale, x - box.x * scale, y - box.y * scale]))
    new Drawing(canvas, shaper).nodes(nodes)
  })
}
