import type PDFDocument from 'pdfkit'
import type { PdfImage } from 'pdfkit'
import { PaperError } from './problems.ts'

const isJpeg = (bytes: Uint8Array): boolean => bytes[0] === 0xff && bytes[1] === 0xd8

const open = (doc: PDFDocument, name: string, bytes: Uint8Array | undefined): PdfImage => {
  if (!bytes || !isJpeg(bytes))
    throw new PaperError('picture-format', `The picture “${name}” is not a JPEG file. Convert it to JPEG.`)
  const image = doc.openImage(bytes)
  if (image.colorSpace === 'DeviceRGB' || image.colorSpace === 'DeviceGray') return image
  throw new PaperError(
    'picture-format',
    `The picture “${name}” is not in RGB or grey, which PDF/A needs here. Convert it to sRGB.`,
  )
}

/**
 * Opens photos by name, each once, so that a photo shown twice is stored once.
 *
 * @param pictures JPEG files by name
 * @returns a function that throws PaperError picture-format for what is not a JPEG in RGB or grey
 */
export const photoShelf = (
  doc: PDFDocument,
  pictures: Readonly<Record<string, Uint8Array>>,
): ((name: string) => PdfImage) => {
  const opened = new Map<string, PdfImage>()
  return (name) => {
    const image = opened.get(name) ?? open(doc, name, pictures[name])
    opened.set(name, image)
    return image
  }
}
