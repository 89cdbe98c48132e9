import { endWith, ownFile, say, writeWhole } from '#cli/io.ts'
import { judgedFile } from '#cli/judged.ts'
import type { FontName } from '#core/paper/options.ts'
import { createdFrom, renderFieldsheet, renderReport } from '#core/report/render.ts'

const FACES = ['regular', 'italic', 'medium', 'semibold', 'fallback'] as const satisfies readonly FontName[]

function fonts(): Record<FontName, Uint8Array> {
  return Object.fromEntries(FACES.map((name) => [name, ownFile(`fonts/${name}.ttf`)])) as Record<FontName, Uint8Array>
}

/** Writes the report, or the sheet for the site, as a PDF. */
export async function render(
  name: 'render' | 'fieldsheet',
  file: string,
  { output, rulebook }: { readonly output: string; readonly rulebook?: string },
): Promise<void> {
  const found = await judgedFile(file, rulebook)
  if (!found) return
  const { judged, text } = found
  const options = {
    text,
    file: file.split(/[\\/]/).at(-1) ?? file,
    fonts: fonts(),
    created: createdFrom(judged.install),
    draft: true,
  }
  const bytes = name === 'render' ? renderReport(judged, options) : renderFieldsheet(judged, options)
  const written = writeWhole(output, bytes)
  say(written.ok ? `Wrote ${output} (${(bytes.length / 1024).toFixed(0)} kB).\n` : `${written.message}\n`)
  if (!written.ok) endWith(2)
}
