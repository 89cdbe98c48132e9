import type PDFDocument from 'pdfkit'
import type { PdfReference } from 'pdfkit'
import { pdfString } from './pdf-string.ts'
import { PAGE } from './style.ts'

/** A heading as the outline shows it. */
export interface Entry {
  readonly level: number
  readonly title: string
  readonly page: PdfReference
  /** Distance of its top from the top of the page, in points. */
  readonly top: number
}

interface Item {
  /** 0 for the outline itself. */
  readonly level: number
  readonly entry: Entry | undefined
  readonly reference: PdfReference
  readonly children: Item[]
}

/** Headings of the first level stand open, the others closed. */
const OPEN_LEVEL = 1
const HEADROOM = 12

const nest = (doc: PDFDocument, reference: PdfReference, entries: readonly Entry[]): Item => {
  const root: Item = { level: 0, entry: undefined, reference, children: [] }
  let open: readonly Item[] = [root]
  for (const entry of entries) {
    const above = open.filter(({ level }) => level < entry.level)
    const item: Item = { level: entry.level, entry, reference: doc.ref({}), children: [] }
    above.at(-1)?.children.push(item)
    open = [...above, item]
  }
  return root
}

const isOpen = (item: Item): boolean => item.level <= OPEN_LEVEL

/** How many items show when this one is opened (ISO 32000-1, table 153). */
const showing = (item: Item): number =>
  item.children.reduce((sum, child) => sum + 1 + (isOpen(child) ? showing(child) : 0), 0)

const write = (item: Item, parent: Item | undefined): void => {
  const { data } = item.reference
  if (item.entry && parent) {
    const { title, page, top } = item.entry
    const index = parent.children.indexOf(item)
    Object.assign(data, {
      Title: pdfString(title),
      Parent: parent.reference,
      Prev: parent.children[index - 1]?.reference,
      Next: parent.children[index + 1]?.reference,
      Dest: [page, 'XYZ', 0, Math.round(PAGE.height - top + HEADROOM), null],
    })
  }
  if (item.children.length > 0) {
    data.First = item.children[0]?.reference
    data.Last = item.children.at(-1)?.reference
    data.Count = isOpen(item) ? showing(item) : -showing(item)
  }
  for (const child of item.children) write(child, item)
  item.reference.end()
}

/**
 * Writes the document outline from its headings, with the counts that PDFKit leaves out, and ends it.
 *
 * @param doc the document, still open
 * @param root the outline's own dictionary
 * @param entries the headings in order, without a jump in level
 * @source ISO 32000-1:2008, 12.3.3, tables 152 and 153
 */
export const writeOutline = (doc: PDFDocument, root: PdfReference, entries: readonly Entry[]): void => {
  root.data.Type = 'Outlines'
  write(nest(doc, root, entries), undefined)
}
