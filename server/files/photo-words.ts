import type { PhotoProblem } from './photo-answer.ts'
import { PHOTO_LIMITS } from './photo-limits.ts'

const megabytes = (bytes: number): string => `${(bytes / 1e6).toFixed(1)} MB`
const KINDS = 'JPEG, PNG or WebP'

type Words = {
  readonly [Code in PhotoProblem['code']]: (problem: Extract<PhotoProblem, { code: Code }>) => string
}

const WORDS: Words = {
  empty: () => 'The file is empty. Choose the photo again.',
  'too-large': ({ bytes }) =>
    `The photo has ${megabytes(bytes)}; up to ${megabytes(PHOTO_LIMITS.bytes)} are taken. Send a smaller version of it.`,
  'not-a-photo': ({ kind }) =>
    `This is not a photo but ${kind}. Photos are taken as ${KINDS}, whatever the file is called.`,
  'not-readable-here': ({ kind }) =>
    `The photo is ${kind}, which cannot be read here. Save or share it as JPEG (on many phones: camera settings, formats, “most compatible”) and send that.`,
  'too-many-pixels': ({ width, height }) =>
    `The photo has ${width} × ${height} pixels; up to ${PHOTO_LIMITS.pixels / 1e6} million are taken. Send a smaller version of it.`,
  moving: () => 'The picture moves. Send a single photo of the moment that matters.',
  damaged: () =>
    'The photo cannot be read to its end: it is damaged or was cut off on its way. Send it again from the camera.',
  'too-heavy': () => 'The photo takes more memory to read than one photo may. Send a smaller version of it, as JPEG.',
  'too-slow': () =>
    `The photo could not be read within ${PHOTO_LIMITS.time / 1000} seconds. Send a smaller version of it, as JPEG.`,
  busy: () => 'Many photos are being read at the moment. Send this one again in a minute; nothing else is lost.',
}

/** A sentence for who sent the photo: what is wrong, what is allowed, what to do. */
export function photoWords(problem: PhotoProblem): string {
  const words = WORDS[problem.code] as (problem: PhotoProblem) => string
  return words(problem)
}
