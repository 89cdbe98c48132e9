import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { FontName } from '#core/paper/options.ts'
import fonts from '#templates/fonts.json' with { type: 'json' }

const require = createRequire(import.meta.url)
const FILES = Object.entries(fonts) as [FontName, string][]

let read: Readonly<Record<FontName, Uint8Array>> | undefined

/** The fonts of the paper, from their packages; read once, since they never change while the process lives. */
export function paperFonts(): Readonly<Record<FontName, Uint8Array>> {
  read ??= Object.fromEntries(
    FILES.map(([name, file]) => [name, new Uint8Array(readFileSync(require.resolve(file)))]),
  ) as Record<FontName, Uint8Array>
  return read
}
