import { buffer } from 'node:stream/consumers'
import { crc32, createDeflate } from 'node:zlib'

export const SIGNATURE = Buffer.from('\x89PNG\r\n\x1a\n', 'latin1')

/** One chunk of a PNG. */
export function pngChunk(name: string, data: Uint8Array): Buffer {
  const body = Buffer.concat([Buffer.from(name, 'latin1'), data])
  const framed = Buffer.alloc(body.length + 8)
  framed.writeUInt32BE(data.length, 0)
  body.copy(framed, 4)
  framed.writeUInt32BE(crc32(body), body.length + 4)
  return framed
}

export interface EmptyPng {
  readonly width: number
  readonly height: number
  readonly bits: 1 | 8 | 16
  /** PNG's colour type: 0 grey, 2 RGB, 6 RGB with transparency. */
  readonly colour: 0 | 2 | 6
}

const SAMPLES = { 0: 1, 2: 3, 6: 4 } as const

export function pngHead({ width, height, bits, colour }: EmptyPng): Buffer {
  const head = Buffer.alloc(13)
  head.writeUInt32BE(width, 0)
  head.writeUInt32BE(height, 4)
  head[8] = bits
  head[9] = colour
  return pngChunk('IHDR', head)
}

/** A black PNG of any size, small on disk however many pixels it unfolds to. */
export async function emptyPng(picture: EmptyPng): Promise<Buffer> {
  const row = Buffer.alloc(1 + Math.ceil((picture.width * picture.bits * SAMPLES[picture.colour]) / 8))
  const deflate = createDeflate({ level: 9 })
  const packed = buffer(deflate)
  for (let line = 0; line < picture.height; line += 1)
    if (!deflate.write(row)) await new Promise((resolve) => deflate.once('drain', resolve))
  deflate.end()
  const end = pngChunk('IEND', Buffer.alloc(0))
  return Buffer.concat([SIGNATURE, pngHead(picture), pngChunk('IDAT', await packed), end])
}

/** Where the first row and the first column of the stored pixels are on the upright picture, by EXIF's orientation. */
const ORIENTATIONS = {
  1: ['top', 'left'],
  2: ['top', 'right'],
  3: ['bottom', 'right'],
  4: ['bottom', 'left'],
  5: ['left', 'top'],
  6: ['right', 'top'],
  7: ['right', 'bottom'],
  8: ['left', 'bottom'],
} as const

export type Orientation = keyof typeof ORIENTATIONS

export interface Pixels {
  readonly width: number
  readonly height: number
  /** RGB, row by row. */
  readonly data: Buffer
}

const flipped = (side: string): boolean => side === 'bottom' || side === 'right'

/** The pixels as a camera held in another way stores them. */
export function asStored({ width, height, data }: Pixels, orientation: Orientation): Pixels {
  const [row, column] = ORIENTATIONS[orientation]
  const turned = row === 'left' || row === 'right'
  const [storedWidth, storedHeight] = turned ? [height, width] : [width, height]
  const stored = Buffer.alloc(data.length)
  for (let r = 0; r < storedHeight; r += 1) {
    for (let c = 0; c < storedWidth; c += 1) {
      const alongRows = flipped(row) ? storedHeight - 1 - r : r
      const alongColumns = flipped(column) ? storedWidth - 1 - c : c
      const [x, y] = turned ? [alongRows, alongColumns] : [alongColumns, alongRows]
      data.copy(stored, (r * storedWidth + c) * 3, (y * width + x) * 3, (y * width + x) * 3 + 3)
    }
  }
  return { width: storedWidth, height: storedHeight, data: stored }
}
