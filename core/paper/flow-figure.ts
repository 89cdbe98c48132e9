import type { StructureElement } from 'pdfkit'
import type { Canvas } from './canvas.ts'
import { child, type Flow, type Laid, styled, textStrips } from './flow.ts'
import { changeFirst, changeLast, type Strip, strip } from './strips.ts'
import { BLOCK, CONTENT, PAGE } from './style.ts'
import { drawSvg } from './svg.ts'
import type { Figure } from './tree.ts'

/** The caption's share of a page that a tall figure leaves free. */
const CAPTION_ROOM = 60
const PX = 72 / 96
/** Photos are not blown up beyond 150 dots an inch. */
const PHOTO_DOT = 72 / 150

interface Size {
  readonly width: number
  readonly height: number
}

const natural = (figure: Figure, flow: Flow): Size & { readonly dot: number | undefined } => {
  if (figure.picture.kind === 'svg') return { ...figure.picture.svg.box, dot: undefined }
  const { width, height, orientation = 1 } = flow.photo(figure.picture.name)
  return orientation > 4 ? { width: height, height: width, dot: PHOTO_DOT } : { width, height, dot: PHOTO_DOT }
}

/** As wide as asked (`50%`, or pixels of 1/96 inch), else as wide as there is room; never taller than a page. */
const sizeOf = (figure: Figure, flow: Flow): Size => {
  const { width, height, dot } = natural(figure, flow)
  const share = /^(\d+(?:\.\d+)?)(%?)$/.exec(figure.width ?? '')
  const asked = share?.[2] === '%' ? (flow.width * Number(share[1])) / 100 : share ? Number(share[1]) * PX : flow.width
  const most = Math.min(flow.width, asked, dot === undefined ? Number.POSITIVE_INFINITY : width * dot)
  const fitting = Math.min(most, ((CONTENT.height - CAPTION_ROOM) * width) / height)
  return { width: fitting, height: (fitting * height) / width }
}

const draw = (canvas: Canvas, figure: Figure, flow: Flow, x: number, y: number, size: Size): void => {
  const { picture } = figure
  if (picture.kind === 'svg') drawSvg(canvas, flow.shaper, picture.svg, x, y, size.width)
  else canvas.photo(flow.photo(picture.name), x, y, size.width, size.height)
}

/** The rectangle that the figure covers, counted from the page's lower left (ISO 32000-1, 14.8.5.4.3). */
const setBox = (element: StructureElement, x: number, y: number, { width, height }: Size): void => {
  const corners = [x, PAGE.height - y - height, x + width, PAGE.height - y].map(
    (value) => Math.round(value * 100) / 100,
  )
  element.dictionary.data.A = { O: 'Layout', Placement: 'Block', BBox: corners }
}

/** A drawing or photo in one piece, its caption below it. */
export const flowFigure = (figure: Figure, flow: Flow): Laid => {
  const parent = child(flow, 'Div')
  const element = child({ ...flow, parent }, 'Figure', { alt: figure.alternative })
  const size = sizeOf(figure, flow)
  const drawing = strip(size.height, (canvas, shift, y) => {
    const x = flow.x + shift
    setBox(element, x, y, size)
    canvas.mark(element, () => draw(canvas, figure, flow, x, y, size))
  })
  const { before, after } = BLOCK.figure
  if (figure.caption.length === 0) return { strips: [drawing], before, after }
  const caption = child({ ...flow, parent }, 'Caption')
  const lines = textStrips(flow, caption, figure.caption, styled(BLOCK.figcaption.text, figure.classes))
  const spaced: readonly Strip[] = changeFirst(
    lines.map((line) => ({ ...line, hold: 2 as const })),
    { before: BLOCK.figcaption.before },
  )
  return { strips: [{ ...drawing, hold: 2 }, ...changeLast(spaced, { hold: 0 })], before, after }
}
