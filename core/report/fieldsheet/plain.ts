import { type Block, table } from '../blocks.ts'
import { type Point, pointCell } from './points.ts'

const BOX = 26

/** Test points one below the other: what, limit, box. Nothing where there are none. */
export function plainPoints(anchor: string, caption: string, points: readonly Point[]): Block[] {
  if (points.length === 0) return []
  const rows = points.map((point) => ({
    anchor: `${point.anchor}/row`,
    head: { text: point.name },
    cells: [{ text: point.limit }, { text: point.unit }, pointCell({ ...point, limit: '' }, BOX)],
  }))
  const columns = [
    { label: 'Test point', width: 38 },
    { label: 'Limit', width: 28 },
    { label: 'Unit', width: 8 },
    { label: 'Reading', width: BOX },
  ]
  return [table(anchor, columns, [{ rows }], caption)]
}
