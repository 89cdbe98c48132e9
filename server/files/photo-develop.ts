import sharp, { type Sharp } from 'sharp'
import { takenAt } from './exif-time.ts'
import type { Photo, PhotoAnswer, PhotoProblem, Picture } from './photo-answer.ts'
import { type PhotoKind, photoKind } from './photo-kind.ts'
import { PHOTO_LIMITS } from './photo-limits.ts'

/** Readers of the picture library by kind; all others are shut, so that no other format is ever parsed. */
const READERS: Readonly<Record<PhotoKind, string>> = {
  JPEG: 'VipsForeignLoadJpegBuffer',
  PNG: 'VipsForeignLoadPngBuffer',
  WebP: 'VipsForeignLoadWebpBuffer',
  HEIC: 'VipsForeignLoadHeifBuffer',
}

/** Whether the installed picture library reads HEIC as phones make it; its prebuilt form reads AVIF only. */
const readsHeic = (): boolean => sharp.format.heif.input.fileSuffix?.includes('.heic') ?? false

function openOnly(kind: PhotoKind): void {
  sharp.block({ operation: ['VipsForeignLoad'] })
  sharp.unblock({ operation: [READERS[kind]] })
  sharp.cache(false)
  sharp.concurrency(1)
}

const refuse = (problem: PhotoProblem): PhotoAnswer => ({ ok: false, problem })

const inside = (side: number) => ({ width: side, height: side, fit: 'inside', withoutEnlargement: true }) as const

/** The same pixels give the same bytes: one encoder, fixed settings, no metadata. */
async function asJpeg(pixels: Sharp): Promise<Picture> {
  const { data, info } = await pixels
    .jpeg({ quality: PHOTO_LIMITS.quality, progressive: false, chromaSubsampling: '4:2:0' })
    .toBuffer({ resolveWithObject: true })
  return { bytes: data, width: info.width, height: info.height }
}

async function made(bytes: Buffer, exif: Buffer | undefined): Promise<Photo> {
  const { data, info } = await sharp(bytes, { limitInputPixels: PHOTO_LIMITS.pixels, failOn: 'error', pages: 1 })
    .autoOrient()
    .resize(inside(PHOTO_LIMITS.stored))
    .flatten({ background: 'white' })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true })
  const upright = () => sharp(data, { raw: { width: info.width, height: info.height, channels: info.channels } })
  const stored = await asJpeg(upright())
  const paper = await asJpeg(upright().resize(inside(PHOTO_LIMITS.paper)))
  return { stored, paper, taken: exif ? takenAt(exif) : null }
}

/** The library reads the first picture of a moving PNG and says nothing of the others. */
function isMovingPng(bytes: Buffer): boolean {
  const control = bytes.subarray(0, 1).equals(Buffer.from([0x89])) ? bytes.indexOf('acTL') : -1
  return control > 0 && control < bytes.indexOf('IDAT')
}

const outOfMemory = (error: unknown): boolean =>
  error instanceof Error && /memory|unable to allocate|bad_alloc/i.test(error.message)

/**
 * Makes a photo anew: header judged first, then decoded, turned upright, shrunk, without any metadata.
 * It parses hostile bytes, so only the process made for that calls it (`photo-child.ts`).
 */
export async function develop(bytes: Buffer): Promise<PhotoAnswer> {
  const kind = photoKind(bytes)
  if ('other' in kind) return refuse({ code: 'not-a-photo', kind: kind.other })
  if (kind.photo === 'HEIC' && !readsHeic()) return refuse({ code: 'not-readable-here', kind: 'HEIC' })
  openOnly(kind.photo)
  try {
    const head = await sharp(bytes, { limitInputPixels: false }).metadata()
    const { width, height, pages = 1 } = head
    if (pages > 1 || isMovingPng(bytes)) return refuse({ code: 'moving' })
    if (width * height > PHOTO_LIMITS.pixels) return refuse({ code: 'too-many-pixels', width, height })
    return { ok: true, photo: await made(bytes, head.exif) }
  } catch (error) {
    // The library's own words name its inside; what matters to the sender is one of two things.
    return refuse({ code: outOfMemory(error) ? 'too-heavy' : 'damaged' })
  }
}
