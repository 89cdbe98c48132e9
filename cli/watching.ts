import { type Dirent, type FSWatcher, readdirSync, watch } from 'node:fs'
import { join, relative, resolve } from 'node:path'

/** A folder that is watched, and what in it is of interest. */
export interface Watched {
  readonly folder: string
  /** With the folders in it, those too that are made later. */
  readonly deep: boolean
  /** Whether a path, from the root, is of interest. */
  readonly wanted: (path: string) => boolean
}

/** Editors write a file in several steps: it is looked at when all was quiet for so many ms. */
const QUIET = 120
const SKIPPED: ReadonlySet<string> = new Set(['node_modules', '.git'])

/** What is in a folder; nothing where it is gone already, or may not be looked into. */
function entriesOf(folder: string): readonly Dirent[] {
  try {
    return readdirSync(folder, { withFileTypes: true })
  } catch {
    return []
  }
}

/** One folder that was asked for, and those below it. */
class Root {
  readonly #watchers = new Map<string, FSWatcher>()
  readonly #root: Watched
  readonly #tell: (path: string) => void

  constructor(root: Watched, tell: (path: string) => void) {
    this.#root = root
    this.#tell = tell
  }

  /** Watches a folder; of one that is new, what is in it counts as changed. */
  look(folder: string, isNew: boolean): void {
    if (this.#watchers.has(folder) || !this.#start(folder)) return
    for (const entry of entriesOf(folder)) {
      const path = join(folder, entry.name)
      if (entry.isDirectory()) this.#lookBelow(path, entry.name, isNew)
      else if (isNew && this.#root.wanted(path)) this.#tell(path)
    }
  }

  #lookBelow(path: string, name: string, isNew: boolean): void {
    if (this.#root.deep && !SKIPPED.has(name)) this.look(path, isNew)
  }

  #start(folder: string): boolean {
    try {
      const watcher = watch(folder, (_, name) => this.#notice(folder, name))
      watcher.on('error', () => this.#forget(folder))
      this.#watchers.set(folder, watcher)
      return true
    } catch {
      // It is gone again, or the system watches no more folders: what is watched already still is.
      return false
    }
  }

  #notice(folder: string, name: string | null): void {
    if (name === null) return this.#tell(folder)
    const path = join(folder, name)
    const entry = entriesOf(folder).find((candidate) => candidate.name === name)
    if (entry?.isDirectory()) return this.#lookBelow(path, name, true)
    if (entry === undefined && this.#watchers.has(path)) {
      // A folder went away, and the files in it.
      this.#forget(path)
      this.#tell(path)
    } else if (this.#root.wanted(path)) this.#tell(path)
  }

  #forget(folder: string): void {
    this.#watchers.get(folder)?.close()
    this.#watchers.delete(folder)
  }
}

/**
 * From now on, calls back with a path after it changed and all was quiet for a moment. Folders are watched, for many editors put a
 * new file in the place of the old one; a folder that is new is watched too, and what is in it already counts as changed.
 *
 * @param changed is given the path from where the command runs
 */
export function watchFolders(roots: readonly Watched[], changed: (path: string) => void): void {
  let timer: NodeJS.Timeout | undefined
  const tell = (path: string): void => {
    clearTimeout(timer)
    timer = setTimeout(() => changed(relative('', path)), QUIET)
  }
  for (const root of roots) new Root(root, tell).look(resolve(root.folder), false)
}
