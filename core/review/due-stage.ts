/** How near a day is on which something falls due; people are told once at each stage. */
export type DueStage = 'ahead' | 'soon' | 'overdue'

/** Days ahead of which the first and the second reminder go out. */
export const AHEAD_DAYS = 60
export const SOON_DAYS = 14

const DAY_MS = 86_400_000

/** A day so many days after another; both `YYYY-MM-DD`. */
export const daysAfter = (day: string, days: number): string =>
  new Date(Date.parse(`${day}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10)

/**
 * The stage at which something stands that falls due on a day; nothing while it is far off.
 *
 * @param due the last day on which it still holds, `YYYY-MM-DD`
 * @param today the same form
 */
export function dueStage(due: string, today: string): DueStage | undefined {
  if (due < today) return 'overdue'
  if (due <= daysAfter(today, SOON_DAYS)) return 'soon'
  return due <= daysAfter(today, AHEAD_DAYS) ? 'ahead' : undefined
}
