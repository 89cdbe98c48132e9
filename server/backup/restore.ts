import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import createKnex, { type Knex } from 'knex'
import { objectKey, readKey } from '#server/files/object-key.ts'
import type { ObjectStore } from '#server/files/store.ts'
import { countRows } from './count-rows.ts'
import { DUMP, FILES, MANIFEST, type Manifest, readManifest, sha256Of } from './manifest.ts'
import { runPostgres } from './programs.ts'

export interface RestoreOptions {
  /** The owner of an empty database; its roles must have been made. */
  readonly owner: string
  /** A role that sees every row, for counting them. */
  readonly reader: string
  readonly bin: string
  readonly store: ObjectStore
  readonly folder: string
}

/** A backup that is not what its manifest says, or a place that is not empty. */
export class RestoreRefused extends Error {}

async function withKnex<T>(url: string, work: (db: Knex) => Promise<T>): Promise<T> {
  const db = createKnex({ client: 'pg', connection: url, pool: { min: 0, max: 1 } })
  try {
    return await work(db)
  } finally {
    await db.destroy()
  }
}

async function soundManifest(folder: string): Promise<Manifest> {
  const manifest = readManifest(await readFile(join(folder, MANIFEST), 'utf8'))
  if (manifest === undefined) throw new RestoreRefused(`${MANIFEST} in ${folder} is not the manifest of a backup.`)
  const found = sha256Of(await readFile(join(folder, DUMP)))
  if (found !== manifest.dump_sha256)
    throw new RestoreRefused(`${DUMP} is not the one that the manifest names: it was changed or cut off.`)
  return manifest
}

async function assertEmpty(db: Knex): Promise<void> {
  const tables = await db('pg_tables').where('schemaname', 'public').pluck<string[]>('tablename')
  if (tables.length > 0)
    throw new RestoreRefused(`The database is not empty: it has ${tables.length} tables. Restore into a new one.`)
}

async function putFiles(store: ObjectStore, folder: string, files: readonly string[]): Promise<void> {
  for (const name of files) {
    const parts = readKey(name)
    if (parts === undefined) throw new RestoreRefused(`“${name}” in the manifest is not the name of a stored file.`)
    const stored = await store.put(objectKey(parts), await readFile(join(folder, FILES, name)))
    if (!stored.ok)
      throw new RestoreRefused(`The file ${name} of the backup does not have the content that its name says.`)
  }
}

function differences(wanted: Manifest['rows'], found: Manifest['rows']): string[] {
  const tables = new Set([...Object.keys(wanted), ...Object.keys(found)])
  return [...tables].flatMap((table) =>
    wanted[table] === found[table]
      ? []
      : [`${table}: ${wanted[table] ?? 0} rows in the backup, ${found[table] ?? 0} here`],
  )
}

/** Restores a backup into an empty database and storage, and holds the result against the manifest. */
export async function restore({ owner, reader, bin, store, folder }: RestoreOptions): Promise<Manifest> {
  const manifest = await soundManifest(folder)
  await withKnex(owner, assertEmpty)
  await runPostgres(bin, 'pg_restore', ['--exit-on-error', '--no-owner', '-d', owner, join(folder, DUMP)])
  await putFiles(store, folder, manifest.files)
  const wrong = differences(manifest.rows, await withKnex(reader, countRows))
  if (wrong.length > 0)
    throw new RestoreRefused(`The restored database is not what was backed up:\n${wrong.join('\n')}`)
  return manifest
}
