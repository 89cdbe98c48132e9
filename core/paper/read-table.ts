import { attribute, classesOf, content, type Element, elements, placeOf, problem } from './markup.ts'
import { PaperError, type Place } from './problems.ts'
import { readRuns } from './read-inline.ts'
import { common, type Reading } from './reading.ts'
import type { Cell, Column, Row, Table } from './tree.ts'

const SCOPES = ['col', 'row', 'colgroup', 'rowgroup']

const readShare = (element: Element): number | undefined => {
  const value = attribute(element, 'width') ?? attribute(element, 'style')?.replace(/^\s*width\s*:\s*|\s*;?\s*$/g, '')
  if (value === undefined || value === 'auto') return undefined
  const share = /^(\d+(?:\.\d+)?)%$/.exec(value)?.[1]
  if (share) return Number(share)
  throw problem('table-shape', element, `The column's width is “${value}”. Write a percentage such as 18%, or auto.`)
}

const readCount = (element: Element, name: string): number => {
  const value = attribute(element, name)
  if (value === undefined) return 1
  if (/^[1-9]\d?$/.test(value)) return Number(value)
  throw problem('table-shape', element, `${name} is “${value}”. Write a whole number from 1 to 99.`)
}

const readColumns = (table: Element): readonly Column[] =>
  elements(table)
    .filter(({ tagName }) => tagName === 'colgroup')
    .flatMap(elements)
    .flatMap((col) =>
      Array.from({ length: readCount(col, 'span') }, () => ({ share: readShare(col), classes: classesOf(col) })),
    )

const readCell = (element: Element, reading: Reading): Cell => {
  const header = element.tagName === 'th'
  const scope = attribute(element, 'scope')
  if (header && !SCOPES.includes(scope ?? '')) {
    throw problem(
      'header-without-scope',
      element,
      `This <th> has no scope. Write scope="col" or scope="row" (or colgroup, rowgroup).`,
    )
  }
  return { ...common(element), header, scope, span: readCount(element, 'colspan'), blocks: reading.mixed(element) }
}

const readRow = (element: Element, reading: Reading): Row => ({
  ...common(element),
  cells: elements(element).map((cell) => readCell(cell, reading)),
})

const rowsOf = (part: Element, reading: Reading): readonly Row[] => elements(part).map((row) => readRow(row, reading))

const checkShape = (rows: readonly Row[], declared: number, place: Place): number => {
  const first = rows[0]
  if (!first)
    throw new PaperError(
      'table-shape',
      'The table has no row. Leave it out, or say in words that there is nothing.',
      place,
    )
  const width = declared || first.cells.reduce((sum, cell) => sum + cell.span, 0)
  for (const row of rows) {
    const found = row.cells.reduce((sum, cell) => sum + cell.span, 0)
    if (found !== width)
      throw new PaperError('table-shape', `This row has ${found} columns, the table ${width}.`, row.place)
  }
  return width
}

const checkShares = (columns: readonly Column[], place: Place): void => {
  const sum = columns.reduce((total, { share }) => total + (share ?? 0), 0)
  if (sum > 100.5)
    throw new PaperError('table-shape', `The column widths add up to ${sum}%. They may not exceed 100%.`, place)
}

/**
 * A table: caption, columns, header rows, and one or more groups of rows.
 *
 * @throws PaperError table-shape (uneven rows, bad widths), header-without-scope
 */
export const readTable = (element: Element, reading: Reading): Table => {
  const parts = elements(element)
  const named = (tag: string) => parts.filter(({ tagName }) => tagName === tag)
  const head = named('thead').flatMap((part) => rowsOf(part, reading))
  const bodies = named('tbody').map((part) => rowsOf(part, reading))
  const declared = readColumns(element)
  const width = checkShape([...head, ...bodies.flat()], declared.length, placeOf(element))
  const columns =
    declared.length > 0 ? declared : Array.from({ length: width }, () => ({ share: undefined, classes: [] }))
  checkShares(columns, placeOf(element))
  const caption = named('caption').flatMap((part) => readRuns(content(part)))
  return { ...common(element), kind: 'table', caption, columns, head, bodies }
}
