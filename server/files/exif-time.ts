const ORIGINAL = 0x9003
const EXIF_FOLDER = 0x8769
const TIME = /^(\d{4}):(\d{2}):(\d{2}) (\d{2}):(\d{2}):(\d{2})/
/** No camera writes more fields in one directory than this. */
const MOST_FIELDS = 512

/** Reads numbers of a TIFF in the order of bytes that it declares; nothing beyond its end. */
function reader(
  bytes: Buffer,
): { short(at: number): number | undefined; long(at: number): number | undefined } | undefined {
  const order = bytes.toString('latin1', 0, 4)
  if (order !== 'II*\0' && order !== 'MM\0*') return undefined
  const little = order.startsWith('I')
  const fits = (at: number, size: number): boolean => at + size <= bytes.length
  return {
    short: (at) => (fits(at, 2) ? (little ? bytes.readUInt16LE(at) : bytes.readUInt16BE(at)) : undefined),
    long: (at) => (fits(at, 4) ? (little ? bytes.readUInt32LE(at) : bytes.readUInt32BE(at)) : undefined),
  }
}

/**
 * The time at which a camera says that a photo was taken (EXIF DateTimeOriginal), as `2026-05-04T10:15:00`: local time
 * without a zone, and anybody can change it. Nothing where there is none or it is no time.
 *
 * @param exif the block as it lies in the file, with or without its heading
 */
export function takenAt(exif: Uint8Array): string | null {
  const block = Buffer.from(exif.buffer, exif.byteOffset, exif.byteLength)
  const tiff = block.toString('latin1', 0, 6) === 'Exif\0\0' ? block.subarray(6) : block
  const read = reader(tiff)
  if (!read) return null

  function field(folder: number | undefined, tag: number): number | undefined {
    const count = folder === undefined ? undefined : read?.short(folder)
    if (folder === undefined || count === undefined) return undefined
    for (let index = 0; index < Math.min(count, MOST_FIELDS); index += 1) {
      const at = folder + 2 + index * 12
      if (read?.short(at) === tag) return read.long(at + 8)
    }
    return undefined
  }

  const text = field(field(read.long(4), EXIF_FOLDER), ORIGINAL)
  const match = text === undefined ? null : TIME.exec(tiff.toString('latin1', text, text + 19))
  if (!match) return null
  const [, year, month, day, hour, minute, second] = match
  const taken = `${year}-${month}-${day}T${hour}:${minute}:${second}`
  const real = new Date(`${taken}Z`)
  return Number.isNaN(real.getTime()) || !real.toISOString().startsWith(taken) ? null : taken
}
