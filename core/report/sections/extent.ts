import { type Block, type Section, table } from '../blocks.ts'
import { limitationsOf } from '../limitations.ts'
import { capital } from '../print.ts'
import type { ReportScene } from '../scene.ts'

/** What the report covers, what it leaves out, and what its results stand for. */
export function extent({ install, judged }: ReportScene): Section {
  const { report } = install
  const rows = limitationsOf(judged.findings).map(({ anchor, reason, subjects }) => ({
    anchor,
    head: { text: subjects.join(', ') },
    cells: [{ text: capital(reason) }],
  }))
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
