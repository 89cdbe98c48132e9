import { inOrganisation, type Tx } from '#server/db.ts'
import type { Answer } from '#server/http/route.ts'
import type { Services } from '#server/services.ts'
import { type Cell, csvStream } from './csv.ts'

/** Rows are read this many at a time, each time in a transaction of its own: a slow reader holds none open. */
const STRETCH = 500

/** Reads stretches until one is not full. `after` is the last row of the stretch before. */
export async function* everyRow<Row>(
  { db }: Pick<Services, 'db'>,
  organisation: string,
  read: (tx: Tx, after: Row | undefined, limit: number) => Promise<readonly Row[]>,
): AsyncGenerator<Row> {
  let after: Row | undefined
  for (;;) {
    const last = after
    const rows = await inOrganisation(db, organisation, (tx) => read(tx, last, STRETCH))
    yield* rows
    after = rows.at(-1)
    if (rows.length < STRETCH || after === undefined) return
  }
}

async function* cellsOf<Row>(rows: AsyncIterable<Row>, cells: (row: Row) => readonly Cell[]) {
  for await (const row of rows) yield cells(row)
}

/** A column of a table: its head, and what stands in a row. */
export type Columns<Row> = Readonly<Record<string, (row: Row) => Cell>>

/** A whole table as a download, made while it is read. */
export function csvAnswer<Row>(name: string, columns: Columns<Row>, rows: AsyncIterable<Row>): Answer {
  const fields = Object.values(columns)
  return {
    bytes: csvStream(
      Object.keys(columns),
      cellsOf(rows, (row) => fields.map((field) => field(row))),
    ),
    type: 'text/csv; charset=utf-8',
    headers: { 'content-disposition': `attachment; filename="${name}.csv"` },
  }
}
