import type { Upload } from '#server/files/upload.ts'
import type { UploadLog, Whose } from '#server/files/upload-log.ts'

/** Rows of uploads in memory, changed in place as the database changes them. */
export function uploadLogInMemory(): UploadLog & { readonly rows: () => readonly Upload[] } {
  let rows: readonly Upload[] = []
  const mine = (whose: Whose, id?: string) => (row: Upload) =>
    row.organisation === whose.organisation && row.uploader === whose.uploader && (id ?? row.id) === row.id

  const change = (whose: Whose, id: string, changed: (row: Upload) => Upload): Promise<Upload | undefined> => {
    const wanted = mine(whose, id)
    rows = rows.map((row) => (wanted(row) ? changed(row) : row))
    return Promise.resolve(rows.find(wanted))
  }

  return {
    rows: () => rows,
    open(upload, now) {
      const same = (row: Upload): boolean => row.sha256 === upload.sha256 && row.size === upload.size
      const there = rows.filter(mine(upload)).find((row) => same(row) && row.expires > now)
      if (!there) rows = [...rows, upload]
      return Promise.resolve(there ?? upload)
    },
    find: (whose, id) => Promise.resolve(rows.find(mine(whose, id))),
    notePart: (whose, id, place, sha256) =>
      change(whose, id, (row) => ({
        ...row,
        parts: row.parts.map((hash, index) => (index === place ? sha256 : hash)),
      })),
    async forgetParts(whose, id) {
      await change(whose, id, (row) => ({ ...row, parts: row.parts.map(() => null) }))
    },
    complete: (whose, id) => change(whose, id, (row) => ({ ...row, state: 'complete' })),
    removeExpired(before) {
      const left = rows.filter(({ expires }) => expires >= before)
      const removed = rows.length - left.length
      rows = left
      return Promise.resolve(removed)
    },
  }
}
