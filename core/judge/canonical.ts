import { sha256 } from '#core/paper/sha256.ts'
import type { ResolvedBook } from './book.ts'

/** A value as JSON with sorted keys, so that the same content always has the same text. */
function canonical(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(canonical)
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value)
      .toSorted(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, inner]) => [key, canonical(inner)]),
  )
}

/** The hash that a report prints: SHA-256 over the resolved book in canonical JSON, in hex. */
export function hashOf(book: ResolvedBook): string {
  const bytes = sha256(encodeUtf8(JSON.stringify(canonical(book))))
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')
}

/** UTF-8 without the platform's encoder, which the language itself does not bring. */
export function encodeUtf8(text: string): Uint8Array {
  return Uint8Array.from(encodeURIComponent(text).matchAll(/%(..)|./g), ([all, hex]) =>
    hex === undefined ? all.charCodeAt(0) : Number.parseInt(hex, 16),
  )
}
