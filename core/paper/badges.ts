import { num, pathOperators, rgb } from './operators.ts'
import type { Shape } from './style.ts'
import type { Segment } from './svg-path.ts'
import { ellipse, rectangle } from './svg-shapes.ts'

type Draw = (x: number, baseline: number, size: number, colour: string) => string

/** Operators that draw one shape in a square of 10 by 10 units, its colour already set for filling and stroking. */
const framed =
  (inner: string): Draw =>
  (x, baseline, size, colour) => {
    const scale = (size * 0.8) / 10
    const top = baseline - size * 0.75
    return `${num(scale)} 0 0 ${num(scale)} ${num(x)} ${num(top)} cm ${rgb(colour)} rg ${rgb(colour)} RG 1.2 w 1 J 1 j\n${inner}`
  }

const disc = (r: number): string => pathOperators(ellipse(5, 5, r, r))
const square = (inset: number): string => pathOperators(rectangle(inset, inset, 10 - 2 * inset, 10 - 2 * inset, 0))
const diamond: readonly Segment[] = [['M', 5, 0.3], ['L', 9.7, 5], ['L', 5, 9.7], ['L', 0.3, 5], ['Z']]
const TICK = '2.8 5.2 m 4.4 6.9 l 7.3 3.3 l S'
const CROSS = '3.2 3.2 m 6.8 6.8 l S 6.8 3.2 m 3.2 6.8 l S'

/** The shape of each verdict: full for a clear answer, open where the uncertainty or the evidence leaves it open, round for meets, angular for fails. */
export const BADGE_SHAPES: Readonly<Record<Shape, Draw>> = {
  'disc-tick': framed(`${disc(5)} f 1 1 1 RG ${TICK}`),
  'ring-tick': framed(`${disc(4.4)} S ${TICK}`),
  'box-cross': framed(`${square(0.6)} S ${CROSS}`),
  'square-cross': framed(`${square(0)} f 1 1 1 RG ${CROSS}`),
  'dotted-ring': framed(`[1.6 1.9] 0 d ${disc(4.4)} S`),
  'half-diamond': framed(`${pathOperators(diamond)} S 5 0.3 m 5 9.7 l 0.3 5 l f`),
  dash: framed('1.5 5 m 8.5 5 l S'),
}
