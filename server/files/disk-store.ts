import { constants } from 'node:fs'
import { type FileHandle, open, readdir, rename, stat, unlink } from 'node:fs/promises'
import { join } from 'node:path'
import { pipeline, type Readable } from 'node:stream'
import { folderInside, makeInside, syncFolder } from './disk-folders.ts'
import { foldersWithin } from './folders-within.ts'
import { takeIn } from './intake.ts'
import { isMissing, unlessMissing } from './missing.ts'
import { KINDS, type ObjectKey, objectKey, partsOf, readKey } from './object-key.ts'
import type { ObjectFacts, ObjectStore, Stored } from './store.ts'
import { verified } from './verified.ts'

export interface DiskStoreOptions {
  /** A folder of its own, on one file system. */
  readonly root: string
  /** Names for temporary files; never twice the same. */
  readonly newId: () => string
  /** Largest object in bytes. */
  readonly limit: number
}

/** Not a name that `objectKey` could make, so no key reaches into it. */
const PARTIAL = '.partial'

const READ = constants.O_RDONLY | constants.O_NOFOLLOW

/** Objects as read-only files of one folder: each written aside, through to the disk, and then renamed into place. */
export function diskStore({ root, newId, limit }: DiskStoreOptions): ObjectStore {
  async function place(key: ObjectKey): Promise<{ folder: string; file: string }> {
    const { organisation, kind, sha256 } = partsOf(key)
    const folder = await folderInside(root, [organisation, kind])
    return { folder, file: join(folder, sha256) }
  }

  async function facts(key: ObjectKey): Promise<ObjectFacts | undefined> {
    const { kind } = partsOf(key)
    const handle = await unlessMissing(place(key).then(({ file }) => open(file, READ)))
    if (!handle) return undefined
    try {
      const { size, mtime } = await handle.stat()
      return { key, size, type: KINDS[kind], written: mtime }
    } finally {
      await handle.close()
    }
  }

  async function writeAside(key: ObjectKey, body: Uint8Array | Readable, file: FileHandle): Promise<Stored> {
    try {
      const stored = await takeIn(key, body, limit, (chunk) => file.writeFile(chunk))
      if (!stored.ok) return stored
      await file.chmod(0o440)
      await file.sync()
      return stored
    } finally {
      await file.close()
    }
  }

  return {
    async put(key, body) {
      const { organisation, kind, sha256 } = partsOf(key)
      const folder = await makeInside(root, [organisation, kind])
      const aside = join(await makeInside(root, [PARTIAL]), newId())
      const handle = await open(aside, 'wx', 0o600)
      try {
        const stored = await writeAside(key, body, handle)
        if (!stored.ok) return stored
        await rename(aside, join(folder, sha256))
        await syncFolder(folder)
        return stored
      } finally {
        await unlessMissing(unlink(aside))
      }
    },

    async get(key) {
      const { kind } = partsOf(key)
      const handle = await unlessMissing(place(key).then(({ file }) => open(file, READ)))
      if (!handle) return undefined
      const { size, mtime } = await handle.stat()
      // The caller hears of errors from the stream that it is given.
      const stream = pipeline(handle.createReadStream(), verified(key), () => undefined)
      return { key, size, type: KINDS[kind], written: mtime, stream }
    },

    head: facts,

    async delete(key) {
      try {
        const { folder, file } = await place(key)
        await unlink(file)
        await syncFolder(folder)
      } catch (error) {
        if (!isMissing(error)) throw error
      }
    },

    async *list(within) {
      for (const folder of foldersWithin(within)) {
        for (const name of await names(join(root, folder))) {
          const parts = readKey(`${folder}/${name}`)
          const found = parts && (await facts(objectKey(parts)))
          if (found) yield found
        }
      }
    },

    async sweep(before) {
      let swept = 0
      for (const name of await names(join(root, PARTIAL))) {
        const file = join(root, PARTIAL, name)
        const found = await unlessMissing(stat(file))
        if (!found || found.mtime >= before) continue
        await unlessMissing(unlink(file))
        swept += 1
      }
      return swept
    },
  }
}

const names = async (folder: string): Promise<string[]> => ((await unlessMissing(readdir(folder))) ?? []).sort()
