import type { Part, PartKind } from './parts.ts'

/** Room that a kind of part takes: along the wire, above it and below it, in units of the drawing. */
interface Room {
  readonly along: number
  readonly above: number
  readonly below: number
}

/** A part at its place. Its wire comes in at `x` and leaves at `out`, both at height `y`. */
export interface Placed {
  readonly part: Part
  readonly x: number
  readonly out: number
  readonly y: number
  readonly children: readonly Placed[]
}

const GAP = 8

const ROOM: Readonly<Record<PartKind, Room>> = {
  supply: { along: 24, above: 22, below: 54 },
  meter: { along: 34, above: 22, below: 24 },
  'main protection': { along: 40, above: 22, below: 24 },
  board: { along: 4, above: 20, below: 14 },
  'overcurrent device': { along: 42, above: 22, below: 28 },
  'residual-current device': { along: 44, above: 22, below: 28 },
  changeover: { along: 84, above: 28, below: 58 },
  inverter: { along: 44, above: 28, below: 30 },
  array: { along: 36, above: 16, below: 12 },
  battery: { along: 36, above: 12, below: 12 },
  link: { along: 34, above: 10, below: 10 },
  circuit: { along: 52, above: 8.5, below: 8.5 },
  circuits: { along: 52, above: 8.5, below: 8.5 },
}

/** Room for a link to earth below a part. */
const LINK = 40
/** Room for one more line of words below a device. */
const LINE = 9.5

/** Where the name of a board stands when a device with a name of its own follows at the same height. */
export const RAISED = 31

/** Whether the first thing on a board is a device, not a circuit. */
export function leadsOn(children: readonly { readonly kind: PartKind }[]): boolean {
  const [first] = children
  return first !== undefined && first.kind !== 'circuit' && first.kind !== 'circuits'
}

/** Rows move closer together when there are many. */
const CLOSE = 0.74
const MANY = 24

interface Result {
  readonly placed: Placed
  readonly bottom: number
}

class Placing {
  readonly #factor: number

  constructor(rows: number) {
    this.#factor = rows > MANY ? CLOSE : 1
  }

  #room({ kind, children, linked, cabled }: Part): Room {
    const more = (linked ? LINK : 0) + (cabled ? LINE : 0)
    const room = { ...ROOM[kind], below: ROOM[kind].below + more }
    if (kind === 'board' && leadsOn(children)) return { ...room, above: RAISED + 8 }
    if (kind !== 'circuit' && kind !== 'circuits') return room
    return { ...room, above: room.above * this.#factor, below: room.below * this.#factor }
  }

  /** Room above the wire of a part and of the first in each generation below it: they share one height. */
  #above(part: Part): number {
    const [first] = part.children
    const own = this.#room(part).above
    return first ? Math.max(own, this.#above(first)) : own
  }

  /** Puts a part with everything below it under `top`. */
  put(part: Part, x: number, top: number): Result {
    const { along, below } = this.#room(part)
    const y = top + this.#above(part)
    const out = x + along
    let bottom = y + below
    let next = top
    const children = part.children.map((child, index) => {
      const { placed, bottom: end } = index === 0 ? this.#level(child, out + GAP, y) : this.put(child, out + GAP, next)
      next = end
      bottom = Math.max(bottom, end)
      return placed
    })
    return { placed: { part, x, out, y, children }, bottom }
  }

  /** The first child stands at the height of its parent. */
  #level(part: Part, x: number, y: number): Result {
    return this.put(part, x, y - this.#above(part))
  }
}

/**
 * Places the parts of a diagram: the wire runs from left to right, what hangs on one thing stands below each other.
 *
 * @param rows how many circuits the diagram shows
 */
export function place(root: Part, rows: number): { readonly root: Placed; readonly height: number } {
  const { placed, bottom } = new Placing(rows).put(root, 6, 4)
  return { root: placed, height: bottom }
}

/** Every part at its place, the first generations first. */
export function everyPlaced(root: Placed): Placed[] {
  return [root, ...root.children.flatMap(everyPlaced)]
}
