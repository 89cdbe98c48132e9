import { COLOUR } from '#core/paper/style.ts'
import { circle, drawing, line, polygon, rect, text } from './draw/svg.ts'
import type { ReportScene } from './scene.ts'

/** Beyond this many strings the table serves better. */
const MOST = 24
const LEFT = 46
const RIGHT = 480
const ROW = 14
const TOP = 20
/** % that the axis reaches to either side. */
const REACH = 12

const place = (percent: number): number =>
  LEFT + ((Math.max(-REACH, Math.min(REACH, percent)) + REACH) / (2 * REACH)) * (RIGHT - LEFT)

interface ReadString {
  readonly id: string
  /** % off the datasheet. */
  readonly voltage: number
}

function row(scene: ReportScene, { id, voltage }: ReadString, index: number): string {
  const y = TOP + index * ROW + ROW / 2
  const current = scene.number(id, 'isc_from_expected')
  const x = current === undefined ? 0 : place(current)
  return [
    line(LEFT, y, RIGHT, y, { stroke: COLOUR.hairline, 'stroke-width': 0.4 }),
    text(LEFT - 6, y + 3, id, { 'text-anchor': 'end', 'font-size': 8.5, fill: COLOUR.ink }),
    current === undefined
      ? ''
      : polygon([x, y - 3.6, x + 3.6, y, x, y + 3.6, x - 3.6, y], {
          fill: 'none',
          stroke: COLOUR.ink,
          'stroke-width': 1,
        }),
    circle(place(voltage), y, 2.8, { fill: COLOUR.ink }),
  ].join('')
}

/**
 * Strings as points on one scale, in % off the datasheet: voltage as a disc, current as a diamond, the band of the rule
 * book as water. Undefined where no string was read, or there are too many to tell apart.
 */
export function stringPlot(scene: ReportScene, arrayId: string, count: number): string | undefined {
  const ids = Array.from({ length: Math.min(count, MOST + 1) }, (_, index) => `${arrayId}/${index + 1}`)
  const read = ids.flatMap((id): ReadString[] => {
    const voltage = scene.number(id, 'voc_from_expected')
    return voltage === undefined ? [] : [{ id, voltage }]
  })
  if (read.length < 2 || ids.length > MOST) return undefined
  const band = scene.judged.book.parameters.string_spread
  const bottom = TOP + read.length * ROW
  const ticks = [-10, -5, 0, 5, 10].map((percent) =>
    text(
      place(percent),
      bottom + 11,
      percent === 0 ? 'as the datasheet' : `${percent > 0 ? '+' : '−'}${Math.abs(percent)} %`,
      {
        'text-anchor': 'middle',
        'font-size': 8,
        fill: COLOUR.muted,
      },
    ),
  )
  const label = `Strings of ${arrayId}: deviation of voltage and current from the datasheet in %`
  return drawing(520, bottom + 28, label, [
    rect(place(-band), TOP - 4, place(band) - place(-band), bottom - TOP + 6, { fill: COLOUR.depth }),
    line(place(0), TOP - 4, place(0), bottom + 2, { stroke: COLOUR.rule, 'stroke-width': 0.7 }),
    ...read.map((string, index) => row(scene, string, index)),
    ...ticks,
    circle(LEFT + 4, 8, 2.8, { fill: COLOUR.ink }),
    text(LEFT + 11, 11, 'voltage', { 'font-size': 8, fill: COLOUR.muted }),
    polygon([LEFT + 54, 4.4, LEFT + 57.6, 8, LEFT + 54, 11.6, LEFT + 50.4, 8], {
      fill: 'none',
      stroke: COLOUR.ink,
      'stroke-width': 1,
    }),
    text(LEFT + 62, 11, 'current', { 'font-size': 8, fill: COLOUR.muted }),
    text(RIGHT, 11, `band ± ${band} %`, { 'font-size': 8, fill: COLOUR.muted, 'text-anchor': 'end' }),
  ])
}
