import { beside } from './beside.ts'
import { child, type Flow, type Laid, styled, textStrips } from './flow.ts'
import { flowInto } from './flow-list.ts'
import type { Strip } from './strips.ts'
import { BLOCK, CELL, COLOUR, CONTENT, HAIRLINE, TERM_SHARE } from './style.ts'
import type { Definitions } from './tree.ts'

const PAD = { top: 2.4, bottom: 2.6 } as const

/** Terms at the left, what they stand for at the right, a hairline under each pair unless the list has the class `plain`. */
export const flowDefinitions = (list: Definitions, flow: Flow): Laid => {
  const element = child(flow, 'L')
  element.dictionary.data.A = { O: 'List', ListNumbering: 'None' }
  const ruled = !list.classes.includes('plain')
  const termWidth = flow.width * (list.classes.includes('wide-terms') ? 0.5 : TERM_SHARE)
  const strips: Strip[] = list.entries.flatMap(({ term, details }) => {
    const row = child({ ...flow, parent: element }, 'LI')
    const label = child({ ...flow, parent: row }, 'Lbl')
    const body = child({ ...flow, parent: row }, 'LBody')
    const left = { ...flow, width: termWidth - CELL.x }
    const right = { ...flow, x: flow.x + termWidth, width: flow.width - termWidth, base: { ...BLOCK.detail, after: 2 } }
    const sides = [
      { strips: textStrips(left, label, term, styled(BLOCK.term.text, flow.inherited)), shift: 0 },
      { strips: flowInto(details, body, right), shift: 0 },
    ]
    return beside(sides, PAD, CONTENT.height, (canvas, shift, y, height) => {
      if (!ruled) return
      const [from, to] = [flow.x + shift, flow.x + shift + flow.width]
      const stroke = { colour: COLOUR.hairline, width: HAIRLINE }
      canvas.artifact('/Type /Layout', () => canvas.rule(from, y + height, to, y + height, stroke))
    })
  })
  return { strips, before: BLOCK.definitions.before, after: BLOCK.definitions.after }
}
