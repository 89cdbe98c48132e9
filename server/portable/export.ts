import { Readable } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import type { Knex } from 'knex'
import type { Tx } from '#server/db.ts'
import { type ZipEntry, zipStream } from '#server/exports/zip.ts'
import { type KeyParts, objectKey, PASSING_KINDS, partsOf } from '#server/files/object-key.ts'
import type { ObjectStore } from '#server/files/store.ts'
import { FORMAT, type Manifest, migrationsOf, objectPath, tablePath } from './manifest.ts'
import { type Digest, digestOf, rowsOf } from './rows.ts'
import { PORTABLE } from './tables.ts'

/** Row-level security shows one organisation's rows, to the owner too. */
export const show = (tx: Tx, organisation: string) =>
  tx.raw("select set_config('app.organisation', ?, true)", [organisation])

async function organisationOf(tx: Tx, mark: string): Promise<string | undefined> {
  const { rows } = await tx.raw<{ rows: { id: string }[] }>('select organisation_ids() as id')
  for (const { id } of rows) {
    await show(tx, id)
    const found = await tx('organisations').where({ organisation_id: id, mark }).first('mark')
    if (found !== undefined) return id
  }
  return undefined
}

interface Held extends KeyParts {
  readonly size: number
}

async function objectsOf(store: ObjectStore, organisation: string): Promise<Held[]> {
  const passing: readonly string[] = PASSING_KINDS
  const held: Held[] = []
  for await (const { key, size } of store.list({ organisation })) {
    const parts = partsOf(key)
    if (!passing.includes(parts.kind)) held.push({ ...parts, size })
  }
  return held
}

async function opened(store: ObjectStore, parts: KeyParts): Promise<Readable> {
  const object = await store.get(objectKey(parts))
  if (object === undefined) throw new Error(`The object ${parts.kind}/${parts.sha256} went away while it was exported.`)
  return object.stream
}

export interface ExportWish {
  /** A connection of the role that owns the database. */
  readonly owner: Knex
  readonly store: ObjectStore
  readonly mark: string
  readonly now: Date
}

/**
 * Writes everything of an organisation as one archive: each table as lines of canonical JSON, each stored object under
 * its hash, and first a manifest with counts and hashes. All of it is as it was at one moment.
 *
 * @returns the manifest; undefined where there is no such organisation
 */
export async function exportOrganisation(
  { owner, store, mark, now }: ExportWish,
  out: NodeJS.WritableStream,
): Promise<Manifest | undefined> {
  return await owner.transaction(
    async (tx) => {
      const organisation = await organisationOf(tx, mark)
      if (organisation === undefined) return undefined
      const tables: Record<string, Digest> = {}
      for (const table of PORTABLE) tables[table.name] = await digestOf(rowsOf(tx, organisation, table))
      const held = await objectsOf(store, organisation)
      const manifest: Manifest = {
        format: FORMAT,
        organisation,
        mark,
        exported_at: now.toISOString(),
        migrations: await migrationsOf(tx),
        tables,
        objects: held.map(({ kind, sha256, size }) => ({ kind, sha256, size })),
      }
      const entry = (path: string, open: ZipEntry['open']): ZipEntry => ({ path: path.split('/'), date: now, open })
      const entries = [
        entry('manifest.json', async () => Readable.from([Buffer.from(`${JSON.stringify(manifest, null, 2)}\n`)])),
        ...held.map((parts) => entry(objectPath(parts), () => opened(store, parts))),
        ...PORTABLE.map((table) =>
          entry(tablePath(table.name), async () =>
            Readable.from(rowsOf(tx, organisation, table), { objectMode: false, encoding: 'utf8' }),
          ),
        ),
      ]
      await pipeline(zipStream(entries), out)
      return manifest
    },
    { isolationLevel: 'repeatable read', readOnly: true },
  )
}
