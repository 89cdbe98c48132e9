import { classesOf, content, type Element, isElement, isText, type Node, placeOf, type TextNode } from './markup.ts'
import { BADGE } from './style.ts'
import type { Marks, Run } from './tree.ts'

const PLAIN: Marks = { strong: false, em: false, small: false, raise: undefined, classes: [] }

const marked = (marks: Marks, element: Element): Marks => {
  const classes = [...marks.classes, ...classesOf(element)]
  switch (element.tagName) {
    case 'strong':
      return { ...marks, classes, strong: true }
    case 'em':
      return { ...marks, classes, em: true }
    case 'small':
      return { ...marks, classes, small: true }
    case 'sub':
      return { ...marks, classes, raise: 'sub' }
    case 'sup':
      return { ...marks, classes, raise: 'sup' }
    default:
      return { ...marks, classes }
  }
}

const textRun = (node: TextNode, marks: Marks): Run => {
  const location = node.sourceCodeLocation
  const source = { place: placeOf(node), from: Number(location?.startOffset), to: Number(location?.endOffset) }
  return { kind: 'text', text: node.value.replace(/[ \t\n\r\f]+/g, ' '), marks, source }
}

const collect = (nodes: readonly Node[], marks: Marks, into: Run[]): void => {
  for (const node of nodes) {
    if (isText(node)) into.push(textRun(node, marks))
    if (!isElement(node)) continue
    if (node.tagName === 'br') {
      into.push({ kind: 'break' })
      continue
    }
    const inner = marked(marks, node)
    const badge = classesOf(node).map((name) => BADGE[name])[0]
    if (badge) into.push({ kind: 'shape', ...badge, marks: inner })
    collect(content(node), inner, into)
  }
}

/** One space between words over all runs, none at the ends of a line that the author made. */
const tidy = (runs: readonly Run[]): readonly Run[] => {
  const kept: Run[] = []
  let afterSpace = true
  for (const run of runs) {
    if (run.kind !== 'text') {
      kept.push(run)
      afterSpace = run.kind === 'break'
      continue
    }
    const text = afterSpace && run.text.startsWith(' ') ? run.text.slice(1) : run.text
    if (text === '') continue
    afterSpace = text.endsWith(' ')
    kept.push({ ...run, text })
  }
  return kept
}

/**
 * The runs of text inside nodes that hold only phrasing, with white space collapsed as HTML does.
 *
 * @param nodes text and phrasing elements, already checked by `readMarkup`
 */
export const readRuns = (nodes: readonly Node[]): readonly Run[] => {
  const runs: Run[] = []
  collect(nodes, PLAIN, runs)
  return tidy(runs)
}
