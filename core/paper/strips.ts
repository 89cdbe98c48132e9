import type { Canvas } from './canvas.ts'

/**
 * How strongly a strip holds on to the next one: not at all, as one row of a group does (given up when the group is taller than a page),
 * or as a heading does to its text.
 */
export type Hold = 0 | 1 | 2

export type FramePaint = (canvas: Canvas, shift: number, top: number, bottom: number) => void

/** Something that reaches around strips: a box, or a table with the header rows that are repeated on each page. */
export interface Frame {
  readonly head: readonly Strip[]
  /** Draws under the strips that it reaches around. */
  readonly under?: FramePaint
  /** Draws over them. */
  readonly over?: FramePaint
}

/** The smallest piece that a page break leaves whole: a line, a row, a figure. Lengths in points. */
export interface Strip {
  readonly height: number
  /** Space above, left out at the top of a page. */
  readonly before: number
  readonly hold: Hold
  readonly breakBefore: boolean
  /** Outermost first. */
  readonly frames: readonly Frame[]
  /** Draws the strip; `shift` moves it to the right of where it was laid out, `y` is its top. */
  readonly paint: (canvas: Canvas, shift: number, y: number) => void
}

/** A strip with nothing unusual about it. */
export const strip = (height: number, paint: Strip['paint'], changes: Partial<Strip> = {}): Strip => ({
  height,
  before: 0,
  hold: 0,
  breakBefore: false,
  frames: [],
  paint,
  ...changes,
})

/** Empty room that holds on to what follows. */
export const room = (height: number, hold: Hold): Strip => strip(height, () => undefined, { hold })

/** The same strips with the first or the last of them changed. */
export const changeFirst = (strips: readonly Strip[], changes: Partial<Strip>): readonly Strip[] =>
  strips.map((one, index) => (index === 0 ? { ...one, ...changes } : one))

export const changeLast = (strips: readonly Strip[], changes: Partial<Strip>): readonly Strip[] =>
  strips.map((one, index) => (index === strips.length - 1 ? { ...one, ...changes } : one))

/** Strips inside a frame. */
export const framed = (strips: readonly Strip[], frame: Frame): readonly Strip[] =>
  strips.map((one) => ({ ...one, frames: [frame, ...one.frames] }))

/** A strip at its place on a page. */
export interface Placed {
  readonly strip: Strip
  readonly y: number
}

/** Strips below each other from `y` on, without the space above the first. */
export const stacked = (strips: readonly Strip[], y: number): readonly Placed[] => {
  let at = y
  return strips.map((one, index) => {
    at += index === 0 ? 0 : one.before
    const placed = { strip: one, y: at }
    at += one.height
    return placed
  })
}

/** The height of strips below each other. */
export const stackHeight = (strips: readonly Strip[]): number =>
  strips.reduce((sum, one, index) => sum + one.height + (index === 0 ? 0 : one.before), 0)

/** Draws placed strips, and what their frames put under and over them. */
export const paintPlaced = (canvas: Canvas, shift: number, placed: readonly Placed[]): void => {
  const spans = new Map<Frame, { top: number; bottom: number }>()
  for (const { strip: one, y } of placed) {
    for (const frame of one.frames) {
      const span = spans.get(frame)
      spans.set(frame, { top: span?.top ?? y, bottom: y + one.height })
    }
  }
  for (const [frame, { top, bottom }] of spans) frame.under?.(canvas, shift, top, bottom)
  for (const { strip: one, y } of placed) one.paint(canvas, shift, y)
  for (const [frame, { top, bottom }] of spans) frame.over?.(canvas, shift, top, bottom)
}
