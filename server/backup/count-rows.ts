import type { Knex } from 'knex'

/** Rows of every table of the record, by name: what a restored database is held against. */
export async function countRows(db: Knex): Promise<Readonly<Record<string, number>>> {
  const tables = await db('pg_tables').where('schemaname', 'public').orderBy('tablename').pluck<string[]>('tablename')
  const counts: [string, number][] = []
  for (const table of tables) {
    const [row] = await db(table).count<{ count: number }[]>('* as count')
    counts.push([table, row?.count ?? 0])
  }
  return Object.fromEntries(counts)
}
