import type { Finding } from '#core/glossary.ts'
import type { Entry } from './blocks.ts'
import { verdictCell } from './verdicts.ts'

/** The verdict as the last entry of a list of particulars. */
export function verdictEntry(anchor: string, findings: readonly Finding[]): Entry {
  const { mark, note, text = '' } = verdictCell(findings)
  return { anchor, term: 'Verdict', detail: text, ...(mark && { mark }), ...(note !== undefined && { note }) }
}
