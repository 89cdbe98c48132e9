import { bookPage } from '#core/judge/pages.ts'
import { type Block, type Section, table } from '../blocks.ts'
import { capital, printed } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { sure } from '../sure.ts'
import { grouped } from './identity.ts'

/** The rule book: which one, what it sets where countries differ, and what it leaves out. */
export function rulebook({ judged }: ReportScene): Section {
  const { book } = judged
  const page = sure(bookPage(book.id), `The page of the book ${book.id}`)
  const parameters = Object.entries(page.parameters).map(([name, { value, unit = '', title, source }]) => ({
    anchor: `parameter/${name}`,
    head: { text: sure(title, `The title of ${name}`) },
    cells: [{ text: value === null ? 'none set' : printed(value, unit) }, { text: capital(source) }],
  }))
  const off = page.off.map(({ rule, reason, by }) => ({
    anchor: `off/${rule}`,
    head: { text: rule },
    cells: [{ text: by }, { text: reason }],
  }))
  const columns = [
    { label: 'Parameter', width: 36 },
    { label: 'Value', width: 16 },
    { label: 'Source', width: 48 },
  ]
  const blocks: Block[] = [
    {
      kind: 'prose',
      anchor: 'rulebook/identity',
      paragraphs: [
        `${book.title}: ${page.lineage.join(', then ')}, version ${book.version}, ${book.rules.length} rules. ${page.note}`.trim(),
        `SHA-256 of the book: ${grouped(book.hash)}`,
      ],
    },
    table('rulebook/parameters', columns, [{ rows: parameters }], 'Where countries and editions differ'),
    ...(off.length > 0
      ? [
          table(
            'rulebook/off',
            [
              { label: 'Rule switched off', width: 36 },
              { label: 'By', width: 16 },
              { label: 'Reason', width: 48 },
            ],
            [{ rows: off }],
          ),
        ]
      : []),
  ]
  return { anchor: 'rulebook', title: 'Rule book', blocks }
}
