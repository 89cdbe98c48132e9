import type { SheetValue } from '#core/glossary.ts'
import { withUnit } from './number.ts'

/** Words and numbers side by side: `L1, L2 and L3`. */
export function joined(words: readonly string[]): string {
  if (words.length < 2) return words.join('')
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`
}

/** A sheet value as people read it. */
export function shown(value: SheetValue | undefined, unit: string): string {
  if (value === undefined) return 'not stated'
  if (typeof value === 'number')
    return value === Number.POSITIVE_INFINITY && unit === 'ms' ? 'no trip' : withUnit(value, unit)
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (typeof value === 'string') return value
  if (Array.isArray(value))
    return value.length === 0 ? 'none' : joined(value.map((item: SheetValue) => shown(item, unit)))
  return joined(Object.entries(value as Record<string, SheetValue>).map(([key, item]) => `${key} ${shown(item, unit)}`))
}
