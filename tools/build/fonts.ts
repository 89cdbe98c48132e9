import { copyFileSync, mkdirSync, readFileSync } from 'node:fs'
import type { FontName } from '#core/paper/options.ts'
import fonts from '#templates/fonts.json' with { type: 'json' }

const PROJECT = new URL('../../', import.meta.url).pathname
const FILES = Object.entries(fonts) as [FontName, string][]

/** The fonts of the paper, from their npm packages. */
export function readFonts(): Record<FontName, Uint8Array> {
  const loaded = FILES.map(([name, file]) => [name, new Uint8Array(readFileSync(`${PROJECT}node_modules/${file}`))])
  return Object.fromEntries(loaded) as Record<FontName, Uint8Array>
}

/** Copies the fonts beside the bundle, which must not look for packages. */
export function copyFonts(folder: string): void {
  mkdirSync(folder, { recursive: true })
  for (const [name, file] of FILES) copyFileSync(`${PROJECT}node_modules/${file}`, `${folder}/${name}.ttf`)
}
