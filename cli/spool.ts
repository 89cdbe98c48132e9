import { closeSync, mkdtempSync, openSync, readSync, rmSync, writeSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/** Characters that are held before they go to the disk: findings of some hundred files. */
const HELD = 4_000_000
/** Bytes that are read back at a time. */
const PORTION = 1 << 20

function portion(file: number, at: number): Uint8Array {
  const bytes = new Uint8Array(PORTION)
  return bytes.subarray(0, readSync(file, bytes, 0, PORTION, at))
}

/**
 * Text that grows at its end and is read back once, from its start: what a format prints below a head that is only
 * known when all is there. More than a little of it waits on the disk and not in memory.
 */
export class Spool {
  #held: string[] = []
  #length = 0
  #disk: { readonly folder: string; readonly file: number } | undefined

  add(text: string): void {
    this.#held.push(text)
    this.#length += text.length
    if (this.#length > HELD) this.#spill()
  }

  /** All of it in pieces. What lay on the disk is gone after that. */
  *pieces(): Generator<string | Uint8Array> {
    const disk = this.#disk
    if (disk) {
      let at = 0
      for (let bytes = portion(disk.file, at); bytes.length > 0; bytes = portion(disk.file, at)) {
        yield bytes
        at += bytes.length
      }
      this.end()
    }
    yield this.#held.join('')
  }

  /** Takes away what lies on the disk. */
  end(): void {
    if (this.#disk === undefined) return
    closeSync(this.#disk.file)
    rmSync(this.#disk.folder, { recursive: true, force: true })
    this.#disk = undefined
  }

  #spill(): void {
    if (this.#disk === undefined) {
      const folder = mkdtempSync(join(tmpdir(), 'skerry-'))
      const file = openSync(join(folder, 'findings'), 'wx+', 0o600)
      // Nobody else needs its name, and without one it goes away with the process, however that ends.
      rmSync(folder, { recursive: true, force: true })
      this.#disk = { folder, file }
    }
    const bytes = Buffer.from(this.#held.join(''))
    for (let written = 0; written < bytes.length; ) written += writeSync(this.#disk.file, bytes, written)
    this.#held = []
    this.#length = 0
  }
}
