import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { FontName } from '#core/paper/options.ts'
import files from '#templates/fonts.json' with { type: 'json' }

const require = createRequire(import.meta.url)

const read = (name: FontName): Uint8Array => new Uint8Array(readFileSync(require.resolve(files[name])))

/** The fonts that the project sets its pages in. */
export const fonts: Readonly<Record<FontName, Uint8Array>> = {
  regular: read('regular'),
  italic: read('italic'),
  medium: read('medium'),
  semibold: read('semibold'),
  fallback: read('fallback'),
}
