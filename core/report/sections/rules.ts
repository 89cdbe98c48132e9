import type { Finding, Verdict } from '#core/glossary.ts'
import { rulePage } from '#core/judge/pages.ts'
import { ruleTitle } from '#core/texts/words.ts'
import { type Row, type RowGroup, type Section, tables } from '../blocks.ts'
import { citesText } from '../finding-blocks.ts'
import { WORST_FIRST } from '../marks.ts'
import { capital, few } from '../print.ts'
import type { ReportScene } from '../scene.ts'

const MOST = 10

function verdictsText(findings: readonly Finding[]): string {
  const list = (verdict: Verdict) => {
    const found = findings.filter((finding) => finding.verdict === verdict)
    if (found.length === 0) return []
    const names = [...new Set(found.map(({ subject }) => subject))]
    const where = verdict === 'not applicable' ? '' : `: ${few(names, MOST)}`
    return [`${found.length} ${verdict}${where}`]
  }
  return WORST_FIRST.flatMap(list).join('; ')
}

/** Every rule that was judged, with its verdicts and its source. */
export function rules({ judged }: ReportScene): Section {
  const byRule = new Map<string, Finding[]>()
  for (const finding of judged.findings) {
    const known = byRule.get(finding.rule)
    if (known) known.push(finding)
    else byRule.set(finding.rule, [finding])
  }
  const chapters = new Map<string, Row[]>()
  for (const { id, key, severity } of judged.book.rules) {
    const { chapter, record } = rulePage(key)
    const found = byRule.get(id) ?? []
    const row: Row = {
      anchor: `judged/${id}`,
      head: { text: ruleTitle(key), note: severity === 'failure' ? id : `${id} · ${severity}` },
      cells: [{ text: citesText(record.cites) }, { text: verdictsText(found) || 'nothing to judge' }],
    }
    chapters.set(chapter, [...(chapters.get(chapter) ?? []), row])
  }
  const groups: RowGroup[] = [...chapters].map(([chapter, rows]) => ({
    title: capital(chapter.replaceAll('-', ' ')),
    rows,
  }))
  const columns = [
    { label: 'Rule', width: 36 },
    { label: 'Source', width: 40 },
    { label: 'Verdicts', width: 24 },
  ]
  return {
    anchor: 'rules',
    title: 'Every rule judged',
    newPage: true,
    blocks: tables('rules/list', columns, groups),
  }
}
