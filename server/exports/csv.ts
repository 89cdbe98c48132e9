import { Readable } from 'node:stream'

/** A text, a number that stays one, or an empty cell. */
export type Cell = string | number | null

/** Where a text begins like this, a spreadsheet would compute it instead of showing it; also as the wide forms of the signs. */
const COMPUTED = /^[=+\-@\t\r\n\0\uFF1D\uFF0B\uFF0D\uFF20]/

const QUOTED = /[",\r\n]/

/** Half a character has no form in UTF-8. */
const HALVES = /\p{Cs}/gu

/** A text as a spreadsheet shows it: with a leading apostrophe where it would compute it. */
export function harmless(text: string): string {
  const whole = text.replace(HALVES, '\uFFFD')
  return COMPUTED.test(whole) ? `'${whole}` : whole
}

function printed(cell: Cell): string {
  if (cell === null) return ''
  if (typeof cell === 'string') return harmless(cell)
  if (!Number.isFinite(cell)) throw new Error(`A cell of a table holds ${cell}, which is no number that CSV can hold.`)
  return String(cell)
}

function encoded(cell: Cell): string {
  const text = printed(cell)
  return QUOTED.test(text) ? `"${text.replaceAll('"', '""')}"` : text
}

/** One record of a CSV file (RFC 4180), with its line end. A single empty cell is quoted, or it would be an empty line. */
export function csvRow(cells: readonly Cell[]): string {
  const line = cells.map(encoded).join(',')
  return `${line === '' ? '""' : line}\r\n`
}

/** Rows are joined up to this many characters, so that a table of short rows does not go out in as many packets. */
const BATCH = 16_384

/** Spreadsheets take this as the sign that a file is in UTF-8. */
const BYTE_ORDER_MARK = '\uFEFF'

async function* lines(head: readonly string[], rows: AsyncIterable<readonly Cell[]>): AsyncGenerator<string> {
  let batch = BYTE_ORDER_MARK + csvRow(head)
  for await (const cells of rows) {
    if (cells.length !== head.length)
      throw new Error(`A row of the table has ${cells.length} cells instead of ${head.length}.`)
    batch += csvRow(cells)
    if (batch.length < BATCH) continue
    yield batch
    batch = ''
  }
  yield batch
}

/** A table as CSV in UTF-8, made row by row as the reader asks for it. Rows are asked for no faster than they are read. */
export const csvStream = (head: readonly string[], rows: AsyncIterable<readonly Cell[]>): Readable =>
  Readable.from(lines(head, rows), { objectMode: false, encoding: 'utf8' })
