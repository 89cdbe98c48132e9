/**
 * A number as people read it: four significant digits, at most three decimals, no needless zeros.
 *
 * `0.5287` gives `0.529`, `1666.7` gives `1667`, `22.95` stays.
 */
export function plainNumber(value: number): string {
  if (value === Number.POSITIVE_INFINITY) return '∞'
  if (Number.isInteger(value)) return String(value)
  const magnitude = Math.floor(Math.log10(Math.abs(value)))
  const decimals = Math.min(3, Math.max(0, 3 - magnitude))
  return String(Number(value.toFixed(decimals))).replace('-', '−')
}

/** A number with its unit; a factor or a count stands alone. */
export function withUnit(value: number, unit: string): string {
  return unit === '' ? plainNumber(value) : `${plainNumber(value)} ${unit}`
}
