import { createdFrom, renderReport } from '#core/report/render.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { paperFonts } from '#server/paper/fonts.ts'
import type { JudgedRevision } from './judged-revision.ts'

/** A revision as a draft PDF. Text that no font can print is refused with its words. */
export function renderDraft({ judged, text, file }: JudgedRevision): { readonly bytes: Uint8Array } | Refused {
  try {
    const options = { text, file, fonts: paperFonts(), created: createdFrom(judged.install), draft: true }
    return { bytes: renderReport(judged, options) }
  } catch (error) {
    if (!(error instanceof Error) || error.name !== 'PaperError') throw error
    // Lines and columns of the typeset page mean nothing to whoever wrote the file.
    const message = error.message.replace(/^Line \d+, column \d+: /, '')
    return refuse('file-refused', message, { errors: [{ pointer: '', code: 'cannot-be-printed', message }] })
  }
}
