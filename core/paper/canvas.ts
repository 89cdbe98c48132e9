import type { PdfImage, StructureElement } from 'pdfkit'
import { BADGE_SHAPES } from './badges.ts'
import type { PaperDocument } from './document.ts'
import type { Faces } from './faces.ts'
import type { Line } from './lines.ts'
import { num, pathOperators, rgb } from './operators.ts'
import type { Piece } from './shape.ts'
import type { Segment } from './svg-path.ts'

/** Kinds of artifact, ISO 32000-1, 14.8.2.2. */
export type Artifact =
  | '/Type /Layout'
  | '/Type /Background'
  | `/Type /Pagination /Subtype /${'Header' | 'Footer' | 'Watermark'}`
  | '/Type /Pagination'

export interface Stroke {
  readonly colour: string
  readonly width: number
}

const sameLook = (a: Piece, b: Piece): boolean =>
  a.face === b.face &&
  a.size === b.size &&
  a.colour === b.colour &&
  a.rise === b.rise &&
  a.spacing === b.spacing &&
  !b.shape

/** Writes on the current page. Coordinates in points from the page's top left, downward. */
export class Canvas {
  readonly doc: PaperDocument
  readonly flat: boolean
  readonly #faces: Faces
  #inside = false
  #colour = ''

  /** @param flat whether transparency is forbidden, as in PDF/A-1 */
  constructor(doc: PaperDocument, faces: Faces, flat: boolean) {
    this.doc = doc
    this.#faces = faces
    this.flat = flat
  }

  /** Starts a page. */
  addPage(): void {
    this.doc.addPage()
    this.#colour = ''
  }

  write(operators: string): void {
    this.doc.addContent(operators)
  }

  /** Keeps the graphics state as it was before. */
  saved(paint: () => void): void {
    this.write('q')
    paint()
    this.write('Q')
    this.#colour = ''
  }

  /** What `paint` writes belongs to a structure element; inside an artifact it stays part of that. */
  mark(element: StructureElement, paint: () => void): void {
    if (this.#inside) return paint()
    const content = this.doc.markStructureContent(String(element.dictionary.data.S))
    this.#inside = true
    paint()
    this.#inside = false
    this.doc.endMarkedContent()
    element.add(content)
  }

  /** What `paint` writes is decoration, which no reader speaks; inside marked content it stays part of that. */
  artifact(kind: Artifact, paint: () => void): void {
    if (this.#inside) return paint()
    this.write(`/Artifact <<${kind}>> BDC`)
    this.#inside = true
    paint()
    this.#inside = false
    this.write('EMC')
  }

  rectangle(x: number, y: number, width: number, height: number, colour: string): void {
    this.#setColour(colour)
    this.write(`${num(x)} ${num(y)} ${num(width)} ${num(height)} re f`)
  }

  stroke(segments: readonly Segment[], { colour, width }: Stroke): void {
    this.write(`${rgb(colour)} RG ${num(width)} w\n${pathOperators(segments)}\nS`)
  }

  rule(x: number, y: number, toX: number, toY: number, stroke: Stroke): void {
    this.stroke(
      [
        ['M', x, y],
        ['L', toX, toY],
      ],
      stroke,
    )
  }

  photo(image: PdfImage, x: number, y: number, width: number, height: number): void {
    this.doc.image(image, x, y, { width, height })
  }

  /** Writes a line of text whose first piece starts at `x`, standing on `baseline`. */
  text(pieces: Line['pieces'], x: number, baseline: number): void {
    this.#shapes(pieces, x, baseline)
    let at = x
    let open: Piece[] = []
    let start = x
    const flush = () => {
      const [first] = open
      if (first) this.#group(first, open, start, baseline)
      open = []
    }
    for (const piece of pieces) {
      const first = open[0]
      if (first && !sameLook(first, piece)) flush()
      if (open.length === 0) start = at
      if (!piece.shape) open.push(piece)
      at += piece.width
    }
    flush()
  }

  #shapes(pieces: Line['pieces'], x: number, baseline: number): void {
    let at = x
    for (const piece of pieces) {
      const { shape, size, colour, width } = piece
      if (shape) this.saved(() => this.write(BADGE_SHAPES[shape](at, baseline, size, colour)))
      at += width
    }
  }

  /** Writes pieces that look like the first of them. */
  #group(first: Piece, pieces: readonly Piece[], x: number, baseline: number): void {
    const face = this.#faces[first.face]
    this.doc.page.fonts[face.id] ??= face.reference
    this.#setColour(first.colour)
    const spacing = first.spacing === 0 ? '' : `${num(first.spacing)} Tc `
    const glyphs = pieces.map(({ run }) => face.encode(run)).join('')
    this.write(
      `BT /${face.id} ${num(first.size)} Tf ${spacing}1 0 0 -1 ${num(x)} ${num(baseline - first.rise)} Tm [<${glyphs}>] TJ${spacing === '' ? '' : ' 0 Tc'} ET`,
    )
  }

  #setColour(colour: string): void {
    if (colour === this.#colour) return
    this.#colour = colour
    this.write(`${rgb(colour)} rg`)
  }
}
