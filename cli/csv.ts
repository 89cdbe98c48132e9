/** A table as read from CSV: rows with the line on which each begins. */
export interface Row {
  readonly line: number
  readonly cells: readonly string[]
}

/**
 * Reads CSV (RFC 4180): quotes around cells, doubled inside them, line ends within; a semicolon separates where the head
 * line has more of them than commas, as spreadsheets write it where the comma is the decimal sign.
 */
export function parseCsv(text: string): Row[] {
  const body = text.replace(/^\uFEFF/, '')
  const head = body.split('\n', 1)[0] ?? ''
  const separator = head.split(';').length > head.split(',').length ? ';' : ','
  const rows: Row[] = []
  let [cells, cell, quoted, line, began] = [[] as string[], '', false, 1, 1]
  const endRow = (): void => {
    cells.push(cell)
    if (cells.some((value) => value.trim() !== ''))
      rows.push({ line: began, cells: cells.map((value) => value.trim()) })
    cells = []
    cell = ''
    began = line
  }
  for (let at = 0; at < body.length; at += 1) {
    const mark = body.charAt(at)
    if (mark === '\n') line += 1
    if (quoted) {
      if (mark !== '"') cell += mark
      else if (body.charAt(at + 1) === '"') {
        cell += '"'
        at += 1
      } else quoted = false
    } else if (mark === '"' && cell.trim() === '') {
      cell = ''
      quoted = true
    } else if (mark === separator) {
      cells.push(cell)
      cell = ''
    } else if (mark === '\n') endRow()
    else if (mark !== '\r') cell += mark
  }
  if (cell !== '' || cells.length > 0) endRow()
  return rows
}
