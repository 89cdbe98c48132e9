import { INSPECTION_ITEMS, itemField } from '#core/sheets/inspection.ts'
import { type Block, table } from '../blocks.ts'
import { capital } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { wordCell, writingBox } from './points.ts'

const RESULT = 26
const NOTE = 38
const ON_SITE = 76

/** Items that the file's rule book asks for. */
function asked({ judged }: ReportScene): readonly string[] {
  const fields = new Set(judged.book.rules.flatMap(({ reads }) => reads))
  return INSPECTION_ITEMS.filter((item) => fields.has(itemField(item)))
}

/** Things to look at, with the result where there is one. */
export function looks(scene: ReportScene): Block[] {
  const known = new Map((scene.install.inspection ?? []).map(({ item, result }) => [item, result]))
  const rows = [...new Set([...asked(scene), ...known.keys()])].map((item) => ({
    anchor: `point/inspection/${item}/row`,
    head: { text: capital(item) },
    cells: [
      wordCell({ anchor: `point/inspection/${item}`, name: `result: ${item}`, word: known.get(item) }, RESULT),
      known.has(item) ? { text: '' } : { svg: writingBox(`note on ${item}`, NOTE) },
    ],
  }))
  const columns = [
    { label: 'Item', width: 36 },
    { label: 'Good, defect, not applicable', width: RESULT },
    { label: 'Note, photo', width: NOTE },
  ]
  return [table('point/inspection', columns, [{ rows }])]
}

/** Who tests, when, with what. */
export function whoAndWhen({ install }: ReportScene): Block {
  const named = Object.entries(install.instruments ?? {}).map(
    ([id, { kind, serial }]) => `${id} ${kind}, serial ${serial}`,
  )
  const tester = install.people?.tested_by?.name
  const cells = [
    ['date', 'Date', install.report.inspected?.from],
    ['name', 'Tested by', tester],
    ['instrument', 'Instrument, serial', named.length > 0 ? named.join('; ') : undefined],
  ] as const
  const rows = cells.map(([name, title, word]) => ({
    anchor: `point/head/${name}/row`,
    head: { text: title },
    cells: [
      word === undefined
        ? { anchor: `point/head/${name}`, svg: writingBox(title, ON_SITE) }
        : { anchor: `point/head/${name}`, text: word },
    ],
  }))
  return table(
    'point/head',
    [
      { label: 'On site', width: 24 },
      { label: '', width: ON_SITE },
    ],
    [{ rows }],
  )
}
