/**
 * The typesetting engine: a small, strict HTML becomes a tagged, archivable PDF, the same bytes for the same input.
 *
 * ## HTML
 * A fragment without <html> or <body>. Every element is closed; attributes are those named here, `class`, `id` (becomes a named destination),
 * `lang`, `title` and `data-…`. Anything else is a `PaperError` with line and column.
 *
 * | where | what |
 * | --- | --- |
 * | page, section, div | h1–h4 (the first is h1, no level skipped), p, ul, ol, dl, table, figure, section, div; no loose text |
 * | words (h1–h4, p, dt, caption, figcaption, th) | text, strong, em, sub, sup, small, span, br |
 * | li, dd, td | words or blocks, or words followed by blocks |
 * | table | caption?, colgroup? of `<col width="18%">` (or no width: the content decides; `span`, `class`), thead?, tbody (one or more). `th` needs `scope` (col, row, colgroup, rowgroup); `colspan` is understood, `rowspan` is not |
 * | figure | one `<svg role="img" aria-label="…">` (or with `<title>`) or one `<img src="key" alt="…">`, then figcaption?. `width="60%"` or pixels on either |
 *
 * A no-break space joins words; a zero-width space (U+200B) allows a break; so do a hyphen or slash between letters and an em dash.
 * Drawings: see `svg-read.ts` for the elements and attributes; classes are looked up in `options.svgStyles`.
 *
 * ## Classes
 * - any block: `page-break` (starts a page), `keep` (is not divided between pages, unless taller than one)
 * - p: `with-next` (stays on the page on which the following block starts)
 * - div or section as a box: `title-block` (once, at the start: chart frame with the skerry), `box`, `box-tint`, `box-note`, `box-caution` (heavy bar), `box-island` (the lamp's colour)
 * - div or section as columns: `columns-2`, `columns-3`, `grid-2`, `grid-3`, `grid-4`. Children that are all div, section or figure stand beside each other, boxes of one row equally high; other content is divided evenly
 * - table: `zebra`, `plain` (no lines between rows); several tbody are groups that stay whole. tr: `group`, `total`, `row-fails`, `row-island`. A row with a single `th` names a group
 * - col, th, td: `num` (to the right; figures are tabular), `centre`
 * - dl: `plain` (no lines), `wide-terms` (half the width)
 * - any text: `lead`, `muted`, `small-label`, `figure` (a large number), `medium`, `right`, `island`, `alarm`
 * - span: `verdict-meets`, `verdict-meets-inside`, `verdict-fails-inside`, `verdict-fails`, `verdict-not-shown`, `verdict-limited`, `verdict-not-applicable` put a shape in front of the word inside
 */
import type { StructureElement } from 'pdfkit'
import { Canvas } from './canvas.ts'
import { PaperDocument } from './document.ts'
import { openFaces } from './faces.ts'
import type { Flow } from './flow.ts'
import { flowBlocks } from './flow-blocks.ts'
import { paintFurniture } from './furniture.ts'
import { readMarkup } from './markup.ts'
import type { PaperOptions } from './options.ts'
import { type Page, paginate } from './paginate.ts'
import { photoShelf } from './photos.ts'
import { PaperError } from './problems.ts'
import { readBlocks } from './read-blocks.ts'
import { keepRoomForSeal } from './seal-room.ts'
import { Shaper } from './shape.ts'
import { paintPlaced } from './strips.ts'
import { BLOCK, CONTENT, PAGE, SVG_CLASS } from './style.ts'

const PRODUCER = 'Skerry'

const dated = (name: string, iso: string): Date => {
  const date = new Date(iso)
  if (Number.isNaN(date.getTime())) throw new RangeError(`${name} is “${iso}”. Write an ISO 8601 date and time.`)
  return date
}

const openDocument = (options: PaperOptions): PaperDocument => {
  const flat = options.flavour === 'PDF/A-1b'
  return new PaperDocument({
    title: options.title,
    author: options.author,
    subject: options.subject,
    language: options.language,
    created: dated('created', options.created),
    producer: PRODUCER,
    part: flat ? 1 : 3,
    conformance: flat ? 'B' : 'A',
  })
}

const attach = (doc: PaperDocument, { attachments = [], flavour }: PaperOptions): void => {
  if (attachments.length > 0 && flavour === 'PDF/A-1b') {
    throw new PaperError('flavour', 'PDF/A-1b carries no attachments. Leave them out, or choose PDF/A-3a.')
  }
  for (const { name, type, bytes, relationship, description, created } of attachments) {
    const date = dated(`created of ${name}`, created)
    doc.file(bytes, { name, type, relationship, description, creationDate: date, modifiedDate: date })
  }
}

interface Desk {
  readonly doc: PaperDocument
  readonly shaper: Shaper
  readonly parent: StructureElement
}

const paintPages = (
  canvas: Canvas,
  { doc, shaper, parent }: Desk,
  pages: readonly Page[],
  options: PaperOptions,
): void => {
  pages.forEach(({ repeated, placed }, index) => {
    canvas.addPage()
    if (index === 0 && options.seal) keepRoomForSeal(doc, parent, options.seal)
    paintFurniture(canvas, shaper, options, { page: index + 1, pages: pages.length })
    if (repeated.length > 0) canvas.artifact('/Type /Pagination', () => paintPlaced(canvas, 0, repeated))
    paintPlaced(canvas, 0, placed)
  })
}

/**
 * Typesets a page of HTML as PDF/A-3a and PDF/UA-1 (or PDF/A-1b), A4 upright.
 *
 * @param html the subset described above
 * @param options fonts, title and the other things that stand outside the text
 * @returns the file's bytes: the same input gives the same bytes in every process and on every machine
 * @throws PaperError what is wrong in the HTML and where; RangeError for a date that is none
 */
export const typeset = (html: string, options: PaperOptions): Uint8Array => {
  const { pictures = {}, svgStyles = {} } = options
  const reading = { svgStyles: { ...SVG_CLASS, ...svgStyles }, pictures: new Set(Object.keys(pictures)) }
  const blocks = readBlocks(readMarkup(html), reading)
  const doc = openDocument(options)
  const faces = openFaces(doc, options.fonts)
  const shaper = new Shaper(faces, html)
  const parent = doc.struct('Document')
  doc.addStructure(parent)
  const flow: Flow = {
    doc,
    shaper,
    photo: photoShelf(doc, pictures),
    x: PAGE.left,
    width: CONTENT.width,
    parent,
    base: BLOCK.p,
    inherited: [],
    blocks: flowBlocks,
  }
  const pages = paginate(flowBlocks(blocks, flow), PAGE.top, CONTENT.bottom)
  attach(doc, options)
  paintPages(new Canvas(doc, faces, options.flavour === 'PDF/A-1b'), { doc, shaper, parent }, pages, options)
  return doc.finish()
}
