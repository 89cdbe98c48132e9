import { arcCurves, type Curve } from './svg-arc.ts'

/** A drawn line in absolute coordinates: only what PDF knows too. */
export type Segment = readonly ['M' | 'L', number, number] | readonly ['C', ...Curve] | readonly ['Z']

/** Makes the error for a path that cannot be read, from a finished sentence. */
type Refuse = (sentence: string) => Error

const COUNTS: Readonly<Record<string, number>> = { M: 2, L: 2, H: 1, V: 1, C: 6, Q: 4, A: 7, Z: 0 }
const NUMBER = /[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/y
const FLAG = /[01]/y
const BETWEEN = /[\s,]*/y

interface Command {
  readonly letter: string
  readonly values: readonly number[]
}

/** Reads commands with their numbers; a command whose numbers repeat stands once for each set. */
const commands = (data: string, refuse: Refuse): readonly Command[] => {
  let at = 0
  const take = (pattern: RegExp): string | undefined => {
    pattern.lastIndex = at
    const found = pattern.exec(data)?.[0]
    at += found?.length ?? 0
    return found
  }
  const values = (letter: string, count: number): number[] =>
    Array.from({ length: count }, (_, index) => {
      take(BETWEEN)
      const isFlag = letter.toUpperCase() === 'A' && (index === 3 || index === 4)
      const found = take(isFlag ? FLAG : NUMBER)
      if (found === undefined) throw refuse(`The path wants a number at “${data.slice(at, at + 12)}”.`)
      return Number(found)
    })
  const read: Command[] = []
  let letter = ''
  take(BETWEEN)
  while (at < data.length) {
    const next = /[A-Za-z]/.exec(data.charAt(at))?.[0]
    if (next) at++
    letter = next ?? letter.replace('M', 'L').replace('m', 'l')
    const count = COUNTS[letter.toUpperCase()]
    if (count === undefined)
      throw refuse(`The path uses “${letter}”. Allowed: ${Object.keys(COUNTS).join(' ')}, capital or small.`)
    if (!next && count === 0) throw refuse('The path has a number after Z.')
    read.push({ letter, values: values(letter, count) })
    take(BETWEEN)
  }
  if (read[0] && read[0].letter.toUpperCase() !== 'M') throw refuse('The path does not start with M.')
  return read
}

interface Pen {
  x: number
  y: number
  startX: number
  startY: number
}

/** Numbers of a relative command, moved to where the pen stands. */
const absolute = ({ letter, values }: Command, pen: Pen): readonly number[] => {
  const upper = letter.toUpperCase()
  if (letter === upper) return values
  if (upper === 'H') return values.map((value) => value + pen.x)
  if (upper === 'V') return values.map((value) => value + pen.y)
  const free = upper === 'A' ? 5 : 0
  return values.map((value, index) => (index < free ? value : value + ((index - free) % 2 === 0 ? pen.x : pen.y)))
}

/** Missing numbers cannot occur: `commands` has counted them. */
const pick = (values: readonly number[], index: number): number => Number(values[index])

const arc = (pen: Pen, values: readonly number[], x: number, y: number): Segment[] => {
  const [rx, ry] = [Math.abs(pick(values, 0)), Math.abs(pick(values, 1))]
  if (rx === 0 || ry === 0) return [['L', x, y]]
  const rotation = (pick(values, 2) * Math.PI) / 180
  const shape = { rx, ry, rotation, large: values[3] === 1, sweep: values[4] === 1 }
  return arcCurves(pen.x, pen.y, shape, x, y).map((curve) => ['C', ...curve] as const)
}

/** A quadratic curve raised to a cubic one. */
const quadratic = (pen: Pen, values: readonly number[], x: number, y: number): Segment => {
  const [qx, qy] = [pick(values, 0), pick(values, 1)]
  const toward = (from: number, control: number) => from + (2 / 3) * (control - from)
  return ['C', toward(pen.x, qx), toward(pen.y, qy), toward(x, qx), toward(y, qy), x, y]
}

const drawn = (command: Command, pen: Pen): readonly Segment[] => {
  const values = absolute(command, pen)
  const upper = command.letter.toUpperCase()
  const x = upper === 'V' ? pen.x : upper === 'H' ? pick(values, 0) : pick(values, values.length - 2)
  const y = upper === 'H' ? pen.y : pick(values, values.length - 1)
  switch (upper) {
    case 'M':
      return [['M', x, y]]
    case 'C':
      return [['C', pick(values, 0), pick(values, 1), pick(values, 2), pick(values, 3), x, y]]
    case 'Q':
      return [quadratic(pen, values, x, y)]
    case 'A':
      return arc(pen, values, x, y)
    case 'Z':
      return [['Z']]
    default:
      return [['L', x, y]]
  }
}

const follow = (pen: Pen, segment: Segment): void => {
  if (segment[0] === 'Z') {
    pen.x = pen.startX
    pen.y = pen.startY
    return
  }
  pen.x = pick(segment.slice(-2).map(Number), 0)
  pen.y = pick(segment.slice(-1).map(Number), 0)
  if (segment[0] !== 'M') return
  pen.startX = pen.x
  pen.startY = pen.y
}

/**
 * Path data as moves, lines and cubic curves in absolute coordinates.
 *
 * @param data the `d` attribute: M L H V C Q A Z, capital (absolute) or small (relative)
 * @param refuse makes what is thrown when the path holds something else
 * @source SVG 2 (W3C Candidate Recommendation 2018), 9.3
 */
export const readPath = (data: string, refuse: Refuse): readonly Segment[] => {
  const pen: Pen = { x: 0, y: 0, startX: 0, startY: 0 }
  const segments: Segment[] = []
  for (const command of commands(data, refuse)) {
    for (const segment of drawn(command, pen)) {
      follow(pen, segment)
      segments.push(segment)
    }
  }
  return segments
}
