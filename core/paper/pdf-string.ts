/**
 * Marks text that shall become a PDF string: PDFKit writes a String object as `(text)` and a plain string as the name `/text`.
 *
 * @param text any text; PDFKit escapes it and writes UTF-16 where ASCII is not enough
 */
export const pdfString = (text: string): object => Object(text)
