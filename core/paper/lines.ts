import type { Piece, Word } from './shape.ts'

/** One line of text: pieces from left to right, each where the one before ends. Width in points, without a space at the end. */
export interface Line {
  readonly pieces: readonly Piece[]
  readonly width: number
}

/** One piece for each glyph, for words that are wider than any line. */
const letters = (word: Word): readonly Word[] => {
  const parts = word.pieces.flatMap((piece) => {
    if (piece.shape) return [piece]
    return piece.run.glyphs.map((glyph) => ({
      ...piece,
      run: { glyphs: [{ ...glyph, kern: 0 }], width: glyph.width },
      width: (glyph.width * piece.size) / 1000 + piece.spacing,
    }))
  })
  return parts.map((piece, index) => {
    const last = index === parts.length - 1
    return { pieces: [piece], width: piece.width, space: last ? word.space : undefined, forced: last && word.forced }
  })
}

/**
 * Sets words into lines, each as full as it gets. A word wider than a line is broken between letters, so that nothing leaves its column.
 *
 * @param words as the shaper gives them
 * @param width of a line, in points
 * @returns at least one line
 */
export const breakLines = (words: readonly Word[], width: number): readonly Line[] => {
  const lines: Line[] = []
  let pieces: Piece[] = []
  let filled = 0
  let space: Piece | undefined
  const end = () => {
    lines.push({ pieces, width: filled })
    pieces = []
    filled = 0
    space = undefined
  }
  const fitting = words.flatMap((word) => (word.width > width ? letters(word) : [word]))
  for (const word of fitting) {
    const gap = space?.width ?? 0
    if (pieces.length > 0 && filled + gap + word.width > width + 0.01) end()
    if (space && pieces.length > 0) {
      pieces.push(space)
      filled += space.width
    }
    pieces.push(...word.pieces)
    filled += word.width
    space = word.space
    if (word.forced) end()
  }
  if (pieces.length > 0 || lines.length === 0) end()
  return lines
}

/** The widest word, and all words on one line: between these two a column's width makes sense. */
export const extent = (words: readonly Word[]): { readonly least: number; readonly most: number } => {
  let least = 0
  let most = 0
  let line = 0
  for (const word of words) {
    least = Math.max(least, word.width)
    line += word.width
    most = Math.max(most, line)
    line = word.forced ? 0 : line + (word.space?.width ?? 0)
  }
  return { least, most }
}
