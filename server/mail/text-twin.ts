import { type DefaultTreeAdapterTypes, parseFragment } from 'parse5'

type Node = DefaultTreeAdapterTypes.ChildNode

interface Block {
  readonly before: string
  readonly after: string
}

/** How each tag of a mail's HTML reads as plain text; any other tag is a mistake in a template. */
const BLOCKS: Readonly<Record<string, Block>> = {
  p: { before: '', after: '\n\n' },
  ul: { before: '', after: '\n\n' },
  li: { before: '- ', after: '\n' },
  blockquote: { before: '> ', after: '\n\n' },
}

const INLINE: ReadonlySet<string> = new Set(['a', 'strong', 'small'])

const isText = (node: Node): node is DefaultTreeAdapterTypes.TextNode => node.nodeName === '#text'

/** Blank text between blocks belongs to the layout of the template. */
const isGap = (node: Node): boolean => isText(node) && node.value.trim() === ''

const readBlocks = (nodes: readonly Node[]): string => read(nodes.filter((node) => !isGap(node)))

const read = (nodes: readonly Node[]): string => nodes.map(readNode).join('')

function readNode(node: Node): string {
  if (isText(node)) return node.value.replace(/\s+/g, ' ')
  if (!('tagName' in node)) throw new Error(`A mail's page holds ${node.nodeName}.`)
  if (INLINE.has(node.tagName)) return read(node.childNodes)
  const block = BLOCKS[node.tagName]
  if (!block) throw new Error(`A mail's page holds the tag ${node.tagName}.`)
  return `${block.before}${(node.tagName === 'ul' ? readBlocks : read)(node.childNodes).trim()}${block.after}`
}

export interface Twins {
  readonly subject: string
  readonly text: string
  /** Without the title. */
  readonly body: string
}

/** A filled page as plain text, so that both parts of a mail always say the same. Its title is the subject. */
export function textTwin(page: string): Twins {
  const title = /^\s*<title>[^<]*<\/title>/.exec(page)?.[0]
  if (title === undefined) throw new Error("A mail's page begins with its title.")
  const body = page.slice(title.length).trim()
  const [head] = parseFragment(title.trim()).childNodes
  const subject = head && 'childNodes' in head ? read(head.childNodes).trim() : ''
  const text = readBlocks(parseFragment(body).childNodes).trim()
  return { subject, text: `${text}\n`, body }
}
