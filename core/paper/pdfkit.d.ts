/**
 * The part of PDFKit 0.20 that `core/paper` uses, and nothing else.
 * The published typings are not used because they pull in Node's types, which `core/` must do without.
 * Members with a leading underscore are PDFKit's own; `document.ts` is the only file that touches them.
 */
declare module 'pdfkit' {
  export interface PdfReference {
    readonly id: number
    data: Record<string, unknown>
    compress: boolean
    buffer: Uint8Array[]
    write(chunk: string | Uint8Array): void
    end(chunk?: string | Uint8Array): void
    finalize(): void
  }

  export interface FontkitGlyph {
    readonly id: number
    readonly advanceWidth: number
  }

  export interface FontkitFont {
    readonly unitsPerEm: number
    hasGlyphForCodePoint(codePoint: number): boolean
    glyphForCodePoint(codePoint: number): FontkitGlyph
  }

  export interface EmbeddedFont {
    readonly id: string
    readonly font: FontkitFont
    readonly subset: { includeGlyph(glyph: number): number }
    readonly unicode: number[][]
    readonly widths: number[]
    ref(): PdfReference
  }

  export interface PdfPage {
    readonly width: number
    readonly height: number
    readonly dictionary: PdfReference
    readonly fonts: Record<string, PdfReference>
    readonly annotations: PdfReference[]
  }

  export interface StructureContent {
    readonly refs: readonly unknown[]
  }

  export interface StructureElement {
    readonly dictionary: PdfReference
    add(child: StructureElement | StructureContent): StructureElement
    end(): void
  }

  export interface PdfImage {
    readonly width: number
    readonly height: number
    readonly orientation?: number
    readonly colorSpace?: string
  }

  export interface PdfOptions {
    font: null
    pdfVersion: '1.4' | '1.7'
    tagged: boolean
    lang: string
    displayTitle: boolean
    autoFirstPage: boolean
    size: [number, number]
    margin: number
    info: Record<string, string | Date>
  }

  export default class PDFDocument {
    constructor(options: PdfOptions)
    readonly page: PdfPage
    readonly outline: { readonly dictionary: PdfReference }
    readonly info: Record<string, string | Date>
    subset: number
    protected _id: Uint8Array
    protected readonly _root: PdfReference
    protected readonly _font: EmbeddedFont
    addPage(): this
    addContent(operators: string): this
    ref(data?: Record<string, unknown>): PdfReference
    registerFont(name: string, source: Uint8Array | FontkitFont): this
    font(name: string): this
    fillOpacity(opacity: number): this
    strokeOpacity(opacity: number): this
    openImage(bytes: Uint8Array): PdfImage
    image(image: PdfImage, x: number, y: number, size: { width: number; height: number }): this
    struct(type: string, options?: { alt?: string }): StructureElement
    addStructure(element: StructureElement): this
    markStructureContent(tag: string): StructureContent
    endMarkedContent(): this
    addNamedDestination(name: string, kind: 'XYZ', left: number, top: number, zoom: null): void
    file(
      bytes: Uint8Array,
      options: {
        name: string
        type: string
        relationship: string
        description: string
        creationDate: Date
        modifiedDate: Date
      },
    ): PdfReference
    annotate(
      x: number,
      y: number,
      width: number,
      height: number,
      options: Record<string, unknown> & { structParent: StructureElement },
    ): this
    end(): void
    endAcroForm(): void
    endOutline(): void
    endMetadata(): void
    endSubset(): void
    push(chunk: Uint8Array | null): boolean
    protected _finalize(): void
  }
}
