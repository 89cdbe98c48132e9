/** Where something stands in the HTML; lines and columns count from 1. */
export interface Place {
  readonly line: number
  readonly column: number
}

/** Everything that keeps a page from being typeset. */
export type PaperCode =
  | 'broken-html'
  | 'unknown-tag'
  | 'unknown-attribute'
  | 'misplaced-tag'
  | 'unclosed-tag'
  | 'loose-text'
  | 'heading-jump'
  | 'header-without-scope'
  | 'missing-alternative'
  | 'unknown-picture'
  | 'picture-format'
  | 'unknown-character'
  | 'table-shape'
  | 'svg-value'
  | 'flavour'

/** A page that cannot be typeset: what is wrong and, where it stands in the HTML, at which line and column. */
export class PaperError extends Error {
  readonly code: PaperCode
  readonly line: number | undefined
  readonly column: number | undefined

  constructor(code: PaperCode, sentence: string, place?: Place) {
    super(place ? `Line ${place.line}, column ${place.column}: ${sentence}` : sentence)
    this.name = 'PaperError'
    this.code = code
    this.line = place?.line
    this.column = place?.column
  }
}
