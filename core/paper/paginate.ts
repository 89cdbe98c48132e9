import type { Frame, Hold, Placed, Strip } from './strips.ts'

/** A page: header rows that are repeated because their table goes on, then the page's own strips. */
export interface Page {
  readonly repeated: readonly Placed[]
  readonly placed: readonly Placed[]
}

const heightOf = (strips: readonly Strip[], atTop: boolean): number =>
  strips.reduce((sum, one, index) => sum + one.height + (index === 0 && atTop ? 0 : one.before), 0)

/** The strips from `from` on of which each holds on to the next at least so strongly. */
const holding = (strips: readonly Strip[], from: number, hold: Hold): readonly Strip[] => {
  let end = from
  for (let one = strips[end]; one && one.hold >= hold && strips[end + 1]?.breakBefore === false; one = strips[end])
    end++
  return strips.slice(from, end + 1)
}

/** The strips from `from` on that stay together: all that hold, or only what holds strongly when that is more than a page. */
const chunkAt = (strips: readonly Strip[], from: number, room: number): readonly Strip[] => {
  const weak = holding(strips, from, 1)
  if (heightOf(weak, true) <= room) return weak
  const strong = holding(strips, from, 2)
  return heightOf(strong, true) <= room ? strong : strips.slice(from, from + 1)
}

/** Fills pages one after the other. */
class Filler {
  readonly pages: Page[] = []
  readonly #top: number
  readonly #bottom: number
  readonly #opened = new Set<Frame>()
  #repeated: Placed[] = []
  #placed: Placed[] = []
  #y: number

  constructor(top: number, bottom: number) {
    this.#top = top
    this.#bottom = bottom
    this.#y = top
  }

  get #empty(): boolean {
    return this.#placed.length === 0
  }

  add(first: Strip, chunk: readonly Strip[]): void {
    const full = this.#y + heightOf(chunk, this.#empty) > this.#bottom + 0.01
    if (!this.#empty && (full || first.breakBefore)) this.turn()
    if (this.#empty) this.#repeat(first)
    for (const one of chunk) this.#place(one)
  }

  turn(): void {
    this.pages.push({ repeated: this.#repeated, placed: this.#placed })
    this.#repeated = []
    this.#placed = []
    this.#y = this.#top
  }

  #repeat(first: Strip): void {
    const heads = first.frames.filter((frame) => this.#opened.has(frame)).flatMap(({ head }) => head)
    for (const head of heads) {
      this.#repeated.push({ strip: head, y: this.#y })
      this.#y += head.height
    }
  }

  #place(one: Strip): void {
    if (!this.#empty) this.#y += one.before
    this.#placed.push({ strip: one, y: this.#y })
    this.#y += one.height
    for (const frame of one.frames) this.#opened.add(frame)
  }
}

/**
 * Divides strips among pages. What holds on to the next strip stays with it; rows of a group give way when the group is taller than a page.
 *
 * @param strips in order
 * @param top and `bottom` of the room on each page, in points from the page's top
 * @returns at least one page
 */
export const paginate = (strips: readonly Strip[], top: number, bottom: number): readonly Page[] => {
  const filler = new Filler(top, bottom)
  let next = 0
  strips.forEach((first, at) => {
    if (at < next) return
    const heads = Math.max(0, ...first.frames.map(({ head }) => heightOf(head, true)))
    const chunk = chunkAt(strips, at, bottom - top - heads)
    filler.add(first, chunk)
    next = at + chunk.length
  })
  filler.turn()
  return filler.pages
}
