import { type Section, table } from '../blocks.ts'
import { markOf } from '../marks.ts'
import type { ReportScene } from '../scene.ts'

const MEANINGS = [
  ['meets', 'The rule holds at the value, and at both ends of its uncertainty.'],
  ['meets, inside the uncertainty', 'It holds at the value as read, but not over its whole uncertainty.'],
  [
    'fails, inside the uncertainty',
    'It does not hold at the value as read; the true value may still lie on the right side. Counts as failing.',
  ],
  ['fails', 'It does not hold.'],
  ['not shown', 'A reading or an entry that the rule needs is missing.'],
  ['limited', 'It is missing for a stated reason, which the reviewer accepts or refuses.'],
  ['not applicable', 'The rule is not about this subject as it is built.'],
] as const

/** How a value becomes a verdict, so that a second person can follow it. */
export function method({ judged }: ReportScene): Section {
  const { book } = judged
  const rows = MEANINGS.map(([verdict, words]) => ({
    anchor: `method/${verdict}`,
    head: { mark: markOf(verdict) },
    cells: [{ text: words }],
  }))
  return {
    anchor: 'method',
    title: 'How the verdicts were reached',
    blocks: [
      {
        kind: 'prose',
        anchor: 'method/rule',
        paragraphs: [
          `Quantities are computed from the attached file; each rule of the book ${book.id} ${book.version} is then held against the values of each thing it is about. The file and every computed quantity with its formula and source are embedded in this document.`,
          'Decision rule: simple acceptance. A value on the right side of its limit, or at it, is accepted; no guard band is taken off. At the limit itself a wrong decision is then up to 50 % likely (ILAC-G8:09/2019, 4.2). The uncertainty of each reading is drawn and told, so that a reviewer can weigh it.',
          'A rule that touches readings is judged at the values as read and at both ends of their uncertainty: the one that the instrument states, else the widest that IEC 61557 permits for its kind.',
          'Only rules at the level of failure decide whether the report can be issued. Cautions and notes are opinions of the rule book, marked as such.',
        ],
      },
      table(
        'method/verdicts',
        [
          { label: 'Verdict', width: 34 },
          { label: 'Meaning', width: 66 },
        ],
        [{ rows }],
      ),
    ],
  }
}
