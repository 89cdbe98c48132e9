import type { Segment } from './svg-path.ts'

/** A number as PDF content holds it: thousandths are finer than any printer. */
export const num = (value: number): string => String(Math.round(value * 1000) / 1000)

/** The six numbers of a matrix, fine enough that a whole page of user units stays in place. */
export const matrix = (values: readonly number[]): string =>
  `${values.map((value) => String(Math.round(value * 1e6) / 1e6)).join(' ')} cm`

const CHANNELS = [1, 3, 5] as const

/** Red, green and blue, 0 to 1, of `#rrggbb`. */
export const channels = (colour: string): readonly number[] =>
  CHANNELS.map((at) => Number.parseInt(colour.slice(at, at + 2), 16) / 255)

/** A colour as the operands of `rg` and `RG`. */
export const rgb = (colour: string): string => channels(colour).map(num).join(' ')

/** A colour as it looks on white paper when it lets part of the paper through. */
export const onPaper = (colour: string, opacity: number): string => {
  const parts = channels(colour).map((value) => Math.round((1 - opacity * (1 - value)) * 255))
  return `#${parts.map((value) => value.toString(16).padStart(2, '0')).join('')}`
}

const LETTER = { M: 'm', L: 'l', C: 'c' } as const

/** Segments as PDF path operators. */
export const pathOperators = (segments: readonly Segment[]): string =>
  segments
    .map((segment) => {
      if (segment[0] === 'Z') return 'h'
      const [letter, ...numbers] = segment
      return `${numbers.map(num).join(' ')} ${LETTER[letter]}`
    })
    .join('\n')
