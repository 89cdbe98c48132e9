import { ownFonts } from '#cli/fonts.ts'
import { endWith, isTerminal, say, writeWhole } from '#cli/io.ts'
import { judgedFile } from '#cli/judged.ts'
import { createdFrom, renderFieldsheet, renderReport } from '#core/report/render.ts'

type Made = { readonly ok: true; readonly bytes: Uint8Array } | { readonly ok: false; readonly message: string }

/** What cannot be printed, such as a character that no font has, is told with its words; anything else is a fault of ours. */
function made(draw: () => Uint8Array): Made {
  try {
    return { ok: true, bytes: draw() }
  } catch (error) {
    // The engine stands beside this bundle, so its class is not ours to compare with.
    if (error instanceof Error && error.name === 'PaperError') {
      // Lines and columns of the typeset page mean nothing to whoever wrote the file.
      return { ok: false, message: error.message.replace(/^Line \d+, column \d+: /, '') }
    }
    throw error
  }
}

function stop(message: string): void {
  say(`${message}\n`)
  endWith(2)
}

/** Writes the report, or the sheet for the site, as a PDF. */
export async function render(
  name: 'render' | 'fieldsheet',
  file: string,
  { output, rulebook }: { readonly output: string; readonly rulebook?: string },
): Promise<void> {
  if (output === '-' && isTerminal('stdout')) return stop('A terminal cannot show a PDF: name a file with -o, or pipe.')
  const found = await judgedFile(file, rulebook)
  if (!found) return
  const { judged, text } = found
  const options = {
    text,
    file: file.split(/[\\/]/).at(-1) ?? file,
    fonts: ownFonts(),
    created: createdFrom(judged.install),
    draft: true,
  }
  const page = made(() => (name === 'render' ? renderReport(judged, options) : renderFieldsheet(judged, options)))
  const written = page.ok ? writeWhole(output, page.bytes) : page
  if (!page.ok || !written.ok) return stop(`${written.ok ? '' : written.message}\nNothing was written.`)
  if (output !== '-') say(`Wrote ${output} (${(page.bytes.length / 1024).toFixed(0)} kB).\n`)
}
