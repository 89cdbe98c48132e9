import type { StructureElement } from 'pdfkit'
import { baselineOf, child, type Flow, type Laid, styled, textStrips } from './flow.ts'
import { changeFirst, type Strip } from './strips.ts'
import { BLOCK, COLOUR, LIST, MEASURE, type TextStyle } from './style.ts'
import type { Block, List } from './tree.ts'

/** A picture lower than a line stands in the middle of it, level with the words beside it. */
const level = (strips: readonly Strip[], leading: number): readonly Strip[] =>
  strips.map((one) => {
    const above = Math.max(0, (leading - one.height) / 2)
    return { ...one, height: one.height + 2 * above, paint: (canvas, shift, y) => one.paint(canvas, shift, y + above) }
  })

/** A cell's or an item's only paragraph belongs to the element itself; several blocks become its children. */
export const flowInto = (blocks: readonly Block[], parent: StructureElement, flow: Flow): readonly Strip[] => {
  const [only, ...others] = blocks
  const inner = { ...flow, parent }
  if (only?.kind === 'figure' && others.length === 0) return level(flow.blocks(blocks, inner), flow.base.text.leading)
  if (only?.kind !== 'paragraph' || others.length > 0) return flow.blocks(blocks, inner)
  return textStrips(inner, parent, only.runs, styled(flow.base.text, [...flow.inherited, ...only.classes]))
}

const marker = (list: List, index: number): string => (list.ordered ? `${index + 1}.` : '•')

/** Draws the number or the dot to the left of the item's first line. */
const withMarker = (
  strips: readonly Strip[],
  label: StructureElement,
  sign: string,
  flow: Flow,
  text: TextStyle,
): readonly Strip[] => {
  const first = strips[0]
  if (!first) return strips
  const look = { face: text.face, size: text.size, rise: 0, colour: COLOUR.muted, spacing: 0 }
  const pieces = flow.shaper.pieces(sign, look)
  const width = pieces.reduce((sum, piece) => sum + piece.width, 0)
  return changeFirst(strips, {
    paint: (canvas, shift, y) => {
      const x = flow.x + shift + LIST.indent - LIST.marker - width
      canvas.mark(label, () => canvas.text(pieces, x, y + baselineOf(text)))
      first.paint(canvas, shift, y)
    },
  })
}

/** A list of items with dots or numbers. */
export const flowList = (list: List, flow: Flow): Laid => {
  const element = child(flow, 'L')
  element.dictionary.data.A = { O: 'List', ListNumbering: list.ordered ? 'Decimal' : 'Disc' }
  const text = styled(flow.base.text, [...flow.inherited, ...list.classes])
  const strips = list.items.flatMap((item, index) => {
    const row = child({ ...flow, parent: element }, 'LI')
    const label = child({ ...flow, parent: row }, 'Lbl')
    const body = child({ ...flow, parent: row }, 'LBody')
    const inner = {
      ...flow,
      x: flow.x + LIST.indent,
      width: Math.min(flow.width, MEASURE) - LIST.indent,
      base: { text, before: 0, after: BLOCK.item.after },
    }
    const laid = withMarker(flowInto(item, body, inner), label, marker(list, index), flow, text)
    return index === 0 ? laid : changeFirst(laid, { before: BLOCK.item.after })
  })
  return { strips, before: BLOCK.list.before, after: flow.base.after }
}
