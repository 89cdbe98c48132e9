import type { IslandBudget } from '#core/quantities/budget.ts'
import { at } from '../svg-text.ts'

const [LEFT, RIGHT, TOP, BOTTOM] = [52, 588, 14, 150]

/** The battery's charge over two days after a grid failure at sunset. */
export function budgetCurve(budget: IslandBudget): string {
  const most = budget.usable
  const x = (hour: number): number => LEFT + (hour / budget.hours) * (RIGHT - LEFT)
  const y = (charge: number): number => BOTTOM - (Math.max(0, charge) / most) * (BOTTOM - TOP)
  const line = (charge: readonly number[]): string =>
    charge.map((value, hour) => `${at(x(hour))},${at(y(value))}`).join(' ')
  const hours = [0, 6, 12, 18, 24, 30, 36, 42, 48].map(
    (hour) =>
      `<line class="gridline" x1="${at(x(hour))}" y1="${TOP}" x2="${at(x(hour))}" y2="${BOTTOM}"/><text class="label" x="${at(x(hour))}" y="${BOTTOM + 14}" text-anchor="middle">${hour} h</text>`,
  )
  const levels = [0, 0.5, 1].map(
    (part) =>
      `<text class="label" x="${LEFT - 6}" y="${at(y(part * most) + 3)}" text-anchor="end">${at((part * most) / 1000)} kWh</text>`,
  )
  const curves = [
    ...(budget.withSun
      ? [
          `<polyline class="island" points="${line(budget.withSun.charge)}"/><text class="label" x="${at(x(30))}" y="${at(y(budget.withSun.charge[30] ?? 0) - 5)}" text-anchor="middle">clear sky</text>`,
        ]
      : []),
    ...(budget.mustRun
      ? [`<polyline class="ink" points="${line(budget.mustRun.charge)}" stroke-dasharray="4 3"/>`]
      : []),
    `<polyline class="ink" points="${line(budget.withoutSun.charge)}"/>`,
  ]
  return `<svg role="img" aria-label="Charge of the battery over 48 hours after a grid failure at sunset, without and with sun" viewBox="0 0 620 172"><rect class="water" x="${LEFT}" y="${at(y(budget.held))}" width="${RIGHT - LEFT}" height="${at(BOTTOM - y(budget.held))}" opacity="0.55"/>${hours.join('')}${levels.join('')}${curves.join('')}<line class="axis" x1="${LEFT}" y1="${BOTTOM}" x2="${RIGHT}" y2="${BOTTOM}"/></svg>`
}
