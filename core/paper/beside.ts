import type { Canvas } from './canvas.ts'
import { paintPlaced, type Strip, stacked, stackHeight, strip } from './strips.ts'

/** Room above and below each side, in points. */
interface Pad {
  readonly top: number
  readonly bottom: number
}

/** Takes strips from the front while they fit. */
const taken = (strips: readonly Strip[], limit: number): readonly Strip[] => {
  let count = 0
  while (count < strips.length && (count === 0 || stackHeight(strips.slice(0, count + 1)) <= limit)) count++
  return strips.slice(0, count)
}

/** A stack of strips; `shift` moves it to the right of where it was laid out. */
export interface Side {
  readonly strips: readonly Strip[]
  readonly shift: number
}

/**
 * Sets stacks of strips beside each other as one strip; only what is taller than `limit` becomes several, one after the other.
 *
 * @param sides laid out at their own places across the page, or moved there by their shift
 * @param pad room above and below
 * @param limit height that one strip may have, in points
 * @param ground draws underneath, for the whole height
 */
export const beside = (
  sides: readonly Side[],
  pad: Pad,
  limit: number,
  ground: (canvas: Canvas, shift: number, y: number, height: number) => void,
): readonly Strip[] => {
  const made: Strip[] = []
  let rest = sides
  do {
    const part = rest.map((side) => ({ ...side, strips: taken(side.strips, limit - pad.top - pad.bottom) }))
    rest = rest.map((side) => ({
      ...side,
      strips: side.strips.slice(taken(side.strips, limit - pad.top - pad.bottom).length),
    }))
    const height = Math.max(0, ...part.map(({ strips }) => stackHeight(strips))) + pad.top + pad.bottom
    made.push(
      strip(height, (canvas, shift, y) => {
        ground(canvas, shift, y, height)
        for (const side of part) paintPlaced(canvas, shift + side.shift, stacked(side.strips, y + pad.top))
      }),
    )
  } while (rest.some(({ strips }) => strips.length > 0))
  return made
}
