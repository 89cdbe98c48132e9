import type { Range } from '../glossary.ts'

/**
 * Lines and columns of a stretch of text. They are counted when asked for, so that a file without findings never pays.
 *
 * @param text the whole file; lines end with LF or CRLF
 * @param from offset of the first character, in UTF-16 code units
 * @param to offset after the last one, not before `from`
 */
export function rangeOf(text: string, from: number, to: number): Range {
  const [line, column] = lineAndColumn(text, from)
  const [endLine, endColumn] = lineAndColumn(text, to)
  return { line, column, endLine, endColumn, offset: from, endOffset: to }
}

/**
 * The text from an offset to the end of its line.
 *
 * @param text lines end with LF or CRLF
 * @param offset of the first character that is wanted
 */
export function restOfLine(text: string, offset: number): string {
  const end = text.indexOf('\n', offset)
  return text.slice(offset, end === -1 ? text.length : end).replace(/\r$/, '')
}

/** Where the lines of the text last asked about begin: findings come in crowds, all of one file. */
let counted: { readonly text: string; readonly starts: readonly number[] } = { text: '', starts: [0] }

function lineStarts(text: string): readonly number[] {
  if (counted.text === text) return counted.starts
  const starts = [0]
  for (let end = text.indexOf('\n'); end !== -1; end = text.indexOf('\n', end + 1)) starts.push(end + 1)
  counted = { text, starts }
  return starts
}

function lineAndColumn(text: string, offset: number): [line: number, column: number] {
  const starts = lineStarts(text)
  let [low, high] = [0, starts.length]
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((starts[middle] ?? 0) <= offset) low = middle
    else high = middle
  }
  return [low + 1, offset - (starts[low] ?? 0) + 1]
}
