import { type DefaultTreeAdapterTypes, parseFragment } from 'parse5'
import { type PaperCode, PaperError, type Place } from './problems.ts'

export type Element = DefaultTreeAdapterTypes.Element
export type Node = DefaultTreeAdapterTypes.ChildNode
export type TextNode = DefaultTreeAdapterTypes.TextNode

export const isElement = (node: Node): node is Element => 'tagName' in node
export const isText = (node: Node): node is TextNode => node.nodeName === '#text'
const isComment = (node: Node): boolean => node.nodeName === '#comment'

const START: Place = { line: 1, column: 1 }

/** Where a node was written; for one that only follows from what it holds, where that was. */
const writtenAt = (node: Node): Node['sourceCodeLocation'] =>
  node.sourceCodeLocation ?? ('childNodes' in node ? node.childNodes.map(writtenAt).find((found) => found) : undefined)

/** Where a node starts in the HTML; the start of the page for one that stands nowhere in it. */
export const placeOf = (node: Node): Place => {
  const location = writtenAt(node)
  return location ? { line: location.startLine, column: location.startCol } : START
}

/** The error of a node, ready to be thrown. */
export const problem = (code: PaperCode, node: Node, sentence: string): PaperError =>
  new PaperError(code, sentence, placeOf(node))

const FLOW = ['h1', 'h2', 'h3', 'h4', 'p', 'ul', 'ol', 'dl', 'table', 'figure', 'section', 'div'] as const
const PHRASING = ['strong', 'em', 'sub', 'sup', 'br', 'span', 'small'] as const

/** What may stand inside each tag. `#text` stands for words outside any tag. */
const CONTENT = {
  root: FLOW,
  section: FLOW,
  div: FLOW,
  h1: [...PHRASING, '#text'],
  h2: [...PHRASING, '#text'],
  h3: [...PHRASING, '#text'],
  h4: [...PHRASING, '#text'],
  p: [...PHRASING, '#text'],
  strong: [...PHRASING, '#text'],
  em: [...PHRASING, '#text'],
  sub: [...PHRASING, '#text'],
  sup: [...PHRASING, '#text'],
  span: [...PHRASING, '#text'],
  small: [...PHRASING, '#text'],
  br: [],
  ul: ['li'],
  ol: ['li'],
  li: [...FLOW, ...PHRASING, '#text'],
  dl: ['dt', 'dd'],
  dt: [...PHRASING, '#text'],
  dd: [...FLOW, ...PHRASING, '#text'],
  table: ['caption', 'colgroup', 'thead', 'tbody'],
  caption: [...PHRASING, '#text'],
  colgroup: ['col'],
  col: [],
  thead: ['tr'],
  tbody: ['tr'],
  tr: ['th', 'td'],
  th: [...PHRASING, '#text'],
  td: [...FLOW, ...PHRASING, '#text'],
  figure: ['svg', 'img', 'figcaption'],
  figcaption: [...PHRASING, '#text'],
  img: [],
} satisfies Readonly<Record<string, readonly string[]>>

type Tag = keyof typeof CONTENT

const isTag = (name: string): name is Tag => Object.hasOwn(CONTENT, name)

const ATTRIBUTES: Readonly<Record<string, readonly string[]>> = {
  col: ['width', 'style', 'span'],
  th: ['scope', 'colspan'],
  td: ['colspan'],
  img: ['src', 'alt', 'width', 'height'],
}
const EVERYWHERE = ['class', 'id', 'lang', 'title']
const VOID = new Set(['br', 'col', 'img'])

const listed = (words: readonly string[]): string =>
  words.map((word) => (word === '#text' ? 'text' : `<${word}>`)).join(', ')

const checkAttributes = (element: Element): void => {
  const allowed = [...EVERYWHERE, ...(ATTRIBUTES[element.tagName] ?? [])]
  for (const { name } of element.attrs) {
    if (allowed.includes(name) || name.startsWith('data-')) continue
    const sentence = `<${element.tagName}> has an attribute ${name}, which the page does not know. Allowed: ${allowed.join(', ')}, data-….`
    throw problem('unknown-attribute', element, sentence)
  }
}

const checkClosed = (element: Element): void => {
  if (VOID.has(element.tagName) || element.sourceCodeLocation?.endTag) return
  throw problem(
    'unclosed-tag',
    element,
    `<${element.tagName}> is not closed. Write </${element.tagName}> where it ends.`,
  )
}

const checkText = (node: TextNode, parent: string, allowed: readonly string[]): void => {
  if (node.value.trim() === '' || allowed.includes('#text')) return
  const words = node.value.trim().slice(0, 30)
  throw problem(
    'loose-text',
    node,
    `The text “${words}” stands directly in ${parent}. Put it into a block such as <p>.`,
  )
}

const checkElement = (element: Element, parent: string, allowed: readonly string[]): Tag | 'svg' => {
  const { tagName } = element
  if (tagName !== 'svg' && !isTag(tagName)) {
    throw problem(
      'unknown-tag',
      element,
      `<${tagName}> is not part of the page's HTML. Allowed here: ${listed(allowed)}.`,
    )
  }
  if (!element.sourceCodeLocation) {
    const where = tagName === 'tbody' ? 'A row' : `The content of ${parent}`
    throw problem('misplaced-tag', element, `${where} stands outside <${tagName}>. Write <${tagName}> around it.`)
  }
  if (!allowed.includes(tagName)) {
    throw problem(
      'misplaced-tag',
      element,
      `<${tagName}> may not stand in ${parent}. Allowed there: ${listed(allowed)}.`,
    )
  }
  return tagName
}

const check = (nodes: readonly Node[], name: Tag): void => {
  const parent = name === 'root' ? 'the page' : `<${name}>`
  const allowed: readonly string[] = CONTENT[name]
  for (const node of nodes) {
    if (isText(node)) checkText(node, parent, allowed)
    if (!isElement(node)) continue
    const tag = checkElement(node, parent, allowed)
    if (tag === 'svg') continue
    checkAttributes(node)
    checkClosed(node)
    check(node.childNodes, tag)
  }
}

/**
 * Reads the HTML and checks that it keeps to the subset: only known tags and attributes, each where it may stand, each closed.
 *
 * @param html the page's content, without <html> or <body>
 * @returns the top-level nodes, with their places
 * @throws PaperError broken-html, unknown-tag, unknown-attribute, misplaced-tag, unclosed-tag, loose-text
 */
export const readMarkup = (html: string): readonly Node[] => {
  const fragment = parseFragment(html, {
    sourceCodeLocationInfo: true,
    onParseError: ({ code, startLine, startCol }) => {
      const sentence = `The HTML is broken here: ${code.replaceAll('-', ' ')}.`
      throw new PaperError('broken-html', sentence, { line: startLine, column: startCol })
    },
  })
  check(fragment.childNodes, 'root')
  return fragment.childNodes
}

/** The value of an attribute, or nothing. */
export const attribute = (element: Element, name: string): string | undefined =>
  element.attrs.find((attr) => attr.name === name)?.value

/** The classes of an element, in order. */
export const classesOf = (element: Element): readonly string[] =>
  (attribute(element, 'class') ?? '').split(/\s+/).filter((name) => name !== '')

/** Child nodes without comments. */
export const content = (element: Element): readonly Node[] => element.childNodes.filter((node) => !isComment(node))

/** Child elements, in order. */
export const elements = (element: Element): readonly Element[] => element.childNodes.filter(isElement)
