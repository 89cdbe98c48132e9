import type { Faces, GlyphRun } from './faces.ts'
import { PaperError, type Place } from './problems.ts'
import { BADGE, type FaceName, MARK, type Shape, TEXT_CLASS, type TextStyle } from './style.ts'
import type { Marks, Run, Source } from './tree.ts'

/** A stretch of text in one font, size and colour, or the shape in front of a verdict. Widths in points. */
export interface Piece {
  readonly face: FaceName
  readonly size: number
  readonly rise: number
  readonly colour: string
  /** Added after each glyph, in points. */
  readonly spacing: number
  readonly run: GlyphRun
  readonly width: number
  readonly shape?: Shape
}

/** What may not be broken, the space behind it, and whether a new line must follow. */
export interface Word {
  readonly pieces: readonly Piece[]
  readonly width: number
  readonly space: Piece | undefined
  readonly forced: boolean
}

type Look = Pick<Piece, 'face' | 'size' | 'rise' | 'colour' | 'spacing'>

const NO_GLYPHS: GlyphRun = { glyphs: [], width: 0 }
const BREAK_HERE = 0x200b
const PLAIN_SPACES = new Set([0x00a0, 0x202f, 0x2009])

const lookOf = (marks: Marks, base: TextStyle): Look => {
  let style = base
  for (const name of marks.classes) {
    const badge = BADGE[name]
    style = { ...style, ...TEXT_CLASS[name], ...(badge ? { face: 'medium', colour: badge.colour } : {}) }
  }
  const face = marks.strong ? 'semibold' : marks.em ? 'italic' : style.face
  const full = marks.small ? style.size * MARK.small : style.size
  const size = marks.raise ? full * MARK.size : full
  const rise = marks.raise ? full * MARK.raise[marks.raise] : 0
  return { face, size, rise, colour: style.colour, spacing: style.spacing * size }
}

const missing = (sign: string, codePoint: number, source: Source | undefined, html: string): PaperError => {
  const code = `U+${codePoint.toString(16).toUpperCase().padStart(4, '0')}`
  const sentence = `No font of the page has the character “${sign}” (${code}). Write it another way.`
  return new PaperError('unknown-character', sentence, source && placeIn(html, sign, source))
}

/** Where a character stands; the start of its text when it was written as an entity. */
const placeIn = (html: string, sign: string, { place, from, to }: Source): Place => {
  const at = html.indexOf(sign, from)
  if (at < 0 || at >= to) return place
  const lines = html.slice(from, at).split('\n').length - 1
  if (lines === 0) return { line: place.line, column: place.column + at - from }
  return { line: place.line + lines, column: at - html.lastIndexOf('\n', at) }
}

/** Turns runs of text into words that know their widths. */
export class Shaper {
  readonly #faces: Faces
  readonly #html: string

  constructor(faces: Faces, html: string) {
    this.#faces = faces
    this.#html = html
  }

  /** The words of a block, in order. */
  words(runs: readonly Run[], base: TextStyle): readonly Word[] {
    const words: Word[] = []
    let open: Piece[] = []
    const close = (space: Piece | undefined, forced: boolean) => {
      if (open.length === 0 && !space && !forced) return
      words.push({ pieces: open, width: open.reduce((sum, { width }) => sum + width, 0), space, forced })
      open = []
    }
    for (const run of runs) {
      if (run.kind === 'break') {
        close(undefined, true)
        continue
      }
      const look = lookOf(run.marks, base)
      if (run.kind === 'shape') {
        open.push({ ...look, colour: run.colour, run: NO_GLYPHS, width: look.size * 1.16, shape: run.shape })
        continue
      }
      for (const token of tokens(run.text)) {
        if (token === ' ') close(this.#piece(' ', look, look.face), false)
        else if (token === '') close(undefined, false)
        else open.push(...this.pieces(token, look, run.source))
      }
    }
    close(undefined, false)
    return words
  }

  /** Text of one look as pieces: one, unless characters have to come from the fallback font. */
  pieces(text: string, look: Look, source?: Source): readonly Piece[] {
    const found: Piece[] = []
    let part = ''
    let face: FaceName = look.face
    for (const sign of text) {
      const needed = this.#faceFor(sign, look.face, source)
      if (needed !== face && part !== '') {
        found.push(this.#piece(part, look, face))
        part = ''
      }
      face = needed
      part += sign
    }
    return [...found, this.#piece(part, look, face)]
  }

  #faceFor(sign: string, face: FaceName, source: Source | undefined): FaceName {
    const codePoint = Number(sign.codePointAt(0))
    if (codePoint < 0x7f || this.#faces[face].has(codePoint)) return face
    if (this.#faces.fallback.has(codePoint)) return 'fallback'
    throw missing(sign, codePoint, source, this.#html)
  }

  #piece(text: string, look: Look, face: FaceName): Piece {
    const run = this.#faces[face].run(text)
    const width = (run.width * look.size) / 1000 + run.glyphs.length * look.spacing
    const { size, rise, colour, spacing } = look
    return { face, size, rise, colour, spacing, run, width }
  }
}

const isLetter = (sign: string | undefined): boolean => sign !== undefined && /\p{L}/u.test(sign)

/** Whether a line may end behind this character though no space follows. */
const endsPart = (sign: string, before: string | undefined, next: string | undefined): boolean => {
  if (sign === '—') return next !== undefined
  return (sign === '-' || sign === '/' || sign === '–') && isLetter(before) && isLetter(next)
}

/** Words, `' '` for each space, `''` where a line may break without one. Spaces that hold words together become plain ones inside a word. */
const tokens = (text: string): readonly string[] => {
  const found: string[] = []
  const signs = Array.from(text.normalize('NFC'))
  let part = ''
  const close = (token: string) => {
    if (part !== '') found.push(part)
    found.push(token)
    part = ''
  }
  signs.forEach((sign, index) => {
    const codePoint = Number(sign.codePointAt(0))
    if (sign === ' ') close(' ')
    else if (codePoint === BREAK_HERE) close('')
    else part += PLAIN_SPACES.has(codePoint) ? ' ' : sign
    if (endsPart(sign, signs[index - 1], signs[index + 1])) close('')
  })
  if (part !== '') found.push(part)
  return found
}
