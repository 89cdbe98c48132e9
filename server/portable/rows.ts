import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'
import type { Tx } from '#server/db.ts'
import type { PortableTable } from './tables.ts'

const STRETCH = 500

/** Columns that can be written, in the order of the table. */
export async function columnsOf(tx: Tx, { name, withheld = [] }: PortableTable): Promise<string[]> {
  const { rows } = await tx.raw<{ rows: { column_name: string }[] }>(
    `select column_name from information_schema.columns
     where table_schema = 'public' and table_name = ? and is_generated = 'NEVER' order by ordinal_position`,
    [name],
  )
  return rows.map(({ column_name }) => column_name).filter((column) => !withheld.includes(column))
}

async function keyOf(tx: Tx, { name }: PortableTable): Promise<string[]> {
  const { rows } = await tx.raw<{ rows: { column: string }[] }>(
    `select a.attname as column from pg_index i
     join pg_attribute a on a.attrelid = i.indrelid and a.attnum = any(i.indkey)
     where i.indrelid = ?::regclass and i.indisprimary order by array_position(i.indkey::int[], a.attnum::int)`,
    [name],
  )
  return rows.map(({ column }) => column)
}

/** Each row of an organisation as one line of canonical JSON (RFC 8785), in the order of the primary key. */
export async function* rowsOf(tx: Tx, organisation: string, table: PortableTable): AsyncGenerator<string> {
  const columns = (await columnsOf(tx, table)).map((column) => `'${column}', t."${column}"`).join(', ')
  const order = (await keyOf(tx, table)).map((column) => `t."${column}"`).join(', ')
  await tx.raw(
    `declare portable no scroll cursor for select to_jsonb(r)::text as line from "${table.name}" t,
     lateral (select jsonb_build_object(${columns})) as r where t.organisation_id = ? order by ${order}`,
    [organisation],
  )
  try {
    for (;;) {
      const { rows } = await tx.raw<{ rows: { line: string }[] }>(`fetch ${STRETCH} from portable`)
      for (const { line } of rows) {
        const parsed: { jsonb_build_object: unknown } = JSON.parse(line)
        yield `${canonicalize(parsed.jsonb_build_object)}\n`
      }
      if (rows.length < STRETCH) return
    }
  } finally {
    await tx.raw('close portable')
  }
}

export interface Digest {
  readonly rows: number
  readonly sha256: string
}

/** How many lines there are, and the hash over all of them. */
export async function digestOf(lines: AsyncIterable<string> | Iterable<string>): Promise<Digest> {
  const hash = createHash('sha256')
  let rows = 0
  for await (const line of lines) {
    hash.update(line)
    rows += 1
  }
  return { rows, sha256: hash.digest('hex') }
}
