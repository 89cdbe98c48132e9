import { content, type Element, elements, isElement, type Node, problem } from './markup.ts'
import { PaperError } from './problems.ts'
import { readFigure } from './read-figure.ts'
import { readRuns } from './read-inline.ts'
import { readTable } from './read-table.ts'
import { common, type Reading } from './reading.ts'
import type { Block, Definitions, Group, Heading, List, Paragraph, Run } from './tree.ts'

const LEVELS: Readonly<Record<string, Heading['level']>> = { h1: 1, h2: 2, h3: 3, h4: 4 }

const readList = (element: Element, reading: Reading): List => ({
  ...common(element),
  kind: 'list',
  ordered: element.tagName === 'ol',
  items: elements(element).map(reading.mixed),
})

const readDefinitions = (element: Element, reading: Reading): Definitions => {
  const entries: { term: readonly Run[]; details: Block[] }[] = []
  for (const child of elements(element)) {
    if (child.tagName === 'dt') {
      entries.push({ term: readRuns(content(child)), details: [] })
      continue
    }
    const entry = entries.at(-1)
    if (!entry)
      throw problem('misplaced-tag', child, 'A <dd> comes before the first <dt>. Start the list with the term.')
    entry.details.push(...reading.mixed(child))
  }
  return { ...common(element), kind: 'definitions', entries }
}

const readGroup = (element: Element, reading: Reading, tag: Group['tag']): Group => ({
  ...common(element),
  kind: 'group',
  tag,
  blocks: elements(element).map((child) => readBlock(child, reading)),
})

const readBlock = (element: Element, reading: Reading): Block => {
  const level = LEVELS[element.tagName]
  if (level) return { ...common(element), kind: 'heading', level, runs: readRuns(content(element)) }
  switch (element.tagName) {
    case 'ul':
    case 'ol':
      return readList(element, reading)
    case 'dl':
      return readDefinitions(element, reading)
    case 'table':
      return readTable(element, reading)
    case 'figure':
      return readFigure(element, reading)
    case 'section':
    case 'div':
      return readGroup(element, reading, element.tagName)
    default:
      return { ...common(element), kind: 'paragraph', runs: readRuns(content(element)) }
  }
}

const BLOCKS = new Set(['h1', 'h2', 'h3', 'h4', 'p', 'ul', 'ol', 'dl', 'table', 'figure', 'section', 'div'])

const paragraphOf = (nodes: readonly Node[], parent: Element): Paragraph[] => {
  const runs = readRuns(nodes)
  return runs.length === 0 ? [] : [{ ...common(parent), id: undefined, kind: 'paragraph', runs }]
}

/** Words that stand beside blocks become a paragraph of their own, styled by the classes of the element around them. */
const readMixed = (parent: Element, reading: Reading): readonly Block[] => {
  const blocks: Block[] = []
  let loose: Node[] = []
  for (const node of content(parent)) {
    if (!isElement(node) || !BLOCKS.has(node.tagName)) {
      loose.push(node)
      continue
    }
    blocks.push(...paragraphOf(loose, parent), readBlock(node, reading))
    loose = []
  }
  return [...blocks, ...paragraphOf(loose, parent)]
}

const plainText = (runs: readonly Run[]): string => runs.map((run) => (run.kind === 'text' ? run.text : ' ')).join('')

const checkHeadings = (blocks: readonly Block[], before: number): number => {
  let last = before
  for (const block of blocks) {
    if (block.kind === 'group') last = checkHeadings(block.blocks, last)
    if (block.kind !== 'heading') continue
    if (block.level > last + 1) {
      const expected = last === 0 ? 'The first heading must be <h1>' : `After <h${last}> comes at most <h${last + 1}>`
      const found = `<h${block.level}> “${plainText(block.runs).slice(0, 40)}”`
      throw new PaperError('heading-jump', `${found} skips a level. ${expected}.`, block.place)
    }
    last = block.level
  }
  return last
}

/**
 * Blocks of the page, from checked nodes.
 *
 * @param nodes the top-level nodes as `readMarkup` gives them
 * @throws PaperError heading-jump, and what tables and figures throw
 */
export const readBlocks = (nodes: readonly Node[], known: Omit<Reading, 'mixed'>): readonly Block[] => {
  const reading: Reading = { ...known, mixed: (element) => readMixed(element, reading) }
  const blocks = nodes.filter(isElement).map((element) => readBlock(element, reading))
  checkHeadings(blocks, 0)
  return blocks
}
