import { strToU8, zlibSync } from 'fflate'
import PDFDocument, { type EmbeddedFont, type FontkitFont, type PdfReference } from 'pdfkit'
import { type Entry, writeOutline } from './outline.ts'
import { pdfString } from './pdf-string.ts'
import { sha256 } from './sha256.ts'
import { srgbProfile } from './srgb.ts'
import { PAGE } from './style.ts'
import { type About, xmpPacket } from './xmp.ts'

const joined = (chunks: readonly Uint8Array[]): Uint8Array => {
  const whole = new Uint8Array(chunks.reduce((size, chunk) => size + chunk.length, 0))
  let at = 0
  for (const chunk of chunks) {
    whole.set(chunk, at)
    at += chunk.length
  }
  return whole
}

/**
 * PDFKit's document with everything taken out that reads a disk, a clock, or the platform's own compression,
 * and with the metadata, outline, colour profile and identifier that PDF/A and PDF/UA want.
 *
 * `declare` and the `??=` below are needed because PDFKit's constructor already writes before a subclass's fields exist.
 */
export class PaperDocument extends PDFDocument {
  declare private chunks: Uint8Array[] | undefined
  private readonly about: About
  private complete = false
  readonly headings: Entry[] = []

  constructor(about: About) {
    super({
      font: null,
      pdfVersion: about.part === 1 ? '1.4' : '1.7',
      tagged: true,
      lang: about.language,
      displayTitle: true,
      autoFirstPage: false,
      size: [PAGE.width, PAGE.height],
      margin: 0,
      info: {
        Title: about.title,
        Author: about.author,
        ...(about.subject === undefined ? {} : { Subject: about.subject }),
        Producer: about.producer,
        Creator: about.producer,
        CreationDate: about.created,
        ModDate: about.created,
      },
    })
    this.about = about
    this.subset = about.part
  }

  /** Opens a font under a name, or makes an opened one current, and returns it. */
  openFont(name: string, source: Uint8Array | FontkitFont): EmbeddedFont {
    this.registerFont(name, source)
    this.font(name)
    return this._font
  }

  /** Ends the document and returns its bytes. */
  finish(): Uint8Array {
    this.end()
    if (!this.complete) throw new Error('A PDF object was opened and not ended.')
    return joined(this.written)
  }

  private get written(): Uint8Array[] {
    this.chunks ??= []
    return this.chunks
  }

  /** Takes the bytes directly, without a stream. */
  override push(chunk: Uint8Array | null): boolean {
    if (chunk) this.written.push(chunk)
    return true
  }

  /** Compresses with fflate, so that the bytes do not depend on the zlib that a platform was built with. */
  override ref(data?: Record<string, unknown>): PdfReference {
    const reference = super.ref(data)
    const finalize = reference.finalize.bind(reference)
    reference.finalize = () => {
      if (reference.compress && reference.buffer.length > 0) {
        reference.buffer = [zlibSync(joined(reference.buffer))]
        reference.compress = false
      }
      finalize()
    }
    return reference
  }

  override endOutline(): void {
    const { dictionary } = this.outline
    writeOutline(this, dictionary, this.headings)
    if (this.headings.length === 0) return
    this._root.data.Outlines = dictionary
    this._root.data.PageMode = 'UseOutlines'
  }

  override endSubset(): void {
    const profile = this.ref({ N: 3 })
    profile.end(srgbProfile())
    const name = pdfString('sRGB IEC61966-2.1')
    const intent = this.ref({
      Type: 'OutputIntent',
      S: 'GTS_PDFA1',
      Info: name,
      OutputConditionIdentifier: name,
      DestOutputProfile: profile,
    })
    intent.end()
    this._root.data.OutputIntents = [intent]
  }

  /** Puts the room for a seal into the catalog: the form with its field, and the permissions that the seal gives. */
  sealWith(form: PdfReference, signature: PdfReference): void {
    this._root.data.AcroForm = form
    this._root.data.Perms = { DocMDP: signature }
  }

  /** The only form that there can be is the seal's, which is written already; PDFKit would ask it for fonts. */
  override endAcroForm(): void {}

  override endMetadata(): void {
    const packet = this.ref({ Type: 'Metadata', Subtype: 'XML' })
    packet.compress = false
    packet.end(strToU8(xmpPacket(this.about)))
    this._root.data.Metadata = packet
  }

  /** The identifier is the digest of everything before the trailer: the same content, the same identifier. */
  protected override _finalize(): void {
    this._id = sha256(joined(this.written)).slice(0, 16)
    super._finalize()
    this.complete = true
  }
}
