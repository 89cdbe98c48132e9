import { once } from 'node:events'
import { PassThrough, pipeline, type Readable } from 'node:stream'
import { ZipArchive } from 'archiver'
import { distinct, zipPath } from './zip-names.ts'

export interface ZipEntry {
  /** Folders and file, as names for people; what no file system takes is replaced. */
  readonly path: readonly string[]
  /** Shown as the file's time: taken from the record, so that the same documents give the same bytes. */
  readonly date: Date
  /** Called when the entry's turn comes, one at a time. */
  readonly open: () => Promise<Readable>
}

interface Placed {
  readonly name: string
  readonly date: Date
  readonly open: () => Promise<Readable>
}

/** Zip holds times from 1980 on. */
const EARLIEST = Date.UTC(1980, 0, 1)

/** Names, order and dates follow from the entries alone. */
function placed(entries: readonly ZipEntry[]): Placed[] {
  const names = distinct(entries.map(({ path }) => zipPath(path)))
  return entries
    .map(({ date, open }, index) => ({
      name: names[index] ?? '',
      date: new Date(Math.max(date.getTime(), EARLIEST)),
      open,
    }))
    .sort((a, b) => (a.name < b.name ? -1 : 1))
}

/** Adds one entry and waits until its last byte is in the archive. */
async function add(archive: ZipArchive, { name, date, open }: Placed, gone: AbortSignal): Promise<void> {
  gone.throwIfAborted()
  const source = await open()
  if (gone.aborted) {
    source.destroy()
    throw gone.reason
  }
  // Whatever ends early, source or archive, ends the other.
  const through = pipeline(source, new PassThrough(), (error) => {
    if (error) archive.destroy(error)
  })
  const stop = (): void => {
    through.destroy()
  }
  gone.addEventListener('abort', stop, { once: true })
  try {
    const added = once(archive, 'entry', { signal: gone })
    archive.append(through, { name, date, mode: 0o644 })
    await added
  } finally {
    gone.removeEventListener('abort', stop)
  }
}

async function fill(archive: ZipArchive, entries: readonly Placed[], gone: AbortSignal): Promise<void> {
  try {
    for (const entry of entries) await add(archive, entry, gone)
    await archive.finalize()
  } catch (error) {
    archive.destroy(error instanceof Error ? error : new Error(String(error)))
  }
}

/**
 * Many documents as one archive, made while it is read: one document open at a time, none read faster than the reader
 * takes it. The documents are stored as they are: PDF and JPEG are packed already, and so the same documents give the
 * same bytes with any packer. A document that fails, or turns out damaged, breaks the archive off instead of leaving a
 * hole in it; a reader that leaves closes what is open.
 */
export function zipStream(entries: readonly ZipEntry[]): Readable {
  const archive = new ZipArchive({ store: true })
  const leave = new AbortController()
  archive.on('error', (error) => archive.destroy(error))
  archive.on('close', () => leave.abort(new Error('The archive was closed.')))
  void fill(archive, placed(entries), leave.signal)
  return archive
}
