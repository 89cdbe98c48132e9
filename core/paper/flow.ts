import type { PdfImage, StructureElement } from 'pdfkit'
import type { PaperDocument } from './document.ts'
import { breakLines, type Line } from './lines.ts'
import type { Shaper } from './shape.ts'
import { type Hold, type Strip, strip } from './strips.ts'
import { type BlockStyle, TEXT_CLASS, type TextStyle } from './style.ts'
import type { Block, Run } from './tree.ts'

/** What laying out a block needs to know about where it stands. Lengths in points. */
export interface Flow {
  readonly doc: PaperDocument
  readonly shaper: Shaper
  readonly photo: (name: string) => PdfImage
  readonly x: number
  readonly width: number
  /** The structure element that the block becomes a child of. */
  readonly parent: StructureElement
  /** How a paragraph looks here. */
  readonly base: BlockStyle
  /** Text classes of the boxes around. */
  readonly inherited: readonly string[]
  /** Lays out blocks below each other; the door back into `flow-blocks.ts` for boxes, cells and items. */
  readonly blocks: (blocks: readonly Block[], flow: Flow) => readonly Strip[]
}

/** A block's strips with the distances that it keeps. */
export interface Laid {
  readonly strips: readonly Strip[]
  readonly before: number
  readonly after: number
}

/** A new structure element below the flow's own. */
export const child = (flow: Flow, type: string, options: { alt?: string } = {}): StructureElement => {
  const element = flow.doc.struct(type, options)
  flow.parent.add(element)
  return element
}

/** A text style as classes change it. */
export const styled = (base: TextStyle, classes: readonly string[]): TextStyle => {
  let style = base
  for (const name of classes) style = { ...style, ...TEXT_CLASS[name] }
  return style
}

/** At least two lines of a paragraph stay together at either end of a page. */
const holdOf = (index: number, count: number): Hold =>
  index < count - 1 && (index === 0 || index === count - 2) ? 2 : 0

const offset = (line: Line, width: number, align: TextStyle['align']): number => {
  if (align === 'left') return 0
  return align === 'right' ? width - line.width : (width - line.width) / 2
}

/** Where the baseline lies below the top of a line, so that capitals stand in its middle. 0.698 is the height of Plex's capitals. */
export const baselineOf = ({ leading, size }: TextStyle): number => (leading + 0.698 * size) / 2

/** Lines of text, each marked as part of `element`. */
export const textStrips = (
  flow: Flow,
  element: StructureElement,
  runs: readonly Run[],
  style: TextStyle,
): readonly Strip[] => {
  const lines = breakLines(flow.shaper.words(runs, style), flow.width)
  return lines.map((line, index) => {
    const x = flow.x + offset(line, flow.width, style.align)
    const down = baselineOf(style)
    return strip(
      style.leading,
      (canvas, shift, y) => {
        if (line.pieces.length > 0) canvas.mark(element, () => canvas.text(line.pieces, x + shift, y + down))
      },
      { hold: holdOf(index, lines.length) },
    )
  })
}
