import { ownFile } from '#cli/io.ts'
import type { FontName } from '#core/paper/options.ts'

const FACES = ['regular', 'italic', 'medium', 'semibold', 'fallback'] as const satisfies readonly FontName[]

/** The fonts that stand beside the bundle. */
export function ownFonts(): Record<FontName, Uint8Array> {
  return Object.fromEntries(FACES.map((name) => [name, ownFile(`fonts/${name}.ttf`)])) as Record<FontName, Uint8Array>
}
