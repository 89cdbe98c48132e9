import { strToU8 } from 'fflate'
import { sha256 } from '#core/paper/sha256.ts'

/** Longest name of a place in a report, in UTF-16 code units: it is kept with every remark that holds on to it. */
export const LONGEST_ANCHOR = 300
const KEPT = 240

const hex = (bytes: Uint8Array): string => Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')

/** SHA-256 of a text in UTF-8, in hex. */
export const textHash = (text: string): string => hex(sha256(strToU8(text)))

/** A name made of parts; one that would be too long keeps its beginning and a hash of the whole. */
export function anchorOf(...parts: readonly string[]): string {
  const name = parts.join('/')
  return name.length <= LONGEST_ANCHOR ? name : `${name.slice(0, KEPT)}~${textHash(name).slice(0, 16)}`
}
