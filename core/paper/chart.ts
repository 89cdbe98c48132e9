import type { Canvas } from './canvas.ts'
import { matrix, num, pathOperators, rgb } from './operators.ts'
import type { Shaper } from './shape.ts'
import { COLOUR } from './style.ts'
import { readPath } from './svg-path.ts'
import { ellipse, rectangle } from './svg-shapes.ts'

const drawn = (path: string) => readPath(path, (sentence) => new Error(sentence))

/** Depth lines around a skerry, outermost first; as on a chart, the shallower the water, the deeper the tint. In units of a square of 200. */
const SEA = [
  {
    ground: COLOUR.shoal,
    line: 'M-34 214 C-52 168 -30 130 -40 92 C-50 46 -8 28 22 2 C56 -28 110 -22 152 -14 C206 -4 238 40 236 92 C234 150 226 196 176 222 C112 252 -10 260 -34 214 Z',
  },
  {
    ground: COLOUR.depth,
    line: 'M10 150 C-8 122 12 104 14 76 C18 44 52 46 74 30 C102 8 142 18 168 38 C196 60 206 96 194 126 C184 154 152 158 128 172 C92 192 30 184 10 150 Z',
  },
  {
    ground: COLOUR.deep,
    line: 'M50 128 C42 112 58 104 58 90 C58 70 80 70 94 60 C114 48 142 58 152 76 C162 94 164 112 150 126 C138 138 122 134 108 144 C88 156 60 148 50 128 Z',
  },
].map(({ ground, line }) => ({ ground, line: pathOperators(drawn(line)) }))

const LAND = [
  'M82 114 C76 106 86 100 88 92 C90 82 104 82 112 78 C122 74 134 82 134 92 C134 100 138 108 128 114 C120 118 114 114 106 120 C98 126 88 122 82 114 Z',
  'M60 158 C58 153 64 150 69 152 C74 154 76 159 71 162 C66 164 61 162 60 158 Z',
  'M176 60 C178 56 184 57 186 61 C187 65 182 68 178 66 C175 65 174 62 176 60 Z',
].map((line) => pathOperators(drawn(line)))

/** Depths in metres, as soundings stand on a chart: where, and how deep. */
const SOUNDINGS = [
  [-22, 60, '21'],
  [4, 182, '14'],
  [24, 106, '9'],
  [66, 76, '4'],
  [120, 160, '3'],
  [150, 22, '12'],
  [52, 40, '11'],
  [96, 182, '8'],
  [-20, 132, '23'],
] as const

/** The rocks' lamp lies here, and so does the middle of the drawing. */
const LAMP = { x: 112, y: 98 } as const
const SEGMENT = 21

/** The graduated border of a chart: black and white by turns between two hairlines, from both ends alike. */
const paintBorder = (canvas: Canvas, x: number, y: number, width: number, height: number, band: number): void => {
  const along = 2 * Math.round(width / SEGMENT / 2) + 1
  const down = 2 * Math.round(height / SEGMENT / 2) + 1
  for (let at = 0; at < along; at += 2) {
    for (const top of [y, y + height - band])
      canvas.rectangle(x + (at * width) / along, top, width / along, band, COLOUR.ink)
  }
  for (let at = 0; at < down; at += 2) {
    for (const left of [x, x + width - band])
      canvas.rectangle(left, y + (at * height) / down, band, height / down, COLOUR.ink)
  }
  const line = { colour: COLOUR.ink, width: 0.35 }
  canvas.stroke(rectangle(x, y, width, height, 0), line)
  canvas.stroke(rectangle(x + band, y + band, width - 2 * band, height - 2 * band, 0), line)
  canvas.stroke(rectangle(x - 2.6, y - 2.6, width + 5.2, height + 5.2, 0), { colour: COLOUR.ink, width: 0.9 })
}

const paintSoundings = (canvas: Canvas, shaper: Shaper): void => {
  const look = { face: 'italic', size: 7.5, rise: 0, colour: COLOUR.abyss, spacing: 0 } as const
  for (const [x, y, depth] of SOUNDINGS) canvas.text(shaper.pieces(depth, look), x, y)
}

const paintSea = (canvas: Canvas, shaper: Shaper, scale: number): void => {
  const stroke = (weight: number) => `${num(weight / scale)} w`
  for (const { ground, line } of SEA) canvas.write(`${rgb(ground)} rg ${rgb(COLOUR.abyss)} RG ${stroke(0.4)} ${line} B`)
  for (const line of LAND) canvas.write(`${rgb(COLOUR.paper)} rg ${rgb(COLOUR.ink)} RG ${stroke(0.8)} ${line} B`)
  canvas.saved(() => paintSoundings(canvas, shaper))
  canvas.write(`${rgb(COLOUR.lamp)} rg ${pathOperators(ellipse(LAMP.x, LAMP.y, 4.4, 4.4))} f`)
}

/**
 * The ground of a title block: a skerry on a chart, cut off by the block's right end, inside a graduated border.
 *
 * @param x left, `y` top, `width`, `height` of the block, in points
 */
export const paintChart = (
  canvas: Canvas,
  shaper: Shaper,
  x: number,
  y: number,
  width: number,
  height: number,
): void => {
  const scale = Math.max(0.78, (height * 1.02) / 200)
  canvas.saved(() => {
    canvas.write(`${pathOperators(rectangle(x + 5.6, y + 5.6, width - 11.2, height - 11.2, 0))} W n`)
    canvas.write(matrix([scale, 0, 0, scale, x + width - 66 - LAMP.x * scale, y + height / 2 - LAMP.y * scale]))
    paintSea(canvas, shaper, scale)
  })
  paintBorder(canvas, x + 3, y + 3, width - 6, height - 6, 2.6)
}
