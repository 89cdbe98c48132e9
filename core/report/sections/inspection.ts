import type { InspectionItem } from '#core/install/record.ts'
import { type Mark, type Section, table } from '../blocks.ts'
import { distinct } from '../names.ts'
import { capital } from '../print.ts'
import type { ReportScene } from '../scene.ts'

const RESULTS: Readonly<Record<InspectionItem['result'], Mark>> = {
  good: { word: 'good', shape: 'verdict-meets' },
  defect: { word: 'defect', shape: 'verdict-fails' },
  'not inspected': { word: 'not inspected', shape: 'verdict-not-shown' },
  'not applicable': { word: 'not applicable', shape: 'verdict-not-applicable' },
}

/** What was looked at, what was found, and which photo shows it. */
export function inspection({ install }: ReportScene): Section {
  const items = install.inspection ?? []
  const names = distinct(items.map(({ item }) => item))
  const rows = items.map(({ item, result, note, photo }, index) => ({
    anchor: `inspection/${names[index]}`,
    ...(result === 'defect' && { look: 'row-fails' as const }),
    head: { text: capital(item) },
    cells: [{ mark: RESULTS[result] }, { text: note ?? '–' }, { text: photo ?? '–' }],
  }))
  const columns = [
    { label: 'Item', width: 32 },
    { label: 'Result', width: 17 },
    { label: 'Note', width: 33 },
    { label: 'Photo', width: 18 },
  ]
  return {
    anchor: 'inspection',
    title: 'Inspection',
    blocks: rows.length === 0 ? [] : [table('inspection/list', columns, [{ rows }])],
  }
}
