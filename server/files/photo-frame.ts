import type { Photo, PhotoAnswer, Picture } from './photo-answer.ts'
import { PHOTO_LIMITS } from './photo-limits.ts'
import { isProblem } from './photo-problem.ts'

interface Sizes {
  readonly size: number
  readonly width: number
  readonly height: number
}

const sizes = ({ bytes, width, height }: Picture): Sizes => ({ size: bytes.length, width, height })

/** An answer as bytes: one line of JSON, then both pictures. */
export function packed(answer: PhotoAnswer): Buffer {
  if (!answer.ok) return Buffer.from(`${JSON.stringify({ problem: answer.problem })}\n`)
  const { stored, paper, taken } = answer.photo
  const head = JSON.stringify({ stored: sizes(stored), paper: sizes(paper), taken })
  return Buffer.concat([Buffer.from(`${head}\n`), stored.bytes, paper.bytes])
}

const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

const isSide = (value: unknown, most: number): value is number =>
  typeof value === 'number' && Number.isInteger(value) && value >= 1 && value <= most

/** One picture from the front of bytes; nothing unless it is a JPEG of the size that is said. */
function picture(value: unknown, rest: Buffer, most: number): Picture | undefined {
  if (!isRecord(value)) return undefined
  const { size, width, height } = value
  if (!isSide(size, rest.length) || !isSide(width, most) || !isSide(height, most)) return undefined
  const bytes = rest.subarray(0, size)
  return bytes[0] === 0xff && bytes[1] === 0xd8 ? { bytes, width, height } : undefined
}

function photo(head: Readonly<Record<string, unknown>>, rest: Buffer): Photo | undefined {
  const stored = picture(head['stored'], rest, PHOTO_LIMITS.stored)
  const paper = stored && picture(head['paper'], rest.subarray(stored.bytes.length), PHOTO_LIMITS.paper)
  if (!stored || !paper || stored.bytes.length + paper.bytes.length !== rest.length) return undefined
  const { taken } = head
  return { stored, paper, taken: typeof taken === 'string' && /^[\d:T-]{19}$/.test(taken) ? taken : null }
}

function parsed(line: string): unknown {
  try {
    return JSON.parse(line)
  } catch (error) {
    if (error instanceof SyntaxError) return undefined
    throw error
  }
}

/**
 * Reads what a photo's process wrote; nothing where it is not whole or not in form.
 * That process has parsed hostile bytes, so its word is not taken for anything that can be looked at.
 */
export function unpacked(bytes: Buffer): PhotoAnswer | undefined {
  const end = bytes.indexOf('\n')
  const head = end < 0 ? undefined : parsed(bytes.toString('utf8', 0, end))
  if (!isRecord(head)) return undefined
  if (isProblem(head['problem'])) return { ok: false, problem: head['problem'] }
  const read = photo(head, bytes.subarray(end + 1))
  return read && { ok: true, photo: read }
}
