import type { Finding } from '#core/glossary.ts'
import { type Block, type Section, table } from '../blocks.ts'
import { capital } from '../print.ts'
import type { ReportScene } from '../scene.ts'

/** Reasons why readings are missing, each with what it covers. */
function limitations(limited: readonly Finding[]) {
  const byReason = new Map<string, Set<string>>()
  for (const { reason = '', subject } of limited) byReason.set(reason, (byReason.get(reason) ?? new Set()).add(subject))
  return [...byReason].map(([reason, subjects]) => {
    const names = [...subjects]
    return {
      anchor: `limitation/${names.toSorted().join('+')}/${reason}`,
      head: { text: names.join(', ') },
      cells: [{ text: capital(reason) }],
    }
  })
}

/** What the report covers, what it leaves out, and what its results stand for. */
export function extent({ install, judged }: ReportScene): Section {
  const { report } = install
  const rows = limitations(judged.findings.filter(({ verdict }) => verdict === 'limited'))
  const blocks: Block[] = [
    {
      kind: 'prose',
      anchor: 'extent/text',
      paragraphs: [
        report.extent ?? 'The extent is not stated.',
        ...(report.remarks === undefined ? [] : [report.remarks]),
        'The results relate to this installation only, as it was found on the days of the inspection.',
      ],
    },
  ]
  const columns = [
    { label: 'Not tested', width: 30 },
    { label: 'Reason', width: 70 },
  ]
  if (rows.length > 0) blocks.push(table('extent/limitations', columns, [{ rows }], 'Limitations'))
  return { anchor: 'extent', title: 'Extent and limitations', blocks }
}
