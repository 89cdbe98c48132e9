import type { Canvas } from './canvas.ts'
import { paintChart } from './chart.ts'
import type { Shaper } from './shape.ts'
import { type BoxStyle, HAIRLINE } from './style.ts'
import { rectangle } from './svg-shapes.ts'

/** Ground, border and bar of a box, or the chart of a title block. */
export const paintBox = (
  canvas: Canvas,
  shaper: Shaper,
  box: BoxStyle,
  x: number,
  y: number,
  width: number,
  height: number,
): void => {
  canvas.artifact('/Type /Background', () => {
    if (box.ground) canvas.rectangle(x, y, width, height, box.ground)
    if (box.border) canvas.stroke(rectangle(x, y, width, height, 0), { colour: box.border, width: HAIRLINE })
    if (box.bar) canvas.rectangle(x, y, box.bar.width, height, box.bar.colour)
    if (box.reserve) paintChart(canvas, shaper, x, y, width, height)
  })
}
