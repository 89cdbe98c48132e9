import { strFromU8, unzipSync } from 'fflate'
import type { Knex } from 'knex'
import { verifyAudit } from '#server/commands/verify-audit.ts'
import type { Tx } from '#server/db.ts'
import { objectKey, readKey } from '#server/files/object-key.ts'
import type { ObjectStore } from '#server/files/store.ts'
import { show } from './export.ts'
import { isManifest, type Manifest, migrationsOf, objectPath, tablePath } from './manifest.ts'
import { columnsOf, type Digest, digestOf, rowsOf } from './rows.ts'
import { PORTABLE, type PortableTable } from './tables.ts'

export type Imported =
  | { readonly ok: true; readonly manifest: Manifest }
  | { readonly ok: false; readonly problem: string }

/** Carries a reason out of the transaction that it undoes. */
class NotImported extends Error {}

type Files = Readonly<Record<string, Uint8Array>>

const STRETCH = 200

const linesOf = (files: Files, { name }: PortableTable): string[] =>
  strFromU8(files[tablePath(name)] ?? new Uint8Array())
    .split('\n')
    .slice(0, -1)

const same = (a: Digest | undefined, b: Digest): boolean => a?.rows === b.rows && a.sha256 === b.sha256

/** What is not there, or not as the manifest says: nothing is written then. */
async function damaged(files: Files, manifest: Manifest): Promise<string | undefined> {
  for (const table of PORTABLE) {
    const digest = await digestOf(linesOf(files, table).map((line) => `${line}\n`))
    if (!same(manifest.tables[table.name], digest))
      return `The archive is damaged: the rows of ${table.name} are not those that its manifest names.`
  }
  const missing = manifest.objects.find((one) => files[objectPath(one)] === undefined)
  return missing && `The archive is damaged: ${objectPath(missing)} is missing.`
}

async function insertRows(tx: Tx, table: PortableTable, lines: readonly string[]): Promise<void> {
  const columns = (await columnsOf(tx, table)).map((column) => `"${column}"`).join(', ')
  const stretch = table.whole === true ? Math.max(lines.length, 1) : STRETCH
  for (let from = 0; from < lines.length; from += stretch)
    await tx.raw(
      `insert into "${table.name}" (${columns}) overriding system value
       select ${columns} from jsonb_populate_recordset(null::"${table.name}", ?::jsonb)`,
      [`[${lines.slice(from, from + stretch).join(',')}]`],
    )
}

/** Counters of identity columns go on behind the highest number that came along. */
async function moveCounters(tx: Tx): Promise<void> {
  const { rows } = await tx.raw<{ rows: { table: string; column: string }[] }>(
    `select table_name as table, column_name as column from information_schema.columns
     where table_schema = 'public' and is_identity = 'YES'`,
  )
  for (const { table, column } of rows)
    await tx.raw(
      `select setval(pg_get_serial_sequence(?, ?), coalesce(max("${column}"), 0) + 1, false) from "${table}"`,
      [table, column],
    )
}

async function storeObjects(store: ObjectStore, files: Files, { organisation, objects }: Manifest): Promise<void> {
  for (const one of objects) {
    const parts = readKey(`${organisation}/${one.kind}/${one.sha256}`)
    if (parts === undefined)
      throw new NotImported(`The archive names an object of an unknown kind: ${objectPath(one)}.`)
    const stored = await store.put(objectKey(parts), files[objectPath(one)] ?? new Uint8Array())
    if (!stored.ok)
      throw new NotImported(`The archive is damaged: ${objectPath(one)} does not have the hash of its name.`)
  }
}

/** The rows were judged when they were written: steps and four eyes are not judged again by who people are today. */
async function withoutTriggers(tx: Tx, work: () => Promise<void>): Promise<void> {
  for (const { name } of PORTABLE) await tx.raw('alter table ?? disable trigger user', [name])
  await work()
  for (const { name } of PORTABLE) await tx.raw('alter table ?? enable trigger user', [name])
}

async function confirm(tx: Tx, { organisation, tables }: Manifest): Promise<void> {
  for (const table of PORTABLE)
    if (!same(tables[table.name], await digestOf(rowsOf(tx, organisation, table))))
      throw new NotImported(`The rows of ${table.name} did not arrive as they were sent.`)
  const { broken } = await verifyAudit(tx, organisation)
  if (broken !== null) throw new NotImported(`The audit trail does not hold at event ${broken.sequence}: ${broken.why}`)
}

async function write(tx: Tx, store: ObjectStore, files: Files, manifest: Manifest): Promise<void> {
  const { rows } = await tx.raw<{ rows: { any: boolean }[] }>('select any_organisation() as any')
  if (rows[0]?.any !== false) throw new NotImported('There is an organisation already. Import into an empty instance.')
  if (JSON.stringify(await migrationsOf(tx)) !== JSON.stringify(manifest.migrations))
    throw new NotImported(
      'The archive is of another version of the schema. Import with the version that it was made with.',
    )
  await show(tx, manifest.organisation)
  await withoutTriggers(tx, async () => {
    for (const table of PORTABLE) await insertRows(tx, table, linesOf(files, table))
  })
  await moveCounters(tx)
  await confirm(tx, manifest)
  await storeObjects(store, files, manifest)
}

function opened(archive: Uint8Array): { files: Files; manifest: Manifest } | string {
  try {
    const files = unzipSync(archive)
    const manifest: unknown = JSON.parse(strFromU8(files['manifest.json'] ?? new Uint8Array()))
    return isManifest(manifest)
      ? { files, manifest }
      : 'This is no archive of an organisation: its manifest is not in form.'
  } catch (error) {
    if (!(error instanceof Error)) throw error
    return `This is no archive of an organisation: ${error.message}.`
  }
}

/**
 * Brings an exported organisation into an empty instance: all of it, verified against the archive's manifest, or nothing.
 * People sign in there after a reset of their password. The archive is held in memory.
 */
export async function importOrganisation(
  { owner, store }: { readonly owner: Knex; readonly store: ObjectStore },
  archive: Uint8Array,
): Promise<Imported> {
  const found = opened(archive)
  if (typeof found === 'string') return { ok: false, problem: found }
  const { files, manifest } = found
  const problem = await damaged(files, manifest)
  if (problem !== undefined) return { ok: false, problem }
  try {
    await owner.transaction((tx) => write(tx, store, files, manifest))
    return { ok: true, manifest }
  } catch (error) {
    if (error instanceof NotImported) return { ok: false, problem: error.message }
    throw error
  }
}
