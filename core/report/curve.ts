import { COLOUR } from '#core/paper/style.ts'
import type { IslandBudget } from '#core/quantities/budget.ts'
import { circle, drawing, line, polygon, polyline, text } from './draw/svg.ts'
import { hoursText, rounded } from './print.ts'

type Course = IslandBudget['withoutSun']

const WIDTH = 560
const LEFT = 44
const RIGHT = 548
const TOP = 26
const BOTTOM = 158

interface Axes {
  readonly x: (hour: number) => number
  readonly y: (energy: number) => number
}

function axesOf({ hours, usable, held }: IslandBudget): Axes {
  const most = Math.max(usable, held, 1)
  return {
    x: (hour) => LEFT + (hour / hours) * (RIGHT - LEFT),
    y: (energy) => BOTTOM - (energy / most) * (BOTTOM - TOP),
  }
}

const LABEL = { 'font-size': 8, fill: COLOUR.muted }

function grid({ hours, usable }: IslandBudget, { x, y }: Axes): string {
  const marks = Array.from({ length: hours / 6 + 1 }, (_, index) => index * 6)
  const levels = [0, 0.25, 0.5, 0.75, 1].map((part) => part * usable)
  return [
    ...marks.map((hour) => line(x(hour), TOP, x(hour), BOTTOM, { stroke: COLOUR.hairline, 'stroke-width': 0.4 })),
    ...marks.map((hour) => text(x(hour), BOTTOM + 12, `${hour} h`, { ...LABEL, 'text-anchor': 'middle' })),
    ...levels.map((energy) =>
      text(LEFT - 6, y(energy) + 3, rounded(energy / 1000, 1), { ...LABEL, 'text-anchor': 'end' }),
    ),
    ...levels.map((energy) =>
      line(LEFT, y(energy), RIGHT, y(energy), { stroke: COLOUR.hairline, 'stroke-width': 0.4 }),
    ),
    text(LEFT - 6, TOP - 10, 'kWh', { ...LABEL, 'text-anchor': 'end' }),
    line(LEFT, BOTTOM, RIGHT, BOTTOM, { stroke: COLOUR.rule, 'stroke-width': 0.9 }),
  ].join('')
}

/** Power of the sun as a hill at the foot, its top at a third of the height. */
function sunHill({ sun }: IslandBudget, { x }: Axes): string {
  const most = Math.max(...sun, 0)
  if (most === 0) return ''
  const height = (power: number) => BOTTOM - (power / most) * ((BOTTOM - TOP) / 3)
  const points = sun.flatMap((power, hour) => [x(hour + 0.5), height(power)])
  return polygon([x(0), BOTTOM, ...points, x(sun.length), BOTTOM], {
    fill: COLOUR.lampTint,
    stroke: COLOUR.lamp,
    'stroke-width': 0.5,
  })
}

const course = (charge: readonly number[], { x, y }: Axes, look: Readonly<Record<string, string | number>>): string =>
  polyline(
    charge.flatMap((energy, hour) => [x(hour), y(energy)]),
    { fill: 'none', ...look },
  )

function key(entries: readonly (readonly [string, Readonly<Record<string, string | number>>])[]): string {
  let at = LEFT
  return entries
    .map(([words, look]) => {
      const from = at
      at += 26 + words.length * 4.1 + 12
      return line(from, 9, from + 20, 9, look) + text(from + 25, 12, words, LABEL)
    })
    .join('')
}

/** A ring where a course runs empty. */
const empty = ({ lasts }: Course, { x }: Axes): string =>
  lasts === undefined
    ? ''
    : circle(x(lasts), BOTTOM, 2.6, { fill: COLOUR.paper, stroke: COLOUR.ink, 'stroke-width': 1.1 })

/** Its name with the hour at which it runs empty: in the key, where no line crosses the words. */
const named = (name: string, { lasts }: Course): string =>
  lasts === undefined ? name : `${name}: empty after ${hoursText(lasts)}`

/**
 * The charge of the island's batteries over two days from sunset: without sun, under a clear sky, and for what must run.
 *
 * @param budget as `islandBudget` gives it, energies in Wh
 */
export function budgetCurve(budget: IslandBudget): string {
  const axes = axesOf(budget)
  const { withoutSun, withSun, mustRun } = budget
  const lasts = withoutSun.lasts
  const dark = { stroke: COLOUR.ink, 'stroke-width': 1.5 }
  const lit = { stroke: COLOUR.lamp, 'stroke-width': 1.5 }
  const least = { stroke: COLOUR.ink, 'stroke-width': 1, 'stroke-dasharray': '4 2.5' }
  const label = `Charge of the island over ${budget.hours} hours: without sun it lasts ${lasts === undefined ? 'throughout' : hoursText(lasts)}`
  return drawing(WIDTH, BOTTOM + 20, label, [
    sunHill(budget, axes),
    grid(budget, axes),
    ...(mustRun ? [course(mustRun.charge, axes, least)] : []),
    ...(withSun ? [course(withSun.charge, axes, lit)] : []),
    course(withoutSun.charge, axes, dark),
    ...(mustRun ? [empty(mustRun, axes)] : []),
    empty(withoutSun, axes),
    key([
      [named('without sun', withoutSun), dark],
      ...(withSun ? [['clear sky', lit] as const] : []),
      ...(mustRun ? [[named('what must run, without sun', mustRun), least] as const] : []),
    ]),
  ])
}
