/** A table as read from CSV: rows with the line on which each begins. */
export interface Row {
  readonly line: number
  readonly cells: readonly string[]
}

/** A cell in quotes (doubled inside them), or one without, and what ends it. */
const CELL = /(?:[ \t]*"((?:[^"]|"")*)"[ \t]*|([^,\n\r]*))(,|\r?\n|$)/y
const CELL_BY_SEMICOLON = /(?:[ \t]*"((?:[^"]|"")*)"[ \t]*|([^;\n\r]*))(;|\r?\n|$)/y

const linesIn = (text: string): number => text.split('\n').length - 1

/** The pattern of a cell: semicolons separate where the head line has more of them than commas, as spreadsheets write it where the comma is the decimal sign. */
function cellPattern(head: string): RegExp {
  const pattern = head.split(';').length > head.split(',').length ? CELL_BY_SEMICOLON : CELL
  return new RegExp(pattern.source, pattern.flags)
}

/** Reads CSV (RFC 4180): quotes around cells, doubled inside them, line ends within. Empty rows are left out. */
export function parseCsv(text: string): Row[] {
  const body = text.replace(/^\uFEFF/, '')
  const pattern = cellPattern(body.split('\n', 1)[0] ?? '')
  const rows: Row[] = []
  let cells: string[] = []
  let [line, began] = [1, 1]
  while (pattern.lastIndex < body.length) {
    const match = pattern.exec(body)
    if (!match) break
    const [all, quoted, bare = '', end = ''] = match
    cells.push((quoted === undefined ? bare : quoted.replaceAll('""', '"')).trim())
    line += linesIn(all)
    if (end === ',' || end === ';') continue
    if (cells.some((cell) => cell !== '')) rows.push({ line: began, cells })
    cells = []
    began = line
  }
  return rows
}
