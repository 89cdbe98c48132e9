import type { Battery } from '#core/install/battery.ts'

/** cm² of opening for each m³/h. */
const OPENING = 28

const gases = (chemistry: Battery['chemistry']): boolean => chemistry.startsWith('lead-acid')

/**
 * Air in m³/h that keeps hydrogen below 4 %: factor · n · Igas · C · 10⁻³. Lead-acid only: lithium and sodium cells are
 * gastight.
 *
 * @param factor the rule book's, m³/Ah: 0.05, in older texts 0.055
 * @returns undefined for other chemistries, and where cells, capacity or gas current are not stated
 * @source IEC 62485-2, as printed in two engineering texts (clause 7.2 from memory)
 */
export function ventilation(battery: Battery, factor: number): number | undefined {
  const { chemistry, cells, capacity, gas_current } = battery
  if (!gases(chemistry) || cells === undefined || capacity === undefined || gas_current === undefined) return undefined
  return (factor * cells * gas_current * capacity) / 1000
}

/**
 * Free area in cm² of each of the two openings that let an air flow through by itself: 28·Q.
 *
 * @param flow Q in m³/h
 * @source IEC 62485-2, 7.3, as printed in two engineering texts (clause from memory)
 */
export function ventOpening(flow: number): number {
  return OPENING * flow
}
