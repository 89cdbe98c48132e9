import type { EmbeddedFont, FontkitFont } from 'pdfkit'
import type { PaperDocument } from './document.ts'
import { readKerning } from './kerning.ts'
import type { FaceName } from './style.ts'

/** Text set in one font: which glyphs, how far each moves on, both in thousandths of the size. */
export interface GlyphRun {
  /** `kern` changes how far a glyph moves on because of the one that follows. */
  readonly glyphs: readonly (Glyph & { readonly kern: number })[]
  readonly width: number
}

export interface Glyph {
  readonly id: number
  readonly codePoint: number
  readonly width: number
}

/** What is known about a font and does not depend on the document. Kept as long as its bytes are. */
interface SharedFace {
  readonly font: FontkitFont
  readonly glyphs: Map<number, Glyph>
  readonly kern: (left: number, right: number) => number
  readonly runs: Map<string, GlyphRun>
}

const RUN_LIMIT = 20_000
const PADDING = 16
const shared = new WeakMap<Uint8Array, SharedFace>()

/** fontkit reads past the end of a font whose last glyph is empty: sixteen zeros behind it are enough. */
const padded = (bytes: Uint8Array): Uint8Array => {
  const longer = new Uint8Array(bytes.length + PADDING)
  longer.set(bytes)
  return longer
}

const isDigit = (codePoint: number): boolean => codePoint >= 48 && codePoint <= 57

/** One font in one document. Spaces that may not break a line are drawn as the plain space, so that text copied out of the PDF has plain spaces. */
export class Face {
  readonly #shared: SharedFace
  readonly #embedded: EmbeddedFont
  readonly #encoded = new Map<GlyphRun, string>()

  constructor(doc: PaperDocument, name: FaceName, bytes: Uint8Array) {
    const known = shared.get(bytes)
    this.#embedded = doc.openFont(name, known?.font ?? padded(bytes))
    this.#embedded.unicode[0] = [0xfffd]
    this.#shared = known ?? {
      font: this.#embedded.font,
      glyphs: new Map(),
      kern: readKerning(bytes),
      runs: new Map(),
    }
    shared.set(bytes, this.#shared)
  }

  get id(): string {
    return this.#embedded.id
  }

  /** The font's dictionary, which a page names among its resources. */
  get reference() {
    return this.#embedded.ref()
  }

  /** Whether the font draws this character. */
  has(codePoint: number): boolean {
    return this.#shared.glyphs.has(codePoint) || this.#shared.font.hasGlyphForCodePoint(codePoint)
  }

  /** The glyphs of text whose characters the font has. */
  run(text: string): GlyphRun {
    const { runs } = this.#shared
    const known = runs.get(text)
    if (known) return known
    if (runs.size >= RUN_LIMIT) runs.clear()
    const made = this.#make(text)
    runs.set(text, made)
    return made
  }

  /** The inside of a `TJ` array, without its first `<` and last `>`, so that neighbours can be joined. */
  encode(run: GlyphRun): string {
    const known = this.#encoded.get(run)
    if (known !== undefined) return known
    let text = ''
    for (const glyph of run.glyphs) {
      text += this.#code(glyph)
      if (glyph.kern !== 0) text += `>${Math.round(-glyph.kern)}<`
    }
    this.#encoded.set(run, text)
    return text
  }

  #make(text: string): GlyphRun {
    const plain = Array.from(text, (sign) => this.#glyph(Number(sign.codePointAt(0))))
    const glyphs = plain.map((glyph, index) => ({ ...glyph, kern: this.#kern(glyph, plain[index + 1]) }))
    return { glyphs, width: glyphs.reduce((sum, { width, kern }) => sum + width + kern, 0) }
  }

  #glyph(codePoint: number): Glyph {
    const { glyphs, font } = this.#shared
    const known = glyphs.get(codePoint)
    if (known) return known
    const { id, advanceWidth } = font.glyphForCodePoint(codePoint)
    const glyph = { id, codePoint, width: (advanceWidth * 1000) / font.unitsPerEm }
    glyphs.set(codePoint, glyph)
    return glyph
  }

  /** Digits stay in their columns; ligatures are left out. */
  #kern(glyph: Glyph, next: Glyph | undefined): number {
    if (!next || (isDigit(glyph.codePoint) && isDigit(next.codePoint))) return 0
    const { kern, font } = this.#shared
    return (kern(glyph.id, next.id) * 1000) / font.unitsPerEm
  }

  #code(glyph: Glyph): string {
    const code = this.#embedded.subset.includeGlyph(glyph.id)
    this.#embedded.widths[code] ??= glyph.width
    this.#embedded.unicode[code] ??= [glyph.codePoint]
    return code.toString(16).padStart(4, '0')
  }
}

export type Faces = Readonly<Record<FaceName, Face>>

/** Opens the five fonts in a document. */
export const openFaces = (doc: PaperDocument, fonts: Readonly<Record<FaceName, Uint8Array>>): Faces => ({
  regular: new Face(doc, 'regular', fonts.regular),
  italic: new Face(doc, 'italic', fonts.italic),
  medium: new Face(doc, 'medium', fonts.medium),
  semibold: new Face(doc, 'semibold', fonts.semibold),
  fallback: new Face(doc, 'fallback', fonts.fallback),
})
