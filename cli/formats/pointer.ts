import type { Path } from '#core/glossary.ts'

/** A path as a JSON Pointer (RFC 6901). */
export function pointer(path: Path): string {
  return path.map((part) => `/${String(part).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('')
}
