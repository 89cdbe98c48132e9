import { constants } from 'node:fs'
import { mkdir, open, realpath } from 'node:fs/promises'
import { dirname, join } from 'node:path'

/** Writes a folder's list of names through to the disk: a rename is safe only after this. */
export async function syncFolder(path: string): Promise<void> {
  const folder = await open(path, constants.O_RDONLY | constants.O_DIRECTORY)
  try {
    await folder.sync()
  } finally {
    await folder.close()
  }
}

/** Makes a folder and its parents, each new one written through in its parent. */
async function makeFolder(path: string): Promise<void> {
  const first = await mkdir(path, { recursive: true, mode: 0o700 })
  if (first === undefined) return
  for (let made = path; made.length >= first.length; made = dirname(made)) await syncFolder(dirname(made))
}

/** A folder below the root; throws where a link on the way leads anywhere else. */
export async function folderInside(root: string, parts: readonly string[]): Promise<string> {
  const folder = join(await realpath(root), ...parts)
  if ((await realpath(folder)) !== folder) throw new Error('A folder of the object store is a link to another place.')
  return folder
}

/** The same, made where it is missing, and nothing made beyond a link. */
export async function makeInside(root: string, parts: readonly string[]): Promise<string> {
  await makeFolder(root)
  let folder = await realpath(root)
  for (const [index, part] of parts.entries()) {
    await makeFolder(join(folder, part))
    folder = await folderInside(root, parts.slice(0, index + 1))
  }
  return folder
}
