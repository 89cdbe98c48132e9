import { child, type Flow, type Laid, styled, textStrips } from './flow.ts'
import { boxOf, flowBox, flowGrid, gridOf } from './flow-box.ts'
import { flowDefinitions } from './flow-definitions.ts'
import { flowFigure } from './flow-figure.ts'
import { flowList } from './flow-list.ts'
import { flowTable } from './flow-table.ts'
import { changeFirst, type Strip, strip } from './strips.ts'
import { BLOCK, COLOUR, HAIRLINE, MEASURE } from './style.ts'
import type { Block, Group, Heading, Paragraph } from './tree.ts'

const HEADINGS = { 1: BLOCK.h1, 2: BLOCK.h2, 3: BLOCK.h3, 4: BLOCK.h4 } as const

const titleOf = (heading: Heading): string =>
  heading.runs
    .map((run) => (run.kind === 'text' ? run.text : ' '))
    .join('')
    .trim()

/** A heading holds on to what follows, stands in the outline, and, at the second level, hangs from a hairline. */
const flowHeading = (heading: Heading, flow: Flow): Laid => {
  const style = HEADINGS[heading.level]
  const text = styled(style.text, [...flow.inherited, ...heading.classes])
  const lines = textStrips(flow, child(flow, `H${heading.level}`), heading.runs, text)
  const strips = lines.map((line, index) =>
    strip(
      line.height,
      (canvas, shift, y) => {
        if (index === 0) {
          canvas.doc.headings.push({
            level: heading.level,
            title: titleOf(heading),
            page: canvas.doc.page.dictionary,
            top: y,
          })
        }
        if (index === 0 && heading.level === 2) {
          const [left, right] = [flow.x + shift, flow.x + shift + flow.width]
          const stroke = { colour: COLOUR.rule, width: HAIRLINE }
          canvas.artifact('/Type /Layout', () => canvas.rule(left, y - 5, right, y - 5, stroke))
        }
        line.paint(canvas, shift, y)
      },
      { hold: 2 },
    ),
  )
  return { strips, before: style.before, after: style.after }
}

const flowParagraph = (paragraph: Paragraph, flow: Flow): Laid => {
  const text = styled(flow.base.text, [...flow.inherited, ...paragraph.classes])
  const width = text.align === 'left' ? Math.min(flow.width, MEASURE) : flow.width
  const lines = textStrips({ ...flow, width }, child(flow, 'P'), paragraph.runs, text)
  const leads = paragraph.classes.includes('with-next')
  return {
    strips: leads ? lines.map((line) => ({ ...line, hold: 2 })) : lines,
    before: flow.base.before,
    after: flow.base.after,
  }
}

const flowGroup = (group: Group, flow: Flow): Laid => {
  const box = boxOf(group.classes)
  if (box) return flowBox(group, box, flow)
  const parent = child(flow, group.tag === 'section' ? 'Sect' : 'Div')
  const inner = { ...flow, parent, inherited: [...flow.inherited, ...group.classes] }
  const columns = gridOf(group.classes)
  if (columns) return flowGrid(group, columns, inner)
  return { strips: flow.blocks(group.blocks, inner), before: 0, after: 0 }
}

const flowBlock = (block: Block, flow: Flow): Laid => {
  switch (block.kind) {
    case 'heading':
      return flowHeading(block, flow)
    case 'paragraph':
      return flowParagraph(block, flow)
    case 'list':
      return flowList(block, flow)
    case 'definitions':
      return flowDefinitions(block, flow)
    case 'table':
      return flowTable(block, flow)
    case 'figure':
      return flowFigure(block, flow)
    case 'group':
      return flowGroup(block, flow)
  }
}

/** Makes the block a place that links can name. */
const anchored = (strips: readonly Strip[], id: string | undefined): readonly Strip[] => {
  const first = strips[0]
  if (!first || id === undefined) return strips
  return changeFirst(strips, {
    paint: (canvas, shift, y) => {
      canvas.doc.addNamedDestination(id, 'XYZ', 0, y - 12, null)
      first.paint(canvas, shift, y)
    },
  })
}

/**
 * Lays out blocks below each other. Between two blocks lies the larger of the distances that they ask for.
 *
 * @param blocks in order
 * @param flow where they stand
 */
export const flowBlocks = (blocks: readonly Block[], flow: Flow): readonly Strip[] => {
  const strips: Strip[] = []
  let after = 0
  for (const block of blocks) {
    const laid = flowBlock(block, flow)
    const first = laid.strips[0]
    if (!first) continue
    const before = Math.max(after, laid.before, first.before)
    const breakBefore = first.breakBefore || block.classes.includes('page-break')
    const hold = block.classes.includes('keep')
    const held = hold
      ? laid.strips.map((one, at) =>
          at === laid.strips.length - 1 || one.hold === 2 ? one : { ...one, hold: 1 as const },
        )
      : laid.strips
    strips.push(...changeFirst(anchored(held, block.id), { before, breakBefore }))
    after = laid.after
  }
  return strips
}
