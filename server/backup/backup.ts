import { mkdir, readFile, rm, writeFile } from 'node:fs/promises'
import { dirname, join } from 'node:path'
import { buffer } from 'node:stream/consumers'
import createKnex, { type Knex } from 'knex'
import { PASSING_KINDS } from '#server/files/object-key.ts'
import type { ObjectStore } from '#server/files/store.ts'
import { VERSION } from '#server/version.ts'
import { countRows } from './count-rows.ts'
import { DUMP, FILES, MANIFEST, type Manifest, sha256Of } from './manifest.ts'
import { runPostgres } from './programs.ts'

export interface BackupOptions {
  /** A role that row-level security does not bind; any other would dump a database without rows, and say nothing. */
  readonly url: string
  readonly bin: string
  readonly store: ObjectStore
  /** A folder that does not exist yet. */
  readonly folder: string
  readonly now: Date
}

/** A backup that would be worth nothing. */
export class UselessBackup extends Error {}

async function assertSeesEverything(db: Knex): Promise<void> {
  const { rows } = await db.raw<{ rows: { sees: boolean }[] }>(
    'select rolbypassrls or rolsuper as sees from pg_roles where rolname = current_user',
  )
  if (rows[0]?.sees !== true)
    throw new UselessBackup(
      'This role is bound by row-level security: its dump would have no rows. Use a role with BYPASSRLS, such as skerry_backup.',
    )
}

/** Objects of all organisations but those that pass: parts of uploads that are under way. */
async function copyFiles(db: Knex, store: ObjectStore, folder: string): Promise<string[]> {
  const organisations = await db('organisations').orderBy('organisation_id').pluck<string[]>('organisation_id')
  const passing: readonly string[] = PASSING_KINDS
  const copied: string[] = []
  for (const organisation of organisations)
    for await (const { key } of store.list({ organisation })) {
      if (passing.includes(key.split('/')[1] ?? '')) continue
      const object = await store.get(key)
      if (object === undefined) continue
      const file = join(folder, FILES, key)
      await mkdir(dirname(file), { recursive: true })
      await writeFile(file, await buffer(object.stream))
      copied.push(key)
    }
  return copied
}

/**
 * Writes a backup: the database as one moment saw it, the stored files, and a manifest that says how many rows and which
 * files there are. The files are copied after the dump, so that every row of the dump finds its file.
 */
export async function backUp({ url, bin, store, folder, now }: BackupOptions): Promise<Manifest> {
  const db = createKnex({ client: 'pg', connection: url, pool: { min: 0, max: 1 } })
  await mkdir(folder, { recursive: false, mode: 0o700 })
  try {
    await assertSeesEverything(db)
    const dump = join(folder, DUMP)
    const rows = await db.transaction(
      async (tx) => {
        const { rows: exported } = await tx.raw<{ rows: { snapshot: string }[] }>(
          'select pg_export_snapshot() as snapshot',
        )
        await runPostgres(bin, 'pg_dump', ['-Fc', `--snapshot=${exported[0]?.snapshot}`, '-f', dump, url])
        return await countRows(tx)
      },
      { isolationLevel: 'repeatable read', readOnly: true },
    )
    const files = await copyFiles(db, store, folder)
    const manifest = {
      skerry: VERSION,
      made_at: now.toISOString(),
      rows,
      dump_sha256: sha256Of(await readFile(dump)),
      files,
    }
    await writeFile(join(folder, MANIFEST), `${JSON.stringify(manifest, null, 2)}\n`)
    return manifest
  } catch (error) {
    await rm(folder, { recursive: true, force: true })
    throw error
  } finally {
    await db.destroy()
  }
}
