import type { Canvas } from './canvas.ts'
import { matrix } from './operators.ts'
import type { PaperOptions, Running } from './options.ts'
import type { Piece, Shaper } from './shape.ts'
import { COLOUR, CONTENT, HAIRLINE, PAGE } from './style.ts'

interface Spot {
  readonly page: number
  readonly pages: number
}

const LOOK = { face: 'regular', size: 7.2, rise: 0, colour: COLOUR.muted, spacing: 0.07 } as const
const RIGHT = PAGE.width - PAGE.right
const SCALE = { height: 2.2, above: 11 } as const

const widthOf = (pieces: readonly Piece[]): number => pieces.reduce((sum, { width }) => sum + width, 0)

const numbered = (text: string, { page, pages }: Spot): string =>
  text.replaceAll('{page}', String(page)).replaceAll('{pages}', String(pages))

const paintRunning = (
  canvas: Canvas,
  shaper: Shaper,
  running: Running | undefined,
  spot: Spot,
  baseline: number,
): void => {
  if (!running) return
  const { left, right } = typeof running === 'function' ? running(spot) : running
  const write = (text: string, place: (width: number) => number) => {
    if (text === '') return
    const pieces = shaper.pieces(numbered(text, spot).replaceAll('\u00a0', ' '), LOOK)
    canvas.text(pieces, place(widthOf(pieces)), baseline)
  }
  write(left, () => PAGE.left)
  write(right, (width) => RIGHT - width)
}

/** A chart's scale bar in place of a line above the foot: one part for each page, this page's part in ink. */
const paintScale = (canvas: Canvas, { page, pages }: Spot): void => {
  const y = PAGE.height - PAGE.footerAt - SCALE.above
  const part = CONTENT.width / pages
  canvas.rule(PAGE.left, y, RIGHT, y, { colour: COLOUR.rule, width: HAIRLINE })
  canvas.rectangle(PAGE.left + (page - 1) * part, y, part, SCALE.height, COLOUR.ink)
  for (let at = 1; at < pages; at++) {
    const x = PAGE.left + at * part
    canvas.rule(x, y, x, y + SCALE.height, { colour: COLOUR.rule, width: HAIRLINE })
  }
}

/** A word across the page, under everything else, so light that text on it stays easy to read. */
const paintWatermark = (canvas: Canvas, shaper: Shaper, word: string): void => {
  const look = { face: 'semibold', size: 100, rise: 0, colour: COLOUR.watermark, spacing: 12 } as const
  const natural = widthOf(shaper.pieces(word, look))
  const scale = Math.min(1.3, (PAGE.height * 0.62) / natural)
  const angle = -Math.atan2(PAGE.height, PAGE.width)
  const [cos, sin] = [Math.cos(angle) * scale, Math.sin(angle) * scale]
  canvas.saved(() => {
    canvas.write(matrix([cos, sin, -sin, cos, PAGE.width / 2, PAGE.height / 2]))
    canvas.text(shaper.pieces(word, look), -natural / 2, 35)
  })
}

/**
 * What every page carries besides its text, all of it artifact: the watermark, the running head and foot, the scale bar.
 *
 * @throws PaperError unknown-character
 */
export const paintFurniture = (canvas: Canvas, shaper: Shaper, options: PaperOptions, spot: Spot): void => {
  const { watermark, header, footer } = options
  if (watermark)
    canvas.artifact('/Type /Pagination /Subtype /Watermark', () => paintWatermark(canvas, shaper, watermark))
  canvas.artifact('/Type /Pagination /Subtype /Header', () => paintRunning(canvas, shaper, header, spot, PAGE.headerAt))
  canvas.artifact('/Type /Pagination /Subtype /Footer', () => {
    paintScale(canvas, spot)
    paintRunning(canvas, shaper, footer, spot, PAGE.height - PAGE.footerAt)
  })
}
