import type { Frame, Placed, Strip } from './strips.ts'

/** A page: header rows that are repeated because their table goes on, then the page's own strips. */
export interface Page {
  readonly repeated: readonly Placed[]
  readonly placed: readonly Placed[]
}

const heightOf = (strips: readonly Strip[], atTop: boolean): number =>
  strips.reduce((sum, one, index) => sum + one.height + (index === 0 && atTop ? 0 : one.before), 0)

const reach = (strips: readonly Strip[], from: number, hold: number): number => {
  let end = from
  while (end < strips.length - 1 && (strips[end]?.hold ?? 0) >= hold) end++
  return end + 1
}

/** The strips from `from` on that stay together: all that hold, or only what holds strongly when that is more than a page. */
const chunkAt = (strips: readonly Strip[], from: number, room: number): readonly Strip[] => {
  const [weak, strong] = [1, 2].map((hold) => strips.slice(from, reach(strips, from, hold)))
  if (weak && heightOf(weak, true) <= room) return weak
  return strong && heightOf(strong, true) <= room ? strong : strips.slice(from, from + 1)
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

  add(chunk: readonly Strip[]): void {
    const [first] = chunk
    if (!first) return
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
  for (let at = 0; at < strips.length; ) {
    const heads = Math.max(0, ...(strips[at]?.frames ?? []).map(({ head }) => heightOf(head, true)))
    const chunk = chunkAt(strips, at, bottom - top - heads)
    filler.add(chunk)
    at += chunk.length
  }
  filler.turn()
  return filler.pages
}
